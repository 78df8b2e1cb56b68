package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.empty;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.not;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.store.Change;
import org.treadwarm.store.Scope;

/** A job's history, copies and the archive, on pages and over the API. */
class HistoryTest {
    private static RunningServer server;
    private static ApiClient api;
    private static Visitor visitor;

    private Job job;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        api = new ApiClient(server);
        visitor = new Visitor(server, server.session(server.owner()));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    /** Revision 2 makes the studio higher and says who surveyed. */
    @BeforeEach
    void fresh() {
        job = server.job("yard", RunningServer.studio());
        ObjectNode survey = job.document().deepCopy();
        ((ObjectNode) survey.at("/rooms/0")).put("height", "3.3 m");
        ((ObjectNode) survey.at("/site")).put("surveyedBy", "Silvie Quill");
        assertThat(server.desk().save(job.id(), 1, "yard two", survey, new Change("Ben", "after a visit")))
                .isInstanceOf(Saving.Saved.class);
    }

    private String at(String rest) {
        return "/jobs/" + job.id() + rest;
    }

    @Test
    void thePageSaysWhoChangedWhatFromWhatToWhat() {
        Page page = visitor.open(at("/history"));

        assertThat(page.status()).isEqualTo(200);
        assertThat(page.text())
                .contains("Revision 2", "Ben", "after a visit", "room height", "3.3 m", "Silvie Quill", "Revision 1");
        assertThat(visitor.open(at("/history?before=2")).text())
                .contains("The job was started")
                .doesNotContain("3.3 m");
        assertThat(visitor.open(at("/history?before=x")).status()).isEqualTo(404);
        assertThat(visitor.open("/jobs/nosuchjob123/history").status()).isEqualTo(404);
    }

    @Test
    void anOldRevisionIsShownToReadAndBroughtBackAsANewOne() {
        Page old = visitor.open(at("/history/1"));
        assertThat(old.status()).isEqualTo(200);
        assertThat(old.text()).contains("Revision 1 of yard").doesNotContain("3.3 m");

        assertThat(visitor.send(old.form("revision")).status()).isEqualTo(303);

        Job now = server.now(job);
        assertThat(now.revision()).isEqualTo(3);
        assertThat(now.document()).isEqualTo(job.document());
        assertThat(now.name()).isEqualTo("yard");
        assertThat(visitor.open(at("/history")).text()).contains("revision 1 restored");
        assertThat(visitor.open(at("/history/3")).text()).contains("newest revision");
    }

    @Test
    void aRevisionIsNotBroughtBackOverASaveThatWasNotSeen() {
        Form form = visitor.open(at("/history/1")).form("revision");
        server.desk().save(job.id(), 2, "third", job.document(), Change.by("Ben"));

        Page answer = visitor.send(form);

        assertThat(answer.status()).isEqualTo(409);
        assertThat(server.now(job).name()).isEqualTo("third");
        assertThat(visitor.send(answer.form("revision").to(at("/history/1/restore")))
                        .status())
                .isEqualTo(303);
    }

    @ParameterizedTest
    @ValueSource(strings = {"/history/0", "/history/9", "/history/x", "/history/99999999999999999999"})
    void saysWhenThereIsNoSuchRevision(String path) {
        assertThat(visitor.open(at(path)).status()).isEqualTo(404);
    }

    @Test
    void aLongListOfJobsIsGivenPartByPartAndEachOnce() {
        for (int i = 0; i < 120; i++) {
            server.job("long & list " + i, RunningServer.studio());
        }
        List<String> found = new ArrayList<>();
        Optional<String> next = Optional.of("/jobs?find=long+%26+list");
        while (next.isPresent()) {
            Page page = visitor.open(next.get());
            assertThat(page.status()).isEqualTo(200);
            page.all("a")
                    .map(link -> link.getAttribute("href"))
                    .filter(href -> href.matches("/jobs/[a-z2-9]+"))
                    .forEach(found::add);
            next = page.all("a")
                    .map(link -> link.getAttribute("href"))
                    .filter(href -> href.contains("after="))
                    .findFirst();
        }

        assertThat(found).hasSize(120).doesNotHaveDuplicates();
    }

    @Test
    void copiesArchivesAndFindsJobsOnPages() {
        Page page = visitor.open(at(""));
        Page copy = visitor.submit(page.form("csrf").to(at("/copy")));
        assertThat(copy.text()).contains("yard two (copy)");
        visitor.send(page.form("csrf").to(at("/archive")));

        assertThat(visitor.open(at("")).text()).contains("This job is archived");
        assertThat(visitor.open("/jobs?find=silvie+q").text())
                .contains("yard two (copy)")
                .contains("Revision");
        assertThat(visitor.open("/jobs?find=shower&show=archived").text())
                .contains("yard two")
                .doesNotContain("yard two (copy)");
        assertThat(visitor.open("/jobs?find=nobody").text()).contains("No job matches");
        assertThat(visitor.open("/jobs?show=x").status()).isEqualTo(404);
        Page unknown = visitor.open("/jobs?after=2026-12-02T09:00:00.000Z_aaaaaaaaaaaa");
        assertThat(unknown.status()).isEqualTo(400);
        assertThat(unknown.text()).contains("begin the list again", "href=\"/jobs\"");

        visitor.send(page.form("csrf").to(at("/unarchive")));
        assertThat(visitor.open(at("")).text()).doesNotContain("This job is archived");
    }

    @Test
    void theApiTellsWhatARevisionChanged() {
        api.with(Scope.READ)
                .get(at("/revisions/2/changes"))
                .then()
                .statusCode(200)
                .body("changes.address", containsInAnyOrder("/rooms/studio-1/height", "/site/surveyedBy"))
                .body("changes.find { it.address.endsWith('height') }.after", equalTo("3.3 m"))
                .body("changes.label", hasItem("rooms › studio › room height"));
        api.with(Scope.READ)
                .get(at("/revisions/1/changes"))
                .then()
                .statusCode(200)
                .body("changes", empty());
        api.with(Scope.READ).get(at("/revisions/9/changes")).then().statusCode(404);
    }

    @Test
    void theApiRestoresOnlyFromTheRevisionThatWasSeen() {
        api.with(Scope.WRITE).post(at("/revisions/1/restore")).then().statusCode(428);
        api.with(Scope.WRITE)
                .header("If-Match", "\"1\"")
                .post(at("/revisions/1/restore"))
                .then()
                .statusCode(412);
        api.with(Scope.WRITE)
                .header("If-Match", "\"2\"")
                .post(at("/revisions/1/restore"))
                .then()
                .statusCode(200)
                .body("revision", equalTo(3));
        api.with(Scope.WRITE)
                .header("If-Match", "*")
                .post(at("/revisions/9/restore"))
                .then()
                .statusCode(404);
        assertThat(server.now(job).document()).isEqualTo(job.document());
    }

    @Test
    void theApiCopiesArchivesAndFinds() {
        String copy = api.with(Scope.WRITE)
                .post(at("/copy"))
                .then()
                .statusCode(201)
                .body("name", equalTo("yard two (copy)"))
                .extract()
                .path("id");
        api.with(Scope.WRITE).post("/jobs/" + copy + "/archive").then().body("archived", equalTo(true));

        api.with(Scope.READ)
                .get("/jobs?find=SILVIE&archived=true")
                .then()
                .statusCode(200)
                .body("jobs.id", hasItem(copy))
                .body("jobs.id", not(hasItem(job.id())));
        api.with(Scope.READ).get("/jobs?archived=false").then().body("jobs.id", not(hasItem(copy)));
        api.with(Scope.READ)
                .get("/jobs?limit=1")
                .then()
                .body("jobs.size()", equalTo(1))
                .body("next", containsString("limit=1&cursor="));
        api.with(Scope.WRITE).post("/jobs/" + copy + "/unarchive").then().body("archived", equalTo(false));
        for (String act : new String[] {"copy", "archive", "unarchive"}) {
            api.with(Scope.WRITE).post("/jobs/nosuchjob123/" + act).then().statusCode(404);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"archived=maybe", "find=%00"})
    void theApiRefusesWhatCannotBeAskedFor(String query) {
        api.with(Scope.READ)
                .urlEncodingEnabled(false)
                .get("/jobs?" + query)
                .then()
                .statusCode(422)
                .body("errors.pointer", contains("/" + query.substring(0, query.indexOf('='))));
    }
}
