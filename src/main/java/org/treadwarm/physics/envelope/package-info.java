/**
 * Layers, air gaps and bridging by ISO 6946. Pure functions on SI doubles; temperatures in degrees Celsius.
 */
package org.treadwarm.physics.envelope;
