package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BooleanSupplier;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.physics.section.Condition;
import org.treadwarm.physics.section.FloorHeater;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer;
import org.treadwarm.physics.section.FloorSection;
import org.treadwarm.physics.section.FloorTemperatures;
import org.treadwarm.survey.Place;
import org.treadwarm.survey.SectionQuestion;
import org.treadwarm.survey.SectionQuestion.EmbeddedKind;
import org.treadwarm.units.Reading;

/**
 * A floor solved between its cables or pipes.
 *
 * @param upwardFlux given off by the finished surface, W/m²
 * @param downwardFlux given off by the lowest face, W/m²
 * @param surface the finished surface, above the covering, degrees Celsius
 * @param heaterTemperature mean of the cable's skin or of the pipe's outside, degrees Celsius
 * @param layers highest temperature of each layer's face towards the heater; of the layer that holds it, the heater's outside
 */
public record SectionEvaluation(
        double upwardFlux,
        double downwardFlux,
        SurfaceTemperatures surface,
        double heaterTemperature,
        List<WarmFace> layers,
        SectionAccuracy accuracy) {
    /** Stands for no resistance between the water and the wall, W/(m²·K). */
    private static final double NO_FILM = 1e12;

    /** Temperatures of a surface, degrees Celsius. */
    public record SurfaceTemperatures(double mean, double maximum, double minimum) {}

    /** The warmest point of a layer. */
    public record WarmFace(String name, double temperature) {}

    /** Estimated relative error of flux and overtemperatures, relative residual, steps of the solver and cells of the last grid. */
    public record SectionAccuracy(double relativeError, double residual, int iterations, int cells) {
        static SectionAccuracy of(org.treadwarm.physics.section.Accuracy found) {
            return new SectionAccuracy(found.relativeError(), found.residual(), found.iterations(), found.cells());
        }
    }

    /**
     * Solves a section.
     *
     * @param stopped asked now and then whether to give up
     * @throws IllegalStateException when the section cannot be solved to its error within the cells allowed
     * @throws java.util.concurrent.CancellationException when asked to give up
     */
    public static SectionEvaluation of(SectionQuestion question, BooleanSupplier stopped) {
        FloorTemperatures solved = section(question).solve(stopped);
        List<WarmFace> layers = new ArrayList<>();
        for (int i = 0; i < question.layers().size(); i++) {
            layers.add(new WarmFace(
                    question.layers().get(i).title(i + 1), solved.warmFaces().get(i)));
        }
        return new SectionEvaluation(
                solved.upwardFlux(),
                solved.downwardFlux(),
                new SurfaceTemperatures(solved.surfaceMean(), solved.surfaceMaximum(), solved.surfaceMinimum()),
                solved.heaterTemperature(),
                List.copyOf(layers),
                SectionAccuracy.of(solved.accuracy()));
    }

    private static FloorSection section(SectionQuestion question) {
        Inputs inputs = new Inputs();
        StackBuilder builder = new StackBuilder(inputs);
        builder.add(Place.ROOT.at("/layers"), question.layers(), HeatFlow.UP);
        Stack stack = builder.all().get(0);
        double[] in = inputs.values();
        double[] resistances = new double[stack.layers];
        stack.evaluate(in, resistances, new double[stack.layers]);
        List<FloorLayer> layers = new ArrayList<>();
        for (int i = 0; i < stack.layers; i++) {
            layers.add(SectionGeometry.layer(
                    stack, i, in, resistances, question.layers().get(i).title(i + 1)));
        }
        return new FloorSection(
                question.spacing().value(),
                layers,
                heater(question),
                above(question.above()),
                new Condition.Film(
                        question.below().temperature().value(),
                        question.below().coefficient().value()));
    }

    private static Condition above(SectionQuestion.SectionAbove above) {
        double room = above.temperature().value();
        return above.coefficient().isPresent()
                ? new Condition.Film(room, above.coefficient().get().value())
                : new Condition.BasicCharacteristic(room);
    }

    private static FloorHeater heater(SectionQuestion question) {
        SectionQuestion.SectionHeater given = question.heater();
        if (given.kind() == EmbeddedKind.CABLE) {
            return new HeatingCable(
                    question.heaterLayer(),
                    given.depth().value(),
                    given.diameter().value(),
                    given.power().orElseThrow().value());
        }
        return new WaterPipe(
                question.heaterLayer(),
                given.depth().value(),
                given.diameter().value(),
                given.wallThickness().orElseThrow().value(),
                given.wallConductivity().orElseThrow().value(),
                given.filmCoefficient().map(Reading::value).orElse(NO_FILM),
                given.waterTemperature().orElseThrow().value());
    }
}
