package org.treadwarm.web.pages;

import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;

/** Addresses of pages. */
final class Links {
    private Links() {}

    /** The page of a room, space or assembly of a job. */
    static String part(String job, String part, String name) {
        return "/jobs/" + job + "/" + part + "/" + segment(name);
    }

    private static String segment(String text) {
        return URLEncoder.encode(text, StandardCharsets.UTF_8).replace("+", "%20");
    }
}
