package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/** The sentences under a heat balance. */
final class BalanceNotes {
    /** Paths and total are each rounded by whoever sums them; less than this in W says nothing. */
    private static final double ROUNDING = 0.5;

    private BalanceNotes() {}

    static List<String> of(Balance balance, BalanceBlocks blocks) {
        List<String> notes = new ArrayList<>();
        double listed = balance.outWatts() - balance.gainWatts();
        boolean sums = Math.abs(listed - balance.totalWatts()) <= ROUNDING;
        notes.add(total(balance, sums));
        if (!sums) {
            notes.add("The paths listed add up to " + Figures.watts(listed) + ", which is not the total.");
        }
        balance.floor()
                .filter(floor -> Math.abs(floor.requiredWatts() - balance.totalWatts()) > ROUNDING)
                .ifPresent(floor -> notes.add("Asked of the floor: " + Figures.watts(floor.requiredWatts()) + "."));
        if (!blocks.merged().isEmpty()) {
            notes.add("Smaller: " + blocks.merged() + ".");
        }
        return notes;
    }

    private static String total(Balance balance, boolean sums) {
        String total = Figures.watts(balance.totalWatts());
        if (balance.totalWatts() <= 0) {
            return "No heat is needed: the balance is " + total + ".";
        }
        if (sums && balance.gainWatts() > 0) {
            return "To be supplied: " + total + ", that is " + Figures.watts(balance.outWatts()) + " out less "
                    + Figures.watts(balance.gainWatts()) + " gained.";
        }
        return "To be supplied: " + total + ".";
    }
}
