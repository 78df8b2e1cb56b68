package org.treadwarm.checks;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.sizing.NoBalanceException;
import org.treadwarm.sizing.Sizer;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Sizing.HeatLoss;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.SideSizing;
import org.treadwarm.survey.Survey;

/**
 * A survey of one room that puts a published case to the whole program: reading, rules and sizing. Its floor area and height
 * are invented and decide nothing.
 */
final class OneRoom {
    private final ObjectNode survey = JsonNodeFactory.instance.objectNode();
    private final ObjectNode room;

    /** A room between two temperatures, written with their units. */
    OneRoom(String indoor, String outdoor) {
        survey.putObject("site").put("outdoorTemperature", outdoor);
        survey.putObject("assemblies");
        survey.putObject("spaces");
        room = survey.putArray("rooms").addObject();
        room.put("name", "room").put("indoorTemperature", indoor).put("floorArea", 20);
        room.put("height", 2.5);
    }

    /** A number with its unit, as somebody writes it into a survey. */
    static String reading(double number, String unit) {
        return (BigDecimal.valueOf(number).toPlainString() + " " + unit).trim();
    }

    /** Adds a surface of an assembly of its own, which the caller fills. */
    ObjectNode surface(double area, String to) {
        String name = "assembly " + survey.get("assemblies").size();
        ObjectNode surface = room.withArray("surfaces").addObject();
        surface.put("assembly", name).put("area", area).put("to", to);
        return ((ObjectNode) survey.get("assemblies")).putObject(name);
    }

    /** Adds an unheated space that is known by its temperature factor. */
    void space(String name, double temperatureFactor) {
        ObjectNode spaces = (ObjectNode) survey.get("spaces");
        spaces.putObject(name).put("kind", "unheated").put("temperatureFactor", temperatureFactor);
    }

    /** Adds a junction to outdoors. */
    void junction(String psi, String length) {
        room.withArray("junctions").addObject().put("psi", psi).put("length", length);
    }

    /** Adds a heated floor over outdoors, 0.1 m²·K/W above the heater and 1 below. */
    void heatedFloor(String zone) {
        ObjectNode floor = room.putObject("heatedFloor");
        floor.put("area", 10).put("zone", zone).put("to", Survey.OUTDOORS);
        layer(floor.putArray("above"), 0.1, "m2.K/W");
        layer(floor.putArray("below"), 1, "m2.K/W");
    }

    /** Adds a layer of known resistance. */
    static ObjectNode layer(ArrayNode layers, double resistance, String unit) {
        return layers.addObject().put("resistance", reading(resistance, unit));
    }

    /** The sizing of the survey's only room. */
    RoomSizing sized() {
        return sizing().rooms().get(0);
    }

    /** The heat the room loses. */
    HeatLoss heatLoss() {
        return sized().heatLoss();
    }

    /** Resistances and U-value of the first assembly. */
    SideSizing firstAssembly() {
        return sizing().assemblies().get(0).sides().get(0);
    }

    private Sizing sizing() {
        if (!(Intake.survey(survey) instanceof Outcome.Accepted<Survey> accepted)) {
            throw new IllegalStateException("the program refuses the survey of a published case: " + survey);
        }
        try {
            return Sizer.size(accepted.value());
        } catch (NoBalanceException e) {
            throw new IllegalStateException("the survey of a published case has no balance", e);
        }
    }
}
