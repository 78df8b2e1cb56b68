package org.treadwarm.web;

import io.javalin.http.Context;
import java.io.IOException;
import java.io.InputStream;

/**
 * Reads what a client is still sending and throws it away, so that it gets to hear why it was refused; without that, many
 * clients only see a broken connection.
 */
public final class Drain {
    private static final long MOST = 64L * 1024 * 1024;
    private static final int AT_A_TIME = 64 * 1024;

    private Drain() {}

    /** Reads the rest of a request, up to {@value #MOST} bytes. */
    public static void rest(Context ctx) {
        byte[] thrownAway = new byte[AT_A_TIME];
        try {
            InputStream body = ctx.req().getInputStream();
            long read = 0;
            int count = 0;
            while (count >= 0 && read < MOST) {
                count = body.read(thrownAway);
                read += count;
            }
        } catch (IOException e) {
            // The client has gone, so nobody waits for the answer.
            ctx.attribute("gone", true);
        }
    }
}
