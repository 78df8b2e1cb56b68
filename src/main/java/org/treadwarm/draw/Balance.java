package org.treadwarm.draw;

import java.util.List;
import java.util.Optional;

/**
 * A room's heat balance.
 *
 * @param room the room's name
 * @param paths the ways heat goes, in the order they are to be drawn from the top
 * @param totalWatts heat to be supplied in W, gains taken off
 * @param floor the heated floor; empty if the room has none
 */
public record Balance(String room, List<HeatPath> paths, double totalWatts, Optional<FloorHeat> floor) {
    /** @throws IllegalArgumentException if the total cannot be drawn */
    public Balance {
        paths = List.copyOf(paths);
        Checks.drawable("Total", totalWatts);
    }

    /** Sum of the paths by which heat goes out, in W. */
    double outWatts() {
        return paths.stream()
                .mapToDouble(HeatPath::watts)
                .filter(watts -> watts > 0)
                .sum();
    }

    /** Sum of the paths by which heat comes in, in W, as a positive number. */
    double gainWatts() {
        return 0
                - paths.stream()
                        .mapToDouble(HeatPath::watts)
                        .filter(watts -> watts < 0)
                        .sum();
    }
}
