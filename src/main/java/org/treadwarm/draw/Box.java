package org.treadwarm.draw;

/** An upright rectangle on the sheet in pixels, y downwards. */
record Box(double x, double y, double width, double height) {
    static Box between(Point one, Point other) {
        return new Box(
                Math.min(one.x(), other.x()),
                Math.min(one.y(), other.y()),
                Math.abs(one.x() - other.x()),
                Math.abs(one.y() - other.y()));
    }

    double right() {
        return x + width;
    }

    double bottom() {
        return y + height;
    }

    double middleX() {
        return x + width / 2;
    }

    double middleY() {
        return y + height / 2;
    }

    /** The box with so much added on every side. */
    Box grown(double by) {
        return new Box(x - by, y - by, width + 2 * by, height + 2 * by);
    }

    boolean holds(Box other) {
        return other.x >= x && other.right() <= right() && other.y >= y && other.bottom() <= bottom();
    }

    boolean meets(Box other) {
        return other.x < right() && other.right() > x && other.y < bottom() && other.bottom() > y;
    }
}
