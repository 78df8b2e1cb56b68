package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.sizing.SectionEvaluation;
import org.treadwarm.survey.SectionQuestion;

/** In the answer for a floor's section, what the heater gives goes up or down, to 1e-10 of it. */
class SectionBalanceTest {
    private final SplittableRandom random = new SplittableRandom(10211);

    @Test
    void whatTheHeaterGivesGoesUpOrDown() {
        for (int i = 0; i < 200; i++) {
            boolean water = i % 2 == 0;
            ObjectNode tree = question(water, i % 4 < 2, i % 3 == 0);
            SectionQuestion question = ((Outcome.Accepted<SectionQuestion>) Intake.section(tree)).value();
            SectionEvaluation answer = SectionEvaluation.of(question, () -> false);
            double given = water ? ofPipe(tree, answer.heaterTemperature()) : ofCable(tree);
            assertThat(Math.abs(given - answer.upwardFlux() - answer.downwardFlux()))
                    .as("question %s: %s", i, tree)
                    .isLessThan(1e-10 * given);
        }
    }

    private static double ofCable(ObjectNode tree) {
        return tree.at("/heater/power").doubleValue() / tree.at("/spacing").doubleValue();
    }

    /** Through the wall of the pipe and the film in it: two resistances of cylinders. */
    private static double ofPipe(ObjectNode tree, double outside) {
        double outer = tree.at("/heater/diameter").doubleValue();
        double inner = outer - 2 * tree.at("/heater/wallThickness").doubleValue();
        double resistance = 1
                        / (Math.PI * inner * tree.at("/heater/filmCoefficient").doubleValue())
                + Math.log(outer / inner)
                        / (2 * Math.PI * tree.at("/heater/wallConductivity").doubleValue());
        double water = tree.at("/heater/waterTemperature").doubleValue();
        return (water - outside) / resistance / tree.at("/spacing").doubleValue();
    }

    /** A screed on insulation, or a board on a void of a timber floor, invented. */
    private ObjectNode question(boolean water, boolean film, boolean timber) {
        ObjectNode tree = (ObjectNode) Trees.json("{}");
        double spacing = random.nextDouble(0.08, 0.25);
        double diameter = water ? random.nextDouble(0.012, 0.02) : random.nextDouble(0.004, 0.008);
        double thickness = diameter + random.nextDouble(0.01, 0.05);
        tree.put("spacing", spacing);
        ObjectNode above = tree.putObject("above").put("temperature", 20);
        if (film) {
            above.put("coefficient", random.nextDouble(6, 12));
        } else {
            above.put("characteristic", "EN 1264-2");
        }
        tree.putObject("below").put("temperature", random.nextDouble(12, 20)).put("coefficient", 5.9);
        ArrayNode layers = tree.putArray("layers");
        layers.addObject().put("name", "covering").put("resistance", random.nextDouble(0, 0.12));
        layers.addObject()
                .put("name", "around")
                .put("thickness", thickness)
                .put("conductivity", timber ? 0.25 : random.nextDouble(0.8, 2));
        if (timber) {
            layers.addObject().put("name", "void").put("resistance", 0.21);
        }
        layers.addObject()
                .put("name", "insulation")
                .put("thickness", random.nextDouble(0.03, 0.2))
                .put("conductivity", 0.04);
        ObjectNode heater = tree.putObject("heater")
                .put("kind", water ? "pipe" : "cable")
                .put("layer", "around")
                .put("depth", random.nextDouble(diameter / 2, thickness - diameter / 2))
                .put("diameter", diameter);
        if (water) {
            heater.put("wallThickness", 0.002)
                    .put("wallConductivity", 0.35)
                    .put("filmCoefficient", 2000)
                    .put("waterTemperature", random.nextDouble(30, 50));
        } else {
            heater.put("power", spacing * random.nextDouble(50, 150));
        }
        return tree;
    }
}
