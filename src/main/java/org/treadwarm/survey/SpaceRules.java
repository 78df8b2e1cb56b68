package org.treadwarm.survey;

/** What must hold for a space that is not a room of the survey: held, unheated, or known by a factor. */
final class SpaceRules {
    private final Findings findings;
    private final SurfaceRules surfaces;
    private final JunctionRules junctions;
    private final AirRules air;

    SpaceRules(Findings findings, SurfaceRules surfaces, JunctionRules junctions, AirRules air) {
        this.findings = findings;
        this.surfaces = surfaces;
        this.junctions = junctions;
        this.air = air;
    }

    void check(Place at, String name, Space space) {
        if (!findings.clean(at, "/kind")) {
            return;
        }
        if (space.kind() == SpaceKind.HELD) {
            held(at, space);
            return;
        }
        space.temperature()
                .ifPresent(temperature -> findings.add(
                        at,
                        "/temperature",
                        temperature.typed(),
                        "an unheated space finds its own temperature",
                        "leave it out, or make the space \"held\""));
        if (space.temperatureFactor().isPresent()) {
            forbidden(at, space, "a space with a temperature factor has nothing else");
            return;
        }
        surfaces.check(at, name, false, space.surfaces());
        junctions.check(at, name, space.junctions(), false, false);
        space.air().ifPresent(given -> {
            air.check(at.at("/air"), given);
            if (given.volume().isEmpty()) {
                findings.missing(
                        at, "/air/volume", "the air of a space needs its volume", "more than 0 m3, at most 100 000 m3");
            }
        });
    }

    private void held(Place at, Space space) {
        if (space.temperature().isEmpty()) {
            findings.missing(at, "/temperature", "a held space needs the temperature it is held at", "-60 to 60 °C");
        }
        forbidden(at, space, "a held space is known by its temperature alone");
        space.temperatureFactor()
                .ifPresent(factor -> findings.add(
                        at,
                        "/temperatureFactor",
                        factor.typed(),
                        "a held space has a temperature, not a factor",
                        "leave it out"));
    }

    private void forbidden(Place at, Space space, String why) {
        if (!space.surfaces().isEmpty()) {
            findings.add(at, "/surfaces", space.surfaces().size() + " surfaces", why, "leave them out");
        }
        if (!space.junctions().isEmpty()) {
            findings.add(at, "/junctions", space.junctions().size() + " junctions", why, "leave them out");
        }
        if (space.air().isPresent()) {
            findings.add(at, "/air", "air", why, "leave it out");
        }
    }
}
