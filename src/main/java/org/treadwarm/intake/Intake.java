package org.treadwarm.intake;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.function.BiConsumer;
import org.treadwarm.survey.Findings;
import org.treadwarm.survey.Place;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Rules;
import org.treadwarm.survey.SectionQuestion;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.Unusual;
import org.treadwarm.survey.WallFootQuestion;

/** The door for documents: a tree in, a survey out, or every problem it has. */
public final class Intake {
    private Intake() {}

    /** What became of a document. */
    public sealed interface Outcome<T> {
        /**
         * It can be sized.
         *
         * @param value what it says
         * @param unusual its unusual readings, in the order of the document
         */
        record Accepted<T>(T value, List<Unusual> unusual) implements Outcome<T> {}

        /** It has problems: all of them, in the order of the document. */
        record Refused<T>(List<Problem> problems) implements Outcome<T> {
            public Refused {
                problems = List.copyOf(problems);
            }
        }
    }

    /** Brings a document that is to be kept into the form in which pages show it; what it says stays the same. */
    public static void tidy(JsonNode survey) {
        Binder.nameGoals(survey);
    }

    /** Reads a survey. */
    public static Outcome<Survey> survey(JsonNode tree) {
        return read(tree, Survey.class, Rules::check);
    }

    /** Reads one assembly together with the conditions to evaluate it at. */
    public static Outcome<AssemblyQuestion> assembly(JsonNode tree) {
        return read(tree, AssemblyQuestion.class, (question, findings) -> {
            Rules.checkAssembly(question.assembly(), findings);
            question.check(findings);
        });
    }

    /** Reads one floor section. */
    public static Outcome<SectionQuestion> section(JsonNode tree) {
        return read(tree, SectionQuestion.class, SectionQuestion::check);
    }

    /** Reads one wall foot. */
    public static Outcome<WallFootQuestion> wallFoot(JsonNode tree) {
        return read(tree, WallFootQuestion.class, WallFootQuestion::check);
    }

    /** Reads one heated floor together with the setback to warm up from. */
    public static Outcome<WarmUpQuestion> warmUp(JsonNode tree) {
        return read(tree, WarmUpQuestion.class, WarmUpQuestion::check);
    }

    private static <T extends Record> Outcome<T> read(JsonNode tree, Class<T> type, BiConsumer<T, Findings> rules) {
        Findings findings = new Findings();
        Binder binder = new Binder(findings);
        T read = type.cast(binder.bind(tree, type, Place.ROOT));
        if (read != null) {
            rules.accept(read, findings);
        }
        return findings.isEmpty()
                ? new Outcome.Accepted<>(read, binder.unusual())
                : new Outcome.Refused<>(findings.all());
    }
}
