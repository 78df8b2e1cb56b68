package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import org.treadwarm.sizing.WallFootEvaluation;
import org.treadwarm.sizing.WallFootEvaluation.FootPsi;
import org.treadwarm.units.Numbers;

/** The numbers of a solved wall foot in words. */
final class WallFootWords {
    /** Smallest error that is written; psi has three decimals. */
    private static final double LEAST_ERROR = 0.001;

    private WallFootWords() {}

    /** A psi value as a row of text. */
    public record Line(String psi, String error, String coupling, String cells) {}

    static Line line(FootPsi found) {
        return new Line(
                Numbers.fixed(found.psi(), 3),
                Numbers.fixed(error(found), 3),
                Numbers.fixed(found.coupling(), 3),
                Numbers.grouped(found.accuracy().cells()));
    }

    private static double error(FootPsi found) {
        return Math.max(LEAST_ERROR, Math.ceil(found.psiError() * 1000) / 1000);
    }

    /** Psi as a reading of the survey. */
    static String reading(FootPsi found) {
        return Numbers.fixed(found.psi(), 3) + " ± " + Numbers.fixed(error(found), 3) + " W/(m.K)";
    }

    /** What is taken off the section's L2D, a line each. */
    static List<Answer.Line> takenOff(WallFootEvaluation found) {
        return List.of(
                new Answer.Line(
                        "Floor, U by ISO 13370 times B'/2",
                        Numbers.fixed(found.slabTransmittance() * found.halfWidth(), 3) + " W/(m·K)",
                        Numbers.fixed(found.slabTransmittance(), 3) + " W/(m²·K) times "
                                + Numbers.fixed(found.halfWidth(), 2) + " m; in section without the wall it would be "
                                + Numbers.fixed(found.slabTransmittanceInSection(), 3) + " W/(m²·K)"),
                new Answer.Line(
                        "Wall, U times its height in the section",
                        Numbers.fixed(found.wallTransmittance() * found.wallHeight(), 3) + " W/(m·K)",
                        Numbers.fixed(found.wallTransmittance(), 3) + " W/(m²·K) times "
                                + Numbers.fixed(found.wallHeight(), 2) + " m"));
    }

    /** What a stored psi was solved from. */
    static String remark(WallFootPages.Solved solved, boolean edge) {
        JsonNode from = solved.question();
        String foot = "in section with the wall \"" + solved.wall() + "\", heated plane "
                + shown(from, "heatedPlane") + " above the ground, foundation " + shown(from, "foundation")
                + " deep of " + shown(from, "footConductivity");
        return foot
                + (edge
                        ? ", edge insulation " + shown(from, "edgeThickness") + " of " + shown(from, "edgeConductivity")
                                + ", " + shown(from, "edgeDepth") + " deep"
                        : ", without edge insulation")
                + "; internal dimensions";
    }

    private static String shown(JsonNode question, String key) {
        return Forms.shown(question.path(key)).replace('\u00a0', ' ');
    }
}
