package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The parts that lay drawings out. */
class LayoutTest {
    @Test
    void pushesApartWhatCollidesAndLeavesTheRest() {
        List<PushApart.Wish> wishes =
                List.of(new PushApart.Wish(20, 10), new PushApart.Wish(20, 10), new PushApart.Wish(60, 10));
        assertThat(PushApart.centres(wishes, 0, 100)).containsExactly(15.0, 25.0, 60.0);
    }

    @Test
    void keepsWithinTheBounds() {
        List<PushApart.Wish> wishes = List.of(new PushApart.Wish(-9, 10), new PushApart.Wish(99, 10));
        assertThat(PushApart.centres(wishes, 0, 30)).containsExactly(5.0, 25.0);
        assertThatIllegalArgumentException().isThrownBy(() -> PushApart.centres(wishes, 0, 19));
    }

    @Test
    void layersAreToOneScaleAndThinOnesWidened() {
        List<LayerSpan> spans = LayerSpan.over(
                List.of(Samples.layer("a", 0.1, 1), Samples.layer("foil", 0.001, 0), Samples.layer("b", 0.2, 1)),
                5,
                300);
        assertThat(width(spans.get(2))).isCloseTo(2 * width(spans.get(0)), within(1e-9));
        assertThat(width(spans.get(1))).isEqualTo(14);
        assertThat(spans.get(1).drawn()).isEqualTo(LayerSpan.Drawn.WIDENED);
        assertThat(spans.get(2).end()).isCloseTo(305, within(1e-9));
    }

    @Test
    void layersWithoutThicknessAreSymbolsAndStillFillTheLength() {
        Layer layer = new Layer("air", OptionalDouble.empty(), 0.18, MaterialFamily.AIR, Optional.empty(), List.of());
        List<LayerSpan> spans = LayerSpan.over(List.of(layer, layer), 0, 100);
        assertThat(spans).extracting(LayerSpan::drawn).containsOnly(LayerSpan.Drawn.SYMBOL);
        assertThat(spans.get(1).end()).isEqualTo(100);
    }

    @Test
    void ticksAreRoundAndContainTheRange() {
        assertThat(Ticks.around(-5, 22, 5).values()).containsExactly(-10.0, 0.0, 10.0, 20.0, 30.0);
        Ticks fine = Ticks.around(0, 0.9, 6);
        assertThat(fine.text(fine.step())).isEqualTo("0.2");
    }

    @Test
    void wrapsAndCutsWhatIsTooLong() {
        assertThat(Lettering.wrap("one two", 30, false)).containsExactly("one", "two");
        assertThat(Lettering.wrap("a".repeat(40), 100, false))
                .allSatisfy(line -> assertThat(Lettering.width(line, false)).isLessThanOrEqualTo(100));
        assertThat(Lettering.wrap("  ", 100, false)).containsExactly("");
    }

    @ParameterizedTest
    @CsvSource({
        "EPS 100,INSULATION",
        "Mineral wool,INSULATION",
        "Insulation board,INSULATION",
        "Reinforced concrete with steel,CONCRETE_SCREED",
        "Tile adhesive,CONCRETE_SCREED",
        "Porcelain tile,TILE",
        "Aerated concrete block,BRICK_BLOCK",
        "Plasterboard,BOARD",
        "Gypsum plaster,CONCRETE_SCREED",
        "Oak parquet,TIMBER",
        "Unventilated air gap,AIR",
        "Stair nosing,OTHER",
        "Vapour barrier,MEMBRANE",
        "Double glazing,GLASS",
        "Steel sheet,METAL",
        "Gravel,GROUND",
        "Unobtainium,OTHER"
    })
    void readsTheFamilyFromTheName(String name, MaterialFamily family) {
        assertThat(MaterialFamily.of(name)).isEqualTo(family);
    }

    private static double width(LayerSpan span) {
        return span.end() - span.start();
    }
}
