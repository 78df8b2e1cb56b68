package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.empty;
import static org.hamcrest.Matchers.endsWith;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasSize;
import static org.hamcrest.Matchers.notNullValue;
import static org.hamcrest.Matchers.nullValue;

import com.fasterxml.jackson.databind.node.ObjectNode;
import io.restassured.response.Response;
import io.restassured.specification.RequestSpecification;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.AfterParameterizedClassInvocation;
import org.junit.jupiter.params.BeforeParameterizedClassInvocation;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Change;
import org.treadwarm.store.Kind;
import org.treadwarm.store.Scope;
import org.treadwarm.web.csv.TableFile;

/** Tables into a job and out of it over the API. */
@ParameterizedClass
@EnumSource(Kind.class)
class TablesApiTest {
    private static final String HIGHER = "room,height [m]\nstudio,3.3\nattic,2.1\n";

    private static RunningServer server;
    private static ApiClient api;

    @Parameter
    Kind kind;

    private Job job;

    @BeforeParameterizedClassInvocation
    static void start(Kind kind) {
        server = RunningServer.start(kind);
        api = new ApiClient(server);
    }

    @AfterParameterizedClassInvocation
    static void stop() {
        server.close();
    }

    @BeforeEach
    void fresh() {
        job = server.job("yard", RunningServer.studio());
    }

    private static RequestSpecification table(Object body) {
        RequestSpecification request = api.with(Scope.WRITE).contentType("text/csv");
        return body instanceof byte[] bytes ? request.body(bytes) : request.body(body.toString());
    }

    private Response send(RequestSpecification request, String match) {
        return request.header("If-Match", match).post("/jobs/{id}/tables/rooms", job.id());
    }

    private long revision() {
        return server.now(job).revision();
    }

    @Test
    void keepsATableAsOneRevision() {
        Response saved = send(table(HIGHER), "\"1\"");

        saved.then()
                .statusCode(200)
                .header("ETag", "\"2\"")
                .header("Location", "/api/v1/jobs/" + job.id())
                .body("id", equalTo(job.id()))
                .body("revision", equalTo(2))
                .body("kept", equalTo(true))
                .body("draft", equalTo(true))
                .body("changes", hasSize(2))
                .body("changes[0].address", equalTo("/rooms/studio-1/height"))
                .body("changes[0].label", equalTo("rooms › studio › room height"))
                .body("changes[0].before", notNullValue())
                .body("changes[0].after", equalTo("3.3\u00a0m"))
                .body("changes[1].before", nullValue());
        Job now = server.now(job);
        assertThat(now.note()).isEqualTo("rooms from a table");
        assertThat(now.savedBy()).isEqualTo("key tests");
        assertThat(now.document().at("/rooms/0/height").textValue()).isEqualTo("3.3\u00a0m");
        assertThat(saved.<String>path("changes[1].address"))
                .isEqualTo("/rooms/" + now.document().at("/rooms/2/id").textValue());
    }

    @Test
    void aPreviewTellsTheSameAndKeepsNothing() throws IOException {
        send(table(HIGHER).queryParam("preview", true), "\"1\"")
                .then()
                .statusCode(200)
                .header("ETag", "\"1\"")
                .header("Location", nullValue())
                .body("revision", equalTo(1))
                .body("kept", equalTo(false))
                .body("draft", equalTo(true))
                .body("changes", hasSize(2))
                .body("changes[0].after", equalTo("3.3\u00a0m"));
        assertThat(revision()).isEqualTo(1);
        send(table(HIGHER).queryParam("preview", "yes"), "\"1\"")
                .then()
                .statusCode(422)
                .body("errors[0].pointer", equalTo("/preview"));
        RawAnswer garbled = new RawRequest(
                        "POST",
                        "/api/v1/jobs/" + job.id() + "/tables/rooms?preview=%zz",
                        List.of("Host: 127.0.0.1", "Authorization: Bearer " + server.key(Scope.WRITE)),
                        HIGHER)
                .header("Content-Type", "text/csv")
                .header("If-Match", "*")
                .sendTo(server);
        assertThat(garbled.status()).isEqualTo(422);
        assertThat(revision()).isEqualTo(1);
    }

    @Test
    void whatGoesOutComesInWithoutARevision() {
        for (String table : new String[] {"rooms", "openings"}) {
            Response out = api.with(Scope.READ).get("/jobs/{id}/tables/" + table, job.id());
            out.then()
                    .statusCode(200)
                    .header("Content-Type", "text/csv; charset=utf-8")
                    .header("Content-Disposition", endsWith(table + ".csv\""));

            table(out.asByteArray())
                    .header("If-Match", out.header("ETag"))
                    .post("/jobs/{id}/tables/" + table, job.id())
                    .then()
                    .statusCode(200)
                    .body("kept", equalTo(false))
                    .body("draft", equalTo(false))
                    .body("changes", empty());
        }
        assertThat(revision()).isEqualTo(1);
    }

    @ParameterizedTest
    @ValueSource(strings = {"room;height [m]\nstudio;3,3\n", "\uFEFFroom\theight [m]\r\nstudio\t3.3\r\n"})
    void takesOtherSeparatorsAndAByteOrderMark(String text) {
        send(table(text), "*").then().statusCode(200).body("changes", hasSize(1));
        assertThat(revision()).isEqualTo(2);
    }

    @Test
    void wantsToKnowWhatTheTableWasMadeFrom() {
        table(HIGHER).post("/jobs/{id}/tables/rooms", job.id()).then().statusCode(428);
        server.desk().save(job.id(), 1, "yard two", job.document(), Change.by("Ben"));
        for (boolean preview : new boolean[] {true, false}) {
            send(table(HIGHER).queryParam("preview", preview), "\"1\"")
                    .then()
                    .statusCode(412)
                    .header("ETag", "\"2\"");
        }
        assertThat(revision()).isEqualTo(2);
    }

    @Test
    void tellsEveryBadCellAndKeepsNothingOfTheTable() {
        String table = "room,height [m],floor area [m2]\nstudio,3.3,\n,2.1,\nattic,so high,-4\n";
        for (boolean preview : new boolean[] {true, false}) {
            send(table(table).queryParam("preview", preview), "\"1\"")
                    .then()
                    .statusCode(422)
                    .contentType("application/problem+json")
                    .body("type", equalTo("urn:treadwarm:problem:table"))
                    .body("requestId", notNullValue())
                    .body("errors.row", equalTo(List.of(3, 4, 4)))
                    .body("errors.pointer", containsInAnyOrder("/3/room", "/4/room height", "/4/floor area"))
                    .body("errors.given", containsInAnyOrder("", "so high", "-4"))
                    .body("errors.column", containsInAnyOrder("room", "room height", "floor area"));
        }
        assertThat(revision()).isEqualTo(1);
    }

    @Test
    void refusesCellsThatCannotBeKept() {
        send(table("room,remark\nstudio,\"a\0b\"\n"), "*")
                .then()
                .statusCode(422)
                .body("errors[0].pointer", equalTo("/2/remark"));
        send(table("room,remark\nstudio," + "x".repeat(10_001) + "\n"), "*")
                .then()
                .statusCode(422)
                .body("errors[0].allowed", containsString("at most 10000 characters"));
        assertThat(revision()).isEqualTo(1);
    }

    @Test
    void refusesWhatIsNoTextInUtf8() {
        send(table("room,remark\nstudio,K\u00fcche\n".getBytes(StandardCharsets.ISO_8859_1)), "*")
                .then()
                .statusCode(400)
                .body("type", endsWith("not-utf-8"))
                .body("detail", containsString("Save the table as CSV in UTF-8"));
        send(table(HIGHER.getBytes(StandardCharsets.UTF_16)), "*").then().statusCode(400);
        send(table("room,remark\nstudio,K\u00fcche\n".getBytes(StandardCharsets.UTF_8)), "*")
                .then()
                .statusCode(200);
        assertThat(server.now(job).document().at("/rooms/0/remark").textValue()).isEqualTo("K\u00fcche");
    }

    @ParameterizedTest
    @ValueSource(strings = {"application/json", "text/plain", "text/csv; charset=iso-8859-1", "text/csvx"})
    void refusesOtherTypes(String type) {
        send(api.with(Scope.WRITE).contentType(type).body(HIGHER.getBytes(StandardCharsets.UTF_8)), "*")
                .then()
                .statusCode(415)
                .body("detail", containsString("Content-Type: text/csv"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"text/csv; charset=utf-8", "TEXT/CSV;charset=\"UTF-8\"; header=present"})
    void takesTheTypeHoweverItIsWritten(String type) {
        send(api.with(Scope.WRITE).contentType(type).body(HIGHER.getBytes(StandardCharsets.UTF_8)), "*")
                .then()
                .statusCode(200);
    }

    @Test
    void refusesATableThatIsTooLarge() {
        send(table("x".repeat(TableFile.LARGEST + 1)), "*")
                .then()
                .statusCode(413)
                .body("detail", containsString("2 MiB"));
        send(table("room\n" + "a\n".repeat(2001)), "*")
                .then()
                .statusCode(422)
                .body("errors[0].allowed", containsString("up to 2000 rows"))
                .body("errors[0].column", nullValue())
                .body("errors[0].pointer", equalTo("/1"));
    }

    @Test
    void isSavedOnceUnderOneName() {
        Response first = send(table(HIGHER).header("Idempotency-Key", "table-" + job.id()), "\"1\"");
        first.then().statusCode(200).header("Idempotency-Replayed", nullValue());

        Response again = send(table(HIGHER).header("Idempotency-Key", "table-" + job.id()), "\"1\"");

        again.then().statusCode(200).header("Idempotency-Replayed", "true").header("ETag", "\"2\"");
        assertThat(again.asString()).isEqualTo(first.asString());
        assertThat(revision()).isEqualTo(2);
        send(table("room\nbarn\n").header("Idempotency-Key", "table-" + job.id()), "\"1\"")
                .then()
                .statusCode(422)
                .body("type", endsWith("idempotency-key"));
    }

    @Test
    void aKeyMustReachAsFar() {
        for (Scope scope : new Scope[] {Scope.SIZE, Scope.READ}) {
            api.with(scope)
                    .contentType("text/csv")
                    .body(HIGHER)
                    .header("If-Match", "*")
                    .post("/jobs/{id}/tables/rooms", job.id())
                    .then()
                    .statusCode(403);
        }
        api.anyone().get("/jobs/{id}/tables/rooms", job.id()).then().statusCode(401);
        api.with(Scope.SIZE).get("/jobs/{id}/tables/rooms", job.id()).then().statusCode(403);
    }

    @Test
    void givesTheResultsOfAJobThatIsNoDraft() {
        String results =
                api.with(Scope.READ).get("/jobs/{id}/tables/results", job.id()).asString();
        assertThat(results).startsWith("\uFEFFroom,verdict,").contains("\r\nstudio,");
        ObjectNode draft = RunningServer.studio();
        ((ObjectNode) draft.at("/rooms/0")).put("height", "so high");
        api.with(Scope.READ)
                .get("/jobs/{id}/tables/results", server.job("draft", draft).id())
                .then()
                .statusCode(422)
                .body("errors[0].pointer", equalTo("/rooms/0/height"));
    }

    @Test
    void knowsNoOtherTables() {
        api.with(Scope.READ).get("/jobs/{id}/tables/walls", job.id()).then().statusCode(404);
        api.with(Scope.READ).get("/jobs/nosuchjob222/tables/rooms").then().statusCode(404);
        for (String path : new String[] {job.id() + "/tables/results", "nosuchjob222/tables/rooms"}) {
            table(HIGHER).header("If-Match", "*").post("/jobs/" + path).then().statusCode(404);
        }
    }
}
