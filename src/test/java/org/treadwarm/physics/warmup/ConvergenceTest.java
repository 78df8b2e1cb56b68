package org.treadwarm.physics.warmup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;
import static org.treadwarm.physics.warmup.Floors.HOUR;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The numerical solution comes to the closed forms, and at the rate it should. */
class ConvergenceTest {
    private static final double CONDUCTIVITY = 1.4;
    private static final double DENSITY = 2000;
    private static final double SPECIFIC_HEAT = 1000;
    private static final SemiInfiniteSolid SOLID = new SemiInfiniteSolid(CONDUCTIVITY, 7e-7);

    /** Far more than heat spreads in four hours. */
    private static final double DEEP = 2;

    private static final Accuracy FINE = new Accuracy(1e-8, 8);

    private static FloorLayer.Massive layer(double thickness) {
        return new FloorLayer.Massive(thickness, CONDUCTIVITY, DENSITY, SPECIFIC_HEAT);
    }

    private static Moment after(BuildUp floor, Room room, double start, double density, double seconds, Accuracy fine) {
        WarmUp warmUp = new WarmUp(floor, room, fine);
        State uniform = warmUp.uniform(start);
        if (room.lossCoefficient() > 1e6) {
            int nodes = uniform.temperatures().length;
            Arrays.fill(uniform.temperatures(), nodes - 2, nodes, room.outdoorTemperature());
        }
        return warmUp.curve(uniform, density, seconds, 1, () -> false).moments().get(1);
    }

    /** The heater at the bottom of a thick layer heats its face by a constant flux. */
    @ParameterizedTest
    @ValueSource(doubles = {600, 3600, 14400})
    void heatsADeepSolidByItsFlux(double seconds) {
        BuildUp deep = new BuildUp(List.of(layer(DEEP)), List.of(), new Film.Constant(10), new Underside.Adiabatic());
        Moment moment = after(deep, Floors.bath(10), 10, 100, seconds, FINE);
        assertThat(moment.heater() - 10).isCloseTo(SOLID.riseUnderFlux(0, seconds, 100), withinPercentage(0.01));
    }

    /** The heater plane, unheated, tells the temperature at its depth below a warmer room. */
    @ParameterizedTest
    @CsvSource({"0.02, 600", "0.02, 3600", "0.02, 14400", "0.05, 600", "0.05, 3600", "0.05, 14400"})
    void warmsADeepSolidThroughItsFilm(double depth, double seconds) {
        BuildUp deep = new BuildUp(
                List.of(layer(depth)), List.of(layer(DEEP)), new Film.Constant(10.8), new Underside.Adiabatic());
        Moment moment = after(deep, Floors.bath(11), 10, 0, seconds, FINE);
        assertThat(moment.air()).isCloseTo(11, within(1e-6));
        assertThat(moment.heater() - 10).isCloseTo(SOLID.shareBehindFilm(depth, seconds, 10.8), within(2e-5));
        assertThat(moment.surface() - 10).isCloseTo(SOLID.shareBehindFilm(0, seconds, 10.8), within(2e-5));
    }

    /** A wall over an adiabatic plane is half of a wall between two films. */
    @ParameterizedTest
    @CsvSource({"1, 0.05", "1, 0.2", "1, 1", "5, 0.05", "5, 0.5", "50, 0.2", "50, 1"})
    void coolsAPlaneWall(double biot, double fourier) {
        double half = 0.1;
        BuildUp wall = new BuildUp(
                List.of(layer(half)),
                List.of(),
                new Film.Constant(biot * CONDUCTIVITY / half),
                new Underside.Adiabatic());
        Moment moment = after(wall, Floors.bath(0), 1, 0, fourier * half * half / 7e-7, FINE);
        assertThat(moment.heater()).isCloseTo(new PlaneWall(biot).share(0, fourier), within(2e-5));
        assertThat(moment.surface()).isCloseTo(new PlaneWall(biot).share(1, fourier), within(2e-5));
    }

    /** A layer of great conductivity is at one temperature throughout. */
    @Test
    void coolsAndHeatsALumpedLayer() {
        BuildUp lump = new BuildUp(
                List.of(new FloorLayer.Massive(0.05, 1e5, 2000, 1000)),
                List.of(),
                new Film.Constant(10.8),
                new Underside.Adiabatic());
        LumpedLayer closed = new LumpedLayer(100_000, 10.8);
        assertThat(after(lump, Floors.bath(0), 10, 0, HOUR, FINE).surface())
                .isCloseTo(closed.left(10, HOUR), within(2e-5));
        assertThat(after(lump, Floors.bath(0), 0, 100, HOUR, FINE).surface())
                .isCloseTo(closed.rise(100, HOUR), within(5e-5));
    }

    /** Halving the cells quarters the error. */
    @Test
    void isOfSecondOrderInSpace() {
        double coarse = surface(new Accuracy(1e-9, 1));
        double middle = surface(new Accuracy(1e-9, 2));
        double fine = surface(new Accuracy(1e-9, 4));
        assertThat((coarse - middle) / (middle - fine)).isBetween(3.7, 4.3);
    }

    /** The error goes with the tolerance as that of a second-order method does: to the power of 2/3. */
    @Test
    void errorInTimeFollowsTheTolerance() {
        double exact = surface(new Accuracy(1e-11, 1));
        double coarse = surface(new Accuracy(1e-6, 1)) - exact;
        double fine = surface(new Accuracy(1e-9, 1)) - exact;
        assertThat(coarse / fine).isBetween(30.0, 300.0);
    }

    /** Steps of one length: half as long, a quarter of the error. */
    @Test
    void isOfSecondOrderInTime() {
        double exact = stepped(3200);
        double coarse = stepped(50) - exact;
        double fine = stepped(100) - exact;
        assertThat(coarse / fine).isBetween(3.6, 4.4);
    }

    private static double stepped(int steps) {
        Chain chain = new Chain(Floors.screed(), Floors.room(), 1);
        Stepper stepper = new Stepper(chain);
        double[] start = new double[chain.nodes()];
        SteadyState.fill(chain, Floors.screed(), Floors.room(), 15, start);
        stepper.start(start, 120);
        for (int i = 0; i < steps; i++) {
            stepper.attempt(86_400.0 / steps);
            stepper.take();
        }
        return stepper.now()[chain.air];
    }

    private static double surface(Accuracy accuracy) {
        return after(Floors.screed(), Floors.room(), 15, 120, 2 * HOUR, accuracy)
                .surface();
    }

    /** What is slowest decays by its time constant. */
    @Test
    void theLongestTimeConstantIsThatOfTheDecay() {
        WarmUp warmUp = new WarmUp(Floors.screed(), Floors.room(), new Accuracy(1e-9, 1));
        double rest = warmUp.moment(warmUp.steady(0)).air();
        double early = warmUp.after(warmUp.held(20), 0, Watched.AIR, 200 * HOUR, () -> false) - rest;
        double late = warmUp.after(warmUp.held(20), 0, Watched.AIR, 250 * HOUR, () -> false) - rest;
        assertThat(50 * HOUR / Math.log(early / late)).isCloseTo(warmUp.timeConstants(1)[0], within(2.0));
    }
}
