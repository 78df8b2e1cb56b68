package org.treadwarm.intake;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;
import org.treadwarm.survey.Problem;

/** What must hold between the parts of a survey: one change breaks one rule, found at its place. */
class RulesTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "/rooms | [] | /rooms | no room yet",
                "/rooms/1/name | 'parlour' | /rooms/1/name | has this name already",
                "/rooms/1/name | ' parlour ' | /rooms/1/name | has this name already",
                "/rooms/1/name | 'loft' | /rooms/1/name | has this name already",
                "/rooms/1/name | 'outdoors' | /rooms/1/name | meaning of its own",
                "/rooms/1/name | '' | /rooms/1/name | empty",
                "/spaces/ground | {'kind': 'held', 'temperature': 9} | /spaces/ground | meaning of its own",
                "/rooms/1/id | 'parlour' | /rooms/1/id | stands at",
                "/rooms/1/surfaces/0/id | 'bay' | /rooms/1/surfaces/0/id | stands at",
                "/rooms/0/junctions/1/id | 'verge' | /spaces/loft/junctions/0/id | stands at",
                "/rooms/1/id | 'a b' | /rooms/1/id | no id",
                "/rooms/1/id | 'a2345678901234567890123456789012345678901' | /rooms/1/id | too long",
                "/assemblies/window/layers | [{'resistance': 1}] | /assemblies/window | by its layers or by its U-value",
                "/assemblies/window | {} | /assemblies/window | needs its layers or its U-value",
                "/assemblies/roof/layers | [] | /assemblies/roof | needs its layers or its U-value",
                "/assemblies/roof/layers/0/conductivity | 1 | /assemblies/roof/layers/0 | two ways",
                "/assemblies/timber wall/layers/3/thickness | 1 | /assemblies/timber wall/layers/3 | two ways",
                "/assemblies/timber wall/layers/3/resistance | 1 | /assemblies/timber wall/layers/3 | two ways",
                "/assemblies/timber wall/layers/3/material | 'EPS' | /assemblies/timber wall/layers/3 | two ways",
                "/assemblies/roof/layers/0 | {} | /assemblies/roof/layers/0 | how well this layer insulates",
                "/assemblies/roof/layers/0 | {'thickness': 0.1} | /assemblies/roof/layers/0 | conductivity or the material",
                "/assemblies/roof/layers/0 | {'conductivity': 1} | /assemblies/roof/layers/0/thickness | thickness is missing",
                "/assemblies/roof/layers/0 | {'material': 'EPS'} | /assemblies/roof/layers/0/thickness | thickness is missing",
                "/assemblies/roof/layers/0 | {'material': 'ceramic tiel', 'thickness': 1} | /assemblies/roof/layers/0/material | did you mean \"ceramic tile\"",
                "/assemblies/roof/layers/0 | {'material': 'aerogel (range)', 'thickness': 1} | /assemblies/roof/layers/0/conductivity | only a range",
                "/assemblies/timber wall/layers/3/airGap/emissivities | [0.9] | /assemblies/timber wall/layers/3/airGap/emissivities | two faces",
                "/assemblies/timber wall/layers/3/airGap/emissivities | [0.9, 0.9, 0.9] | /assemblies/timber wall/layers/3/airGap/emissivities | two faces",
                "/assemblies/timber wall/layers/1/bridging/resistance | 1 | /assemblies/timber wall/layers/1/bridging | conductivity or by its resistance",
                "/assemblies/timber wall/layers/2/bridging | {'share': 0.1} | /assemblies/timber wall/layers/2/bridging | conductivity or by its resistance",
                "/assemblies/timber wall/layers/2/bridging | {'share': 0.1, 'conductivity': 0.13} | /assemblies/timber wall/layers/2/bridging/conductivity | no thickness",
                "/assemblies/timber wall/layers/2/bridging | {'share': 0.1, 'resistance': 1, 'frame': 'studs'} | /assemblies/timber wall/layers/2/bridging/share | one share",
                "/rooms/0/heatedFloor/above/0/bridging | {'share': 0.1, 'resistance': 1} | /rooms/0/heatedFloor/above/0/bridging | above the heater",
                "/spaces/neighbour/surfaces | [{'assembly': 'roof', 'area': 1, 'to': 'outdoors'}] | /spaces/neighbour/surfaces | by its temperature alone",
                "/spaces/neighbour/junctions | [{'psi': 1, 'length': 1}] | /spaces/neighbour/junctions | by its temperature alone",
                "/spaces/neighbour/air | {'changeRate': 1, 'volume': 9} | /spaces/neighbour/air | by its temperature alone",
                "/spaces/neighbour/temperatureFactor | 0.5 | /spaces/neighbour/temperatureFactor | not a factor",
                "/spaces/loft/temperature | 5 | /spaces/loft/temperature | finds its own",
                "/spaces/stair/temperature | 5 | /spaces/stair/temperature | finds its own",
                "/spaces/stair/surfaces | [{'assembly': 'roof', 'area': 1, 'to': 'outdoors'}] | /spaces/stair/surfaces | nothing else",
                "/spaces/stair/junctions | [{'psi': 1, 'length': 1}] | /spaces/stair/junctions | nothing else",
                "/spaces/stair/air | {'changeRate': 1, 'volume': 9} | /spaces/stair/air | nothing else",
                "/spaces/loft/surfaces/1/to | 'stair' | /spaces/loft/surfaces/1/to | only rooms",
                "/spaces/loft/junctions/0/to | 'stair' | /spaces/loft/junctions/0/to | only rooms",
                "/rooms/0/surfaces/0/assembly | 'timber wal' | /rooms/0/surfaces/0/assembly | did you mean \"timber wall\"",
                "/rooms/0/surfaces/0/openings/0/assembly | 'widnow' | /rooms/0/surfaces/0/openings/0/assembly | did you mean \"window\"",
                "/rooms/0/surfaces/0/to | 'outdors' | /rooms/0/surfaces/0/to | did you mean \"outdoors\"",
                "/rooms/0/surfaces/0/to | 'Garage' | /rooms/0/surfaces/0/to | did you mean \"garage\"",
                "/rooms/0/surfaces/0/to | 'parlour' | /rooms/0/surfaces/0/to | back to where it comes from",
                "/spaces/loft/surfaces/1/to | 'loft' | /spaces/loft/surfaces/1/to | back to where it comes from",
                "/rooms/0/surfaces/0/width | 1 | /rooms/0/surfaces/0/area | both given",
                "/rooms/0/surfaces/0/openings/0/height | 1 | /rooms/0/surfaces/0/openings/0/area | both given",
                "/rooms/1/surfaces/0 | {'assembly': 'roof', 'to': 'outdoors', 'width': 200, 'height': 200} | /rooms/1/surfaces/0/width | more than 10 000",
                "/rooms/0/surfaces/0/ground | {'kind': 'slab', 'exposedPerimeter': 9, 'wallThickness': 0.3, 'soilConductivity': 2} | /rooms/0/surfaces/0/ground | only a surface to ground",
                "/rooms/0/surfaces/0/openings/0/count | 10 | /rooms/0/surfaces/0/openings | larger than their surface",
                "/rooms/0/surfaces/4/openings | [{'assembly': 'window', 'area': 1}] | /rooms/0/surfaces/4/openings | no openings",
                "/rooms/0/surfaces/4/ground/floorHeight | 0.4 | /rooms/0/surfaces/4/ground/floorHeight | only a suspended floor",
                "/rooms/0/surfaces/4/ground/exposedPerimeter | 0 | /rooms/0/surfaces/4/ground/exposedPerimeter | outside what is possible",
                "/spaces/garage/surfaces/1 | {'name': 'garage wall', 'assembly': 'roof', 'area': 1, 'to': 'parlour'} | /rooms/0/surfaces/2 | listed from the other side",
                "/rooms/0/heatedFloor/heater/glycol | 0.2 | /rooms/0/heatedFloor/heater/glycol | only warm water may hold glycol",
                "/rooms/0/heatedFloor/heater/manifold | 'attic' | /rooms/0/heatedFloor/heater/manifold | only warm water comes",
                "/rooms/0/heatedFloor/heater/manifoldDrop | 6000 | /rooms/0/heatedFloor/heater/manifoldDrop | only warm water comes",
                "/rooms/1/heatedFloor/heater | {'kind': 'water', 'spacing': 0.1, 'manifold': 'attic', 'glycol': 0.25, 'manifoldDrop': 5000} | /rooms/2/heatedFloor/heater/manifoldDrop | the same manifold feeds",
                "/rooms/2/heatedFloor/heater/glycol | 0.1 | /rooms/2/heatedFloor/heater/glycol | so weak a mixture",
                "/rooms/1/heatedFloor/heater | {'kind': 'water', 'spacing': 0.1, 'manifold': 'attic'} | /rooms/2/heatedFloor/heater/glycol | the same liquid flows through",
                "/rooms/2/heatedFloor/parts/1/area | 8 | /rooms/2/heatedFloor/parts | not the whole heated area of 11.5 m2",
                "/rooms/2/heatedFloor/parts/0/spacing | 0.017 | /rooms/2/heatedFloor/parts/0/spacing | inside one another",
                "/rooms/2/heatedFloor/heater | {'kind': 'water'} | /rooms/2/heatedFloor/parts/1/spacing | so it needs their spacing",
                "/rooms/1/heatedFloor/parts | [{'area': 4.5, 'zone': 'bathroom', 'spacing': 0.1}] | /rooms/1/heatedFloor/heater/density | power per metre",
                "/rooms/0/junctions/0/to | 'ground' | /rooms/0/junctions/0/to | not lead to the ground",
                "/rooms/0/junctions/0/to | 'parlour' | /rooms/0/junctions/0/to | back to where it comes from",
                "/rooms/0/junctions/0/to | 'cellar' | /rooms/0/junctions/0/to | no room or space",
                "/spaces/loft/junctions/0/at | 'heated floor' | /spaces/loft/junctions/0/at | no heated floor here",
                "/rooms/1/air/flow | 0.01 | /rooms/1/air | one of a change rate",
                "/rooms/1/air | {} | /rooms/1/air | one of a change rate",
                "/rooms/1/air/recovery | 0.5 | /rooms/1/air/recovery | only from a supply",
                "/rooms/1/air | {'supply': 0.01} | /rooms/1/air/recovery | share of heat recovered",
                "/rooms/0/heatedFloor/to | 'outdoors' | /rooms/0/heatedFloor | either on the ground or over",
                "/rooms/1/heatedFloor/to | 'ground' | /rooms/1/heatedFloor/to | described by \"ground\"",
                "/rooms/1/heatedFloor/to | 'bath' | /rooms/1/heatedFloor/to | back to where it comes from",
                "/rooms/1/heatedFloor/to | 'cellar' | /rooms/1/heatedFloor/to | no room or space",
                "/rooms/2/heatedFloor/heater/density | 100 | /rooms/2/heatedFloor/heater/density | only an electric heater",
            })
    void aBrokenRuleIsFoundAtItsPlace(String changed, String value, String expected, String message) {
        ObjectNode survey = Surveys.everything();
        Trees.set(survey, changed, Trees.json(value));
        List<Problem> problems = Surveys.problems(survey);
        assertThat(problems).extracting(Problem::pointer).contains(expected);
        assertThat(problems)
                .filteredOn(problem -> problem.pointer().equals(expected))
                .allSatisfy(problem -> assertThat(problem.message()).contains(message));
    }

    @Test
    void aJunctionAtAHeatedFloorNeedsOne() {
        ObjectNode survey = Surveys.everything();
        Trees.remove(survey, "/rooms/0/heatedFloor");
        assertThat(Surveys.problems(survey)).extracting(Problem::pointer).containsExactly("/rooms/0/junctions/2/at");
    }

    @Test
    void framesInTheTwelvesCrossAndMoreAreRefused() {
        ObjectNode survey = Surveys.everything();
        ArrayNode layers = (ArrayNode) survey.at("/assemblies/roof/layers");
        while (layers.size() < 12) {
            layers.add(Trees.json("{'resistance': 0.5}"));
        }
        layers.forEach(layer -> ((ObjectNode) layer).set("bridging", Trees.json("{'share': 0.1, 'resistance': 0.2}")));
        assertThat(Surveys.problems(survey)).isEmpty();
        layers.add(Trees.json("{'resistance': 0.5, 'bridging': {'share': 0.1, 'resistance': 0.2}}"));
        assertThat(Surveys.problems(survey)).extracting(Problem::pointer).containsExactly("/assemblies/roof/layers");
    }

    @Test
    void surfacesOfOneNameFromTheSameSideMayRepeat() {
        ObjectNode survey = Surveys.everything();
        Trees.set(survey, "/rooms/1/surfaces/1/name", Trees.json("'bath wall'"));
        Trees.set(survey, "/rooms/1/surfaces/1/to", Trees.json("'outdoors'"));
        assertThat(Surveys.problems(survey)).isEmpty();
    }

    @Test
    void spacesThatLeadOnlyToEachOtherLeadNowhere() {
        ObjectNode survey = Surveys.studio();
        Trees.set(
                survey,
                "/spaces/hut",
                Trees.json("{'kind': 'unheated', 'surfaces': [{'assembly': 'slates', 'area': 4, 'to': 'shed'}]}"));
        Trees.set(survey, "/spaces/shed", Trees.json("{'kind': 'unheated'}"));
        assertThat(Surveys.problems(survey))
                .extracting(Problem::pointer)
                .containsExactlyInAnyOrder("/spaces/hut", "/spaces/shed");
        Trees.set(survey, "/spaces/shed", Trees.json("{'kind': 'unheated', 'air': {'changeRate': 1, 'volume': 9}}"));
        assertThat(Surveys.problems(survey)).isEmpty();
    }

    @Test
    void aSpaceWithNothingAtAllLeadsNowhere() {
        ObjectNode survey = Surveys.studio();
        Trees.set(survey, "/spaces/hut", Trees.json("{'kind': 'unheated'}"));
        assertThat(Surveys.problems(survey)).extracting(Problem::pointer).containsExactly("/spaces/hut");
    }

    @Test
    void aSurfaceOfAGivenUValueOnGroundNeedsNoSlab() {
        ObjectNode survey = Surveys.everything();
        Trees.set(survey, "/rooms/0/surfaces/4/assembly", Trees.json("'old door'"));
        Trees.remove(survey, "/rooms/0/surfaces/4/ground");
        assertThat(Surveys.problems(survey)).isEmpty();
    }

    @Test
    void theAnnualMeanIsNeededOnlyOnTheGround() {
        ObjectNode survey = (ObjectNode) Trees.json("{'site': {'outdoorTemperature': -9}, 'rooms': [{'name': 'a',"
                + " 'indoorTemperature': 20, 'floorArea': 9, 'height': 2.5}]}");
        assertThat(Surveys.problems(survey)).isEmpty();
    }
}
