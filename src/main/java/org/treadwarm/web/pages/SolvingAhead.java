package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import io.javalin.http.Handler;
import io.javalin.http.HttpStatus;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.jobs.Partial;
import org.treadwarm.sizing.SectionsAhead;
import org.treadwarm.web.Computation;
import org.treadwarm.web.Computation.State;
import org.treadwarm.web.Computations;

/**
 * Solves the floors of a survey that no sizing has met yet before a page sizes it, so that a long wait shows how far it is and can
 * be cancelled. The same floors asked for again by the same page are not solved twice.
 */
final class SolvingAhead {
    /** In the query of a page that is to be shown as typed, without an answer. */
    static final String UNSIZED = "sized=no";

    static final String STOPPED = "This is not sized, as solving its floor was given up. Save it to size it.";

    private static final String SOLVING = "The floor is being solved between its heaters; the answer follows.";
    private static final int MOST_BEGUN = 200;

    private final JobDesk desk;
    private final Computations computations;
    private final ComputationPages waiting;
    private final Map<Asked, String> begun = new LinkedHashMap<>();

    /** The floors and the page that they were asked for on. */
    private record Asked(SectionsAhead floors, String then) {}

    SolvingAhead(JobDesk desk, Computations computations, ComputationPages waiting) {
        this.desk = desk;
        this.computations = computations;
        this.waiting = waiting;
    }

    /** The page, once the floors of the job in its address are solved; it is gone back to from a list of jobs. */
    Handler before(Handler page) {
        return before(ctx -> desk.document(ctx.pathParam("job")), page, "/jobs");
    }

    /** The page of a part of a job, whose floors are solved first where the part needs them; it can be gone back to as typed. */
    Handler beforePart(Handler page) {
        return beforeTyped(
                ctx -> desk.document(ctx.pathParam("job")).filter(document -> needsFloors(ctx, document)), page);
    }

    private static boolean needsFloors(Context ctx, JsonNode document) {
        return Part.find(document, ctx.pathParam("part"), ctx.pathParam("name"))
                .filter(Answer::needsFloors)
                .isPresent();
    }

    /** The page, once the floors of a document are solved; it can be gone back to as typed. */
    Handler beforeTyped(Function<Context, Optional<JsonNode>> document, Handler page) {
        return ctx -> {
            if (isUnsized(ctx)) {
                page.handle(ctx);
            } else {
                before(document, page, ctx.req().getRequestURI() + "?" + UNSIZED)
                        .handle(ctx);
            }
        };
    }

    /** The page, once the floors of a document are solved. */
    Handler before(Function<Context, Optional<JsonNode>> document, Handler page, String back) {
        return ctx -> {
            Optional<JsonNode> found = document.apply(ctx);
            if (found.isEmpty() || !waits(ctx, found.get(), ctx.req().getRequestURI(), back)) {
                page.handle(ctx);
            }
        };
    }

    /** Whether a page is asked for as typed, without an answer. */
    static boolean isUnsized(Context ctx) {
        return UNSIZED.equals(ctx.queryString());
    }

    /**
     * Whether the floors of a document are not solved yet; then the answer leads to the page that says how far that is.
     *
     * @param then address to go on to
     * @param back address to go back to when it is cancelled
     */
    boolean waits(Context ctx, JsonNode document, String then, String back) {
        Optional<SectionsAhead> floors = floors(document);
        if (floors.isEmpty()) {
            return false;
        }
        Optional<Computation> solving = begun(new Asked(floors.get(), then), back);
        if (solving.isEmpty()) {
            waiting.tooMuch(ctx);
            return true;
        }
        if (solving.get().await(Computations.PATIENCE) instanceof State.Done) {
            return false;
        }
        ctx.redirect("/computations/" + solving.get().id(), HttpStatus.SEE_OTHER);
        return true;
    }

    /** The answer for a form as it stands; where floors are still being solved, it says so and is to be asked for again. */
    void preview(Context ctx, WrittenAnswers answers, JsonNode document, Part part) {
        boolean solving = Answer.needsFloors(part) && isSolving(document, ctx.path());
        if (solving) {
            ctx.header("Refresh", "1");
        }
        ctx.contentType("text/html; charset=utf-8");
        ctx.result(solving ? answers.unsized(document, part, SOLVING) : answers.of(document, part));
    }

    private boolean isSolving(JsonNode document, String then) {
        return floors(document)
                .map(floors -> begun(new Asked(floors, then), then)
                        .map(solving -> !(solving.await(Computations.PATIENCE) instanceof State.Done))
                        .orElse(true))
                .orElse(false);
    }

    /** The floors to be solved; empty when there are none. */
    private static Optional<SectionsAhead> floors(JsonNode document) {
        Judgement judgement = Partial.unsized(document).judgement();
        return judgement
                .survey()
                .filter(survey -> judgement.problems().isEmpty())
                .map(SectionsAhead::of)
                .filter(floors -> floors.count() > 0);
    }

    private synchronized Optional<Computation> begun(Asked asked, String back) {
        Optional<Computation> known = Optional.ofNullable(begun.get(asked))
                .flatMap(computations::find)
                .filter(found -> found.state() instanceof State.Running);
        if (known.isPresent()) {
            return known;
        }
        int count = asked.floors().count();
        String title = count == 1
                ? "Solving a floor between its heaters"
                : "Solving " + count + " floors between their heaters";
        Optional<Computation> fresh = computations.begin(title, id -> asked.then(), back, (stopped, progress) -> {
            asked.floors().solve(stopped, progress);
            return count;
        });
        begun.remove(asked);
        fresh.ifPresent(computation -> begun.put(asked, computation.id()));
        if (begun.size() > MOST_BEGUN) {
            begun.remove(begun.keySet().iterator().next());
        }
        return fresh;
    }
}
