package org.treadwarm.checks;

import java.util.Collection;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Which computation answers which case, by the case's id or, for a family of cases, by how the id begins ("family-*"). A case
 * without a computation and a computation without a case are faults.
 */
final class Bindings {
    private static final Map<String, Computation> ALL = all();

    private Bindings() {}

    /** The computation of a case. */
    static Computation of(String caseId) {
        return ALL.get(key(caseId));
    }

    /** Throws unless every case has one computation and every computation has a case. */
    static void check(Collection<CheckCase> cases) {
        Set<String> used = new LinkedHashSet<>();
        Set<String> ids = new LinkedHashSet<>();
        for (CheckCase given : cases) {
            used.add(key(given.id()));
            if (!ids.add(given.id())) {
                throw new IllegalStateException("two cases are called " + given.id());
            }
        }
        Set<String> unused = new LinkedHashSet<>(ALL.keySet());
        unused.removeAll(used);
        if (!unused.isEmpty()) {
            throw new IllegalStateException("no case for the computations " + unused);
        }
    }

    private static String key(String caseId) {
        if (ALL.containsKey(caseId)) {
            return caseId;
        }
        List<String> families = ALL.keySet().stream()
                .filter(key -> key.endsWith("*") && caseId.startsWith(key.substring(0, key.length() - 1)))
                .toList();
        if (families.size() != 1) {
            throw new IllegalStateException("the computations of case " + caseId + " are " + families + ", not one");
        }
        return families.get(0);
    }

    private static Map<String, Computation> all() {
        Map<String, Computation> all = new HashMap<>();
        List.of(
                        LayerChecks.bindings(),
                        AirLayerChecks.bindings(),
                        GroundChecks.bindings(),
                        RoomChecks.bindings(),
                        MoistureChecks.bindings(),
                        UnitChecks.bindings(),
                        HeatedFloorChecks.bindings(),
                        WarmUpChecks.bindings(),
                        WaterFloorChecks.bindings(),
                        CircuitChecks.bindings(),
                        ElectricChecks.bindings(),
                        SectionChecks.bindings(),
                        TableChecks.bindings())
                .forEach(all::putAll);
        return Map.copyOf(all);
    }
}
