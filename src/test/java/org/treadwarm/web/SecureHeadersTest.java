package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.http.HttpHeaders;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The headers that keep browsers careful stand on every answer, be it a page, a document, a file or a fault. */
class SecureHeadersTest {
    private static RunningServer server;
    private static Visitor visitor;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        visitor = new Visitor(server, server.session(server.owner()));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/sign-in",
                "/jobs",
                "/method",
                "/nothing",
                "/owner/wrong",
                "/",
                "/static/treadwarm.css",
                "/static/treadwarm.js",
                "/static/mark.svg",
                "/static/nothing.css",
                "/api/v1/health",
                "/api/v1/jobs",
                "/api/v1/nothing"
            })
    void standOnEveryAnswer(String path) {
        HttpHeaders headers = visitor.open(path).response().headers();

        assertThat(headers.firstValue("X-Content-Type-Options")).contains("nosniff");
        assertThat(headers.firstValue("Referrer-Policy")).isPresent();
        assertThat(headers.firstValue("Content-Security-Policy"))
                .hasValueSatisfying(policy -> assertThat(policy)
                        .contains(
                                "default-src 'none'", "frame-ancestors 'none'", "base-uri 'none'", "form-action 'self'")
                        .doesNotContain("unsafe", "*", "http:"));
        assertThat(headers.firstValue("Server")).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(strings = {"/jobs", "/sign-in", "/method", "/one-room"})
    void pagesNeedNothingThatThePolicyForbids(String path) {
        Page page = visitor.open(path);

        assertThat(page.all("style")).isEmpty();
        assertThat(page.all("script"))
                .allMatch(script -> script.getAttribute("src").startsWith("/static/"));
        assertThat(page.all("*"))
                .noneMatch(element -> element.hasAttribute("style")
                        || element.hasAttribute("onclick")
                        || element.hasAttribute("oninput"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"/jobs", "/sign-in", "/one-room", "/api/v1/health"})
    void whatIsNobodyElsesBusinessIsNotKeptByCaches(String path) {
        assertThat(visitor.open(path).response().headers().firstValue("Cache-Control"))
                .contains("no-store");
    }
}
