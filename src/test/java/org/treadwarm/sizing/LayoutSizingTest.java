package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.FreeFloor;
import org.treadwarm.sizing.Sizing.Limit;
import org.treadwarm.sizing.Sizing.MatCircuit;
import org.treadwarm.sizing.Sizing.MatLayout;
import org.treadwarm.sizing.Sizing.MatPieces;

/** The plan of a floor and the mats chosen for it, in the studio whose heated area is 36 m². */
class LayoutSizingTest {
    private static final Offset<Double> CLOSE = within(1e-9);
    private static final String FLOOR = "/rooms/0/heatedFloor";

    private static FloorSizing sized(String key, String json) {
        ObjectNode survey = Surveys.quiet();
        Trees.set(survey, FLOOR + key, Trees.json(json));
        return Surveys.sized(survey).rooms().get(0).floor();
    }

    private static MatLayout mats(String list) {
        return mats(Surveys.quiet(), list);
    }

    private static MatLayout mats(ObjectNode survey, String list) {
        Trees.set(survey, FLOOR + "/heater", Trees.json("{'kind': 'electric', 'voltage': 230, 'mats': " + list + "}"));
        FloorSizing floor = Surveys.sized(survey).rooms().get(0).floor();
        return floor.electric().orElseThrow().mats().orElseThrow();
    }

    @Test
    void whatTwoFixedPartsCoverCountsOnce() {
        FreeFloor plan = sized(
                        "/plan",
                        "{'width': 7, 'length': 6, 'fixed': ["
                                + "{'width': 2, 'length': 1, 'x': 0, 'y': 5}, {'width': 1, 'length': 2, 'x': 1.5, 'y': 4}]}")
                .plan()
                .orElseThrow();
        assertThat(plan.area()).isCloseTo(42, CLOSE);
        assertThat(plan.fixedArea()).isCloseTo(3.5, CLOSE);
        assertThat(plan.freeArea()).isCloseTo(38.5, CLOSE);
        assertThat(plan.freeShare()).isCloseTo(38.5 / 42, CLOSE);
        assertThat(plan.heatedShare().orElseThrow()).isCloseTo(36 / 38.5, CLOSE);
    }

    @Test
    void aFloorThatIsAllCoveredHasNoHeatedShare() {
        FreeFloor plan = sized(
                        "/plan", "{'width': 7, 'length': 6, 'fixed': [{'width': 7, 'length': 6, 'x': 0, 'y': 0}]}")
                .plan()
                .orElseThrow();
        assertThat(plan.freeArea()).isZero();
        assertThat(plan.heatedShare()).isEmpty();
    }

    @Test
    void matsLeaveTheLeastFloorBare() {
        MatLayout mats = mats("[{'name': 'wide', 'area': 10, 'power': 1500}, {'area': 2.5, 'power': 375, 'count': 2}]");
        assertThat(mats.pieces()).extracting(MatPieces::name).containsExactly("wide", "mat 2");
        assertThat(mats.pieces()).extracting(MatPieces::count).containsExactly(3, 2);
        assertThat(mats.pieces().get(1).pointer()).isEqualTo(FLOOR + "/heater/mats/1");
        assertThat(mats.coveredArea()).isCloseTo(35, CLOSE);
        assertThat(mats.bareArea()).isCloseTo(1, CLOSE);
        assertThat(mats.power()).isCloseTo(5250, CLOSE);
        assertThat(mats.margin()).isCloseTo(5250 - mats.neededPower(), CLOSE).isPositive();
    }

    @Test
    void eachMatIsFedWholeAndMeasured() {
        MatLayout mats = mats("[{'area': 12, 'power': 1840}]");
        MatPieces mat = mats.pieces().get(0);
        assertThat(mat.current()).isCloseTo(8, CLOSE);
        assertThat(mat.resistance()).isCloseTo(230 * 230 / 1840.0, CLOSE);
        assertThat(mat.lowestResistance()).isCloseTo(0.95 * mat.resistance(), CLOSE);
        assertThat(mat.highestResistance()).isCloseTo(1.10 * mat.resistance(), CLOSE);
        assertThat(mats.circuits()).extracting(MatCircuit::current).containsExactly(16.0, 8.0);
        assertThat(mats.circuits()).extracting(MatCircuit::breaker).containsExactly(16.0, 10.0);
    }

    @Test
    void matsKeepToTheFreeFloor() {
        ObjectNode survey = Surveys.quiet();
        Trees.set(
                survey,
                FLOOR + "/plan",
                Trees.json("{'width': 7, 'length': 6, 'fixed': [{'width': 7, 'length': 2, 'x': 0, 'y': 0}]}"));
        MatLayout mats = mats(survey, "[{'area': 10, 'power': 2000}]");
        assertThat(mats.area()).isCloseTo(28, CLOSE);
        assertThat(mats.coveredArea()).isCloseTo(20, CLOSE);
    }

    @Test
    void theStrongestAreChosenWhereNoneAreStrongEnough() {
        MatLayout mats = mats("[{'area': 36, 'power': 36}, {'area': 10, 'power': 50}]");
        assertThat(mats.pieces()).extracting(MatPieces::count).containsExactly(3);
        assertThat(mats.power()).isCloseTo(150, CLOSE);
        assertThat(mats.margin()).isNegative();
    }

    private static FloorSizing withMats(ObjectNode survey, String list) {
        Trees.set(survey, FLOOR + "/heater", Trees.json("{'kind': 'electric', 'voltage': 230, " + list + "}"));
        return Surveys.sized(survey).rooms().get(0).floor();
    }

    private static Limit installedPower(FloorSizing floor) {
        return floor.limits().stream()
                .filter(limit -> limit.name().equals("installed power"))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void weakMatsDoNotCarryTheRoom() {
        FloorSizing floor = withMats(Surveys.quiet(), "'mats': [{'area': 10, 'power': 300}]");
        MatLayout mats = floor.electric().orElseThrow().mats().orElseThrow();
        assertThat(floor.verdict()).isEqualTo(Verdict.CARRIES_WITH_SUPPLEMENT);
        assertThat(installedPower(floor).governs()).isTrue();
        assertThat(mats.meanDensity().orElseThrow()).isCloseTo(900 / 36.0, CLOSE);
        assertThat(floor.atCarryingFlux().orElseThrow().heaterPower()).isCloseTo(900, within(1e-6));
        assertThat(floor.installedDensity()).isEmpty();
    }

    @Test
    void strongMatsCarryTheRoomAndTellTheirMargin() {
        FloorSizing floor = withMats(Surveys.quiet(), "'mats': [{'area': 10, 'power': 1500}]");
        FloorSizing without = Surveys.sized(Surveys.quiet()).rooms().get(0).floor();
        MatLayout mats = floor.electric().orElseThrow().mats().orElseThrow();
        assertThat(floor.verdict()).isEqualTo(Verdict.CARRIES);
        assertThat(installedPower(floor).margin()).isPositive();
        assertThat(mats.margin()).isPositive();
        assertThat(floor.requiredFlux()).isEqualTo(without.requiredFlux());
    }

    /** What the mats chosen for the design day give, they give on a colder one too. */
    @Test
    void theFloorHoldsDownToWhatItsMatsGive() {
        ObjectNode survey = Surveys.quiet();
        String list = "'mats': [{'area': 36, 'power': 2300}]";
        FloorSizing floor = withMats(survey, list);
        assertThat(installedPower(floor).governs()).isTrue();
        Trees.set(
                survey,
                "/site/outdoorTemperature",
                DoubleNode.valueOf(floor.holdsDownTo().orElseThrow()));
        assertThat(withMats(survey, list).marginShare().orElseThrow()).isCloseTo(0, within(1e-6));
    }

    @Test
    void theWeakerOfDensityAndMatsCounts() {
        FloorSizing weakMats = withMats(Surveys.quiet(), "'density': 200, 'mats': [{'area': 10, 'power': 300}]");
        FloorSizing weakDensity = withMats(Surveys.quiet(), "'density': 20, 'mats': [{'area': 10, 'power': 1500}]");
        assertThat(installedPower(weakMats).governs()).isTrue();
        assertThat(installedPower(weakDensity).governs()).isFalse();
        assertThat(weakDensity.installedDensity()).hasValue(20);
        assertThat(weakDensity.atCarryingFlux().orElseThrow().heaterFlux()).isCloseTo(20, within(1e-9));
    }

    @Test
    void matsLimitASolvedFloorToo() {
        FloorSizing weak = Surveys.sized(SolvedJob.mats(60)).rooms().get(1).floor();
        FloorSizing strong = Surveys.sized(SolvedJob.mats(1500)).rooms().get(1).floor();
        double made = weak.electric().orElseThrow().mats().orElseThrow().power();
        assertThat(weak.section()).isPresent();
        assertThat(installedPower(weak).governs()).isTrue();
        assertThat(weak.atCarryingFlux().orElseThrow().heaterPower()).isCloseTo(made, within(1e-6));
        assertThat(installedPower(strong).margin()).isPositive();
    }

    @Test
    void nothingIsChosenWhereNothingFits() {
        FloorSizing floor =
                sized("/heater", "{'kind': 'electric', 'voltage': 230, 'mats': [{'area': 37, 'power': 4000}]}");
        assertThat(floor.electric()).isEmpty();
        assertThat(floor.matsReason())
                .hasValueSatisfying(reason -> assertThat(reason).contains("none of them fits"));
    }
}
