package org.treadwarm.bench;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.survey.Survey;

/** Invented surveys to time. */
public final class BenchSurveys {
    private BenchSurveys() {}

    /** One room of 12 surfaces, all kinds of them, with a heated slab. */
    public static JsonNode twelveSurfaces() {
        return job(1);
    }

    /** A job of so many such rooms; each looks at the next one and at a loft of its own. */
    public static JsonNode job(int rooms) {
        ObjectNode survey = Document.mapper().createObjectNode();
        survey.putObject("site")
                .put("outdoorTemperature", "-9 °C")
                .put("annualMeanTemperature", "8.5 °C")
                .put("altitude", "120 m");
        assemblies(survey.putObject("assemblies"));
        ObjectNode spaces = survey.putObject("spaces");
        spaces.putObject("neighbour").put("kind", "held").put("temperature", "15 °C");
        ArrayNode list = survey.putArray("rooms");
        for (int i = 0; i < rooms; i++) {
            loft(spaces.putObject("loft " + i));
            room(list.addObject(), i, rooms);
        }
        return survey;
    }

    /** The survey of a tree. */
    public static Survey survey(JsonNode tree) {
        Outcome<Survey> outcome = Intake.survey(tree);
        if (outcome instanceof Outcome.Accepted<Survey> accepted) {
            return accepted.value();
        }
        throw new IllegalStateException("refused: " + outcome);
    }

    private static void assemblies(ObjectNode assemblies) {
        ArrayNode wall = assemblies.putObject("wall").putArray("layers");
        wall.addObject().put("material", "gypsum plasterboard").put("thickness", "12.5 mm");
        wall.addObject()
                .put("thickness", "140 mm")
                .put("conductivity", "0.037 W/(m.K)")
                .putObject("bridging")
                .put("share", "15 %")
                .put("conductivity", "0.13 W/(m.K)");
        wall.addObject().put("material", "OSB").put("thickness", "12 mm");
        wall.addObject().put("resistance", "0.18 m2.K/W");
        assemblies.putObject("window").put("uValue", "1.4 W/(m2.K)");
        ArrayNode ceiling =
                assemblies.putObject("ceiling").put("heatFlow", "up").putArray("layers");
        ceiling.addObject().put("material", "plasterboard").put("thickness", "12.5 mm");
        ceiling.addObject().put("thickness", "250 mm").put("conductivity", "0.04 W/(m.K)");
        ArrayNode slab = assemblies.putObject("slab").put("heatFlow", "down").putArray("layers");
        slab.addObject().put("thickness", "100 mm").put("conductivity", "0.036 W/(m.K)");
    }

    private static void loft(ObjectNode loft) {
        loft.put("kind", "unheated");
        loft.putArray("surfaces")
                .addObject()
                .put("assembly", "window")
                .put("area", "30 m2")
                .put("to", "outdoors");
        loft.putObject("air").put("changeRate", "2 1/h").put("volume", "30 m3");
    }

    private static void room(ObjectNode room, int i, int rooms) {
        room.put("name", "room " + i)
                .put("indoorTemperature", "20 °C")
                .put("floorArea", "24 m2")
                .put("height", "2.5 m");
        ArrayNode surfaces = room.putArray("surfaces");
        for (int k = 0; k < 4; k++) {
            ObjectNode wall = surface(surfaces, "outer wall " + k, "wall", "10 m2", "outdoors");
            wall.putArray("openings").addObject().put("assembly", "window").put("area", "1.4 x 1.2 m2");
        }
        surface(surfaces, "party wall", "wall", "10 m2", "neighbour");
        surface(surfaces, "ceiling", "ceiling", "20 m2", "loft " + i);
        surface(surfaces, "hatch", "ceiling", "1 m2", "loft " + i);
        surface(surfaces, "partition", "wall", "8 m2", i + 1 < rooms ? "room " + (i + 1) : "neighbour");
        surface(surfaces, "niche", "wall", "2 m2", "outdoors");
        surface(surfaces, "bay", "wall", "3 m2", "outdoors");
        surface(surfaces, "dormer", "ceiling", "2 m2", "outdoors");
        ground(surface(surfaces, "floor under shelves", "slab", "4 m2", "ground")
                .putObject("ground"));
        room.putArray("junctions")
                .addObject()
                .put("psi", "0.16 W/(m.K)")
                .put("length", "10 m")
                .put("at", "heated floor");
        room.putObject("air").put("changeRate", "0.6 1/h");
        ObjectNode floor = room.putObject("heatedFloor").put("area", "20 m2").put("zone", "occupied");
        ArrayNode above = floor.putArray("above");
        above.addObject().put("material", "ceramic tile").put("thickness", "10 mm");
        above.addObject().put("material", "cement screed").put("thickness", "50 mm");
        floor.putArray("below").addObject().put("thickness", "100 mm").put("conductivity", "0.036 W/(m.K)");
        ground(floor.putObject("ground"));
        floor.putObject("heater").put("kind", "electric").put("density", "120 W/m2");
    }

    private static ObjectNode surface(ArrayNode surfaces, String name, String assembly, String area, String to) {
        return surfaces.addObject()
                .put("name", name)
                .put("assembly", assembly)
                .put("area", area)
                .put("to", to);
    }

    private static void ground(ObjectNode ground) {
        ground.put("kind", "slab")
                .put("exposedPerimeter", "10 m")
                .put("wallThickness", "0.3 m")
                .put("soilConductivity", "2.0 W/(m.K)");
    }
}
