package org.treadwarm.jobs;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class RememberedTest {
    private final List<String> made = new ArrayList<>();

    private String make(Remembered<String> remembered, String text) {
        return remembered.of(text, () -> {
            made.add(text);
            return text + "!";
        });
    }

    @Test
    void makesTheSameOnlyOnce() {
        Remembered<String> remembered = new Remembered<>(100, String::length);
        assertThat(make(remembered, "a")).isEqualTo("a!");
        assertThat(make(remembered, "a")).isEqualTo("a!");
        assertThat(make(remembered, "b")).isEqualTo("b!");
        assertThat(made).containsExactly("a", "b");
    }

    @Test
    void forgetsWhatWasAskedForLongestAgoWhenThereIsTooMuch() {
        Remembered<String> remembered = new Remembered<>(22, String::length);
        make(remembered, "aaaa");
        make(remembered, "bbbb");
        make(remembered, "aaaa");
        make(remembered, "cccc");
        make(remembered, "aaaa");
        make(remembered, "bbbb");
        assertThat(made).containsExactly("aaaa", "bbbb", "cccc", "bbbb");
    }

    @Test
    void doesNotRememberWhatIsTooLargeOrDoesNotLast() {
        Remembered<String> remembered = new Remembered<>(3, String::length);
        make(remembered, "aa");
        make(remembered, "aa");
        remembered.of("b", () -> "b", value -> false);
        assertThat(remembered.of("b", () -> "c", value -> true)).isEqualTo("c");
        assertThat(remembered.of("b", () -> "d", value -> true)).isEqualTo("c");
        assertThat(made).containsExactly("aa", "aa");
    }

    @Test
    void keepsItsSizeWhenTheSameIsRememberedAgain() {
        Remembered<String> remembered = new Remembered<>(8, String::length);
        for (int i = 0; i < 10; i++) {
            remembered.of("x", () -> "y", value -> false);
        }
        make(remembered, "abc");
        make(remembered, "abc");
        assertThat(made).containsExactly("abc");
    }

    @Test
    void judgesTheSameDocumentOnceAndAnotherSpellingAnew() {
        Judgement first = Judgement.of(Demo.survey());
        assertThat(Judgement.of(Demo.survey())).isSameAs(first);
        assertThat(first.isLasting()).isTrue();
        ObjectNode other = (ObjectNode) Demo.survey();
        other.set("site", other.get("site").deepCopy());
        ((ObjectNode) other.get("site")).put("surveyedBy", "Somebody else");
        assertThat(Judgement.of(other)).isNotSameAs(first);
    }
}
