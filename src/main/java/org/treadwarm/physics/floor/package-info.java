/**
 * The heated floor as a plane: what it gives, what it may give (EN 1264, ISO 11855). Pure functions on SI doubles; temperatures in degrees Celsius.
 */
package org.treadwarm.physics.floor;
