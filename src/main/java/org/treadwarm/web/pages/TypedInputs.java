package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Site;
import org.treadwarm.survey.Space;
import org.treadwarm.web.pages.FieldView.Choice;

/** A survey as it was typed, in tables: what forms show, without what was left empty. */
final class TypedInputs {
    private final JsonNode document;
    private final Forms forms;

    private TypedInputs(JsonNode document) {
        this.document = document;
        this.forms = new Forms(document, List.of());
    }

    /** A table of inputs: the thing itself, then what lies within it. */
    public record Group(String title, List<Section> sections) {}

    /**
     * What was typed about one thing.
     *
     * @param title the part of the group; empty for the group itself
     */
    public record Section(String title, List<Row> rows) {}

    /**
     * One input.
     *
     * @param basis how it was come by; empty when not said
     */
    public record Row(String name, String value, String basis) {}

    /** All groups: site, assemblies, spaces, then the rooms. */
    static List<Group> of(JsonNode document) {
        TypedInputs inputs = new TypedInputs(document);
        List<Group> groups = new ArrayList<>();
        groups.add(inputs.group("/site", "Site", Site.class));
        document.path("assemblies")
                .fieldNames()
                .forEachRemaining(name ->
                        groups.add(inputs.group(Pointer.to("/assemblies", name), "Assembly: " + name, Assembly.class)));
        document.path("spaces")
                .fieldNames()
                .forEachRemaining(
                        name -> groups.add(inputs.group(Pointer.to("/spaces", name), "Space: " + name, Space.class)));
        for (int i = 0; i < document.path("rooms").size(); i++) {
            String name = document.path("rooms").path(i).path("name").asText();
            groups.add(inputs.group(Pointer.to("/rooms", i), "Room: " + name, Room.class));
        }
        return groups;
    }

    private Group group(String pointer, String title, Class<? extends Record> type) {
        List<Section> sections = new ArrayList<>();
        add(sections, forms.form(pointer, title, type), "");
        return new Group(title, sections);
    }

    private void add(List<Section> sections, ObjectView view, String title) {
        List<Row> rows = Stream.concat(view.fields().stream(), view.more().stream())
                .flatMap(field -> row(field).stream())
                .toList();
        if (!rows.isEmpty()) {
            sections.add(new Section(title, rows));
        }
        view.parts()
                .forEach(part -> part.items()
                        .forEach(item ->
                                add(sections, item, title.isEmpty() ? item.title() : title + ", " + item.title())));
    }

    private Optional<Row> row(FieldView field) {
        JsonNode node = document.at(field.pointer());
        String typed = Forms.shown(node);
        if (typed.isBlank()) {
            return Optional.empty();
        }
        boolean bare = node.isNumber() || node.path("reading").isNumber();
        String value = field.choices().stream()
                .filter(Choice::chosen)
                .map(Choice::label)
                .findFirst()
                .orElse(bare ? typed + "\u00a0" + field.printedUnit() : typed);
        return Optional.of(new Row(field.label(), value, field.basis()));
    }
}
