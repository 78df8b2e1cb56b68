package org.treadwarm.units;

import java.util.Map;

/**
 * A fixed table from texts to values that is also asked for the end of a text without cutting it off. Reading a survey looks up a
 * key or a unit for nearly every word of it, where a map would make and chase objects.
 */
public final class TextTable<V> {
    private final String[] texts;
    private final Object[] values;

    /** The table of a map's entries. */
    public TextTable(Map<String, ? extends V> entries) {
        texts = new String[4 * Integer.highestOneBit(entries.size() + 1)];
        values = new Object[texts.length];
        entries.forEach((text, value) -> {
            int slot = slot(text, 0);
            texts[slot] = text;
            values[slot] = value;
        });
    }

    /** The value of what stands in a text from a place to its end; null when the table has none. */
    @SuppressWarnings("unchecked")
    public V at(String text, int from) {
        return (V) values[slot(text, from)];
    }

    /** The slot of a text, or the free one where it would be; at least half of the slots are free. */
    private int slot(String text, int from) {
        int length = text.length() - from;
        int hash = hash(text, from);
        int slot = (hash ^ hash >>> 16) & texts.length - 1;
        while (texts[slot] != null && !(texts[slot].length() == length && text.startsWith(texts[slot], from))) {
            slot = slot + 1 & texts.length - 1;
        }
        return slot;
    }

    /** The hash that the end of a text has as a text of its own; that of a whole one is mostly known already. */
    private static int hash(String text, int from) {
        if (from == 0) {
            return text.hashCode();
        }
        int hash = 0;
        for (int i = from; i < text.length(); i++) {
            hash = 31 * hash + text.charAt(i);
        }
        return hash;
    }
}
