package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class SectionDrawingsTest {
    @Test
    void wallNumbersEveryFaceWhereThereIsRoom() {
        String words = words(BuildUpDrawing.draw(Sheet.wide("w"), Samples.framedWall()));
        assertThat(words)
                .contains("22.0", "21.2", "20.8", "−2.6", "−4.8", "−5.0", "dew point", "11.2 °C")
                .contains("crossed by timber studs", "15 % of the area", "140 mm · R 3.50 m²K/W")
                .doesNotContain("behind it");
    }

    @Test
    void narrowWallGivesTheInnerFacesInItsKey() {
        assertThat(words(BuildUpDrawing.draw(Sheet.narrow("w"), Samples.framedWall()))
                        .replace('\n', ' '))
                .contains("−2.6 °C behind it", "drawn thicker than to scale");
    }

    @Test
    void floorNamesItsTemperaturesAndWhereHeatGoes() {
        assertThat(words(FloorBuildUpDrawing.draw(Sheet.wide("f"), Samples.floor())))
                .contains("surface\n28.6 °C", "heating cable\n30.1 °C", "heat up\n75.4 W/m²", "heat down\n11.8 W/m²")
                .contains("out by the edges\n2.1 W/m²", "beneath: ground, 9.0 °C");
    }

    @Test
    void limitScaleNamesTheGoverningLimitAndTheMargin() {
        assertThat(words(LimitScale.draw(Sheet.wide("l"), Samples.limits(75, 87.4))))
                .contains("required\n75.0 W/m²", "can carry\n87.4 W/m²", "margin\n12.4 W/m²", "87.4 W/m²\ngoverns")
                .contains("1500.0 W/m²\nbeyond the scale");
        assertThat(words(LimitScale.draw(Sheet.narrow("l"), Samples.limits(95, 87))))
                .contains("short by\n8.0 W/m²");
    }

    @Test
    void refusesWhatCannotBeDrawn() {
        BuildUp wall = Samples.framedWall();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new BuildUp(
                        "w", false, wall.first(), wall.last(), wall.layers(), List.of(1.0), OptionalDouble.empty()));
        assertThatIllegalArgumentException().isThrownBy(() -> new AirSide("a", Double.NaN));
        assertThatIllegalArgumentException().isThrownBy(() -> new FluxLimit("a", Double.POSITIVE_INFINITY, true));
        assertThatIllegalArgumentException().isThrownBy(() -> new Bridge(1, "a"));
        assertThatIllegalArgumentException().isThrownBy(() -> new Sheet("1 a", 720));
    }

    private static String words(String svg) {
        return DrawingCheck.read(svg).holds().words();
    }
}
