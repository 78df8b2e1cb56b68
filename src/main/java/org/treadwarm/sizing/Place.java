package org.treadwarm.sizing;

import org.treadwarm.survey.Pointer;

/**
 * A place in a survey, kept as the way down to it. A sizing passes thousands and names hardly any, so the JSON Pointer is
 * written only when somebody asks.
 */
final class Place {
    /** The whole survey. */
    static final Place SURVEY = new Place(null, "", Place.NO_ITEM);

    private static final int NO_ITEM = -1;

    private final Place above;
    private final String keys;
    private final int item;

    private Place(Place above, String keys, int item) {
        this.above = above;
        this.keys = keys;
        this.item = item;
    }

    /** The place that a pointer leads to from here, such as {@code "/heatedFloor"}. */
    Place at(String pointer) {
        return new Place(this, pointer, NO_ITEM);
    }

    /** An item of the list that a pointer leads to from here, such as {@code "/surfaces"}. */
    Place item(String pointer, int item) {
        return new Place(this, pointer, item);
    }

    /** An item of the list at this place. */
    Place item(int item) {
        return new Place(this, "", item);
    }

    /** What stands under a name in the map that a pointer leads to from here. */
    Place named(String pointer, String name) {
        return new Place(this, Pointer.to(pointer, name), NO_ITEM);
    }

    /** This place as a JSON Pointer (RFC 6901). */
    String pointer() {
        String parent = above == null ? "" : above.pointer();
        return item == NO_ITEM ? parent + keys : Pointer.to(parent + keys, item);
    }
}
