package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.treadwarm.survey.FixedPart;
import org.treadwarm.survey.HeatingMat;
import org.treadwarm.survey.Junction;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Opening;
import org.treadwarm.survey.Surface;

/** What a part is in a few words, as typed, for when its form is folded. */
final class Facts {
    private Facts() {}

    static String of(JsonNode node, Class<?> type) {
        List<String> facts = new ArrayList<>();
        if (type == Surface.class) {
            area(facts, node);
            add(facts, "to ", node.path("to"), "");
            int openings = node.path("openings").size();
            if (openings > 0) {
                facts.add(openings == 1 ? "1 opening" : openings + " openings");
            }
        } else if (type == Opening.class) {
            area(facts, node);
            add(facts, "", node.path("count"), " of them");
        } else if (type == Junction.class) {
            add(facts, "psi ", node.path("psi"), "");
            add(facts, "", node.path("length"), " long");
            if (node.path("at").asText().equals("heated floor")) {
                facts.add("at the heated floor");
            }
        } else if (type == Layer.class) {
            add(facts, "", node.path("thickness"), "");
            add(facts, "", node.path("airGap").path("thickness"), " air gap");
            add(facts, "lambda ", node.path("conductivity"), "");
            add(facts, "R ", node.path("resistance"), "");
            add(facts, "framing ", node.path("bridging").path("share"), "");
        } else if (type == FixedPart.class) {
            add(facts, "", node.path("width"), " wide");
            add(facts, "", node.path("length"), " long");
        } else if (type == HeatingMat.class) {
            add(facts, "", node.path("area"), "");
            add(facts, "", node.path("power"), "");
        }
        return String.join(" · ", facts);
    }

    private static void area(List<String> facts, JsonNode node) {
        String width = Forms.shown(node.path("width"));
        String height = Forms.shown(node.path("height"));
        if (!width.isEmpty() && !height.isEmpty()) {
            facts.add(width + " x " + height);
        }
        add(facts, "", node.path("area"), "");
    }

    private static void add(List<String> facts, String before, JsonNode node, String after) {
        String text = Forms.shown(node);
        if (!text.isEmpty()) {
            facts.add(before + text + after);
        }
    }
}
