package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.hamcrest.Matchers.hasItem;

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

/** Floors solved between cables or pipes, over HTTP. */
class SectionsApiTest {
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

    static ObjectNode pipe() {
        return (ObjectNode) Trees.json("""
                {'spacing': '0.15 m',
                 'above': {'temperature': '20 °C', 'coefficient': '10.8 W/(m2.K)'},
                 'below': {'temperature': '20 °C', 'coefficient': 5.88235294},
                 'layers': [{'name': 'covering', 'resistance': 0.05},
                   {'name': 'screed', 'thickness': '61 mm', 'conductivity': 1.2},
                   {'name': 'insulation', 'thickness': '30 mm', 'conductivity': 0.04}],
                 'heater': {'kind': 'pipe', 'layer': 'screed', 'depth': '53 mm', 'diameter': '16 mm',
                   'wallThickness': '2 mm', 'wallConductivity': 0.35, 'filmCoefficient': 2000,
                   'waterTemperature': '40 °C'}}""");
    }

    static ObjectNode cable() {
        return (ObjectNode) Trees.json("""
                {'spacing': '0.15 m',
                 'above': {'temperature': 20, 'coefficient': 10.8},
                 'below': {'temperature': 20, 'coefficient': 5.88235294},
                 'layers': [{'name': 'screed', 'thickness': '51 mm', 'conductivity': 1.0},
                   {'name': 'insulation', 'thickness': '30 mm', 'conductivity': 0.04}],
                 'heater': {'kind': 'cable', 'layer': 'screed', 'depth': '48 mm', 'diameter': '6 mm', 'power': '15 W/m'}}""");
    }

    private static ValidatableResponse ask(ObjectNode question) {
        return api.json(Scope.SIZE, question).post("/sections").then();
    }

    private static JsonPath answer(ObjectNode question) {
        return JsonPath.from(ask(question).statusCode(200).extract().asString())
                .using(JsonPathConfig.jsonPathConfig().numberReturnType(NumberReturnType.DOUBLE));
    }

    /** K 3.9107 W/(m²·K), 27.60 and 26.91 °C, 15.77 W/m² downward: an independent semi-analytic solution (line source, multipoles). */
    @Test
    void solvesAPipe() {
        JsonPath answer = answer(pipe());

        assertThat(answer.getDouble("upwardFlux")).isCloseTo(3.9107 * 20, within(0.08));
        assertThat(answer.getDouble("downwardFlux")).isCloseTo(15.77, within(0.03));
        assertThat(answer.getDouble("surface.maximum")).isCloseTo(27.60, within(0.02));
        assertThat(answer.getDouble("surface.minimum")).isCloseTo(26.91, within(0.02));
        assertThat(answer.getDouble("accuracy.relativeError")).isBetween(0.0, 1e-3);
        assertThat(answer.getDouble("accuracy.residual")).isBetween(0.0, 1e-9);
        assertThat(answer.getDouble("accuracy.iterations")).isBetween(1.0, 40.0);
        assertThat(answer.getDouble("accuracy.cells")).isGreaterThan(500);
    }

    /** 86.781 up, 13.219 down, 28.977 and 27.213 °C, skin 40.53 °C: the same independent solution. */
    @Test
    void solvesACable() {
        JsonPath answer = answer(cable());

        assertThat(answer.getDouble("upwardFlux")).isCloseTo(86.781, within(0.03));
        assertThat(answer.getDouble("downwardFlux")).isCloseTo(13.219, within(0.03));
        assertThat(answer.getDouble("surface.maximum")).isCloseTo(28.977, within(0.02));
        assertThat(answer.getDouble("surface.minimum")).isCloseTo(27.213, within(0.02));
        assertThat(answer.getDouble("heaterTemperature")).isCloseTo(40.53, within(0.1));
    }

    @Test
    void takesTheBasicCharacteristicInsteadOfACoefficient() {
        ObjectNode question = cable();
        question.withObject("/above").remove("coefficient");
        question.withObject("/above").put("characteristic", "EN 1264-2");

        JsonPath answer = answer(question);

        double mean = answer.getDouble("surface.mean") - 20;
        assertThat(answer.getDouble("upwardFlux")).isCloseTo(8.92 * Math.pow(mean, 1.1), within(0.5));
        assertThat(answer.getDouble("upwardFlux") + answer.getDouble("downwardFlux"))
                .isCloseTo(100, within(1e-6));
    }

    @ParameterizedTest(name = "{0} = {1}")
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "/spacing | 5 | /spacing",
                "/heater/layer | \"lath\" | /heater/layer",
                "/heater/depth | \"60 mm\" | /heater/depth",
                "/heater/power | \"15 W/m\" | /heater/power",
                "/heater/wallThickness | \"9 mm\" | /heater/wallThickness",
                "/heater/diameter | \"0.2 m\" | /heater/diameter",
                "/layers | [] | /layers",
                "/above/characteristic | \"EN 1264-2\" | /above",
                "/heater/layer | \"covering\" | /heater/layer",
                "/hater | 1 | /hater",
            })
    void refusesWhatCannotBe(String pointer, String value, String address) {
        ObjectNode question = pipe();
        Trees.set(question, pointer, Trees.json(value));

        ask(question).statusCode(422).body("errors.pointer", hasItem(address));
    }

    @Test
    void asksForWhatAPipeNeeds() {
        ObjectNode question = pipe();
        question.withObject("/heater").remove("waterTemperature");

        ask(question).statusCode(422).body("errors.pointer", hasItem("/heater/waterTemperature"));
    }
}
