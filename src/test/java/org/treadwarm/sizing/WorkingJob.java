package org.treadwarm.sizing;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.treadwarm.wire.Json;

/** A job of Quillfen Floors with every feature of the survey; all of it is invented. */
final class WorkingJob {
    private static final String SITE_AND_ASSEMBLIES = """
            {"name": "Quillfen Floors, invented job",
             "site": {"outdoorTemperature": -9, "annualMeanTemperature": 8.5, "altitude": 430,
                      "groundwaterFactor": 1.15},
             "assemblies": {
               "wall / north": {"layers": [
                 {"material": "gypsum plasterboard", "thickness": 0.0125},
                 {"airGap": {"thickness": 0.025, "emissivities": [0.05, 0.9]}},
                 {"thickness": 0.05, "conductivity": 0.035,
                  "bridging": {"share": 0.1, "conductivity": 0.13, "frame": "battens"}},
                 {"thickness": 0.14, "conductivity": 0.035,
                  "bridging": {"share": 0.15, "conductivity": 0.13, "frame": "studs"}},
                 {"thickness": 0.018, "conductivity": 0.13, "bridging": {"share": 0.15, "resistance": 0.2, "frame": "studs"}},
                 {"resistance": 0.2}]},
               "party wall": {"insideCoefficient": 8, "outsideCoefficient": 20,
                 "layers": [{"thickness": 0.2, "conductivity": 0.8}]},
               "ceiling": {"heatFlow": "up", "layers": [{"airGap": {"thickness": 0.05}}, {"thickness": 0.1, "conductivity": 0.04}]},
               "deck": {"heatFlow": "down", "layers": [{"airGap": {"thickness": 0.03}}, {"thickness": 0.06, "conductivity": 0.04}]},
               "warm deck": {"heatFlow": "down", "insideCoefficient": 6, "layers": [{"resistance": 5}]},
               "window": {"uValue": 1.3},
               "old slab": {"uValue": 0.6}},
            """;

    private static final String SPACES = """
             "spaces": {
               "loft": {"kind": "unheated", "air": {"changeRate": 1, "volume": 40},
                 "surfaces": [{"assembly": "ceiling", "area": 45, "to": "outdoors"},
                              {"assembly": "party wall", "width": 4, "height": 2.5, "to": "garage"}]},
               "garage": {"kind": "unheated",
                 "surfaces": [{"name": "garage wall", "assembly": "party wall", "area": 30, "to": "outdoors",
                               "openings": [{"assembly": "window", "width": 2.2, "height": 2, "count": 2}]},
                              {"assembly": "old slab", "area": 18, "to": "ground"}]},
               "neighbour": {"kind": "held", "temperature": 23},
               "stair": {"kind": "unheated", "temperatureFactor": 0.4}},
            """;

    private static final String ROOMS = """
             "rooms": [
               {"name": "kitchen", "indoorTemperature": 20, "floorArea": 18, "height": 2.4, "reheat": 6, "allowance": 0.1,
                "otherHeat": 150, "air": {"changeRate": 0.5},
                "surfaces": [
                  {"assembly": "wall / north", "area": 14, "to": "outdoors",
                   "openings": [{"assembly": "window", "area": 1.2, "count": 2}, {"assembly": "window", "width": 1, "height": 2.1}]},
                  {"name": "to stair", "assembly": "party wall", "area": 5, "to": "stair"},
                  {"name": "to bath", "assembly": "party wall", "area": 8, "to": "bath"},
                  {"assembly": "ceiling", "area": 18, "to": "loft"},
                  {"name": "rest of floor", "assembly": "deck", "area": 4, "to": "ground",
                   "ground": {"kind": "slab", "exposedPerimeter": 9, "wallThickness": 0.3, "soilConductivity": 2}}],
                "junctions": [{"psi": 0.05, "length": 7, "at": "room"}, {"psi": 0.2, "length": 8, "at": "heated floor"},
                              {"psi": 0.1, "length": 2, "at": "heated floor", "to": "stair"}],
                "heatedFloor": {"area": 14, "zone": "occupied", "maximumSurfaceTemperature": 27,
                  "above": [{"material": "hardwood", "thickness": 0.015, "maximumTemperature": 19},
                            {"material": "cement screed", "thickness": 0.06, "maximumTemperature": 45}],
                  "below": [{"name": "boards", "thickness": 0.1, "conductivity": 0.035, "density": 30}],
                  "ground": {"kind": "slab", "exposedPerimeter": 9, "wallThickness": 0.3, "soilConductivity": 2},
                  "heater": {"kind": "electric", "density": 120}}},
               {"name": "bath", "indoorTemperature": 24, "floorArea": 6, "height": 2.4, "air": {"flow": 0.01},
                "surfaces": [{"name": "outer", "assembly": "wall / north", "width": 3, "height": 2.4, "to": "outdoors",
                              "openings": [{"assembly": "window", "area": 0.6}]},
                             {"assembly": "deck", "area": 1, "to": "ground",
                              "ground": {"kind": "suspended", "area": 60, "exposedPerimeter": 30, "wallThickness": 0.3,
                                         "soilConductivity": 2, "floorHeight": 0.4, "wallUValue": 1.5, "ventArea": 0.002,
                                         "windSpeed": 4, "shielding": "exposed"}}],
                "heatedFloor": {"area": 4.5, "zone": "bathroom",
                  "above": [{"thickness": 0.01, "conductivity": 1.3, "density": 2300}],
                  "below": [{"airGap": {"thickness": 0.02}, "bridging": {"share": 0.1, "conductivity": 0.13}},
                            {"thickness": 0.12, "conductivity": 0.035, "density": 30,
                             "bridging": {"share": 0.12, "conductivity": 0.13}}],
                  "ground": {"kind": "suspended", "exposedPerimeter": 5, "wallThickness": 0.3, "soilConductivity": 2,
                             "floorHeight": 0.4, "wallUValue": 1.5, "ventArea": 0.002, "windSpeed": 4},
                  "heater": {"kind": "electric", "density": 150}}},
               {"name": "studio", "indoorTemperature": 21, "floorArea": 30, "height": 2.6,
                "air": {"supply": 0.02, "recovery": 0.8},
                "surfaces": [{"assembly": "wall / north", "area": 20, "to": "outdoors"},
                             {"assembly": "warm deck", "area": 3, "to": "ground",
                              "ground": {"kind": "slab", "exposedPerimeter": 20, "wallThickness": 0.3, "soilConductivity": 2}}],
                "heatedFloor": {"area": 24, "zone": "peripheral", "to": "garage",
                  "above": [{"resistance": 0.05}],
                  "below": [{"thickness": 0.1, "conductivity": 0.035, "bridging": {"share": 0.12, "conductivity": 0.13}}],
                  "heater": {"kind": "electric", "density": 100}}},
               {"name": "hall", "indoorTemperature": 15, "floorArea": 8, "height": 2.6,
                "air": {"changeRate": 0.5, "volume": 18},
                "surfaces": [{"name": "shared", "assembly": "party wall", "area": 6, "to": "neighbour"},
                             {"name": "hatch wall", "assembly": "party wall", "width": 5, "height": 2.4, "to": "garage",
                              "openings": [{"name": "hatch", "assembly": "window", "area": 0.8}]}],
                "junctions": [{"psi": 0.1, "length": 2.4, "to": "kitchen"}, {"psi": 0.1, "length": 2.4, "to": "garage"}],
                "heatedFloor": {"area": 6, "zone": "occupied", "to": "kitchen", "below": [{"resistance": 0.1}],
                  "heater": {"kind": "electric", "density": 10}}},
               {"name": "store", "indoorTemperature": 10, "floorArea": 5, "height": 2.6,
                "surfaces": [{"name": "glass", "assembly": "window", "area": 4, "to": "outdoors",
                              "openings": [{"assembly": "window", "area": 4}]}],
                "junctions": [{"psi": 0.9, "length": 9, "at": "heated floor"}],
                "heatedFloor": {"area": 4, "zone": "occupied", "to": "outdoors",
                  "heater": {"kind": "electric", "density": 20}}}]}
            """;

    private WorkingJob() {}

    static ObjectNode survey() {
        try {
            return (ObjectNode) Json.mapper().readTree(SITE_AND_ASSEMBLIES + SPACES + ROOMS);
        } catch (JsonProcessingException e) {
            throw new AssertionError(e);
        }
    }
}
