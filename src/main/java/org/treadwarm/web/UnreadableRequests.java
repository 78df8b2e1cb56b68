package org.treadwarm.web;

import java.nio.ByteBuffer;
import java.util.Optional;
import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.util.Callback;
import org.treadwarm.wire.Json;
import org.treadwarm.wire.ProblemDocument;

/**
 * Answers requests that no route ever sees, such as those with an address that cannot be decoded or headers that are too
 * long. Who asked is not known there, so everybody gets a problem document.
 */
final class UnreadableRequests implements Request.Handler {
    @Override
    public boolean handle(Request request, Response response, Callback callback) {
        int status = response.getStatus();
        String id = RequestIds.of(Optional.ofNullable(request.getHeaders().get(RequestIds.HEADER)));
        response.getHeaders().put(RequestIds.HEADER, id);
        response.getHeaders().put(HttpHeader.CONTENT_TYPE, ProblemDocument.MEDIA_TYPE);
        response.getHeaders().put(HttpHeader.CACHE_CONTROL, "no-store");
        response.getHeaders().put("X-Content-Type-Options", "nosniff");
        ProblemDocument problem = ProblemDocument.plain(
                        status, "http", "The request could not be read", "It was refused unread.")
                .metBy(Optional.of(id));
        response.write(true, ByteBuffer.wrap(Json.bytes(problem)), callback);
        return true;
    }
}
