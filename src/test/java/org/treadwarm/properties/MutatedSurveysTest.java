package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.reference.SurveyGenerator;
import org.treadwarm.sizing.NoBalanceException;
import org.treadwarm.sizing.Sizer;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;
import org.treadwarm.wire.Json;

/**
 * 20 000 surveys gone wrong: each is no JSON, refused with problems that point at their place, or sized to finite numbers.
 * Nothing else happens.
 */
class MutatedSurveysTest {
    private static final int MUTANTS = 2000;
    private static final List<String> NOT_FINITE = List.of("NaN", "Infinity", "-Infinity");

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
    void areRefusedAtTheirPlaceOrSized(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        Mutator mutator = new Mutator(random);
        for (int i = 0; i < MUTANTS; i++) {
            byte[] mutant = mutator.mutant(base(random));
            try {
                judge(mutant);
            } catch (RuntimeException | AssertionError e) {
                fail("%s; seed %d, mutant %d: %s".formatted(e, seed, i, new String(mutant, StandardCharsets.UTF_8)), e);
            }
        }
    }

    private static ObjectNode base(SplittableRandom random) {
        return switch (random.nextInt(4)) {
            case 0 -> Surveys.studio();
            case 1 -> Surveys.everything();
            default -> SurveyGenerator.random(random);
        };
    }

    private static void judge(byte[] mutant) {
        JsonNode tree;
        try {
            tree = Document.read(mutant);
        } catch (NotJsonException e) {
            assertWords(e.problem());
            return;
        }
        Outcome<Survey> outcome = Intake.survey(tree);
        if (outcome instanceof Outcome.Refused<Survey> refused) {
            assertPlaces(tree, refused.problems());
            return;
        }
        try {
            assertFinite(Json.bytes(Sizer.size(((Outcome.Accepted<Survey>) outcome).value())));
        } catch (NoBalanceException e) {
            assertWords(e.problem());
        }
    }

    private static void assertPlaces(JsonNode tree, List<Problem> problems) {
        assertThat(problems).isNotEmpty();
        for (Problem problem : problems) {
            assertWords(problem);
            JsonPointer pointer = JsonPointer.compile(problem.pointer());
            boolean there = !tree.at(pointer).isMissingNode();
            boolean parent = pointer.head() != null && !tree.at(pointer.head()).isMissingNode();
            assertThat(there || parent).as("the place of %s", problem).isTrue();
        }
    }

    private static void assertWords(Problem problem) {
        assertThat(problem.given()).as("%s", problem).isNotBlank();
        assertThat(problem.message()).isNotBlank();
        assertThat(problem.allowed()).isNotBlank();
    }

    private static void assertFinite(byte[] answer) {
        try {
            Trees.visit("", Document.mapper().readTree(answer), (pointer, node) -> {
                assertThat(node.isNull()).as(pointer).isFalse();
                if (!pointer.matches(".*/(name|to|message|text|pointer)")) {
                    assertThat(NOT_FINITE).as(pointer).doesNotContain(node.asText());
                }
                if (node.isNumber()) {
                    assertThat(node.doubleValue()).as(pointer).isFinite();
                }
            });
        } catch (IOException e) {
            throw new AssertionError("the answer is no JSON", e);
        }
    }
}
