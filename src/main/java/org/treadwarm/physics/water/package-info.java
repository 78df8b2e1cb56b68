/**
 * Warm-water heating: properties of the water, flow through pipes, circuits and their balancing (EN 1264-3, IAPWS). Pure functions on SI doubles; temperatures in degrees Celsius where not said otherwise.
 */
package org.treadwarm.physics.water;
