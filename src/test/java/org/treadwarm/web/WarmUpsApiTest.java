package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.hasSize;
import static org.hamcrest.Matchers.notNullValue;
import static org.hamcrest.Matchers.nullValue;

import com.fasterxml.jackson.databind.node.ObjectNode;
import io.restassured.path.json.JsonPath;
import io.restassured.path.json.config.JsonPathConfig;
import io.restassured.path.json.config.JsonPathConfig.NumberReturnType;
import io.restassured.response.ValidatableResponse;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.treadwarm.properties.Trees;
import org.treadwarm.store.Scope;

/** Warming up over HTTP; the numbers themselves are held by the tests of the physics. */
class WarmUpsApiTest {
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

    /** Tiles on screed on insulation on concrete, 120 W/m²; invented. */
    static ObjectNode question() {
        return (ObjectNode) Trees.json("""
                {'above': [
                   {'thickness': '10 mm', 'material': 'ceramic tile'},
                   {'thickness': '65 mm', 'conductivity': 1.2, 'density': '2000 kg/m3', 'specificHeat': '1 kJ/(kg.K)'}],
                 'below': [
                   {'thickness': '30 mm', 'material': 'EPS'},
                   {'thickness': '100 mm', 'material': 'concrete'}],
                 'belowTemperature': '15 °C', 'belowCoefficient': '5.9 W/(m2.K)',
                 'density': '150 W/m2',
                 'room': {'lossCoefficient': '1.2 W/(m2.K)', 'airCapacity': '9 kJ/(m2.K)',
                   'massCapacity': '150 kJ/(m2.K)', 'massCoupling': '8 W/(m2.K)'},
                 'outdoorTemperature': '-9 °C', 'from': '16 °C', 'to': '20 °C', 'within': '3 h'}""");
    }

    private static ValidatableResponse ask(ObjectNode question) {
        return api.json(Scope.SIZE, question).post("/warmups").then();
    }

    private static JsonPath answer(ObjectNode question) {
        return JsonPath.from(ask(question).statusCode(200).extract().asString())
                .using(JsonPathConfig.jsonPathConfig().numberReturnType(NumberReturnType.DOUBLE));
    }

    @Test
    void answersHoursDensityCurveAndPowerCut() {
        JsonPath answer = answer(question());

        assertThat(answer.getDouble("hours")).isBetween(3.0, 6.0);
        assertThat(answer.getDouble("densityNeeded")).isBetween(150.0, 300.0);
        assertThat(answer.getDouble("reheat")).isPositive();
        assertThat(answer.getDouble("powerCut.hoursToFive")).isBetween(10.0, 72.0);
        assertThat(answer.getList("powerCut.curve")).hasSize(49);
        assertThat(answer.getDouble("powerCut.curve[0].air")).isCloseTo(20, within(1e-9));
        assertThat(answer.getDouble("powerCut.curve[48].hour")).isGreaterThan(answer.getDouble("powerCut.hoursToFive"));
        assertThat(answer.getDouble("powerCut.curve[48].air")).isLessThan(5);
        assertThat(answer.getList("curve")).hasSize(49);
        assertThat(answer.getDouble("curve[0].air")).isCloseTo(16, within(1e-9));
        assertThat(answer.getDouble("curve[48].hour")).isCloseTo(answer.getDouble("hours"), within(1e-9));
        assertThat(answer.getDouble("curve[48].air")).isCloseTo(20, within(0.01));
        assertThat(answer.getDouble("curve[48].heater")).isGreaterThan(answer.getDouble("curve[48].floor"));
    }

    @Test
    void theDensityNeededTakesTheTimeGiven() {
        ObjectNode question = question();
        double needed = answer(question).getDouble("densityNeeded");
        question.put("density", needed);
        assertThat(answer(question).getDouble("hours")).isCloseTo(3, within(0.01));
    }

    @Test
    void theOperativeTemperatureComesLater() {
        ObjectNode question = question().put("watched", "operative");
        assertThat(answer(question).getDouble("hours"))
                .isGreaterThan(answer(question()).getDouble("hours"));
    }

    @Test
    void leavesOutWhatDoesNotHappen() {
        ObjectNode weak = question().put("density", "60 W/m2").put("lookedAt", "4 h");
        weak.remove("within");
        ask(weak)
                .statusCode(200)
                .body("hours", nullValue())
                .body("reached", notNullValue())
                .body("densityNeeded", nullValue())
                .body("reheat", nullValue())
                .body("curve", hasSize(49))
                .body("powerCut.hoursToFive", nullValue())
                .body("powerCut.hoursToFreezing", nullValue());
        ask(question().put("within", "1 min")).statusCode(200).body("densityNeeded", nullValue());
    }

    @Test
    void aRoomThatStaysWarmNeedsNoTime() {
        ObjectNode sunny = question();
        ((ObjectNode) sunny.get("room")).put("otherGain", "60 W/m2");
        JsonPath answer = answer(sunny);
        assertThat(answer.getDouble("hours")).isZero();
        assertThat(answer.getDouble("densityNeeded")).isZero();
        assertThat(answer.getDouble("steadyDensity")).isZero();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "/above/1/density | /above/1/density",
                "/above/1/specificHeat | /above/1/specificHeat",
                "/above/1/thickness | /above/1/thickness",
                "/below/0/material | /below/0",
                "/belowTemperature | /belowTemperature",
                "/room | /room",
                "/room/massCapacity | /room/massCapacity",
                "/to | /to",
            })
    void saysWhatIsMissing(String removed, String pointer) {
        ObjectNode question = question();
        int slash = removed.lastIndexOf('/');
        ((ObjectNode) question.at(removed.substring(0, slash))).remove(removed.substring(slash + 1));
        ask(question).statusCode(422).body("errors.pointer", contains(pointer));
    }

    @ParameterizedTest
    @CsvSource({
        "from, 21 °C",
        "watched, floor",
        "within, 0 h",
        "within, 3 m",
        "lookedAt, 1000 h",
        "density, -5 W/m2",
        "density, cold",
        "colour, red"
    })
    void refusesWhatCannotBe(String key, String value) {
        ask(question().put(key, value)).statusCode(422).body("errors.pointer", contains("/" + key));
    }

    @Test
    void looksAtTwentyLayersAtMost() {
        ObjectNode thick = question();
        for (int i = 0; i < 20; i++) {
            thick.withArray("above").add(question().at("/above/0"));
        }
        ask(thick).statusCode(422).body("errors.pointer", contains("/above"));
    }

    @Test
    void takesResistancesAirGapsAndFraming() {
        ObjectNode timber = question();
        timber.set("below", Trees.json("""
                [{'thickness': '150 mm', 'material': 'mineral wool',
                  'bridging': {'share': '10 %', 'conductivity': 0.13}},
                 {'airGap': {'thickness': '20 mm'}}, {'resistance': 0.05}]"""));
        assertThat(answer(timber).getDouble("hours")).isPositive();
    }

    @Test
    void asksForAKey() {
        api.anyone()
                .contentType("application/json")
                .body(question().toString())
                .post("/warmups")
                .then()
                .statusCode(401);
    }
}
