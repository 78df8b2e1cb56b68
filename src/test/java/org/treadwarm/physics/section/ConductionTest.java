package org.treadwarm.physics.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.section.Condition.BasicCharacteristic;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.Condition.Held;
import org.treadwarm.physics.section.Section.Block;
import org.treadwarm.physics.section.Section.Cable;
import org.treadwarm.physics.section.Section.Edge;
import org.treadwarm.physics.section.Section.Pipe;
import org.treadwarm.physics.section.Section.Sheet;
import org.treadwarm.physics.section.Section.Side;

/** Fields whose answer is known in closed form, and what must hold for any. */
class ConductionTest {
    private static Section square() {
        return Section.of(
                List.of(new Block(0, 1, 0, 2, 1)),
                List.of(
                        new Edge(Side.TOP, 0, 1, new Held(20)),
                        new Edge(Side.LEFT, 0, 2, new Held(0)),
                        new Edge(Side.BOTTOM, 0, 1, new Held(0))));
    }

    /** The series for a square of 2 m, one side at 20 °C and three at 0 °C (separation of variables). */
    private static double seriesInSquare(double x, double y) {
        double sum = 0;
        for (int n = 1; n < 60; n += 2) {
            double order = n * Math.PI;
            sum += 80 / order * Math.sin(order * x / 2) * Math.sinh(order * y / 2) / Math.sinh(order);
        }
        return sum;
    }

    @Test
    void errorsFallWithTheSquareOfTheCells() {
        double[] errors = new double[4];
        for (int i = 0; i < errors.length; i++) {
            int columns = 8 << i;
            Field field = Conduction.solve(square(), Grid.uniform(1, 2, columns, 2 * columns), 1e-10, () -> false);
            errors[i] = Math.abs(field.temperature(0.5, 1) - seriesInSquare(0.5, 1));
        }
        for (int i = 1; i < errors.length; i++) {
            assertThat(errors[i - 1] / errors[i]).isBetween(3.6, 4.4);
        }
    }

    @Test
    void layersAndSheetsInAColumnAddUp() {
        Section section = new Section(
                List.of(new Block(0, 0.3, 0, 0.04, 0.05), new Block(0, 0.3, 0.04, 0.1, 1.2)),
                List.of(new Sheet(0, 0.3, 0.04, 0.15), new Sheet(0, 0.3, 0.1, 0.1)),
                List.of(new Edge(Side.TOP, 0, 0.3, new Film(20, 10)), new Edge(Side.BOTTOM, 0, 0.3, new Film(-10, 5))),
                List.of(),
                List.of(),
                List.of());
        Field field = Conduction.solve(section, Grid.uniform(0.3, 0.1, 3, 5), 1e-12, () -> false);
        double flux = 30 / (0.1 + 0.1 + 0.06 / 1.2 + 0.15 + 0.04 / 0.05 + 0.2);
        assertThat(field.heatToEdge(1) / 0.3).isCloseTo(flux, within(1e-9));
        assertThat(field.temperature(0.1, 0)).isCloseTo(-10 + flux / 5, within(1e-9));
        assertThat(field.temperature(0.1, 0.1)).isCloseTo(20 - flux * 0.2, within(1e-9));
    }

    @Test
    void aFloorOfOneLayerMeetsTheBasicCharacteristic() {
        Section section = Section.of(
                List.of(new Block(0, 0.1, 0, 0.05, 1)),
                List.of(
                        new Edge(Side.TOP, 0, 0.1, new BasicCharacteristic(20)),
                        new Edge(Side.BOTTOM, 0, 0.1, new Held(35))));
        Field field = Conduction.solve(section, Grid.uniform(0.1, 0.05, 2, 4), 1e-12, () -> false);
        double flux = field.heatToEdge(0) / 0.1;
        double surface = 35 - flux * 0.05;
        assertThat(flux).isCloseTo(8.92 * Math.pow(surface - 20, 1.1), within(1e-6));
    }

    /**
     * A circle of diameter D in the middle of a square of side w loses k S dT with S = 2 pi / ln(1.078705 w / D), but for terms in (D/w)^8:
     * 1.078705 = 8 sqrt(pi) / Gamma(1/4)² is the conformal radius of a square of half side 1 (from memory).
     */
    @Test
    void aPipeInASquareHasItsShapeFactor() {
        List<Edge> edges = List.of(
                new Edge(Side.TOP, 0, 0.1, new Held(0)),
                new Edge(Side.BOTTOM, 0, 0.1, new Held(0)),
                new Edge(Side.RIGHT, -0.1, 0.1, new Held(0)));
        Pipe pipe = new Pipe(0, 0, 0.025, 1e-6, 1e6, 1e9, 1);
        Section section = new Section(
                List.of(new Block(0, 0.1, -0.1, 0.1, 1)), List.of(), edges, List.of(), List.of(pipe), List.of());
        double shapeFactor = 2 * Math.PI / Math.log(1.078705 * 4);
        double[] errors = new double[3];
        for (int i = 0; i < errors.length; i++) {
            int cells = 20 << i;
            double[] across = new GridLines(0, 1).fine(0, 0.1, 0.1 / cells).lines();
            double[] upward = new GridLines(0, 1).fine(-0.1, 0.1, 0.1 / cells).lines();
            Field field = Conduction.solve(section, new Grid(across, upward), 1e-11, () -> false);
            errors[i] = Math.abs(2 * field.heatOfPipe(0) / shapeFactor - 1);
        }
        assertThat(errors[0]).isLessThan(0.002);
        assertThat(errors[0] / errors[1]).isBetween(3.0, 5.0);
        assertThat(errors[1] / errors[2]).isBetween(3.0, 5.0);
    }

    /** What a random section of materials of very different conductivity, a pipe and a cable is made of. */
    private static Section random(SplittableRandom random, boolean mirrored) {
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Block(0, 0.4, 0, 0.2, 1));
        for (int i = 0; i < 6; i++) {
            double left = random.nextInt(0, 30) / 100.0;
            double width = random.nextInt(1, 10) / 100.0;
            double bottom = random.nextInt(0, 15) / 100.0;
            double height = random.nextInt(1, 5) / 100.0;
            double conductivity = Math.pow(10, random.nextDouble(-1.5, 2.4));
            double from = mirrored ? 0.4 - left - width : left;
            blocks.add(new Block(from, from + width, bottom, bottom + height, conductivity));
        }
        double pipe = mirrored ? 0.3 : 0.1;
        double cable = mirrored ? 0.1 : 0.3;
        return new Section(
                blocks,
                List.of(new Sheet(0, 0.4, 0.15, random.nextDouble(0, 0.2))),
                List.of(
                        new Edge(Side.TOP, 0, 0.4, new Film(random.nextDouble(-10, 30), random.nextDouble(2, 20))),
                        new Edge(Side.BOTTOM, 0, 0.4, new Film(random.nextDouble(-10, 30), random.nextDouble(2, 20)))),
                List.of(),
                List.of(new Pipe(pipe, 0.1, 0.01, 0.002, 0.35, 2000, random.nextDouble(25, 50))),
                List.of(new Cable(cable, 0.1, 0.005, random.nextDouble(0, 20))));
    }

    @Test
    void noHeatIsLost() {
        SplittableRandom random = new SplittableRandom(10211);
        for (int i = 0; i < 25; i++) {
            Field field = Conduction.solve(random(random, false), Grid.uniform(0.4, 0.2, 80, 40), 1e-11, () -> false);
            assertThat(field.imbalance()).as("section %s", i).isLessThan(1e-12);
        }
    }

    @Test
    void theMirroredSectionHasTheMirroredField() {
        for (int seed = 0; seed < 10; seed++) {
            Grid grid = Grid.uniform(0.4, 0.2, 80, 40);
            Field field = Conduction.solve(random(new SplittableRandom(seed), false), grid, 1e-11, () -> false);
            Field mirrored = Conduction.solve(random(new SplittableRandom(seed), true), grid, 1e-11, () -> false);
            assertThat(mirrored.heatToEdge(0)).isCloseTo(field.heatToEdge(0), within(1e-8));
            assertThat(mirrored.heatOfPipe(0)).isCloseTo(field.heatOfPipe(0), within(1e-8));
            for (double x = 0.013; x < 0.4; x += 0.05) {
                assertThat(mirrored.temperature(0.4 - x, 0.12)).isCloseTo(field.temperature(x, 0.12), within(1e-7));
            }
        }
    }

    @Test
    void twoThreadsGiveTheSameDigitsEachTime() {
        Section section = random(new SplittableRandom(1), false);
        Grid grid = Grid.uniform(0.4, 0.2, 480, 240);
        assertThat(grid.cells()).isGreaterThan(Workers.SMALLEST_SHARED);
        Field first = Conduction.solve(section, grid, 1e-9, () -> false);
        for (int i = 0; i < 3; i++) {
            Field again = Conduction.solve(section, grid, 1e-9, () -> false);
            assertThat(again.temperatures()).containsExactly(first.temperatures());
        }
    }

    @Test
    void stopsWhenAsked() {
        Grid grid = Grid.uniform(1, 2, 8, 16);
        assertThatThrownBy(() -> Conduction.solve(square(), grid, 1e-10, () -> true))
                .isInstanceOf(CancellationException.class);
    }

    @Test
    void refusesMoreCellsThanItMayTake() {
        Grid grid = Grid.uniform(1, 2, 2001, 2000);
        assertThatThrownBy(() -> Conduction.solve(square(), grid, 1e-10, () -> false))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("at most 1200000 cells");
    }

    @Test
    void refusesAGridThatCutsThroughMaterials() {
        Grid grid = Grid.uniform(1, 2, 8, 15);
        Section section = Section.of(
                List.of(new Block(0, 1, 0, 2, 1), new Block(0, 1, 0.5, 1, 2)),
                List.of(new Edge(Side.TOP, 0, 1, new Held(20))));
        assertThatThrownBy(() -> Conduction.solve(section, grid, 1e-10, () -> false))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("no line at the border y = 0.5 m");
    }

    @Test
    void refusesAColdFloorUnderTheBasicCharacteristic() {
        Section section = Section.of(
                List.of(new Block(0, 0.1, 0, 0.05, 1)),
                List.of(
                        new Edge(Side.TOP, 0, 0.1, new BasicCharacteristic(20)),
                        new Edge(Side.BOTTOM, 0, 0.1, new Held(15))));
        assertThatThrownBy(() -> Conduction.solve(section, Grid.uniform(0.1, 0.05, 2, 4), 1e-12, () -> false))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("colder");
    }
}
