package org.treadwarm.survey;

import java.util.HashSet;
import java.util.Set;

/** What surfaces, junctions and heated floors may lead to: outdoors, a space or another room. */
final class OtherSides {
    private final Survey survey;
    private final Findings findings;
    private final Set<String> roomNames;

    OtherSides(Survey survey, Findings findings, Set<String> roomNames) {
        this.survey = survey;
        this.findings = findings;
        this.roomNames = roomNames;
    }

    /** Checks what stands under {@code to} of an object. */
    void check(Place above, String to, String owner, boolean ownerIsRoom) {
        if (!findings.clean(above, "/to") || to.equals(Survey.OUTDOORS)) {
            return;
        }
        if (to.equals(owner)) {
            findings.add(above, "/to", to, "this leads back to where it comes from", sides("outdoors"));
            return;
        }
        Space space = survey.spaces().get(to);
        if (space == null && !roomNames.contains(to)) {
            findings.add(
                    above,
                    "/to",
                    to,
                    "no room or space is called \"" + to + "\"" + findings.hint(to, this::names),
                    sides("outdoors, ground"));
        } else if (space != null && space.temperatureFactor().isPresent() && !ownerIsRoom) {
            findings.add(
                    above,
                    "/to",
                    to,
                    "only rooms may look at a space that is known by its temperature factor",
                    "a space of its own temperature, a room, or outdoors");
        }
    }

    private Set<String> names() {
        Set<String> names = new HashSet<>(roomNames);
        names.addAll(survey.spaces().keySet());
        names.add(Survey.OUTDOORS);
        names.add(Survey.GROUND);
        return names;
    }

    static String sides(String fixed) {
        return fixed + ", or the name of a space or of another room";
    }
}
