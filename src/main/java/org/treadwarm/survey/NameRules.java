package org.treadwarm.survey;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;

/** Rooms and spaces have names of their own, and ids stand once in a survey. */
final class NameRules {
    private static final Pattern ID = Pattern.compile("[A-Za-z0-9-]{1,40}");

    private final Survey survey;
    private final Findings findings;
    private final Set<String> roomNames = new HashSet<>();
    private final Map<String, String> ids = new HashMap<>();

    NameRules(Survey survey, Findings findings) {
        this.survey = survey;
        this.findings = findings;
    }

    void check() {
        names();
        ids();
    }

    /** The names of the rooms that could be read; they are known once {@link #check} is done. */
    Set<String> roomNames() {
        return roomNames;
    }

    private void names() {
        if (survey.rooms().isEmpty() && findings.clean("/rooms")) {
            findings.add("/rooms", "[]", "there is no room yet", "at least one room");
        }
        if (survey.rooms().size() > Rules.MOST_ROOMS) {
            findings.add(
                    "/rooms",
                    survey.rooms().size() + " rooms",
                    "there are too many rooms",
                    "at most " + Rules.MOST_ROOMS);
        }
        survey.spaces().keySet().forEach(name -> reserved(Pointer.to("/spaces", name), name));
        Set<String> taken = new HashSet<>(survey.spaces().keySet());
        for (int i = 0; i < survey.rooms().size(); i++) {
            String pointer = "/rooms/" + i + "/name";
            String name = survey.rooms().get(i).name();
            if (findings.clean(pointer)) {
                reserved(pointer, name);
                if (!taken.add(name)) {
                    findings.add(
                            pointer, name, "another room or space has this name already", "a name that is used once");
                }
                roomNames.add(name);
            }
        }
    }

    private void reserved(String pointer, String name) {
        if (name.equals(Survey.OUTDOORS) || name.equals(Survey.GROUND)) {
            findings.add(pointer, name, "\"" + name + "\" has a meaning of its own here", "another name");
        }
    }

    private void ids() {
        for (int i = 0; i < survey.rooms().size(); i++) {
            Room room = survey.rooms().get(i);
            Place at = Place.ROOT.item("/rooms", i);
            id(at, room.id());
            ids(at, room.surfaces(), room.junctions());
        }
        survey.spaces()
                .forEach((name, space) -> ids(Place.ROOT.at("/spaces").key(name), space.surfaces(), space.junctions()));
    }

    private void ids(Place owner, List<Surface> surfaces, List<Junction> junctions) {
        for (int i = 0; i < surfaces.size(); i++) {
            Place at = owner.item("/surfaces", i);
            id(at, surfaces.get(i).id());
            List<Opening> openings = surfaces.get(i).openings();
            for (int k = 0; k < openings.size(); k++) {
                id(at.item("/openings", k), openings.get(k).id());
            }
        }
        for (int i = 0; i < junctions.size(); i++) {
            id(owner.item("/junctions", i), junctions.get(i).id());
        }
    }

    private void id(Place owner, Optional<String> id) {
        if (id.isEmpty()) {
            return;
        }
        String pointer = owner.pointer() + "/id";
        String text = id.get();
        if (!ID.matcher(text).matches()) {
            findings.add(pointer, text, "this is no id", "1 to 40 of the letters A-Z, a-z, digits and -");
        } else {
            String other = ids.putIfAbsent(text, pointer);
            if (other != null) {
                findings.add(pointer, text, "this id stands at " + other + " already", "an id that is used once");
            }
        }
    }
}
