package org.treadwarm.physics.section;

/**
 * How far a section's numbers can be trusted.
 *
 * @param relativeError estimated from the change between the last two grids (Richardson, with an assumed order), of the floor's
 *     flux and overtemperatures, whichever is worst, or of the coupling
 * @param residual what is left of the cells' balances, relative, as the root of the sum of squares
 * @param iterations steps of the solver on the last grid
 * @param cells of the last grid
 */
public record Accuracy(double relativeError, double residual, int iterations, int cells) {}
