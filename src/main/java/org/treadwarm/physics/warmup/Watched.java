package org.treadwarm.physics.warmup;

/** Which temperature is waited for. */
public enum Watched {
    /** Of the room's air. */
    AIR,
    /** Mean of air and mass. */
    OPERATIVE,
    /** Of the floor's surface. */
    SURFACE,
    /** Of the heater plane. */
    HEATER
}
