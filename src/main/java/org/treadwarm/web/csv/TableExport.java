package org.treadwarm.web.csv;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.treadwarm.sizing.Sizing;

/** A job's rooms, openings and results as CSV. */
public final class TableExport {
    private static final List<String> RESULTS = List.of(
            "room",
            "verdict",
            "indoor temperature [°C]",
            "heat loss [W]",
            "heated area [m2]",
            "required heat flux [W/m2]",
            "carrying heat flux [W/m2]",
            "margin [W/m2]",
            "supplement [W]",
            "holds down to [°C]");

    private TableExport() {}

    /** Rooms or openings as they were typed, in the columns that can be read in again. */
    public static String survey(TableKind kind, JsonNode document) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(kind.columns().stream().map(Column::header).toList());
        for (JsonNode room : document.path("rooms")) {
            if (kind == TableKind.ROOMS) {
                rows.add(row(kind, room, "", ""));
                continue;
            }
            for (JsonNode surface : room.path("surfaces")) {
                surface.path("openings")
                        .forEach(opening ->
                                rows.add(row(kind, opening, room.path("name").asText(), title(surface))));
            }
        }
        return CsvText.write(rows);
    }

    /** What a surface is called in a table: its name, or else its assembly's. */
    static String title(JsonNode surface) {
        String name = surface.path("name").asText("");
        return name.isBlank() ? surface.path("assembly").asText("") : name;
    }

    private static List<String> row(TableKind kind, JsonNode part, String room, String surface) {
        return kind.columns().stream()
                .map(column -> !column.key().isEmpty()
                        ? column.shown(part)
                        : switch (column.title()) {
                            case "room" -> room;
                            case "surface" -> surface;
                            default -> part.path("id").asText("");
                        })
                .toList();
    }

    /** The results of the rooms, in SI units and unrounded; what does not exist stays empty. */
    public static String results(Sizing sizing) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(RESULTS);
        for (Sizing.RoomSizing room : sizing.rooms()) {
            Sizing.FloorSizing floor = room.floor();
            rows.add(List.of(
                    room.name(),
                    floor.verdict().toString(),
                    Double.toString(room.indoorTemperature()),
                    Double.toString(room.heatLoss().total()),
                    text(floor.area()),
                    text(floor.requiredFlux()),
                    text(floor.carryingFlux()),
                    text(floor.margin()),
                    text(floor.supplement()),
                    text(floor.holdsDownTo())));
        }
        return CsvText.write(rows);
    }

    private static String text(OptionalDouble number) {
        return number.isPresent() ? Double.toString(number.getAsDouble()) : "";
    }
}
