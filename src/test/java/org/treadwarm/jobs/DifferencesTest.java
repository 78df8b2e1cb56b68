package org.treadwarm.jobs;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;

class DifferencesTest {
    private static final String ROOM =
            "{'height': '2.5 m', 'surfaces': [{'id': 'a', 'area': '1'}, {'id': 'b', 'area': {'reading': '2', 'basis': 'told'}}],"
                    + " 'below': [{'thickness': '1'}, {'thickness': '2'}], 'note': [1, 2]}";

    private static JsonNode tree(String text) {
        try {
            return Document.read(text.replace('\'', '"').getBytes(StandardCharsets.UTF_8));
        } catch (NotJsonException e) {
            throw new IllegalArgumentException(text, e);
        }
    }

    private static List<String> addresses(String before, String after) {
        return Differences.between(tree(before), tree(after)).stream()
                .map(Difference::address)
                .toList();
    }

    @Test
    void findsNothingInTheSameOrInPartsThatOnlyMoved() {
        assertThat(addresses(ROOM, ROOM)).isEmpty();
        assertThat(addresses("{'s': [{'id': 'a'}, {'id': 'b'}]}", "{'s': [{'id': 'b'}, {'id': 'a'}]}"))
                .isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "2.5 m|3 m|/height",
                "'area': '1'|'area': '7'|/surfaces/a/area",
                "told|taped|/surfaces/b/area",
                "{'thickness': '2'}|{'thickness': '3'}|/below/1/thickness",
                "{'thickness': '2'}|{'thickness': '2'}, {}|/below",
                "[1, 2]|[2, 1]|/note",
                "'id': 'b'|'id': 'c'|/surfaces/b /surfaces/c",
                "'height'|'he/i~t'|/height /he~1i~0t",
            })
    void addressesWhatDiffers(String from, String to, String addresses) {
        assertThat(addresses(ROOM, ROOM.replace(from, to))).containsExactly(addresses.split(" "));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "2.5 m|3 m",
                "'id': 'b'|'id': 'c'",
                "{'thickness': '2'}|{'thickness': '2'}, {}",
                "{'thickness': '2'}|{'thickness': '5'}",
                "'note': [1, 2]|'more': {'a': 1}",
                "'surfaces'|'surface'",
            })
    void theSecondVersionIsTheFirstWithEveryDifferenceWritten(String from, String to) {
        JsonNode after = tree(ROOM.replace(from, to));
        JsonNode document = tree(ROOM);

        Differences.between(document, after)
                .forEach(difference -> Differences.write(document, difference.path(), difference.after()));

        assertThat(document).isEqualTo(after);
    }
}
