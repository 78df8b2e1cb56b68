package org.treadwarm.physics.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.physics.section.WallFoot.EdgeInsulation;
import org.treadwarm.physics.section.WallFoot.Wall;

/** Wall feet: the parts of their psi value, and what insulation does. */
class WallFootTest {
    private static WallFoot foot(double wallConductivity, Optional<EdgeInsulation> edge) {
        return new WallFoot(
                4,
                List.of(
                        new Solid("screed", 0.03, 1.2),
                        new Solid("insulation", 0.1, 0.036),
                        new Solid("slab", 0.15, 2)),
                0.3,
                new Wall(0.3, wallConductivity, 1, 0.8, wallConductivity),
                edge,
                2,
                0.13,
                0.04);
    }

    @Test
    void psiIsWhatFloorAndWallLeave() {
        WallFootCoupling got = foot(0.6, Optional.empty()).solve(() -> false);
        assertThat(got.psi() + got.slabCoefficient() * 4 + got.wallCoefficient() * 1)
                .isCloseTo(got.coupling(), within(1e-12));
        assertThat(got.wallCoefficient()).isCloseTo(1 / (0.13 + 0.3 / 0.6 + 0.04), within(1e-12));
        assertThat(got.psi(0)).isCloseTo(got.psi() + 4 * got.slabCoefficient(), within(1e-12));
        assertThat(got.accuracy().relativeError()).isLessThan(1e-3);
    }

    @Test
    void edgeInsulationHelpsAndMoreSoBesideAConductingWall() {
        double last = 0;
        for (double conductivity : new double[] {0.1, 0.6, 1.5}) {
            double without =
                    foot(conductivity, Optional.empty()).solve(() -> false).psi();
            EdgeInsulation strip = new EdgeInsulation(0.05, 0.035, 0.3);
            double with =
                    foot(conductivity, Optional.of(strip)).solve(() -> false).psi();
            assertThat(without - with).isGreaterThan(Math.max(last, 0.005));
            last = without - with;
        }
    }

    @Test
    void aShortWallIsRefused() {
        assertThatThrownBy(() -> new Wall(0.4, 1, 1.1, 0.5, 1))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("three thicknesses");
    }
}
