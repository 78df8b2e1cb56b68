package org.treadwarm.survey;

/**
 * A place in a document, kept as the way down to it. Reading and sizing a survey pass thousands of places and name hardly
 * any, so the JSON Pointer is written only when somebody asks.
 */
public final class Place {
    /** The whole document. */
    public static final Place ROOT = new Place(null, "", Place.POINTER);

    private static final int POINTER = -1;
    private static final int KEY = -2;

    private final Place above;
    private final String step;
    private final int item;

    /** A step down: by a pointer, to an item of the list that a pointer leads to, or by a key that is to be escaped. */
    private Place(Place above, String step, int item) {
        this.above = above;
        this.step = step;
        this.item = item;
    }

    /** The place that a pointer leads to from here, such as {@code "/heatedFloor"}. */
    public Place at(String pointer) {
        return new Place(this, pointer, POINTER);
    }

    /** What stands under a key of the object at this place, whatever characters are in the key. */
    public Place key(String key) {
        return new Place(this, key, KEY);
    }

    /** An item of the list at this place. */
    public Place item(int item) {
        return new Place(this, "", item);
    }

    /** An item of the list that a pointer leads to from here, such as {@code "/surfaces"}. */
    public Place item(String pointer, int item) {
        return new Place(this, pointer, item);
    }

    /** This place as a JSON Pointer (RFC 6901). */
    public String pointer() {
        String parent = above == null ? "" : above.pointer();
        return switch (item) {
            case POINTER -> parent + step;
            case KEY -> Pointer.to(parent, step);
            default -> Pointer.to(parent + step, item);
        };
    }
}
