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

/** Wall feet over HTTP. */
class WallFeetApiTest {
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

    static ObjectNode question() {
        return (ObjectNode) Trees.json("""
                {'characteristicDimension': '4 m', 'soilConductivity': '2.0 W/(m.K)', 'wallThickness': '0.23 m',
                 'below': [{'material': 'XPS', 'thickness': '30 mm', 'conductivity': 0.034}],
                 'above': '60 mm',
                 'wall': [{'material': 'gypsum plaster', 'thickness': '15 mm', 'conductivity': 0.57},
                   {'name': 'brickwork', 'thickness': '215 mm', 'conductivity': 0.77}],
                 'heatedPlane': '0.15 m', 'foundation': '0.6 m', 'footConductivity': '1.3 W/(m.K)',
                 'edgeThickness': '50 mm', 'edgeConductivity': '0.035 W/(m.K)', 'edgeDepth': '300 mm'}""");
    }

    private static ValidatableResponse ask(ObjectNode question) {
        return api.json(Scope.SIZE, question).post("/wall-feet").then();
    }

    /** Floor, wall and psi are the whole of L2D; the floor by ISO 13370's formula for dt less than B', written out here. */
    @Test
    void floorWallAndPsiAddUp() {
        JsonPath answer = JsonPath.from(
                        ask(question()).statusCode(200).extract().asString())
                .using(JsonPathConfig.jsonPathConfig().numberReturnType(NumberReturnType.DOUBLE));

        double thickness = 0.23 + 2 * (0.03 / 0.034 + 0.04);
        double floor = 2 * 2 / (Math.PI * 4 + thickness) * Math.log(Math.PI * 4 / thickness + 1);
        double wall = 1 / (0.13 + 0.015 / 0.57 + 0.215 / 0.77 + 0.04);
        assertThat(answer.getDouble("slabTransmittance")).isCloseTo(floor, within(1e-12));
        assertThat(answer.getDouble("slabTransmittanceInSection")).isBetween(floor, 1.06 * floor);
        assertThat(answer.getDouble("wallTransmittance")).isCloseTo(wall, within(1e-12));
        assertThat(answer.getDouble("wallHeight")).isCloseTo(1, within(1e-12));
        for (String foot : new String[] {"withoutEdge", "withEdge"}) {
            assertThat(answer.getDouble(foot + ".psi") + floor * 2 + wall)
                    .as(foot)
                    .isCloseTo(answer.getDouble(foot + ".coupling"), within(1e-12));
            assertThat(answer.getDouble(foot + ".psiError"))
                    .isBetween(0.0, 1e-3 * answer.getDouble(foot + ".coupling"));
        }
        assertThat(answer.getDouble("withEdge.psi")).isLessThan(answer.getDouble("withoutEdge.psi"));
    }

    @Test
    void withoutEdgeInsulationThereIsOnePsi() {
        ObjectNode question = question();
        question.remove(java.util.List.of("edgeThickness", "edgeConductivity", "edgeDepth"));

        JsonPath answer = JsonPath.from(ask(question).statusCode(200).extract().asString());

        assertThat(answer.<Object>get("withEdge")).isNull();
        assertThat(answer.getString("dimensions")).isEqualTo("internal");
    }

    @ParameterizedTest(name = "{0} = {1}")
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "/characteristicDimension | 0.1 | /characteristicDimension",
                "/below | [{'thickness': '9 m', 'conductivity': 2}] | /characteristicDimension",
                "/below | [] | /below",
                "/below | [{'resistance': 1.2}] | /below/0/thickness",
                "/below | [{'airGap': {'thickness': '20 mm'}}] | /below/0/airGap",
                "/below | [{'resistance': 0, 'thickness': '20 mm'}] | /below/0/resistance",
                "/wall | [] | /wall",
                "/wall | [{'name': 'cavity', 'resistance': 0.18}] | /wall/0/thickness",
                "/wall | [{'thickness': '1 mm', 'conductivity': 0.5}] | /wall",
                "/edgeThickness | \"2.5 m\" | /edgeThickness",
                "/edgeDepth | \"9 m\" | /edgeDepth",
                "/foundation | \"0.6 K\" | /foundation",
                "/foundations | 1 | /foundations",
            })
    void refusesWhatCannotBe(String pointer, String value, String address) {
        ObjectNode question = question();
        Trees.set(question, pointer, Trees.json(value));

        ask(question).statusCode(422).body("errors.pointer", hasItem(address));
    }

    @ParameterizedTest
    @CsvSource({"edgeThickness", "edgeConductivity", "edgeDepth"})
    void edgeInsulationIsKnownByAllThree(String key) {
        ObjectNode question = question();
        question.remove(key);

        ask(question).statusCode(422).body("errors.pointer", hasItem("/" + key));
    }
}
