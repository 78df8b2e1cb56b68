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
import org.treadwarm.survey.WallFootQuestion;

/** The door for documents: a tree in, a survey out, or every problem it has. */
public final class Intake {
    private Intake() {}

    /** What became of a document. */
    public sealed interface Outcome<T> {
        /** It can be sized. */
        record Accepted<T>(T value) implements Outcome<T> {}

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
        Survey survey = (Survey) new Binder(findings).bind(tree, Survey.class, Place.ROOT);
        if (survey != null) {
            Rules.check(survey, findings);
        }
        return findings.isEmpty() ? new Outcome.Accepted<>(survey) : new Outcome.Refused<>(findings.all());
    }

    /** Reads one assembly together with the conditions to evaluate it at. */
    public static Outcome<AssemblyQuestion> assembly(JsonNode tree) {
        Findings findings = new Findings();
        AssemblyQuestion question =
                (AssemblyQuestion) new Binder(findings).bind(tree, AssemblyQuestion.class, Place.ROOT);
        if (question != null) {
            Assembly assembly = question.assembly();
            Rules.checkAssembly(assembly, findings);
            question.check(findings);
        }
        return findings.isEmpty() ? new Outcome.Accepted<>(question) : new Outcome.Refused<>(findings.all());
    }

    /** Reads one floor section. */
    public static Outcome<SectionQuestion> section(JsonNode tree) {
        Findings findings = new Findings();
        SectionQuestion question = (SectionQuestion) new Binder(findings).bind(tree, SectionQuestion.class, Place.ROOT);
        if (question != null) {
            question.check(findings);
        }
        return findings.isEmpty() ? new Outcome.Accepted<>(question) : new Outcome.Refused<>(findings.all());
    }

    /** Reads one wall foot. */
    public static Outcome<WallFootQuestion> wallFoot(JsonNode tree) {
        Findings findings = new Findings();
        WallFootQuestion question =
                (WallFootQuestion) new Binder(findings).bind(tree, WallFootQuestion.class, Place.ROOT);
        if (question != null) {
            question.check(findings);
        }
        return findings.isEmpty() ? new Outcome.Accepted<>(question) : new Outcome.Refused<>(findings.all());
    }

    /** Reads one heated floor together with the setback to warm up from. */
    public static Outcome<WarmUpQuestion> warmUp(JsonNode tree) {
        Findings findings = new Findings();
        WarmUpQuestion question = (WarmUpQuestion) new Binder(findings).bind(tree, WarmUpQuestion.class, Place.ROOT);
        if (question != null) {
            question.check(findings);
        }
        return findings.isEmpty() ? new Outcome.Accepted<>(question) : new Outcome.Refused<>(findings.all());
    }
}
