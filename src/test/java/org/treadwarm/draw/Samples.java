package org.treadwarm.draw;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Invented data of the invented firm Quillfen Floors. */
final class Samples {
    private Samples() {}

    static Balance bathroom() {
        List<HeatPath> paths = List.of(
                path("External wall, north", 212),
                path("External wall, east behind the shower", 148),
                path("Window", 186),
                path("Floor to ground", 96),
                path("Ceiling to loft", 121),
                path("Ventilation", 402),
                path("Linear bridge, window reveal", 14),
                path("Linear bridge, floor edge", 11),
                path("Door to hall", -62),
                path("Airing cupboard wall", -38));
        return new Balance("Bathroom, Mill Lane", paths, 1090, Optional.of(new FloorHeat(1090, 750, 340)));
    }

    static HeatPath path(String label, double watts) {
        return new HeatPath(label, watts, OptionalDouble.of(watts / 1090));
    }

    static FluxScale limits(double required, double carried) {
        return new FluxScale(
                "Bathroom, Mill Lane",
                required,
                carried,
                List.of(
                        new FluxLimit("Surface temperature in the wet zone", 100, false),
                        new FluxLimit("Covering: engineered oak, highest temperature at its underside", carried, true),
                        new FluxLimit("Cable output", 150, false),
                        new FluxLimit("Sensor", 1500, false)));
    }

    static BuildUp framedWall() {
        Optional<Bridge> studs = Optional.of(new Bridge(0.15, "timber studs"));
        return new BuildUp(
                "Framed wall, north",
                false,
                new AirSide("bathroom", 22),
                new AirSide("outdoors", -5),
                List.of(
                        layer("Plasterboard", 0.0125, 0.06),
                        layer("Vapour membrane", 0.0002, 0),
                        new Layer(
                                "Mineral wool",
                                OptionalDouble.of(0.14),
                                3.5,
                                MaterialFamily.INSULATION,
                                studs,
                                List.of("0.040 W/mK")),
                        layer("OSB board", 0.011, 0.085),
                        new Layer(
                                "Ventilated air gap",
                                OptionalDouble.empty(),
                                0.18,
                                MaterialFamily.AIR,
                                Optional.empty(),
                                List.of()),
                        layer("Brick outer leaf", 0.1025, 0.133)),
                List.of(21.2, 20.8, 20.8, -2.6, -3.2, -4.3, -4.8),
                OptionalDouble.of(11.2));
    }

    static BuildUp roof() {
        BuildUp wall = framedWall();
        return new BuildUp(
                "Floor over garage",
                true,
                wall.first(),
                wall.last(),
                wall.layers(),
                wall.temperatures(),
                wall.dewPoint());
    }

    static Layer layer(String name, double thickness, double resistance) {
        return new Layer(
                name, OptionalDouble.of(thickness), resistance, MaterialFamily.of(name), Optional.empty(), List.of());
    }

    static FloorSection floor() {
        return new FloorSection(
                "Bathroom, Mill Lane",
                new AirSide("bathroom", 22),
                List.of(layer("Porcelain tile", 0.01, 0.01), layer("Tile adhesive", 0.005, 0.005)),
                "heating cable",
                List.of(
                        layer("Levelling compound", 0.012, 0.01),
                        layer("Insulation board, XPS", 0.02, 0.57),
                        layer("Concrete slab", 0.15, 0.08)),
                new Beneath(Beneath.Kind.GROUND, "ground", OptionalDouble.of(9)),
                28.6,
                30.1,
                75.4,
                11.8,
                OptionalDouble.of(2.1));
    }
}
