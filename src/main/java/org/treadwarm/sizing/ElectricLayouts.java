package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.physics.PracticeLimit.Judged;
import org.treadwarm.physics.PracticeLimit.Sense;
import org.treadwarm.physics.electric.BreakerPractice;
import org.treadwarm.physics.electric.CableLaying;
import org.treadwarm.physics.electric.CableLimits;
import org.treadwarm.physics.electric.ElectricCircuits;
import org.treadwarm.physics.electric.ElectricCircuits.Circuit;
import org.treadwarm.physics.electric.ElectricCircuits.Load;
import org.treadwarm.physics.electric.HeatingElement;
import org.treadwarm.sizing.Sizing.ElectricLayout;
import org.treadwarm.sizing.Sizing.HeatingElementLayout;
import org.treadwarm.sizing.Sizing.MatCircuit;
import org.treadwarm.sizing.Sizing.MatLayout;
import org.treadwarm.sizing.Sizing.MatPieces;
import org.treadwarm.sizing.Sizing.PracticeJudgement;
import org.treadwarm.survey.CircuitRule;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.Layer;

/** Feeds the electric heater of a floor. */
final class ElectricLayouts {
    /** Largest usual breaker of a heating circuit in Europe, A; common practice, no source. */
    private static final double EUROPEAN_BREAKER = 16;

    /** Largest usual breaker of a heating circuit in the US, A; common practice, no source. */
    private static final double US_BREAKER = 20;

    /** Mains at the ends of what they may be; common practice, no source. */
    private static final double LOW_VOLTAGE = 0.9;

    private static final double HIGH_VOLTAGE = 1.1;

    /** More elements than this in one floor are a slip of the survey. */
    private static final int MOST_ELEMENTS = 200;

    private ElectricLayouts() {}

    /** The layout of a heater whose voltage is known, and whose density is or whose mats are chosen; empty for others. */
    static Optional<ElectricLayout> of(FloorEvaluation floor, HeatedFloor given, Optional<MatLayout> mats) {
        Optional<Heater> heater = given.heater().filter(each -> each.voltage().isPresent());
        boolean dense = floor.plan.heater().hasDensity() && floor.density() > 0;
        if (heater.isEmpty() || mats.isEmpty() && !dense) {
            return Optional.empty();
        }
        double voltage = heater.get().voltage().get().value();
        if (mats.isPresent()) {
            List<PracticeJudgement> limits = limits(mats.get(), given);
            return Optional.of(layout(
                    voltage, OptionalDouble.empty(), List.of(), mats, mats.get().power(), limits));
        }
        double power = floor.density() * floor.area;
        List<HeatingElementLayout> elements = elements(heater.get(), voltage, power);
        return elements.isEmpty()
                ? Optional.empty()
                : Optional.of(layout(voltage, cable(floor), elements, mats, power, limits(floor, given, heater.get())));
    }

    private static ElectricLayout layout(
            double voltage,
            OptionalDouble cableLength,
            List<HeatingElementLayout> elements,
            Optional<MatLayout> mats,
            double power,
            List<PracticeJudgement> limits) {
        HeatingElement whole = new HeatingElement(power, voltage);
        return new ElectricLayout(
                voltage,
                cableLength,
                elements,
                mats,
                whole.powerAt(LOW_VOLTAGE * voltage),
                whole.powerAt(HIGH_VOLTAGE * voltage),
                limits);
    }

    /** Equal parts, each on a circuit of its own; empty when they are beyond any floor. */
    private static List<HeatingElementLayout> elements(Heater heater, double voltage, double power) {
        BreakerPractice practice = practice(heater);
        double largest = largestBreaker(heater);
        int count = (int) Math.min(
                MOST_ELEMENTS + 1.0, Math.ceil(power / voltage / (largest * practice.continuousShare()) - 1e-9));
        if (count > MOST_ELEMENTS) {
            return List.of();
        }
        List<Load> loads = Collections.nCopies(Math.max(1, count), new Load("element", power / Math.max(1, count)));
        List<HeatingElementLayout> elements = new ArrayList<>();
        for (Circuit circuit : ElectricCircuits.of(loads, voltage, practice, largest)) {
            HeatingElement element = new HeatingElement(loads.get(0).power(), voltage);
            elements.add(new HeatingElementLayout(
                    element.power(),
                    element.current(),
                    circuit.breaker(),
                    element.resistance(),
                    element.lowestResistance(),
                    element.highestResistance()));
        }
        return List.copyOf(elements);
    }

    /** Circuits of mats; empty when one of them is too large for the largest usual breaker, or there are too many. */
    static List<MatCircuit> circuits(Heater heater, List<MatPieces> mats) {
        double voltage = heater.voltage().orElseThrow().value();
        BreakerPractice practice = practice(heater);
        double largest = largestBreaker(heater);
        double most = largest * practice.continuousShare();
        long count = mats.stream().mapToLong(MatPieces::count).sum();
        if (count > MOST_ELEMENTS || mats.stream().anyMatch(mat -> mat.current() > most)) {
            return List.of();
        }
        List<Load> loads = mats.stream()
                .flatMap(mat -> Collections.nCopies(mat.count(), new Load(mat.name(), mat.power())).stream())
                .toList();
        return ElectricCircuits.of(loads, voltage, practice, largest).stream()
                .map(circuit -> new MatCircuit(circuit.loads(), circuit.current(), circuit.breaker()))
                .toList();
    }

    private static BreakerPractice practice(Heater heater) {
        return heater.circuitRule() == CircuitRule.US ? Practice.usBreakers() : Practice.europeanBreakers();
    }

    private static double largestBreaker(Heater heater) {
        return heater.circuitRule() == CircuitRule.US ? US_BREAKER : EUROPEAN_BREAKER;
    }

    private static List<PracticeJudgement> limits(FloorEvaluation floor, HeatedFloor given, Heater heater) {
        boolean timber = onTimber(given);
        if (!given.parts().isEmpty()) {
            double linear = heater.linearPower().orElseThrow().value();
            double densest = floor.plan.parts().stream()
                    .mapToDouble(part -> linear / floor.whole().in[part.spacing()])
                    .max()
                    .orElseThrow();
            return judgements(CableLimits.judge(linear, densest, timber, Practice.electric()));
        }
        double density = floor.density();
        return judgements(
                heater.spacing().isPresent()
                        ? CableLimits.judge(
                                density * heater.spacing().get().value(), density, timber, Practice.electric())
                        : CableLimits.judgeDensity(density, timber, Practice.electric()));
    }

    private static List<PracticeJudgement> limits(MatLayout mats, HeatedFloor given) {
        double densest =
                mats.pieces().stream().mapToDouble(MatPieces::density).max().orElseThrow();
        return judgements(CableLimits.judgeDensity(densest, onTimber(given), Practice.electric()));
    }

    private static boolean onTimber(HeatedFloor given) {
        return given.below().stream().findFirst().map(ElectricLayouts::isTimber).orElse(false);
    }

    /** Cable of the runs at their spacing, m; empty where no spacing is known. */
    private static OptionalDouble cable(FloorEvaluation floor) {
        if (!floor.plan.parts().isEmpty()) {
            return OptionalDouble.of(floor.cable());
        }
        int spacing = floor.plan.heater().spacing();
        return spacing == Stack.NONE
                ? OptionalDouble.empty()
                : OptionalDouble.of(CableLaying.length(floor.area, floor.whole().in[spacing]));
    }

    private static boolean isTimber(Layer layer) {
        String words = (layer.name().orElse("") + " " + layer.material().orElse("")).toLowerCase(Locale.ROOT);
        return List.of("timber", "joist", "wood", "plywood", "chipboard", "board on joists").stream()
                .anyMatch(words::contains);
    }

    static List<PracticeJudgement> judgements(List<Judged> judged) {
        return judged.stream()
                .map(each -> new PracticeJudgement(
                        each.name(),
                        Optional.of(each.sense() == Sense.AT_MOST ? "at most" : "at least"),
                        each.value(),
                        each.limit(),
                        each.margin(),
                        each.source()))
                .toList();
    }
}
