package org.treadwarm.web;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.net.Socket;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.treadwarm.store.Session;

/**
 * A request as it goes over the wire, so that it may break every rule but two: its lines stay lines, and it says truly how
 * long its body is.
 *
 * @param headers the lines of its headers, without the length of the body
 */
record RawRequest(String method, String path, List<String> headers, String body) {
    RawRequest {
        headers = List.copyOf(headers);
    }

    static RawRequest get(String path, String key) {
        return with("GET", path, key, "");
    }

    static RawRequest with(String method, String path, String key, String body) {
        List<String> headers = List.of(
                "Host: 127.0.0.1",
                "Authorization: Bearer " + key,
                "Content-Type: application/json",
                "Accept: application/json");
        return new RawRequest(method, path, headers, body);
    }

    /** A form of somebody signed in. */
    static RawRequest form(String method, String path, Session session, String fields) {
        List<String> headers = List.of(
                "Host: 127.0.0.1",
                "Cookie: treadwarm-session=" + session.token(),
                "Content-Type: application/x-www-form-urlencoded",
                "Accept: text/html");
        return new RawRequest(method, path, headers, "csrf=" + session.csrfToken() + fields);
    }

    RawRequest method(String other) {
        return new RawRequest(other, path, headers, body);
    }

    RawRequest path(String other) {
        return new RawRequest(method, other, headers, body);
    }

    RawRequest body(String other) {
        return new RawRequest(method, path, headers, other);
    }

    RawRequest header(String name, String value) {
        List<String> more = new ArrayList<>(headers);
        more.add(name + ": " + value);
        return new RawRequest(method, path, more, body);
    }

    RawRequest spoilHeader(int which, UnaryOperator<String> spoil) {
        List<String> spoiled = new ArrayList<>(headers);
        spoiled.set(which % spoiled.size(), spoil.apply(spoiled.get(which % spoiled.size())));
        return new RawRequest(method, path, spoiled, body);
    }

    /** Whether it still goes to the API, however it was spoiled; what shows the API to people is a page. */
    boolean isOfApi() {
        return path.startsWith("/api/") && !path.split("[?#]", 2)[0].equals("/api/") && !path.contains("..");
    }

    byte[] bytes() {
        byte[] content = body.getBytes(StandardCharsets.UTF_8);
        StringBuilder head = new StringBuilder(line(method + " " + path + " HTTP/1.1"));
        headers.forEach(header -> head.append(line(header)));
        head.append(line("Content-Length: " + content.length))
                .append(line("Connection: close"))
                .append("\r\n");
        ByteArrayOutputStream all = new ByteArrayOutputStream();
        all.writeBytes(head.toString().getBytes(StandardCharsets.UTF_8));
        all.writeBytes(content);
        return all.toByteArray();
    }

    private static String line(String text) {
        return text.replaceAll("[\r\n]", "") + "\r\n";
    }

    /** Sends it on a connection of its own. */
    RawAnswer sendTo(RunningServer server) throws IOException {
        try (Socket socket = new Socket("127.0.0.1", server.port())) {
            socket.setSoTimeout(30_000);
            socket.getOutputStream().write(bytes());
            socket.getOutputStream().flush();
            socket.shutdownOutput();
            String answer = new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
            if (answer.isEmpty()) {
                throw new AssertionError("no answer to " + shown());
            }
            return RawAnswer.of(answer);
        }
    }

    /** For messages. */
    String shown() {
        String text = method + " " + path + " " + headers + " " + body;
        return text.length() < 600 ? text : text.substring(0, 600) + "…";
    }
}
