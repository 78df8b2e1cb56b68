package org.treadwarm.survey;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;

/** Addresses, nearest names and the walk over every reading. */
class SurveyTest {
    @ParameterizedTest
    @CsvSource({"loft, /spaces/loft", "a/b, /spaces/a~1b", "a~b, /spaces/a~0b", "~1, /spaces/~01", "'', /spaces/"})
    void pointersEscapeSlashAndTilde(String key, String pointer) {
        assertThat(Pointer.to("/spaces", key)).isEqualTo(pointer);
    }

    @ParameterizedTest
    @CsvSource({"windw, window", "WINDOW, window", "dor, door", "xyz, door"})
    void theNearestNameHasTheFewestLettersChanged(String given, String nearest) {
        assertThat(Nearest.to(given, List.of("window", "door"))).contains(nearest);
    }

    @Test
    void amongNoNamesThereIsNoNearest() {
        assertThat(Nearest.to("door", List.of())).isEmpty();
        assertThat(Nearest.to("x".repeat(10_000), List.of("y".repeat(10_000)))).isPresent();
    }

    @Test
    void everyReadingIsVisitedAtItsAddress() {
        ObjectNode tree = Surveys.everything();
        List<String> visited = new ArrayList<>();
        Readings.visit(Surveys.accepted(tree), "", (pointer, declared, reading) -> {
            if (!tree.at(pointer).isMissingNode()) {
                assertThat(reading.value())
                        .as(pointer)
                        .isEqualTo(tree.at(pointer).doubleValue());
                visited.add(pointer);
            } else {
                assertThat(declared.fallback()).as(pointer).isNotEmpty();
            }
        });
        List<String> numbers = new ArrayList<>();
        Trees.visit("", tree, (pointer, node) -> {
            if (node.isNumber()) {
                numbers.add(pointer);
            }
        });
        assertThat(visited).containsExactlyInAnyOrderElementsOf(numbers);
    }

    @Test
    void nearestNamesAreToldOfTheFirstSlipsOnly() {
        ObjectNode tree = Surveys.quiet();
        ArrayNode surfaces = (ArrayNode) tree.at("/rooms/0/surfaces");
        for (int i = 0; i < 1500; i++) {
            surfaces.add(Trees.json("{'assembly': 'shed wal', 'area': 1, 'to': 'outdoors'}"));
        }
        List<Problem> problems = Surveys.problems(tree);
        assertThat(problems).hasSize(Findings.MOST);
        assertThat(problems.get(0).message()).contains("did you mean \"shed wall\"");
        assertThat(problems.get(999).message()).doesNotContain("did you mean");
    }
}
