package org.treadwarm.intake;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;
import org.treadwarm.survey.Problem;

/** What a survey must have and what it may leave out, on the invented survey that has everything. */
class RequiredKeysTest {
    @Test
    void theStoredSurveysAreAcceptedAndSized() {
        assertThat(Surveys.sized(Surveys.studio()).rooms()).hasSize(2);
        assertThat(Surveys.sized(Surveys.everything()).rooms()).hasSize(3);
    }

    @ParameterizedTest
    @CsvSource({
        "/site, /site",
        "/site/outdoorTemperature, /site/outdoorTemperature",
        "/site/annualMeanTemperature, /site/annualMeanTemperature",
        "/rooms, /rooms",
        "/rooms/0/name, /rooms/0/name",
        "/rooms/0/indoorTemperature, /rooms/0/indoorTemperature",
        "/rooms/0/floorArea, /rooms/0/floorArea",
        "/rooms/0/height, /rooms/0/height",
        "/rooms/0/surfaces/0/assembly, /rooms/0/surfaces/0/assembly",
        "/rooms/0/surfaces/0/to, /rooms/0/surfaces/0/to",
        "/rooms/0/surfaces/0/area, /rooms/0/surfaces/0/area",
        "/rooms/0/surfaces/2/width, /rooms/0/surfaces/2/width",
        "/rooms/0/surfaces/2/height, /rooms/0/surfaces/2/height",
        "/rooms/0/surfaces/4/ground, /rooms/0/surfaces/4/ground",
        "/rooms/0/surfaces/4/ground/kind, /rooms/0/surfaces/4/ground/kind",
        "/rooms/0/surfaces/4/ground/exposedPerimeter, /rooms/0/surfaces/4/ground/exposedPerimeter",
        "/rooms/0/surfaces/4/ground/wallThickness, /rooms/0/surfaces/4/ground/wallThickness",
        "/rooms/0/surfaces/4/ground/soilConductivity, /rooms/0/surfaces/4/ground/soilConductivity",
        "/rooms/0/surfaces/5/ground/floorHeight, /rooms/0/surfaces/5/ground/floorHeight",
        "/rooms/0/surfaces/5/ground/wallUValue, /rooms/0/surfaces/5/ground/wallUValue",
        "/rooms/0/surfaces/5/ground/ventArea, /rooms/0/surfaces/5/ground/ventArea",
        "/rooms/0/surfaces/5/ground/windSpeed, /rooms/0/surfaces/5/ground/windSpeed",
        "/rooms/0/surfaces/0/openings/0/assembly, /rooms/0/surfaces/0/openings/0/assembly",
        "/rooms/0/surfaces/0/openings/0/area, /rooms/0/surfaces/0/openings/0/area",
        "/rooms/0/surfaces/0/openings/1/width, /rooms/0/surfaces/0/openings/1/width",
        "/rooms/0/junctions/0/psi, /rooms/0/junctions/0/psi",
        "/rooms/0/junctions/0/length, /rooms/0/junctions/0/length",
        "/rooms/0/air/supply, /rooms/0/air",
        "/rooms/0/air/recovery, /rooms/0/air/recovery",
        "/rooms/1/air/changeRate, /rooms/1/air",
        "/rooms/0/heatedFloor/area, /rooms/0/heatedFloor/area",
        "/rooms/0/heatedFloor/zone, /rooms/0/heatedFloor/zone",
        "/rooms/0/heatedFloor/ground, /rooms/0/heatedFloor",
        "/rooms/1/heatedFloor/to, /rooms/1/heatedFloor",
        "/rooms/0/heatedFloor/heater/kind, /rooms/0/heatedFloor/heater/kind",
        "/rooms/0/heatedFloor/plan/width, /rooms/0/heatedFloor/plan/width",
        "/rooms/0/heatedFloor/plan/length, /rooms/0/heatedFloor/plan/length",
        "/rooms/0/heatedFloor/plan/fixed/0/width, /rooms/0/heatedFloor/plan/fixed/0/width",
        "/rooms/0/heatedFloor/plan/fixed/0/length, /rooms/0/heatedFloor/plan/fixed/0/length",
        "/rooms/0/heatedFloor/plan/fixed/0/x, /rooms/0/heatedFloor/plan/fixed/0/x",
        "/rooms/0/heatedFloor/plan/fixed/0/y, /rooms/0/heatedFloor/plan/fixed/0/y",
        "/rooms/1/heatedFloor/heater/voltage, /rooms/1/heatedFloor/heater/voltage",
        "/rooms/1/heatedFloor/heater/mats/0/area, /rooms/1/heatedFloor/heater/mats/0/area",
        "/rooms/1/heatedFloor/heater/mats/0/power, /rooms/1/heatedFloor/heater/mats/0/power",
        "/spaces/loft/kind, /spaces/loft/kind",
        "/spaces/loft/air/volume, /spaces/loft/air/volume",
        "/spaces/neighbour/temperature, /spaces/neighbour/temperature",
        "/spaces/garage/surfaces/0/ground/area, /spaces/garage/surfaces/0/ground/area",
        "/assemblies/window, /rooms/0/surfaces/0/openings/0/assembly",
        "/assemblies/window/uValue, /assemblies/window",
        "/assemblies/roof/layers, /assemblies/roof",
        "/assemblies/roof/layers/1/thickness, /assemblies/roof/layers/1/thickness",
        "/assemblies/roof/layers/1/conductivity, /assemblies/roof/layers/1",
        "/assemblies/roof/layers/0/resistance, /assemblies/roof/layers/0",
        "/assemblies/timber wall/layers/1/bridging/share, /assemblies/timber wall/layers/1/bridging/share",
        "/assemblies/timber wall/layers/1/bridging/conductivity, /assemblies/timber wall/layers/1/bridging",
        "/assemblies/timber wall/layers/3/airGap/thickness, /assemblies/timber wall/layers/3/airGap/thickness",
    })
    void aMissingKeyIsFoundAtItsPlace(String removed, String expected) {
        ObjectNode survey = Surveys.everything();
        Trees.remove(survey, removed);
        List<Problem> problems = Surveys.problems(survey);
        assertThat(problems).extracting(Problem::pointer).contains(expected);
        assertThat(problems).allSatisfy(problem -> {
            assertThat(problem.given()).isNotBlank();
            assertThat(problem.message()).isNotBlank();
            assertThat(problem.allowed()).isNotBlank();
        });
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/name",
                "/remark",
                "/site/altitude",
                "/site/groundSeasonFactor",
                "/site/groundwaterFactor",
                "/site/dimensions",
                "/site/reference",
                "/site/surveyedBy",
                "/site/surveyedOn",
                "/assemblies/timber wall/heatFlow",
                "/assemblies/timber wall/insideCoefficient",
                "/assemblies/timber wall/outsideCoefficient",
                "/assemblies/timber wall/layers/1/bridging",
                "/assemblies/timber wall/layers/1/bridging/frame",
                "/assemblies/timber wall/layers/1/density",
                "/assemblies/timber wall/layers/1/specificHeat",
                "/assemblies/timber wall/layers/3/airGap/direction",
                "/assemblies/timber wall/layers/3/airGap/emissivities",
                "/spaces/loft/air",
                "/spaces/loft/junctions",
                "/spaces/loft/surfaces/0/openings",
                "/rooms/0/id",
                "/rooms/0/surfaces",
                "/rooms/0/surfaces/0/name",
                "/rooms/0/surfaces/0/openings",
                "/rooms/0/surfaces/0/openings/0/count",
                "/rooms/0/surfaces/4/ground/area",
                "/rooms/0/surfaces/5/ground/shielding",
                "/rooms/0/junctions",
                "/rooms/0/junctions/1/to",
                "/rooms/0/junctions/1/at",
                "/rooms/0/air",
                "/rooms/0/air/volume",
                "/rooms/0/heatedFloor/above",
                "/rooms/0/heatedFloor/below",
                "/rooms/0/heatedFloor/heater",
                "/rooms/0/heatedFloor/heater/density",
                "/rooms/0/heatedFloor/heater/spacing",
                "/rooms/0/heatedFloor/maximumSurfaceTemperature",
                "/rooms/0/heatedFloor/plan",
                "/rooms/1/heatedFloor/heater/mats",
                "/rooms/1/heatedFloor/heater/mats/0/name",
                "/rooms/1/heatedFloor/heater/mats/0/count",
                "/rooms/0/heatedFloor/plan/fixed",
                "/rooms/0/heatedFloor/plan/fixed/0/name",
                "/rooms/0/heatedFloor/above/0/maximumTemperature",
                "/rooms/0/reheat",
                "/rooms/0/allowance",
                "/rooms/0/otherHeat",
                "/rooms/1/heatedFloor",
            })
    void theRestMayBeLeftOut(String removed) {
        ObjectNode survey = Surveys.everything();
        Trees.remove(survey, removed);
        assertThat(Surveys.problems(survey)).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            quoteCharacter = '`',
            value = {
                "/site/altitude, 0",
                "/site/altitude, '0 m'",
                "/site/groundSeasonFactor, 1.45",
                "/site/groundwaterFactor, 1",
                "/site/dimensions, 'internal'",
                "/assemblies/timber wall/heatFlow, 'horizontal'",
                "/assemblies/timber wall/layers/3/airGap/direction, 'horizontal'",
                "/rooms/0/surfaces/0/openings/0/count, 1",
                "/rooms/0/surfaces/4/ground/area, 30",
                "/rooms/0/surfaces/5/ground/shielding, 'average'",
                "/rooms/0/junctions/1/to, 'outdoors'",
                "/rooms/0/junctions/1/at, 'room'",
                "/rooms/0/air/volume, 75",
                "/rooms/0/reheat, 0",
                "/rooms/0/allowance, 0",
                "/rooms/0/otherHeat, 0",
            })
    void whatIsLeftOutHasTheDeclaredDefault(String pointer, String fallback) {
        ObjectNode given = Surveys.everything();
        Trees.set(given, pointer, Trees.json(fallback));
        ObjectNode leftOut = Surveys.everything();
        Trees.remove(leftOut, pointer);
        assertThat(Surveys.answer(leftOut)).isEqualTo(Surveys.answer(given));
    }

    @Test
    void emissivitiesLeftOutAreThoseOfOrdinaryMaterials() {
        String pointer = "/assemblies/timber wall/layers/3/airGap/emissivities";
        ObjectNode given = Surveys.everything();
        Trees.set(given, pointer, Trees.json("[0.9, 0.9]"));
        ObjectNode leftOut = Surveys.everything();
        Trees.remove(leftOut, pointer);
        assertThat(Surveys.answer(leftOut)).isEqualTo(Surveys.answer(given));
    }
}
