package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.jobs.Difference;
import org.treadwarm.jobs.Differences;
import org.treadwarm.jobs.Labels;

/**
 * Two versions of one part that were made from the same third, and how they become one.
 *
 * @param type the part's shape
 * @param base what both began from; a missing node if it is not known
 * @param theirs what stands in the job; a missing node if they took it out
 * @param mine what was typed here; a missing node if it was to be taken out
 */
record TwoVersions(Class<? extends Record> type, JsonNode base, JsonNode theirs, JsonNode mine) {
    static final String THEIRS = "theirs";
    static final String MINE = "mine";
    private static final String FIELD = "choice";

    List<Difference> differences() {
        return Differences.between(theirs, mine);
    }

    /** What stands for each difference unless somebody chooses: the side that changed it; nothing where both did. */
    private Optional<String> suggestion(Difference difference) {
        JsonNode before = base;
        for (String step : difference.path()) {
            before = Differences.at(before, step);
        }
        if (base.isMissingNode() || difference.path().isEmpty()) {
            return Optional.empty();
        }
        if (before.equals(difference.before())) {
            return Optional.of(MINE);
        }
        return before.equals(difference.after()) ? Optional.of(THEIRS) : Optional.empty();
    }

    /**
     * The differences as choices.
     *
     * @param chosen by address
     * @param sent whether the choices were sent, so that a missing one is wrong
     */
    List<Choice> choices(Map<String, String> chosen, boolean sent) {
        Labels labels = new Labels(type, mine, theirs);
        List<Choice> choices = new ArrayList<>();
        for (Difference difference : differences()) {
            Optional<String> suggestion = suggestion(difference);
            String stands = chosen.getOrDefault(difference.address(), sent ? "" : suggestion.orElse(""));
            String where = labels.where(difference);
            choices.add(new Choice(
                    FIELD + difference.address(),
                    "choice" + choices.size(),
                    where.isEmpty()
                            ? "The whole part"
                            : where.substring(0, 1).toUpperCase(Locale.ROOT) + where.substring(1),
                    labels.value(difference, difference.before()),
                    labels.value(difference, difference.after()),
                    suggestion
                            .map(side -> side.equals(MINE) ? "only you changed this" : "only they changed this")
                            .orElse("both changed this"),
                    stands,
                    sent && stands.isEmpty()));
        }
        return choices;
    }

    /** What was chosen in a form, by address. */
    static Optional<String> chosen(Map<String, List<String>> form, Difference difference) {
        return Optional.ofNullable(form.get(FIELD + difference.address()))
                .map(values -> values.get(0))
                .filter(value -> value.equals(THEIRS) || value.equals(MINE));
    }

    /** Theirs, with mine wherever it was chosen; a missing node when the part is to be taken out. */
    JsonNode settled(Map<String, String> chosen) {
        JsonNode result = theirs.deepCopy();
        for (Difference difference : differences()) {
            if (chosen.get(difference.address()).equals(MINE)) {
                if (difference.path().isEmpty()) {
                    return mine.deepCopy();
                }
                Differences.write(result, difference.path(), difference.after());
            }
        }
        return result;
    }
}
