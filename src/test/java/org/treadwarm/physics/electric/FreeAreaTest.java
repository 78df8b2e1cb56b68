package org.treadwarm.physics.electric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.electric.FreeArea.Rectangle;

/** The free area against a raster that its rectangles' sides lie on, so that counting cells is exact. */
class FreeAreaTest {
    private static final int DRAWS = 500;
    private static final double CELL = 0.05;

    @Test
    void countsTheCellsOfARaster() {
        SplittableRandom random = new SplittableRandom(17);
        for (int i = 0; i < DRAWS; i++) {
            int width = random.nextInt(1, 80);
            int depth = random.nextInt(1, 80);
            Rectangle floor = onRaster(0, 0, width, depth);
            List<int[]> raster = new ArrayList<>();
            List<Rectangle> cutOuts = new ArrayList<>();
            int count = random.nextInt(0, 9);
            for (int k = 0; k < count; k++) {
                int[] sides = {
                    random.nextInt(-10, 80), random.nextInt(-10, 80), random.nextInt(1, 40), random.nextInt(1, 40)
                };
                raster.add(sides);
                cutOuts.add(onRaster(sides[0], sides[1], sides[2], sides[3]));
            }
            FreeArea area = FreeArea.of(floor, cutOuts);
            double expected = cells(width, depth, raster) * CELL * CELL;
            assertThat(area.cutOut()).as("draw %d: %s in %s", i, cutOuts, floor).isCloseTo(expected, within(1e-9));
            assertThat(area.free()).isBetween(0.0, area.floor());
        }
    }

    private static Rectangle onRaster(int x, int y, int width, int depth) {
        return new Rectangle(x * CELL, y * CELL, width * CELL, depth * CELL);
    }

    private static int cells(int width, int depth, List<int[]> cutOuts) {
        int covered = 0;
        for (int x = 0; x < width; x++) {
            for (int y = 0; y < depth; y++) {
                int column = x;
                int row = y;
                if (cutOuts.stream()
                        .anyMatch(sides -> column >= sides[0]
                                && column < sides[0] + sides[2]
                                && row >= sides[1]
                                && row < sides[1] + sides[3])) {
                    covered++;
                }
            }
        }
        return covered;
    }

    @Test
    void anEmptyFloorIsFreeAndAFullOneIsNot() {
        Rectangle floor = new Rectangle(0, 0, 4, 3);
        assertThat(FreeArea.of(floor, List.of()).share()).isEqualTo(1);
        assertThat(FreeArea.of(floor, List.of(new Rectangle(-1, -1, 9, 9))).free())
                .isZero();
        assertThat(FreeArea.of(floor, List.of(new Rectangle(5, 0, 1, 1))).free())
                .isEqualTo(12);
        assertThat(FreeArea.of(floor, List.of(new Rectangle(0, 0, 2, 1.5), new Rectangle(1, 0.5, 2, 1)))
                        .free())
                .isCloseTo(12 - 3 - 1, within(1e-12));
        assertThatIllegalArgumentException().isThrownBy(() -> new Rectangle(0, 0, 0, 1));
    }
}
