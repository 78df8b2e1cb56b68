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
}
