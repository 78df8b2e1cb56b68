package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ObjectNode;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.floor.ZoneSplit;
import org.treadwarm.properties.Surveys;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.Limit;
import org.treadwarm.sizing.Sizing.PartSizing;

/** Floors laid in parts, fed by one water or one cable. */
class PartedFloorTest {
    private static final Sizing SIZING = Surveys.sized(PartedJob.survey());
    private static final Sizing WHOLE = Surveys.sized(Surveys.solved());

    private static FloorSizing floor(Sizing sizing, int room) {
        return sizing.rooms().get(room).floor();
    }

    @Test
    void thePartsMakeTheFloorsFlux() {
        for (int room = 0; room < 2; room++) {
            FloorSizing floor = floor(SIZING, room);
            PartSizing strip = floor.parts().get(0);
            PartSizing rest = floor.parts().get(1);
            double left = ZoneSplit.occupiedFlux(
                    floor.area().orElseThrow(),
                    strip.area(),
                    strip.atRequiredFlux().flux(),
                    floor.requiredFlux().orElseThrow());
            assertThat(rest.atRequiredFlux().flux()).isCloseTo(left, within(1e-8));
            assertThat(strip.atRequiredFlux().flux())
                    .isGreaterThan(rest.atRequiredFlux().flux());
            double made = strip.area() * strip.atRequiredFlux().heaterFlux()
                    + rest.area() * rest.atRequiredFlux().heaterFlux();
            assertThat(floor.heaterPower().orElseThrow()).isCloseTo(made, within(1e-6));
        }
    }

    @Test
    void theSameWaterFlowsThroughAll() {
        FloorSizing hall = floor(SIZING, 0);
        double first = hall.parts()
                .get(0)
                .atRequiredFlux()
                .section()
                .waterTemperature()
                .orElseThrow();
        double second = hall.parts()
                .get(1)
                .atRequiredFlux()
                .section()
                .waterTemperature()
                .orElseThrow();
        assertThat(first).isCloseTo(second, within(1e-8));
        double whole = floor(WHOLE, 0)
                .section()
                .orElseThrow()
                .atRequiredFlux()
                .waterTemperature()
                .orElseThrow();
        assertThat(first).as("closer pipes need cooler water").isLessThan(whole);
    }

    @Test
    void theSameCableHeatsAll() {
        FloorSizing bath = floor(SIZING, 1);
        PartSizing near = bath.parts().get(0);
        PartSizing far = bath.parts().get(1);
        assertThat(near.atCarryingFlux().heaterFlux() * near.spacing())
                .isCloseTo(far.atCarryingFlux().heaterFlux() * far.spacing(), within(1e-7));
        assertThat(near.density().orElseThrow()).isCloseTo(15 / 0.08, within(1e-9));
        assertThat(bath.installedPower().orElseThrow()).isCloseTo(15 * (1.5 / 0.08 + 2.5 / 0.12), within(1e-9));
        assertThat(bath.electric().orElseThrow().cableLength().orElseThrow())
                .isCloseTo(1.5 / 0.08 + 2.5 / 0.12, within(1e-9));
    }

    @Test
    void eachPartHasTheLimitOfItsZone() {
        FloorSizing hall = floor(SIZING, 0);
        assertThat(hall.limits().stream().map(Limit::name))
                .contains(
                        "surface temperature, peripheral area, strip",
                        "surface temperature, occupied area, part 2",
                        "covering surface temperature, strip",
                        "water supply");
        FloorSizing bath = floor(SIZING, 1);
        Limit governing =
                bath.limits().stream().filter(Limit::governs).findFirst().orElseThrow();
        assertThat(governing.name()).isEqualTo("surface temperature, occupied area, part 2");
        assertThat(bath.parts().get(1).atCarryingFlux().surfaceTemperature()).isCloseTo(29, within(1e-6));
        assertThat(bath.carryingFlux().orElseThrow()).isCloseTo(governing.maximumFlux(), within(1e-9));
    }

    /** Two parts that are alike are the floor without parts, in every number that both have. */
    @Test
    void alikePartsAreTheWholeFloor() {
        ObjectNode halves = Surveys.solved();
        for (int i = 0; i < 2; i++) {
            PartedJob.parts(halves, 0).addObject().put("area", 9).put("zone", "occupied");
        }
        FloorSizing parted = floor(Surveys.sized(halves), 0);
        FloorSizing whole = floor(WHOLE, 0);
        assertThat(parted.carryingFlux().orElseThrow())
                .isCloseTo(whole.carryingFlux().orElseThrow(), within(1e-7));
        assertThat(parted.surfaceTemperature().orElseThrow())
                .isCloseTo(whole.surfaceTemperature().orElseThrow(), within(1e-8));
        assertThat(parted.downwardFlux().orElseThrow())
                .isCloseTo(whole.downwardFlux().orElseThrow(), within(1e-8));
        assertThat(parted.edgeFlux().orElseThrow()).isCloseTo(whole.edgeFlux().orElseThrow(), within(1e-8));
        assertThat(parted.holdsDownTo().orElseThrow())
                .isCloseTo(whole.holdsDownTo().orElseThrow(), within(1e-6));
        assertThat(parted.water().orElseThrow().massFlow())
                .isCloseTo(whole.water().orElseThrow().massFlow(), within(1e-9));
    }

    @Test
    void holdsDownToWhatItsLimitsAllow() {
        ObjectNode there = PartedJob.survey();
        there.withObject("/site")
                .put("outdoorTemperature", floor(SIZING, 0).holdsDownTo().orElseThrow());
        assertThat(floor(Surveys.sized(there), 0).margin().orElseThrow()).isCloseTo(0, within(1e-6));
    }

    @Test
    void eachPartHasLoopsOfItsOwn() {
        var water = floor(SIZING, 0).water().orElseThrow();
        assertThat(water.parts()).hasSize(2);
        assertThat(water.parts().get(0).loopLength())
                .isCloseTo(4 / 0.1 / water.parts().get(0).loops() + 6, within(1e-9));
        assertThat(water.parts().stream().mapToDouble(part -> part.heat()).sum())
                .isCloseTo(water.heat(), within(1e-9))
                .isCloseTo(
                        Math.min(
                                floor(SIZING, 0).heaterPower().orElseThrow(),
                                floor(SIZING, 0).atCarryingFlux().orElseThrow().heaterPower()),
                        within(1e-6));
        var valves = SIZING.total().water().orElseThrow().valves();
        assertThat(valves).hasSize(water.loops());
        assertThat(valves.get(0).part()).contains("strip");
        assertThat(valves.get(valves.size() - 1).part()).contains("part 2");
    }

    @Test
    void eachManifoldIsBalancedByItself() {
        var both = Surveys.sized(PartedJob.twoManifolds()).total().water().orElseThrow();
        var alone = SIZING.total().water().orElseThrow();
        assertThat(alone.manifolds()).singleElement().satisfies(only -> {
            assertThat(only.name()).isEmpty();
            assertThat(only.pressure()).isEqualTo(alone.pressure());
            assertThat(only.throttled()).isZero();
        });
        assertThat(both.manifolds().get(0).massFlow()).isEqualTo(alone.massFlow());
        assertThat(both.manifolds().get(1).name()).contains("annex");
        for (var manifold : both.manifolds()) {
            var valves = both.valves().stream()
                    .filter(valve ->
                            valve.room().equals("other hall") == manifold.name().isPresent())
                    .toList();
            assertThat(valves)
                    .hasSize(manifold.loops())
                    .allSatisfy(valve ->
                            assertThat(valve.drop() + valve.throttled()).isCloseTo(manifold.pressure(), within(1e-6)));
            assertThat(manifold.pressure() + manifold.throttled()).isCloseTo(both.pressure(), within(1e-6));
        }
    }

    @Test
    void statedDropsAreInThePressureOfThePump() {
        var without = Surveys.sized(PartedJob.twoManifolds()).total().water().orElseThrow();
        var manifoldOnly =
                Surveys.sized(PartedJob.statedDrops(false)).total().water().orElseThrow();
        var both = Surveys.sized(PartedJob.statedDrops(true)).total().water().orElseThrow();
        var plain = without.manifolds().get(0);
        var annex = both.manifolds().get(1);
        double worst = without.manifolds().get(1).pressure();

        assertThat(without.sourceDrop()).isEmpty();
        assertThat(plain.ownDrop()).isEmpty();
        assertThat(both.manifolds().get(0).pressure()).isEqualTo(plain.pressure());
        assertThat(annex.ownDrop()).hasValue(0.5 * 9806.65);
        assertThat(annex.loopDrop()).hasValue(worst);
        assertThat(annex.pressure()).isCloseTo(worst + 4903.325, within(1e-6));
        assertThat(manifoldOnly.pressure()).isEqualTo(Math.max(plain.pressure(), annex.pressure()));
        assertThat(both.sourceDrop()).hasValue(12_000);
        assertThat(both.pressure()).isCloseTo(manifoldOnly.pressure() + 12_000, within(1e-6));
        for (var manifold : both.manifolds()) {
            assertThat(manifold.pressure() + manifold.throttled() + 12_000).isCloseTo(both.pressure(), within(1e-6));
        }
        assertThat(both.valves()).isEqualTo(without.valves());
    }

    @Test
    void saysWhyItsPartsAreNotSolved() {
        ObjectNode survey = PartedJob.survey();
        survey.withObject("/rooms/0/heatedFloor/above/1").removeAll().put("resistance", 0.01);
        FloorSizing hall = floor(Surveys.sized(survey), 0);
        assertThat(hall.parts()).isEmpty();
        assertThat(hall.surfaceBasis()).contains("mean (plane)");
        assertThat(hall.sectionReason().orElseThrow()).contains("resistance alone");
    }
}
