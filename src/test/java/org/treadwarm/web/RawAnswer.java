package org.treadwarm.web;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** An answer as it came over the wire. */
record RawAnswer(int status, String head, String body) {
    private static final Pattern STATUS = Pattern.compile("HTTP/1\\.[01] (\\d{3})");

    static RawAnswer of(String text) {
        Matcher status = STATUS.matcher(text);
        if (!status.lookingAt()) {
            throw new AssertionError("no answer but \"" + text + "\"");
        }
        String[] parts = text.split("\r\n\r\n", 2);
        return new RawAnswer(Integer.parseInt(status.group(1)), parts[0], parts.length < 2 ? "" : parts[1]);
    }

    /** What is wrong with it whatever was asked, if anything is. */
    Optional<String> fault(boolean ofApi) {
        // The reader of requests says 505 to a first line that names no version of HTTP it knows, as RFC 9110 has it.
        if (status >= 500 && status != 505) {
            return Optional.of("fault " + status);
        }
        boolean refusal = status >= 300 && !body.isEmpty();
        if (refusal && ofApi && !head.contains("application/problem+json")) {
            return Optional.of("no problem document: " + head);
        }
        boolean inside = refusal && (body.contains("Exception") || body.contains("\tat ") || body.contains("jetty"));
        return inside ? Optional.of("the program's inside: " + body) : Optional.empty();
    }
}
