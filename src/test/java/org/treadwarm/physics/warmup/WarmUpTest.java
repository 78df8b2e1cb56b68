package org.treadwarm.physics.warmup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.treadwarm.physics.warmup.Floors.HOUR;

import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.floor.HeatedFloor;
import org.treadwarm.physics.warmup.WarmUp.Balance;
import org.treadwarm.physics.warmup.WarmUp.Curve;
import org.treadwarm.physics.warmup.WarmUp.Wait;

/** What a floor and its room do over hours and days. */
class WarmUpTest {
    private static final BooleanSupplier NEVER = () -> false;

    private final WarmUp linear = new WarmUp(Floors.screed(), Floors.room());
    private final WarmUp powerLaw = new WarmUp(Floors.screedByPowerLaw(), Floors.room(1.2, 3));

    @Test
    void theHeatPutInIsStoredOrLost() {
        for (WarmUp warmUp : List.of(linear, powerLaw)) {
            for (double density : new double[] {0, 40, 150}) {
                Balance balance = warmUp.curve(warmUp.uniform(15), density, 30 * HOUR, 7, NEVER)
                        .balance();
                double scale = Math.abs(balance.in()) + Math.abs(balance.stored()) + Math.abs(balance.lostOutdoors());
                assertThat(balance.in())
                        .isCloseTo(
                                balance.stored() + balance.lostOutdoors() + balance.lostBelow(), within(1e-9 * scale));
                assertThat(balance.in()).isCloseTo((density + (warmUp == powerLaw ? 3 : 0)) * 30 * HOUR, within(1e-6));
            }
        }
    }

    @Test
    void whatIsHeldStays() {
        for (WarmUp warmUp : List.of(linear, powerLaw)) {
            State held = warmUp.held(20);
            Moment before = warmUp.moment(held);
            Moment after = warmUp.curve(held, held.density(), 48 * HOUR, 1, NEVER)
                    .moments()
                    .get(1);
            assertThat(after.air()).isCloseTo(20, within(1e-8));
            assertThat(after.heater()).isCloseTo(before.heater(), within(1e-8));
            assertThat(after.surface()).isCloseTo(before.surface(), within(1e-8));
        }
    }

    /** The plane model of the sizing, written for itself, gives the same flux from the same heat. */
    @Test
    void theSteadyStateIsThatOfThePlaneModel() {
        BuildUp floor = Floors.screedByPowerLaw();
        State steady = powerLaw.steady(90);
        Moment moment = powerLaw.moment(steady);
        double coefficient = 1 / (floor.resistanceBelow() + 1 / 5.9);
        double flux = HeatedFloor.fluxOfDensity(
                90, moment.air(), floor.resistanceAbove(), coefficient, coefficient * (moment.air() - 15));
        assertThat(moment.upwardFlux()).isCloseTo(flux, within(1e-9));
        assertThat(moment.heater())
                .isCloseTo(HeatedFloor.temperatureBelow(moment.air(), flux, floor.resistanceAbove()), within(1e-9));
        assertThat(moment.upwardFlux()).isCloseTo(1.2 * (moment.air() + 5) - 3, within(1e-9));
        assertThat(moment.upwardFlux() + moment.downwardFlux()).isCloseTo(90, within(1e-9));
    }

    @Test
    void comesToTheSteadyState() {
        Moment steady = powerLaw.moment(powerLaw.steady(70));
        assertThat(powerLaw.after(powerLaw.uniform(10), 70, Watched.AIR, 2000 * HOUR, NEVER))
                .isCloseTo(steady.air(), within(1e-4));
    }

    @Test
    void waitsUntilTheAirIsWarm() {
        State start = linear.held(16);
        Wait wait = linear.waitFor(start, 150, Watched.AIR, 20, 24 * HOUR, NEVER);
        double seconds = wait.seconds().orElseThrow();
        assertThat(wait.temperature()).isCloseTo(20, within(1e-8));
        assertThat(linear.after(start, 150, Watched.AIR, seconds, NEVER)).isCloseTo(20, within(2e-3));
        assertThat(linear.waitFor(start, 150, Watched.OPERATIVE, 20, 24 * HOUR, NEVER)
                        .seconds()
                        .orElseThrow())
                .isGreaterThan(seconds);
        assertThat(linear.waitFor(start, 150, Watched.AIR, 16, 24 * HOUR, NEVER).seconds())
                .hasValue(0);
    }

    @Test
    void saysHowFarItCameWhenItIsNotReached() {
        Wait wait = linear.waitFor(linear.held(16), 45, Watched.AIR, 20, 6 * HOUR, NEVER);
        assertThat(wait.seconds()).isEmpty();
        assertThat(wait.temperature())
                .isBetween(16.0, 20.0)
                .isCloseTo(linear.after(linear.held(16), 45, Watched.AIR, 6 * HOUR, NEVER), within(1e-12));
    }

    @Test
    void moreHeatWarmsSooner() {
        for (WarmUp warmUp : List.of(linear, powerLaw)) {
            double last = Double.POSITIVE_INFINITY;
            for (double density = 90; density < 400; density += 31) {
                double seconds = warmUp.waitFor(warmUp.held(15), density, Watched.OPERATIVE, 21, 200 * HOUR, NEVER)
                        .seconds()
                        .orElseThrow();
                assertThat(seconds).isLessThan(last);
                last = seconds;
            }
        }
    }

    @Test
    void findsTheDensityThatWarmsInTime() {
        for (WarmUp warmUp : List.of(linear, powerLaw)) {
            State start = warmUp.held(16);
            double last = Double.POSITIVE_INFINITY;
            for (double hours : new double[] {1.5, 3, 6, 12, 100}) {
                double density = warmUp.densityWithin(start, Watched.AIR, 20, hours * HOUR, NEVER)
                        .orElseThrow();
                assertThat(density)
                        .isLessThan(last)
                        .isGreaterThan(warmUp.held(20).density());
                assertThat(warmUp.after(start, density, Watched.AIR, hours * HOUR, NEVER))
                        .isCloseTo(20, within(1.01e-4));
                last = density;
            }
        }
    }

    @Test
    void saysWhenNoDensityIsEnoughAndWhenNoneIsNeeded() {
        assertThat(linear.densityWithin(linear.held(16), Watched.AIR, 20, 300, NEVER))
                .isEmpty();
        assertThat(linear.densityWithin(linear.held(22), Watched.AIR, 20, HOUR, NEVER))
                .hasValue(0);
    }

    @Test
    void aThermostatThatOnlyHeatsLetsTheRoomBeWarmer() {
        WarmUp sunny = new WarmUp(Floors.screed(), Floors.room(1.2, 60));
        State start = sunny.heldByHeating(16);
        assertThat(start.density()).isZero();
        assertThat(sunny.moment(start).air()).isGreaterThan(25);
        assertThat(sunny.held(16).density()).isNegative();
    }

    @Test
    void coolsAfterAPowerCut() {
        PowerCut cut = PowerCut.of(linear, 20, 240 * HOUR, NEVER);
        double five = cut.secondsToFive().orElseThrow();
        assertThat(linear.after(linear.held(20), 0, Watched.AIR, five, NEVER)).isCloseTo(5, within(2e-3));
        assertThat(cut.secondsToFreezing()).isEmpty();
        assertThat(cut.heaterInTheEnd()).isPositive();

        WarmUp frosty =
                new WarmUp(Floors.screed(new Film.Constant(10.8), new Underside.Exchange(25, -10)), Floors.room());
        PowerCut frost = PowerCut.of(frosty, 20, 240 * HOUR, NEVER);
        assertThat(frost.secondsToFreezing().orElseThrow())
                .isGreaterThan(frost.secondsToFive().orElseThrow());
        assertThat(frost.heaterInTheEnd()).isNegative();
        assertThat(PowerCut.of(frosty, 20, HOUR, NEVER).secondsToFive()).isEqualTo(OptionalDouble.empty());
    }

    @Test
    void whatIsColdAlreadyTakesNoTime() {
        assertThat(PowerCut.of(linear, 4, 24 * HOUR, NEVER).secondsToFive()).hasValue(0);
        WarmUp mild = new WarmUp(Floors.screed(), new Room(9045, 150_000, 8, 1.2, 8, 0));
        assertThat(PowerCut.of(mild, 4, 240 * HOUR, NEVER).secondsToFive())
                .as("it would be 8 °C and more without heat, and never cools to 5 °C")
                .isEmpty();
    }

    @Test
    void samplesAtEqualTimes() {
        Curve curve = linear.curve(linear.held(16), 150, 6 * HOUR, 12, NEVER);
        assertThat(curve.moments()).hasSize(13);
        assertThat(curve.moments().get(0).air()).isCloseTo(16, within(1e-12));
        for (int i = 0; i < 13; i++) {
            assertThat(curve.moments().get(i).seconds()).isEqualTo(i * HOUR / 2);
        }
        assertThat(curve.moments()).isSortedAccordingTo((a, b) -> Double.compare(a.air(), b.air()));
        assertThat(curve.moments().get(12).air())
                .isCloseTo(linear.after(linear.held(16), 150, Watched.AIR, 6 * HOUR, NEVER), within(1e-3));
    }

    @Test
    void stopsWhenItIsTold() {
        AtomicInteger asked = new AtomicInteger();
        BooleanSupplier soon = () -> asked.incrementAndGet() > 5;
        assertThatThrownBy(() -> linear.after(linear.uniform(15), 100, Watched.AIR, 24 * HOUR, soon))
                .isInstanceOf(CancellationException.class);
        assertThat(asked).hasValue(6);
    }

    /** A foil right below the surface, with nothing above it that holds heat, and nothing below at all. */
    @Test
    void needsNoLayersThatHoldHeat() {
        BuildUp bare = new BuildUp(
                List.of(new FloorLayer.Massless(0.1)),
                List.of(),
                new Film.PowerLaw(8.92, 1.1),
                new Underside.Adiabatic());
        WarmUp warmUp = new WarmUp(bare, Floors.room());
        Moment start =
                warmUp.curve(warmUp.uniform(18), 100, HOUR, 1, NEVER).moments().get(0);
        assertThat(start.upwardFlux()).isCloseTo(100, within(1e-8));
        assertThat(start.heater()).isCloseTo(start.surface() + 10, within(1e-9));
        Balance balance =
                warmUp.curve(warmUp.uniform(18), 100, 10 * HOUR, 1, NEVER).balance();
        assertThat(balance.in()).isCloseTo(balance.stored() + balance.lostOutdoors(), within(1e-9 * balance.in()));
        assertThat(balance.lostBelow()).isZero();
    }

    @Test
    void aLayerWithoutResistanceChangesNothing() {
        BuildUp with = new BuildUp(
                List.of(
                        new FloorLayer.Massless(0),
                        Floors.screed().above().get(0),
                        Floors.screed().above().get(1)),
                Floors.screed().below(),
                Floors.screed().film(),
                Floors.CELLAR);
        WarmUp warmUp = new WarmUp(with, Floors.room());
        assertThat(warmUp.after(warmUp.uniform(15), 100, Watched.SURFACE, HOUR, NEVER))
                .isEqualTo(linear.after(linear.uniform(15), 100, Watched.SURFACE, HOUR, NEVER));
    }

    @Test
    void refusesWhatIsNoFloor() {
        assertThatIllegalArgumentException().isThrownBy(() -> new FloorLayer.Massive(0, 1, 1000, 1000));
        assertThatIllegalArgumentException().isThrownBy(() -> new FloorLayer.Massive(0.1, 1, Double.NaN, 1000));
        assertThatIllegalArgumentException().isThrownBy(() -> new FloorLayer.Massless(-0.1));
        assertThatIllegalArgumentException().isThrownBy(() -> new Film.Constant(0));
        assertThatIllegalArgumentException().isThrownBy(() -> new Film.PowerLaw(8.92, 0.5));
        assertThatIllegalArgumentException().isThrownBy(() -> new Underside.Exchange(-1, 10));
        assertThatIllegalArgumentException().isThrownBy(() -> Floors.room(0, 0));
        assertThatIllegalArgumentException().isThrownBy(() -> new Accuracy(1e-5, 0));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> linear.after(linear.uniform(15), 0, Watched.AIR, -1, NEVER));
        assertThatIllegalArgumentException().isThrownBy(() -> powerLaw.timeConstants(1));
        WarmUp finer = new WarmUp(Floors.screed(), Floors.room(), new Accuracy(1e-5, 2));
        assertThatIllegalArgumentException().isThrownBy(() -> finer.moment(linear.uniform(15)));
    }

    @Test
    void refusesMoreCellsThanItsBound() {
        List<FloorLayer> many =
                java.util.Collections.nCopies(200, Floors.screed().above().get(1));
        BuildUp thick = new BuildUp(many, List.of(), new Film.Constant(10.8), new Underside.Adiabatic());
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new WarmUp(thick, Floors.room(), new Accuracy(1e-5, 64)))
                .withMessageContaining("nodes");
    }
}
