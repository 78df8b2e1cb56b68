package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.physics.PracticeLimit.Judged;
import org.treadwarm.physics.electric.BreakerPractice;
import org.treadwarm.physics.electric.CableLaying;
import org.treadwarm.physics.electric.CableLimits;
import org.treadwarm.physics.electric.ElectricCircuits;
import org.treadwarm.physics.electric.ElectricCircuits.Circuit;
import org.treadwarm.physics.electric.ElectricCircuits.Load;
import org.treadwarm.physics.electric.HeatingElement;
import org.treadwarm.sizing.Sizing.ElectricLayout;
import org.treadwarm.sizing.Sizing.HeatingElementLayout;
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

    /** The layout of a heater whose voltage and density are known; empty for others. */
    static Optional<ElectricLayout> of(FloorEvaluation floor, HeatedFloor given) {
        Optional<Heater> heater = given.heater().filter(each -> each.voltage().isPresent());
        if (heater.isEmpty() || !floor.plan.heater().hasDensity() || floor.density() <= 0) {
            return Optional.empty();
        }
        double voltage = heater.get().voltage().get().value();
        double power = floor.density() * floor.area;
        boolean us = heater.get().circuitRule() == CircuitRule.US;
        BreakerPractice practice = us ? Practice.usBreakers() : Practice.europeanBreakers();
        double largest = us ? US_BREAKER : EUROPEAN_BREAKER;
        int count = (int) Math.min(
                MOST_ELEMENTS + 1.0, Math.ceil(power / voltage / (largest * practice.continuousShare()) - 1e-9));
        if (count > MOST_ELEMENTS) {
            return Optional.empty();
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
        HeatingElement whole = new HeatingElement(power, voltage);
        return Optional.of(new ElectricLayout(
                voltage,
                cable(floor),
                List.copyOf(elements),
                whole.powerAt(LOW_VOLTAGE * voltage),
                whole.powerAt(HIGH_VOLTAGE * voltage),
                limits(floor, given, heater.get())));
    }

    private static List<PracticeJudgement> limits(FloorEvaluation floor, HeatedFloor given, Heater heater) {
        if (heater.spacing().isEmpty() && given.parts().isEmpty()) {
            return List.of();
        }
        boolean timber = given.below().stream()
                .findFirst()
                .map(ElectricLayouts::isTimber)
                .orElse(false);
        if (given.parts().isEmpty()) {
            double linear = floor.density() * heater.spacing().get().value();
            return judgements(CableLimits.judge(linear, floor.density(), timber, Practice.electric()));
        }
        double linear = heater.linearPower().orElseThrow().value();
        double densest = floor.plan.parts().stream()
                .mapToDouble(part -> linear / floor.whole().in[part.spacing()])
                .max()
                .orElseThrow();
        return judgements(CableLimits.judge(linear, densest, timber, Practice.electric()));
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
                .map(each ->
                        new PracticeJudgement(each.name(), each.value(), each.limit(), each.margin(), each.source()))
                .toList();
    }
}
