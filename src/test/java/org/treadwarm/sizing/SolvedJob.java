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
        return List.of(survey(), hotRooms(), coldBelow(), warmBelow());
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

    private static ObjectNode room(ObjectNode survey, int number) {
        return survey.withObject("/rooms/" + number);
    }
}
