package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** What must hold for a surface and its openings. */
final class SurfaceRules {
    private final Survey survey;
    private final Findings findings;
    private final OtherSides otherSides;
    private final GroundRules ground;

    SurfaceRules(Survey survey, Findings findings, OtherSides otherSides, GroundRules ground) {
        this.survey = survey;
        this.findings = findings;
        this.otherSides = otherSides;
        this.ground = ground;
    }

    void check(Place owner, String name, boolean isRoom, List<Surface> surfaces) {
        for (int i = 0; i < surfaces.size(); i++) {
            surface(owner.item("/surfaces", i), name, isRoom, surfaces.get(i));
        }
    }

    private void surface(Place at, String owner, boolean isRoom, Surface surface) {
        assembly(at, surface.assembly());
        area(at, surface.area(), surface.width(), surface.height());
        boolean onGround = surface.to().equals(Survey.GROUND);
        if (onGround) {
            ground.surface(at, surface, isRoom);
        } else {
            otherSides.check(at, surface.to(), owner, isRoom);
            surface.ground()
                    .filter(given -> findings.clean(at, "/to"))
                    .ifPresent(given -> findings.add(
                            at,
                            "/ground",
                            "ground",
                            "only a surface to ground lies on the ground",
                            "leave it out, or write \"to\": \"ground\""));
        }
        openings(at, surface, onGround);
    }

    private void openings(Place at, Surface surface, boolean onGround) {
        double cut = 0;
        for (int i = 0; i < surface.openings().size(); i++) {
            Opening opening = surface.openings().get(i);
            Place own = at.item("/openings", i);
            assembly(own, opening.assembly());
            area(own, opening.area(), opening.width(), opening.height());
            cut += opening.totalArea();
        }
        if (cut > surface.grossArea() * (1 + 1e-12) && surface.grossArea() > 0) {
            findings.add(
                    at,
                    "/openings",
                    sensible(cut) + " m2 of openings",
                    "the openings are larger than their surface",
                    "at most its area, " + sensible(surface.grossArea()) + " m2");
        }
        if (onGround && !surface.openings().isEmpty()) {
            findings.add(
                    at,
                    "/openings",
                    surface.openings().size() + " openings",
                    "a surface on the ground has no openings",
                    "leave them out");
        }
    }

    private static String sensible(double area) {
        return Numbers.significant(area, 6);
    }

    private void area(Place at, Optional<Reading> area, Optional<Reading> width, Optional<Reading> height) {
        boolean sides = width.isPresent() || height.isPresent();
        if (area.isPresent() && sides) {
            findings.add(at, "/area", area.get().typed(), "area and width with height are both given", "one of them");
        } else if (area.isEmpty()) {
            if (!sides) {
                findings.missing(at, "/area", "the area is missing", "an area, or a width and a height");
            } else if (width.isEmpty()) {
                findings.missing(at, "/width", "with a height, the width is needed too", "a width, or an area instead");
            } else if (height.isEmpty()) {
                findings.missing(
                        at, "/height", "with a width, the height is needed too", "a height, or an area instead");
            } else if (Extent.area(area, width, height) > 10000) {
                findings.add(
                        at,
                        "/width",
                        width.get().typed(),
                        "width times height is more than 10 000 m2",
                        "at most 10 000 m2");
            }
        }
    }

    private void assembly(Place owner, String name) {
        if (findings.clean(owner, "/assembly") && !survey.assemblies().containsKey(name)) {
            String hint = findings.hint(name, survey.assemblies()::keySet);
            findings.add(
                    owner,
                    "/assembly",
                    name,
                    "no assembly is called \"" + name + "\"" + hint,
                    "the name of an assembly");
        }
    }
}
