/**
 * Readings, units and the declaration of a quantity. Knows nothing else: everything that enters or leaves the program as
 * text with a unit passes here, and inside the program there are only SI doubles (temperatures in degrees Celsius).
 */
package org.treadwarm.units;
