package org.treadwarm.store;

import java.util.regex.Pattern;

/**
 * One separately kept part of a job; the store does not look into its text.
 *
 * @param role what the part is, such as "site" or "room"; 1 to 40 characters without white space
 * @param id which of the parts with this role it is; 1 to 200 characters without white space
 * @param text the content, of any length
 */
public record Piece(String role, String id, String text) {
    private static final Pattern ROLE = Pattern.compile("[^\\s\\p{Z}\\p{C}]{1,40}");
    private static final Pattern ID = Pattern.compile("[^\\s\\p{Z}\\p{C}]{1,200}");

    /** @throws IllegalArgumentException if the role or id breaks its rule, or the text has a NUL or half a character */
    public Piece {
        if (!ROLE.matcher(role).matches()) {
            throw new IllegalArgumentException("Not the role of a piece: '" + role + "'");
        }
        if (!ID.matcher(id).matches()) {
            throw new IllegalArgumentException("Not the id of a piece: '" + id + "'");
        }
        Texts.storable("piece " + role + " " + id, text);
    }
}
