package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Problem;
import org.treadwarm.web.Problems;
import org.treadwarm.web.Traces;
import org.treadwarm.wire.Json;
import org.treadwarm.wire.ProblemDocument;

/** Many surveys in one request, each answered in its place. */
final class BatchApi {
    private static final Logger LOG = LoggerFactory.getLogger(BatchApi.class);
    private static final int MOST = 1000;
    private static final Duration LONGEST = Duration.ofSeconds(10);

    /** So many are sized before their answers are sent, so that the answers of a batch never fill the memory. */
    private static final int AT_A_TIME = 64;

    private final Helpers helpers = new Helpers(Runtime.getRuntime().availableProcessors());

    /** {@code POST /api/v1/sizings/batch}: surveys in, for each its sizing or its problem document. */
    void size(Context ctx) throws IOException {
        Optional<JsonNode> document = Bodies.read(ctx, Bodies.JOB);
        if (document.isEmpty()) {
            return;
        }
        List<Problem> problems = problems(document.get());
        if (!problems.isEmpty()) {
            Problems.invalid(ctx, problems);
            return;
        }
        List<JsonNode> surveys = new ArrayList<>();
        document.get().path("surveys").forEach(surveys::add);
        long end = System.nanoTime() + LONGEST.toNanos();
        ctx.status(200);
        ctx.contentType("application/json; charset=utf-8");
        write(ctx.outputStream(), surveys, () -> System.nanoTime() - end > 0);
    }

    private void write(OutputStream out, List<JsonNode> surveys, BooleanSupplier late) throws IOException {
        out.write(ascii("{\"answers\":["));
        for (int from = 0; from < surveys.size(); from += AT_A_TIME) {
            List<JsonNode> some = surveys.subList(from, Math.min(surveys.size(), from + AT_A_TIME));
            String comma = from == 0 ? "" : ",";
            for (byte[] answer : helpers.all(some, survey -> answer(survey, late))) {
                out.write(ascii(comma));
                out.write(answer);
                comma = ",";
            }
        }
        out.write(ascii("]}"));
    }

    private static byte[] ascii(String text) {
        return text.getBytes(StandardCharsets.US_ASCII);
    }

    /** A survey sized. */
    private record Sized(int status, Object sizing) {}

    /** A survey that could not be sized. */
    private record Refused(int status, ProblemDocument problem) {
        static byte[] of(ProblemDocument problem) {
            return Json.bytes(new Refused(problem.status(), problem));
        }
    }

    static byte[] answer(JsonNode survey, BooleanSupplier late) {
        if (late.getAsBoolean()) {
            return tooLong();
        }
        try {
            Judgement judged = Judgement.of(survey, late);
            return judged.sizing().isPresent()
                    ? Json.bytes(new Sized(200, judged.sizing().get()))
                    : Refused.of(ProblemDocument.invalid(judged.problems()));
        } catch (CancellationException given) {
            return tooLong();
        } catch (RuntimeException fault) {
            LOG.error("a survey of a batch met a fault: {}", Traces.of(fault));
            return Refused.of(ProblemDocument.plain(
                    500, "http", "A fault of the program", "This survey could not be sized; the others were."));
        }
    }

    private static byte[] tooLong() {
        return Refused.of(ProblemDocument.plain(
                503,
                "too-long",
                "This batch takes too long",
                "After " + LONGEST.toSeconds() + " seconds no further survey is sized; send the rest again."));
    }

    private static List<Problem> problems(JsonNode tree) {
        String allowed = "1 to " + MOST + " surveys";
        if (!tree.isObject()) {
            return List.of(new Problem("", "no object", "a batch is an object", "{\"surveys\": [...]}"));
        }
        List<Problem> problems = new ArrayList<>();
        JsonNode surveys = tree.path("surveys");
        if (!surveys.isArray()) {
            String given = surveys.isMissingNode() ? "nothing" : "no list";
            problems.add(new Problem("/surveys", given, "the surveys are missing", allowed));
        } else if (surveys.isEmpty() || surveys.size() > MOST) {
            problems.add(new Problem(
                    "/surveys", surveys.size() + " surveys", "a batch cannot have so many surveys", allowed));
        }
        for (Iterator<String> keys = tree.fieldNames(); keys.hasNext(); ) {
            String key = keys.next();
            if (!key.equals("surveys")) {
                String given = key.length() <= 100 ? key : key.substring(0, 99) + "…";
                problems.add(new Problem(Pointer.to("", key), given, "this is no key of a batch", "surveys"));
            }
        }
        return problems;
    }
}
