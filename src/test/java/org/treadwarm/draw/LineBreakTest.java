package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class LineBreakTest {
    private static final List<Point> LEVEL = List.of(new Point(0, 5), new Point(10, 5), new Point(20, 5));

    @Test
    void breaksALineAtBoxesThatMayOverlap() {
        List<Box> gaps = List.of(new Box(12, 0, 4, 10), new Box(8, 4, 5, 4), new Box(0, 6, 20, 4));
        assertThat(LineBreak.outside(LEVEL, gaps))
                .containsExactly(
                        List.of(new Point(0, 5), new Point(8, 5)), List.of(new Point(16, 5), new Point(20, 5)));
    }

    @Test
    void leavesAloneWhatIsNotCovered() {
        assertThat(LineBreak.outside(LEVEL, List.of())).containsExactly(LEVEL);
        assertThat(LineBreak.outside(LEVEL, List.of(new Box(-1, 0, 30, 10)))).isEmpty();
    }

    @Test
    void seesSlantingLinesThroughACorner() {
        Box box = new Box(0, 0, 10, 10);
        assertThat(LineBreak.meets(new Point(-2, 8), new Point(2, 12), box)).isFalse();
        assertThat(LineBreak.meets(new Point(-2, 7), new Point(4, 13), box)).isTrue();
        assertThat(LineBreak.meets(List.of(new Point(20, 0), new Point(20, 5), new Point(5, 5)), box))
                .isTrue();
    }
}
