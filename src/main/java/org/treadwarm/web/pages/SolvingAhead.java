package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.Handler;
import io.javalin.http.HttpStatus;
import java.util.Optional;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sizing.SectionsAhead;
import org.treadwarm.survey.Survey;
import org.treadwarm.web.Computation;
import org.treadwarm.web.Computation.State;
import org.treadwarm.web.Computations;

/**
 * Solves the floors of a job that no sizing has met yet before a page sizes the job, so that a long wait shows how far it is and
 * can be cancelled.
 */
final class SolvingAhead {
    private final JobDesk desk;
    private final Computations computations;

    SolvingAhead(JobDesk desk, Computations computations) {
        this.desk = desk;
        this.computations = computations;
    }

    /** The page, once the floors of its job are solved. */
    Handler before(Handler page) {
        return ctx -> {
            if (!waits(ctx)) {
                page.handle(ctx);
            }
        };
    }

    private boolean waits(Context ctx) {
        Optional<SectionsAhead> ahead = desk.document(ctx.pathParam("job"))
                .map(Intake::survey)
                .filter(outcome -> outcome instanceof Outcome.Accepted<Survey>)
                .map(outcome -> SectionsAhead.of(((Outcome.Accepted<Survey>) outcome).value()));
        if (ahead.isEmpty() || ahead.get().count() == 0) {
            return false;
        }
        int count = ahead.get().count();
        String title = count == 1
                ? "Solving a floor between its heaters"
                : "Solving " + count + " floors between their heaters";
        Optional<Computation> begun =
                computations.begin(title, id -> ctx.req().getRequestURI(), "/jobs", (stopped, progress) -> {
                    ahead.get().solve(stopped, progress);
                    return count;
                });
        if (begun.isEmpty() || !(begun.get().await(Computations.PATIENCE) instanceof State.Running)) {
            return false;
        }
        ctx.redirect("/computations/" + begun.get().id(), HttpStatus.SEE_OTHER);
        return true;
    }
}
