package org.treadwarm.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.nullValue;

import io.restassured.response.Response;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Change;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.store.Scope;
import org.treadwarm.store.SheetContent;
import org.treadwarm.store.SheetHeader;
import org.treadwarm.store.SheetOrder;

/** Lists, part by part. */
class PagingApiTest {
    private static RunningServer server;
    private static ApiClient api;
    private static Job first;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        api = new ApiClient(server);
        for (int i = 0; i < 5; i++) {
            first = server.job("House " + i, Document.mapper().createObjectNode());
        }
        for (int i = 1; i < 5; i++) {
            server.desk().save(first.id(), i, "House", Document.mapper().createObjectNode(), Change.by("tests"));
        }
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    private static List<String> walk(String path, String rows, String field) {
        return walk(path + "?limit=2", 2, rows, field);
    }

    private static List<String> walk(String begin, int most, String rows, String field) {
        List<String> seen = new ArrayList<>();
        Optional<String> next = Optional.of("/api/v1" + begin);
        while (next.isPresent()) {
            Response part = given().baseUri(server.origin())
                    .urlEncodingEnabled(false)
                    .header("Authorization", "Bearer " + server.key(Scope.READ))
                    .get(next.get());
            part.then().statusCode(200);
            List<Object> found = part.path(rows + "." + field);
            assertThat(found).hasSizeLessThanOrEqualTo(most);
            found.forEach(each -> seen.add(each.toString()));
            next = Optional.ofNullable(part.path("next"));
            String link = next.map(address -> "<" + address + ">; rel=\"next\"").orElse(null);
            assertThat(part.header("Link")).isEqualTo(link);
        }
        return seen;
    }

    @Test
    void givesEveryJobOnce() {
        assertThat(walk("/jobs", "jobs", "id"))
                .isEqualTo(
                        server.desk().list().stream().map(RevisionHeader::jobId).toList());
    }

    @Test
    void givesEveryJobOnceThoughTheyAreSavedMeanwhile() {
        List<String> before =
                server.desk().list().stream().map(RevisionHeader::jobId).toList();
        Response begin = api.with(Scope.READ).queryParam("limit", 2).get("/jobs");
        for (String id : List.of(before.get(1), before.get(4))) {
            Job job = server.desk().current(id).orElseThrow();
            server.desk().save(id, job.revision(), job.name(), job.document(), Change.by("tests"));
        }
        server.job("begun meanwhile", Document.mapper().createObjectNode());

        List<String> told = new ArrayList<>(begin.<List<String>>path("jobs.id"));
        String next = begin.path("next");
        told.addAll(walk(next.substring("/api/v1".length()), 2, "jobs", "id"));
        assertThat(told).isEqualTo(before);
    }

    @Test
    void givesEveryRevisionOnce() {
        assertThat(walk("/jobs/" + first.id() + "/revisions", "revisions", "revision"))
                .containsExactly("5", "4", "3", "2", "1");
    }

    @Test
    void givesEverySheetOnceAlsoWithoutALimit() {
        issue(250);
        List<String> all = numbers();

        assertThat(all).hasSizeGreaterThanOrEqualTo(250);
        assertThat(walk("/sheets", 100, "sheets", "number")).isEqualTo(all);
        assertThat(walk("/sheets?limit=7", 7, "sheets", "number")).isEqualTo(all);
    }

    @Test
    void aSheetIssuedMeanwhileMovesNoOther() {
        issue(5);
        List<String> before = numbers();
        Response begin = api.with(Scope.READ).queryParam("limit", 2).get("/sheets");
        issue(1);

        String next = begin.path("next");
        assertThat(walk(next.substring("/api/v1".length()), 2, "sheets", "number"))
                .isEqualTo(before.subList(2, before.size()));
    }

    private static List<String> numbers() {
        return server.store().sheets().list().stream().map(SheetHeader::number).toList();
    }

    private static void issue(int sheets) {
        Job job = server.job("Sheets", Document.mapper().createObjectNode());
        for (int i = 0; i < sheets; i++) {
            SheetContent content = new SheetContent("1", "{}", "{\"variant\":" + i + "}");
            server.store().sheets().issue(new SheetOrder(job.id(), 1, content, Optional.empty()), "tests");
        }
    }

    @Test
    void givesEveryMaterialOnce() {
        List<String> all =
                api.with(Scope.READ).queryParam("limit", 200).get("/materials").path("materials.name");
        assertThat(walk("/materials", "materials", "name")).startsWith(all.toArray(String[]::new));
    }

    @Test
    void keepsWhatWasSearchedFor() {
        Response part = api.with(Scope.READ)
                .queryParam("find", "a")
                .queryParam("limit", 1)
                .get("/materials");

        part.then().body("next", containsString("find=a&limit=1&cursor="));
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "201", "-1", "ten", "", "1e2"})
    void refusesOtherLimits(String limit) {
        api.with(Scope.READ)
                .queryParam("limit", limit)
                .get("/jobs")
                .then()
                .statusCode(400)
                .body("detail", containsString("1 to 200, not \"" + limit + "\""));
    }

    @ParameterizedTest
    @CsvSource({
        "/jobs, ",
        "/jobs, am9icyA",
        "/jobs, %%%",
        "/materials, cmV2aXNpb25zIDE",
        "/jobs, cmV2aXNpb25zIDE",
        "/jobs, am9icyAyMDI2LTEyLTAyVDA5OjAwOjAwLjAwMFpfYWFhYWFhYWFhYWFh",
        "/sheets, c2hlZXRzIDIwMjY"
    })
    void refusesForeignCursors(String path, String cursor) {
        api.with(Scope.READ)
                .queryParam("cursor", Optional.ofNullable(cursor).orElse(""))
                .get(path)
                .then()
                .statusCode(400)
                .body("detail", containsString("cursor"))
                .body("detail", containsString("begin the list again"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"/materials?find=oak%zz", "/jobs?limit=%", "/jobs?archived=%f"})
    void refusesWhatCannotBeDecoded(String path) throws IOException {
        RawAnswer answer =
                RawRequest.get("/api/v1" + path, server.key(Scope.READ)).sendTo(server);

        assertThat(answer.status()).isEqualTo(400);
        assertThat(answer.body()).contains("is not encoded");
    }

    @Test
    void theLastPartHasNoNext() {
        api.with(Scope.READ).get("/jobs").then().body("next", nullValue());
    }
}
