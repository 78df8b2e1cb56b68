package org.treadwarm.web.pages;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.store.Store;
import org.treadwarm.web.security.Visitors;

/** The routes of the pages. */
public final class Pages {
    public Pages(Store store, JobDesk desk, Visitors visitors) {}

    /** Adds the routes. */
    public void routes(RoutesConfig routes) {}

    /** Shows a fault. */
    public void fault(Context ctx, int status, String title) {
        ctx.html("<title>" + title + "</title>");
    }
}
