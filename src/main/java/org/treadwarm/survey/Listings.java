package org.treadwarm.survey;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A surface is listed once, by either side; the same name from opposite sides is most likely the same surface twice. Outdoors
 * and the ground list none.
 */
final class Listings {
    private final Survey survey;
    private final Findings findings;
    private final Map<Listing, Place> listed = new HashMap<>();

    /** A surface's name seen from an owner towards another side. */
    private record Listing(String owner, String to, String title) {}

    Listings(Survey survey, Findings findings) {
        this.survey = survey;
        this.findings = findings;
    }

    void check() {
        survey.spaces().forEach((name, space) -> check(Place.ROOT.at("/spaces").key(name), name, space.surfaces()));
        for (int i = 0; i < survey.rooms().size(); i++) {
            Room room = survey.rooms().get(i);
            check(Place.ROOT.item("/rooms", i), room.name(), room.surfaces());
        }
    }

    private void check(Place at, String owner, List<Surface> surfaces) {
        for (int i = 0; i < surfaces.size(); i++) {
            Surface surface = surfaces.get(i);
            if (surface.to().equals(Survey.OUTDOORS) || surface.to().equals(Survey.GROUND)) {
                continue;
            }
            Place own = at.item("/surfaces", i);
            Place opposite = listed.get(new Listing(surface.to(), owner, surface.title()));
            if (opposite != null && !surface.to().equals(owner)) {
                findings.add(
                        own.pointer(),
                        surface.title(),
                        "\"" + surface.title() + "\" between \"" + owner + "\" and \"" + surface.to()
                                + "\" is listed from the other side too, at " + opposite.pointer(),
                        "each surface once, from either side; or another name, if these are two surfaces");
            }
            listed.putIfAbsent(new Listing(owner, surface.to(), surface.title()), own);
        }
    }
}
