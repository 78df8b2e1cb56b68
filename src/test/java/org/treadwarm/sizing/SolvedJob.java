package org.treadwarm.sizing;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.treadwarm.properties.Surveys;

/** Surveys whose floors are solved between their cables or pipes, with limits that are reached late, at once and never. */
final class SolvedJob {
    private SolvedJob() {}

    static ObjectNode survey() {
        return Surveys.solved();
    }

    static List<ObjectNode> all() {
        return List.of(survey(), hotRooms(), coldBelow(), warmBelow(), mats(60), mats(1500));
    }

    /** Rooms warmer than their floors may be. */
    private static ObjectNode hotRooms() {
        ObjectNode survey = survey();
        room(survey, 0).put("indoorTemperature", 30);
        room(survey, 0).withObject("/heatedFloor/above/0").put("maximumTemperature", 25);
        room(survey, 2).put("indoorTemperature", 29.5);
        return survey;
    }

    /** Hardly anything between the heater and the coldest outdoors. */
    private static ObjectNode coldBelow() {
        ObjectNode survey = survey();
        survey.withObject("/site").put("outdoorTemperature", -60);
        ObjectNode bath = room(survey, 1).withObject("/heatedFloor");
        bath.withArray("below").removeAll();
        bath.withObject("/heater").put("linearPower", 3);
        return survey;
    }

    /** A floor over something warmer than itself. */
    private static ObjectNode warmBelow() {
        ObjectNode survey = survey();
        survey.withObject("/spaces/kiln").put("kind", "held").put("temperature", 60);
        ObjectNode landing = room(survey, 2).withObject("/heatedFloor");
        landing.put("to", "kiln");
        landing.withArray("below").removeAll();
        landing.withObject("/heater").put("density", 5);
        return survey;
    }

    /** A solved floor with mats of a power to choose from, beside the spacing of their wires. */
    static ObjectNode mats(double power) {
        ObjectNode survey = survey();
        ObjectNode heater = room(survey, 1).withObject("/heatedFloor/heater");
        heater.remove("linearPower");
        heater.withArray("mats").addObject().put("area", 1).put("power", power);
        return survey;
    }

    private static ObjectNode room(ObjectNode survey, int number) {
        return survey.withObject("/rooms/" + number);
    }
}
