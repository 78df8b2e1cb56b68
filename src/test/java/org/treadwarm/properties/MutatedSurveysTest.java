package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.regex.Pattern;
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
    private static final Pattern WORDS = Pattern.compile("/(name|to|message|text|pointer)$");
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
            boolean parent = pointer.head() != null && tree.at(pointer.head()).isContainerNode();
            if (!there && !parent) {
                fail("nothing is at the place of %s".formatted(problem));
            }
        }
    }

    private static void assertWords(Problem problem) {
        if (problem.given().isBlank()
                || problem.message().isBlank()
                || problem.allowed().isBlank()) {
            fail("words are missing in %s".formatted(problem));
        }
    }

    /** Collects by hand, since an assertion for each number of 20 000 answers takes longer than all their sizings. */
    private static void assertFinite(byte[] answer) {
        List<String> wrong = new ArrayList<>();
        try {
            Trees.visit("", Document.mapper().readTree(answer), (pointer, node) -> {
                boolean word = node.isTextual() && !WORDS.matcher(pointer).find();
                boolean infinite = node.isNumber() && !Double.isFinite(node.doubleValue());
                if (node.isNull() || infinite || word && NOT_FINITE.contains(node.textValue())) {
                    wrong.add(pointer);
                }
            });
        } catch (IOException e) {
            throw new AssertionError("the answer is no JSON", e);
        }
        assertThat(wrong).isEmpty();
    }
}
