package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class BalanceDrawingTest {
    private static final Sheet SHEET = Sheet.wide("b");

    @Test
    void blocksAreAsHighAsTheirWatts() {
        List<Box> boxes = draw(balance(List.of(path("Wall", 300), path("Roof", 100), path("Hall", -80)), 320, 200, 120))
                .outlined();
        double perWatt = boxes.get(0).height() / 300;
        assertThat(boxes)
                .extracting(Box::height)
                .satisfiesExactly(
                        wall -> assertThat(wall).isPositive(),
                        roof -> assertThat(roof).isCloseTo(100 * perWatt, within(0.02)),
                        missing -> assertThat(missing).isCloseTo(120 * perWatt, within(0.02)),
                        floor -> assertThat(floor).isCloseTo(200 * perWatt, within(0.02)),
                        gain -> assertThat(gain).isCloseTo(80 * perWatt, within(0.02)));
    }

    @Test
    void saysWhatIsMissingAndWhatIsGained() {
        assertThat(draw(Samples.bathroom()).words())
                .contains(
                        "missing 340 W:", "something else must", "−62 W · −6 %", "2 smaller paths", "all it can carry")
                .contains("To be supplied: 1090 W, that is 1190 W out less 100 W gained.");
    }

    @Test
    void listsThePathsTooSmallToDraw() {
        List<HeatPath> paths = IntStream.rangeClosed(1, 29)
                .mapToObj(i -> path("Joint " + i, 1))
                .toList();
        List<HeatPath> all = new ArrayList<>(paths);
        all.add(path("Wall", 900));
        assertThat(draw(balance(all, 929, 929, 0)).words()).contains("29 smaller paths", "Joint 29 1 W");
    }

    @Test
    void needsNoHeatWhenAllAreGains() {
        DrawingCheck drawing = draw(balance(List.of(path("Hall", -80), path("Shop", -20)), -100, 500, 0));
        assertThat(drawing.words()).contains("No heat is needed: the balance is −100 W.", "nothing is asked of it");
    }

    @Test
    void drawsNothingToScaleWhereThereIsNothing() {
        assertThat(draw(balance(List.of(), 0, 0, 0)).words()).contains("No heat is needed: the balance is 0 W.");
        draw(balance(List.of(path("Wall", 0)), 0, 100, 0));
    }

    @Test
    void saysThatAllMustComeFromElsewhereWithoutAFloor() {
        Balance balance = new Balance("Hall", List.of(path("Wall", 300)), 300, Optional.empty());
        assertThat(draw(balance).words()).contains("no heated floor:\n300 W\nmust come from");
    }

    @Test
    void admitsThatPathsAndTotalDisagree() {
        assertThat(draw(balance(List.of(path("Wall", 300)), 360, 360, 0)).words())
                .contains("The paths listed add up to 300 W, which is not the total.");
    }

    @Test
    void isWrittenTheSameEveryTime() {
        List<HeatPath> paths = List.of(new HeatPath("Wall", 300, OptionalDouble.of(1)));
        Balance balance = new Balance("Hall & porch", paths, 300, Optional.of(new FloorHeat(300, 200, 100)));
        assertThat(BalanceDrawing.draw(Sheet.narrow("gold"), balance)).isEqualTo("""
                        <svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 360 441" width="100%" role="img" aria-labelledby="gold-title gold-desc" font-family="system-ui, sans-serif" font-size="14">
                         <title id="gold-title">Heat balance of Hall &amp; porch</title>
                         <desc id="gold-desc">To be supplied: 300\u00a0W. By path: Wall 300\u00a0W. Supply: missing 100\u00a0W: something else must add this, heated floor 200\u00a0W all it can carry.</desc>
                         <rect width="360" height="441" fill="#fffdf8"/>
                         <g>
                          <text x="168" y="23.4" fill="#2b2620" text-anchor="end">Heat out</text>
                          <text x="168" y="42.4" fill="#2b2620" text-anchor="end" font-weight="bold">300\u00a0W</text>
                          <text x="192" y="23.4" fill="#2b2620">Heat to come in</text>
                          <text x="192" y="42.4" fill="#2b2620" font-weight="bold">300\u00a0W</text>
                          <rect x="143" y="66" width="32" height="320" fill="#ece6da" stroke="#2b2620" stroke-width="1.5"/>
                          <polyline points="143,226 137.67,226 132.33,226 127,226" fill="none" stroke="#6b6257" stroke-width="1"/>
                          <text x="123" y="211.9" fill="#2b2620" text-anchor="end">Wall</text>
                          <text x="123" y="230.9" fill="#2b2620" text-anchor="end" font-weight="bold">300\u00a0W</text>
                          <text x="123" y="249.9" fill="#2b2620" text-anchor="end" font-weight="bold">100\u00a0%</text>
                          <rect x="185" y="66" width="32" height="106.67" fill="none" stroke="#a63d0f" stroke-width="2" stroke-dasharray="7 4"/>
                          <polyline points="217,119.33 222.33,119.33 227.67,119.33 233,119.33" fill="none" stroke="#6b6257" stroke-width="1"/>
                          <text x="237" y="95.73" fill="#a63d0f" font-weight="bold">missing</text>
                          <text x="237" y="114.73" fill="#a63d0f" font-weight="bold">100\u00a0W:</text>
                          <text x="237" y="133.73" fill="#2b2620">something else</text>
                          <text x="237" y="152.73" fill="#2b2620">must add this</text>
                          <rect x="185" y="172.67" width="32" height="213.33" fill="#f3dccb" stroke="#2b2620" stroke-width="1.5"/>
                          <polyline points="217,279.33 222.33,279.33 227.67,279.33 233,279.33" fill="none" stroke="#6b6257" stroke-width="1"/>
                          <text x="237" y="265.23" fill="#2b2620">heated floor</text>
                          <text x="237" y="284.23" fill="#2b2620" font-weight="bold">200\u00a0W</text>
                          <text x="237" y="303.23" fill="#6b6257">all it can carry</text>
                          <line x1="143" y1="386" x2="217" y2="386" stroke="#2b2620" stroke-width="2"/>
                          <text x="10" y="426.4" fill="#2b2620">To be supplied: 300\u00a0W.</text>
                         </g>
                        </svg>
                        """);
    }

    private static DrawingCheck draw(Balance balance) {
        return DrawingCheck.read(BalanceDrawing.draw(SHEET, balance)).holds();
    }

    private static Balance balance(List<HeatPath> paths, double total, double carried, double missing) {
        return new Balance("Hall", paths, total, Optional.of(new FloorHeat(total, carried, missing)));
    }

    private static HeatPath path(String label, double watts) {
        return new HeatPath(label, watts, OptionalDouble.empty());
    }
}
