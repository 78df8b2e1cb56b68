package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;

/** The heat that a room loses on every path except through its heated floor, W. */
final class HeatLoss {
    private final String room;
    private final List<Coupling> paths;
    private final double reheat;

    HeatLoss(JsonNode room, List<Coupling> couplings) {
        this.room = Fields.text(room, "name");
        this.paths = ordered(couplings);
        this.reheat = Fields.number(room, "reheat", 0) * Fields.number(room, "floorArea");
    }

    /** Own surfaces with their openings, surfaces heard from the other side, junctions likewise, air. */
    private List<Coupling> ordered(List<Coupling> couplings) {
        List<Coupling> ordered = new ArrayList<>();
        Predicate<Coupling> own = coupling -> coupling.from().equals(room);
        Predicate<Coupling> heard = coupling -> coupling.to().equals(room);
        Predicate<Coupling> junction = coupling -> coupling.kind() == Coupling.Kind.JUNCTION;
        couplings.stream().filter(own.and(Coupling::isPlane)).forEach(ordered::add);
        couplings.stream().filter(heard.and(Coupling::isPlane)).forEach(ordered::add);
        couplings.stream().filter(own.and(junction)).forEach(ordered::add);
        couplings.stream().filter(heard.and(junction)).forEach(ordered::add);
        couplings.stream()
                .filter(own.and(coupling -> coupling.kind() == Coupling.Kind.AIR))
                .forEach(ordered::add);
        return ordered;
    }

    List<Coupling> paths() {
        return paths;
    }

    double reheat() {
        return reheat;
    }

    /** The node at the other end of a path. */
    String beyond(Coupling path) {
        return path.beyond(room);
    }

    /** By how much the room is warmer than the other end of a path, K. */
    double difference(Coupling path, Conditions conditions) {
        return conditions.difference(room, path.beyond(room));
    }

    double heatFlow(Coupling path, Conditions conditions) {
        return path.conductance() * difference(path, conditions);
    }

    double transmission(Conditions conditions) {
        return sum(Coupling::isPlane, conditions);
    }

    double ofKind(Coupling.Kind kind, Conditions conditions) {
        return sum(path -> path.kind() == kind, conditions);
    }

    double total(Conditions conditions) {
        return transmission(conditions)
                + ofKind(Coupling.Kind.JUNCTION, conditions)
                + ofKind(Coupling.Kind.AIR, conditions)
                + reheat;
    }

    /** What flows in through planes from rooms and spaces, as a positive number. */
    double gainsFromNeighbours(Conditions conditions) {
        double gains = 0;
        for (Coupling path : paths) {
            String beyond = path.beyond(room);
            boolean neighbour = !beyond.equals(Couplings.OUTDOORS) && !beyond.equals(Couplings.GROUND);
            if (path.isPlane() && neighbour && heatFlow(path, conditions) < 0) {
                gains -= heatFlow(path, conditions);
            }
        }
        return gains;
    }

    private double sum(Predicate<Coupling> chosen, Conditions conditions) {
        return paths.stream()
                .filter(chosen)
                .mapToDouble(path -> heatFlow(path, conditions))
                .sum();
    }
}
