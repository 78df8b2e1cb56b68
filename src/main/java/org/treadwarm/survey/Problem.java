package org.treadwarm.survey;

/**
 * One thing in a survey that stands in the way of a sizing.
 *
 * @param pointer JSON Pointer to the field
 * @param given what was given there, shortened
 * @param message what is wrong, in a surveyor's words
 * @param allowed what is allowed there
 */
public record Problem(String pointer, String given, String message, String allowed) {}
