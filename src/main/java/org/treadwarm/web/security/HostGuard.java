package org.treadwarm.web.security;

import io.javalin.http.Context;
import java.util.Locale;
import java.util.Set;

/** Answers only to its own names, so that no foreign page can reach it through a name of its own (DNS rebinding). */
public final class HostGuard {
    private final Set<String> allowed;

    public HostGuard(Set<String> allowed) {
        this.allowed = Set.copyOf(allowed);
    }

    /** Whether the request calls the server by one of its names. */
    public boolean admits(Context ctx) {
        String host = ctx.header("Host");
        return host != null && allowed.contains(withoutPort(host).toLowerCase(Locale.ROOT));
    }

    private static String withoutPort(String host) {
        int colon = host.lastIndexOf(':');
        return colon > host.lastIndexOf(']') && colon > 0 ? host.substring(0, colon) : host;
    }
}
