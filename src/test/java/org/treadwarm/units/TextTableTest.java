package org.treadwarm.units;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.LinkedHashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;

class TextTableTest {
    @Test
    void findsEachTextAndNoOther() {
        Map<String, Integer> entries = new LinkedHashMap<>();
        for (int i = 0; i < 500; i++) {
            entries.put("key " + i, i);
        }
        TextTable<Integer> table = new TextTable<>(entries);
        entries.forEach((text, value) -> {
            assertThat(table.at(text, 0)).isEqualTo(value);
            assertThat(table.at("3.5 " + text, 4)).isEqualTo(value);
            assertThat(table.at(text + " ", 0)).isNull();
            assertThat(table.at(text, 1)).isNull();
        });
        assertThat(table.at("", 0)).isNull();
        assertThat(table.at("m", 1)).isNull();
    }

    /** Texts of one hash: "Aa" and "BB" have that of each other, so do all texts made of them. */
    @Test
    void tellsTextsOfOneHashApart() {
        TextTable<String> table = new TextTable<>(Map.of("AaAa", "1", "AaBB", "2", "BBAa", "3"));
        assertThat(table.at("AaAa", 0)).isEqualTo("1");
        assertThat(table.at("AaBB", 0)).isEqualTo("2");
        assertThat(table.at("5BBAa", 1)).isEqualTo("3");
        assertThat(table.at("5BBBB", 1)).isNull();
    }

    @Test
    void mayBeEmpty() {
        assertThat(new TextTable<String>(Map.of()).at("m", 0)).isNull();
    }
}
