package org.treadwarm.physics.electric;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.treadwarm.physics.Require;

/** Electric circuits that feed the elements of a floor. */
public final class ElectricCircuits {
    private ElectricCircuits() {}

    /**
     * An element to feed.
     *
     * @param name its name
     * @param power at the voltage of the circuits, W
     */
    public record Load(String name, double power) {
        public Load {
            Require.positive("power of " + name, power);
        }
    }

    /**
     * A circuit.
     *
     * @param loads names of its elements, the largest first
     * @param current A
     * @param breaker rating of its breaker, A
     */
    public record Circuit(List<String> loads, double current, double breaker) {
        public Circuit {
            loads = List.copyOf(loads);
        }
    }

    /**
     * Circuits for elements that are fed whole: each, from the largest to the smallest, goes into the first circuit that still
     * carries it (of equal ones the first given goes first). That is at times one circuit more than the fewest possible. Each
     * circuit has the smallest breaker that carries it.
     *
     * @param loads the elements
     * @param voltage V
     * @param practice ratings, and how far they may be used
     * @param largestBreaker no circuit gets more than this, A
     * @throws IllegalArgumentException when no rating is as small as the largest breaker, or an element is too large for one
     */
    public static List<Circuit> of(List<Load> loads, double voltage, BreakerPractice practice, double largestBreaker) {
        Require.positive("voltage", voltage);
        double most = practice.ratings().stream()
                .mapToDouble(Double::doubleValue)
                .filter(rating -> rating <= largestBreaker)
                .max()
                .orElseThrow(() -> new IllegalArgumentException("the largest breaker is " + largestBreaker
                        + " A, allowed is at least " + practice.ratings().get(0) + " A"));
        List<List<Load>> circuits = new ArrayList<>();
        loads.stream()
                .sorted(Comparator.comparingDouble(Load::power).reversed())
                .forEach(load -> {
                    if (load.power() / voltage > practice.carries(most)) {
                        throw new IllegalArgumentException(load.name() + " draws " + load.power() / voltage
                                + " A, allowed is at most " + practice.carries(most) + " A on one circuit");
                    }
                    List<Load> room = circuits.stream()
                            .filter(circuit -> (power(circuit) + load.power()) / voltage <= practice.carries(most))
                            .findFirst()
                            .orElseGet(() -> {
                                List<Load> opened = new ArrayList<>();
                                circuits.add(opened);
                                return opened;
                            });
                    room.add(load);
                });
        return circuits.stream()
                .map(circuit -> circuit(circuit, voltage, practice))
                .toList();
    }

    private static Circuit circuit(List<Load> loads, double voltage, BreakerPractice practice) {
        double current = power(loads) / voltage;
        double breaker = practice.ratings().stream()
                .mapToDouble(Double::doubleValue)
                .filter(rating -> practice.carries(rating) >= current)
                .findFirst()
                .orElseThrow();
        return new Circuit(loads.stream().map(Load::name).toList(), current, breaker);
    }

    private static double power(List<Load> loads) {
        return loads.stream().mapToDouble(Load::power).sum();
    }
}
