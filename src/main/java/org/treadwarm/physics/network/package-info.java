/**
 * Spaces and conductances: the steady temperatures of spaces that float. Pure functions on SI doubles; temperatures in degrees Celsius.
 */
package org.treadwarm.physics.network;
