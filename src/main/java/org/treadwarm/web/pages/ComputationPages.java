package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.treadwarm.units.Numbers;
import org.treadwarm.web.Computation;
import org.treadwarm.web.Computation.State;
import org.treadwarm.web.Computations;

/** Pages that say how far a computation is, without script: they ask the browser to look again, and offer to cancel. */
final class ComputationPages {
    private static final String LOOK_AGAIN = "1";

    private final Computations computations;
    private final View view;

    ComputationPages(Computations computations, View view) {
        this.computations = computations;
        this.view = view;
    }

    /** Begins a computation and leads to its result when it is soon done, else to the page that says how far it is. */
    void begin(Context ctx, String title, UnaryOperator<String> then, String back, Computation.Work work) {
        Optional<Computation> begun = computations.begin(title, then, back, work);
        if (begun.isEmpty()) {
            tooMuch(ctx);
            return;
        }
        boolean done = begun.get().await(Computations.PATIENCE) instanceof State.Done;
        ctx.redirect(done ? begun.get().then() : "/computations/" + begun.get().id(), HttpStatus.SEE_OTHER);
    }

    /** Says that no further computation can be begun. */
    void tooMuch(Context ctx) {
        view.show(
                ctx,
                503,
                "fault",
                Map.of("title", "Too much is being computed just now; try again in a minute", "status", 503));
    }

    /** {@code GET /computations/{id}}: how far it is, or on to its result. */
    void show(Context ctx) {
        Optional<Computation> found = computations.find(ctx.pathParam("id"));
        if (found.isEmpty()) {
            view.show(
                    ctx,
                    404,
                    "fault",
                    Map.of("title", "This computation is no longer known; begin it anew", "status", 404));
            return;
        }
        State state = found.get().await(Computations.PATIENCE);
        if (state instanceof State.Done) {
            ctx.redirect(found.get().then(), HttpStatus.SEE_OTHER);
            return;
        }
        show(ctx, found.get(), state);
    }

    private void show(Context ctx, Computation computation, State state) {
        Map<String, Object> model = new HashMap<>();
        model.put("id", computation.id());
        model.put("what", computation.title());
        model.put("back", computation.back());
        model.put("running", false);
        model.put("share", "0");
        model.put("reason", "");
        if (state instanceof State.Running running) {
            model.put("running", true);
            model.put("share", Numbers.fixed(100 * running.done(), 0));
            ctx.header("Refresh", LOOK_AGAIN);
        } else if (state instanceof State.Failed failed) {
            model.put("reason", failed.reason());
        }
        view.show(ctx, 200, "computation", model);
    }

    /** {@code POST /computations/{id}}: cancels it. */
    void cancel(Context ctx) {
        Optional<Computation> found = computations.find(ctx.pathParam("id"));
        found.ifPresent(Computation::cancel);
        ctx.redirect("/computations/" + ctx.pathParam("id"), HttpStatus.SEE_OTHER);
    }
}
