package org.treadwarm.web.pages;

/**
 * A value that two people left different, and which of the two shall stand.
 *
 * @param field the name of its field in the form
 * @param id its id in the page
 * @param where what it is
 * @param theirs what the other saved
 * @param mine what was typed here
 * @param by who changed it since both began
 * @param chosen theirs, mine, or empty for not chosen yet
 * @param wrong whether the choice is missing after the form was sent
 */
public record Choice(
        String field, String id, String where, String theirs, String mine, String by, String chosen, boolean wrong) {}
