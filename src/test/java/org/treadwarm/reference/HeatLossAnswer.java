package org.treadwarm.reference;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Locale;

/** A room's {@code heatLoss} in the answer. */
final class HeatLossAnswer {
    private HeatLossAnswer() {}

    static ObjectNode of(HeatLoss loss, Conditions conditions) {
        double total = loss.total(conditions);
        ObjectNode node = JsonNodeFactory.instance.objectNode();
        node.put("total", total);
        node.put("transmission", loss.transmission(conditions));
        node.put("junctions", loss.ofKind(Coupling.Kind.JUNCTION, conditions));
        node.put("air", loss.ofKind(Coupling.Kind.AIR, conditions));
        node.put("reheat", loss.reheat());
        node.put("gainsFromNeighbours", loss.gainsFromNeighbours(conditions));
        node.putArray("paths");
        for (Coupling path : loss.paths()) {
            node.withArray("paths").add(path(loss, path, conditions, total));
        }
        if (loss.reheat() > 0) {
            ObjectNode reheat = node.withArray("paths").addObject();
            reheat.put("name", "reheat").put("kind", "reheat").put("heatFlow", loss.reheat());
            putShare(reheat, loss.reheat(), total);
        }
        return node;
    }

    private static ObjectNode path(HeatLoss loss, Coupling path, Conditions conditions, double total) {
        ObjectNode node = JsonNodeFactory.instance.objectNode();
        double heatFlow = loss.heatFlow(path, conditions);
        node.put("name", path.name());
        node.put("to", loss.beyond(path));
        node.put("kind", path.kind().name().toLowerCase(Locale.ROOT));
        path.area().ifPresent(area -> node.put("area", area));
        path.uValue().ifPresent(uValue -> node.put("uValue", uValue));
        node.put("conductance", path.conductance());
        if (path.conductance() != 0) {
            node.put("temperatureDifference", loss.difference(path, conditions));
        }
        node.put("heatFlow", heatFlow);
        putShare(node, heatFlow, total);
        return node;
    }

    private static void putShare(ObjectNode node, double heatFlow, double total) {
        if (total > 0) {
            node.put("share", heatFlow / total);
        }
    }
}
