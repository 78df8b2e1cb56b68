package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.not;
import static org.hamcrest.Matchers.notNullValue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.restassured.response.ValidatableResponse;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.AfterParameterizedClassInvocation;
import org.junit.jupiter.params.BeforeParameterizedClassInvocation;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Kind;
import org.treadwarm.store.Scope;

/** Single rooms over HTTP: two in one room are told of each other, two in two rooms never notice. */
@ParameterizedClass
@EnumSource(Kind.class)
class RoomsApiTest {
    private static final int SAVES = 50;

    @Parameter
    Kind kind;

    private static RunningServer server;
    private static ApiClient api;

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
        ObjectNode survey = RunningServer.studio();
        ((ObjectNode) survey.get("rooms").get(1)).put("id", "shower-1");
        job = server.job("yard", survey);
    }

    private String path(String room) {
        return "/jobs/" + job.id() + "/rooms/" + room;
    }

    private ValidatableResponse get(String room) {
        return api.with(Scope.READ).get(path(room)).then();
    }

    private String tag(String room) {
        return get(room).statusCode(200).extract().header("ETag");
    }

    private ValidatableResponse put(String room, String match, JsonNode body) {
        return api.json(Scope.WRITE, body)
                .header("If-Match", match)
                .put(path(room))
                .then();
    }

    private ObjectNode room(int index) {
        return (ObjectNode) server.now(job).document().at("/rooms/" + index).deepCopy();
    }

    @Test
    void aRoomHasATagThatChangesWithItAlone() {
        String studio = tag("studio-1");
        String shower = tag("shower-1");

        String next = put("studio-1", studio, room(0).put("height", "3.3 m"))
                .statusCode(200)
                .body("revision", equalTo(2))
                .body("savedBy", equalTo("key tests"))
                .body("room.height", equalTo("3.3 m"))
                .extract()
                .header("ETag");

        assertThat(next).isNotEqualTo(studio).isEqualTo(tag("studio-1"));
        assertThat(tag("shower-1")).isEqualTo(shower);
        assertThat(server.desk().revision(job.id(), 1).orElseThrow().document()).isEqualTo(job.document());
    }

    @Test
    void aStaleSaveComesBackWithBothVersionsAndWhereTheyDiffer() {
        String seen = tag("studio-1");
        put("studio-1", seen, room(0).put("height", "3.3 m")).statusCode(200);

        ObjectNode mine = room(0).put("height", "2.2 m").put("remark", "behind the shed");
        put("studio-1", seen, mine)
                .statusCode(412)
                .header("ETag", tag("studio-1"))
                .body("yours.height", equalTo("2.2 m"))
                .body("requestId", notNullValue())
                .body("theirs.height", equalTo("3.3 m"))
                .body("differences.address", containsInAnyOrder("/height", "/remark"))
                .body("differences.find { it.address == '/height' }.before", equalTo("3.3 m"))
                .body("differences.find { it.address == '/height' }.after", equalTo("2.2 m"));
        assertThat(server.now(job).revision()).isEqualTo(2);

        put("studio-1", tag("studio-1"), mine).statusCode(200).body("revision", equalTo(3));
    }

    @Test
    void aStaleSaveWithoutIdsIsComparedByThoseThatItsPartsHad() {
        ObjectNode mine = room(0);
        mine.path("surfaces").forEach(surface -> ((ObjectNode) surface).remove("id"));
        put("studio-1", "\"other\"", mine.put("height", "2.2 m"))
                .statusCode(412)
                .body("differences.address", contains("/height"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"\"x\"", "W/\"x\"", "x", "\"\"", "1"})
    void savesNothingFromAnotherTag(String match) {
        put("studio-1", match, room(0)).statusCode(412);
        put("studio-1", "W/" + tag("studio-1"), room(0)).statusCode(412);
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void savesFromAnyTagOrOneOfAList() {
        put("studio-1", "*", room(0).put("height", "3.1 m")).statusCode(200);
        put("studio-1", "\"x\", " + tag("studio-1"), room(0).put("height", "3.2 m"))
                .statusCode(200);
    }

    @Test
    void needsToKnowWhatWasChanged() {
        api.json(Scope.WRITE, room(0)).put(path("studio-1")).then().statusCode(428);
        api.with(Scope.WRITE).delete(path("studio-1")).then().statusCode(428);
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void refusesAnotherIdAndWhatIsNoRoom() {
        String tag = tag("studio-1");
        put("studio-1", tag, room(0).put("id", "other"))
                .statusCode(422)
                .body("errors.pointer", contains("/id"))
                .body("errors[0].allowed", containsString("studio-1"));
        put("studio-1", tag, Document.mapper().createArrayNode()).statusCode(422);
        put("nosuchroom", tag, room(0)).statusCode(404);
        get("nosuchroom").statusCode(404);
        api.with(Scope.READ).get("/jobs/nosuchjob123/rooms/studio-1").then().statusCode(404);
    }

    @Test
    void aRoomWithProblemsMakesADraft() {
        put("studio-1", tag("studio-1"), room(0).put("height", "so high")).statusCode(200);

        assertThat(server.now(job).draft()).isTrue();
    }

    @Test
    void addsARoomUnderANewIdOrItsOwn() {
        ObjectNode attic = room(1).put("name", "attic");
        attic.remove("id");
        attic.path("surfaces").forEach(surface -> ((ObjectNode) surface).remove("id"));
        String at = "/jobs/" + job.id() + "/rooms";

        String id = api.json(Scope.WRITE, attic)
                .post(at)
                .then()
                .statusCode(201)
                .header("Location", not(equalTo("")))
                .extract()
                .path("id");
        get(id).statusCode(200).body("room.name", equalTo("attic"));
        api.json(Scope.WRITE, attic.put("name", "loft").put("id", "loft-9"))
                .post(at)
                .then()
                .statusCode(201);
        get("loft-9").statusCode(200);
        api.json(Scope.WRITE, attic).post(at).then().statusCode(422).body("errors.pointer", contains("/id"));
        api.json(Scope.WRITE, attic.put("id", "a b")).post(at).then().statusCode(422);
        api.json(Scope.WRITE, attic).post("/jobs/nosuchjob123/rooms").then().statusCode(422);
        attic.remove("id");
        api.json(Scope.WRITE, attic).post("/jobs/nosuchjob123/rooms").then().statusCode(404);
    }

    @Test
    void takesARoomOutUnlessItChangedMeanwhile() {
        String seen = tag("shower-1");
        put("shower-1", seen, room(1).put("height", "2.2 m")).statusCode(200);
        api.with(Scope.WRITE)
                .header("If-Match", seen)
                .delete(path("shower-1"))
                .then()
                .statusCode(412)
                .body("theirs.height", equalTo("2.2 m"));

        api.with(Scope.WRITE)
                .header("If-Match", tag("shower-1"))
                .delete(path("shower-1"))
                .then()
                .statusCode(200)
                .body("revision", equalTo(3));
        get("shower-1").statusCode(404);
    }

    @Test
    void twoInTwoRoomsNeverCollideAndEverySaveIsThere() throws Exception {
        ExecutorService threads = Executors.newFixedThreadPool(2);
        try {
            Future<List<Long>> one = threads.submit(saves("studio-1", room(0)));
            Future<List<Long>> other = threads.submit(saves("shower-1", room(1)));
            assertEachIsKept("studio-1", one.get());
            assertEachIsKept("shower-1", other.get());
        } finally {
            threads.shutdownNow();
        }
        assertThat(server.now(job).revision()).isEqualTo(2 * SAVES + 1);
    }

    private Callable<List<Long>> saves(String id, ObjectNode room) {
        return () -> {
            List<Long> revisions = new java.util.ArrayList<>();
            String tag = tag(id);
            for (int i = 0; i < SAVES; i++) {
                ValidatableResponse saved =
                        put(id, tag, room.put("remark", id + " " + i)).statusCode(200);
                tag = saved.extract().header("ETag");
                revisions.add(saved.extract().jsonPath().getLong("revision"));
            }
            return revisions;
        };
    }

    private void assertEachIsKept(String id, List<Long> revisions) {
        for (int i = 0; i < SAVES; i++) {
            JsonNode rooms = server.desk()
                    .revision(job.id(), revisions.get(i))
                    .orElseThrow()
                    .document()
                    .path("rooms");
            assertThat(rooms.path(id.equals("studio-1") ? 0 : 1).path("remark").asText())
                    .isEqualTo(id + " " + i);
        }
    }
}
