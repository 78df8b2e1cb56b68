package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.Optional;
import org.treadwarm.jobs.Difference;
import org.treadwarm.jobs.Differences;
import org.treadwarm.jobs.Labels;

/**
 * One value that two versions do not share.
 *
 * @param address where it stands; parts that have an id are addressed by it
 * @param label the same in words
 * @param before what stands there in the first version; empty for nothing
 * @param after what stands there in the second version; empty for nothing
 */
record DifferenceAnswer(String address, String label, Optional<JsonNode> before, Optional<JsonNode> after) {
    static List<DifferenceAnswer> between(JsonNode before, JsonNode after, Class<? extends Record> type) {
        Labels labels = new Labels(type, after, before);
        return Differences.between(before, after).stream()
                .map(difference -> of(difference, labels))
                .toList();
    }

    private static DifferenceAnswer of(Difference difference, Labels labels) {
        return new DifferenceAnswer(
                difference.address(), labels.where(difference), there(difference.before()), there(difference.after()));
    }

    private static Optional<JsonNode> there(JsonNode node) {
        return node.isMissingNode() ? Optional.empty() : Optional.of(node);
    }
}
