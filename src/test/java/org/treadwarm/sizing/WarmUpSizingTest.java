package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.treadwarm.intake.Intake;
import org.treadwarm.properties.Surveys;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.Warning;
import org.treadwarm.survey.Problem;

/** A reheat that is computed from a setback. */
class WarmUpSizingTest {
    private static ObjectNode bath(ObjectNode survey) {
        return survey.withObject("/rooms/1");
    }

    private static RoomSizing sized(ObjectNode survey) {
        return Surveys.sized(survey).rooms().get(1);
    }

    @Test
    void raisesTheHeatLossByWhatWarmsTheRoomInTime() {
        RoomSizing with = sized(Surveys.solved());
        ObjectNode steady = Surveys.solved();
        bath(steady).remove("reheat");
        RoomSizing without = sized(steady);
        var found = with.floor().warmup().orElseThrow();

        assertThat(with.heatLoss().reheat()).isPositive().isCloseTo(found.reheatFlux() * 4, within(1e-9));
        assertThat(with.heatLoss().total())
                .isCloseTo(without.heatLoss().total() + with.heatLoss().reheat(), within(1e-9));
        assertThat(found.lossCoefficient()).isCloseTo(without.heatLoss().total() / (24 + 9) / 4, within(1e-9));
        assertThat(found.densityNeeded()).isGreaterThan(found.steadyDensity());
    }

    /** The density that it asks for warms the room in just that time. */
    @Test
    void itsDensityIsWarmInTime() {
        ObjectNode survey = Surveys.solved();
        double needed = sized(survey).floor().warmup().orElseThrow().densityNeeded();
        bath(survey).withObject("/heatedFloor/heater").put("linearPower", needed * 0.1);
        var found = sized(survey).floor().warmup().orElseThrow();

        assertThat(found.density()).isCloseTo(needed, within(1e-6));
        assertThat(found.hours().orElseThrow()).isCloseTo(2, within(0.02));
    }

    @Test
    void aLongerTimeAsksForLess() {
        ObjectNode slow = Surveys.solved();
        bath(slow).withObject("/reheat").put("within", 6);
        assertThat(sized(slow).heatLoss().reheat())
                .isLessThan(sized(Surveys.solved()).heatLoss().reheat());
    }

    @Test
    void mayStandUnderItsOwnKey() {
        ObjectNode named = Surveys.solved();
        Intake.tidy(named);
        assertThat(bath(named).has("reheat")).isFalse();
        assertThat(bath(named).at("/warmUp/within").intValue()).isEqualTo(2);
        assertThat(Surveys.answer(named)).isEqualTo(Surveys.answer(Surveys.solved()));
    }

    @Test
    void findsFaultsWhereTheyWereWritten() {
        ObjectNode survey = Surveys.solved();
        bath(survey).withObject("/reheat").put("within", 0).put("from", "twenty");
        assertThat(Surveys.problems(survey))
                .extracting(Problem::pointer)
                .containsExactlyInAnyOrder("/rooms/1/reheat/within", "/rooms/1/reheat/from");

        ObjectNode twice = Surveys.solved();
        bath(twice).putObject("warmUp").put("from", 20).put("within", 2);
        assertThat(Surveys.problems(twice)).extracting(Problem::pointer).contains("/rooms/1/warmUp");

        ObjectNode both = Surveys.solved();
        Intake.tidy(both);
        bath(both).put("reheat", 9);
        assertThat(Surveys.problems(both)).extracting(Problem::pointer).containsExactly("/rooms/1/reheat");

        ObjectNode warm = Surveys.solved();
        Intake.tidy(warm);
        bath(warm).withObject("/warmUp").put("from", 25);
        assertThat(Surveys.problems(warm)).extracting(Problem::pointer).containsExactly("/rooms/1/warmUp/from");

        ObjectNode unheated = Surveys.solved();
        Intake.tidy(unheated);
        bath(unheated).remove("heatedFloor");
        assertThat(Surveys.problems(unheated)).extracting(Problem::pointer).containsExactly("/rooms/1/warmUp");
    }

    @Test
    void saysWhyNothingIsFollowed() {
        ObjectNode survey = Surveys.solved();
        bath(survey).withObject("/heatedFloor/above/0").remove("density");
        List<Warning> warnings = Surveys.sized(survey).warnings();
        assertThat(sized(survey).floor().warmup()).isEmpty();
        assertThat(sized(survey).heatLoss().reheat()).isZero();
        assertThat(warnings).extracting(Warning::code).contains("warm-up-not-followed");
    }

    @Test
    void warnsOfAHeaterThatIsTooSlow() {
        assertThat(Surveys.sized(Surveys.solved()).warnings())
                .filteredOn(warning -> warning.code().equals("warm-up-too-slow"))
                .extracting(Warning::pointer)
                .containsExactly("/rooms/1/warmUp");
    }
}
