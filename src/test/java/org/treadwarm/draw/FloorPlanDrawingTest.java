package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class FloorPlanDrawingTest {
    @Test
    void namesWhatStandsOnTheFloorAndHowItIsHeated() {
        assertThat(words(Sheet.wide("p"), PlanSamples.kitchen()))
                .contains("Kitchen units", "Fridge", "Island", "runs at 150 mm, indicative")
                .contains("peripheral zone, runs at 100 mm", "7.20 m", "4.60 m", "M: manifold.")
                .contains("Pipe 16 mm, heated area 28.4 m²; 100 mm clear of walls and hatched units.")
                .contains("Loops 1 and 2 are equal strips, numbered from the left.")
                .doesNotContain("run is drawn");
    }

    @Test
    void givesLettersToUnitsTooSmallForTheirNames() {
        assertThat(words(Sheet.narrow("p"), PlanSamples.kitchen()).lines())
                .contains("A", "A: Kitchen units.", "B", "B: Fridge.", "Island");
    }

    @Test
    void saysWhenItDrawsEverySecondRunOnly() {
        assertThat(words(Sheet.wide("p"), PlanSamples.workshop())).contains("Every second run is drawn.");
        assertThat(words(Sheet.narrow("p"), PlanSamples.workshop())).contains("One run in 3 is drawn.");
    }

    @Test
    void drawsNoMoreThan120Runs() {
        FloorPlanStrip plan = PlanSamples.workshop();
        PlanAreas areas = PlanAreas.of(plan, new Box(0, 0, 1400, 2200), 100);
        // 12 strips of 22 m / 12, that is 18 runs in each; 17 in the two that keep clear of a wall.
        assertThat(count(areas.meanders(plan, 1))).isGreaterThan(120);
        assertThat(areas.each(plan)).isEqualTo(2);
        assertThat(count(areas.meanders(plan, 2))).isLessThanOrEqualTo(120);
    }

    @Test
    void isToScale() {
        FloorPlanStrip plan = PlanSamples.kitchen();
        List<Box> boxes = DrawingCheck.read(FloorPlanDrawing.draw(Sheet.wide("p"), plan))
                .holds()
                .outlined();
        Box room = boxes.stream()
                .reduce((one, other) -> one.width() > other.width() ? one : other)
                .orElseThrow();
        double scale = room.width() / plan.width();
        assertThat(room.height()).isCloseTo(plan.length() * scale, within(0.02));
        Box island = boxes.get(2);
        assertThat(island.x() - room.x()).isCloseTo(1.6 * scale, within(0.02));
        assertThat(island.y() - room.y()).isCloseTo(1.8 * scale, within(0.02));
        assertThat(island.height()).isCloseTo(0.9 * scale, within(0.02));
    }

    @Test
    void aMeanderIsOneLineWhereNothingStandsInItsWay() {
        Meander meander = new Meander(new Box(10, 20, 100, 45), 10, false);
        List<List<Point>> lines = meander.lines(List.of());
        assertThat(meander.count()).isEqualTo(5);
        assertThat(lines).hasSize(1);
        assertThat(lines.get(0)).hasSize(10);
        assertThat(length(lines.get(0))).isCloseTo(5 * 100 + 4 * 10, within(1e-9));
        assertThat(lines.get(0)).allSatisfy(point -> {
            assertThat(point.x()).isBetween(10.0, 110.0);
            assertThat(point.y()).isBetween(22.5, 62.5);
        });
    }

    @Test
    void anUprightMeanderIsALyingOneTurned() {
        List<Point> lying = new Meander(new Box(10, 20, 100, 45), 10, false)
                .lines(List.of())
                .get(0);
        List<Point> upright =
                new Meander(new Box(20, 10, 45, 100), 10, true).lines(List.of()).get(0);
        assertThat(upright)
                .isEqualTo(lying.stream()
                        .map(point -> new Point(point.y(), point.x()))
                        .toList());
    }

    @Test
    void aMeanderKeepsOffWhatStandsInItsWay() {
        Random random = new Random(3);
        for (int i = 0; i < 200; i++) {
            List<Box> obstacles = IntStream.range(0, 4)
                    .mapToObj(n -> new Box(
                            random.nextDouble() * 180,
                            random.nextDouble() * 130,
                            5 + random.nextDouble() * 60,
                            5 + random.nextDouble() * 60))
                    .toList();
            Box area = new Box(0, 0, 200, 150);
            for (List<Point> line : new Meander(area, 8, random.nextBoolean()).lines(obstacles)) {
                for (int k = 1; k < line.size(); k++) {
                    Point from = line.get(k - 1);
                    Point to = line.get(k);
                    assertThat(area.grown(1e-9).holds(Box.between(from, to))).isTrue();
                    assertThat(obstacles.stream().anyMatch(box -> LineBreak.meets(from, to, box.grown(-1e-9))))
                            .as("%s from %s to %s", obstacles, from, to)
                            .isFalse();
                }
            }
        }
    }

    @Test
    void dividesTheFloorInEqualStripsAndLeavesThePeripheralZone() {
        PlanAreas areas = PlanAreas.of(PlanSamples.kitchen(), new Box(0, 0, 720, 460), 100);
        assertThat(areas.inner()).isEqualTo(new Box(0, 0, 620, 360));
        assertThat(areas.loops()).containsExactly(new Box(0, 0, 310, 360), new Box(310, 0, 310, 360));
        assertThat(areas.strips()).containsExactly(new Box(0, 360, 720, 100), new Box(620, 0, 100, 360));
        // Clear of the left and the upper wall, half a spacing clear of the strip beneath and the loop beside.
        Box first = areas.meanders(PlanSamples.kitchen(), 1).get(0).area();
        assertThat(List.of(first.x(), first.y(), first.right(), first.bottom()))
                .usingElementComparator((one, other) -> Math.abs(one - other) < 1e-9 ? 0 : 1)
                .containsExactly(10.0, 10.0, 302.5, 352.5);
    }

    @ParameterizedTest
    @MethodSource("org.treadwarm.draw.DrawingsTest#cases")
    void plansAreLegible(DrawingsTest.Case one) {
        Random random = one.random();
        double width = 1 + Math.pow(10, random.nextDouble() * 1.5);
        double length = 1 + Math.pow(10, random.nextDouble() * 1.5);
        List<FixedUnit> units = new ArrayList<>();
        for (int i = random.nextInt(6); i > 0; i--) {
            double x = width * i / 7;
            double y = random.nextDouble() * length * 0.7;
            units.add(new FixedUnit(
                    DrawingsTest.name(random), x, y, width / 8 * (0.1 + random.nextDouble() * 0.9), length * 0.25));
        }
        PeripheralZone zone = new PeripheralZone(
                Set.copyOf(List.of(PeripheralZone.Side.values()[random.nextInt(4)], PeripheralZone.Side.LEFT)),
                0.45,
                0.075);
        PlanMark mark = new PlanMark(
                PlanMark.Kind.values()[random.nextInt(2)], width * random.nextDouble(), length * random.nextDouble());
        words(
                one.sheet(),
                new FloorPlanStrip(
                        DrawingsTest.name(random),
                        width,
                        length,
                        random.nextBoolean() ? OptionalDouble.of(12.3) : OptionalDouble.empty(),
                        units,
                        new HeaterRuns(
                                DrawingsTest.name(random),
                                random.nextInt(4) == 0
                                        ? OptionalDouble.empty()
                                        : OptionalDouble.of(0.05 + random.nextDouble() * 0.3),
                                0.1),
                        random.nextBoolean() ? Optional.of(zone) : Optional.empty(),
                        1 + random.nextInt(8),
                        random.nextBoolean() ? Optional.of(mark) : Optional.empty()));
    }

    @Test
    void drawsNoRunsWhereTheirSpacingIsNotKnown() {
        FloorPlanStrip cable = PlanSamples.bathroom();
        FloorPlanStrip mats = new FloorPlanStrip(
                cable.name(),
                cable.width(),
                cable.length(),
                cable.heatedArea(),
                cable.units(),
                new HeaterRuns("Heating mats", OptionalDouble.empty(), 0.05),
                Optional.empty(),
                1,
                Optional.empty());
        String words = words(new Sheet("mats", 560), mats);
        assertThat(words).contains("Heating mats").contains("pale area").doesNotContain("uns at");
    }

    @Test
    void theScaleBarHasARoundLength() {
        assertThat(ScaleBar.length(100)).isEqualTo(1);
        assertThat(ScaleBar.length(71)).isEqualTo(1);
        assertThat(ScaleBar.length(70)).isEqualTo(2);
        assertThat(ScaleBar.length(4)).isEqualTo(20);
        assertThat(ScaleBar.length(1700)).isEqualTo(0.05);
        assertThat(words(new Sheet("bar", 560), PlanSamples.bathroom())).contains("500 mm");
    }

    @Test
    void refusesWhatDoesNotFitTheRoom() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> plan(List.of(new FixedUnit("Bath", 1, 0, 1.5, 1)), Optional.empty()))
                .withMessageContaining("Right side of Bath");
        assertThatIllegalArgumentException().isThrownBy(() -> new FixedUnit("Bath", -0.1, 0, 1, 1));
        assertThatIllegalArgumentException().isThrownBy(() -> new FixedUnit("Bath", 0, 0, 0, 1));
        assertThatIllegalArgumentException().isThrownBy(() -> new HeaterRuns("pipe", OptionalDouble.of(0), 0.1));
        assertThatIllegalArgumentException().isThrownBy(() -> new PeripheralZone(Set.of(), 1, 0.1));
        PeripheralZone deep = new PeripheralZone(Set.of(PeripheralZone.Side.TOP, PeripheralZone.Side.BOTTOM), 1.5, 0.1);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> plan(List.of(), Optional.of(deep)))
                .withMessageContaining("leaves nothing");
    }

    private static FloorPlanStrip plan(List<FixedUnit> units, Optional<PeripheralZone> zone) {
        return new FloorPlanStrip(
                "Hall",
                2,
                3,
                OptionalDouble.empty(),
                units,
                new HeaterRuns("pipe", OptionalDouble.of(0.1), 0.1),
                zone,
                1,
                Optional.empty());
    }

    private static int count(List<Meander> meanders) {
        return meanders.stream().mapToInt(Meander::count).sum();
    }

    private static double length(List<Point> line) {
        double length = 0;
        for (int i = 1; i < line.size(); i++) {
            Point from = line.get(i - 1);
            length += Math.hypot(line.get(i).x() - from.x(), line.get(i).y() - from.y());
        }
        return length;
    }

    private static String words(Sheet sheet, FloorPlanStrip plan) {
        return DrawingCheck.read(FloorPlanDrawing.draw(sheet, plan)).holds().words();
    }
}
