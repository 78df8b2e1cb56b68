package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Step;
import org.treadwarm.sizing.Working;
import org.treadwarm.survey.Readings;
import org.treadwarm.survey.Survey;
import org.treadwarm.tables.Formulas;
import org.treadwarm.tables.Formulas.Formula;
import org.treadwarm.units.Numbers;
import org.treadwarm.wire.Json;

/** The working of one part as rows of text: the number, its formula and source, and what went in. */
final class WorkingView {
    private static final int DIGITS = 6;
    private static final int MOST_SHOWN = 6;

    private WorkingView() {}

    /** One number and how it came about. */
    public record Row(String address, String value, String formula, String words, String source, List<String> inputs) {}

    /** The rows of every number below an address of the answer. */
    static List<Row> of(Survey survey, Sizing sizing, String below) {
        JsonNode answer = Json.tree(sizing);
        Map<String, Double> readings = new HashMap<>();
        Readings.visit(survey, "", (pointer, declared, reading) -> readings.put(pointer, reading.value()));
        List<Row> rows = new ArrayList<>();
        for (Step step : Working.of(survey, sizing)) {
            if (step.address().startsWith(below + "/")) {
                Formula formula = Formulas.find(step.formula()).orElseThrow();
                rows.add(new Row(
                        step.address().substring(below.length() + 1),
                        number(answer.at(step.address()).doubleValue()),
                        formula.formula(),
                        formula.words(),
                        formula.source(),
                        inputs(step, answer, readings)));
            }
        }
        return rows;
    }

    /** Every formula, for the page of the method. */
    static List<Formula> formulas() {
        return Formulas.all();
    }

    private static List<String> inputs(Step step, JsonNode answer, Map<String, Double> readings) {
        List<String> inputs = new ArrayList<>();
        step.symbols().forEach((symbol, addresses) -> {
            List<String> values = addresses.stream()
                    .limit(MOST_SHOWN)
                    .map(address -> value(address, answer, readings))
                    .toList();
            String more = addresses.size() > MOST_SHOWN ? ", and " + (addresses.size() - MOST_SHOWN) + " more" : "";
            inputs.add(symbol + " = " + String.join(", ", values) + more);
        });
        return inputs;
    }

    private static String value(String address, JsonNode answer, Map<String, Double> readings) {
        String pointer = address.substring(address.indexOf(':') + 1);
        if (address.startsWith("sizing:") && answer.at(pointer).isNumber()) {
            return number(answer.at(pointer).doubleValue()) + " (" + pointer + ")";
        }
        Double reading = address.startsWith("survey:") ? readings.get(pointer) : null;
        return reading != null ? number(reading) + " (as surveyed, " + pointer + ")" : address;
    }

    private static String number(double value) {
        return Numbers.significant(value, DIGITS);
    }
}
