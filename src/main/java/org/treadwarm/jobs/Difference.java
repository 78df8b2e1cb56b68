package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import org.treadwarm.survey.Pointer;

/**
 * One value that two versions of a document do not share.
 *
 * @param path the steps to it: keys, ids of parts that have one, and else places in a list counted from 0
 * @param before what stands there in the first version; a missing node for nothing
 * @param after what stands there in the second version; a missing node for nothing
 */
public record Difference(List<String> path, JsonNode before, JsonNode after) {
    /** The path as a JSON Pointer, in which parts that have an id are addressed by it. */
    public String address() {
        String address = "";
        for (String step : path) {
            address = Pointer.to(address, step);
        }
        return address;
    }
}
