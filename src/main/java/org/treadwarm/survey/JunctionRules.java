package org.treadwarm.survey;

import java.util.List;

/** What must hold for the junctions of a room or space. */
final class JunctionRules {
    private final Findings findings;
    private final OtherSides otherSides;

    JunctionRules(Findings findings, OtherSides otherSides) {
        this.findings = findings;
        this.otherSides = otherSides;
    }

    void check(Place owner, String name, List<Junction> junctions, boolean isRoom, boolean hasHeatedFloor) {
        for (int i = 0; i < junctions.size(); i++) {
            Junction junction = junctions.get(i);
            Place at = owner.item("/junctions", i);
            if (junction.to().equals(Survey.GROUND)) {
                findings.add(
                        at,
                        "/to",
                        junction.to(),
                        "a junction does not lead to the ground",
                        OtherSides.sides("outdoors"));
            } else {
                otherSides.check(at, junction.to(), name, isRoom);
            }
            if (junction.at() == JunctionPlace.HEATED_FLOOR && !hasHeatedFloor) {
                findings.add(
                        at,
                        "/at",
                        junction.at().word(),
                        "there is no heated floor here for the junction to be at",
                        "room");
            }
        }
    }
}
