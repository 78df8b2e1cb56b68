package org.treadwarm.draw;

/** A place on the sheet in pixels, y downwards. */
record Point(double x, double y) {}
