package org.treadwarm.checks;

import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.air.AirHeat;
import org.treadwarm.survey.Survey;
import org.treadwarm.tables.PsiDefaults;
import org.treadwarm.units.QuantityKind;

/** Heat losses of rooms, through a whole sizing, and the heat capacity of air. */
final class RoomChecks {
    private RoomChecks() {}

    static Map<String, Computation> bindings() {
        return Map.of(
                "uk-single-wall", RoomChecks::singleWall,
                "14683-sap-default-sum", RoomChecks::junctions,
                "us-f-factor", RoomChecks::slabEdge,
                "air-heat-capacity", given -> Map.of("value", DoubleStream.of(AirHeat.CAPACITY)));
    }

    private static Map<String, DoubleStream> singleWall(Inputs given) {
        OneRoom room = new OneRoom(
                OneRoom.reading(given.number("theta_i"), "°C"), OneRoom.reading(given.number("theta_e"), "°C"));
        room.surface(given.number("A"), Survey.OUTDOORS).put("uValue", given.number("U"));
        return Map.of("Q_W", DoubleStream.of(room.heatLoss().total()));
    }

    /** With 1 K between room and outdoors the junctions lose their conductance. */
    private static Map<String, DoubleStream> junctions(Inputs given) {
        OneRoom room = new OneRoom("1 °C", "0 °C");
        for (PsiDefaults.Row row : PsiDefaults.all()) {
            String code = row.junction().split(" ", 2)[0];
            if (row.junction().endsWith(", default") && given.group("lengths").has(code)) {
                double length = given.group("lengths").number(code);
                room.junction(OneRoom.reading(row.internal().orElseThrow(), "W/(m.K)"), OneRoom.reading(length, "m"));
            }
        }
        return Map.of("H_TB", DoubleStream.of(room.heatLoss().junctions()));
    }

    private static Map<String, DoubleStream> slabEdge(Inputs given) {
        return Map.of(
                "Q_unheated", DoubleStream.of(slabEdge(given, "unheated_uninsulated")),
                "Q_heated", DoubleStream.of(slabEdge(given, "heated_uninsulated")),
                "Q_heated_R10", DoubleStream.of(slabEdge(given, "heated_fully_R10")));
    }

    private static double slabEdge(Inputs given, String slab) {
        OneRoom room = new OneRoom(OneRoom.reading(given.number("dT_F"), "°F"), "0 °F");
        double factor = given.group("F").number(slab);
        room.junction(OneRoom.reading(factor, "Btu/(h.ft.°F)"), OneRoom.reading(given.number("perimeter_ft"), "ft"));
        return UnitChecks.from(QuantityKind.POWER, "Btu/h", room.heatLoss().junctions());
    }
}
