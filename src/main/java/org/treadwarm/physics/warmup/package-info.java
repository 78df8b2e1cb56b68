/**
 * Warming up and cooling down: transient conduction through the layers of a floor with the room above it. Pure functions on SI
 * doubles; temperatures in degrees Celsius, times in seconds, everything per m² of heated floor.
 */
package org.treadwarm.physics.warmup;
