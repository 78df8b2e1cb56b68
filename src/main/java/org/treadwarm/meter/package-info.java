/** Counts and durations of what the program does, to be looked at from outside. */
package org.treadwarm.meter;
