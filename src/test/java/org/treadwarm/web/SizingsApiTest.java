package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.empty;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.everyItem;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.not;
import static org.hamcrest.Matchers.notNullValue;
import static org.hamcrest.Matchers.nullValue;
import static org.hamcrest.Matchers.startsWith;

import com.fasterxml.jackson.databind.node.ObjectNode;
import io.restassured.path.json.JsonPath;
import io.restassured.path.json.config.JsonPathConfig;
import io.restassured.path.json.config.JsonPathConfig.NumberReturnType;
import io.restassured.response.ValidatableResponse;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.store.Scope;

/** The answers that keep nothing, over HTTP. */
class SizingsApiTest {
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

    private static JsonPath exact(ValidatableResponse response) {
        return JsonPath.from(response.extract().asString())
                .using(JsonPathConfig.jsonPathConfig().numberReturnType(NumberReturnType.DOUBLE));
    }

    private static ValidatableResponse size(Object survey) {
        return api.json(Scope.SIZE, survey).post("/sizings").then();
    }

    private static ValidatableResponse evaluate(String assembly) {
        return api.json(Scope.SIZE, assembly).post("/assemblies/evaluations").then();
    }

    private static ObjectNode room(ObjectNode survey, int index) {
        return (ObjectNode) survey.get("rooms").get(index);
    }

    @Test
    void answersASizingWithTheRoomsInOrder() {
        ValidatableResponse response = size(RunningServer.studio()).statusCode(200);

        response.body("rooms.name", contains("studio", "shower room"))
                .body("rooms[0].heatLoss.paths.name", hasItem("north wall"))
                .body("rooms[0].floor.limits.governs", hasItem(true))
                .body("rooms[0].floor.limits.source", everyItem(not(empty())))
                .body("spaces.name", contains("loft"))
                .body("method.version", equalTo("1"));
        JsonPath answer = exact(response);
        assertThat(answer.getDouble("rooms[0].floor.carryingFlux") - answer.getDouble("rooms[0].floor.requiredFlux"))
                .isCloseTo(answer.getDouble("rooms[0].floor.margin"), within(1e-9));
        assertThat(answer.getDouble("rooms[0].heatLoss.total") + answer.getDouble("rooms[1].heatLoss.total"))
                .isCloseTo(answer.getDouble("total.heatLoss"), within(1e-9));
    }

    @Test
    void leavesOutWhatDoesNotExist() {
        ObjectNode survey = RunningServer.studio();
        room(survey, 0).remove(List.of("heatedFloor", "junctions"));

        String text = size(survey)
                .statusCode(200)
                .body("rooms[0].floor", equalTo(java.util.Map.of("verdict", "no heated floor")))
                .body("spaces[0].containsKey('fromFloorAbove')", equalTo(false))
                .extract()
                .asString();
        assertThat(text).doesNotContain("null", "NaN", "Infinity");
    }

    @Test
    void tellsAllProblemsAtOnceWithTheirAddresses() {
        ObjectNode survey = RunningServer.studio();
        room(survey, 0).put("height", "-3 m");
        room(survey, 0).remove("floorArea");
        room(survey, 1).put("colour", "red");
        ((ObjectNode) survey.get("site")).put("outdoorTemperature", "cold");

        size(survey)
                .statusCode(422)
                .contentType("application/problem+json")
                .body("status", equalTo(422))
                .body(
                        "errors.pointer",
                        containsInAnyOrder(
                                "/site/outdoorTemperature", "/rooms/0/height", "/rooms/0/floorArea", "/rooms/1/colour"))
                .body("errors.message", everyItem(not(empty())))
                .body("errors.find { it.pointer == '/rooms/0/height' }.given", equalTo("-3 m"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", " ", "{", "{\"site\": 1} {}", "{\"site\": 1, \"site\": 2}", "{\"a\": NaN}", "\u0000", "[01]"
            })
    void refusesWhatIsNoJson(String text) {
        api.json(Scope.SIZE, text)
                .post("/sizings")
                .then()
                .statusCode(400)
                .contentType("application/problem+json")
                .body("errors.message", everyItem(not(empty())));
    }

    @ParameterizedTest
    @ValueSource(strings = {"[]", "5", "null", "\"text\"", "{}", "{\"rooms\": {}}", "{\"rooms\": [1], \"site\": []}"})
    void refusesJsonThatIsNoSurvey(String text) {
        size(text).statusCode(422).body("errors", not(empty()));
    }

    @Test
    void readsAtMostTwoMebibytes() {
        String most = "\"" + "x".repeat(8000) + "\",";
        String large = "[" + most.repeat(2 * 1024 * 1024 / most.length() + 1) + "1]";

        size(large).statusCode(413).contentType("application/problem+json");
    }

    @ParameterizedTest
    @ValueSource(strings = {"text/plain", "application/x-www-form-urlencoded", "text/json", "application/xml"})
    void readsOnlyWhatIsDeclaredAsJson(String type) {
        api.with(Scope.SIZE)
                .contentType(type)
                .body(RunningServer.studio().toString())
                .post("/sizings")
                .then()
                .statusCode(415);
    }

    @ParameterizedTest
    @ValueSource(strings = {"Bearer nonsense", "Bearer ", "Basic dHc6dHc=", "tw_x", "Bearer tw_\u00e9"})
    void asksForAKeyThatIsKnown(String header) {
        api.anyone()
                .header("Authorization", header)
                .get("/materials")
                .then()
                .statusCode(401)
                .header("WWW-Authenticate", startsWith("Bearer"))
                .contentType("application/problem+json");
    }

    @Test
    void asksForAKey() {
        api.anyone()
                .contentType("application/json")
                .body("{}")
                .post("/sizings")
                .then()
                .statusCode(401)
                .header("WWW-Authenticate", startsWith("Bearer"));
    }

    @Test
    void aKeyThatWasRevokedEndsSoon() {
        var key = server.store().keys().create("short", Scope.SIZE, "tests");
        server.store().keys().revoke(key.key().id(), "tests");

        api.anyone()
                .header("Authorization", "Bearer " + key.token())
                .get("/materials")
                .then()
                .statusCode(401);
    }

    @ParameterizedTest
    @CsvSource({"GET, /sizings", "DELETE, /sizings", "PUT, /materials", "POST, /health", "PATCH, /jobs"})
    void saysWhichMethodsAreNotServed(String method, String path) {
        api.with(Scope.WRITE).request(method, path).then().statusCode(405).contentType("application/problem+json");
    }

    @ParameterizedTest
    @ValueSource(strings = {"/nothing", "/jobs/a/b/c/d", "/sizings/1", "/materials/oak"})
    void saysThatNothingIsThere(String path) {
        api.with(Scope.WRITE).get(path).then().statusCode(404).contentType("application/problem+json");
    }

    @ParameterizedTest
    @ValueSource(strings = {"quillfen.example", "127.0.0.1.quillfen.example", "127.0.0.2:80", "localhost.", "[::2]"})
    void answersOnlyToItsOwnNames(String host) {
        api.with(Scope.SIZE)
                .header("Host", host)
                .get("/materials")
                .then()
                .statusCode(421)
                .contentType("application/problem+json");
    }

    @Test
    void needsNoKeyForHealthAndDescription() {
        api.anyone().get("/health").then().statusCode(200).body("status", equalTo("ok"));
        api.anyone().get("/openapi.json").then().statusCode(200).body("openapi", startsWith("3.1"));
    }

    @Test
    void evaluatesABridgedWall() {
        ValidatableResponse response = evaluate("""
                {"layers": [
                  {"name": "board", "thickness": "12.5 mm", "conductivity": "0.25 W/(m.K)"},
                  {"name": "wool", "thickness": "140 mm", "conductivity": "0.037 W/(m.K)",
                   "bridging": {"share": "12 %", "conductivity": "0.13 W/(m.K)"}},
                  {"name": "sheathing", "thickness": "12 mm", "conductivity": "0.13 W/(m.K)"}]}""").statusCode(200);
        JsonPath answer = exact(response);
        // By hand, ISO 6946: paths side by side, and layers averaged.
        double films = 0.13 + 0.04;
        double plain = films + 0.0125 / 0.25 + 0.012 / 0.13;
        double upper = 1 / (0.88 / (plain + 0.14 / 0.037) + 0.12 / (plain + 0.14 / 0.13));
        double lower = plain + 0.14 / (0.88 * 0.037 + 0.12 * 0.13);

        assertThat(answer.getDouble("upperLimit")).isCloseTo(upper, within(1e-9));
        assertThat(answer.getDouble("lowerLimit")).isCloseTo(lower, within(1e-9));
        assertThat(answer.getDouble("resistance")).isCloseTo((upper + lower) / 2, within(1e-9));
        assertThat(answer.getDouble("uValue")).isCloseTo(2 / (upper + lower), within(1e-9));
        assertThat(answer.getDouble("temperatureFactor")).isBetween(0.7, 1.0);
        List<Double> temperatures = answer.getList("interfaces.temperature", Double.class);
        assertThat(temperatures).hasSizeGreaterThan(3).isSortedAccordingTo((a, b) -> Double.compare(b, a));
    }

    @Test
    void evaluatesAComponentOfKnownUValue() {
        assertThat(exact(evaluate("{\"uValue\": \"1.4 W/(m2.K)\"}").statusCode(200))
                        .getDouble("uValue"))
                .isCloseTo(1.4, within(1e-12));
    }

    @Test
    void refusesAnAssemblyWithItsProblems() {
        evaluate("{\"layers\": [{\"thickness\": \"0 mm\", \"conductivity\": \"0.04 W/(m.K)\"}, {}], \"to\": \"mars\"}")
                .statusCode(422)
                .body("errors.pointer", hasItem("/layers/0/thickness"))
                .body("errors.pointer", hasItem(startsWith("/layers/1")));
        evaluate("{}").statusCode(422);
        evaluate("[]").statusCode(422);
    }

    @Test
    void findsMaterials() {
        api.with(Scope.SIZE).get("/materials").then().statusCode(200).body("materials", not(empty()));
        api.with(Scope.SIZE)
                .queryParam("find", "oak")
                .get("/materials")
                .then()
                .statusCode(200)
                .body("materials.name", everyItem(containsString("oak")))
                .body("materials.source", everyItem(notNullValue()));
        api.with(Scope.SIZE)
                .queryParam("find", "no such stuff é \u0000 <b>")
                .get("/materials")
                .then()
                .statusCode(200)
                .body("materials", empty());
    }

    @Test
    void errorsTellNothingOfTheProgramsInside() {
        String text = size("{\"rooms\": [null], \"site\": {\"x\": \"\\u0000\"}}")
                .body("trace", nullValue())
                .extract()
                .asString();

        assertThat(text).doesNotContain("Exception", "org.treadwarm", "com.fasterxml", "java.", "\tat ");
    }
}
