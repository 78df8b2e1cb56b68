package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.treadwarm.web.pages.ContractAnswers.Answer;
import org.treadwarm.web.pages.ContractTypes.Field;
import org.treadwarm.web.pages.ContractTypes.Term;

/** The description of the API as what its page shows. */
final class ContractView {
    private static final Set<String> METHODS = Set.of("get", "put", "post", "delete");
    private static final Pattern SCOPE = Pattern.compile("(?:S|else s)cope (size|read|write)\\.");

    private final JsonNode description;
    private final ContractTypes types;
    private final ContractAnswers answers;

    ContractView(JsonNode description) {
        this.description = description;
        this.types = new ContractTypes(description);
        List<JsonNode> calls = new ArrayList<>();
        eachCall((path, method, call) -> calls.add(call));
        this.answers = new ContractAnswers(calls, types);
    }

    /** What belongs together. */
    public record Subject(String name, String words, List<Call> calls) {}

    /**
     * A route.
     *
     * @param key what key it needs, in words
     * @param usual the statuses that are told once for all routes, in words
     */
    public record Call(
            String id,
            String method,
            String path,
            String words,
            String key,
            List<Field> parameters,
            Taken body,
            List<Answer> answers,
            String usual,
            String example) {
        /** The words up to where they go into detail. */
        public String briefly() {
            return words.split("[.;:,] ", 2)[0].replaceFirst("\\.$", "");
        }
    }

    /**
     * The body that a route takes.
     *
     * @param media its media type; empty for no body
     */
    public record Taken(String media, String words, List<Term> type, List<Field> fields) {}

    /** A document that is sent or answered. */
    public record Shown(String name, String words, List<Field> fields) {}

    /** The routes by subject. */
    List<Subject> subjects(String origin) {
        List<Subject> subjects = new ArrayList<>();
        for (JsonNode tag : description.path("tags")) {
            List<Call> calls = new ArrayList<>();
            eachCall((path, method, call) -> {
                if (call.at("/tags/0").equals(tag.path("name"))) {
                    calls.add(call(path, method, call, origin));
                }
            });
            subjects.add(new Subject(
                    tag.path("name").asText(), tag.path("description").asText(), calls));
        }
        return subjects;
    }

    /** Statuses that most routes answer with the same words. */
    List<Answer> usualAnswers() {
        return answers.usual();
    }

    /** Every document by its name. */
    List<Shown> documents() {
        return description.at("/components/schemas").properties().stream()
                .sorted(Map.Entry.comparingByKey())
                .map(each -> new Shown(
                        each.getKey(), each.getValue().path("description").asText(), types.fields(each.getValue())))
                .toList();
    }

    private interface EachCall {
        void see(String path, String method, JsonNode call);
    }

    private void eachCall(EachCall seen) {
        description
                .path("paths")
                .properties()
                .forEach(path -> path.getValue().properties().stream()
                        .filter(each -> METHODS.contains(each.getKey()))
                        .forEach(each -> seen.see(path.getKey(), each.getKey(), each.getValue())));
    }

    private Call call(String path, String method, JsonNode call, String origin) {
        List<JsonNode> parameters = new ArrayList<>();
        description.path("paths").path(path).path("parameters").forEach(parameters::add);
        call.path("parameters").forEach(parameters::add);
        Taken body = body(call.path("requestBody"));
        return new Call(
                call.path("operationId").asText(),
                method.toUpperCase(Locale.ROOT),
                path,
                call.path("summary").asText().replaceFirst(" Scope [a-z]+\\.", ""),
                keyWords(call),
                parameters.stream().map(this::parameter).toList(),
                body,
                answers.own(call),
                answers.usualOf(call),
                new ContractExample(
                                origin,
                                method,
                                path,
                                parameters,
                                body.media(),
                                !scope(call).isEmpty())
                        .text());
    }

    private static String scope(JsonNode call) {
        Matcher scope = SCOPE.matcher(call.path("summary").asText());
        return !call.path("security").isEmpty() && scope.find() ? scope.group(1) : "";
    }

    private static String keyWords(JsonNode call) {
        String scope = scope(call);
        if (scope.isEmpty()) {
            return "Needs no key.";
        }
        boolean withoutToo = call.at("/security/0").isEmpty();
        String least = "a key of the scope " + scope + (scope.equals("write") ? "" : " or wider");
        return withoutToo ? "Takes " + least + ", or none where that is said above." : "Needs " + least + ".";
    }

    private Field parameter(JsonNode parameter) {
        Field field = types.field(
                parameter.path("name").asText(),
                parameter.path("schema"),
                parameter.path("required").asBoolean());
        String bounds = field.words().isEmpty() ? "" : "; " + field.words();
        String description = parameter.path("description").asText().replaceFirst("\\.$", "");
        return field.saying(description + " (" + parameter.path("in").asText() + bounds + ")");
    }

    private Taken body(JsonNode body) {
        if (body.isMissingNode()) {
            return new Taken("", "", List.of(), List.of());
        }
        Map.Entry<String, JsonNode> content =
                body.path("content").properties().iterator().next();
        JsonNode schema = content.getValue().path("schema");
        String words =
                body.path("description").asText(schema.path("description").asText());
        return new Taken(
                content.getKey(), words, types.type(schema), schema.has("$ref") ? List.of() : types.fields(schema));
    }
}
