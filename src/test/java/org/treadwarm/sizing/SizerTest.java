package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;
import org.treadwarm.sizing.Sizing.Caution;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.Limit;
import org.treadwarm.sizing.Sizing.PathLoss;

/** What the answer says and what it leaves out. */
class SizerTest {
    private static JsonNode answer(String pointer, String value) {
        ObjectNode survey = Surveys.quiet();
        Trees.set(survey, pointer, Trees.json(value));
        return Surveys.answer(survey);
    }

    private static FloorSizing floor(String pointer, String value) {
        ObjectNode survey = Surveys.quiet();
        Trees.set(survey, pointer, Trees.json(value));
        return Surveys.sized(survey).rooms().get(0).floor();
    }

    @Test
    void aFloorThatGivesEnoughCarries() {
        FloorSizing floor = Surveys.sized(Surveys.quiet()).rooms().get(0).floor();
        assertThat(floor.verdict()).isEqualTo(Verdict.CARRIES);
        assertThat(floor.margin().orElseThrow()).isPositive();
        assertThat(floor.supplement()).hasValue(0);
        assertThat(floor.holdsDownTo().orElseThrow()).isLessThan(-9);
        assertThat(floor.holdsDownToReason()).isEmpty();
    }

    @Test
    void aFloorThatDoesNotCarriesWithSupplement() {
        FloorSizing floor = floor("/rooms/0/air/changeRate", "4");
        assertThat(floor.verdict()).isEqualTo(Verdict.CARRIES_WITH_SUPPLEMENT);
        assertThat(floor.supplement().orElseThrow()).isCloseTo(-floor.margin().orElseThrow() * 36, within(1e-9));
        assertThat(floor.holdsDownTo().orElseThrow()).isGreaterThan(-9);
        assertThat(floor.marginShare().orElseThrow())
                .isCloseTo(floor.margin().orElseThrow() / floor.requiredFlux().orElseThrow(), within(1e-15));
    }

    @Test
    void otherHeatIsSetAgainstTheSupplementOnly() {
        ObjectNode survey = Surveys.quiet();
        Trees.set(survey, "/rooms/0/air/changeRate", Trees.json("4"));
        FloorSizing without = Surveys.sized(survey).rooms().get(0).floor();
        Trees.set(survey, "/rooms/0/otherHeat", Trees.json("500"));
        FloorSizing with = Surveys.sized(survey).rooms().get(0).floor();
        assertThat(with.requiredFlux()).isEqualTo(without.requiredFlux());
        assertThat(with.supplement().orElseThrow())
                .isCloseTo(without.supplement().orElseThrow() - 500, within(1e-9));
        Trees.set(survey, "/rooms/0/otherHeat", Trees.json("50000"));
        FloorSizing much = Surveys.sized(survey).rooms().get(0).floor();
        assertThat(much.supplement()).hasValue(0);
        assertThat(much.verdict()).isEqualTo(Verdict.CARRIES_WITH_SUPPLEMENT);
    }

    @Test
    void aRoomWithoutAHeatedFloorHasNothingButItsVerdict() {
        ObjectNode survey = Surveys.quiet();
        Trees.remove(survey, "/rooms/0/heatedFloor");
        Trees.remove(survey, "/rooms/0/junctions/0");
        JsonNode answer = Surveys.answer(survey);
        assertThat(answer.at("/rooms/0/floor")).isEqualTo(Trees.json("{'verdict': 'no heated floor'}"));
        assertThat(answer.at("/total/heaterPower").doubleValue()).isZero();
        assertThat(answer.at("/total/heatedArea").doubleValue()).isZero();
        assertThat(answer.at("/total/installedPower").isMissingNode()).isTrue();
    }

    @Test
    void aRoomThatNeedsNothingHasNoShares() {
        JsonNode answer = answer("/site/outdoorTemperature", "20.5");
        JsonNode room = answer.at("/rooms/0");
        ObjectNode warm = Surveys.quiet();
        Trees.set(warm, "/site/outdoorTemperature", Trees.json("40"));
        JsonNode hot = Surveys.answer(warm).at("/rooms/0");
        assertThat(room.at("/floor/verdict").asText()).isEqualTo("carries");
        assertThat(hot.at("/heatLoss/total").doubleValue()).isNegative();
        assertThat(hot.at("/floor/requiredFlux").doubleValue()).isZero();
        assertThat(hot.at("/floor").has("marginShare")).isFalse();
        assertThat(hot.at("/heatLoss/paths/0").has("share")).isFalse();
        assertThat(hot.at("/floor/surfaceTemperature").doubleValue()).isEqualTo(20);
        assertThat(hot.at("/floor/heaterTemperature").doubleValue()).isEqualTo(20);
    }

    @Test
    void aPathWithoutConductanceHasNoTemperatureDifference() {
        JsonNode answer = answer("/rooms/0/air/changeRate", "0");
        JsonNode paths = answer.at("/rooms/0/heatLoss/paths");
        JsonNode air = paths.get(paths.size() - 1);
        assertThat(air.get("kind").asText()).isEqualTo("air");
        assertThat(air.get("conductance").doubleValue()).isZero();
        assertThat(air.get("heatFlow").doubleValue()).isZero();
        assertThat(air.has("temperatureDifference")).isFalse();
    }

    @Test
    void pathsStandInTheOrderOfTheContract() {
        List<PathLoss> paths =
                Surveys.sized(Surveys.everything()).rooms().get(0).heatLoss().paths();
        assertThat(paths)
                .extracting(PathLoss::name)
                .containsExactly(
                        "front",
                        "bay",
                        "opening",
                        "parlour ceiling",
                        "garage wall",
                        "stair wall",
                        "floor by the hearth",
                        "floor by the window",
                        "to the parlour",
                        "lintel",
                        "to the garage",
                        "air",
                        "reheat");
        assertThat(paths)
                .extracting(PathLoss::kind)
                .containsExactly(
                        "transmission",
                        "opening",
                        "opening",
                        "transmission",
                        "transmission",
                        "transmission",
                        "transmission",
                        "transmission",
                        "transmission",
                        "junction",
                        "junction",
                        "air",
                        "reheat");
    }

    @Test
    void partsWithoutANameAreCalledByTheirAssembly() {
        List<PathLoss> paths =
                Surveys.sized(Surveys.studio()).rooms().get(1).heatLoss().paths();
        assertThat(paths).extracting(PathLoss::name).contains("opening", "shed wall");
    }

    @Test
    void heatThatGoesDownIsToldWhereItArrives() {
        JsonNode answer = Surveys.answer(Surveys.everything());
        double down = answer.at("/rooms/2/floor/downwardFlux").doubleValue() * 11.5;
        assertThat(answer.at("/spaces/1/fromFloorAbove").doubleValue()).isCloseTo(down, within(1e-9));
        assertThat(answer.at("/spaces/0").has("fromFloorAbove")).isFalse();
        assertThat(answer.at("/spaces")).hasSize(2);
    }

    @Test
    void heightAndWeightNeedEveryThicknessAndDensity() {
        FloorSizing floor = floor("/name", "'the same'");
        assertThat(floor.buildUpHeight().orElseThrow()).isCloseTo(0.155, within(1e-12));
        assertThat(floor.load()).isPresent();
        FloorSizing withoutDensity = floor("/rooms/0/heatedFloor/above/1", "{'thickness': 0.045, 'conductivity': 1.2}");
        assertThat(withoutDensity.buildUpHeight()).isPresent();
        assertThat(withoutDensity.load()).isEmpty();
        FloorSizing withoutThickness = floor("/rooms/0/heatedFloor/above/1", "{'resistance': 0.04}");
        assertThat(withoutThickness.buildUpHeight()).isEmpty();
        assertThat(withoutThickness.load()).isEmpty();
    }

    @Test
    void theHeaterMayBeLeftOut() {
        ObjectNode survey = Surveys.quiet();
        Trees.remove(survey, "/rooms/0/heatedFloor/heater");
        FloorSizing floor = Surveys.sized(survey).rooms().get(0).floor();
        assertThat(floor.installedPower()).isEmpty();
        assertThat(floor.heaterPower()).isPresent();
        assertThat(floor.limits()).extracting(Limit::name).containsExactly("surface temperature, occupied area");
    }

    @ParameterizedTest
    @CsvSource({"occupied, occupied area, 29", "peripheral, peripheral area, 35", "bathroom, bathroom, 29"})
    void theZoneLimitsTheSurface(String zone, String label, double highest) {
        FloorSizing floor = floor("/rooms/0/heatedFloor/zone", "'" + zone + "'");
        Limit limit = floor.limits().get(0);
        assertThat(limit.name()).isEqualTo("surface temperature, " + label);
        assertThat(limit.maximumFlux()).isCloseTo(8.92 * Math.pow(highest - 20, 1.1), within(1e-9));
        assertThat(limit.source()).isEqualTo("EN 1264-2");
    }

    @Test
    void everyLimitStandsWithItsMarginAndOneGoverns() {
        FloorSizing floor = Surveys.sized(Surveys.everything()).rooms().get(0).floor();
        assertThat(floor.limits())
                .extracting(Limit::name)
                .containsExactly(
                        "surface temperature, occupied area",
                        "covering surface temperature",
                        "layer temperature: oak",
                        "heater density");
        assertThat(floor.limits())
                .filteredOn(Limit::governs)
                .hasSize(1)
                .allSatisfy(limit -> assertThat(limit.maximumFlux())
                        .isEqualTo(floor.carryingFlux().orElseThrow()));
        assertThat(floor.limits())
                .allSatisfy(limit -> assertThat(limit.margin())
                        .isEqualTo(limit.maximumFlux() - floor.requiredFlux().orElseThrow()));
    }

    @Test
    void theFirstOfEqualLimitsGoverns() {
        FloorSizing floor = floor("/rooms/0/heatedFloor/maximumSurfaceTemperature", "29");
        assertThat(floor.limits()).extracting(Limit::governs).startsWith(true, false);
    }

    @Test
    void aHeaterThatItsLossEatsUpCarriesNothing() {
        FloorSizing floor = floor("/rooms/0/heatedFloor/heater/density", "1");
        assertThat(floor.carryingFlux()).hasValue(0);
        assertThat(floor.verdict()).isEqualTo(Verdict.CARRIES_WITH_SUPPLEMENT);
        assertThat(floor.atCarryingFlux().orElseThrow().heaterTemperature()).isEqualTo(20);
    }

    @Test
    void whatHoldsAtEveryTemperatureOrAtNoneSaysSo() {
        ObjectNode survey = Surveys.quiet();
        Trees.set(survey, "/rooms/0/heatedFloor/zone", Trees.json("'peripheral'"));
        Trees.set(survey, "/rooms/0/heatedFloor/heater/density", Trees.json("800"));
        FloorSizing always = Surveys.sized(survey).rooms().get(0).floor();
        assertThat(always.holdsDownTo()).isEmpty();
        assertThat(always.holdsDownToReason()).contains("beyond -60");
        FloorSizing never = floor("/spaces/shop next door/temperature", "-60");
        FloorSizing atNone = floor("/rooms/0/reheat", "500");
        assertThat(never.holdsDownTo()).isPresent();
        assertThat(atNone.holdsDownTo()).isEmpty();
        assertThat(atNone.holdsDownToReason()).contains("never");
    }

    @Test
    void allowanceAndReheatAreAddedToWhatTheFloorMustGive() {
        double plain = floor("/rooms/0/allowance", "0").requiredHeat().orElseThrow();
        assertThat(floor("/rooms/0/allowance", "0.1").requiredHeat().orElseThrow())
                .isCloseTo(1.1 * plain, within(1e-9));
        assertThat(floor("/rooms/0/reheat", "10").requiredHeat().orElseThrow()).isCloseTo(plain + 420, within(1e-9));
    }

    @Test
    void spacesWhoseLossesCancelHaveNoBalance() {
        ObjectNode survey = Surveys.quiet();
        Trees.set(
                survey,
                "/spaces/hut",
                Trees.json(
                        "{'kind': 'unheated', 'surfaces': [{'assembly': 'party wall', 'area': 10, 'to': 'outdoors'}],"
                                + " 'junctions': [{'psi': -1.1, 'length': 10}]}"));
        assertThatThrownBy(() -> Sizer.size(Surveys.accepted(survey)))
                .isInstanceOfSatisfying(
                        NoBalanceException.class,
                        e -> assertThat(e.problem().pointer()).isEqualTo("/spaces"));
    }

    @ParameterizedTest
    @CsvSource({
        "/rooms/0/heatedFloor/area, /rooms/0/heatedFloor",
        "/rooms/0/heatedFloor/ground/exposedPerimeter, /rooms/0/heatedFloor",
        "/rooms/0/surfaces/4/ground/exposedPerimeter, /rooms/0",
    })
    void whatIsNextToNothingIsRefusedAtItsPart(String pointer, String address) {
        ObjectNode survey = Surveys.quiet();
        Trees.set(survey, pointer, Trees.json("4.9e-324"));
        assertThatThrownBy(() -> Sizer.size(Surveys.accepted(survey)))
                .isInstanceOfSatisfying(
                        NoBalanceException.class,
                        e -> assertThat(e.problem().pointer()).isEqualTo(address));
    }

    @Test
    void theGroundIsToldOnlyWhereItWasCalculated() {
        ObjectNode survey = Surveys.quiet();
        assertThat(Surveys.answer(survey)
                        .at("/rooms/0/heatLoss/paths/5/ground/characteristicDimension")
                        .doubleValue())
                .isCloseTo(42 / 9.5, within(1e-12));
        Trees.set(survey, "/rooms/0/surfaces/4/assembly", Trees.json("'party wall'"));
        assertThat(Surveys.answer(survey).at("/rooms/0/heatLoss/paths/5").has("ground"))
                .isFalse();
        assertThat(Surveys.sized(survey).warnings()).isEmpty();
    }

    @Test
    void cautionsGoByHeaterZoneAndGlazing() {
        assertThat(codes("/rooms/0/heatedFloor/heater", "{'kind': 'electric'}"))
                .contains(
                        "licensed-electrician",
                        "floor-sensor",
                        "no-covered-heater",
                        "covering-maker",
                        "floor-load",
                        "frost")
                .contains("cold-draught", "damp")
                .doesNotContain("water-limit", "wet-room");
        assertThat(codes("/rooms/0/heatedFloor/heater", "{'kind': 'water'}"))
                .contains("water-limit")
                .doesNotContain("licensed-electrician", "floor-sensor");
        assertThat(codes("/rooms/0/heatedFloor/zone", "'bathroom'")).contains("wet-room");
        assertThat(codes("/rooms/0/surfaces/0/openings", "[]")).doesNotContain("cold-draught");
        ObjectNode unheated = Surveys.quiet();
        Trees.remove(unheated, "/rooms/0/heatedFloor");
        Trees.remove(unheated, "/rooms/0/junctions/0");
        assertThat(Surveys.sized(unheated).rooms().get(0).cautions())
                .extracting(Caution::code)
                .containsExactly("cold-draught", "damp");
    }

    private static List<String> codes(String pointer, String value) {
        ObjectNode survey = Surveys.quiet();
        Trees.set(survey, pointer, Trees.json(value));
        return Surveys.sized(survey).rooms().get(0).cautions().stream()
                .peek(caution -> assertThat(caution.source()).isNotBlank())
                .map(Caution::code)
                .toList();
    }
}
