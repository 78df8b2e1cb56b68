package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.intake.AssemblyQuestion;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.survey.Assembly;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.ReadingException;
import org.treadwarm.units.ReadingParser;

/** Single parts read out of a draft that cannot be read as a whole yet. */
final class Excerpt {
    private Excerpt() {}

    /** One assembly, if it has no problems of its own. */
    static Optional<Assembly> assembly(JsonNode node) {
        Outcome<AssemblyQuestion> outcome = Intake.assembly(node);
        return outcome instanceof Outcome.Accepted<AssemblyQuestion> accepted
                ? Optional.of(accepted.value().assembly())
                : Optional.empty();
    }

    /** The site's outdoor temperature, if it can be read. */
    static OptionalDouble outdoorTemperature(JsonNode document) {
        JsonNode node = document.path("site").path("outdoorTemperature");
        double value = Double.NaN;
        try {
            value = node.isNumber()
                    ? node.doubleValue()
                    : ReadingParser.parse(Forms.shown(node), QuantityKind.TEMPERATURE)
                            .value();
        } catch (ReadingException e) {
            return OptionalDouble.empty();
        }
        return value >= -60 && value <= 60 ? OptionalDouble.of(value) : OptionalDouble.empty();
    }
}
