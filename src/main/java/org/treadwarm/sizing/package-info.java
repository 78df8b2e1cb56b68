/**
 * Survey to sizing: the main job, and the only place where the subjects of the physics meet. A survey is compiled once into
 * a {@link org.treadwarm.sizing.Plan} of plain numbers; an {@link org.treadwarm.sizing.Evaluation} computes it, again and
 * again if need be, without making garbage; {@link org.treadwarm.sizing.Answers} turns the numbers into the answer's records.
 * {@link org.treadwarm.sizing.Working} says of each number, when asked, by which formula and from which numbers it came.
 */
package org.treadwarm.sizing;
