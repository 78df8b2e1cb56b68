package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.empty;
import static org.hamcrest.Matchers.endsWith;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.hasItems;

import com.fasterxml.jackson.databind.node.ObjectNode;
import io.restassured.response.ValidatableResponse;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.AfterParameterizedClassInvocation;
import org.junit.jupiter.params.BeforeParameterizedClassInvocation;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Change;
import org.treadwarm.store.Kind;
import org.treadwarm.store.Scope;
import org.treadwarm.store.SheetContent;

/** Issued sheets over HTTP. */
@ParameterizedClass
@EnumSource(Kind.class)
class SheetsApiTest {
    @Parameter
    Kind kind;

    private static RunningServer server;
    private static ApiClient api;

    @BeforeParameterizedClassInvocation
    static void start(Kind kind) {
        server = RunningServer.start(kind);
        api = new ApiClient(server);
    }

    @AfterParameterizedClassInvocation
    static void stop() {
        server.close();
    }

    private static ValidatableResponse issue(Job job, String body) {
        return api.json(Scope.WRITE, body).post("/jobs/{id}/sheets", job.id()).then();
    }

    private static String issued(Job job) {
        return issue(job, "{\"revision\": 1}").statusCode(201).extract().path("number");
    }

    private static Job job() {
        return server.job("yard", RunningServer.studio());
    }

    @Test
    void aSheetStandsAtItsLocationWithTheBytesItKeeps() {
        Job job = job();
        String number = issue(job, "{\"revision\": 1}")
                .statusCode(201)
                .header("Location", containsString("/api/v1/sheets/"))
                .body("jobId", equalTo(job.id()))
                .body("holds", equalTo(true))
                .body("issuedBy", equalTo("key tests"))
                .extract()
                .path("number");

        SheetContent kept = server.store().sheets().find(number).orElseThrow().content();
        String answer = api.with(Scope.READ)
                .get("/sheets/{number}", number)
                .then()
                .statusCode(200)
                .body("sheet.fingerprint", equalTo(kept.fingerprint()))
                .extract()
                .asString();
        assertThat(answer).endsWith(",\"survey\":" + kept.survey() + ",\"sizing\":" + kept.sizing() + "}");
        api.with(Scope.READ).get("/sheets").then().statusCode(200).body("sheets.number", hasItem(number));
        api.with(Scope.READ)
                .get("/sheets/{number}/verification", number)
                .then()
                .statusCode(200)
                .body("agrees", equalTo(true))
                .body("fingerprintHolds", equalTo(true))
                .body("differences", empty());
    }

    @Test
    void aNewSheetMayReplaceAnOldOne() {
        Job job = job();
        String first = issued(job);
        ObjectNode changed = RunningServer.studio();
        ((ObjectNode) changed.get("site")).put("outdoorTemperature", "-14 °C");
        server.desk().save(job.id(), 1, "yard", changed, Change.by("tests"));

        String order = "{\"revision\": 2, \"replaces\": \"" + first + "\"}";
        String second = issue(job, order).statusCode(201).extract().path("number");

        api.with(Scope.READ)
                .get("/sheets/{number}", first)
                .then()
                .body("sheet.replacedBy", equalTo(second))
                .body("sheet.holds", equalTo(false));
        issue(job, "{\"revision\": 1, \"replaces\": \"" + first + "\"}")
                .statusCode(409)
                .body("type", endsWith(":replaces"))
                .body("detail", containsString("already replaced by " + second));
        issue(job, "{\"revision\": 2}").statusCode(409).body("type", endsWith(":same-sheet"));
    }

    @Test
    void aWithdrawnSheetStaysAndSaysSo() {
        String number = issued(job());
        String path = "/sheets/" + number + "/withdrawal";

        api.json(Scope.WRITE, "{\"reason\": \" wrong house \"}")
                .post(path)
                .then()
                .statusCode(200)
                .body("withdrawal.reason", equalTo("wrong house"))
                .body("withdrawal.by", equalTo("key tests"));
        api.json(Scope.WRITE, "{\"reason\": \"again\"}").post(path).then().statusCode(409);
        api.with(Scope.READ)
                .get("/sheets/{number}", number)
                .then()
                .statusCode(200)
                .body("sheet.withdrawal.reason", equalTo("wrong house"));
    }

    @Test
    void aDraftIsRefusedWithItsProblems() {
        ObjectNode survey = RunningServer.studio();
        survey.remove("site");

        issue(server.job("draft", survey), "{\"revision\": 1}")
                .statusCode(422)
                .body("errors.pointer", contains("/site"));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            {}                                        | /revision
            {"revision": 0}                           | /revision
            {"revision": 1.5}                         | /revision
            {"revision": 1, "replaces": "the first"}  | /replaces
            {"revision": 1, "also": true}             | /also
            [1]                                       | /revision
            """)
    void anOrderThatCannotBeReadIsRefused(String body, String pointer) {
        issue(job(), body).statusCode(422).body("errors.pointer", hasItems(pointer));
    }

    @Test
    void whatIsNotThereIsMissing() {
        issue(job(), "{\"revision\": 2}").statusCode(404);
        for (String number : new String[] {"2020-0001", "nothing", "2020-00"}) {
            api.with(Scope.READ).get("/sheets/" + number).then().statusCode(404);
        }
        api.with(Scope.READ).get("/sheets/2020-0001/verification").then().statusCode(404);
        api.json(Scope.WRITE, "{\"reason\": \"wrong\"}")
                .post("/sheets/2020-0001/withdrawal")
                .then()
                .statusCode(404);
        api.json(Scope.WRITE, "{\"reason\": \" \"}")
                .post("/sheets/2020-0001/withdrawal")
                .then()
                .statusCode(422)
                .body("errors.pointer", contains("/reason"));
        assertThat(server.store().sheets().find("2020-0001")).isEqualTo(Optional.empty());
    }
}
