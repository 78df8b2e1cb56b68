package org.treadwarm.bench;

import com.fasterxml.jackson.databind.ObjectMapper;
import io.javalin.Javalin;

/** What the program's rates are held against: a server of the same framework whose one handler parses JSON and echoes it. */
public final class BareServer {
    private BareServer() {}

    /** Starts it on a port, 0 for any free one; it echoes at {@code /echo}. */
    public static Javalin start(int port) {
        ObjectMapper mapper = new ObjectMapper();
        return Javalin.create(config -> {
                    config.startup.showJavalinBanner = false;
                    config.startup.startupWatcherEnabled = false;
                    config.routes.post("/echo", ctx -> {
                        ctx.contentType("application/json");
                        ctx.result(mapper.writeValueAsBytes(mapper.readTree(ctx.bodyAsBytes())));
                    });
                })
                .start("127.0.0.1", port);
    }
}
