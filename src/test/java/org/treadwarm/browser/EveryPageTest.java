package org.treadwarm.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.deque.html.axecore.playwright.AxeBuilder;
import com.deque.html.axecore.results.Rule;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.microsoft.playwright.APIResponse;
import com.microsoft.playwright.Browser;
import com.microsoft.playwright.Page;
import com.microsoft.playwright.Route;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.jobs.Demo;
import org.treadwarm.jobs.Job;
import org.treadwarm.sheets.Issuing;
import org.treadwarm.sheets.SheetDesk;
import org.treadwarm.store.Change;
import org.treadwarm.store.Links;
import org.treadwarm.store.Person;
import org.treadwarm.store.Role;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Session;
import org.treadwarm.store.SheetContent;
import org.treadwarm.store.SheetIssue;
import org.treadwarm.store.SheetOrder;
import org.treadwarm.web.RunningServer;

/** What holds on every page: no barrier, no complaint of the browser, nothing wider than the page, nothing too small. */
@ExtendWith(Chromium.class)
class EveryPageTest {
    private static final List<String> RULES =
            List.of("wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22a", "wcag22aa");
    private static final int SMALLEST_TARGET = 44;

    private static RunningServer server;
    private static RunningServer withoutOwner;
    private static String invitation;
    private static Session session;
    private static String demo;
    private static String broken;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        session = server.session(server.owner());
        demo = "/jobs/" + server.job("Sallowby house", Demo.survey()).id();
        ObjectNode survey = RunningServer.studio();
        ObjectNode room = (ObjectNode) survey.get("rooms").get(0);
        room.put("height", "so high").remove("indoorTemperature");
        ((ObjectNode) room.at("/surfaces/0")).put("assembly", "").put("to", "nowhere");
        ((ObjectNode) room.at("/heatedFloor/heater")).remove("kind");
        broken = "/jobs/" + server.job("Unfinished", survey).id();
        withoutOwner = RunningServer.start();
        invitation = withoutOwner.store().people().inviteOwner().orElseThrow();
    }

    @AfterAll
    static void stop() {
        server.close();
        withoutOwner.close();
    }

    static Stream<String> pages() {
        String room = server.desk()
                .current(demo.substring("/jobs/".length()))
                .orElseThrow()
                .document()
                .at("/rooms/0/id")
                .textValue();
        Stream<String> jobs = Stream.of(
                "/jobs",
                demo,
                demo + "/rooms/" + room,
                demo + wallFoot(),
                demo + "/history",
                demo + "/history/1",
                demo + "/files",
                "/jobs?find=nothing-like-it&show=all",
                broken + "/history/1",
                broken,
                broken + "/rooms/studio-1",
                broken + "/spaces/loft",
                broken + "/spaces/stair",
                broken + "/spaces/shop%20next%20door",
                broken + "/assemblies/shed%20wall",
                broken + "/assemblies/new%20sash");
        return Stream.concat(
                Stream.concat(jobs, Stream.concat(service(), sheets())),
                Stream.of("/one-room", "/materials", "/reading-help", "/method", "/api", "/nothing-here", "/sign-in"));
    }

    /** The first wall foot of the demo job that can be solved. */
    private static String wallFoot() {
        for (JsonNode room : server.desk()
                .current(demo.substring("/jobs/".length()))
                .orElseThrow()
                .document()
                .path("rooms")) {
            for (JsonNode junction : room.path("junctions")) {
                if (junction.path("at").asText().equals("heated floor")
                        && room.at("/heatedFloor/ground/kind").asText().equals("slab")) {
                    return "/rooms/" + room.path("id").textValue() + "/wall-foot/"
                            + junction.path("id").textValue();
                }
            }
        }
        throw new IllegalStateException("The demo job has no wall foot to solve");
    }

    /** People, keys and the audit list, with a row of every sort, and what links lead to. */
    private static Stream<String> service() {
        String join = "/link/"
                + server.store().links().invite("Benno", Role.SURVEYOR, "tests").token();
        Person member = server.member("Emmet " + join.length(), Role.ESTIMATOR);
        String reset = server.store()
                .links()
                .resetPassword(member.id(), "tests", Links.VALID_FOR)
                .orElseThrow()
                .token();
        server.store().keys().create("ended", Scope.READ, Optional.of(Instant.EPOCH), "tests");
        server.store().team().close(server.member("Carla", Role.OWNER).id(), "tests");
        return Stream.of(
                "/people", "/keys", "/audit", "/account", join, "/link/" + reset, "/link/spent", "/people?done=role");
    }

    /** Sheets: one withdrawn and replaced, one that holds and has a link, and one that today's method computes otherwise. */
    private static Stream<String> sheets() {
        String job = demo.substring("/jobs/".length());
        SheetDesk desk = new SheetDesk(server.desk(), server.store().sheets());
        String first = number(desk.issue(job, 1, Optional.empty(), "tests"));
        SheetContent kept = desk.find(first).orElseThrow().content();
        desk.withdraw(first, "the wrong house", "tests");
        SheetContent otherwise =
                new SheetContent("0", kept.survey(), kept.sizing().replace("\"heatLoss\":", "\"heatFlow\":"));
        String odd = ((SheetIssue.Issued)
                        server.store().sheets().issue(new SheetOrder(job, 1, otherwise, Optional.of(first)), "tests"))
                .header()
                .number();
        String second = number(desk.issue(job, 1, Optional.empty(), "tests"));
        server.store().sheetLinks().create(second, "tests");
        String token =
                server.store().sheetLinks().create(first, "tests").orElseThrow().token();
        return Stream.of(
                demo + "/issue",
                broken + "/issue",
                "/sheets",
                "/sheets/" + first,
                "/sheets/" + second,
                "/sheets/" + odd,
                "/sheets/" + odd + "/verification",
                "/sheets/" + second + "/verification",
                "/sheets/" + second + "/links",
                "/sheets/" + second + "/withdrawal",
                "/sheets/2026-9999",
                "/shared/" + token,
                "/shared/revoked");
    }

    private static String number(Issuing issuing) {
        return ((Issuing.Issued) issuing).sheet().number();
    }

    /** The pages that a form with faults, and a good one, come back with. */
    @ParameterizedTest
    @ValueSource(strings = {"/people", "/keys", "/account"})
    void isForEverybodyAfterAFormWasSent(String path, Browser browser) {
        try (Tab tab = Tab.desk(server, browser).as(session).open(path)) {
            tab.press(tab.page().locator("form.card button"));
            assertThat(tab.page().locator("#summary").isVisible()).isTrue();
            assertForEverybody(tab);
            if (!path.equals("/account")) {
                tab.page().locator("#name").fill("Dorit");
                tab.press(tab.page().locator("form.card button"));
                assertThat(tab.page().locator(".secret").isVisible()).isTrue();
                assertForEverybody(tab);
            }
        }
    }

    @Test
    void isForEverybodyWhenTwoChangedOneRoom(Browser browser) {
        Job job = server.job("Two at once", RunningServer.studio());
        ObjectNode survey = job.document().deepCopy();
        ((ObjectNode) survey.at("/rooms/0")).put("height", "3.3 m");
        try (Tab tab = Tab.desk(server, browser).as(session).open("/jobs/" + job.id() + "/rooms/studio-1")) {
            server.desk().save(job.id(), 1, "Two at once", survey, Change.by("Ben"));
            tab.page().locator("[name='/rooms/0/height']").fill("2.2");
            tab.press(tab.page().locator("button.main"));
            assertThat(tab.page().locator("fieldset.choice").count()).isEqualTo(1);
            assertForEverybody(tab);
            tab.press(tab.page().locator("button.main"));
            assertThat(tab.page().locator("#summary").isVisible()).isTrue();
            assertForEverybody(tab);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"room,height [m]\nstudio,3.3", "room,height [m]\nstudio,so high"})
    void isForEverybodyWithATableToLookAt(String table, Browser browser) {
        Job job = server.job("Tables", RunningServer.studio());
        try (Tab tab = Tab.desk(server, browser).as(session).open("/jobs/" + job.id() + "/files")) {
            tab.page().locator("#table-rooms").fill(table);
            tab.press(tab.page().locator("form.card button").first());
            assertThat(tab.page().locator("table.changes").isVisible()).isTrue();
            assertForEverybody(tab);
        }
    }

    /** Chosen, looked at and kept, with and without script; the second step sends the file no more. */
    @ParameterizedTest
    @ValueSource(booleans = {true, false})
    void aTableComesAsAFile(boolean script, Browser browser, @TempDir Path folder) throws IOException {
        Job job = server.job("Files", RunningServer.studio());
        Path good = Files.writeString(folder.resolve("rooms.csv"), "\uFEFFroom;remark\r\nstudio;Küche\r\n");
        Path bad = Files.writeString(folder.resolve("latin.csv"), "room\nKüche\n", StandardCharsets.ISO_8859_1);
        try (Tab tab = script ? Tab.desk(server, browser) : Tab.withoutScript(server, browser)) {
            tab.as(session).open("/jobs/" + job.id() + "/files");
            send(tab, bad);
            assertThat(tab.page().locator("#file-rooms-error").innerText()).contains("no text in UTF-8");
            if (script) {
                assertForEverybody(tab);
            }
            send(tab, good);
            assertThat(tab.page().locator("table.changes").innerText()).contains("Küche");
            if (script) {
                assertForEverybody(tab);
            }
            tab.press(tab.button("keep"));
            assertThat(server.now(job).document().at("/rooms/0/remark").textValue())
                    .isEqualTo("Küche");
        }
    }

    private static void send(Tab tab, Path file) {
        tab.page().locator("#file-rooms").setInputFiles(file);
        tab.press(tab.page().locator("form:has(#file-rooms) button"));
    }

    @Test
    void aSolvedWallFootIsForEverybody(Browser browser) {
        try (Tab tab = Tab.desk(server, browser).as(session).open(demo + wallFoot())) {
            tab.type("/heatedPlane", "0.15");
            tab.type("/foundation", "0.6");
            tab.type("/footConductivity", "1.3");
            tab.type("/edgeThickness", "50");
            tab.type("/edgeConductivity", "0.035");
            tab.type("/edgeDepth", "300");
            tab.press(tab.button("solve"));
            tab.page().waitForURL("**/wall-foot/*/*");
            assertThat(tab.page().locator("figure.picture").count()).isEqualTo(2);
            assertForEverybody(tab);
        }
    }

    /** They stand folded by standard, and what is folded is not looked at. */
    @Test
    void thePublishedValuesOfAStandardAreForEverybody(Browser browser) {
        try (Tab tab = Tab.desk(server, browser).as(session).open("/method")) {
            tab.awaitDone();
            Page page = tab.page();
            page.locator("details.values summary").first().click();
            assertThat(page.locator("details.values[open] table").isVisible()).isTrue();
            assertForEverybody(tab);
        }
    }

    /** The page would come again every second, under the hands of what looks at it; here it does not. */
    @ParameterizedTest
    @ValueSource(strings = {"a floor", "/method"})
    void aComputationIsForEverybodyAndCanBeCancelled(String what, Browser browser) {
        RunningServer other = RunningServer.start();
        Session owner = other.session(other.owner());
        ObjectNode survey = RunningServer.studio();
        ((ObjectNode) survey.at("/rooms/0/heatedFloor/heater")).put("spacing", "121.37 mm");
        String job = "/jobs/" + other.job("New floor", survey).id();
        Runnable free = other.busy();
        try (Tab tab = Tab.desk(other, browser).as(owner)) {
            tab.page().route("**/*", route -> {
                APIResponse response = route.fetch();
                Map<String, String> headers = new HashMap<>(response.headers());
                headers.remove("refresh");
                route.fulfill(new Route.FulfillOptions().setResponse(response).setHeaders(headers));
            });
            tab.ask(what.equals("/method") ? what : job);
            assertThat(tab.page().locator("progress").count()).isEqualTo(1);
            assertNoFaults(tab);
            tab.pressOnce(tab.page().locator("main form button.quiet"));
            assertThat(tab.page().locator("main [role=status]").innerText()).startsWith("Cancelled");
            assertNoFaults(tab);
        } finally {
            free.run();
            other.close();
        }
    }

    static Stream<String> pagesBeforeTheOwner() {
        return Stream.of("/sign-in", "/owner/" + invitation, "/owner/spent");
    }

    @ParameterizedTest
    @MethodSource("pages")
    void isForEverybody(String path, Browser browser) {
        try (Tab tab = Tab.desk(server, browser).as(session).open(path)) {
            assertForEverybody(tab);
        }
    }

    @ParameterizedTest
    @MethodSource("pagesBeforeTheOwner")
    void isForEverybodyBeforeThereIsAnOwner(String path, Browser browser) {
        try (Tab tab = Tab.desk(withoutOwner, browser).open(path)) {
            assertForEverybody(tab);
        }
    }

    private static void assertForEverybody(Tab tab) {
        // A page that tells of a computation comes again until that is done, under the hands of whoever looks at it.
        tab.awaitDone();
        assertNoFaults(tab);
    }

    private static void assertNoFaults(Tab tab) {
        Page page = tab.page();
        List<String> faults = new ArrayList<>();
        for (int width : new int[] {390, 820, 1280}) {
            page.setViewportSize(width, 1180);
            tooWide(page).forEach(what -> faults.add(width + " px: too wide: " + what));
            tooSmall(page).forEach(what -> faults.add(width + " px: too small: " + what));
            if (width != 390) {
                barriers(page).forEach(what -> faults.add(width + " px: " + what));
            }
        }
        faults.addAll(tab.complaints());
        assertThat(faults).isEmpty();
    }

    private static List<String> barriers(Page page) {
        List<String> barriers = new ArrayList<>();
        for (Rule rule : new AxeBuilder(page)
                .setLegacyMode(true)
                .withTags(RULES)
                .analyze()
                .getViolations()) {
            rule.getNodes()
                    .forEach(node -> barriers.add(rule.getId() + ": " + node.getTarget() + " " + node.getHtml() + " "
                            + node.getFailureSummary()));
        }
        return barriers;
    }

    /** Whatever sticks out of the page where the page itself would have to be scrolled sideways. */
    @SuppressWarnings("unchecked")
    private static List<String> tooWide(Page page) {
        return (List<String>) page.evaluate("""
                () => {
                  const width = document.documentElement.clientWidth;
                  if (document.documentElement.scrollWidth <= width) { return []; }
                  return [...document.querySelectorAll('body *')]
                      .filter(each => each.getBoundingClientRect().right > width + 0.5)
                      .slice(0, 5)
                      .map(each => each.outerHTML.slice(0, 150));
                }""");
    }

    /** Buttons and fields that a gloved finger would miss. */
    @SuppressWarnings("unchecked")
    private static List<String> tooSmall(Page page) {
        return (List<String>) page.evaluate("""
                smallest => [...document.querySelectorAll('button, input, select, textarea, summary')]
                    .filter(each => each.type !== 'hidden' && each.tabIndex >= 0)
                    .filter(each => each.checkVisibility())
                    .filter(each => each.getBoundingClientRect().height < smallest)
                    .slice(0, 5)
                    .map(each => each.getBoundingClientRect().height + ' ' + each.outerHTML.slice(0, 150))
                """, SMALLEST_TARGET);
    }
}
