package org.treadwarm.reference;

import java.util.OptionalDouble;

/**
 * One conductance between two nodes, as the side {@code from} lists it.
 *
 * @param conductance W/K
 * @param area net area in m² of a surface, area of all pieces of an opening
 * @param uValue W/(m²K), on ground without season and groundwater factors
 */
record Coupling(
        String name,
        Kind kind,
        String from,
        String to,
        double conductance,
        OptionalDouble area,
        OptionalDouble uValue) {
    enum Kind {
        TRANSMISSION,
        OPENING,
        JUNCTION,
        AIR
    }

    boolean isPlane() {
        return kind == Kind.TRANSMISSION || kind == Kind.OPENING;
    }

    /** The node at the other end. */
    String beyond(String node) {
        return from.equals(node) ? to : from;
    }
}
