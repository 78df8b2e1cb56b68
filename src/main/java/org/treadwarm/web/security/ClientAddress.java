package org.treadwarm.web.security;

import io.javalin.http.Context;
import java.net.Inet6Address;
import java.net.InetAddress;
import java.net.UnknownHostException;
import java.util.Collections;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Where a request comes from, as far as its sender cannot choose it. Behind a proxy that is the last address in
 * X-Forwarded-For, which the proxy itself appended; whatever stands before that, the sender may have written.
 */
final class ClientAddress {
    private static final Pattern WITH_PORT =
            Pattern.compile("\\[([0-9a-fA-F:.]+)](?::\\d+)?|(\\d+(?:\\.\\d+){3}):\\d+");
    // With a colon in it, the Java library takes a text for an address or refuses it, and never looks it up as a name.
    private static final Pattern VERSION_SIX = Pattern.compile("[0-9a-fA-F:]*:[0-9a-fA-F:.]*");
    private static final int LONGEST = 100;

    private ClientAddress() {}

    static String of(Context ctx, boolean behindProxy) {
        if (!behindProxy) {
            return network(ctx.req().getRemoteAddr());
        }
        List<String> headers = Collections.list(ctx.req().getHeaders("X-Forwarded-For"));
        String all = headers.isEmpty() ? "" : headers.get(headers.size() - 1);
        String last = all.substring(all.lastIndexOf(',') + 1).strip();
        return network(last.isEmpty() ? ctx.req().getRemoteAddr() : last);
    }

    /** Whether an address, as the connection itself has it, is this machine's own. */
    static boolean isLoopback(String address) {
        String plain = address.replaceAll("[\\[\\]]", "");
        return plain.startsWith("127.") || plain.equals("::1") || plain.equals("0:0:0:0:0:0:0:1");
    }

    /** An address of version 6 counts as its first half, since whoever has one has all of that network. */
    static String network(String text) {
        Matcher withPort = WITH_PORT.matcher(text);
        String address = !withPort.matches() ? text : withPort.group(1) != null ? withPort.group(1) : withPort.group(2);
        if (!VERSION_SIX.matcher(address).matches()) {
            return address.substring(0, Math.min(address.length(), LONGEST));
        }
        try {
            return network(InetAddress.getByName(address));
        } catch (UnknownHostException noAddress) {
            return address.substring(0, Math.min(address.length(), LONGEST));
        }
    }

    private static String network(InetAddress address) {
        if (!(address instanceof Inet6Address)) {
            return address.getHostAddress();
        }
        byte[] bytes = address.getAddress();
        StringBuilder half = new StringBuilder();
        for (int i = 0; i < 8; i += 2) {
            half.append(Integer.toHexString((bytes[i] & 0xff) << 8 | bytes[i + 1] & 0xff))
                    .append(':');
        }
        return half.append(":/64").toString();
    }
}
