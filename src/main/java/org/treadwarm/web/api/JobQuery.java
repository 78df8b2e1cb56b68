package org.treadwarm.web.api;

import io.javalin.http.Context;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.treadwarm.store.JobPlace;
import org.treadwarm.store.JobSearch;
import org.treadwarm.survey.Problem;
import org.treadwarm.web.Problems;

/** What the address of the list of jobs asks for. */
final class JobQuery {
    private static final int LONGEST = 200;

    private JobQuery() {}

    /** The search; empty when the refusal has been written already. */
    static Optional<JobSearch> read(Context ctx, Paging paging) {
        String find = query(ctx, "find");
        String archived = query(ctx, "archived");
        List<Problem> problems = new ArrayList<>();
        if (find.length() > LONGEST || find.indexOf(0) >= 0) {
            problems.add(problem("find", find, "at most " + LONGEST + " characters"));
        }
        if (!archived.matches("|true|false")) {
            problems.add(problem("archived", archived, "true or false, or nothing for both"));
        }
        if (!problems.isEmpty()) {
            Problems.invalid(ctx, problems);
            return Optional.empty();
        }
        return Optional.of(new JobSearch(
                find,
                archived.isEmpty() ? Optional.empty() : Optional.of(archived.equals("true")),
                paging.after().map(cursor -> new JobPlace(cursor.number(1), cursor.number(2))),
                paging.limit()));
    }

    private static Problem problem(String name, String given, String allowed) {
        return new Problem("/" + name, JobsApi.shortened(given), "this cannot be asked for", allowed);
    }

    private static String query(Context ctx, String name) {
        return Optional.ofNullable(ctx.queryParam(name)).orElse("");
    }
}
