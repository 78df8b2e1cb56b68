package org.treadwarm.sizing;

import java.util.List;
import org.treadwarm.sizing.Plan.Face;
import org.treadwarm.sizing.Plan.PathRef;

/** Where the numbers of a plan stand in the survey and in its answer. */
final class Addresses {
    private final Plan plan;
    private final int[] ownPosition;
    private final int[] heardPosition;

    Addresses(Plan plan) {
        this.plan = plan;
        ownPosition = new int[plan.links.size()];
        heardPosition = new int[plan.links.size()];
        for (PathRef[] paths : plan.paths) {
            for (int i = 0; i < paths.length; i++) {
                (paths[i].heard() ? heardPosition : ownPosition)[paths[i].link()] = i;
            }
        }
    }

    static String survey(String pointer) {
        return "survey:" + pointer;
    }

    static String sizing(String pointer) {
        return "sizing:" + pointer;
    }

    /** A pointer into the answer for another outdoor temperature. */
    static String again(String pointer) {
        return "again:" + pointer;
    }

    /** Address of a reading that the plan takes in. */
    String input(int index) {
        return survey(plan.address(index));
    }

    boolean isRoom(int node) {
        return node < plan.rooms;
    }

    boolean floats(int node) {
        return plan.floating[node] != Stack.NONE;
    }

    /** Whether a node's temperature is known only by a temperature factor. */
    boolean isFactor(int node) {
        return plan.factor[node] != Stack.NONE;
    }

    /** Pointer of a room or floating space in the answer. */
    String pointer(int node) {
        return isRoom(node) ? "/rooms/" + node : "/spaces/" + plan.floating[node];
    }

    /** Pointer of a path in the answer of a room or floating space. */
    String path(int node, int position) {
        return pointer(node) + (isRoom(node) ? "/heatLoss" : "") + "/paths/" + position;
    }

    String path(int node, PathRef path) {
        return path(node, (path.heard() ? heardPosition : ownPosition)[path.link()]);
    }

    /** Address of a node's temperature; not for spaces known by a factor. */
    String temperature(int node) {
        if (isRoom(node)) {
            return sizing(pointer(node) + "/indoorTemperature");
        }
        return floats(node) ? sizing(pointer(node) + "/temperature") : input(plan.nodeTemperature[node]);
    }

    String outdoors() {
        return input(plan.site.outdoor());
    }

    /** The node on the other side of a path. */
    int other(PathRef path) {
        return path.heard()
                ? plan.links.get(path.link()).owner()
                : plan.links.get(path.link()).other();
    }

    /** Address of a number of an assembly towards one kind of other side. */
    String side(int face, String key) {
        Face wanted = plan.faces.get(face);
        List<Face> before = plan.faces.subList(0, face);
        long side = before.stream()
                .filter(other -> other.assembly() == wanted.assembly())
                .count();
        return sizing("/assemblies/" + wanted.assembly() + "/sides/" + side + "/" + key);
    }
}
