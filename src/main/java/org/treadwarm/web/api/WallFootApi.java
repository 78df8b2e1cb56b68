package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.TimeUnit;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.sizing.WallFootEvaluation;
import org.treadwarm.survey.WallFootQuestion;
import org.treadwarm.web.Problems;

/** Answers the psi value of a wall's foot; nothing is kept. */
final class WallFootApi {
    private static final long LONGEST_SECONDS = 10;

    /** {@code POST /api/v1/wall-feet}: one wall foot solved in section. */
    void answer(Context ctx) {
        Optional<JsonNode> document = Bodies.read(ctx, Bodies.SIZING);
        if (document.isEmpty()) {
            return;
        }
        Outcome<WallFootQuestion> outcome = Intake.wallFoot(document.get());
        if (outcome instanceof Outcome.Accepted<WallFootQuestion> accepted) {
            solve(ctx, accepted.value());
        } else if (outcome instanceof Outcome.Refused<WallFootQuestion> refused) {
            Problems.invalid(ctx, refused.problems());
        }
    }

    private static void solve(Context ctx, WallFootQuestion question) {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(LONGEST_SECONDS);
        try {
            SizingApi.json(ctx, 200, WallFootEvaluation.of(question, () -> System.nanoTime() > end, share -> {}));
        } catch (CancellationException tooLong) {
            Problems.plain(
                    ctx,
                    422,
                    "too-long",
                    "This wall foot takes too long",
                    "It was not solved within " + LONGEST_SECONDS + " seconds.");
        } catch (IllegalStateException | IllegalArgumentException unsolved) {
            Problems.plain(ctx, 422, "not-solved", "This wall foot cannot be solved", unsolved.getMessage() + ".");
        }
    }
}
