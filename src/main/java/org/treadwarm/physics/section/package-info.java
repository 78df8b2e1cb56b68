/**
 * Steady two-dimensional conduction through sections, and the heated floor's section on top of it. Pure functions on SI doubles;
 * temperatures in degrees Celsius, heat in W per metre of depth.
 */
package org.treadwarm.physics.section;
