package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Job;

/** Two people in one job: in two rooms they do not notice each other, in one room nothing is lost. */
class SavingTogetherPagesTest {
    private static RunningServer server;
    private static Visitor first;
    private static Visitor second;

    private Job job;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        var owner = server.owner();
        first = new Visitor(server, server.session(owner));
        second = new Visitor(server, server.session(owner));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    @BeforeEach
    void fresh() {
        ObjectNode survey = RunningServer.studio();
        ((ObjectNode) survey.get("rooms").get(1)).put("id", "shower-1");
        job = server.job("yard", survey);
    }

    private Form form(Visitor visitor, String part) {
        return visitor.open("/jobs/" + job.id() + "/" + part).form("revision");
    }

    private JsonNode kept(String pointer) {
        return server.now(job).document().at(pointer);
    }

    @Test
    void formsOfTwoRoomsAreBothKept() {
        Form one = form(first, "rooms/studio-1");
        Form other = form(second, "rooms/shower-1");

        assertThat(first.send(one.type("/rooms/0/height", "3.3 m").press("save"))
                        .status())
                .isEqualTo(303);
        assertThat(second.send(other.type("/rooms/1/height", "2.2 m").press("save"))
                        .status())
                .isEqualTo(303);

        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("3.3 m");
        assertThat(kept("/rooms/1/height").textValue()).isEqualTo("2.2 m");
    }

    @Test
    void theSecondFormOfOneRoomIsHeldBackWithWhatWasTyped() {
        Form one = form(first, "rooms/studio-1");
        Form other = form(second, "rooms/studio-1");
        first.send(one.type("/rooms/0/height", "3.3 m").press("save"));

        Page answer = second.send(other.type("/rooms/0/height", "2.2 m").press("save"));

        assertThat(answer.status()).isEqualTo(409);
        assertThat(answer.value("/rooms/0/height")).isEqualTo("2.2 m");
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("3.3 m");
        assertThat(server.now(job).revision()).isEqualTo(2);
    }

    @Test
    void theSecondFormStandsWhenItIsSavedAgainAndTheFirstStaysInTheHistory() {
        Form one = form(first, "rooms/studio-1");
        Form other = form(second, "rooms/studio-1");
        first.send(one.type("/rooms/0/height", "3.3 m").press("save"));
        Page held = second.send(other.type("/rooms/0/height", "2.2 m").press("save"));

        assertThat(second.send(held.form("revision").press("save")).status()).isEqualTo(303);

        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("2.2 m");
        assertThat(server.desk()
                        .revision(job.id(), 2)
                        .orElseThrow()
                        .document()
                        .at("/rooms/0/height")
                        .textValue())
                .isEqualTo("3.3 m");
    }

    @Test
    void theFormOfAJobKeepsWhatOthersHaveSavedInFieldsNobodyTouched() {
        Form one = visitorsJob(first);
        Form other = visitorsJob(second);
        first.send(one.type("/site/outdoorTemperature", "-12")
                .type("job-name", "Mill Lane")
                .press("save"));

        assertThat(second.send(other.type("new-name", "attic").press("add-room"))
                        .status())
                .isEqualTo(303);

        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-12");
        assertThat(server.now(job).name()).isEqualTo("Mill Lane");
        assertThat(kept("/rooms/2/name").textValue()).isEqualTo("attic");
    }

    @Test
    void aFieldOfTheSiteThatBothChangedIsHeldBackWithWhatWasTyped() {
        Form one = visitorsJob(first);
        Form other = visitorsJob(second);
        first.send(one.type("/site/outdoorTemperature", "-12").press("save"));

        Page held = second.send(other.type("/site/outdoorTemperature", "-14").press("save"));

        assertThat(held.status()).isEqualTo(409);
        assertThat(held.value("/site/outdoorTemperature")).isEqualTo("-14");
        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-12");
        assertThat(second.send(held.form("new-name").press("save")).status()).isEqualTo(303);
        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-14");
    }

    private Form visitorsJob(Visitor visitor) {
        return visitor.open("/jobs/" + job.id()).form("new-name");
    }

    @Test
    void aRoomThatMovedInTheListIsStillWrittenTo() {
        Form other = form(second, "rooms/shower-1");
        first.send(form(first, "rooms/studio-1").press("remove-part"));

        second.send(other.type("/rooms/1/height", "2.2 m").press("save"));

        assertThat(kept("/rooms").size()).isEqualTo(1);
        assertThat(kept("/rooms/0/id").textValue()).isEqualTo("shower-1");
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("2.2 m");
    }

    @Test
    void aFormOfARoomThatIsGoneSaysSo() {
        Form other = form(second, "rooms/studio-1");
        first.send(form(first, "rooms/studio-1").press("remove-part"));

        assertThat(second.send(other.press("save")).status()).isEqualTo(404);
    }

    @Test
    void formsOfTwoAssembliesAreBothKept() {
        Form one = form(first, "assemblies/new%20sash");
        Form other = form(second, "assemblies/door");

        first.send(one.type("/assemblies/new sash/uValue", "1.1").press("save"));
        assertThat(second.send(other.type("/assemblies/door/uValue", "1.9").press("save"))
                        .status())
                .isEqualTo(303);

        assertThat(kept("/assemblies/new sash/uValue").textValue()).startsWith("1.1");
        assertThat(kept("/assemblies/door/uValue").textValue()).startsWith("1.9");
    }
}
