package org.treadwarm.sizing;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.treadwarm.properties.Surveys;

/** Surveys whose floors are laid in parts: with water, with a cable, at limits that are reached late, at once and never. */
final class PartedJob {
    private PartedJob() {}

    /** The hall with a strip of closer pipes, the bath with a strip of closer runs. */
    static ObjectNode survey() {
        ObjectNode survey = Surveys.solved();
        ArrayNode hall = parts(survey, 0);
        hall.addObject()
                .put("name", "strip")
                .put("area", 4)
                .put("zone", "peripheral")
                .put("spacing", 0.1);
        hall.addObject().put("area", 14).put("zone", "occupied");
        ArrayNode bath = parts(survey, 1);
        bath.addObject()
                .put("name", "by the tub")
                .put("area", 1.5)
                .put("zone", "bathroom")
                .put("spacing", 0.08);
        bath.addObject().put("area", 2.5).put("zone", "occupied").put("spacing", 0.12);
        ((ObjectNode) survey.at("/rooms/1/heatedFloor/heater")).remove("spacing");
        return survey;
    }

    static List<ObjectNode> all() {
        ObjectNode hot = survey();
        room(hot, 0).put("indoorTemperature", 30);
        room(hot, 1).put("indoorTemperature", 31);
        ObjectNode unneeded = survey();
        unneeded.withObject("/site").put("outdoorTemperature", 25);
        ObjectNode cold = survey();
        cold.withObject("/site").put("outdoorTemperature", -50);
        room(cold, 1).withObject("/heatedFloor/heater").put("linearPower", 3);
        return List.of(survey(), hot, unneeded, cold, twoManifolds(), statedDrops(false), statedDrops(true));
    }

    /** One hall more, on a manifold of its own with glycol in it. */
    static ObjectNode twoManifolds() {
        ObjectNode survey = survey();
        ObjectNode other = room(survey, 0).deepCopy();
        other.put("name", "other hall");
        other.withObject("/heatedFloor/heater")
                .put("manifold", "annex")
                .put("glycol", 0.3)
                .put("feederLength", 20);
        survey.withArray("rooms").add(other);
        return survey;
    }

    /** The two manifolds with the drop of one stated, and perhaps that of the heat source. */
    static ObjectNode statedDrops(boolean source) {
        ObjectNode survey = twoManifolds();
        int last = survey.withArray("rooms").size() - 1;
        room(survey, last).withObject("/heatedFloor/heater").put("manifoldDrop", "0.5 mH2O");
        if (source) {
            survey.withObject("/site").put("heatSourceDrop", "12 kPa");
        }
        return survey;
    }

    static ArrayNode parts(ObjectNode survey, int room) {
        return room(survey, room).withObject("/heatedFloor").withArray("parts");
    }

    private static ObjectNode room(ObjectNode survey, int number) {
        return survey.withObject("/rooms/" + number);
    }
}
