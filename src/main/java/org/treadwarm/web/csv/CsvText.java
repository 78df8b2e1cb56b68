package org.treadwarm.web.csv;

import com.fasterxml.jackson.databind.MappingIterator;
import com.fasterxml.jackson.databind.SequenceWriter;
import com.fasterxml.jackson.dataformat.csv.CsvGenerator;
import com.fasterxml.jackson.dataformat.csv.CsvMapper;
import com.fasterxml.jackson.dataformat.csv.CsvParser;
import com.fasterxml.jackson.dataformat.csv.CsvSchema;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.regex.Pattern;

/** Rows of texts as CSV and back. Cells that a spreadsheet would take for a formula are marked with an apostrophe. */
final class CsvText {
    private static final CsvMapper MAPPER = CsvMapper.csvBuilder()
            .enable(CsvParser.Feature.WRAP_AS_ARRAY)
            .enable(CsvGenerator.Feature.STRICT_CHECK_FOR_QUOTING)
            .build();
    private static final String BYTE_ORDER_MARK = "\uFEFF";
    private static final String FORMULA_STARTS = "=+-@\t\r";
    private static final Pattern SIGNED_NUMBER = Pattern.compile("[-+][0-9]+([.,][0-9]+)?[ \u00a0]?[°%A-Za-z]{0,3}");

    private CsvText() {}

    /** Writes rows; the byte order mark lets spreadsheets see that it is UTF-8. */
    static String write(List<List<String>> rows) {
        StringWriter text = new StringWriter().append(BYTE_ORDER_MARK);
        CsvSchema schema = CsvSchema.emptySchema().withLineSeparator("\r\n");
        try (SequenceWriter writer = MAPPER.writer(schema).writeValues(text)) {
            for (List<String> row : rows) {
                writer.write(row.stream().map(CsvText::guarded).toArray(String[]::new));
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.toString();
    }

    /**
     * Reads rows; cells are separated by what the first line has most of: commas, semicolons or tabs.
     *
     * @throws IOException if the text is no CSV; the message says why
     */
    static List<List<String>> read(String text) throws IOException {
        String plain = text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text;
        CsvSchema schema = CsvSchema.emptySchema().withColumnSeparator(separator(plain));
        try (MappingIterator<List<String>> rows =
                MAPPER.readerForListOf(String.class).with(schema).readValues(plain)) {
            return rows.readAll().stream()
                    .map(row -> row.stream().map(CsvText::unguarded).toList())
                    .toList();
        }
    }

    private static char separator(String text) {
        String head = text.lines().findFirst().orElse("");
        char most = ',';
        for (char candidate : new char[] {';', '\t'}) {
            most = count(head, candidate) > count(head, most) ? candidate : most;
        }
        return most;
    }

    private static long count(String text, char wanted) {
        boolean quoted = false;
        long count = 0;
        for (char c : text.toCharArray()) {
            quoted ^= c == '"';
            count += !quoted && c == wanted ? 1 : 0;
        }
        return count;
    }

    private static boolean startsFormula(String text) {
        return !text.isEmpty() && FORMULA_STARTS.indexOf(text.charAt(0)) >= 0;
    }

    private static boolean looksGuarded(String text) {
        return text.length() > 1
                && text.charAt(0) == '\''
                && (text.charAt(1) == '\'' || startsFormula(text.substring(1)));
    }

    static String guarded(String text) {
        boolean formula = startsFormula(text) && !SIGNED_NUMBER.matcher(text).matches();
        return formula || looksGuarded(text) ? "'" + text : text;
    }

    static String unguarded(String text) {
        return looksGuarded(text) ? text.substring(1) : text;
    }
}
