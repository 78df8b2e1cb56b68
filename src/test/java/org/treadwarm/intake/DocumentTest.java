package org.treadwarm.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.survey.Problem;

/** Texts that are no JSON document, and where they stop being one. */
class DocumentTest {
    private static Problem refused(String text) {
        return refused(text.getBytes(StandardCharsets.UTF_8));
    }

    private static Problem refused(byte[] text) {
        NotJsonException thrown = catchThrowableOfType(NotJsonException.class, () -> Document.read(text));
        assertThat(thrown).isNotNull();
        Problem problem = thrown.problem();
        assertThat(problem.message()).isNotBlank();
        assertThat(problem.given()).isNotBlank();
        assertThat(problem.allowed()).isNotBlank();
        return problem;
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{\"rooms\": [{\"name\": \"a\", \"name\": \"b\"}]} | /rooms/0/name | twice",
                "{\"site\": {\"a\": {}, \"a\": {\"b\": 1}}} | /site/a | twice",
                "{\"rooms\": [1], \"rooms\": [2]} | /rooms | twice",
                "{\"a/b\": {\"c~d\": 1, \"c~d\": 2}} | /a~1b/c~0d | twice",
                "{\"site\": {\"altitude\": 1x}} | /site/altitude | not JSON",
                "{\"site\": {\"altitude\": NaN}} | /site/altitude | not JSON",
                "{\"site\": {\"altitude\": 01}} | /site/altitude | not JSON",
                "{\"rooms\": [1, 2,]} | /rooms/2 | not JSON",
            })
    void saysWhere(String text, String pointer, String message) {
        Problem problem = refused(text);
        assertThat(problem.pointer()).isEqualTo(pointer);
        assertThat(problem.message()).contains(message).contains("line 1");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                " ",
                "{",
                "[",
                "\"",
                "{]",
                "nul",
                "// remark\n{}",
                "{'a': 1}",
                "{\"a\": \"\u0001\"}",
                "\u0000"
            })
    void refusesWhatIsNoJson(String text) {
        refused(text);
    }

    @Test
    void refusesBytesThatAreNoUtf8() {
        refused(new byte[] {'{', '"', (byte) 0xc3, '"', ':', '1', '}'});
    }

    @ParameterizedTest
    @ValueSource(strings = {"{} {}", "{} 1", "{} x", "{}}", "1 2"})
    void refusesWhatFollowsTheDocument(String text) {
        refused(text);
    }

    @Test
    void readsFortyLevelsAndNotOneMore() throws NotJsonException {
        assertThat(Document.read(nested(Document.DEEPEST)).isArray()).isTrue();
        assertThat(refused(nested(Document.DEEPEST + 1)).message()).contains("too deep");
        assertThat(refused(nested(100_000)).message()).contains("too deep");
    }

    private static byte[] nested(int depth) {
        return ("[".repeat(depth) + "]".repeat(depth)).getBytes(StandardCharsets.UTF_8);
    }

    @Test
    void readsLongTextsUpToTheLimit() throws NotJsonException {
        String longest = "x".repeat(Document.LONGEST_TEXT);
        assertThat(Document.read(("{\"a\":\"" + longest + "\"}").getBytes(StandardCharsets.UTF_8)))
                .hasSize(1);
        Problem problem = refused("{\"site\":{\"remark\":\"" + longest + "x\"}}");
        assertThat(problem.message()).contains("too long");
        assertThat(problem.pointer()).isEqualTo("/site/remark");
        assertThat(refused("{\"" + longest + "x\":1}").message()).contains("too long");
        assertThat(refused("{\"a\":" + "1".repeat(201) + "}").message()).contains("too long");
    }

    @Test
    void halfACharacterIsNoText() {
        for (String json :
                java.util.List.of("{\"rooms\": [{\"name\": \"a\\ud800b\"}]}", "{\"rooms\": [{\"\\udc00\": 1}]}")) {
            org.assertj.core.api.Assertions.assertThatThrownBy(
                            () -> Document.read(json.getBytes(java.nio.charset.StandardCharsets.UTF_8)))
                    .isInstanceOfSatisfying(
                            NotJsonException.class,
                            refused -> org.assertj.core.api.Assertions.assertThat(
                                            refused.problem().pointer())
                                    .startsWith("/rooms/0"));
        }
    }
}
