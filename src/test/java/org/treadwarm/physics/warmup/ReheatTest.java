package org.treadwarm.physics.warmup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static org.treadwarm.physics.warmup.Floors.HOUR;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.floor.HeatedFloor;

/** Heat beyond the steady heat. */
class ReheatTest {
    private static final BuildUp FLOOR = Floors.screedByPowerLaw();

    private static Optional<Reheat> reheat(double setback, double hours) {
        return Reheat.of(FLOOR, Floors.room(), Watched.AIR, setback, 20, hours * HOUR, () -> false);
    }

    @Test
    void warmsTheRoomInTime() {
        Reheat reheat = reheat(16, 3).orElseThrow();
        WarmUp warmUp = new WarmUp(FLOOR, Floors.room());
        assertThat(warmUp.after(warmUp.held(16), reheat.neededDensity(), Watched.AIR, 3 * HOUR, () -> false))
                .isCloseTo(20, within(1.01e-4));
        assertThat(reheat.extraDensity()).isEqualTo(reheat.neededDensity() - reheat.steadyDensity());
    }

    /** A floor sized by the plane model for the steady load and the extra heat has the density needed. */
    @Test
    void theExtraHeatLeadsASizingToTheDensity() {
        Reheat reheat = reheat(16, 3).orElseThrow();
        double load = Floors.room().steadyLoss(20) + reheat.extraHeat();
        double coefficient = 1 / (FLOOR.resistanceBelow() + 1 / 5.9);
        double flux = HeatedFloor.fluxOfDensity(
                reheat.neededDensity(), 20, FLOOR.resistanceAbove(), coefficient, coefficient * (20 - 15));
        assertThat(flux).isCloseTo(load, within(1e-8));
    }

    @Test
    void lessTimeAndMoreSetbackNeedMore() {
        assertThat(reheat(16, 2).orElseThrow().extraHeat())
                .isGreaterThan(reheat(16, 4).orElseThrow().extraHeat());
        assertThat(reheat(14, 3).orElseThrow().extraHeat())
                .isGreaterThan(reheat(17, 3).orElseThrow().extraHeat());
        assertThat(reheat(16, 1000).orElseThrow().extraHeat()).isCloseTo(0, within(0.01));
    }

    @Test
    void noSetbackNeedsNothing() {
        assertThat(reheat(20, 3).orElseThrow().extraHeat()).isCloseTo(0, within(0.01));
    }

    @Test
    void saysWhenTheTimeIsTooShort() {
        assertThat(reheat(16, 0.05)).isEmpty();
        assertThatIllegalArgumentException().isThrownBy(() -> reheat(21, 3));
        assertThatIllegalArgumentException().isThrownBy(() -> reheat(16, 0));
    }
}
