package org.treadwarm.web;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.Error;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.dialect.Dialects;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Collectors;
import java.util.stream.StreamSupport;
import org.treadwarm.intake.NotJsonException;

/** What the server's own description promises: for each path, method and status, what type and shape an answer has. */
final class Contract {
    private static final String PROBLEM = "application/problem+json";

    private final JsonNode description;
    private final SchemaRegistry registry = SchemaRegistry.withDialect(Dialects.getOpenApi31());
    private final Map<String, Schema> schemas = new ConcurrentHashMap<>();

    /** Reads a description. */
    Contract(byte[] description) {
        try {
            this.description = org.treadwarm.intake.Document.read(description);
        } catch (NotJsonException e) {
            throw new IllegalArgumentException("the description is no JSON", e);
        }
    }

    /**
     * Compares an answer with the promise.
     *
     * @throws AssertionError when the answer is not listed, or has another type or shape than listed
     */
    void check(String method, String path, int status, String type, String body) {
        String call = method + " " + path + " -> " + status;
        JsonNode response = response(method, path, status, call);
        String media = type == null ? "" : type.split(";", 2)[0].strip();
        JsonNode schema = response.path("content").path(media).path("schema");
        if (schema.isMissingNode()) {
            throw new AssertionError(call + " has the type \"" + media + "\", which is not listed");
        }
        if (!media.endsWith("json")) {
            if (!schema.path("type").asText().equals("string")) {
                throw new AssertionError(call + " is no JSON, so it must be listed as a text");
            }
            return;
        }
        List<Error> errors = schema(schema).validate(body, InputFormat.JSON);
        if (!errors.isEmpty()) {
            throw new AssertionError(call + " breaks the contract: " + errors + "\n" + body);
        }
    }

    private JsonNode response(String method, String path, int status, String call) {
        Optional<JsonNode> operations = operations(path);
        if (operations.isEmpty()) {
            return unlisted(status, 404, call);
        }
        JsonNode operation = operations.get().path(method.toLowerCase(Locale.ROOT));
        if (operation.isMissingNode()) {
            return unlisted(status, 405, call);
        }
        JsonNode response = operation.path("responses").path(Integer.toString(status));
        if (response.isMissingNode()) {
            throw new AssertionError(call + " is not listed");
        }
        return response;
    }

    /** What is not listed at all answers with a problem, and no other status than the one that says so. */
    private JsonNode unlisted(int status, int expected, String call) {
        if (status != expected) {
            throw new AssertionError(call + " is not listed, so it must answer " + expected);
        }
        ObjectNode response = org.treadwarm.intake.Document.mapper().createObjectNode();
        response.putObject("content")
                .putObject(PROBLEM)
                .putObject("schema")
                .put("$ref", "#/components/schemas/ProblemDocument");
        return response;
    }

    private Optional<JsonNode> operations(String path) {
        return description.path("paths").properties().stream()
                .filter(entry -> path.matches(pattern(entry.getKey())))
                .min(Map.Entry.comparingByKey())
                .map(Map.Entry::getValue);
    }

    private static String pattern(String template) {
        return template.replaceAll("\\{[a-z]+}", "[^/]+");
    }

    private Schema schema(JsonNode schema) {
        return schemas.computeIfAbsent(schema.toString(), text -> {
            ObjectNode whole = schema.deepCopy();
            whole.set("components", description.path("components"));
            return registry.getSchema(whole.toString(), InputFormat.JSON);
        });
    }

    /** Every path of the description with its methods. */
    Map<String, List<String>> operations() {
        return StreamSupport.stream(description.path("paths").properties().spliterator(), false)
                .collect(Collectors.toMap(
                        Map.Entry::getKey,
                        entry -> entry.getValue().properties().stream()
                                .map(Map.Entry::getKey)
                                .toList()));
    }
}
