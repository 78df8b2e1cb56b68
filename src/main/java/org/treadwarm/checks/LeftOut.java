package org.treadwarm.checks;

/**
 * A published case that is not run, or a number of a case that is not checked.
 *
 * @param id the id of the case, or the name of the number
 * @param reason why not, in a few words
 */
public record LeftOut(String id, String reason) {}
