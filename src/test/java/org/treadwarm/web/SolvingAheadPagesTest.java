package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.net.URI;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Role;

/** Pages whose floors must be solved first: how far that is, cancelling it, and that nothing typed is lost. Without script. */
class SolvingAheadPagesTest {
    private static final String HEATER = "/rooms/0/heatedFloor/heater";

    /** Floors are remembered by the program, so each test needs one that nobody has met. */
    private static final AtomicInteger NEW_FLOORS = new AtomicInteger(141_300);

    private static RunningServer server;
    private static Visitor visitor;

    private Job job;
    private Runnable free;

    /** A server of its own for each test, as what one leaves waiting would keep the next one out. */
    @BeforeEach
    void busy() {
        server = RunningServer.start();
        visitor = new Visitor(server, server.session(server.owner()));
        ObjectNode survey = RunningServer.studio();
        ((ObjectNode) survey.at(HEATER)).put("spacing", newSpacing() + " mm");
        job = server.job("new floor", survey);
        free = server.busy();
    }

    @AfterEach
    void stop() {
        free.run();
        server.close();
    }

    private static String newSpacing() {
        return Double.toString(NEW_FLOORS.incrementAndGet() / 1000.0);
    }

    private String room() {
        return "/jobs/" + job.id() + "/rooms/"
                + job.document().at("/rooms/0/id").textValue();
    }

    private static Page progress(Page first) {
        assertThat(first.status()).isEqualTo(303);
        assertThat(first.leadsTo()).startsWith("/computations/");
        Page page = visitor.ask(first.leadsTo());
        assertThat(page.status()).isEqualTo(200);
        assertThat(page.text()).contains("Solving a floor between its heaters", "% is done");
        assertThat(page.response().headers().firstValue("Refresh")).contains("1");
        return page;
    }

    private static Page cancelled(Page progress) {
        return visitor.submit(progress.form("csrf").to(progress.address()));
    }

    private static String back(Page cancelled) {
        return cancelled
                .all("a")
                .filter(link -> link.getTextContent().equals("Go back"))
                .findFirst()
                .orElseThrow()
                .getAttribute("href");
    }

    @Test
    void aRoomTellsHowFarItIsAndGoesOnByItself() {
        Page waiting = progress(visitor.ask(room()));

        free.run();

        Page room = visitor.open(waiting.address());
        assertThat(room.status()).isEqualTo(200);
        assertThat(room.address()).isEqualTo(room());
        assertThat(room.id("answer").orElseThrow().getTextContent()).contains("The numbers");
    }

    @Test
    void theSamePageDoesNotBeginTwice() {
        assertThat(visitor.ask(room()).leadsTo()).isEqualTo(visitor.ask(room()).leadsTo());
    }

    @Test
    void whatNeedsNoFloorWaitsForNone() {
        String at = "/jobs/" + job.id();

        Page space = visitor.ask(at + "/spaces/loft");
        Page preview = visitor.send(space.form("revision").to(at + "/spaces/loft/preview"));

        assertThat(space.id("answer").orElseThrow().getTextContent()).contains("Settles at", "Every path of heat");
        assertThat(preview.id("answer").orElseThrow().getTextContent())
                .isEqualTo(space.id("answer").orElseThrow().getTextContent());
        assertThat(visitor.ask(at + "/assemblies/shed%20wall").text()).contains("U-value");
        for (String address : List.of("/files/survey.json", "/files/rooms.csv", "/files", "/history")) {
            assertThat(visitor.ask(at + address).status()).as(address).isEqualTo(200);
        }
        progress(visitor.ask(at + "/files/results.csv"));
        progress(visitor.ask(at + "/history/1"));
    }

    @Test
    void aCancelledRoomCanBeLookedAtAsTyped() {
        Page cancelled = cancelled(progress(visitor.ask(room())));

        assertThat(cancelled.text()).contains("Cancelled; nothing was changed.");
        Page typed = visitor.open(back(cancelled));
        assertThat(typed.status()).isEqualTo(200);
        assertThat(typed.text()).contains("not sized", "Save it to size it");
        assertThat(typed.value(HEATER + "/spacing")).isNotEmpty();
    }

    @Test
    void aSaveIsKeptBeforeItsFloorIsSolved() {
        Page cancelled = cancelled(progress(visitor.ask(room())));
        String spacing = newSpacing();

        Page saved = visitor.send(visitor.open(back(cancelled))
                .form("revision")
                .type(HEATER + "/spacing", spacing)
                .press("save"));

        assertThat(saved.status()).isEqualTo(303);
        assertThat(server.now(job).revision()).isEqualTo(2);
        assertThat(server.now(job).document().at(HEATER + "/spacing").textValue())
                .startsWith(spacing);
        progress(visitor.ask(saved.leadsTo()));
    }

    @Test
    void aSavedDraftWaitsForItsFinishedRoomsToo() {
        ObjectNode survey = job.document().deepCopy();
        survey.withArray("/rooms").addObject().put("name", "annex");
        job = server.job("half a draft", survey);

        progress(visitor.ask("/jobs/" + job.id()));
    }

    @Test
    void aDraftThatHadToWaitStillSaysThatItWasKept() {
        ObjectNode survey = job.document().deepCopy();
        survey.withArray("/rooms").addObject().put("name", "annex");
        job = server.job("half a draft", survey);
        String annex = "/jobs/" + job.id() + "/rooms/"
                + job.document().at("/rooms/2/id").textValue();
        Page typed = visitor.open(back(cancelled(progress(visitor.ask(annex)))));

        Page waiting = progress(visitor.send(
                typed.form("revision").type("/rooms/2/height", "2.4 m").press("save")));
        free.run();

        Page draft = visitor.open(waiting.address());
        assertThat(draft.address()).startsWith(annex);
        assertThat(draft.text()).contains("Kept as a draft.");
        assertThat(draft.value("/rooms/2/height")).isEqualTo("2.4 m");
        assertThat(visitor.open(annex).text()).doesNotContain("Kept as a draft.");
    }

    @Test
    void oneRoomKeepsWhatWasTypedThroughTheWait() {
        free.run();
        Page start = visitor.open("/one-room");
        free = server.busy();
        String spacing = newSpacing();
        Page waiting = progress(visitor.send(start.form("document")
                .type(HEATER + "/spacing", spacing)
                .type("/rooms/0/name", "a den of its own")
                .press("save")));

        Page cancelled = cancelled(waiting);
        String address = URI.create(back(cancelled)).getRawPath();
        Page typed = visitor.open(back(cancelled));

        assertThat(typed.value(HEATER + "/spacing")).startsWith(spacing);
        assertThat(typed.value("/rooms/0/name")).isEqualTo("a den of its own");
        free.run();
        Page sized = visitor.open(address);
        assertThat(sized.value("/rooms/0/name")).isEqualTo("a den of its own");
        assertThat(sized.id("answer").orElseThrow().getTextContent()).contains("The numbers");
        Visitor other = new Visitor(server, server.session(server.member("Silvie " + spacing, Role.SURVEYOR)));
        assertThat(other.ask(address).leadsTo()).isEqualTo("/one-room");
    }

    @Test
    void whatFollowsTheTypingSaysThatItIsStillSolved() {
        Page cancelled = cancelled(progress(visitor.ask(room())));
        Page typed = visitor.open(back(cancelled));

        Page preview = visitor.send(
                typed.form("revision").type(HEATER + "/spacing", newSpacing()).to(room() + "/preview"));

        assertThat(preview.status()).isEqualTo(200);
        assertThat(preview.text()).contains("being solved between its heaters");
        assertThat(preview.response().headers().firstValue("Refresh")).contains("1");
    }

    @Test
    void tooManyAreRefusedInWords() {
        for (int i = 0; i < Computations.MOST_WAITING; i++) {
            ((ObjectNode) job.document().at(HEATER)).put("spacing", newSpacing() + " mm");
            visitor.ask("/jobs/" + server.job("waits", job.document()).id());
        }

        Page refused = visitor.ask(room());

        assertThat(refused.status()).isEqualTo(503);
        assertThat(refused.text()).contains("Too much is being computed just now");
    }

    @Test
    void theMethodCanBeCancelledAndBegunAnew() {
        RunningServer fresh = RunningServer.start();
        Runnable ended = fresh.busy();
        try {
            Visitor owner = new Visitor(fresh, fresh.session(fresh.owner()));
            Page running = owner.open("/method");
            assertThat(running.text()).contains("Computing them: 0 % is done");
            assertThat(running.response().headers().firstValue("Refresh")).contains("1");

            Page cancelled = owner.submit(running.form("csrf").to("/method").press("cancel"));

            assertThat(cancelled.text()).contains("Cancelled; they were not computed.");
            assertThat(cancelled.offers("compute")).isTrue();
            assertThat(owner.submit(cancelled.form("csrf").to("/method").press("compute"))
                            .offers("cancel"))
                    .isTrue();
        } finally {
            ended.run();
            fresh.close();
        }
    }
}
