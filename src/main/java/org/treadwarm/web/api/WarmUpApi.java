package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.CancellationException;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.intake.WarmUpQuestion;
import org.treadwarm.sizing.WarmUpEvaluation;
import org.treadwarm.units.Reading;
import org.treadwarm.web.Problems;

/** Answers how a floor and its room warm up; nothing is kept. */
final class WarmUpApi {
    /** Far longer than any floor of practice takes; it bounds what one request may cost. */
    private static final long LONGEST_NANOSECONDS = TimeUnit.SECONDS.toNanos(10);

    /** {@code POST /api/v1/warmups}: one floor under its room, warmed up from a setback. */
    void answer(Context ctx) {
        Optional<JsonNode> document = Bodies.read(ctx, Bodies.SIZING);
        if (document.isEmpty()) {
            return;
        }
        Outcome<WarmUpQuestion> outcome = Intake.warmUp(document.get());
        if (outcome instanceof Outcome.Accepted<WarmUpQuestion> accepted) {
            evaluate(ctx, accepted.value());
        } else if (outcome instanceof Outcome.Refused<WarmUpQuestion> refused) {
            Problems.invalid(ctx, refused.problems());
        }
    }

    private static void evaluate(Context ctx, WarmUpQuestion question) {
        long begun = System.nanoTime();
        BooleanSupplier stopped = () -> System.nanoTime() - begun > LONGEST_NANOSECONDS;
        try {
            SizingApi.json(ctx, 200, WarmUpEvaluation.of(floor(question), room(question), task(question), stopped));
        } catch (CancellationException tooLong) {
            Problems.plain(
                    ctx,
                    503,
                    "too-long",
                    "This took too long",
                    "Ask for fewer layers, or for a shorter time to look at.");
        }
    }

    private static WarmUpEvaluation.Floor floor(WarmUpQuestion question) {
        return new WarmUpEvaluation.Floor(
                question.above(),
                question.below(),
                value(question.surfaceCoefficient()),
                question.belowCoefficient().value(),
                question.belowTemperature().value());
    }

    private static WarmUpEvaluation.RoomHeat room(WarmUpQuestion question) {
        WarmUpQuestion.RoomHeat room = question.room();
        return new WarmUpEvaluation.RoomHeat(
                room.airCapacity().value(),
                room.massCapacity().value(),
                room.massCoupling().value(),
                room.lossCoefficient().value(),
                question.outdoorTemperature().value(),
                room.otherGain().value());
    }

    private static WarmUpEvaluation.Task task(WarmUpQuestion question) {
        return new WarmUpEvaluation.Task(
                question.density().value(),
                question.operative(),
                question.from().value(),
                question.to().value(),
                value(question.within()),
                question.lookedAt().value());
    }

    private static OptionalDouble value(Optional<Reading> reading) {
        return reading.isPresent() ? OptionalDouble.of(reading.get().value()) : OptionalDouble.empty();
    }
}
