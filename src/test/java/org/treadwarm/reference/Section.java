package org.treadwarm.reference;

/**
 * What happens in a heated floor at one upward flux.
 *
 * @param upward W/m² into the room
 * @param surface mean surface temperature, °C
 * @param heater temperature of the heater plane, °C
 * @param downward W/m²
 * @param edge W/m² of heated area through junctions at the heated floor
 */
record Section(double upward, double surface, double heater, double downward, double edge) {
    /** W/m² that the heater must give. */
    double heaterFlux() {
        return upward + downward + edge;
    }
}
