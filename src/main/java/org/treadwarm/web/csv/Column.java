package org.treadwarm.web.csv;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Locale;
import java.util.Optional;
import org.treadwarm.survey.Shape;
import org.treadwarm.units.Declared;
import org.treadwarm.units.ReadingParser;

/**
 * A column of a table.
 *
 * @param title what stands in the header, without the unit
 * @param key the key in the survey; empty for a column that only says where the row belongs
 * @param unit the unit of bare numbers; empty for none
 * @param quantity whether it holds a quantity
 */
public record Column(String title, String key, String unit, boolean quantity) {
    /** Joins a bare number and the unit that a form or a header shows, so that the number alone is shown again. */
    private static final String SHOWN_UNIT = "\u00a0";

    static Column place(String title) {
        return new Column(title, "", "", false);
    }

    static Column of(Class<? extends Record> type, String key, String title) {
        Optional<Declared> declared = Shape.of(type).keys().get(key).quantity();
        String unit = declared.map(
                        each -> each.formUnit().isEmpty() ? each.kind().siUnit() : each.formUnit())
                .orElse("");
        return new Column(title.isEmpty() ? declared.orElseThrow().label() : title, key, unit, declared.isPresent());
    }

    /** The header, with the unit of bare numbers. */
    public String header() {
        return unit.isEmpty() ? title : title + " [" + unit + "]";
    }

    boolean isCalled(String name) {
        String wanted = name.strip().toLowerCase(Locale.ROOT);
        return wanted.equals(title.toLowerCase(Locale.ROOT))
                || !key.isEmpty() && wanted.equals(key.toLowerCase(Locale.ROOT));
    }

    Column inUnit(String other) {
        return new Column(title, key, other, quantity);
    }

    /** What a cell shows of a part. */
    String shown(JsonNode part) {
        JsonNode value = part.path(key).isObject() ? part.path(key).path("reading") : part.path(key);
        String text =
                value.isTextual() ? value.textValue() : value.isValueNode() && !value.isNull() ? value.asText() : "";
        String added = SHOWN_UNIT + unit;
        return quantity && !unit.isEmpty() && text.endsWith(added)
                ? text.substring(0, text.length() - added.length())
                : text;
    }

    /** Writes what a cell says into a part; a cell that says what stands there already changes nothing. */
    void write(ObjectNode part, String cell) {
        if (!cell.equals(shown(part).strip())) {
            boolean bare = quantity && !unit.isEmpty() && ReadingParser.isBare(cell);
            part.put(key, bare ? cell + SHOWN_UNIT + unit : cell);
        }
    }
}
