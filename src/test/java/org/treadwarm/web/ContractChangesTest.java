package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.intake.Document;

/**
 * The description of the API keeps what the kept one promises. The kept one, contract.json, is written anew, after an
 * addition that clients may rely on from now on, by this test with {@code -Dcontract.renew=true}; it refuses while anything
 * is broken.
 */
class ContractChangesTest {
    private static final Path KEPT = Path.of("src/test/resources/contract.json");

    private static ObjectNode served;

    @BeforeAll
    static void read() throws Exception {
        try (RunningServer server = RunningServer.start()) {
            HttpRequest request = HttpRequest.newBuilder(URI.create(server.origin() + "/api/v1/openapi.json"))
                    .build();
            served = (ObjectNode) Document.mapper()
                    .readTree(HttpClient.newHttpClient()
                            .send(request, BodyHandlers.ofByteArray())
                            .body());
        }
    }

    @Test
    void nothingPromisedIsBroken() throws IOException {
        if (Boolean.getBoolean("contract.renew") && !Files.exists(KEPT)) {
            Files.writeString(KEPT, withoutWords(served).toPrettyString() + "\n");
        }
        JsonNode kept = Document.mapper().readTree(Files.readString(KEPT));

        assertThat(ContractChanges.breaking(kept, served)).isEmpty();
        if (Boolean.getBoolean("contract.renew")) {
            Files.writeString(KEPT, withoutWords(served).toPrettyString() + "\n");
        }
    }

    /** Descriptions are for people and may change. */
    private static JsonNode withoutWords(JsonNode description) {
        ObjectNode copy = description.deepCopy();
        copy.remove("info");
        copy.findParents("description").forEach(parent -> {
            if (parent.path("description").isTextual()) {
                ((ObjectNode) parent).remove("description");
            }
        });
        copy.findParents("summary").forEach(parent -> {
            if (parent.path("summary").isTextual()) {
                ((ObjectNode) parent).remove("summary");
            }
        });
        return copy;
    }

    static Stream<Arguments> breaks() {
        return Stream.of(
                change("/api/v1/jobs was removed", d -> object(d, "/paths").remove("/api/v1/jobs")),
                change(
                        "post /api/v1/jobs was removed",
                        d -> object(d, "/paths/~1api~1v1~1jobs").remove("post")),
                change(
                        "get /api/v1/jobs parameter find was removed",
                        d -> ((ArrayNode) d.at("/paths/~1api~1v1~1jobs/get/parameters")).remove(0)),
                change(
                        "get /api/v1/jobs -> 200 was removed",
                        d -> object(d, "/paths/~1api~1v1~1jobs/get/responses").remove("200")),
                change(
                        "post /api/v1/jobs -> 201 header ETag was removed",
                        d -> object(d, "/paths/~1api~1v1~1jobs/post/responses/201/headers")
                                .remove("ETag")),
                change(
                        "post /api/v1/jobs now needs the parameter Idempotency-Key",
                        d -> object(d, "/paths/~1api~1v1~1jobs/post/parameters/0")
                                .put("required", true)),
                change(
                        "post /api/v1/jobs body.note is now required",
                        d -> ((ArrayNode)
                                        d.at(
                                                "/paths/~1api~1v1~1jobs/post/requestBody/content/application~1json/schema/required"))
                                .add("note")),
                change(
                        "post /api/v1/jobs body.name has a lower maxLength",
                        d -> object(
                                        d,
                                        "/paths/~1api~1v1~1jobs/post/requestBody/content/application~1json/schema/properties/name")
                                .put("maxLength", 20)),
                change(
                        "Survey.rooms was removed",
                        d -> object(d, "/components/schemas/Survey/properties").remove("rooms")),
                change(
                        "Health.method was removed",
                        d -> object(d, "/components/schemas/Health/properties").remove("method")),
                change(
                        "JobAnswer.revision changed its type from \"integer\" to \"string\"",
                        d -> object(d, "/components/schemas/JobAnswer/properties/revision")
                                .put("type", "string")),
                change(
                        "JobAnswer.draft is no longer always there",
                        d -> removeWord((ArrayNode) d.at("/components/schemas/JobAnswer/required"), "draft")));
    }

    private static Arguments change(String expected, Consumer<ObjectNode> change) {
        return Arguments.of(expected, change);
    }

    private static ObjectNode object(JsonNode description, String pointer) {
        return (ObjectNode) description.at(pointer);
    }

    private static void removeWord(ArrayNode list, String word) {
        for (int i = 0; i < list.size(); i++) {
            if (list.get(i).asText().equals(word)) {
                list.remove(i);
                return;
            }
        }
        throw new IllegalArgumentException(word);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("breaks")
    void seesWhatBreaksClients(String expected, Consumer<ObjectNode> change) {
        ObjectNode changed = served.deepCopy();
        change.accept(changed);

        assertThat(ContractChanges.breaking(served, changed)).contains(expected);
    }

    @Test
    void letsAdditionsPass() {
        ObjectNode changed = served.deepCopy();
        object(changed, "/paths").set("/api/v1/colours", object(changed, "/paths/~1api~1v1~1jobs"));
        object(changed, "/components/schemas/JobAnswer/properties")
                .putObject("colour")
                .put("type", "string");
        object(changed, "/components/schemas/Survey/properties")
                .putObject("colour")
                .put("type", "string");
        ((ArrayNode) changed.at("/paths/~1api~1v1~1jobs/get/parameters"))
                .addObject()
                .put("name", "sort")
                .put("in", "query");

        assertThat(ContractChanges.breaking(served, changed)).isEmpty();
        assertThat(ContractChanges.breaking(served, served)).isEmpty();
    }
}
