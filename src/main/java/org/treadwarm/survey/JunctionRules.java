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

    void check(String owner, String name, List<Junction> junctions, boolean isRoom, boolean hasHeatedFloor) {
        for (int i = 0; i < junctions.size(); i++) {
            Junction junction = junctions.get(i);
            String pointer = owner + "/junctions/" + i;
            if (junction.to().equals(Survey.GROUND)) {
                findings.add(
                        pointer + "/to",
                        junction.to(),
                        "a junction does not lead to the ground",
                        OtherSides.sides("outdoors"));
            } else {
                otherSides.check(pointer, junction.to(), name, isRoom);
            }
            if (junction.at() == JunctionPlace.HEATED_FLOOR && !hasHeatedFloor) {
                findings.add(
                        pointer + "/at",
                        junction.at().word(),
                        "there is no heated floor here for the junction to be at",
                        "room");
            }
        }
    }
}
