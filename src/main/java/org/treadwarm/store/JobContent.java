package org.treadwarm.store;

import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * What one revision of a job holds.
 *
 * @param name the job's name as people see it
 * @param draft whether the survey in it is not valid yet
 * @param pieces the parts in order; no two share role and id
 */
public record JobContent(String name, boolean draft, List<Piece> pieces) {
    /** @throws IllegalArgumentException if two pieces share role and id, or the name has a NUL or half a character */
    public JobContent {
        Texts.storable("name of the job", name);
        pieces = List.copyOf(pieces);
        Set<String> seen = new HashSet<>();
        for (Piece piece : pieces) {
            if (!seen.add(piece.role() + " " + piece.id())) {
                throw new IllegalArgumentException("Two pieces are " + piece.role() + " " + piece.id());
            }
        }
    }
}
