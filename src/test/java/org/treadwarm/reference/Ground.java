package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;

/** A slab or suspended floor by ISO 13370 (formulas from memory), without season and groundwater factors. */
final class Ground {
    private final JsonNode ground;
    private final double standardArea;

    /** The survey's {@code ground} and the area in m² that counts when it names none (NaN: then it must). */
    Ground(JsonNode ground, double standardArea) {
        this.ground = ground;
        this.standardArea = standardArea;
    }

    boolean suspended() {
        return switch (Fields.text(ground, "kind")) {
            case "slab" -> false;
            case "suspended" -> true;
            default -> throw new IllegalArgumentException("kind of " + ground);
        };
    }

    /** Slab on ground, W/(m²K); films and layers together in m²K/W. */
    double slabTransmittance(double resistance) {
        double dimension = characteristicDimension();
        double equivalent = Fields.number(ground, "wallThickness") + soil() * resistance;
        return equivalent < dimension ? firstSlabFormula(equivalent) : soil() / (0.457 * dimension + equivalent);
    }

    /** Suspended floor from the room to ground, W/(m²K); the deck with both its films in m²K/W. */
    double suspendedTransmittance(double deck) {
        return 1 / (deck + 1 / (voidToGround() + voidToOutdoors()));
    }

    /** Ug from the void of a suspended floor to the ground, W/(m²K), without insulation on the ground. */
    double voidToGround() {
        double films = Transmittance.DOWNWARD_FILM + Transmittance.OUTSIDE_FILM;
        return firstSlabFormula(Fields.number(ground, "wallThickness") + soil() * films);
    }

    /** Ux from the void through its walls and vents to outdoors, W/(m²K). */
    double voidToOutdoors() {
        double shielding = switch (Fields.text(ground, "shielding", "average")) {
            case "sheltered" -> 0.02;
            case "average" -> 0.05;
            case "exposed" -> 0.10;
            default -> throw new IllegalArgumentException("shielding of " + ground);
        };
        double walls = 2 * Fields.number(ground, "floorHeight") * Fields.number(ground, "wallUValue");
        double vents = 1450 * Fields.number(ground, "ventArea") * Fields.number(ground, "windSpeed") * shielding;
        return (walls + vents) / characteristicDimension();
    }

    private double firstSlabFormula(double equivalent) {
        double breadth = Math.PI * characteristicDimension();
        return 2 * soil() / (breadth + equivalent) * Math.log(breadth / equivalent + 1);
    }

    private double characteristicDimension() {
        double area = Fields.number(ground, "area", standardArea);
        if (Double.isNaN(area)) {
            throw new IllegalArgumentException("the ground under an unheated space needs its area");
        }
        return area / (0.5 * Fields.number(ground, "exposedPerimeter"));
    }

    private double soil() {
        return Fields.number(ground, "soilConductivity");
    }
}
