package org.treadwarm.checks;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.envelope.CombinedMethod;
import org.treadwarm.sizing.Sizing.SideSizing;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.QuantityKind;

/** Elements of homogeneous and bridged layers, most of them through a whole sizing. */
final class LayerChecks {
    private static final String SI = "m2.K/W";
    private static final String US = "h.ft2.°F/Btu";

    private LayerChecks() {}

    static Map<String, Computation> bindings() {
        return Map.ofEntries(
                Map.entry("6946-timber-frame-paths", LayerChecks::paths),
                Map.entry("6946-timber-frame-U", LayerChecks::timberFrame),
                Map.entry("6946-partition-to-unheated-es", LayerChecks::partition),
                Map.entry("6946-solid-brick-old-films", LayerChecks::solidBrick),
                Map.entry("6946-three-layer-quick", LayerChecks::threeLayers),
                Map.entry("us-isothermal-planes", LayerChecks::isothermalPlanes),
                Map.entry("us-wa-r21-wall", LayerChecks::framedWall));
    }

    private static Map<String, DoubleStream> paths(Inputs given) {
        return Map.of(
                "R_path_insulation", DoubleStream.of(path(given, 0)), "R_path_stud", DoubleStream.of(path(given, 1)));
    }

    private static double path(Inputs given, int section) {
        OneRoom room = room();
        ArrayNode layers = wall(room, given);
        for (Inputs layer : given.groups("layers_outside_to_inside")) {
            Inputs own = layer.has("sections") ? layer.groups("sections").get(section) : layer;
            OneRoom.layer(layers, own.number("R"), SI);
        }
        return room.firstAssembly().resistance().orElseThrow();
    }

    private static Map<String, DoubleStream> timberFrame(Inputs given) {
        OneRoom room = room();
        ArrayNode layers = wall(room, given);
        for (Inputs layer : given.groups("layers_outside_to_inside")) {
            if (layer.has("sections")) {
                Inputs between = layer.groups("sections").get(0);
                Inputs stud = layer.groups("sections").get(1);
                bridge(OneRoom.layer(layers, between.number("R"), SI), stud.number("fraction"), stud.number("R"), SI);
            } else {
                OneRoom.layer(layers, layer.number("R"), SI);
            }
        }
        SideSizing side = room.firstAssembly();
        return Map.of(
                "R_upper", DoubleStream.of(side.upperLimit().orElseThrow()),
                "R_lower", DoubleStream.of(side.lowerLimit().orElseThrow()),
                "R_total", DoubleStream.of(side.resistance().orElseThrow()),
                "U", DoubleStream.of(side.uValue().orElseThrow()));
    }

    private static Map<String, DoubleStream> partition(Inputs given) {
        OneRoom room = room();
        room.space("unheated room", given.number("b"));
        ObjectNode assembly = room.surface(1, "unheated room");
        assembly.put("insideCoefficient", 1 / given.number("R_surface_each_side"));
        thicknesses(assembly.putArray("layers"), given);
        SideSizing side = room.firstAssembly();
        return Map.of(
                "R_total", DoubleStream.of(side.resistance().orElseThrow()),
                "U", DoubleStream.of(side.uValue().orElseThrow()),
                "U_times_b", DoubleStream.of(room.heatLoss().total()));
    }

    private static Map<String, DoubleStream> solidBrick(Inputs given) {
        OneRoom room = room();
        thicknesses(wall(room, given), given);
        return Map.of("U", DoubleStream.of(room.firstAssembly().uValue().orElseThrow()));
    }

    private static Map<String, DoubleStream> threeLayers(Inputs given) {
        OneRoom room = room();
        ArrayNode layers = wall(room, given.number("Rsi_plus_Rse") / 2, given.number("Rsi_plus_Rse") / 2, SI);
        given.numbers("layer_R").forEach(resistance -> OneRoom.layer(layers, resistance, SI));
        SideSizing side = room.firstAssembly();
        return Map.of(
                "R_total",
                DoubleStream.of(side.resistance().orElseThrow()),
                "U",
                DoubleStream.of(side.uValue().orElseThrow()));
    }

    private static Map<String, DoubleStream> isothermalPlanes(Inputs given) {
        double share = given.number("f_stud");
        double cavity = given.number("R_cavity");
        double stud = given.number("R_stud");
        OneRoom room = room();
        ArrayNode layers = wall(room, given.number("R_other") / 2, given.number("R_other") / 2, US);
        bridge(OneRoom.layer(layers, cavity, US), share, stud, US);
        double lower = room.firstAssembly().lowerLimit().orElseThrow();
        return Map.of(
                "R_layer", DoubleStream.of(CombinedMethod.sideBySide(share, cavity, stud)),
                "R_total", DoubleStream.of(UnitChecks.from(QuantityKind.RESISTANCE, US, lower)));
    }

    /** The three paths as three surfaces side by side. */
    private static Map<String, DoubleStream> framedWall(Inputs given) {
        OneRoom room = room();
        Inputs weights = given.group("weights");
        framedPath(room, given, "R_cavity", weights.number("cavity"));
        framedPath(room, given, "R_stud", weights.number("framing"));
        framedPath(room, given, "R_header", weights.number("header"));
        double perKelvin = room.heatLoss().total();
        return Map.of("U", DoubleStream.of(UnitChecks.from(QuantityKind.TRANSMITTANCE, "Btu/(h.ft2.°F)", perKelvin)));
    }

    private static void framedPath(OneRoom room, Inputs given, String core, double area) {
        double[] films = given.numbers("films").toArray();
        ArrayNode layers = assembly(room.surface(area, Survey.OUTDOORS), films[0], films[1], US);
        for (String layer : new String[] {"gypsum", core, "siding"}) {
            OneRoom.layer(layers, given.number(layer), US);
        }
    }

    /** A room that is 1 K warmer than outdoors, so that a heat loss is a conductance. */
    private static OneRoom room() {
        return new OneRoom("1 °C", "0 °C");
    }

    private static ArrayNode wall(OneRoom room, Inputs given) {
        return wall(room, given.number("Rsi"), given.number("Rse"), SI);
    }

    private static ArrayNode wall(OneRoom room, double inside, double outside, String unit) {
        return assembly(room.surface(1, Survey.OUTDOORS), inside, outside, unit);
    }

    private static ArrayNode assembly(ObjectNode assembly, double inside, double outside, String unit) {
        String coefficient = unit.equals(SI) ? "W/(m2.K)" : "Btu/(h.ft2.°F)";
        assembly.put("insideCoefficient", OneRoom.reading(1 / inside, coefficient));
        assembly.put("outsideCoefficient", OneRoom.reading(1 / outside, coefficient));
        return assembly.putArray("layers");
    }

    private static void thicknesses(ArrayNode layers, Inputs given) {
        for (Inputs layer : given.groups("layers")) {
            layers.addObject().put("thickness", layer.number("d")).put("conductivity", layer.number("lambda"));
        }
    }

    private static void bridge(ObjectNode layer, double share, double resistance, String unit) {
        layer.putObject("bridging").put("share", share).put("resistance", OneRoom.reading(resistance, unit));
    }
}
