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

    void check(String owner, String name, boolean isRoom, List<Surface> surfaces) {
        for (int i = 0; i < surfaces.size(); i++) {
            surface(owner + "/surfaces/" + i, name, isRoom, surfaces.get(i));
        }
    }

    private void surface(String pointer, String owner, boolean isRoom, Surface surface) {
        assembly(pointer, surface.assembly());
        area(pointer, surface.area(), surface.width(), surface.height());
        boolean onGround = surface.to().equals(Survey.GROUND);
        if (onGround) {
            ground.surface(pointer, surface, isRoom);
        } else {
            otherSides.check(pointer, surface.to(), owner, isRoom);
            surface.ground()
                    .filter(given -> findings.clean(pointer, "/to"))
                    .ifPresent(given -> findings.add(
                            pointer + "/ground",
                            "ground",
                            "only a surface to ground lies on the ground",
                            "leave it out, or write \"to\": \"ground\""));
        }
        openings(pointer, surface, onGround);
    }

    private void openings(String pointer, Surface surface, boolean onGround) {
        double cut = 0;
        for (int i = 0; i < surface.openings().size(); i++) {
            Opening opening = surface.openings().get(i);
            String at = pointer + "/openings/" + i;
            assembly(at, opening.assembly());
            area(at, opening.area(), opening.width(), opening.height());
            cut += opening.totalArea();
        }
        if (cut > surface.grossArea() * (1 + 1e-12) && surface.grossArea() > 0) {
            findings.add(
                    pointer + "/openings",
                    sensible(cut) + " m2 of openings",
                    "the openings are larger than their surface",
                    "at most its area, " + sensible(surface.grossArea()) + " m2");
        }
        if (onGround && !surface.openings().isEmpty()) {
            findings.add(
                    pointer + "/openings",
                    surface.openings().size() + " openings",
                    "a surface on the ground has no openings",
                    "leave them out");
        }
    }

    private static String sensible(double area) {
        return Numbers.significant(area, 6);
    }

    private void area(String pointer, Optional<Reading> area, Optional<Reading> width, Optional<Reading> height) {
        boolean sides = width.isPresent() || height.isPresent();
        if (area.isPresent() && sides) {
            findings.add(
                    pointer + "/area", area.get().typed(), "area and width with height are both given", "one of them");
        } else if (area.isEmpty()) {
            if (!sides) {
                findings.missing(pointer + "/area", "the area is missing", "an area, or a width and a height");
            } else if (width.isEmpty()) {
                findings.missing(
                        pointer + "/width", "with a height, the width is needed too", "a width, or an area instead");
            } else if (height.isEmpty()) {
                findings.missing(
                        pointer + "/height", "with a width, the height is needed too", "a height, or an area instead");
            } else if (Extent.area(area, width, height) > 10000) {
                findings.add(
                        pointer + "/width",
                        width.get().typed(),
                        "width times height is more than 10 000 m2",
                        "at most 10 000 m2");
            }
        }
    }

    private void assembly(String owner, String name) {
        if (findings.clean(owner, "/assembly") && !survey.assemblies().containsKey(name)) {
            String hint = findings.hint(name, survey.assemblies()::keySet);
            findings.add(
                    owner + "/assembly",
                    name,
                    "no assembly is called \"" + name + "\"" + hint,
                    "the name of an assembly");
        }
    }
}
