package org.treadwarm.survey;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Every floating space must be joined, through others if need be, to some known temperature. */
final class Connections {
    private final Survey survey;
    private final Map<String, List<String>> neighbours = new HashMap<>();
    private final Set<String> floating = new HashSet<>();
    private final Set<String> held = new HashSet<>();

    private Connections(Survey survey) {
        this.survey = survey;
    }

    static void check(Survey survey, Findings findings) {
        new Connections(survey).check(findings);
    }

    private void check(Findings findings) {
        survey.spaces().forEach((name, space) -> {
            if (space.floats()) {
                floating.add(name);
            }
        });
        if (floating.isEmpty()) {
            return;
        }
        if (floating.size() > Rules.MOST_FLOATING) {
            findings.add(
                    "/spaces",
                    floating.size() + " unheated spaces",
                    "too many unheated spaces float",
                    "at most " + Rules.MOST_FLOATING);
            return;
        }
        survey.spaces().forEach((name, space) -> {
            join(name, space.surfaces(), space.junctions());
            space.air().filter(Connections::moves).ifPresent(air -> join(name, Survey.OUTDOORS));
        });
        survey.rooms().forEach(room -> join(room.name(), room.surfaces(), room.junctions()));
        Set<String> reached = reach();
        for (String name : survey.spaces().keySet()) {
            if (floating.contains(name) && !reached.contains(name)) {
                findings.add(
                        Pointer.to("/spaces", name),
                        name,
                        "this unheated space leads nowhere: nothing joins it to outdoors, the ground, a room or a held space",
                        "at least one surface, junction or air that does");
            }
        }
    }

    private static boolean moves(Air air) {
        return air.changeRate().map(rate -> rate.value() > 0).orElse(false)
                || air.flow().map(flow -> flow.value() > 0).orElse(false)
                || air.supply().map(supply -> supply.value() > 0).orElse(false)
                        && air.recovery().map(share -> share.value() < 1).orElse(true);
    }

    private void join(String owner, List<Surface> surfaces, List<Junction> junctions) {
        surfaces.forEach(surface -> join(owner, surface.to()));
        junctions.forEach(junction -> {
            boolean conducts = junction.psi().value() * junction.length().value() > 0;
            if (conducts && junction.at() == JunctionPlace.ROOM) {
                join(owner, junction.to());
            }
        });
    }

    private void join(String a, String b) {
        boolean aFloats = floating.contains(a);
        boolean bFloats = floating.contains(b);
        if (aFloats && bFloats) {
            neighbours.computeIfAbsent(a, key -> new ArrayList<>()).add(b);
            neighbours.computeIfAbsent(b, key -> new ArrayList<>()).add(a);
        } else if (aFloats) {
            held.add(a);
        } else if (bFloats) {
            held.add(b);
        }
    }

    private Set<String> reach() {
        Set<String> reached = new HashSet<>(held);
        Deque<String> open = new ArrayDeque<>(held);
        while (!open.isEmpty()) {
            for (String next : neighbours.getOrDefault(open.poll(), List.of())) {
                if (reached.add(next)) {
                    open.add(next);
                }
            }
        }
        return reached;
    }
}
