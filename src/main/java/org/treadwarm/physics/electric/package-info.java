/**
 * Electric floor heating: spacing and choice of cables and mats, circuits, and the area that is free to be heated. Pure functions on SI doubles.
 */
package org.treadwarm.physics.electric;
