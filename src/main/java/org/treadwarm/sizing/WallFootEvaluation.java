package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.physics.ground.SlabOnGround;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.physics.section.WallFoot;
import org.treadwarm.physics.section.WallFoot.EdgeInsulation;
import org.treadwarm.physics.section.WallFoot.Wall;
import org.treadwarm.physics.section.WallFootCoupling;
import org.treadwarm.sizing.SectionEvaluation.SectionAccuracy;
import org.treadwarm.survey.LayerMatter;
import org.treadwarm.survey.Place;
import org.treadwarm.survey.WallFootQuestion;
import org.treadwarm.tables.Films;
import org.treadwarm.units.Reading;

/**
 * The psi value of a wall's foot beside a heated slab on the ground, without edge insulation and, where it is given, with it.
 *
 * <p>Psi is for internal dimensions, which for a wall's foot are the overall internal ones too: psi = L2D - U_floor B'/2 - U_wall h
 * (ISO 10211:2017, the linear transmittance of wall and ground floor, the way that takes the floor's U from ISO 13370; from memory).
 * L2D is the section's heat per metre and kelvin between inside and outside; inside counts as one temperature, that of the heated
 * plane, so psi goes with the heated plane's temperature less that outdoors. U_floor is the very ISO 13370 value by which a sizing
 * counts the floor, without season and groundwater factor, with the floor's layers below the heated plane; h is the wall from the
 * finished surface up, as internal dimensions tape it. So floor, wall and psi add up to L2D, and nothing is counted twice or left
 * out. On the safe side: the wall beside the room is part of psi where it loses more than its U-value says, and the room is colder
 * than the heated plane.
 *
 * @param dimensions the dimension system of psi
 * @param withoutEdge without edge insulation
 * @param withEdge with the edge insulation that was given
 * @param slabTransmittance U_floor, W/(m²·K)
 * @param slabTransmittanceInSection the same from a section without the wall; not used for psi, only to compare
 * @param wallTransmittance U_wall, W/(m²·K)
 * @param halfWidth of floor taken off, B'/2, m
 * @param wallHeight of wall taken off, m
 */
public record WallFootEvaluation(
        String dimensions,
        FootPsi withoutEdge,
        Optional<FootPsi> withEdge,
        double slabTransmittance,
        double slabTransmittanceInSection,
        double wallTransmittance,
        double halfWidth,
        double wallHeight) {
    /**
     * One solved section.
     *
     * @param psi W/(m·K)
     * @param psiError estimated, W/(m·K), either way
     * @param coupling L2D, W/(m·K)
     * @param accuracy of the coupling
     */
    public record FootPsi(double psi, double psiError, double coupling, SectionAccuracy accuracy) {}

    /**
     * Solves the sections.
     *
     * @param question one that intake accepted
     * @param stopped asked now and then whether to give up
     * @param progress told now and then what share is done
     * @throws IllegalArgumentException when the section cannot be built
     * @throws IllegalStateException when it cannot be solved to its error within the cells allowed
     * @throws java.util.concurrent.CancellationException when asked to give up
     */
    public static WallFootEvaluation of(WallFootQuestion question, BooleanSupplier stopped, DoubleConsumer progress) {
        Optional<EdgeInsulation> strip = strip(question);
        double parts = strip.isPresent() ? 3 : 2;
        WallFoot bare = foot(question, Optional.empty());
        double inSection = bare.slabCoefficient(stopped);
        progress.accept(1 / parts);
        WallFootCoupling without = bare.solve(inSection, stopped);
        progress.accept(2 / parts);
        Optional<WallFootCoupling> with =
                strip.map(given -> foot(question, Optional.of(given)).solve(inSection, stopped));
        double slab = slabTransmittance(question, bare);
        double height = without.wallHeight() - question.above().value();
        return new WallFootEvaluation(
                "internal",
                psi(without, slab, height),
                with.map(solved -> psi(solved, slab, height)),
                slab,
                inSection,
                without.wallCoefficient(),
                without.halfWidth(),
                height);
    }

    /** The edge insulation of a question, where it has one. */
    static Optional<EdgeInsulation> strip(WallFootQuestion question) {
        return question.edgeThickness()
                .map(thickness -> new EdgeInsulation(
                        thickness.value(),
                        question.edgeConductivity().orElseThrow().value(),
                        question.edgeDepth().orElseThrow().value()));
    }

    private static FootPsi psi(WallFootCoupling solved, double slab, double height) {
        return new FootPsi(
                solved.psi(slab, height),
                solved.accuracy().relativeError() * solved.coupling(),
                solved.coupling(),
                SectionAccuracy.of(solved.accuracy()));
    }

    private static double slabTransmittance(WallFootQuestion question, WallFoot foot) {
        double soil = question.soilConductivity().value();
        double thickness = SlabOnGround.equivalentThickness(
                question.wallThickness().value(), soil, foot.slabResistance() + Films.outside("down"));
        return SlabOnGround.transmittance(question.characteristicDimension().value(), thickness, soil);
    }

    /** The section of a question. */
    static WallFoot foot(WallFootQuestion question, Optional<EdgeInsulation> strip) {
        List<Solid> slab = new ArrayList<>();
        for (int i = 0; i < question.below().size(); i++) {
            LayerMatter matter = LayerMatter.of(question.below().get(i));
            slab.add(new Solid(
                    question.below().get(i).title(i + 1),
                    matter.thickness().orElseThrow(),
                    matter.conductivity().orElseThrow()));
        }
        double inside =
                question.insideCoefficient().map(WallFootEvaluation::film).orElse(Films.inside("horizontal"));
        double outside =
                question.outsideCoefficient().map(WallFootEvaluation::film).orElse(Films.outside("horizontal"));
        return new WallFoot(
                question.halfWidth(),
                slab,
                question.heatedPlane().value(),
                wall(question, inside + outside),
                strip,
                question.soilConductivity().value(),
                inside,
                outside);
    }

    private static double film(Reading coefficient) {
        return 1 / coefficient.value();
    }

    /** The wall as one material of its layers' thickness and, without films, of their resistance by the combined method. */
    private static Wall wall(WallFootQuestion question, double films) {
        double thickness = question.thicknessOfWall();
        Inputs inputs = new Inputs();
        StackBuilder builder = new StackBuilder(inputs);
        builder.add(Place.ROOT.at("/wall"), question.wall(), HeatFlow.HORIZONTAL);
        Stack stack = builder.all().get(0);
        double[] in = inputs.values();
        double[] layer = new double[stack.layers];
        double[] framing = new double[stack.layers];
        stack.evaluate(in, layer, framing);
        double resistance = stack.total(films, in, layer, framing, new Stack.Frames()) - films;
        return new Wall(
                thickness,
                thickness / resistance,
                Wall.leastHeight(thickness) + question.above().value(),
                question.foundation().value(),
                question.footConductivity().value());
    }
}
