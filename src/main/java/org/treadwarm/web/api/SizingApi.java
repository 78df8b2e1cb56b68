package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.regex.Pattern;
import org.treadwarm.intake.AssemblyQuestion;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.sizing.AssemblyEvaluation;
import org.treadwarm.sizing.AssemblyEvaluation.Conditions;
import org.treadwarm.sizing.SectionEvaluation;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.SectionQuestion;
import org.treadwarm.tables.Material;
import org.treadwarm.tables.Materials;
import org.treadwarm.web.Problems;
import org.treadwarm.wire.Json;

/** Answers that keep nothing: sizings, evaluations of assemblies, the materials table. */
final class SizingApi {
    private static final Pattern MATERIALS = Pattern.compile("materials ([0-9]{1,6})");
    private static final Duration LONGEST = Duration.ofSeconds(10);
    private static final Duration LONGEST_SIZING = Duration.ofSeconds(30);

    /** {@code POST /api/v1/sizings}: a survey in, a sizing out. */
    void size(Context ctx) {
        Bodies.read(ctx, Bodies.SIZING)
                .flatMap(document -> judged(ctx, document))
                .ifPresent(judged -> answer(ctx, judged));
    }

    /** What a survey comes to; empty when that takes too long, which is answered then. Floors solved until then are remembered. */
    static Optional<Judgement> judged(Context ctx, JsonNode document) {
        long begun = System.nanoTime();
        try {
            return Optional.of(Judgement.of(document, () -> System.nanoTime() - begun > LONGEST_SIZING.toNanos()));
        } catch (CancellationException e) {
            Problems.plain(
                    ctx,
                    503,
                    "too-long",
                    "This sizing takes too long",
                    "It was not done within " + LONGEST_SIZING.toSeconds()
                            + " seconds. The floors solved until then are remembered: send it again to go on.");
            return Optional.empty();
        }
    }

    /** Writes what a survey comes to; with the working when the query asks for it. */
    static void answer(Context ctx, Judgement judged) {
        if (judged.sizing().isEmpty()) {
            Problems.invalid(ctx, judged.problems());
            return;
        }
        Sizing sizing = judged.sizing().get();
        boolean working = "true".equals(ctx.queryParam("working"));
        json(ctx, 200, working ? Json.withWorking(judged.survey().orElseThrow(), sizing) : Json.bytes(sizing));
    }

    /** {@code POST /api/v1/assemblies/evaluations}: one assembly under given temperatures. */
    void evaluate(Context ctx) {
        Optional<JsonNode> document = Bodies.read(ctx, Bodies.SIZING);
        if (document.isEmpty()) {
            return;
        }
        Outcome<AssemblyQuestion> outcome = Intake.assembly(document.get());
        if (outcome instanceof Outcome.Accepted<AssemblyQuestion> accepted) {
            AssemblyQuestion question = accepted.value();
            Conditions conditions = new Conditions(
                    question.outdoors(),
                    question.indoorTemperature().value(),
                    question.outdoorTemperature().value(),
                    question.relativeHumidity().value());
            json(ctx, 200, AssemblyEvaluation.of(question.assembly(), conditions));
        } else if (outcome instanceof Outcome.Refused<AssemblyQuestion> refused) {
            Problems.invalid(ctx, refused.problems());
        }
    }

    /** {@code POST /api/v1/sections}: one floor solved between its cables or pipes. */
    void section(Context ctx) {
        Optional<JsonNode> document = Bodies.read(ctx, Bodies.SIZING);
        if (document.isEmpty()) {
            return;
        }
        Outcome<SectionQuestion> outcome = Intake.section(document.get());
        if (outcome instanceof Outcome.Accepted<SectionQuestion> accepted) {
            solve(ctx, accepted.value());
        } else if (outcome instanceof Outcome.Refused<SectionQuestion> refused) {
            Problems.invalid(ctx, refused.problems());
        }
    }

    private static void solve(Context ctx, SectionQuestion question) {
        long end = System.nanoTime() + LONGEST.toNanos();
        try {
            json(ctx, 200, SectionEvaluation.of(question, () -> System.nanoTime() > end));
        } catch (CancellationException e) {
            Problems.plain(
                    ctx,
                    422,
                    "too-long",
                    "This section takes too long",
                    "It was not solved within " + LONGEST.toSeconds() + " seconds.");
        } catch (IllegalStateException e) {
            Problems.plain(ctx, 422, "not-solved", "This section cannot be solved", e.getMessage() + ".");
        }
    }

    /** A part of the materials table. */
    record MaterialsAnswer(List<Material> materials, Optional<String> next) {}

    /** {@code GET /api/v1/materials?find=}: rows of the materials table. */
    void materials(Context ctx) {
        String find = Optional.ofNullable(ctx.queryParam("find")).orElse("");
        Optional<Paging> paging = Paging.of(ctx, MATERIALS);
        if (paging.isEmpty()) {
            return;
        }
        List<Material> rows = find.isBlank() ? Materials.all() : Materials.search(find);
        int from = (int) Math.min(
                rows.size(), paging.get().after().map(last -> last.number(1)).orElse(0L));
        int to = Math.min(rows.size(), from + paging.get().limit());
        Optional<String> next = to < rows.size() ? Optional.of(paging.get().next(ctx, to)) : Optional.empty();
        json(ctx, 200, new MaterialsAnswer(rows.subList(from, to), next));
    }

    static void json(Context ctx, int status, Object answer) {
        json(ctx, status, Json.bytes(answer));
    }

    static void json(Context ctx, int status, byte[] text) {
        ctx.status(status);
        ctx.contentType("application/json; charset=utf-8");
        ctx.result(text);
    }
}
