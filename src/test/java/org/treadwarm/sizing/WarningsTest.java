package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;
import org.treadwarm.sizing.Sizing.Warning;
import org.treadwarm.units.Numbers;

/** Second looks: one change to a survey that raises none raises the one it should, at its address; a smaller one does not. */
class WarningsTest {
    private static List<Warning> warnings(ObjectNode survey) {
        return Surveys.sized(survey).warnings();
    }

    private static ObjectNode changed(String pointer, String value) {
        ObjectNode survey = Surveys.quiet();
        Trees.set(survey, pointer, Trees.json(value));
        return survey;
    }

    @Test
    void theQuietSurveyRaisesNone() {
        assertThat(warnings(Surveys.quiet())).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "/rooms/0/height | 1.5 | unusual-reading | /rooms/0/height",
                "/rooms/0/air/changeRate | 6 | unusual-reading | /rooms/0/air/changeRate",
                "/site/annualMeanTemperature | -10 | outdoor-above-annual-mean | /site/outdoorTemperature",
                "/site/heatSourceDrop | '10 kPa' | drop-without-effect | /site/heatSourceDrop",
                "/assemblies/party wall/uValue | 8 | unusual-u-value | /assemblies/party wall",
                "/assemblies/shed wall/layers/1/thickness | 0.95 | unusual-u-value | /assemblies/shed wall",
                "/assemblies/shed wall/layers/1/bridging/conductivity | 50 | bridging-limits-far-apart | /assemblies/shed wall/layers",
                "/assemblies/shed wall/layers/1/bridging | {'share': 0.0005, 'conductivity': 17} | metal-through-layer | /assemblies/shed wall/layers/1/bridging",
                "/rooms/0/heatedFloor/below/0/bridging | {'share': 0.0005, 'conductivity': 50} | metal-through-layer | /rooms/0/heatedFloor/below/0/bridging",
                "/assemblies/shed wall | {'uValue': 2} | cold-surface | /assemblies/shed wall",
                "/assemblies/shed wall | {'layers': [{'resistance': 0.5}]} | cold-surface | /assemblies/shed wall",
                "/assemblies/new sash/insideCoefficient | 8 | coefficient-without-effect | /assemblies/new sash",
                "/assemblies/new sash/outsideCoefficient | 25 | coefficient-without-effect | /assemblies/new sash",
                "/assemblies/slab/layers/0/maximumTemperature | 30 | limit-without-effect | /assemblies/slab/layers/0/maximumTemperature",
                "/rooms/0/surfaces/4/ground/exposedPerimeter | 1.5 | unusual-slab | /rooms/0/surfaces/4/ground/exposedPerimeter",
                "/rooms/0/heatedFloor/ground/exposedPerimeter | 90 | unusual-slab | /rooms/0/heatedFloor/ground/exposedPerimeter",
                "/spaces/shed | {'kind': 'held', 'temperature': 5} | space-not-named | /spaces/shed",
                "/spaces/stair | {'kind': 'unheated', 'temperatureFactor': 0.5} | space-not-named | /spaces/stair",
                "/spaces/hut | {'kind': 'unheated', 'surfaces': [{'assembly': 'slates', 'area': 4, 'to': 'outdoors'}]} | space-not-named | /spaces/hut",
                "/rooms/0/air | {'flow': '700 m3/h'} | many-air-changes | /rooms/0/air",
                "/spaces/loft/air | {'supply': '400 m3/h', 'recovery': 0.5, 'volume': 60} | many-air-changes | /spaces/loft/air",
                "/spaces/shop next door/temperature | 40 | gains-from-neighbours | /rooms/0",
                "/rooms/0/heatedFloor/area | 42.5 | heated-area-too-large | /rooms/0/heatedFloor/area",
                "/rooms/0/heatedFloor/plan | {'width': 7, 'length': 6, 'fixed': [{'width': 7, 'length': 1, 'x': 0, 'y': 5}]} | heated-under-fixed-parts | /rooms/0/heatedFloor/area",
                "/rooms/0/heatedFloor/plan | {'width': 6, 'length': 6.6} | plan-differs-from-floor | /rooms/0/heatedFloor/plan",
                "/rooms/0/heatedFloor/plan | {'width': 8, 'length': 6} | plan-differs-from-floor | /rooms/0/heatedFloor/plan",
                "/rooms/0/heatedFloor/heater | {'kind': 'electric', 'voltage': 230, 'mats': [{'area': 40, 'power': 4000}]} | mats-not-chosen | /rooms/0/heatedFloor/heater/mats",
                "/rooms/0/heatedFloor/heater | {'kind': 'electric', 'voltage': 230, 'mats': [{'area': 6, 'power': 60}]} | mats-too-weak | /rooms/0/heatedFloor/heater/mats",
                "/rooms/0/heatedFloor/heater | {'kind': 'electric', 'voltage': 230, 'mats': [{'area': 8, 'power': 1600}]} | mats-leave-floor-bare | /rooms/0/heatedFloor/heater/mats",
                "/rooms/0/heatedFloor/heater | {'kind': 'electric', 'voltage': 230, 'density': 100, 'mats': [{'area': 6, 'power': 1200}]} | mats-differ-from-density | /rooms/0/heatedFloor/heater/density",
                "/rooms/0/heatedFloor/heater | {'kind': 'electric', 'voltage': 230, 'mats': [{'area': 36, 'power': 5400}]} | mats-on-no-circuit | /rooms/0/heatedFloor/heater/mats",
                "/rooms/0/heatedFloor/zone | 'peripheral' | peripheral-area-too-wide | /rooms/0/heatedFloor/zone",
                "/rooms/0/heatedFloor/below | [] | nothing-below | /rooms/0/heatedFloor/below",
                "/rooms/0/heatedFloor/below | [] | little-insulation-below | /rooms/0/heatedFloor/below",
                "/rooms/0/heatedFloor/below/0/thickness | '43 mm' | little-insulation-below | /rooms/0/heatedFloor/below",
                "/rooms/0/junctions/0/at | 'room' | no-slab-edge | /rooms/0/junctions",
                "/site/annualMeanTemperature | 30 | heated-from-below | /rooms/0/heatedFloor",
                "/rooms/0/heatedFloor/below/0/maximumTemperature | 25 | layer-below-too-warm | /rooms/0/heatedFloor/below/0/maximumTemperature",
                "/rooms/0/heatedFloor/above/1/conductivity | 0.3 | thick-covering | /rooms/0/heatedFloor/above",
                "/rooms/0/heatedFloor/above/0/name | 'engineered oak' | covering-limit-missing | /rooms/0/heatedFloor/maximumSurfaceTemperature",
                "/rooms/0/heatedFloor/above/0 | {'material': 'softwood 500', 'thickness': 0.01} | covering-limit-missing | /rooms/0/heatedFloor/maximumSurfaceTemperature",
                "/rooms/0/heatedFloor/above/0 | {'material': 'PVC floor tiles', 'thickness': 0.003} | covering-limit-missing | /rooms/0/heatedFloor/maximumSurfaceTemperature",
                "/rooms/0/air/changeRate | 4 | high-flux | /rooms/0/heatedFloor",
                "/rooms/0/heatedFloor/above/1/conductivity | 0.05 | hot-heater-plane | /rooms/0/heatedFloor",
                "/rooms/0/heatedFloor/heater | {'kind': 'water'} | water-not-checked | /rooms/0/heatedFloor/heater",
                "/rooms/0/heatedFloor/heater | {'kind': 'electric', 'spacing': 0.15, 'diameter': 0.09} | spacing-not-solved | /rooms/0/heatedFloor/heater/spacing",
                "/rooms/0/heatedFloor/heater | {'kind': 'water', 'spacing': 0.15, 'feederLength': 200} | loops-not-laid | /rooms/0/heatedFloor/heater",
                "/rooms/0/heatedFloor/heater | {'kind': 'electric', 'spacing': 0.1, 'linearPower': 15, 'density': 100} | density-differs | /rooms/0/heatedFloor/heater/density",
            })
    void isRaisedAtItsAddress(String pointer, String value, String code, String address) {
        List<Warning> warnings = warnings(changed(pointer, value));
        assertThat(warnings).anySatisfy(warning -> {
            assertThat(warning.code()).isEqualTo(code);
            assertThat(warning.pointer()).isEqualTo(address);
        });
        assertThat(warnings).allSatisfy(warning -> {
            assertThat(warning.message()).isNotBlank();
            assertThat(warning.why()).isNotBlank();
            assertThat(warning.settle()).isNotBlank();
        });
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "/rooms/0/height | 1.8",
                "/site/annualMeanTemperature | -8",
                "/assemblies/party wall/uValue | 6.9",
                "/assemblies/shed wall/layers/1/bridging/conductivity | 0.5",
                "/assemblies/shed wall | {'uValue': 1}",
                "/rooms/0/surfaces/4/ground/exposedPerimeter | 2.2",
                "/rooms/0/heatedFloor/ground/exposedPerimeter | 83",
                "/rooms/0/air | {'flow': '200 m3/h'}",
                "/rooms/0/air | {'changeRate': 0}",
                "/spaces/shop next door/temperature | 21",
                "/rooms/0/heatedFloor/area | 42",
                "/rooms/0/heatedFloor/heater | {'kind': 'electric', 'voltage': 230, 'density': 150, 'mats': [{'area': 6, 'power': 900}]}",
                "/rooms/0/heatedFloor/plan | {'width': 7, 'length': 6, 'fixed': [{'width': 6, 'length': 1, 'x': 0, 'y': 5}]}",
                "/rooms/0/heatedFloor/plan | {'width': 8, 'length': 6, 'fixed': [{'width': 2, 'length': 3, 'x': 6, 'y': 0}]}",
                "/rooms/0/heatedFloor/below/0/thickness | '44 mm'",
                "/rooms/0/heatedFloor/below/0/maximumTemperature | 40",
                "/rooms/0/heatedFloor/above/1/conductivity | 0.4",
                "/rooms/0/heatedFloor/heater/density | 60",
                "/rooms/0/reheat | 0",
            })
    void aSmallerChangeRaisesNone(String pointer, String value) {
        assertThat(warnings(changed(pointer, value))).isEmpty();
    }

    @Test
    void theRestOfTheFloorIsMissedOnlyWhenNoSurfaceIsIt() {
        ObjectNode survey = Surveys.quiet();
        Trees.remove(survey, "/rooms/0/surfaces/4");
        assertThat(warnings(survey)).extracting(Warning::code).containsExactly("rest-of-floor-not-listed");
        Trees.set(survey, "/rooms/0/heatedFloor/area", Trees.json("40"));
        assertThat(warnings(survey)).isEmpty();
    }

    @Test
    void aCoveringWithALimitOfItsOwnIsNotAskedForOne() {
        ObjectNode survey = changed("/rooms/0/heatedFloor/above/0/name", "'engineered oak'");
        Trees.set(survey, "/rooms/0/heatedFloor/maximumSurfaceTemperature", Trees.json("27"));
        assertThat(warnings(survey)).isEmpty();
    }

    @Test
    void aPeripheralStripIsNarrow() {
        ObjectNode survey = changed("/rooms/0/heatedFloor/zone", "'peripheral'");
        Trees.set(survey, "/rooms/0/heatedFloor/area", Trees.json("19"));
        assertThat(warnings(survey)).extracting(Warning::code).doesNotContain("peripheral-area-too-wide");
    }

    @ParameterizedTest
    @CsvSource({
        "outdoors, 0, 1.24, true", "outdoors, 0, 1.26, false",
        "outdoors, -5, 1.49, true", "outdoors, -5, 1.51, false",
        "outdoors, -9, 1.99, true", "outdoors, -9, 2.01, false",
        "loft, -9, 1.24, true", "loft, -9, 1.26, false",
        "shop next door, -9, 1.24, true", "shop next door, -9, 1.26, false",
        "shower room, -9, 0.74, true", "shower room, -9, 0.76, false",
    })
    void theLeastInsulationBelowGoesByWhatLiesThere(String to, double outdoor, double resistance, boolean warned) {
        ObjectNode survey = Surveys.studio();
        Trees.remove(survey, "/rooms/0/heatedFloor/ground");
        Trees.set(survey, "/site/outdoorTemperature", Trees.json("" + outdoor));
        Trees.set(survey, "/rooms/0/heatedFloor/to", Trees.json("'" + to + "'"));
        Trees.set(survey, "/rooms/0/heatedFloor/below", Trees.json("[{'resistance': " + resistance + "}]"));
        assertThat(warnings(survey).stream()
                        .filter(warning -> warning.pointer().startsWith("/rooms/0"))
                        .anyMatch(warning -> warning.code().equals("little-insulation-below")))
                .isEqualTo(warned);
    }

    @Test
    void oneConstructionListedTwiceIsToldAtBothAddresses() {
        ObjectNode survey = Surveys.quiet();
        Trees.remove(survey, "/rooms/0/heatedFloor/ground");
        Trees.set(survey, "/rooms/0/heatedFloor/to", Trees.json("'shop next door'"));
        assertThat(warnings(survey))
                .filteredOn(warning -> warning.code().equals("construction-twice"))
                .extracting(Warning::pointer)
                .containsExactly("/rooms/0/surfaces/3", "/rooms/0/heatedFloor");
        ObjectNode heard = Surveys.studio();
        Trees.set(heard, "/rooms/1/heatedFloor/to", Trees.json("'studio'"));
        assertThat(warnings(heard))
                .filteredOn(warning -> warning.code().equals("construction-twice"))
                .extracting(Warning::pointer)
                .containsExactly("/rooms/0/surfaces/3", "/rooms/1/heatedFloor");
    }

    @Test
    void theFluxWithoutTheNeighboursIsTold() {
        ObjectNode survey = changed("/spaces/shop next door/temperature", "40");
        Sizing sizing = Surveys.sized(survey);
        double gains = sizing.rooms().get(0).heatLoss().gainsFromNeighbours();
        double without = (sizing.rooms().get(0).heatLoss().total() + gains) / 36;
        assertThat(sizing.warnings())
                .filteredOn(warning -> warning.code().equals("gains-from-neighbours"))
                .singleElement()
                .satisfies(warning -> assertThat(warning.message()).contains(Numbers.fixed(without, 1) + " W/m2"));
    }
}
