/**
 * Heat carried by air, and air at altitude, by EN 12831-1. Pure functions on SI doubles; temperatures in degrees Celsius.
 */
package org.treadwarm.physics.air;
