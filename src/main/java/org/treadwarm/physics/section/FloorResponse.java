package org.treadwarm.physics.section;

import java.util.Arrays;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.treadwarm.physics.section.Condition.BasicCharacteristic;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;

/**
 * A floor's numbers at any flux, from a few two-dimensional fields that are solved once. Immutable.
 *
 * <p>With one coefficient h over the whole surface every number is linear in the flux upward and in the temperature difference
 * between above and below. Both factors are smooth in h; they are solved at the Chebyshev points of ln h and interpolated. At a flux q,
 * h is that of the basic characteristic applied to the mean surface temperature, as the standard states it: q = 8.92 (theta_F,m -
 * theta_i)^1.1 (EN 1264-2:2008+A1:2012, clause 4), h = q / (theta_F,m - theta_i).
 */
public final class FloorResponse {
    /** Range of h, W/(m²·K). The basic characteristic leaves it below 0.0002 W/m² and above 5 000 W/m². */
    static final double LOWEST = 3;

    static final double HIGHEST = 16;

    /** Largest error of the interpolation, relative to the largest value of each factor. */
    static final double INTERPOLATION_GOAL = 1e-4;

    static final int AT_HEATER = 0;
    static final int BETWEEN = 1;
    static final int HEATER = 2;
    static final int WATER = 3;
    static final int INPUT = 4;

    /** Place of the first layer's warm face among the numbers. */
    static final int FACES = 5;

    /** Numbers of points that are tried; the first one serves all floors but those whose heater lies bare at the surface. */
    private static final int[] POINTS = {7, 13, 25};

    private final FloorLayout layout;
    private final Accuracy accuracy;
    private final double[] nodes;
    private final double[] barycentric;

    /** What each number rises by with 1 K between above and below at the same flux, by number, then by node. */
    private final double[][] perDifference;

    /** What each number rises by with 1 W/m² upward, by number, then by node. */
    private final double[][] perFlux;

    private FloorResponse(FloorLayout layout, Accuracy accuracy, int points) {
        this.layout = layout;
        this.accuracy = accuracy;
        this.nodes = new double[points];
        this.barycentric = new double[points];
        int numbers = FACES + layout.layers().size();
        this.perDifference = new double[numbers][points];
        this.perFlux = new double[numbers][points];
        double middle = (Math.log(LOWEST) + Math.log(HIGHEST)) / 2;
        double half = (Math.log(HIGHEST) - Math.log(LOWEST)) / 2;
        for (int i = 0; i < points; i++) {
            double angle = Math.PI * (i + 0.5) / points;
            nodes[i] = middle - half * Math.cos(angle);
            barycentric[i] = (i % 2 == 0 ? 1 : -1) * Math.sin(angle);
        }
    }

    /**
     * The response of a floor. Its temperatures above, below and of the water, its cable's heat and its coefficient above do not matter.
     *
     * @param floor geometry, layers, heater and the coefficient below
     * @param stopped asked at every step of the solver whether to give up
     * @throws IllegalStateException when the fields do not converge or the interpolation is not good enough
     * @throws java.util.concurrent.CancellationException when asked to give up
     */
    public static FloorResponse of(FloorSection floor, BooleanSupplier stopped) {
        return of(floor, stopped, share -> {});
    }

    /**
     * The same, telling how far it is.
     *
     * @param progress told after every field what share of those is solved that most floors need
     */
    public static FloorResponse of(FloorSection floor, BooleanSupplier stopped, DoubleConsumer progress) {
        FloorTemperatures typical = new FloorSection(
                        floor.spacing(),
                        floor.layers(),
                        floor.heater().driven(floor.heater() instanceof WaterPipe ? 20 : 100 * floor.spacing()),
                        new Film(0, 10),
                        new Film(0, floor.below().coefficient()))
                .solve(stopped);
        UnitFields fields = new UnitFields(floor, typical.field().grid(), stopped, share(progress));
        double error = Double.NaN;
        for (int points : POINTS) {
            FloorResponse response = new FloorResponse(floor.layout(), typical.accuracy(), points);
            response.fill(fields);
            error = response.interpolationError(fields);
            if (error <= INTERPOLATION_GOAL) {
                return response;
            }
        }
        throw new IllegalStateException("the response to the coefficient above cannot be interpolated: error " + error);
    }

    /** Counts the fields; few floors need more than the fewest points and one between them. */
    private static Runnable share(DoubleConsumer progress) {
        AtomicInteger solved = new AtomicInteger();
        return () -> progress.accept(Math.min(1, solved.incrementAndGet() / (POINTS[0] + 1.0)));
    }

    private void fill(UnitFields fields) {
        for (int node = 0; node < nodes.length; node++) {
            double[][] factors = fields.factors(Math.exp(nodes[node]));
            for (int number = 0; number < perFlux.length; number++) {
                perDifference[number][node] = factors[0][number];
                perFlux[number][node] = factors[1][number];
            }
        }
    }

    /** The largest difference from fields solved between the first two points, where it is worst. */
    private double interpolationError(UnitFields fields) {
        double between = (nodes[0] + nodes[1]) / 2;
        double[][] solved = fields.factors(Math.exp(between));
        double[] weights = new double[nodes.length];
        weigh(between, weights);
        double worst = 0;
        for (int number = 0; number < perFlux.length; number++) {
            worst = Math.max(worst, error(perDifference[number], weights, solved[0][number]));
            worst = Math.max(worst, error(perFlux[number], weights, solved[1][number]));
        }
        return worst;
    }

    private static double error(double[] values, double[] weights, double solved) {
        double largest = Arrays.stream(values).map(Math::abs).max().orElseThrow();
        return largest == 0 ? 0 : Math.abs(interpolate(values, weights) - solved) / largest;
    }

    /** Room for the answers of {@link #evaluate}. */
    public FloorState newState() {
        return new FloorState(nodes.length, perFlux.length);
    }

    /** How far the numbers can be trusted, as found at a coefficient above of 10 W/(m²·K). */
    public Accuracy accuracy() {
        return accuracy;
    }

    /**
     * The floor at a flux to the room, with the coefficient of the basic characteristic. Below 0.0002 W/m² the coefficient stays at 3
     * W/(m²·K), which moves the surface by less than 0.0001 K.
     *
     * @param flux to the room, W/m², from 0 to 5 000
     * @param room temperature of the room, degrees Celsius
     * @param below temperature below, degrees Celsius
     * @param state receives the answer
     */
    public void evaluate(double flux, double room, double below, FloorState state) {
        double coefficient = flux > 0 ? flux / BasicCharacteristic.overtemperature(flux) : 0;
        evaluateAt(Math.max(LOWEST, coefficient), flux, room, below, state);
    }

    /**
     * The floor at a flux to the room, with a given coefficient.
     *
     * @param coefficient above, 3 to 16 W/(m²·K)
     * @param flux to the room, W/m², at least 0
     * @param room temperature of the room, degrees Celsius
     * @param below temperature below, degrees Celsius
     * @param state receives the answer
     */
    public void evaluateAt(double coefficient, double flux, double room, double below, FloorState state) {
        if (!(flux >= 0) || !(coefficient >= LOWEST && coefficient <= HIGHEST)) {
            throw new IllegalArgumentException(
                    "a floor's response is known for fluxes of at least 0 W/m² and coefficients from " + LOWEST + " to "
                            + HIGHEST + " W/(m²·K), not for " + flux + " and " + coefficient);
        }
        weigh(Math.log(coefficient), state.weights);
        double difference = room - below;
        for (int number = 0; number < perFlux.length; number++) {
            double base = number == INPUT ? 0 : below;
            state.numbers[number] = base
                    + difference * interpolate(perDifference[number], state.weights)
                    + flux * interpolate(perFlux[number], state.weights);
        }
        if (layout.heater() instanceof HeatingCable) {
            state.numbers[WATER] = Double.NaN;
        }
        state.flux = flux;
        state.room = room;
        state.surfaceMean = room + flux / coefficient;
    }

    /** Weights of the nodes at a place: J.-P. Berrut, L. N. Trefethen, "Barycentric Lagrange interpolation", 2004 (from memory). */
    private void weigh(double place, double[] weights) {
        double sum = 0;
        for (int i = 0; i < weights.length; i++) {
            double distance = place - nodes[i];
            if (distance == 0) {
                Arrays.fill(weights, 0);
                weights[i] = 1;
                return;
            }
            weights[i] = barycentric[i] / distance;
            sum += weights[i];
        }
        for (int i = 0; i < weights.length; i++) {
            weights[i] /= sum;
        }
    }

    private static double interpolate(double[] values, double[] weights) {
        double sum = 0;
        for (int i = 0; i < weights.length; i++) {
            sum += values[i] * weights[i];
        }
        return sum;
    }
}
