package org.treadwarm.survey;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;

/** The listed name that a mistyped one is nearest to. */
public final class Nearest {
    private Nearest() {}

    /** The nearest of the names by the fewest letters changed, if there are any names. */
    public static Optional<String> to(String given, Collection<String> names) {
        String shortened = shortened(given);
        return names.stream().limit(2000).min(Comparator.comparingInt(name -> distance(shortened, shortened(name))));
    }

    private static String shortened(String name) {
        return name.substring(0, Math.min(name.length(), 60)).toLowerCase(Locale.ROOT);
    }

    /** Letters inserted, left out or replaced (Levenshtein, 1966). */
    private static int distance(String a, String b) {
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int above = row[j];
                int replaced = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(replaced, Math.min(row[j - 1], above) + 1);
                diagonal = above;
            }
        }
        return row[b.length()];
    }
}
