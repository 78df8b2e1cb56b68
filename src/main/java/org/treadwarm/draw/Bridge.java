package org.treadwarm.draw;

/**
 * Members that cross a layer.
 *
 * @param share part of the layer's area they take up, above 0 and below 1
 * @param name what they are
 */
public record Bridge(double share, String name) {
    /** @throws IllegalArgumentException if the share is not between 0 and 1 */
    public Bridge {
        if (!(share > 0 && share < 1)) {
            throw new IllegalArgumentException("A bridge takes a share between 0 and 1, not " + share);
        }
    }
}
