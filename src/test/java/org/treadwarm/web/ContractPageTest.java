package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse.BodyHandlers;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.treadwarm.store.Role;
import org.treadwarm.web.security.Access;
import org.w3c.dom.Element;

/** The description of the API as a page: all that programs are told, for people. */
class ContractPageTest {
    private static RunningServer server;
    private static Page page;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        server.owner();
        page = new Visitor(server, server.session(server.member("Silvie", Role.SURVEYOR))).open("/api");
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    private static Stream<Element> routes() {
        return page.all("article");
    }

    private static String call(Element route) {
        return text(route, "h2");
    }

    private static String text(Element within, String name) {
        return within.getElementsByTagName(name).item(0).getTextContent();
    }

    @Test
    void isForPeopleWhoAreSignedIn() {
        assertThat(page.status()).isEqualTo(200);
        assertThat(new Visitor(server).open("/api").location()).startsWith("/sign-in");
    }

    @Test
    void showsEveryRouteWithTheScopeItNeeds() {
        Map<String, String> shown = routes().collect(Collectors.toMap(
                ContractPageTest::call,
                route -> route.getElementsByTagName("p").item(1).getTextContent()));
        List<String> unlike = new ArrayList<>();
        for (ServedRoute route : server.routes()) {
            boolean ofApi = route.path().startsWith("/api/") && !route.method().equals("HEAD");
            if (ofApi) {
                String words = shown.getOrDefault(route.method() + " " + route.path(), "not shown");
                String expected = route.access() instanceof Access.Key key
                        ? "the scope " + key.least().text()
                        : "Needs no key.";
                if (!words.contains(expected)) {
                    unlike.add(route + ": " + words);
                }
            }
        }
        assertThat(unlike).isEmpty();
        assertThat(shown).hasSizeGreaterThan(30);
    }

    @Test
    void tellsWhatARouteTakesAndAnswers() {
        String table = routes().filter(route -> call(route).equals("POST /api/v1/jobs/{id}/tables/{table}"))
                .findFirst()
                .orElseThrow()
                .getTextContent();

        assertThat(table)
                .contains("rooms | openings", "If-Match", "Idempotency-Key", "preview", "text/csv")
                .contains("TableAnswer", "TableProblems or ProblemDocument", "412", "Also 401, 403, 405")
                .contains("curl \"" + server.origin() + "/api/v1/jobs/$ID/tables/rooms\"")
                .contains("--data-binary @table.csv");
        assertThat(page.id("usual")).isPresent();
        assertThat(page.text()).contains("at most so many rows (query; at least 1; at most 200; 100 where left out)");
        assertThat(page.text()).contains("reading or <a href=\"#document-WarmUpGoal\">WarmUpGoal</a>");
    }

    @Test
    void everyLinkOfThePageLeadsSomewhere() throws Exception {
        List<String> ids = page.all("*").map(each -> each.getAttribute("id")).toList();
        List<String> lost = page.all("a")
                .map(each -> each.getAttribute("href"))
                .filter(to -> to.startsWith("#") && !ids.contains(to.substring(1)))
                .toList();

        assertThat(lost).isEmpty();
        assertThat(ids).contains("document-Survey", "document-Sizing", "document-ProblemDocument");
        HttpRequest description = HttpRequest.newBuilder(URI.create(server.origin() + "/api/v1/openapi.json"))
                .build();
        assertThat(HttpClient.newHttpClient()
                        .send(description, BodyHandlers.ofString())
                        .statusCode())
                .isEqualTo(200);
    }
}
