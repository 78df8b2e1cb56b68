package org.treadwarm.sizing;

import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.survey.Zone;

/** Names, sources and numbers of what limits a heated floor. */
final class Limits {
    /** Highest surface temperature of the occupied area, degrees Celsius (EN 1264-2:2008+A1:2012, 4; read in trade manuals). */
    static final double OCCUPIED = 29;

    /** Highest surface temperature of the peripheral area, degrees Celsius (as above). */
    static final double PERIPHERAL = 35;

    /** Highest surface temperature of a bathroom above its room temperature, K (as above). */
    static final double BATHROOM_RISE = 9;

    static final String ZONE_SOURCE = "EN 1264-2:2008+A1:2012, clause 4, read in trade manuals";

    static final String SURFACE = "surface temperature, ";
    static final String COVERING = "covering surface temperature";
    static final String LAYER = "layer temperature: ";
    static final String HEATER = "heater density";
    static final String WATER = "water supply";
    static final String MATS = "installed power";

    static final String SURFACE_SOURCE = "EN 1264-2";
    static final String COVERING_SOURCE = "the maker of the covering; 27 °C under timber is common practice, no source";
    static final String LAYER_SOURCE = "the maker of the layer";
    static final String WATER_SOURCE = "EN 1264-2, mean over-temperature of the water; the solved section";
    static final String MATS_SOURCE =
            "energy balance of the heater, with the power of the chosen mats over the heated area";
    static final String HEATER_SOURCE = "energy balance of the heater";

    private Limits() {}

    /** The name of the limit in a slot of a floor, or of a part of it, in a zone; the slots of the heater are not among them. */
    static String name(FloorPlan floor, Zone zone, int slot) {
        return switch (slot) {
            case 0 -> SURFACE + zone.label();
            case 1 -> COVERING;
            default -> LAYER + floor.layerLimits().get(slot - 2).name();
        };
    }

    /** The source of the limit in such a slot. */
    static String source(int slot) {
        return switch (slot) {
            case 0 -> SURFACE_SOURCE;
            case 1 -> COVERING_SOURCE;
            default -> LAYER_SOURCE;
        };
    }

    /** The highest surface temperature of a zone in a room of a temperature, degrees Celsius. */
    static double zoneMaximum(Zone zone, double room) {
        return switch (zone) {
            case OCCUPIED -> OCCUPIED;
            case PERIPHERAL -> PERIPHERAL;
            case BATHROOM -> room + BATHROOM_RISE;
        };
    }
}
