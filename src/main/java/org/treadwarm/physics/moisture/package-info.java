/**
 * Surface temperature factor, saturation pressure and dew point by ISO 13788. Pure functions on SI doubles; temperatures in degrees Celsius.
 */
package org.treadwarm.physics.moisture;
