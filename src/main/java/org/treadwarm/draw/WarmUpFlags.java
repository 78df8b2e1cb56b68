package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/** Words over a chart, each on a stem that comes up from its place. */
final class WarmUpFlags {
    private static final double BESIDE = 7;
    private static final double GAP = 8;

    /** A flag: where its stem stands, where it starts and what is said. */
    private record Flag(double x, double y, Label label) {}

    /** A flag with the height of its words and the side they stand on. */
    private record Hoisted(Flag flag, double middle, boolean leftwards) {
        Box words() {
            double width = flag.label().width();
            double height = flag.label().height();
            double x = leftwards ? flag.x() - BESIDE - width : flag.x() + BESIDE;
            return new Box(x, middle - height / 2, width, height);
        }

        Box stem() {
            return new Box(flag.x() - 1, middle - flag.label().height() / 2, 2, flag.y() - middle);
        }

        boolean collides(Hoisted other) {
            return words().meets(other.words()) || words().meets(other.stem()) || stem().meets(other.words());
        }
    }

    private final Box room;
    private final List<Flag> flags = new ArrayList<>();

    /** Flags above the foot of a room, and within its sides. */
    WarmUpFlags(Box room) {
        this.room = room;
    }

    void add(double x, double y, Label label) {
        flags.add(new Flag(x, y, label));
    }

    /** Height of the rows that are needed. */
    double height() {
        return hoisted().stream()
                .mapToDouble(one -> room.bottom() - one.middle() + row() / 2)
                .max()
                .orElse(0);
    }

    private static double row() {
        return 2 * TextStyle.LINE_HEIGHT + GAP;
    }

    void draw(Canvas canvas) {
        for (Hoisted one : hoisted()) {
            Flag flag = one.flag();
            canvas.line(new Point(flag.x(), one.words().y()), new Point(flag.x(), flag.y()), Stroke.THIN);
            canvas.circle(new Point(flag.x(), flag.y()), 4, Palette.PAPER, Stroke.OUTLINE);
            double side = one.leftwards() ? -BESIDE : BESIDE;
            TextStyle.Anchor anchor = one.leftwards() ? TextStyle.Anchor.END : TextStyle.Anchor.START;
            canvas.label(new Point(flag.x() + side, one.middle()), flag.label(), anchor);
        }
    }

    /** In the fewest rows in which they can stand clear of one another, on the right of their stems if they can. */
    private List<Hoisted> hoisted() {
        for (int rows = 1; rows <= flags.size(); rows++) {
            int choices = 2 * rows;
            for (int code = 0; code < Math.pow(choices, flags.size()); code++) {
                List<Hoisted> all = hoisted(code, choices);
                if (stand(all)) {
                    return all;
                }
            }
        }
        return hoisted(0, 1);
    }

    /** Each digit of the code is the row and the side of one flag. */
    private List<Hoisted> hoisted(int code, int choices) {
        List<Hoisted> all = new ArrayList<>();
        int rest = code;
        for (Flag flag : flags) {
            int choice = rest % choices;
            rest /= choices;
            double middle = room.bottom() - (choice / 2 + 0.5) * row();
            all.add(new Hoisted(flag, middle, choice % 2 == 1));
        }
        return all;
    }

    private boolean stand(List<Hoisted> all) {
        for (int i = 0; i < all.size(); i++) {
            Box words = all.get(i).words();
            if (words.x() < room.x() || words.right() > room.right()) {
                return false;
            }
            for (int j = 0; j < i; j++) {
                if (all.get(i).collides(all.get(j))) {
                    return false;
                }
            }
        }
        return true;
    }
}
