package org.treadwarm.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What must hold in the answer to every generated survey. */
class ReferenceChainTest {
    static LongStream seeds() {
        return LongStream.range(0, 400);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void answersHoldTogether(long seed) {
        ObjectNode survey = SurveyGenerator.random(new SplittableRandom(seed));
        ObjectNode answer = ReferenceChain.size(survey);
        answer.get("rooms").forEach(room -> {
            assertSums(room.get("heatLoss"));
            if (room.get("floor").has("margin")) {
                assertFloor(room.get("floor"));
            }
        });
        assertFinite(answer);
    }

    private static void assertSums(JsonNode loss) {
        double total = Fields.number(loss, "total");
        double paths = 0;
        for (JsonNode path : loss.get("paths")) {
            paths += Fields.number(path, "heatFlow");
            if (path.has("temperatureDifference")) {
                double flow = Fields.number(path, "conductance") * Fields.number(path, "temperatureDifference");
                assertThat(Fields.number(path, "heatFlow")).isEqualTo(flow);
            }
        }
        assertThat(paths).isCloseTo(total, within(1e-9));
    }

    private static void assertFloor(JsonNode floor) {
        double margin = Fields.number(floor, "margin");
        assertThat(Fields.text(floor, "verdict")).isEqualTo(margin >= 0 ? "carries" : "carries with supplement");
        double lowest = Double.POSITIVE_INFINITY;
        int governing = 0;
        String name = "";
        for (JsonNode limit : floor.get("limits")) {
            lowest = Math.min(lowest, Fields.number(limit, "maximumFlux"));
            if (limit.get("governs").booleanValue()) {
                governing++;
                name = Fields.text(limit, "name");
            }
        }
        assertThat(Fields.number(floor, "carryingFlux")).isEqualTo(lowest);
        assertThat(governing).isEqualTo(1);
        if (name.equals("heater density") && lowest > 0) {
            double power = Fields.number(floor.get("atCarryingFlux"), "heaterPower");
            assertThat(power).isLessThanOrEqualTo(Fields.number(floor, "installedPower") + 1e-6);
        }
        assertThat(floor.has("holdsDownTo")).isNotEqualTo(floor.has("holdsDownToReason"));
    }

    private static void assertFinite(JsonNode node) {
        if (node.isNumber()) {
            assertThat(node.doubleValue()).isFinite();
        }
        node.forEach(ReferenceChainTest::assertFinite);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void floorJustCarriesAtTheTemperatureItHoldsDownTo(long seed) {
        ObjectNode survey = SurveyGenerator.random(new SplittableRandom(seed));
        ObjectNode answer = ReferenceChain.size(survey);
        for (int index = 0; index < answer.get("rooms").size(); index++) {
            JsonNode floor = answer.get("rooms").get(index).get("floor");
            if (floor.has("holdsDownTo")) {
                ObjectNode colder = survey.deepCopy();
                ((ObjectNode) colder.get("site")).set("outdoorTemperature", floor.get("holdsDownTo"));
                JsonNode again = ReferenceChain.size(colder).get("rooms").get(index);
                assertThat(Fields.number(again.get("floor"), "margin")).isCloseTo(0, within(1e-8));
            }
        }
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void heatBalanceOfFloatingSpacesCloses(long seed) {
        ObjectNode survey = SurveyGenerator.random(new SplittableRandom(seed));
        ObjectNode answer = ReferenceChain.size(survey);
        Network network = new Network(survey);
        Conditions conditions = network.at(Fields.number(survey.get("site"), "outdoorTemperature"));
        for (JsonNode space : answer.get("spaces")) {
            String name = Fields.text(space, "name");
            double balance = 0;
            for (JsonNode room : answer.get("rooms")) {
                balance += toSpace(room, name);
            }
            for (Coupling coupling : network.couplings()) {
                boolean touches = coupling.from().equals(name) || coupling.to().equals(name);
                if (touches && !isRoom(survey, coupling.beyond(name))) {
                    balance -= coupling.conductance()
                            * (Fields.number(space, "temperature") - conditions.of(coupling.beyond(name)));
                }
            }
            assertThat(balance).isCloseTo(0, within(1e-9));
        }
    }

    private static double toSpace(JsonNode room, String space) {
        double flow = 0;
        for (JsonNode path : room.get("heatLoss").get("paths")) {
            flow += path.path("to").asText().equals(space) ? Fields.number(path, "heatFlow") : 0;
        }
        return flow;
    }

    private static boolean isRoom(JsonNode survey, String name) {
        return Fields.list(survey, "rooms").stream()
                .anyMatch(room -> Fields.text(room, "name").equals(name));
    }
}
