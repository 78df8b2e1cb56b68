package org.treadwarm.sizing;

import java.util.List;
import org.treadwarm.physics.PracticeLimit;
import org.treadwarm.physics.PracticeLimit.Sense;
import org.treadwarm.physics.electric.BreakerPractice;
import org.treadwarm.tables.Breakers;
import org.treadwarm.tables.PracticeLimits;

/** The limits of practice, by subject, and the ratings of breakers. */
public final class Practice {
    private Practice() {}

    /** Limits of warm-water circuits. */
    public static List<PracticeLimit> water() {
        return of("water");
    }

    /** Limits of electric cables. */
    public static List<PracticeLimit> electric() {
        return of("electric");
    }

    /** Breakers of European practice. */
    public static BreakerPractice europeanBreakers() {
        return breakers("european");
    }

    /** Breakers of US practice, used to 80 % for loads that last for hours. */
    public static BreakerPractice usBreakers() {
        return breakers("us");
    }

    private static BreakerPractice breakers(String practice) {
        List<Breakers.Row> rows = Breakers.all().stream()
                .filter(row -> row.practice().equals(practice))
                .toList();
        return new BreakerPractice(
                rows.stream().map(Breakers.Row::rating).toList(),
                rows.get(0).continuousShare(),
                rows.get(0).source());
    }

    private static List<PracticeLimit> of(String subject) {
        return PracticeLimits.all().stream()
                .filter(row -> row.subject().equals(subject))
                .map(row -> new PracticeLimit(row.quantity(), sense(row.sense()), row.limit(), row.source()))
                .toList();
    }

    private static Sense sense(String word) {
        return switch (word) {
            case "at most" -> Sense.AT_MOST;
            case "at least" -> Sense.AT_LEAST;
            default -> throw new IllegalStateException("a limit of practice is neither at most nor at least: " + word);
        };
    }
}
