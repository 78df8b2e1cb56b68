package org.treadwarm.web;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.CookieManager;
import java.net.HttpCookie;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse.BodyHandlers;
import java.time.Duration;
import org.treadwarm.store.Session;

/** Somebody at a browser without script. */
final class Visitor {
    private static final String PROGRESS = "/computations/";

    private final RunningServer server;
    private final CookieManager cookies = new CookieManager();
    private final HttpClient client = HttpClient.newBuilder()
            .cookieHandler(cookies)
            .followRedirects(HttpClient.Redirect.NEVER)
            .version(HttpClient.Version.HTTP_1_1)
            .build();

    /** A stranger. */
    Visitor(RunningServer server) {
        this.server = server;
    }

    /** Somebody who is signed in. */
    Visitor(RunningServer server, Session session) {
        this(server);
        HttpCookie cookie = new HttpCookie("treadwarm-session", session.token());
        cookie.setPath("/");
        cookie.setVersion(0);
        cookies.getCookieStore().add(URI.create(server.origin()), cookie);
    }

    /** Opens a page, and waits for it where it must be computed first; follows no other way that it leads. */
    Page open(String path) {
        return awaited(ask(path));
    }

    /** Asks for a page once, without following where it leads. */
    Page ask(String path) {
        return send(request(path).GET());
    }

    /** Looks again, as a browser does, for as long as a page tells or leads to how far a computation is. */
    Page awaited(Page first) {
        Page page = first;
        while (page.address().startsWith(PROGRESS)
                ? page.looksAgain()
                : page.leadsTo().startsWith(PROGRESS)) {
            page = ask(page.leadsTo().isEmpty() ? page.address() : page.leadsTo());
        }
        return page;
    }

    /** Sends a form, without following where it leads. */
    Page send(Form form) {
        return send(request(form.action())
                .header("Content-Type", "application/x-www-form-urlencoded")
                .POST(BodyPublishers.ofString(form.encoded())));
    }

    /** Sends a form with a file in a field; without a name as a browser does where none was chosen. */
    Page send(Form form, String field, String name, byte[] file) {
        String boundary = "a-boundary-that-no-file-holds";
        return sendRaw(form.action(), boundary, form.withFile(boundary, field, name, file));
    }

    /** Sends something as a form with files, be it one or not. */
    Page sendRaw(String path, String boundary, byte[] body) {
        return send(request(path)
                .header("Content-Type", "multipart/form-data; boundary=" + boundary)
                .POST(BodyPublishers.ofByteArray(body)));
    }

    /** Sends a form and opens the page that it leads to, waiting for it as {@link #open} does. */
    Page submit(Form form) {
        Page answer = send(form);
        return answer.status() == 303 ? open(answer.leadsTo()) : answer;
    }

    private HttpRequest.Builder request(String path) {
        return HttpRequest.newBuilder(URI.create(server.origin()).resolve(path)).timeout(Duration.ofSeconds(30));
    }

    private Page send(HttpRequest.Builder request) {
        try {
            return Page.of(client.send(request.build(), BodyHandlers.ofString()));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }
}
