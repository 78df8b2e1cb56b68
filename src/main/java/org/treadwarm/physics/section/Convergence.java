package org.treadwarm.physics.section;

/**
 * How well the balances of all cells hold.
 *
 * @param residual what is left of them relative to the right-hand side, both as the root of the sum of squares
 * @param iterations steps of the solver
 */
record Convergence(double residual, int iterations) {}
