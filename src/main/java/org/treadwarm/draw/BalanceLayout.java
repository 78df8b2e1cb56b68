package org.treadwarm.draw;

/**
 * Where the columns and labels of the heat balance stand, in pixels from the left.
 *
 * @param width width of the sheet
 * @param bar width of a column
 * @param gap between the columns
 * @param leader length of the leaders
 * @param leastHeight height of the columns if the labels need no more
 */
record BalanceLayout(double width, double bar, double gap, double leader, double leastHeight) {
    static final double MARGIN = 10;

    static BalanceLayout on(Sheet sheet) {
        return sheet.roomy()
                ? new BalanceLayout(sheet.width(), 92, 64, 34, 340)
                : new BalanceLayout(sheet.width(), 32, 10, 16, 320);
    }

    double middle() {
        return width / 2;
    }

    double outColumn() {
        return middle() - gap / 2 - bar;
    }

    double inColumn() {
        return middle() + gap / 2;
    }

    double outLabels() {
        return outColumn() - leader;
    }

    double inLabels() {
        return inColumn() + bar + leader;
    }

    double labelWidth() {
        return outLabels() - MARGIN;
    }

    double headWidth() {
        return middle() - 2 * MARGIN;
    }

    double noteWidth() {
        return width - 2 * MARGIN;
    }

    /** Whether there is room for an axis between the columns. */
    boolean axis() {
        return gap > 50;
    }
}
