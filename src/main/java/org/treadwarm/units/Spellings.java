package org.treadwarm.units;

import java.util.Map;

/**
 * The units of one kind by their spellings, looked up at the end of a text without cutting it off: a survey has a unit in
 * nearly every reading.
 */
final class Spellings {
    private final String[] spellings;
    private final Unit[] units;

    Spellings(Map<String, Unit> bySpelling) {
        spellings = new String[4 * Integer.highestOneBit(bySpelling.size() + 1)];
        units = new Unit[spellings.length];
        bySpelling.forEach((spelling, unit) -> {
            int slot = slot(spelling, 0);
            spellings[slot] = spelling;
            units[slot] = unit;
        });
    }

    /** The unit that is spelt to the letter as a text is from a place to its end; null when there is none. */
    Unit at(String text, int from) {
        return units[slot(text, from)];
    }

    /** The slot of a spelling, or the free one where it would be; at least half of the slots are free. */
    private int slot(String text, int from) {
        int length = text.length() - from;
        int hash = 0;
        for (int i = from; i < text.length(); i++) {
            hash = 31 * hash + text.charAt(i);
        }
        int slot = (hash ^ hash >>> 16) & spellings.length - 1;
        while (spellings[slot] != null
                && !(spellings[slot].length() == length && text.startsWith(spellings[slot], from))) {
            slot = slot + 1 & spellings.length - 1;
        }
        return slot;
    }
}
