package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.units.Numbers;
import org.treadwarm.web.Computation;
import org.treadwarm.web.Computation.State;
import org.treadwarm.web.Computations;
import org.treadwarm.web.pages.TablePages.CheckRows;

/**
 * The method with its published values. They are computed when the page is opened, once for everybody who opens it within some
 * minutes; the page says how far that is.
 */
final class MethodPage {
    private final Computations computations;
    private final View view;
    private String last = "";

    MethodPage(Computations computations, View view) {
        this.computations = computations;
        this.view = view;
    }

    void show(Context ctx) {
        Optional<Computation> known = known();
        show(ctx, known.isPresent() ? known : begin());
    }

    private synchronized Optional<Computation> known() {
        return computations.find(last);
    }

    private synchronized Optional<Computation> begin() {
        Optional<Computation> begun =
                computations.begin("The published values", id -> "/method", "/method", TablePages::checks);
        begun.ifPresent(computation -> last = computation.id());
        return begun;
    }

    private void show(Context ctx, Optional<Computation> computation) {
        Map<String, Object> model = new HashMap<>();
        model.put("formulas", WorkingView.formulas());
        model.put("done", false);
        model.put("running", false);
        model.put("groups", List.of());
        model.put("count", 0);
        model.put("failed", 0);
        model.put("words", "Too much is being computed just now; try again in a minute.");
        computation.ifPresent(found -> put(ctx, model, found.await(Computations.PATIENCE)));
        view.show(ctx, 200, "method", model);
    }

    private static void put(Context ctx, Map<String, Object> model, State state) {
        if (state instanceof State.Done done) {
            CheckRows checks = (CheckRows) done.result();
            model.put("done", true);
            model.put("groups", checks.groups());
            model.put("count", checks.rows().size());
            model.put("failed", checks.failed());
        } else if (state instanceof State.Running running) {
            model.put("running", true);
            model.put("share", Numbers.fixed(100 * running.done(), 0));
            ctx.header("Refresh", "1");
        } else if (state instanceof State.Failed failed) {
            model.put("words", "There is no result. " + failed.reason() + ".");
        } else {
            model.put("words", "Cancelled; they were not computed.");
        }
    }

    /** Cancels the computation, or begins it anew. */
    void change(Context ctx) {
        if (EntryPages.text(ctx, "do").equals("cancel")) {
            known().ifPresent(Computation::cancel);
        } else if (known().map(found -> !(found.state() instanceof State.Running))
                .orElse(true)) {
            begin();
        }
        ctx.redirect("/method", HttpStatus.SEE_OTHER);
    }
}
