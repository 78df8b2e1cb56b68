package org.treadwarm.tables;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** The materials table. */
public final class Materials {
    private static final List<Material> ROWS =
            Csv.rows("materials.csv").stream().map(Materials::row).toList();
    private static final Map<String, Material> BY_NAME = byName();

    private Materials() {}

    /** Every row, by name. */
    public static List<Material> all() {
        return ROWS;
    }

    /** The row of this name or other name, capitals apart. */
    public static Optional<Material> find(String name) {
        return Optional.ofNullable(BY_NAME.get(name.toLowerCase(Locale.ROOT)));
    }

    /** The rows whose names contain every word of the text, capitals apart. */
    public static List<Material> search(String text) {
        String[] words = text.toLowerCase(Locale.ROOT).strip().split("\\s+");
        return ROWS.stream()
                .filter(row -> {
                    String names = (row.name() + " " + String.join(" ", row.alsoCalled())).toLowerCase(Locale.ROOT);
                    return Arrays.stream(words).allMatch(names::contains);
                })
                .toList();
    }

    private static Material row(Map<String, String> row) {
        String also = row.get("also called");
        return new Material(
                row.get("name"),
                also.isEmpty() ? List.of() : List.of(also.split("; ")),
                row.get("family"),
                Csv.number(row, "conductivity [W/(m.K)]"),
                Csv.number(row, "conductivity from [W/(m.K)]"),
                Csv.number(row, "conductivity to [W/(m.K)]"),
                Csv.number(row, "density [kg/m3]"),
                Csv.number(row, "specific heat capacity [J/(kg.K)]"),
                row.get("vapour resistance factor"),
                row.get("confidence"),
                row.get("source"));
    }

    private static Map<String, Material> byName() {
        Map<String, Material> index = new HashMap<>();
        for (Material row : ROWS) {
            claim(index, row.name(), row);
            row.alsoCalled().forEach(name -> claim(index, name, row));
        }
        return Map.copyOf(index);
    }

    private static void claim(Map<String, Material> index, String name, Material row) {
        if (index.put(name.toLowerCase(Locale.ROOT), row) != null) {
            throw new IllegalStateException("two materials are called " + name);
        }
    }
}
