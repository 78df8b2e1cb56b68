package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Job;

/** The list of jobs, the page of a job, and one room without a job. */
class JobFormTest {
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

    private Form form() {
        return visitor.open("/jobs/" + job.id()).form("new-name");
    }

    private JsonNode kept(String pointer) {
        return server.now(job).document().at(pointer);
    }

    private List<String> names(String pointer) {
        List<String> names = new ArrayList<>();
        kept(pointer).fieldNames().forEachRemaining(names::add);
        return names;
    }

    @Test
    void startsAJob() {
        Page page = visitor.submit(visitor.open("/jobs").form("name").type("name", "Mill Lane"));

        assertThat(page.status()).isEqualTo(200);
        assertThat(page.value("job-name")).isEqualTo("Mill Lane");
        assertThat(server.desk().list().get(0).name()).isEqualTo("Mill Lane");
        assertThat(server.desk().list().get(0).savedBy()).isEqualTo(RunningServer.OWNER);
    }

    @Test
    void aJobNeedsAName() {
        int before = server.desk().list().size();

        for (String name : List.of("", "  ", "x".repeat(201))) {
            assertThat(visitor.send(visitor.open("/jobs").form("name").type("name", name))
                            .status())
                    .isEqualTo(422);
        }
        assertThat(server.desk().list()).hasSize(before);
    }

    @Test
    void addsARoomASpaceAndAnAssemblyAndOpensThem() {
        Page room = visitor.submit(form().type("new-name", "attic").press("add-room"));
        assertThat(room.value("/rooms/2/name")).isEqualTo("attic");
        Page space = visitor.submit(form().type("new-name", "coal / cellar").press("add-space"));
        assertThat(space.status()).isEqualTo(200);
        assertThat(space.value("part-name")).isEqualTo("coal / cellar");
        Page assembly =
                visitor.submit(form().type("new-name", "100 % 'new' wall?").press("add-assembly"));
        assertThat(assembly.status()).isEqualTo(200);
        assertThat(assembly.value("part-name")).isEqualTo("100 % 'new' wall?");

        assertThat(names("/spaces")).contains("coal / cellar");
        assertThat(names("/assemblies")).contains("100 % 'new' wall?");
    }

    @Test
    void addsNothingWithoutANameOrUnderOneThatIsTaken() {
        assertThat(visitor.send(form().type("new-name", " ").press("add-room")).status())
                .isEqualTo(422);
        assertThat(visitor.send(form().type("new-name", "loft").press("add-space"))
                        .status())
                .isEqualTo(422);
        assertThat(visitor.send(form().type("new-name", "door").press("add-assembly"))
                        .status())
                .isEqualTo(422);
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void aCopiedRoomHasItsOwnNameAndIds() {
        Page page = visitor.submit(form().press("copy-room:studio-1"));

        assertThat(page.status()).isEqualTo(200);
        JsonNode original = kept("/rooms/0");
        JsonNode copy = kept("/rooms/2");
        assertThat(copy.path("name").textValue()).isNotEqualTo("studio").isNotBlank();
        assertThat(copy.path("id").textValue()).isNotEqualTo("studio-1");
        assertThat(copy.at("/surfaces/0/id").textValue())
                .isNotBlank()
                .isNotEqualTo(original.at("/surfaces/0/id").textValue());
        assertThat(copy.at("/surfaces/1/width")).isEqualTo(original.at("/surfaces/1/width"));
        assertThat(server.now(job).draft()).isFalse();
    }

    @Test
    void aRenamedAssemblyIsRenamedWhereverItIsUsed() {
        Page page = visitor.open("/jobs/" + job.id() + "/assemblies/shed%20wall");

        Page after = visitor.submit(
                page.form("revision").type("part-name", "yard wall (new)").press("save"));

        assertThat(after.status()).isEqualTo(200);
        assertThat(names("/assemblies")).doesNotContain("shed wall").startsWith("yard wall (new)");
        assertThat(kept("/rooms/0/surfaces/0/assembly").textValue()).isEqualTo("yard wall (new)");
        assertThat(kept("/rooms/1/surfaces/1/assembly").textValue()).isEqualTo("yard wall (new)");
        assertThat(server.now(job).draft()).isFalse();
        assertThat(server.now(job).sizing().orElseThrow().total())
                .isEqualTo(job.sizing().orElseThrow().total());
    }

    @Test
    void aRenamedSpaceIsRenamedWhereverItIsUsed() {
        Page page = visitor.open("/jobs/" + job.id() + "/spaces/shop%20next%20door");

        visitor.submit(page.form("revision").type("part-name", "bakery").press("save"));

        assertThat(kept("/rooms/0/surfaces/4/to").textValue()).isEqualTo("bakery");
        assertThat(kept("/rooms/1/heatedFloor/to").textValue()).isEqualTo("bakery");
        assertThat(server.now(job).draft()).isFalse();
    }

    @Test
    void addsAndTakesOutLayersOfAnAssembly() {
        String path = "/jobs/" + job.id() + "/assemblies/shed%20wall";
        String list = "/assemblies/shed wall/layers";
        Page added = visitor.submit(visitor.open(path).form("revision").press("add:" + list));
        assertThat(kept(list).size()).isEqualTo(5);

        Page typed = visitor.submit(added.form("revision")
                .type(list + "/4/name", "render")
                .type(list + "/4/thickness", "15")
                .type(list + "/4/conductivity", "0.8")
                .press("save"));
        assertThat(typed.status()).isEqualTo(200);
        assertThat(typed.value(list + "/4/thickness")).isEqualTo("15");
        assertThat(server.now(job)
                        .survey()
                        .orElseThrow()
                        .assemblies()
                        .get("shed wall")
                        .layers()
                        .get(4)
                        .thickness())
                .hasValueSatisfying(reading -> assertThat(reading.value()).isEqualTo(0.015));
        visitor.submit(typed.form("revision").press("remove:" + list + "/0"));
        assertThat(kept(list).size()).isEqualTo(4);
        assertThat(kept(list + "/0/name").textValue()).isEqualTo("wool between studs");
    }

    @Test
    void theSiteIsTypedOnThePageOfTheJob() {
        Page page =
                visitor.send(form().type("/site/outdoorTemperature", "-61 °C").press("save"));
        assertThat(page.status()).isEqualTo(422);
        assertThat(page.value("/site/outdoorTemperature")).isEqualTo("-61 °C");

        visitor.submit(form().type("/site/outdoorTemperature", "-12").press("save"));
        assertThat(server.now(job).draft()).isFalse();
        assertThat(server.now(job)
                        .survey()
                        .orElseThrow()
                        .site()
                        .outdoorTemperature()
                        .value())
                .isEqualTo(-12);
    }

    @Test
    void theJobIsRenamed() {
        visitor.submit(form().type("job-name", "Mill Lane 2").press("save"));

        assertThat(server.now(job).name()).isEqualTo("Mill Lane 2");
    }

    @Test
    void whatIsNotThereIsNotFound() {
        for (String path : List.of(
                "nosuchjob123",
                job.id() + "/rooms/none",
                job.id() + "/spaces/none",
                job.id() + "/walls/none",
                job.id() + "/site/outdoorTemperature",
                job.id() + "/assemblies/..")) {
            assertThat(visitor.open("/jobs/" + path).status()).as(path).isIn(404);
        }
    }

    @Test
    void oneRoomIsSizedAndKeptAsAJob() {
        int before = server.desk().list().size();
        Form form = visitor.open("/one-room").form("document");
        Page bad = visitor.send(form.type("/rooms/0/height", "x").press("save"));
        assertThat(bad.status()).isEqualTo(422);
        assertThat(bad.value("/rooms/0/height")).isEqualTo("x");
        Page good = visitor.send(bad.form("document")
                .type("/rooms/0/height", "2.6 m")
                .type("/site/outdoorTemperature", "-14")
                .press("save"));
        assertThat(good.status()).isEqualTo(200);
        assertThat(server.desk().list()).hasSize(before);

        assertThat(visitor.submit(good.form("document").to("/one-room/keep")).status())
                .isEqualTo(200);
        JsonNode kept = server.desk()
                .current(server.desk().list().get(0).jobId())
                .orElseThrow()
                .document();
        assertThat(kept.at("/rooms/0/height").textValue()).isEqualTo("2.6 m");
        assertThat(kept.at("/site/outdoorTemperature").textValue()).startsWith("-14");
    }

    @Test
    void oneRoomSurvivesWhatNoBrowserSends() {
        for (String document : List.of(
                "",
                "{",
                "[]",
                "5",
                "{\"rooms\": []}",
                "{\"rooms\": [5]}",
                "{\"rooms\": {\"0\": {}}}",
                "{\"rooms\": [{}], \"site\": 5}",
                "{\"rooms\": [{}], \"spaces\": [1]}")) {
            for (String action : List.of(
                    "save",
                    "keep",
                    "add:/rooms/0/surfaces",
                    "remove:/rooms/0/surfaces/9",
                    "assume:/site/altitude",
                    "add:/",
                    "remove:")) {
                Page page = visitor.send(visitor.open("/one-room")
                        .form("document")
                        .type("document", document)
                        .to(action.equals("keep") ? "/one-room/keep" : "/one-room")
                        .press(action));
                assertThat(page.status()).as(document + " " + action).isLessThan(500);
            }
            assertThat(visitor.send(visitor.open("/one-room")
                                    .form("document")
                                    .type("document", document)
                                    .to("/one-room/preview"))
                            .status())
                    .as(document)
                    .isLessThan(500);
        }
    }

    @Test
    void draftsOfOddShapesOpenAndAreNotChangedByLooking() throws Exception {
        for (String odd : List.of(
                "{}",
                "{\"rooms\": {\"a\": {\"id\": \"a\"}}}",
                "{\"rooms\": [1, null, \"x\", {\"id\": 5}, {\"id\": \"a\", \"surfaces\": 7, \"air\": [],"
                        + " \"heatedFloor\": \"warm\", \"height\": {\"a\": 1}}]}",
                "{\"site\": \"here\", \"spaces\": [1], \"assemblies\": {\"w\": 5, \"v\": {\"layers\": {\"a\": 1}}}}",
                "{\"spaces\": {\"s\": {\"surfaces\": [null, 5]}, \"\": {}}, \"rooms\": [{\"id\": \"a\", \"name\": [1]}]}")) {
            Job odds = server.job("odd", Document.read(odd.getBytes(java.nio.charset.StandardCharsets.UTF_8)));
            String base = "/jobs/" + odds.id();
            assertThat(visitor.open(base).status()).as(odd).isEqualTo(200);
            for (String part :
                    List.of("/rooms/a", "/rooms/5", "/assemblies/w", "/assemblies/v", "/spaces/s", "/spaces/0")) {
                assertThat(visitor.open(base + part).status()).as(odd + part).isIn(200, 404);
            }
            for (String action : List.of("save", "add-room", "add-space", "add-assembly", "copy-room:a")) {
                assertThat(visitor.send(visitor.open(base)
                                        .form("new-name")
                                        .type("new-name", "new")
                                        .press(action))
                                .status())
                        .as(odd + action)
                        .isLessThan(500);
            }
        }
    }

    @Test
    void aJobNameThatCannotBeTakenIsHeldBackWithWhatWasTyped() {
        for (String name : List.of("", "x".repeat(201))) {
            Page page = visitor.send(form().type("job-name", name).press("save"));

            assertThat(page.status()).isEqualTo(422);
            assertThat(page.value("job-name")).isEqualTo(name);
        }
        assertThat(server.now(job).name()).isEqualTo("yard");
    }
}
