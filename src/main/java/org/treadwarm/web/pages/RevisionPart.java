package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import java.util.ArrayList;
import java.util.List;
import org.treadwarm.jobs.Difference;
import org.treadwarm.jobs.Labels;
import org.treadwarm.survey.Survey;

/**
 * A part of a survey to read: the site, a space, an assembly, a room, or anything else at the top.
 *
 * @param title what it is
 * @param lines its values, each with where it stands in it
 */
public record RevisionPart(String title, List<Line> lines) {
    /** A value as it was typed. */
    public record Line(String where, String value) {}

    /** All parts of a survey in its own order. */
    static List<RevisionPart> of(JsonNode document) {
        Labels labels = new Labels(Survey.class, document, document);
        List<RevisionPart> parts = new ArrayList<>();
        for (var field : document.properties()) {
            List<String> path = List.of(field.getKey());
            boolean many = List.of("rooms", "spaces", "assemblies").contains(field.getKey());
            if (many && field.getValue().isArray()) {
                for (int i = 0; i < field.getValue().size(); i++) {
                    add(
                            parts,
                            labels,
                            further(path, Integer.toString(i), field.getValue().get(i)),
                            field.getValue().get(i));
                }
            } else if (many && field.getValue().isObject()) {
                field.getValue()
                        .properties()
                        .forEach(each -> add(parts, labels, List.of(field.getKey(), each.getKey()), each.getValue()));
            } else {
                add(parts, labels, path, field.getValue());
            }
        }
        return parts;
    }

    private static void add(List<RevisionPart> parts, Labels labels, List<String> path, JsonNode part) {
        List<Difference> leaves = new ArrayList<>();
        collect(path, part, leaves);
        String title = labels.where(new Difference(path, part, part));
        List<Line> lines = leaves.stream()
                .map(leaf -> new Line(within(title, labels.where(leaf)), labels.value(leaf, leaf.before())))
                .toList();
        parts.add(new RevisionPart(title, lines));
    }

    private static String within(String title, String where) {
        return where.length() > title.length() + 3 ? where.substring(title.length() + 3) : where;
    }

    private static void collect(List<String> path, JsonNode node, List<Difference> leaves) {
        boolean parts = node.isArray() && !node.isEmpty() && node.get(0).isObject();
        if (node.isObject() && !node.has("reading")) {
            node.properties().stream()
                    .filter(field -> !field.getKey().equals("id"))
                    .forEach(field ->
                            collect(further(path, field.getKey(), field.getValue()), field.getValue(), leaves));
        } else if (parts) {
            for (int i = 0; i < node.size(); i++) {
                collect(further(path, Integer.toString(i), node.get(i)), node.get(i), leaves);
            }
        } else {
            leaves.add(new Difference(path, node, MissingNode.getInstance()));
        }
    }

    /** Parts of a list are addressed by their id, if they have one. */
    private static List<String> further(List<String> path, String step, JsonNode node) {
        List<String> longer = new ArrayList<>(path);
        longer.add(
                step.matches("[0-9]+") && node.path("id").isTextual()
                        ? node.path("id").textValue()
                        : step);
        return List.copyOf(longer);
    }
}
