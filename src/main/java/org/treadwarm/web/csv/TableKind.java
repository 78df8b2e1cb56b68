package org.treadwarm.web.csv;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.treadwarm.survey.Opening;
import org.treadwarm.survey.Room;

/** The tables that go out of a job and into it. */
public enum TableKind {
    ROOMS(
            "rooms",
            List.of(
                    Column.of(Room.class, "name", "room"),
                    Column.of(Room.class, "indoorTemperature", ""),
                    Column.of(Room.class, "floorArea", ""),
                    Column.of(Room.class, "height", ""),
                    Column.of(Room.class, "reheat", ""),
                    Column.of(Room.class, "allowance", ""),
                    Column.of(Room.class, "otherHeat", ""),
                    Column.of(Room.class, "remark", "remark"),
                    Column.place("id"))),
    OPENINGS(
            "openings",
            List.of(
                    Column.place("room"),
                    Column.place("surface"),
                    Column.of(Opening.class, "name", "opening"),
                    Column.of(Opening.class, "assembly", "assembly"),
                    Column.of(Opening.class, "area", ""),
                    Column.of(Opening.class, "width", ""),
                    Column.of(Opening.class, "height", ""),
                    Column.of(Opening.class, "count", ""),
                    Column.of(Opening.class, "remark", "remark"),
                    Column.place("id")));

    private final String word;
    private final List<Column> columns;

    TableKind(String word, List<Column> columns) {
        this.word = word;
        this.columns = columns;
    }

    /** The kind that is called so, if one is. */
    public static Optional<TableKind> called(String word) {
        return Arrays.stream(values()).filter(kind -> kind.word.equals(word)).findFirst();
    }

    /** What it is called. */
    public String word() {
        return word;
    }

    /** Its columns in order. */
    public List<Column> columns() {
        return columns;
    }
}
