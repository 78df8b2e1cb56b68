package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Change;

/** Tables into a job and out of it: nothing is kept before it was seen. */
class TransferPagesTest {
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

    private Page look(String table) {
        Form form = visitor.open("/jobs/" + job.id() + "/files").form("table");
        return visitor.send(form.type("table", table).press("look").to("/jobs/" + job.id() + "/files/rooms.csv"));
    }

    @Test
    void showsWhatATableWouldChangeAndKeepsItWhenToldTo() {
        Page seen = look("room,height [m]\nstudio,3.3\nattic,2.1\n");

        assertThat(seen.status()).isEqualTo(200);
        assertThat(seen.text())
                .contains("What the table would change", "rooms › studio › room height", "3.3", "rooms › attic");
        assertThat(server.now(job).revision()).isEqualTo(1);

        assertThat(visitor.send(seen.form("table").press("keep")).status()).isEqualTo(303);
        assertThat(server.now(job).document().at("/rooms/0/height").textValue()).isEqualTo("3.3\u00a0m");
        assertThat(server.now(job).document().at("/rooms/2/name").textValue()).isEqualTo("attic");
        assertThat(server.now(job).note()).isEqualTo("rooms from a table");
    }

    @Test
    void tellsWhichCellsAreWrongAndGivesTheTextBack() {
        Page seen = look("room,height [m]\nstudio,so high\n");

        assertThat(seen.status()).isEqualTo(422);
        assertThat(seen.text()).contains("One cell cannot be read in", "so high", "room height");
        assertThat(seen.form("table").value("table")).contains("studio,so high");
        assertThat(visitor.send(seen.form("table").press("keep")).status()).isEqualTo(422);
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void keepsNothingOverASaveThatWasNotSeen() {
        Form keep = look("room,height [m]\nstudio,3.3\n").form("table").press("keep");
        server.desk().save(job.id(), 1, "yard two", job.document(), Change.by("Ben"));

        Page again = visitor.send(keep);

        assertThat(again.status()).isEqualTo(409);
        assertThat(server.now(job).revision()).isEqualTo(2);
        assertThat(visitor.send(again.form("table").press("keep")).status()).isEqualTo(303);
        assertThat(server.now(job).document().at("/rooms/0/height").textValue()).isEqualTo("3.3\u00a0m");
    }

    @Test
    void givesTheJobAsFiles() {
        for (String file : new String[] {"rooms.csv", "openings.csv", "results.csv", "survey.json"}) {
            assertThat(visitor.open("/jobs/" + job.id() + "/files/" + file).status())
                    .as(file)
                    .isEqualTo(200);
        }
        assertThat(visitor.open("/jobs/" + job.id() + "/files/other.csv").status())
                .isEqualTo(404);
        assertThat(visitor.open("/jobs/nosuchjob123/files/rooms.csv").status()).isEqualTo(404);
        assertThat(visitor.open("/jobs/nosuchjob123/files").status()).isEqualTo(404);
    }
}
