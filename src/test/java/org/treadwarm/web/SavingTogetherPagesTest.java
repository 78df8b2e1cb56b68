package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
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

    /** Both began from one form of a room; the first has saved. */
    private Page held(UnaryOperator<Form> first, UnaryOperator<Form> second) {
        Form one = form(SavingTogetherPagesTest.first, "rooms/studio-1");
        Form other = form(SavingTogetherPagesTest.second, "rooms/studio-1");
        assertThat(SavingTogetherPagesTest.first.send(first.apply(one)).status())
                .isEqualTo(303);
        return SavingTogetherPagesTest.second.send(second.apply(other));
    }

    private static UnaryOperator<Form> height(String height) {
        return form -> form.type("/rooms/0/height", height).press("save");
    }

    @Test
    void theSecondFormOfOneRoomComesBackWithBothVersionsAndNothingIsLost() {
        Page held = held(height("3.3 m"), height("2.2 m"));

        assertThat(held.status()).isEqualTo(409);
        assertThat(held.text()).contains("3.3 m", "2.2 m", "both changed this", "Room height");
        assertThat(held.form("mine").value("choice/height")).isNull();
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("3.3 m");
        assertThat(server.now(job).revision()).isEqualTo(2);
    }

    @Test
    void whatBothChangedMustBeChosenAndTheFirstStaysInTheHistory() {
        Page held = held(height("3.3 m"), height("2.2 m"));

        Page again = second.send(held.form("mine").press("settle"));
        assertThat(again.status()).isEqualTo(422);
        assertThat(again.text()).contains("One choice is missing", "3.3 m", "2.2 m");
        Form chosen = again.form("mine").forge("choice/height", "mine").press("settle");
        assertThat(second.send(chosen).status()).isEqualTo(303);

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
    void whatOnlyOneChangedIsMarkedAndBothComeTogether() {
        Page held = held(
                height("3.3 m"),
                form -> form.type("/rooms/0/name", "yard studio").press("save"));
        Form form = held.form("mine");

        assertThat(form.value("choice/height")).isEqualTo("theirs");
        assertThat(form.value("choice/name")).isEqualTo("mine");
        assertThat(second.send(form.press("settle")).status()).isEqualTo(303);
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("3.3 m");
        assertThat(kept("/rooms/0/name").textValue()).isEqualTo("yard studio");
    }

    @ParameterizedTest
    @CsvSource({"all-mine,2.2 m", "all-theirs,3.3 m"})
    void allOfOneSideCanBeTakenAtOnce(String button, String height) {
        Page held = held(height("3.3 m"), height("2.2 m"));

        assertThat(second.send(held.form("mine").press(button)).status()).isEqualTo(303);
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo(height);
        assertThat(server.now(job).revision()).isEqualTo(button.equals("all-mine") ? 3 : 2);
    }

    @Test
    void whoSavesAgainMeanwhileIsNotOverwrittenUnseen() {
        Page held = held(height("3.3 m"), height("2.2 m"));
        Form chosen = held.form("mine").forge("choice/height", "mine").press("settle");
        first.send(height("3.4 m").apply(form(first, "rooms/studio-1")));

        Page again = second.send(chosen);
        assertThat(again.status()).isEqualTo(409);
        assertThat(again.text()).contains("3.4 m", "2.2 m", "saved once more");
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("3.4 m");
        assertThat(second.send(again.form("mine").press("all-mine")).status()).isEqualTo(303);
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("2.2 m");
    }

    @Test
    void aSaveOfTheOtherRoomMeanwhileDoesNotMatterToAChoice() {
        Page held = held(height("3.3 m"), height("2.2 m"));
        first.send(
                form(first, "rooms/shower-1").type("/rooms/1/height", "2.4 m").press("save"));

        second.send(held.form("mine").press("all-mine"));

        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("2.2 m");
        assertThat(kept("/rooms/1/height").textValue()).isEqualTo("2.4 m");
    }

    @Test
    void whatWasTypedInARoomThatIsGoneCanStillBeKept() {
        Page held = held(form -> form.press("remove-part"), height("2.2 m"));

        assertThat(held.status()).isEqualTo(409);
        assertThat(second.send(held.form("mine").forge("choice", "mine").press("settle"))
                        .status())
                .isEqualTo(303);
        assertThat(kept("/rooms/1/height").textValue()).isEqualTo("2.2 m");
    }

    @Test
    void aRoomThatSomebodyChangedIsNotTakenOutUnseen() {
        Page held = held(height("3.3 m"), form -> form.press("remove-part"));

        assertThat(held.status()).isEqualTo(409);
        second.send(held.form("mine").forge("choice", "mine").press("settle"));
        assertThat(kept("/rooms").size()).isEqualTo(1);
    }

    @Test
    void whoTypedNothingSeesWhatTheOtherSaved() {
        Page answer = held(height("3.3 m"), form -> form.press("save"));

        assertThat(answer.status()).isEqualTo(303);
        assertThat(kept("/rooms/0/height").textValue()).isEqualTo("3.3 m");
    }

    @Test
    void aNewNameOfAnAssemblyComesThroughTheChoice() {
        Form one = form(first, "assemblies/door");
        Form other = form(second, "assemblies/door");
        first.send(one.type("/assemblies/door/uValue", "1.9").press("save"));

        Page held = second.send(other.type("/assemblies/door/uValue", "1.1")
                .type("part-name", "oak door")
                .press("save"));
        second.send(held.form("mine").press("all-mine"));

        assertThat(kept("/assemblies/oak door/uValue").textValue()).startsWith("1.1");
        assertThat(kept("/assemblies/door").isMissingNode()).isTrue();
    }

    @ParameterizedTest
    @CsvSource({"mine,nonsense", "mine,[1]", "mine,{}", "base,x", "seen,-1"})
    void aForgedFormChangesNothing(String field, String value) {
        Page held = held(height("3.3 m"), height("2.2 m"));

        Page answer = second.send(held.form("mine").forge(field, value).press("all-mine"));

        assertThat(answer.status()).isEqualTo(404);
        assertThat(server.now(job).revision()).isEqualTo(2);
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
    void aSiteThatBothChangedComesBackWithBothVersionsAndNothingIsLost() {
        Page held = heldSite(
                form -> form.type("/site/surveyedBy", "Ben of Quillfen Floors").press("save"));

        assertThat(held.status()).isEqualTo(409);
        assertThat(held.text()).contains("Two versions of the site", "-12", "-14", "both changed this");
        Form form = held.form("mine");
        assertThat(form.value("choice/outdoorTemperature")).isNull();
        assertThat(form.value("choice/surveyedBy")).isEqualTo("mine");
        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-12");
        assertThat(second.send(form.press("settle")).status()).isEqualTo(422);
        Page done = second.send(form.forge("choice/outdoorTemperature", "mine").press("settle"));
        assertThat(done.status()).isEqualTo(303);
        assertThat(done.location()).isEqualTo("/jobs/" + job.id());
        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-14");
        assertThat(kept("/site/surveyedBy").textValue()).isEqualTo("Ben of Quillfen Floors");
    }

    /** Both began from one form of the job and changed the outdoor temperature; the first has saved. */
    private Page heldSite(UnaryOperator<Form> more) {
        Form one = visitorsJob(first);
        Form other = visitorsJob(second);
        first.send(one.type("/site/outdoorTemperature", "-12").press("save"));
        return second.send(more.apply(other.type("/site/outdoorTemperature", "-14")));
    }

    @Test
    void whatElseWasDoneInTheFormOfAJobIsKeptWhileTheSiteIsChosen() {
        Page held = heldSite(form ->
                form.type("job-name", "Mill Lane").type("new-name", "attic").press("add-room"));

        assertThat(held.status()).isEqualTo(409);
        assertThat(server.now(job).name()).isEqualTo("Mill Lane");
        assertThat(kept("/rooms/2/name").textValue()).isEqualTo("attic");
        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-12");
        second.send(held.form("mine").press("all-theirs"));
        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-12");
    }

    @Test
    void aSiteBesideAWrongNameIsToldOfWithWhatWasTyped() {
        Page held = heldSite(form -> form.type("job-name", " ").press("save"));

        assertThat(held.status()).isEqualTo(409);
        assertThat(held.value("/site/outdoorTemperature")).isEqualTo("-14");
        assertThat(held.text()).contains("Somebody else has made this");
        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-12");
    }

    @ParameterizedTest
    @CsvSource({"mine,[1]", "mine,''", "base,x"})
    void aForgedFormOfASiteChangesNothing(String field, String value) {
        Page held = heldSite(form -> form.press("save"));

        assertThat(second.send(held.form("mine").forge(field, value).press("all-mine"))
                        .status())
                .isEqualTo(404);
        assertThat(kept("/site/outdoorTemperature").textValue()).startsWith("-12");
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
