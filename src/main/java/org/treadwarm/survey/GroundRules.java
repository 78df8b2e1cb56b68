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

    void surface(Place at, Surface surface, boolean hasFloorArea) {
        anyOnGround = true;
        boolean givenUValue = Optional.ofNullable(survey.assemblies().get(surface.assembly()))
                .flatMap(Assembly::uValue)
                .isPresent();
        if (surface.ground().isEmpty()) {
            if (!givenUValue) {
                findings.missing(
                        at,
                        "/ground",
                        "a surface to ground needs the slab it belongs to",
                        "kind, exposedPerimeter, wallThickness, soilConductivity");
            }
            return;
        }
        slab(at.at("/ground"), surface.ground().get());
        if (!hasFloorArea && surface.ground().get().area().isEmpty()) {
            findings.missing(
                    at,
                    "/ground/area",
                    "a space has no floor area, so the slab's area is needed",
                    "more than 0 m2, at most 10 000 m2");
        }
    }

    void floor(Place at, Ground ground) {
        anyOnGround = true;
        slab(at, ground);
    }

    private void slab(Place at, Ground ground) {
        if (!findings.clean(at, "/kind")) {
            return;
        }
        boolean suspended = ground.kind() == GroundKind.SUSPENDED;
        only(at, "/floorHeight", ground.floorHeight().isPresent(), suspended, "0 to 1 000 m");
        only(at, "/wallUValue", ground.wallUValue().isPresent(), suspended, "0.01 to 20 W/(m2.K)");
        only(at, "/ventArea", ground.ventArea().isPresent(), suspended, "0 to 10 m2/m");
        only(at, "/windSpeed", ground.windSpeed().isPresent(), suspended, "0 to 60 m/s");
    }

    private void only(Place at, String below, boolean given, boolean suspended, String allowed) {
        if (suspended && !given) {
            findings.missing(at, below, "a suspended floor needs this", allowed);
        } else if (!suspended && given) {
            findings.add(at, below, "a value", "only a suspended floor has this", "leave it out");
        }
    }
}
