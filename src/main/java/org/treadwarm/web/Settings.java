package org.treadwarm.web;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.OptionalInt;
import java.util.Set;

/**
 * How the server listens.
 *
 * @param bind address to listen on
 * @param port port to listen on; 0 for any free one
 * @param hosts further names it may be called by, beside this machine's own
 * @param behindTls whether a reverse proxy in front speaks TLS, so that cookies are marked Secure
 * @param behindProxy whether a reverse proxy in front says in X-Forwarded-For where requests come from
 * @param rateLimit requests a minute with one API key; empty for no limit
 */
public record Settings(
        String bind, int port, List<String> hosts, boolean behindTls, boolean behindProxy, OptionalInt rateLimit) {
    private static final Set<String> LOCAL = Set.of("localhost", "127.0.0.1", "[::1]");

    public Settings {
        hosts = List.copyOf(hosts);
    }

    /** Without a limit for keys. */
    public Settings(String bind, int port, List<String> hosts, boolean behindTls, boolean behindProxy) {
        this(bind, port, hosts, behindTls, behindProxy, OptionalInt.empty());
    }

    /** The names that a request may call the server by, in lower case and without a port. */
    public Set<String> allowedHosts() {
        Set<String> allowed = new LinkedHashSet<>(LOCAL);
        if (!bind.equals("0.0.0.0") && !bind.equals("::")) {
            allowed.add(bind.toLowerCase(Locale.ROOT));
        }
        hosts.forEach(host -> allowed.add(host.toLowerCase(Locale.ROOT)));
        return allowed;
    }
}
