package org.treadwarm.sizing;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.UnaryOperator;
import org.treadwarm.properties.Surveys;
import org.treadwarm.sizing.TableNumbers.TableNumber;
import org.treadwarm.survey.Readings;
import org.treadwarm.survey.Survey;
import org.treadwarm.tables.Formulas;
import org.treadwarm.wire.Json;

/** A survey's working, replayed step by step; gathers what is wrong. */
final class WorkingReplay {
    private static final List<String> PARTS = List.of("rooms", "spaces", "total", "assemblies", "network");

    private final ObjectNode tree;
    private final JsonNode answer;
    private final List<Step> steps;
    private final Map<String, Double> readings = new HashMap<>();
    private final List<String> faults = new ArrayList<>();
    private final Set<String> formulas = new TreeSet<>();

    WorkingReplay(ObjectNode tree) {
        this(tree, steps -> steps);
    }

    /** Replays a working after a change. */
    WorkingReplay(ObjectNode tree, UnaryOperator<List<Step>> change) {
        this.tree = tree;
        Survey survey = Surveys.accepted(tree);
        Sizing sizing = Surveys.sized(tree);
        this.answer = Json.tree(sizing);
        this.steps = change.apply(Working.of(survey, sizing));
        Readings.visit(survey, "", (pointer, declared, reading) -> readings.put(pointer, reading.value()));
        coverage();
        steps.forEach(this::replay);
    }

    List<Step> steps() {
        return steps;
    }

    JsonNode answer() {
        return answer;
    }

    /** Everything that is wrong with the working. */
    List<String> faults() {
        return faults;
    }

    /** Ids of the formulas in use. */
    Set<String> formulas() {
        return formulas;
    }

    private void coverage() {
        Set<String> wanted = new TreeSet<>();
        PARTS.forEach(part -> numbers("/" + part, answer.get(part), wanted));
        Set<String> covered = new TreeSet<>();
        for (Step step : steps) {
            if (!covered.add(step.address())) {
                faults.add(step.address() + " has two steps");
            }
            if (!wanted.contains(step.address())) {
                faults.add(step.address() + " is no number of the answer");
            }
        }
        wanted.removeAll(covered);
        wanted.forEach(address -> faults.add(address + " has no step"));
    }

    private static void numbers(String pointer, JsonNode node, Set<String> found) {
        if (node.isNumber()) {
            found.add(pointer);
        }
        for (Iterator<Map.Entry<String, JsonNode>> fields = node.fields(); fields.hasNext(); ) {
            Map.Entry<String, JsonNode> field = fields.next();
            if (!field.getKey().equals("cautions")) {
                numbers(pointer + "/" + field.getKey(), field.getValue(), found);
            }
        }
        for (int i = 0; node.isArray() && i < node.size(); i++) {
            numbers(pointer + "/" + i, node.get(i), found);
        }
    }

    private void replay(Step step) {
        formulas.add(step.formula());
        String formula = Formulas.find(step.formula()).orElseThrow().formula();
        boolean again = step.symbols().values().stream()
                .flatMap(List::stream)
                .anyMatch(address -> address.startsWith("again:"));
        if (!again && !step.symbols().values().contains(List.of("sizing:" + step.address()))) {
            faults.add(step.address() + " does not appear in its own step " + step);
        }
        try {
            JsonNode other = again ? sizedAgain(step) : answer;
            Map<String, double[]> values = new HashMap<>();
            step.symbols()
                    .forEach((name, addresses) -> values.put(
                            name,
                            addresses.stream()
                                    .mapToDouble(address -> value(address, other))
                                    .toArray()));
            WorkingEquation.Sides sides = WorkingEquation.sides(formula, values);
            if (!sides.agree()) {
                faults.add(step + ": " + formula + " gives " + sides);
            }
            if (!sides.used().equals(step.symbols().keySet())) {
                faults.add(step + ": " + formula + " uses " + sides.used());
            }
        } catch (IllegalArgumentException e) {
            faults.add(step + ": " + formula + ": " + e.getMessage());
        }
    }

    private JsonNode sizedAgain(Step step) {
        ObjectNode changed = tree.deepCopy();
        ((ObjectNode) changed.get("site")).put("outdoorTemperature", number(answer, step.address()));
        return Surveys.answer(changed);
    }

    private double value(String address, JsonNode again) {
        String pointer = address.substring(address.indexOf(':') + 1);
        return switch (address.substring(0, address.indexOf(':'))) {
            case "survey" -> reading(pointer);
            case "sizing" -> number(answer, pointer);
            case "again" -> number(again, pointer);
            case "table" ->
                TableNumbers.find(address)
                        .map(TableNumber::value)
                        .orElseThrow(() -> new IllegalArgumentException("no " + address));
            default -> throw new IllegalArgumentException("no such address: " + address);
        };
    }

    private double reading(String pointer) {
        Double value = readings.get(pointer);
        if (value == null) {
            throw new IllegalArgumentException("the survey has no reading at " + pointer);
        }
        return value;
    }

    private static double number(JsonNode answer, String pointer) {
        JsonNode node = answer.at(JsonPointer.compile(pointer));
        if (!node.isNumber()) {
            throw new IllegalArgumentException("the answer has no number at " + pointer);
        }
        return node.doubleValue();
    }
}
