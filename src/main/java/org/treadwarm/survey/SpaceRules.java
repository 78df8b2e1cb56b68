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

    void check(String pointer, String name, Space space) {
        if (!findings.clean(pointer, "/kind")) {
            return;
        }
        if (space.kind() == SpaceKind.HELD) {
            held(pointer, space);
            return;
        }
        space.temperature()
                .ifPresent(temperature -> findings.add(
                        pointer + "/temperature",
                        temperature.typed(),
                        "an unheated space finds its own temperature",
                        "leave it out, or make the space \"held\""));
        if (space.temperatureFactor().isPresent()) {
            forbidden(pointer, space, "a space with a temperature factor has nothing else");
            return;
        }
        surfaces.check(pointer, name, false, space.surfaces());
        junctions.check(pointer, name, space.junctions(), false, false);
        space.air().ifPresent(given -> {
            air.check(pointer + "/air", given);
            if (given.volume().isEmpty()) {
                findings.missing(
                        pointer + "/air/volume",
                        "the air of a space needs its volume",
                        "more than 0 m3, at most 100 000 m3");
            }
        });
    }

    private void held(String pointer, Space space) {
        if (space.temperature().isEmpty()) {
            findings.missing(
                    pointer + "/temperature", "a held space needs the temperature it is held at", "-60 to 60 °C");
        }
        forbidden(pointer, space, "a held space is known by its temperature alone");
        space.temperatureFactor()
                .ifPresent(factor -> findings.add(
                        pointer + "/temperatureFactor",
                        factor.typed(),
                        "a held space has a temperature, not a factor",
                        "leave it out"));
    }

    private void forbidden(String pointer, Space space, String why) {
        if (!space.surfaces().isEmpty()) {
            findings.add(pointer + "/surfaces", space.surfaces().size() + " surfaces", why, "leave them out");
        }
        if (!space.junctions().isEmpty()) {
            findings.add(pointer + "/junctions", space.junctions().size() + " junctions", why, "leave them out");
        }
        if (space.air().isPresent()) {
            findings.add(pointer + "/air", "air", why, "leave it out");
        }
    }
}
