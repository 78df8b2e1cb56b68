package org.treadwarm.physics.water;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.PracticeLimit;
import org.treadwarm.physics.PracticeLimit.Judged;
import org.treadwarm.physics.water.JobSupply.RoomNeed;
import org.treadwarm.physics.water.Manifold.Valve;
import org.treadwarm.physics.water.RoomCircuits.Loops;
import org.treadwarm.sizing.Practice;

/** Loops of rooms, their balance on a manifold, and the supply of a job. */
class CircuitsTest {
    private static final int DRAWS = 300;
    private static final double LONGEST = 100;
    private static final double LARGEST_DROP = 20_000;
    private static final Tube TUBE = Tube.smooth(0.012);
    private static final Water WATER = Water.atAtmosphere();

    private static RoomCircuits drawn(SplittableRandom random, String name) {
        List<HeatedZone> zones =
                random.nextBoolean() ? List.of(zone(random, 0.1), zone(random, 0.2)) : List.of(zone(random, 0.15));
        return new RoomCircuits(name, zones, random.nextDouble(0, 25), random.nextDouble(30, 50), 5);
    }

    private static HeatedZone zone(SplittableRandom random, double spacing) {
        return new HeatedZone(random.nextDouble(2, 40), spacing, random.nextDouble(20, 110), random.nextDouble(0, 20));
    }

    @Test
    void loopsShareTheRoomsHeatAndPipeAndAreAsFewAsPossible() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < DRAWS; i++) {
            RoomCircuits room = drawn(random, "room " + i);
            Loops loops = room.lay(TUBE, WATER, LONGEST, LARGEST_DROP);
            double laid = room.zones().stream()
                    .mapToDouble(zone -> zone.area() / zone.spacing())
                    .sum();
            assertThat(loops.count() * (loops.length() - room.feederLength())).isCloseTo(laid, within(1e-9));
            assertThat(loops.count() * loops.heat()).isCloseTo(room.heat(), within(1e-9));
            double specificHeat = WATER.specificHeat(room.supply() - room.spread() / 2);
            assertThat(loops.count() * loops.massFlow() * specificHeat * room.spread())
                    .isCloseTo(room.heat(), within(1e-9));
            assertThat(loops.length()).isLessThanOrEqualTo(LONGEST);
            assertThat(loops.pressureDrop()).isLessThanOrEqualTo(LARGEST_DROP);
            if (loops.count() > 1) {
                Loops fewer = room.lay(TUBE, WATER, loops.count() - 1);
                assertThat(fewer.length() > LONGEST || fewer.pressureDrop() > LARGEST_DROP)
                        .as("%s needs %d loops", room, loops.count())
                        .isTrue();
            }
        }
    }

    /** The invented example of the checks: 133 m in one loop is too long, two loops keep both limits. */
    @Test
    void theWorkedRoomTakesTwoLoops() {
        RoomCircuits room = new RoomCircuits("worked", List.of(new HeatedZone(20, 0.15, 55, 15.003)), 0, 38.829, 5);
        Loops loops = room.lay(TUBE, WATER, 100, 25_000);
        assertThat(loops.count()).isEqualTo(2);
        assertThat(loops.length()).isCloseTo(66.67, within(0.01));
        assertThat(loops.content()).isCloseTo(133.333 * Math.PI * 0.006 * 0.006, within(1e-6));
    }

    @Test
    void feedersThatAreTooLongFindNoLoops() {
        RoomCircuits room = new RoomCircuits("far", List.of(new HeatedZone(20, 0.15, 55, 15)), 120, 40, 5);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> room.lay(TUBE, WATER, 100, 25_000))
                .withMessageContaining("far");
        assertThatIllegalArgumentException().isThrownBy(() -> room.lay(TUBE, WATER, 0));
        assertThatIllegalArgumentException().isThrownBy(() -> new RoomCircuits("bare", List.of(), 0, 40, 5));
    }

    @Test
    void everyValveBringsItsLoopToTheWorst() {
        SplittableRandom random = new SplittableRandom(5);
        for (int i = 0; i < DRAWS; i++) {
            List<Loops> rooms = List.of("hall", "bath", "study").stream()
                    .map(name -> drawn(random, name).lay(TUBE, WATER, LONGEST, LARGEST_DROP))
                    .toList();
            Manifold manifold = Manifold.balance(rooms, 5000, 994);
            double worst = rooms.stream().mapToDouble(Loops::pressureDrop).max().orElseThrow();
            assertThat(manifold.valves())
                    .hasSize(rooms.stream().mapToInt(Loops::count).sum())
                    .allSatisfy(valve -> {
                        assertThat(valve.throttled()).isNotNegative();
                        assertThat(valve.drop() + valve.throttled()).isCloseTo(worst, within(1e-9 * worst));
                    });
            assertThat(manifold.valves().stream().filter(valve -> valve.throttled() == 0))
                    .anyMatch(valve -> valve.room().equals(manifold.worst()));
            assertThat(manifold.duty().pressure()).isCloseTo(worst + 5000, within(1e-9));
            double total =
                    manifold.valves().stream().mapToDouble(Valve::massFlow).sum();
            assertThat(manifold.duty().massFlow()).isCloseTo(total, within(1e-12));
            assertThat(manifold.duty().volumeFlow()).isCloseTo(total / 994, within(1e-15));
        }
        assertThatIllegalArgumentException().isThrownBy(() -> Manifold.balance(List.of(), 0, 994));
    }

    @Test
    void theRoomThatNeedsTheHottestWaterGoverns() {
        List<RoomNeed> needs = List.of(
                new RoomNeed("hall", 18, 12, 900),
                new RoomNeed("living", 21, 16.3, 1400),
                new RoomNeed("bath", 24, 9, 500));
        JobSupply job = JobSupply.of(needs, 5, WATER);
        assertThat(job.governing()).isEqualTo("living");
        assertThat(job.supply()).isCloseTo(21 + HeatingWater.supplyOvertemperature(16.3, 5), within(1e-12));
        assertThat(job.rooms().get(1).spread()).isCloseTo(5, within(1e-9));
        for (int i = 0; i < needs.size(); i++) {
            RoomNeed need = needs.get(i);
            JobSupply.RoomWater got = job.rooms().get(i);
            double mean = HeatingWater.meanOvertemperature(job.supply(), got.returning(), need.temperature());
            assertThat(mean).isCloseTo(need.meanOvertemperature(), within(1e-9));
            double specificHeat = WATER.specificHeat((job.supply() + got.returning()) / 2);
            assertThat(got.massFlow() * specificHeat * got.spread()).isCloseTo(need.heat(), within(1e-9));
            assertThat(got.spread()).isGreaterThanOrEqualTo(5 - 1e-9);
        }
        assertThatIllegalArgumentException().isThrownBy(() -> JobSupply.of(List.of(), 5, WATER));
    }

    @Test
    void limitsOfEverySourceStandBesideTheValue() {
        RoomCircuits room = new RoomCircuits(
                "two zones", List.of(new HeatedZone(4, 0.1, 90, 15), new HeatedZone(16, 0.2, 55, 12)), 10, 42, 8);
        Loops loops = room.lay(TUBE, WATER, LONGEST, LARGEST_DROP);
        List<Judged> judged = CircuitLimits.judge(room, loops, 9, Practice.water());
        assertThat(judged).hasSameSizeAs(Practice.water()).allSatisfy(limit -> {
            assertThat(limit.source()).isNotBlank();
            assertThat(limit.keeps()).isEqualTo(limit.margin() >= 0);
        });
        assertThat(judged)
                .filteredOn(limit -> limit.name().equals("loop length") && limit.limit() == 120)
                .singleElement()
                .satisfies(limit -> assertThat(limit.margin()).isCloseTo(120 - loops.length(), within(1e-12)));
        assertThat(judged)
                .filteredOn(limit -> limit.name().equals("loops on a manifold"))
                .singleElement()
                .satisfies(limit -> assertThat(limit.keeps()).isFalse());
        assertThat(judged)
                .filteredOn(limit -> limit.name().equals("spread") && limit.limit() == 5)
                .singleElement()
                .satisfies(limit -> assertThat(limit.margin()).isEqualTo(3));
        PracticeLimit other = new PracticeLimit("noise", PracticeLimit.Sense.AT_MOST, 1, "invented");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> CircuitLimits.judge(room, loops, 1, List.of(other)))
                .withMessageContaining("noise");
    }
}
