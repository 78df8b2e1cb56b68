package org.treadwarm.survey;

/** What must hold for the heated floor of a room. */
final class FloorRules {
    private final Findings findings;
    private final OtherSides otherSides;
    private final GroundRules ground;

    FloorRules(Findings findings, OtherSides otherSides, GroundRules ground) {
        this.findings = findings;
        this.otherSides = otherSides;
        this.ground = ground;
    }

    void check(String pointer, Room room, HeatedFloor floor) {
        boolean judged = findings.clean(pointer, "/ground") && findings.clean(pointer, "/to");
        if (floor.ground().isPresent() == floor.to().isPresent() && judged) {
            findings.add(
                    pointer,
                    floor.to().isPresent() ? "ground and to" : "neither ground nor to",
                    "a heated floor lies either on the ground or over something",
                    "exactly one of ground and to");
        }
        floor.ground().ifPresent(slab -> ground.floor(pointer + "/ground", slab));
        floor.to().ifPresent(to -> {
            if (to.equals(Survey.GROUND)) {
                findings.add(
                        pointer + "/to",
                        to,
                        "a heated floor on the ground is described by \"ground\"",
                        "outdoors, or the name of a space or of another room");
            } else {
                otherSides.check(pointer + "/to", to, room.name(), true);
            }
        });
        layers(pointer, floor);
        heater(pointer, floor);
    }

    private void layers(String pointer, HeatedFloor floor) {
        LayerRules layers = new LayerRules(findings);
        layers.layers(pointer + "/above", floor.above());
        layers.layers(pointer + "/below", floor.below());
        for (int i = 0; i < floor.above().size(); i++) {
            if (floor.above().get(i).bridging().isPresent()) {
                findings.add(
                        pointer + "/above/" + i + "/bridging",
                        "framing",
                        "layers above the heater cannot be crossed by framing",
                        "leave it out");
            }
        }
    }

    private void heater(String pointer, HeatedFloor floor) {
        floor.heater()
                .filter(heater ->
                        heater.kind() == HeaterKind.WATER && heater.density().isPresent())
                .filter(heater -> findings.clean(pointer, "/heater/kind"))
                .ifPresent(heater -> findings.add(
                        pointer + "/heater/density",
                        heater.density().get().typed(),
                        "only an electric heater has an installed density",
                        "leave it out"));
    }
}
