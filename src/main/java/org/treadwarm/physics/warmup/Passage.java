package org.treadwarm.physics.warmup;

import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;

/** One passage through time, step by step, each as long as the tolerance allows. */
final class Passage {
    private static final int MOST_STEPS = 50_000;
    private static final double FIRST_STEP = 1;
    private static final double SHORTEST_STEP = 1e-12;
    private static final double SAFETY = 0.9;

    /** How near a target is met, K, and how near its step, as a share of it. */
    private static final double MEETS = 1e-9;

    private final Chain chain;
    private final double tolerance;
    private final BooleanSupplier stopped;
    private final Stepper stepper;
    private double time;
    private double step = FIRST_STEP;
    private int steps;

    Passage(Chain chain, double tolerance, State start, double density, BooleanSupplier stopped) {
        this.chain = chain;
        this.tolerance = tolerance;
        this.stopped = stopped;
        this.stepper = new Stepper(chain);
        stepper.start(start.temperatures(), density);
    }

    double time() {
        return time;
    }

    int steps() {
        return steps;
    }

    Moment moment() {
        return chain.moment(time, stepper.now());
    }

    Stepper stepper() {
        return stepper;
    }

    /** Goes on to a time. */
    void to(double until) {
        while (time < until) {
            double taken = accepted(until - time);
            stepper.take();
            // The last step may miss the time by a rounding; the next must not be a rounding long.
            time = taken >= until - time ? until : time + taken;
        }
    }

    /** Goes on until a temperature has come to a target from its side, or to a time; tells whether the target was reached. */
    boolean to(double until, Watched watched, double target) {
        double gap = chain.value(watched, stepper.now()) - target;
        if (gap == 0) {
            return true;
        }
        double side = Math.signum(gap);
        while (time < until) {
            double taken = accepted(until - time);
            if (side * (chain.value(watched, stepper.next()) - target) <= 0) {
                taken = narrowed(taken, watched, target);
                stepper.take();
                time += taken;
                return true;
            }
            stepper.take();
            time = taken >= until - time ? until : time + taken;
        }
        return false;
    }

    /** Tries steps of at most so many seconds until one keeps to the tolerance; gives its length. */
    private double accepted(double most) {
        while (true) {
            if (stopped.getAsBoolean()) {
                throw new CancellationException("stopped after " + time + " s of the floor's time");
            }
            if (steps++ >= MOST_STEPS) {
                throw new ArithmeticException("more than " + MOST_STEPS + " steps up to " + time + " s");
            }
            double tried = Math.min(step, most);
            double error = stepper.attempt(tried);
            double wanted = tried * Math.min(5, Math.max(0.2, SAFETY * Math.cbrt(tolerance / error)));
            if (error <= tolerance) {
                // A step cut short by the end of the way says nothing against a longer one.
                step = tried < step ? Math.max(step, wanted) : wanted;
                return tried;
            }
            if (wanted < SHORTEST_STEP) {
                throw new ArithmeticException("no step keeps to the tolerance at " + time + " s");
            }
            step = wanted;
        }
    }

    /** The length of the step that just meets the target, by the Illinois method; the stepper has tried it last. */
    private double narrowed(double full, Watched watched, double target) {
        double other = 0;
        double gapAtOther = chain.value(watched, stepper.now()) - target;
        double last = full;
        double gapAtLast = chain.value(watched, stepper.next()) - target;
        while (Math.abs(gapAtLast) > MEETS && Math.abs(last - other) > MEETS * full) {
            double length = last - gapAtLast * (last - other) / (gapAtLast - gapAtOther);
            stepper.attempt(length);
            double gap = chain.value(watched, stepper.next()) - target;
            if (gap * gapAtLast < 0) {
                other = last;
                gapAtOther = gapAtLast;
            } else {
                gapAtOther /= 2;
            }
            last = length;
            gapAtLast = gap;
        }
        return last;
    }
}
