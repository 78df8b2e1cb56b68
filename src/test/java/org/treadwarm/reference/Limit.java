package org.treadwarm.reference;

/** The largest upward flux in W/m² that one consideration allows. */
record Limit(String name, double maximumFlux) {}
