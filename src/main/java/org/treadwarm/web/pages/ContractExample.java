package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * How a route is called from a shell with curl.
 *
 * @param media the media type of its body; empty for none
 * @param withKey whether it needs a key
 */
record ContractExample(
        String origin, String method, String path, List<JsonNode> parameters, String media, boolean withKey) {
    private static final String NEXT_LINE = " \\\n  ";

    /** The lines to type. What stands for something of the reader's own is a variable of the shell or a file. */
    String text() {
        List<String> words = new ArrayList<>();
        boolean usual = method.equals("get") || method.equals("post") && !media.isEmpty();
        words.add("curl " + (usual ? "" : "-X " + method.toUpperCase(Locale.ROOT) + " ") + "\"" + origin + filled()
                + "\"");
        if (withKey) {
            words.add("-H \"Authorization: Bearer $KEY\"");
        }
        parameters.stream()
                .filter(each -> each.path("in").asText().equals("header")
                        && each.path("required").asBoolean())
                .forEach(each -> words.add("-H \"" + each.path("name").asText() + ": $ETAG\""));
        if (!media.isEmpty()) {
            words.add("-H \"Content-Type: " + media + "\"");
            words.add("--data-binary @" + (media.equals("text/csv") ? "table.csv" : "document.json"));
        }
        return String.join(NEXT_LINE, words);
    }

    private String filled() {
        String filled = path;
        for (JsonNode each : parameters) {
            String name = each.path("name").asText();
            String first = each.at("/schema/enum/0").asText();
            filled = filled.replace("{" + name + "}", first.isEmpty() ? "$" + name.toUpperCase(Locale.ROOT) : first);
        }
        return filled;
    }
}
