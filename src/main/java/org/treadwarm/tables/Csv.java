package org.treadwarm.tables;

import com.fasterxml.jackson.databind.MappingIterator;
import com.fasterxml.jackson.dataformat.csv.CsvMapper;
import com.fasterxml.jackson.dataformat.csv.CsvSchema;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** Rows of a table in the jar, by the names in its header. */
final class Csv {
    private Csv() {}

    static List<Map<String, String>> rows(String name) {
        try (InputStream in = Csv.class.getResourceAsStream("/tables/" + name)) {
            if (in == null) {
                throw new IllegalStateException("the table " + name + " is missing from the program");
            }
            MappingIterator<Map<String, String>> rows = new CsvMapper()
                    .readerForMapOf(String.class)
                    .with(CsvSchema.emptySchema().withHeader())
                    .readValues(in);
            return rows.readAll();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static OptionalDouble number(Map<String, String> row, String column) {
        String text = row.get(column);
        return text == null || text.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(text));
    }

    static double required(Map<String, String> row, String column) {
        return number(row, column).orElseThrow(() -> new IllegalStateException("no " + column + " in " + row));
    }
}
