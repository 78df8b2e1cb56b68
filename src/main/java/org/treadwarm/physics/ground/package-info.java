/**
 * Slab on ground and suspended floor by ISO 13370. Pure functions on SI doubles; temperatures in degrees Celsius.
 */
package org.treadwarm.physics.ground;
