package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.treadwarm.intake.Document;
import org.treadwarm.store.Scope;

/** Many surveys in one request. */
class BatchApiTest {
    private static RunningServer server;
    private static ApiClient api;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        api = new ApiClient(server);
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    @Test
    void answersEachSurveyInItsPlaceAsIfItStoodAlone() throws Exception {
        ObjectNode body = Document.mapper().createObjectNode();
        ArrayNode surveys = body.putArray("surveys");
        for (int i = 0; i < 150; i++) {
            ObjectNode survey = RunningServer.studio();
            if (i % 3 == 1) {
                survey.remove("site");
            }
            if (i % 3 == 2) {
                survey.withObject("/site").put("outdoorTemperature", -i + " °C");
            }
            surveys.add(survey);
        }

        JsonNode answers = Document.read(api.json(Scope.SIZE, body)
                        .post("/sizings/batch")
                        .then()
                        .statusCode(200)
                        .extract()
                        .asByteArray())
                .path("answers");

        assertThat(answers).hasSize(150);
        for (int i = 0; i < 150; i += 7) {
            var alone = api.json(Scope.SIZE, surveys.get(i)).post("/sizings");
            JsonNode answer = answers.get(i);
            assertThat(answer.path("status").intValue()).isEqualTo(alone.statusCode());
            JsonNode expected = Document.read(alone.asByteArray());
            ((ObjectNode) expected).remove("requestId");
            assertThat(answer.path(alone.statusCode() == 200 ? "sizing" : "problem"))
                    .isEqualTo(expected);
        }
    }

    @Test
    void oddEntriesGetTheirProblemInTheirPlace() {
        api.json(Scope.SIZE, "{\"surveys\": [1, null, [], {}]}")
                .post("/sizings/batch")
                .then()
                .statusCode(200)
                .body("answers.status", equalTo(java.util.List.of(422, 422, 422, 422)));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "[]|",
                "{}|/surveys",
                "{\"surveys\": {}}|/surveys",
                "{\"surveys\": []}|/surveys",
                "{\"surveys\": [{}], \"rooms\": 1}|/rooms"
            })
    void refusesWhatIsNoBatch(String body, String pointer) {
        api.json(Scope.SIZE, body)
                .post("/sizings/batch")
                .then()
                .statusCode(422)
                .body("errors.pointer", hasItem(pointer == null ? "" : pointer));
    }

    @Test
    void refusesMoreThanAThousand() {
        String body = "{\"surveys\": [" + "{},".repeat(1000) + "{}]}";

        api.json(Scope.SIZE, body)
                .post("/sizings/batch")
                .then()
                .statusCode(422)
                .body("errors[0].given", equalTo("1001 surveys"));
    }
}
