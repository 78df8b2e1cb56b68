package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;

/**
 * The whole calculation a second time, written straight from its description: slow and plain, and sharing nothing
 * with the program, so that the two can be compared. It expects a valid survey whose quantities are plain SI numbers
 * and whose layers name no material. The answer leaves out cautions, warnings, sources, loads and the method.
 */
public final class ReferenceChain {
    private final JsonNode survey;
    private final Network network;
    private final Conditions design;

    private ReferenceChain(JsonNode survey) {
        this.survey = survey;
        this.network = new Network(survey);
        this.design = network.at(Fields.number(survey.get("site"), "outdoorTemperature"));
    }

    /**
     * The answer to a survey.
     *
     * @throws IllegalArgumentException when something that the calculation needs is missing or unknown
     */
    public static ObjectNode size(JsonNode survey) {
        return new ReferenceChain(survey).answer();
    }

    private ObjectNode answer() {
        ObjectNode answer = JsonNodeFactory.instance.objectNode();
        for (JsonNode room : Fields.list(survey, "rooms")) {
            answer.withArray("rooms").add(room(room));
        }
        answer.putArray("spaces");
        for (String space : network.floating()) {
            ObjectNode node = answer.withArray("spaces").addObject();
            node.put("name", space).put("temperature", design.of(space));
            putFromFloorAbove(node, space);
        }
        answer.set("total", total());
        return answer;
    }

    private ObjectNode room(JsonNode room) {
        ObjectNode node = JsonNodeFactory.instance.objectNode();
        node.put("name", Fields.text(room, "name"));
        node.set("heatLoss", HeatLossAnswer.of(loss(room), design));
        if (room.has("heatedFloor")) {
            node.set("floor", new FloorAnswer(survey, room, network).at(design));
        } else {
            node.putObject("floor").put("verdict", "no heated floor");
        }
        putFromFloorAbove(node, Fields.text(room, "name"));
        return node;
    }

    private HeatLoss loss(JsonNode room) {
        return new HeatLoss(room, network.couplings());
    }

    private void putFromFloorAbove(ObjectNode node, String receiver) {
        boolean receives = false;
        double sum = 0;
        for (JsonNode room : Fields.list(survey, "rooms")) {
            if (room.path("heatedFloor").path("to").asText().equals(receiver)) {
                HeatedFloor floor = new HeatedFloor(survey, room);
                sum += required(room, floor).downward() * floor.area();
                receives = true;
            }
        }
        if (receives) {
            node.put("fromFloorAbove", sum);
        }
    }

    private Section required(JsonNode room, HeatedFloor floor) {
        return floor.section(floor.requiredFlux(loss(room).total(design)), design);
    }

    private ObjectNode total() {
        double heatLoss = 0;
        double heaterPower = 0;
        double heatedArea = 0;
        double installedPower = 0;
        boolean installed = false;
        for (JsonNode room : Fields.list(survey, "rooms")) {
            heatLoss += loss(room).total(design);
            if (room.has("heatedFloor")) {
                HeatedFloor floor = new HeatedFloor(survey, room);
                heaterPower += required(room, floor).heaterFlux() * floor.area();
                heatedArea += floor.area();
                JsonNode heater = floor.json().path("heater");
                if (heater.has("density")) {
                    installedPower += Fields.number(heater, "density") * floor.area();
                    installed = true;
                }
            }
        }
        ObjectNode total = JsonNodeFactory.instance.objectNode();
        total.put("heatLoss", heatLoss).put("heaterPower", heaterPower).put("heatedArea", heatedArea);
        return installed ? total.put("installedPower", installedPower) : total;
    }
}
