package org.treadwarm.intake;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;
import org.treadwarm.survey.Readings;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.Unusual;
import org.treadwarm.units.Declared;

/** Intake notes the unusual readings that a walk over the survey finds, in its order, whichever reading it is. */
class UnusualTest {
    private static Outcome.Accepted<Survey> accepted(ObjectNode survey) {
        return (Outcome.Accepted<Survey>) Intake.survey(survey);
    }

    private static List<String> told(List<Unusual> unusual) {
        return unusual.stream()
                .map(found -> found.at().pointer() + " " + found.reading().typed() + " "
                        + found.declared().label())
                .toList();
    }

    private static Map<String, Declared> readings(ObjectNode survey) {
        Map<String, Declared> readings = new LinkedHashMap<>();
        Readings.visit(accepted(survey).value(), "", (pointer, declared, reading) -> readings.put(pointer, declared));
        return readings;
    }

    @Test
    void areThoseOfTheWalk() {
        int noted = 0;
        for (Map.Entry<String, Declared> entry : readings(Surveys.everything()).entrySet()) {
            for (double value :
                    new double[] {entry.getValue().min(), entry.getValue().max()}) {
                ObjectNode survey = Surveys.everything();
                Trees.set(survey, entry.getKey(), DoubleNode.valueOf(value));
                if (Intake.survey(survey) instanceof Outcome.Accepted<Survey> accepted) {
                    assertThat(told(accepted.unusual()))
                            .as(entry.getKey())
                            .isEqualTo(told(Unusual.in(accepted.value())));
                    noted += told(accepted.unusual()).stream().anyMatch(told -> told.startsWith(entry.getKey() + " "))
                            ? 1
                            : 0;
                }
            }
        }
        assertThat(noted).isGreaterThan(100);
    }

    @Test
    void areToldInTheOrderOfTheContractAndAtTheReadingItself() {
        ObjectNode survey = Surveys.quiet();
        assertThat(accepted(survey).unusual()).isEmpty();
        Trees.set(
                survey,
                "/rooms/0/height",
                JsonNodeFactory.instance.objectNode().put("reading", "9 m").put("basis", "told"));
        Trees.set(survey, "/site/outdoorTemperature", DoubleNode.valueOf(-58));
        ObjectNode turned = JsonNodeFactory.instance.objectNode();
        List.of("rooms", "spaces", "assemblies", "site").forEach(key -> turned.set(key, survey.get(key)));
        assertThat(accepted(turned).unusual().stream().map(found -> found.at().pointer()))
                .containsExactly("/site/outdoorTemperature", "/rooms/0/height");
        assertThat(told(accepted(turned).unusual()))
                .isEqualTo(told(Unusual.in(accepted(turned).value())));
        assertThat(Surveys.sized(turned).warnings().stream().map(warning -> warning.pointer()))
                .startsWith("/site/outdoorTemperature", "/rooms/0/height");
    }

    /** A setback may be written where the reheat stands that is computed from it; what is unusual is told where it was written. */
    @Test
    void ofASetbackAreToldWhereItIsWritten() {
        ObjectNode survey = Surveys.quiet();
        Trees.set(
                survey,
                "/rooms/0/reheat",
                JsonNodeFactory.instance.objectNode().put("from", "2 °C").put("within", "3 h"));
        assertThat(accepted(survey).unusual().stream().map(found -> found.at().pointer()))
                .containsExactly("/rooms/0/reheat/from");
    }
}
