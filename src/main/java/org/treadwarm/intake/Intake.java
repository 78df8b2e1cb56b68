package org.treadwarm.intake;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import org.treadwarm.survey.Assembly;
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
        Findings findings = new Findings();
        Binder binder = new Binder(findings);
        Survey survey = (Survey) binder.bind(tree, Survey.class, Place.ROOT);
        if (survey != null) {
            Rules.check(survey, findings);
        }
        return outcome(survey, binder, findings);
    }

    /** Reads one assembly together with the conditions to evaluate it at. */
    public static Outcome<AssemblyQuestion> assembly(JsonNode tree) {
        Findings findings = new Findings();
        Binder binder = new Binder(findings);
        AssemblyQuestion question = (AssemblyQuestion) binder.bind(tree, AssemblyQuestion.class, Place.ROOT);
        if (question != null) {
            Assembly assembly = question.assembly();
            Rules.checkAssembly(assembly, findings);
            question.check(findings);
        }
        return outcome(question, binder, findings);
    }

    /** Reads one floor section. */
    public static Outcome<SectionQuestion> section(JsonNode tree) {
        Findings findings = new Findings();
        Binder binder = new Binder(findings);
        SectionQuestion question = (SectionQuestion) binder.bind(tree, SectionQuestion.class, Place.ROOT);
        if (question != null) {
            question.check(findings);
        }
        return outcome(question, binder, findings);
    }

    /** Reads one wall foot. */
    public static Outcome<WallFootQuestion> wallFoot(JsonNode tree) {
        Findings findings = new Findings();
        Binder binder = new Binder(findings);
        WallFootQuestion question = (WallFootQuestion) binder.bind(tree, WallFootQuestion.class, Place.ROOT);
        if (question != null) {
            question.check(findings);
        }
        return outcome(question, binder, findings);
    }

    /** Reads one heated floor together with the setback to warm up from. */
    public static Outcome<WarmUpQuestion> warmUp(JsonNode tree) {
        Findings findings = new Findings();
        Binder binder = new Binder(findings);
        WarmUpQuestion question = (WarmUpQuestion) binder.bind(tree, WarmUpQuestion.class, Place.ROOT);
        if (question != null) {
            question.check(findings);
        }
        return outcome(question, binder, findings);
    }

    private static <T> Outcome<T> outcome(T value, Binder binder, Findings findings) {
        return findings.isEmpty()
                ? new Outcome.Accepted<>(value, binder.unusual())
                : new Outcome.Refused<>(findings.all());
    }
}
