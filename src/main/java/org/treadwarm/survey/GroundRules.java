package org.treadwarm.survey;

import java.util.Optional;

/** What must hold where something lies on the ground. */
final class GroundRules {
    private final Survey survey;
    private final Findings findings;
    private boolean anyOnGround;

    GroundRules(Survey survey, Findings findings) {
        this.survey = survey;
        this.findings = findings;
    }

    /** Whether anything judged so far lies on the ground. */
    boolean anyOnGround() {
        return anyOnGround;
    }

    void surface(String pointer, Surface surface, boolean hasFloorArea) {
        anyOnGround = true;
        boolean givenUValue = Optional.ofNullable(survey.assemblies().get(surface.assembly()))
                .flatMap(Assembly::uValue)
                .isPresent();
        if (surface.ground().isEmpty()) {
            if (!givenUValue) {
                findings.missing(
                        pointer + "/ground",
                        "a surface to ground needs the slab it belongs to",
                        "kind, exposedPerimeter, wallThickness, soilConductivity");
            }
            return;
        }
        slab(pointer + "/ground", surface.ground().get());
        if (!hasFloorArea && surface.ground().get().area().isEmpty()) {
            findings.missing(
                    pointer + "/ground/area",
                    "a space has no floor area, so the slab's area is needed",
                    "more than 0 m2, at most 10 000 m2");
        }
    }

    void floor(String pointer, Ground ground) {
        anyOnGround = true;
        slab(pointer, ground);
    }

    private void slab(String pointer, Ground ground) {
        if (!findings.clean(pointer, "/kind")) {
            return;
        }
        boolean suspended = ground.kind() == GroundKind.SUSPENDED;
        only(pointer + "/floorHeight", ground.floorHeight().isPresent(), suspended, "0 to 1 000 m");
        only(pointer + "/wallUValue", ground.wallUValue().isPresent(), suspended, "0.01 to 20 W/(m2.K)");
        only(pointer + "/ventArea", ground.ventArea().isPresent(), suspended, "0 to 10 m2/m");
        only(pointer + "/windSpeed", ground.windSpeed().isPresent(), suspended, "0 to 60 m/s");
    }

    private void only(String pointer, boolean given, boolean suspended, String allowed) {
        if (suspended && !given) {
            findings.missing(pointer, "a suspended floor needs this", allowed);
        } else if (!suspended && given) {
            findings.add(pointer, "a value", "only a suspended floor has this", "leave it out");
        }
    }
}
