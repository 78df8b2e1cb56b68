package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.treadwarm.intake.Document;
import org.treadwarm.survey.Site;

/**
 * What was typed about the site into a form that others may have saved over since. Fields that nobody touched keep what the
 * others saved.
 *
 * @param site the site as it stands now, with what was typed written over it
 * @param mine the site that the form showed, with what was typed written over it
 * @param conflicts the fields that both changed, each to something else
 */
record TypedSite(ObjectNode site, ObjectNode mine, List<ErrorView> conflicts) {
    /**
     * Reads a form.
     *
     * @param fields the form
     * @param shown the document that the form was made from
     * @param now the document that stands now
     */
    static TypedSite of(Map<String, List<String>> fields, JsonNode shown, JsonNode now) {
        TypedSite typed = new TypedSite(site(now), site(shown), new ArrayList<>());
        fields.forEach((field, values) -> {
            if (field.startsWith("/site/")) {
                typed.write(field, values.get(0).strip(), shown.path("site"));
            }
        });
        return typed;
    }

    private static ObjectNode site(JsonNode document) {
        return document.path("site") instanceof ObjectNode known
                ? known.deepCopy()
                : Document.mapper().createObjectNode();
    }

    private void write(String field, String typed, JsonNode shown) {
        FormData data = new FormData();
        List<String> steps = steps(field);
        String before = data.shown(steps, Site.class, shown).strip();
        String now = data.shown(steps, Site.class, site).strip();
        if (typed.equals(before)) {
            return;
        }
        data.write(steps, Site.class, site, typed);
        data.write(steps, Site.class, mine, typed);
        if (!now.equals(before) && !now.equals(typed)) {
            conflicts.add(new ErrorView(
                    Forms.id(field),
                    "Site",
                    "Somebody else has made this \"" + now
                            + "\" meanwhile. Yours stands in the field, not kept yet: save" + " again to let it stand.",
                    ""));
        }
    }

    /** Marks a field as assumed, in both. */
    void assume(String field) {
        FormData data = new FormData();
        data.assume(steps(field), Site.class, site);
        data.assume(steps(field), Site.class, mine);
    }

    private static List<String> steps(String field) {
        return FormData.steps(field.substring("/site".length()));
    }
}
