package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.jobs.Job;
import org.w3c.dom.Element;

/** The form of a room, filled in without script. */
class RoomFormTest {
    private static RunningServer server;
    private static Visitor visitor;

    private Job job;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        visitor = new Visitor(server, server.session(server.owner()));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    @BeforeEach
    void fresh() {
        job = server.job("yard", RunningServer.studio());
    }

    private String path() {
        return "/jobs/" + job.id() + "/rooms/studio-1";
    }

    private Form form() {
        return visitor.open(path()).form("revision");
    }

    private JsonNode kept(String pointer) {
        return server.now(job).document().at(pointer);
    }

    @Test
    void anUntouchedFormChangesNothing() {
        assertThat(visitor.send(form().press("save")).status()).isEqualTo(303);
        assertThat(visitor.send(visitor.open("/jobs/" + job.id())
                                .form("new-name")
                                .press("save"))
                        .status())
                .isEqualTo(303);
        for (String name : List.of(
                "spaces/loft",
                "spaces/stair",
                "spaces/shop%20next%20door",
                "assemblies/shed%20wall",
                "assemblies/stud%20partition",
                "assemblies/new%20sash")) {
            Page page = visitor.open("/jobs/" + job.id() + "/" + name);
            assertThat(visitor.send(page.form("revision").press("save")).status())
                    .isEqualTo(303);
        }
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void emptyListsOfAnotherProgramAreLeftAlone() {
        ObjectNode survey = RunningServer.studio();
        ((ObjectNode) survey.at("/rooms/0/surfaces/1")).putArray("openings");
        ((ObjectNode) survey.at("/spaces/loft")).putArray("junctions");
        job = server.job("lists", survey);

        visitor.send(form().press("save"));
        visitor.send(visitor.open("/jobs/" + job.id() + "/spaces/loft")
                .form("revision")
                .press("save"));

        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void anUntouchedFormOfTheDemoChangesNothing() {
        Job demo = server.job("demo", org.treadwarm.jobs.Demo.survey());
        for (String kind : List.of("spaces", "assemblies")) {
            demo.document().path(kind).fieldNames().forEachRemaining(name -> untouched(demo, kind, name));
        }
        demo.document()
                .path("rooms")
                .forEach(room -> untouched(demo, "rooms", room.path("id").asText()));

        assertThat(server.now(demo).document()).isEqualTo(demo.document());
        assertThat(server.now(demo).revision()).isEqualTo(1);
    }

    private static void untouched(Job job, String kind, String name) {
        String path = "/jobs/" + job.id() + "/" + kind + "/"
                + java.net.URLEncoder.encode(name, java.nio.charset.StandardCharsets.UTF_8)
                        .replace("+", "%20");
        Page page = visitor.open(path);
        assertThat(page.status()).as(path).isEqualTo(200);
        assertThat(visitor.send(page.form("revision").press("save")).status())
                .as(path)
                .isEqualTo(303);
    }

    @Test
    void aBareNumberGetsTheUnitBesideTheFieldAndIsShownAsTyped() {
        Page page = visitor.submit(form().type("/rooms/0/height", "2,95").press("save"));

        assertThat(page.status()).isEqualTo(200);
        assertThat(page.value("/rooms/0/height")).isEqualTo("2,95");
        assertThat(kept("/rooms/0/height").textValue()).matches("2,95[ \u00a0]?m");
        assertThat(server.now(job)
                        .survey()
                        .orElseThrow()
                        .rooms()
                        .get(0)
                        .height()
                        .value())
                .isEqualTo(2.95);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "12' 6\"",
                "12' 6 1/2\"",
                "3,81 m",
                "3.1 ± 0.02 m",
                "310 cm",
                "122 in",
                "3.1",
                "10 ft",
            })
    void whatIsTypedIsKeptToTheLetter(String typed) {
        Page page = visitor.submit(form().type("/rooms/0/height", typed).press("save"));

        assertThat(page.status()).isEqualTo(200);
        assertThat(page.value("/rooms/0/height")).isEqualTo(typed);
        assertThat(kept("/rooms/0/height").textValue()).startsWith(typed);
        assertThat(server.now(job).draft()).isFalse();
    }

    @Test
    void aBadReadingIsShownAgainWhereItWasTypedAndKeptAsADraft() {
        Page page = visitor.send(form().type("/rooms/0/height", "about so high").press("save"));

        assertThat(page.status()).isEqualTo(422);
        assertThat(page.value("/rooms/0/height")).isEqualTo("about so high");
        Element field = page.field("/rooms/0/height");
        assertThat(field.getAttribute("aria-invalid")).isEqualTo("true");
        Element link = page.all("a")
                .filter(each -> each.getAttribute("href").equals("#" + field.getAttribute("id")))
                .findFirst()
                .orElseThrow();
        assertThat(link.getTextContent()).isNotBlank();
        assertThat(Arrays.stream(field.getAttribute("aria-describedby").split(" ")))
                .isNotEmpty()
                .allMatch(id -> page.id(id).isPresent());
        assertThat(server.now(job).draft()).isTrue();
        assertThat(kept("/rooms/0/height").textValue()).startsWith("about so high");
        assertThat(visitor.open(path()).value("/rooms/0/height")).isEqualTo("about so high");
    }

    @Test
    void everyLinkOfTheSummaryLeadsSomewhere() {
        ObjectNode survey = RunningServer.studio();
        ObjectNode room = (ObjectNode) survey.get("rooms").get(0);
        room.remove(List.of("height", "indoorTemperature"));
        room.put("colour", "red");
        ((ObjectNode) room.at("/surfaces/0")).put("area", "0 m2").put("to", "nowhere");
        ((ObjectNode) room.at("/surfaces/0/openings/0")).put("count", "-1");
        ((ObjectNode) room.at("/heatedFloor")).remove("ground");
        room.putObject("air");
        ((ObjectNode) room.at("/junctions/0"))
                .putObject("psi")
                .put("reading", "x")
                .put("basis", "guessed");
        job = server.job("broken", survey);

        Page page = visitor.open(path());

        List<String> targets = page.all("a")
                .map(link -> link.getAttribute("href"))
                .filter(href -> href.startsWith("#") && !href.equals("#content"))
                .toList();
        assertThat(targets)
                .hasSizeGreaterThan(6)
                .allSatisfy(target ->
                        assertThat(page.id(target.substring(1))).as(target).isPresent());
    }

    @Test
    void idsOfThePageAreUnique() {
        assertThat(visitor.open(path())
                        .all("*")
                        .map(element -> element.getAttribute("id"))
                        .filter(id -> !id.isEmpty()))
                .doesNotHaveDuplicates();
    }

    @Test
    void notKnownPutsInWhatIsAssumed() {
        Page before = visitor.open(path());
        String action = before.all("button")
                .map(button -> button.getAttribute("value"))
                .filter(value -> value.startsWith("assume:") && !value.endsWith("/height"))
                .findFirst()
                .orElseThrow();
        String pointer = action.substring("assume:".length());

        Page page = visitor.submit(
                before.form("revision").type("/rooms/0/height", "3.3 m").press(action));

        assertThat(kept(pointer).path("basis").textValue()).isEqualTo("assumed");
        assertThat(kept(pointer).path("reading").textValue()).isNotBlank();
        assertThat(page.value(pointer)).isEqualTo(kept(pointer).path("reading").textValue());
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("3.3 m");
        visitor.submit(page.form("revision").press("save"));
        assertThat(kept(pointer).path("basis").textValue()).isEqualTo("assumed");
    }

    @Test
    void typingOverAnAssumedReadingEndsItsBasis() {
        ObjectNode survey = RunningServer.studio();
        ((ObjectNode) survey.get("rooms").get(0))
                .putObject("height")
                .put("reading", "3 m")
                .put("basis", "assumed");
        job = server.job("assumed", survey);

        visitor.submit(form().type("/rooms/0/height", "3.05 m").press("save"));

        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("3.05 m");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/rooms/0/surfaces",
                "/rooms/0/surfaces/0/openings",
                "/rooms/0/surfaces/1/openings",
                "/rooms/0/junctions",
                "/rooms/0/heatedFloor/above",
                "/rooms/0/heatedFloor/below",
                "/rooms/0/heatedFloor/parts"
            })
    void addsAPartAndTakesItOutAgain(String list) {
        int before = kept(list).size();
        JsonNode document = server.now(job).document();

        Page added = visitor.submit(form().press("add:" + list));
        assertThat(kept(list).size()).isEqualTo(before + 1);
        assertThat(added.offers("remove:" + list + "/" + before)).isTrue();
        visitor.submit(added.form("revision").press("remove:" + list + "/" + before));

        assertThat(server.now(job).document()).isEqualTo(document);
    }

    @Test
    void takingOutTheFirstPartKeepsTheOthersAsTyped() {
        JsonNode second = kept("/rooms/0/surfaces/1");

        visitor.submit(form().press("remove:/rooms/0/surfaces/0"));

        assertThat(kept("/rooms/0/surfaces/0")).isEqualTo(second);
        assertThat(kept("/rooms/0/surfaces").size()).isEqualTo(5);
    }

    @Test
    void whatWasTypedIsKeptWithEveryButton() {
        visitor.submit(form().type("/rooms/0/surfaces/0/area", "25 m2").press("add:/rooms/0/junctions"));

        assertThat(kept("/rooms/0/surfaces/0/area").textValue()).isEqualTo("25 m2");
    }

    @Test
    void theHeatedFloorIsTakenOutAndAddedAgain() {
        Page without = visitor.submit(form().press("remove:/rooms/0/heatedFloor"));
        assertThat(kept("/rooms/0/heatedFloor").isMissingNode()).isTrue();

        visitor.submit(without.form("revision").press("add:/rooms/0/heatedFloor"));
        assertThat(kept("/rooms/0/heatedFloor").isObject()).isTrue();
    }

    @Test
    void anEmptiedFieldIsTakenOut() {
        visitor.submit(form().type("/rooms/0/remark", "a note").press("save"));
        assertThat(kept("/rooms/0/remark").textValue()).isEqualTo("a note");

        visitor.submit(form().type("/rooms/0/remark", " ").press("save"));
        assertThat(kept("/rooms/0/remark").isMissingNode()).isTrue();
    }

    @Test
    void fieldsThatTheFormDoesNotHaveAreNotWritten() {
        visitor.send(form().forge("/rooms/0/colour", "red")
                .forge("/rooms/1/height", "9 m")
                .forge("/rooms/0/surfaces/99/area", "1 m2")
                .forge("/site/altitude", "9 m")
                .forge("/rooms/0/id", "other")
                .forge("/", "x")
                .forge("/rooms", "x")
                .forge("/rooms/0/surfaces", "x")
                .forge("/rooms/0/surfaces/-1/area", "x")
                .press("save"));

        JsonNode now = server.now(job).document();
        assertThat(now.at("/site")).isEqualTo(job.document().at("/site"));
        assertThat(now.at("/rooms/1")).isEqualTo(job.document().at("/rooms/1"));
        assertThat(now.at("/rooms/0/surfaces")).isEqualTo(job.document().at("/rooms/0/surfaces"));
        assertThat(now.at("/rooms/0/id").textValue()).isEqualTo("studio-1");
        assertThat(now.at("/rooms/0/colour").isMissingNode()).isTrue();
    }

    @Test
    void theAnswerFollowsWhatIsTypedAndKeepsNothing() {
        Form form = form().type("/rooms/0/indoorTemperature", "27 °C");
        String saved = answerOf(visitor.open(path()));

        Page preview = visitor.send(form.to(path() + "/preview"));

        assertThat(preview.status()).isEqualTo(200);
        assertThat(answerOf(preview)).isNotBlank().isNotEqualTo(saved);
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    private static String answerOf(Page page) {
        return page.id("answer").orElseThrow().getTextContent();
    }

    @Test
    void theRoomIsTakenOutOfTheJob() {
        Page page = visitor.submit(form().press("remove-part"));

        assertThat(page.status()).isEqualTo(200);
        assertThat(kept("/rooms").size()).isEqualTo(1);
        assertThat(visitor.open(path()).status()).isEqualTo(404);
        assertThat(server.desk().revision(job.id(), 1).orElseThrow().document()).isEqualTo(job.document());
    }

    @Test
    void aTextTooLongIsKeptInADraftThatCanBeOpenedAndMended() {
        String tooLong = "x".repeat(10_500);

        assertThat(visitor.send(form().type("/rooms/0/name", tooLong).press("save"))
                        .status())
                .isEqualTo(422);

        Page page = visitor.open(path());
        assertThat(page.status()).isEqualTo(200);
        assertThat(page.value("/rooms/0/name")).isEqualTo(tooLong);
        assertThat(visitor.open("/jobs/" + job.id()).status()).isEqualTo(200);
        assertThat(visitor.send(page.form("revision")
                                .type("/rooms/0/name", "studio")
                                .press("save"))
                        .status())
                .isEqualTo(303);
        assertThat(server.now(job).draft()).isFalse();
    }

    @Test
    void aNameThatCannotBeTakenIsHeldBackWithWhatWasTyped() {
        for (String name : List.of("", "x".repeat(201), "stud partition")) {
            Page assembly = visitor.open("/jobs/" + job.id() + "/assemblies/shed%20wall");

            Page answer = visitor.send(
                    assembly.form("revision").type("part-name", name).press("save"));

            assertThat(answer.status()).isEqualTo(422);
            assertThat(answer.value("part-name")).isEqualTo(name);
        }
        assertThat(server.now(job).revision()).isEqualTo(1);
    }
}
