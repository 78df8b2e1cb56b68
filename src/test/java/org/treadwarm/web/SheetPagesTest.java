package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Change;
import org.treadwarm.store.Role;

/** Sheets by forms: issued, read, verified, withdrawn, and shown to people without an account. */
class SheetPagesTest {
    private static RunningServer server;
    private static Visitor estimator;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        server.owner();
        estimator = new Visitor(server, server.session(server.member("Emmet", Role.ESTIMATOR)));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    private static Job job() {
        return server.job("yard", RunningServer.studio());
    }

    private static Page issue(Job job) {
        return estimator.send(estimator.open("/jobs/" + job.id() + "/issue").form("revision"));
    }

    @Test
    void anIssuedSheetShowsInputsAsTypedAndWhoIssuedIt() {
        Job job = job();
        assertThat(estimator.open("/jobs/" + job.id()).text()).contains("/issue");

        Page sheet = estimator.open(issue(job).location());

        assertThat(sheet.status()).isEqualTo(200);
        String typed = job.document().at("/site/outdoorTemperature").asText();
        String fingerprint = server.store().sheets().ofJob(job.id()).get(0).fingerprint();
        assertThat(sheet.text())
                .contains(typed, fingerprint, " by Emmet", "Method version", "Limits and margins", "Cautions", "<svg");
        List<String> ids = sheet.all("*")
                .map(element -> element.getAttribute("id"))
                .filter(id -> !id.isEmpty())
                .toList();
        assertThat(ids).doesNotHaveDuplicates();
        assertThat(estimator.open("/sheets").text())
                .contains(sheet.response().uri().getPath());
    }

    @Test
    void theJobListsItsSheetsAndNoOthers() {
        Job job = job();
        Job other = job();
        assertThat(estimator.open("/jobs/" + job.id()).id("sheets")).isEmpty();
        issue(other);
        String first = server.store().sheets().ofJob(other.id()).get(0).number();
        issue(job);
        String number = server.store().sheets().ofJob(job.id()).get(0).number();

        Page page = estimator.open("/jobs/" + job.id());

        assertThat(page.id("sheets").orElseThrow().getTextContent())
                .contains(number, "holds", "Emmet")
                .doesNotContain(first);
        assertThat(page.text()).contains("href=\"/sheets/" + number + "\"", "Sheets: 1");
    }

    @Test
    void theSameIsNotIssuedTwice() {
        Job job = job();
        issue(job);

        Page again = issue(job);

        assertThat(again.status()).isEqualTo(409);
        assertThat(again.text()).contains("has the same content and holds");
        assertThat(server.store().sheets().ofJob(job.id())).hasSize(1);
    }

    @Test
    void whatChangedMeanwhileIsLookedAtFirst() {
        Job job = job();
        Form form = estimator.open("/jobs/" + job.id() + "/issue").form("revision");
        server.desk().save(job.id(), 1, "yard, again", RunningServer.studio(), Change.by("tests"));

        Page refused = estimator.send(form);

        assertThat(refused.status()).isEqualTo(409);
        assertThat(refused.text()).contains("at revision 2 now");
        assertThat(server.store().sheets().ofJob(job.id())).isEmpty();
    }

    @Test
    void aDraftHasNoButton() {
        ObjectNode survey = RunningServer.studio();
        survey.remove("site");
        Job draft = server.job("draft", survey);

        assertThat(estimator.open("/jobs/" + draft.id()).text()).doesNotContain("/issue");
        Page page = estimator.open("/jobs/" + draft.id() + "/issue");
        assertThat(page.has("revision")).isFalse();
        assertThat(page.text()).contains("This job is a draft");
    }

    @Test
    void aNewSheetReplacesTheChosenOne() {
        Job job = job();
        String first = issue(job).location();
        ObjectNode changed = RunningServer.studio();
        ((ObjectNode) changed.get("site")).put("outdoorTemperature", "-14 °C");
        server.desk().save(job.id(), 1, "yard", changed, Change.by("tests"));

        Form form = estimator.open("/jobs/" + job.id() + "/issue").form("revision");
        assertThat(estimator.send(form.type("replaces", "1999-0001")).status()).isEqualTo(422);
        String second = estimator
                .send(form.type("replaces", first.substring("/sheets/".length())))
                .location();

        assertThat(estimator.open(first).text()).contains("<strong>Replaced</strong>", second);
        assertThat(estimator.open(second).text()).contains("sheet " + first.substring("/sheets/".length()));
    }

    @Test
    void verifyingTellsThatItAgrees() {
        String sheet = issue(job()).location();

        Page verified = estimator.open(sheet + "/verification");

        assertThat(verified.text()).contains("agrees", "The kept survey, sizing and method version have it.");
    }

    @Test
    void withdrawingNeedsAReasonAndStands() {
        String sheet = issue(job()).location();
        Form form = estimator.open(sheet + "/withdrawal").form("reason");
        assertThat(estimator.send(form.type("reason", " ")).status()).isEqualTo(422);

        Page withdrawn = estimator.submit(form.type("reason", "wrong <b>house"));

        assertThat(withdrawn.text()).contains("Withdrawn.", "By Emmet", "wrong &lt;b&gt;house");
        estimator.send(form.type("reason", "later"));
        assertThat(estimator.open(sheet).text())
                .contains("wrong &lt;b&gt;house")
                .doesNotContain("later");
        assertThat(estimator.open(sheet + "/withdrawal").location()).isEqualTo(sheet);
    }

    @Test
    void aLinkShowsTheSheetAndNothingElseToAStranger() {
        Job job = job();
        String sheet = issue(job).location();
        Page made = estimator.send(estimator.open(sheet + "/links").form("csrf").to(sheet + "/links"));
        String address = made.all("code").findFirst().orElseThrow().getTextContent();
        String path = address.substring(server.origin().length());
        Visitor stranger = new Visitor(server);

        Page shared = stranger.open(path);
        assertThat(shared.status()).isEqualTo(200);
        assertThat(shared.text())
                .contains("Sheet 2")
                .doesNotContain(job.id(), "/verification", "/withdrawal", "/links");
        assertThat(shared.response().headers().firstValue("X-Robots-Tag")).contains("noindex, nofollow, noarchive");
        assertThat(shared.response().headers().firstValue("Referrer-Policy")).contains("no-referrer");
        assertThat(shared.response().headers().firstValue("Cache-Control")).contains("no-store");
        assertThat(stranger.open(sheet).location()).startsWith("/sign-in");

        estimator.send(estimator.open(sheet + "/withdrawal").form("reason").type("reason", "wrong house"));
        assertThat(stranger.open(path).text()).contains("Withdrawn.", "wrong house");

        String id = server.store().sheetLinks().list(sheet.substring(8)).get(0).id();
        estimator.send(estimator.open(sheet + "/links").form("csrf").to(sheet + "/links/" + id + "/revoke"));
        assertThat(stranger.open(path).status()).isEqualTo(404);
        assertThat(estimator.open(sheet + "/links").text()).doesNotContain(path);
    }
}
