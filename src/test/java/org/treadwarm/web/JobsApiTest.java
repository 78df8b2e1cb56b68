package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.empty;
import static org.hamcrest.Matchers.endsWith;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.not;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.restassured.response.Response;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.AfterParameterizedClassInvocation;
import org.junit.jupiter.params.BeforeParameterizedClassInvocation;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.store.Kind;
import org.treadwarm.store.Scope;

/** Jobs over HTTP: every save a revision, and no save over somebody else's. */
@ParameterizedClass
@EnumSource(Kind.class)
class JobsApiTest {
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

    private static ObjectNode body(String name, JsonNode survey) {
        ObjectNode body = Document.mapper().createObjectNode().put("name", name);
        body.set("survey", survey);
        return body;
    }

    private static Response create(String name, JsonNode survey) {
        return api.json(Scope.WRITE, body(name, survey)).post("/jobs");
    }

    private static String idOf(Response created) {
        return created.then().statusCode(201).extract().path("id");
    }

    private static ValidatableResponse put(String id, String match, JsonNode body) {
        return api.json(Scope.WRITE, body)
                .header("If-Match", match)
                .put("/jobs/{id}", id)
                .then();
    }

    private static ValidatableResponse get(String path, Object... values) {
        return api.with(Scope.READ).get(path, values).then();
    }

    private static JsonNode survey(ValidatableResponse response) throws NotJsonException {
        return Document.read(response.extract().asByteArray()).path("survey");
    }

    @Test
    void aNewJobIsRevisionOneAtItsLocation() {
        Response created = create("yard", RunningServer.studio());
        String id = idOf(created);

        created.then()
                .header("Location", endsWith("/api/v1/jobs/" + id))
                .header("ETag", "\"1\"")
                .body("revision", equalTo(1))
                .body("draft", equalTo(false))
                .body("name", equalTo("yard"))
                .body("savedBy", equalTo("key tests"))
                .body("problems", empty());
        get("/jobs/{id}", id).statusCode(200).header("ETag", "\"1\"").body("id", equalTo(id));
        get("/jobs").statusCode(200).body("jobs.id", hasItem(id));
    }

    @Test
    void everySaveIsTheNextRevisionUnderANewTag() {
        String id = idOf(create("yard", RunningServer.studio()));

        put(id, "\"1\"", body("yard, again", RunningServer.studio()))
                .statusCode(200)
                .header("ETag", "\"2\"")
                .body("revision", equalTo(2))
                .body("name", equalTo("yard, again"));
        get("/jobs/{id}", id).header("ETag", "\"2\"");
        get("/jobs/{id}/revisions", id).statusCode(200).body("revisions.revision", contains(2, 1));
        get("/jobs/{id}/revisions/{n}", id, 1).statusCode(200).body("name", equalTo("yard"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"\"1\"", "\"3\"", "\"x\"", "W/\"2\"", "\"-1\"", "\"99999999999999999999\""})
    void savesNothingFromAnotherRevision(String match) {
        String id = idOf(create("yard", RunningServer.studio()));
        put(id, "\"1\"", body("second", RunningServer.studio())).statusCode(200);

        put(id, match, body("third", RunningServer.studio())).statusCode(412).header("ETag", "\"2\"");
        get("/jobs/{id}", id).body("name", equalTo("second")).body("revision", equalTo(2));
    }

    @Test
    void savesNothingWithoutTheRevision() {
        String id = idOf(create("yard", RunningServer.studio()));

        api.json(Scope.WRITE, body("second", RunningServer.studio()))
                .put("/jobs/{id}", id)
                .then()
                .statusCode(428);
        get("/jobs/{id}", id).body("revision", equalTo(1));
    }

    @Test
    void aSurveyWithProblemsIsKeptAsADraftAndSaysSo() {
        ObjectNode survey = RunningServer.studio();
        survey.putObject("site");
        String id = idOf(create("unfinished", survey));

        get("/jobs/{id}", id)
                .body("draft", equalTo(true))
                .body("problems.pointer", hasItem("/site/outdoorTemperature"))
                .body("survey.rooms.name", contains("studio", "shower room"));
        get("/jobs/{id}/sizing", id).statusCode(422).body("errors.pointer", hasItem("/site/outdoorTemperature"));
        get("/jobs").body("jobs.find { it.id == '" + id + "' }.draft", equalTo(true));
    }

    @ParameterizedTest
    @ValueSource(strings = {"*", "\"zz\", \"1\"", "\"1\""})
    void savesFromAnyTagThatNamesTheRevision(String match) {
        String id = idOf(create("first", RunningServer.studio()));

        put(id, match, body("second", RunningServer.studio())).statusCode(200).header("ETag", "\"2\"");
    }

    @Test
    void sizesTheNewestRevision() {
        String id = idOf(create("yard", RunningServer.studio()));

        get("/jobs/{id}/sizing", id)
                .statusCode(200)
                .header("ETag", "\"1\"")
                .body("rooms.name", contains("studio", "shower room"));
    }

    @Test
    void partsKeepTheIdsThatTheyWereGiven() throws NotJsonException {
        String id = idOf(create("yard", RunningServer.studio()));
        JsonNode first = survey(get("/jobs/{id}", id));
        ObjectNode swapped = RunningServer.studio();
        ArrayNode rooms = (ArrayNode) swapped.get("rooms");
        rooms.add(rooms.remove(0));

        put(id, "1", body("yard", swapped)).statusCode(200);

        JsonNode second = survey(get("/jobs/{id}", id));
        assertThat(first.at("/rooms/1/id").asText()).isNotEmpty();
        assertThat(second.at("/rooms/0")).isEqualTo(first.at("/rooms/1"));
        assertThat(second.at("/rooms/1")).isEqualTo(first.at("/rooms/0"));
    }

    @Test
    void whatWasTypedComesBackToTheLetter() throws NotJsonException {
        ObjectNode survey = RunningServer.studio();
        String id = idOf(create("yard", survey));

        JsonNode kept = survey(get("/jobs/{id}", id));

        assertThat(kept.at("/rooms/0/surfaces/1/width").textValue()).isEqualTo("22' 11 5/8\"");
        assertThat(kept.at("/assemblies")).isEqualTo(survey.at("/assemblies"));
        assertThat(kept.at("/site")).isEqualTo(survey.at("/site"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"Dämmung im Hof №7", "庭の工房", "🏠 house", "a\"b\\c/d<e>&'", "${7*7}", "  spaced  "})
    void takesNamesInAnyScript(String name) {
        String id = idOf(create(name, RunningServer.studio()));

        get("/jobs/{id}", id).statusCode(200).body("name", equalTo(name.strip()));
    }

    @Test
    void refusesNamesThatCannotBeUsed() {
        create("x".repeat(200), RunningServer.studio()).then().statusCode(201);
        for (String name : new String[] {"", "   ", "x".repeat(201), "two\nlines", "nul\u0000"}) {
            create(name, RunningServer.studio()).then().statusCode(422).body("errors.pointer", contains("/name"));
        }
        api.json(Scope.WRITE, "{\"name\": \"half \\ud83c of one\", \"survey\": {}}")
                .post("/jobs")
                .then()
                .statusCode(400)
                .body("errors.pointer", contains("/name"));
    }

    @Test
    void tellsAllThatIsWrongWithABody() {
        api.json(Scope.WRITE, "{\"name\": 5, \"survey\": [], \"more\": 1}")
                .post("/jobs")
                .then()
                .statusCode(422)
                .body("errors.pointer", containsInAnyOrder("/name", "/survey", "/more"));
        api.json(Scope.WRITE, "[]").post("/jobs").then().statusCode(422);
        api.json(Scope.WRITE, "{\"name\"").post("/jobs").then().statusCode(400);
        api.with(Scope.WRITE)
                .contentType("text/plain")
                .body("{}")
                .post("/jobs")
                .then()
                .statusCode(415);
    }

    @Test
    void keepsDraftsOfAnyShape() throws NotJsonException {
        for (String odd : new String[] {
            "{}", "{\"rooms\": {\"a\": 1}}", "{\"rooms\": [1, null, {\"id\": 5}]}", "{\"site\": [], \"x\": null}"
        }) {
            JsonNode survey = Document.read(odd.getBytes(java.nio.charset.StandardCharsets.UTF_8));
            String id = idOf(create("odd", survey));

            assertThat(survey(get("/jobs/{id}", id))).isEqualTo(survey);
            get("/jobs/{id}/sizing", id).statusCode(422).body("errors", not(empty()));
        }
    }

    @ParameterizedTest
    @CsvSource({
        "/jobs/nosuchjob123",
        "/jobs/nosuchjob123/sizing",
        "/jobs/nosuchjob123/revisions",
        "/jobs/nosuchjob123/revisions/1",
        "/jobs/.%20."
    })
    void saysThatAJobIsMissing(String path) {
        api.with(Scope.READ).urlEncodingEnabled(false).get(path).then().statusCode(404);
    }

    @ParameterizedTest
    @ValueSource(strings = {"2", "0", "-1", "x", "99999999999999999999"})
    void saysThatARevisionIsMissing(String number) {
        String id = idOf(create("yard", RunningServer.studio()));

        get("/jobs/{id}/revisions/{n}", id, number).statusCode(404);
    }

    @Test
    void aPutToAMissingJobMakesNone() {
        put("nosuchjob123", "\"1\"", body("yard", RunningServer.studio())).statusCode(404);
    }

    @Test
    void scopesReachAsFarAsTheySay() {
        String id = idOf(create("yard", RunningServer.studio()));
        ObjectNode body = body("yard", RunningServer.studio());

        for (String path :
                new String[] {"/jobs", "/jobs/" + id, "/jobs/" + id + "/sizing", "/jobs/" + id + "/revisions"}) {
            api.with(Scope.SIZE).get(path).then().statusCode(403);
            api.with(Scope.READ).get(path).then().statusCode(200);
            api.with(Scope.WRITE).get(path).then().statusCode(200);
            api.anyone().get(path).then().statusCode(401);
        }
        for (Scope scope : new Scope[] {Scope.SIZE, Scope.READ}) {
            api.json(scope, body).post("/jobs").then().statusCode(403);
            api.json(scope, body)
                    .header("If-Match", "\"1\"")
                    .put("/jobs/" + id)
                    .then()
                    .statusCode(403);
            api.json(scope, RunningServer.studio()).post("/sizings").then().statusCode(200);
        }
        get("/jobs/{id}", id).body("revision", equalTo(1));
    }
}
