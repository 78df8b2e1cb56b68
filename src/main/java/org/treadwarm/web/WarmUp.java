package org.treadwarm.web;

import io.javalin.Javalin;
import org.eclipse.jetty.server.ServerConnector;
import org.treadwarm.web.api.Api;

/** Loads what a server needs while other things that a start must do are done. */
public final class WarmUp {
    private WarmUp() {}

    /** Begins, on a thread of its own; nothing depends on it. */
    public static void begin() {
        Thread thread = new Thread(WarmUp::load, "warm-up");
        thread.setDaemon(true);
        thread.start();
    }

    private static void load() {
        Javalin.create(Server::basics);
        new ServerConnector(new org.eclipse.jetty.server.Server());
        Api.warmUp();
    }
}
