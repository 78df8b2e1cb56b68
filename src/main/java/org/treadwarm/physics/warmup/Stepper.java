package org.treadwarm.physics.warmup;

/**
 * Steps in time by TR-BDF2: second order, L-stable, one matrix for both stages, with an embedded third-order formula that tells the
 * error of the step. Source: M. E. Hosea, L. F. Shampine, "Analysis and implementation of TR-BDF2", Applied Numerical Mathematics
 * 20 (1996) 21-37 (from memory; the order is held by a test).
 *
 * <p>Nodes that hold no heat are in balance at every stage. What passes the boundaries is summed up by the weights of the method,
 * so heat put in equals heat stored and lost up to rounding. Nothing is allocated while stepping; that is why the arrays are
 * fields.
 */
final class Stepper {
    private static final double DIAGONAL = 1 - Math.sqrt(0.5);
    private static final double WEIGHT = Math.sqrt(2) / 4;

    /** So short a time that no cell changes; it brings the nodes without heat into balance. */
    private static final double INSTANT = 1e-25;

    private static final int MOST_ITERATIONS = 30;
    private static final double CONVERGED = 1e-10;

    /** Beyond it errors count relative to the temperature, °C: no room, but the plane of a heater wrapped up far too well. */
    private static final double HOT = 100;

    private final Chain chain;
    private final int nodes;
    private final boolean linear;
    private final double[] capacity;
    private final double[] conductance;
    private final double[] now;
    private final double[] next;
    private final double[] middle;
    private final double[] base;
    private final double[] flow1;
    private final double[] flow2;
    private final double[] flow3;
    private final double[] ratio;
    private final double[] inverse;
    private final double[] change;
    private double density;
    private double factored;
    private double step;
    private double lostOutdoors;
    private double lostBelow;

    Stepper(Chain chain) {
        this.chain = chain;
        this.nodes = chain.nodes();
        this.linear = chain.film instanceof Film.Constant;
        this.capacity = chain.capacity();
        this.conductance = chain.conductance();
        now = new double[nodes];
        next = new double[nodes];
        middle = new double[nodes];
        base = new double[nodes];
        flow1 = new double[nodes];
        flow2 = new double[nodes];
        flow3 = new double[nodes];
        ratio = new double[nodes];
        inverse = new double[nodes];
        change = new double[nodes];
    }

    /** Begins anew from given temperatures with the heater at a density. */
    void start(double[] temperatures, double heaterDensity) {
        System.arraycopy(temperatures, 0, now, 0, nodes);
        density = heaterDensity;
        lostOutdoors = 0;
        lostBelow = 0;
        factored = 0;
        System.arraycopy(now, 0, base, 0, nodes);
        if (!stage(now, INSTANT)) {
            throw new ArithmeticException("the surface of the floor finds no balance with the room");
        }
        flows(now, flow1);
        for (int i = 0; i < nodes; i++) {
            if (capacity[i] == 0) {
                flow1[i] = 0;
            }
        }
    }

    /** The temperatures reached. */
    double[] now() {
        return now;
    }

    /** The temperatures that the step tried last would reach. */
    double[] next() {
        return next;
    }

    /** Heat lost to outdoors since the start, J/m². */
    double lostOutdoors() {
        return lostOutdoors;
    }

    /** Heat lost below since the start, J/m². */
    double lostBelow() {
        return lostBelow;
    }

    /** Tries a step of so many seconds and gives its largest estimated error, K; infinite when its equations did not converge. */
    double attempt(double seconds) {
        step = seconds;
        double implicit = DIAGONAL * seconds;
        for (int i = 0; i < nodes; i++) {
            base[i] = capacity[i] == 0 ? now[i] : now[i] + implicit * flow1[i] / capacity[i];
            middle[i] = now[i];
        }
        if (!stage(middle, implicit)) {
            return Double.POSITIVE_INFINITY;
        }
        held(middle, implicit, flow2);
        double explicit = WEIGHT * seconds;
        for (int i = 0; i < nodes; i++) {
            base[i] = capacity[i] == 0 ? now[i] : now[i] + explicit * (flow1[i] + flow2[i]) / capacity[i];
            next[i] = middle[i];
        }
        if (!stage(next, implicit)) {
            return Double.POSITIVE_INFINITY;
        }
        held(next, implicit, flow3);
        return error();
    }

    /** Takes the step that was tried last. */
    void take() {
        lostOutdoors += step * (WEIGHT * (outdoors(now) + outdoors(middle)) + DIAGONAL * outdoors(next));
        lostBelow += step * (WEIGHT * (below(now) + below(middle)) + DIAGONAL * below(next));
        System.arraycopy(next, 0, now, 0, nodes);
        System.arraycopy(flow3, 0, flow1, 0, nodes);
    }

    private double outdoors(double[] temperatures) {
        return chain.room.lossCoefficient() * (temperatures[chain.air] - chain.room.outdoorTemperature());
    }

    private double below(double[] temperatures) {
        return chain.undersideCoefficient * (temperatures[0] - chain.undersideTemperature);
    }

    /** Heat that each node takes up per second over the implicit part of a stage, W/m². */
    private void held(double[] temperatures, double implicit, double[] flow) {
        for (int i = 0; i < nodes; i++) {
            flow[i] = capacity[i] * (temperatures[i] - base[i]) / implicit;
        }
    }

    /** Difference of the two formulas, made finite for fast nodes by the matrix of the stage. */
    private double error() {
        for (int i = 0; i < nodes; i++) {
            change[i] = ((4 * WEIGHT - 1) * flow1[i] - flow2[i] + 2 * DIAGONAL * flow3[i]) / (3 * DIAGONAL);
        }
        solve();
        double largest = 0;
        for (int i = 0; i < nodes; i++) {
            largest = Math.max(largest, relative(change[i], next[i]));
        }
        return largest;
    }

    private static double relative(double change, double temperature) {
        return Math.abs(change) / Math.max(1, Math.abs(temperature) / HOT);
    }

    /** Solves capacity (T - base)/implicit = flows(T) by Newton's method from the temperatures given. */
    private boolean stage(double[] temperatures, double implicit) {
        for (int iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
            flows(temperatures, change);
            for (int i = 0; i < nodes; i++) {
                change[i] -= capacity[i] * (temperatures[i] - base[i]) / implicit;
            }
            if (!linear || factored != implicit) {
                factor(temperatures, implicit);
            }
            solve();
            double largest = 0;
            for (int i = 0; i < nodes; i++) {
                temperatures[i] += change[i];
                largest = Math.max(largest, relative(change[i], temperatures[i]));
            }
            if (linear || largest < CONVERGED) {
                return true;
            }
        }
        return false;
    }

    /** Heat that flows into each node, W/m². */
    private void flows(double[] temperatures, double[] into) {
        double fromBelow = chain.undersideCoefficient * (chain.undersideTemperature - temperatures[0]);
        for (int i = 0; i < nodes - 1; i++) {
            double upward = i == chain.surface
                    ? chain.film.flux(temperatures[i] - temperatures[i + 1])
                    : conductance[i] * (temperatures[i] - temperatures[i + 1]);
            into[i] = fromBelow - upward;
            fromBelow = upward;
        }
        into[nodes - 1] = fromBelow;
        into[chain.heater] += density;
        into[chain.air] += chain.room.otherGain() - outdoors(temperatures);
    }

    /** Factors capacity/implicit less the slopes of the flows: L D Lᵀ of a symmetric tridiagonal matrix. */
    private void factor(double[] temperatures, double implicit) {
        double fromBelow = chain.undersideCoefficient;
        double eliminated = 0;
        for (int i = 0; i < nodes; i++) {
            double upward = link(i, temperatures);
            double loss = i == chain.air ? chain.room.lossCoefficient() : 0;
            inverse[i] = 1 / (capacity[i] / implicit + fromBelow + upward + loss - eliminated);
            ratio[i] = upward * inverse[i];
            eliminated = upward * ratio[i];
            fromBelow = upward;
        }
        factored = implicit;
    }

    private double link(int i, double[] temperatures) {
        return i == chain.surface ? chain.film.slope(temperatures[i] - temperatures[i + 1]) : conductance[i];
    }

    private void solve() {
        for (int i = 1; i < nodes; i++) {
            change[i] += ratio[i - 1] * change[i - 1];
        }
        change[nodes - 1] *= inverse[nodes - 1];
        for (int i = nodes - 2; i >= 0; i--) {
            change[i] = change[i] * inverse[i] + ratio[i] * change[i + 1];
        }
    }
}
