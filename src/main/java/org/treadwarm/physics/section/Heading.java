package org.treadwarm.physics.section;

/** The side of a cell that a link leaves by. */
enum Heading {
    LEFT,
    RIGHT,
    DOWN,
    UP
}
