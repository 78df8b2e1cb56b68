package org.treadwarm.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Anchors outside this program for the formulas of the second implementation. */
class ReferencePhysicsTest {
    private static final ObjectMapper JSON = JsonMapper.builder().build();

    private static JsonNode read(String text) throws Exception {
        return JSON.readTree(text.replace('\'', '"'));
    }

    /** ISO 6946, table of unventilated air layers, two decimals; values from memory. */
    @ParameterizedTest
    @CsvSource({"up,0.005,0.11", "up,0.025,0.16", "horizontal,0.007,0.13", "horizontal,0.025,0.18", "down,0.1,0.22"})
    void airLayersMatchTheTable(String direction, double thickness, double resistance) throws Exception {
        JsonNode layer = read("{'airGap': {'thickness': %s}}".formatted(thickness));
        assertThat(LayerResistance.of(layer, direction)).isCloseTo(resistance, within(0.006));
    }

    /** Published worked example of a timber-framed wall from the Scottish building standards: U 0.288. */
    @Test
    void timberFrameWallMatchesThePublishedExample() throws Exception {
        JsonNode wall = read("""
                {'layers': [{'resistance': 0.1},
                  {'resistance': 3.333, 'bridging': {'share': 0.095, 'resistance': 1.077}},
                  {'resistance': 0.146}, {'resistance': 0.09}, {'resistance': 0.132}]}""");
        assertThat(Transmittance.inAir(wall, true)).isCloseTo(0.288, within(0.0005));
    }

    /** U of uninsulated and insulated slabs on clay from a national table; values from memory. */
    @ParameterizedTest
    @CsvSource({"0.05,0,0.13", "0.2,0,0.37", "0.5,1.0,0.40", "1.0,0,1.05", "1.0,2.5,0.28"})
    void slabsMatchTheTable(double perimeterPerArea, double insulation, double uValue) throws Exception {
        JsonNode ground = read("""
                {'kind': 'slab', 'area': 100, 'exposedPerimeter': %s, 'wallThickness': 0.3, 'soilConductivity': 1.5}""".formatted(100 * perimeterPerArea));
        assertThat(new Ground(ground, Double.NaN).slabTransmittance(0.21 + insulation))
                .isCloseTo(uValue, within(0.0051));
    }

    /** EN 1264-2: about 100 W/m² at 9 K. */
    @Test
    void nineKelvinGiveAHundredWattsPerSquareMetre() throws Exception {
        JsonNode room = read("{'indoorTemperature': 20, 'heatedFloor': {}}");
        assertThat(new HeatedFloor(room, room).fluxAtSurface(29)).isCloseTo(100, within(0.1));
    }

    @Test
    void smallSurveyMatchesTheSumDoneByHand() throws Exception {
        JsonNode answer = ReferenceChain.size(read("""
                {'site': {'outdoorTemperature': -10},
                 'assemblies': {'wall': {'uValue': 0.5}},
                 'spaces': {'loft': {'kind': 'unheated', 'surfaces': [{'assembly': 'wall', 'area': 60, 'to': 'outdoors'}]}},
                 'rooms': [{'name': 'studio', 'indoorTemperature': 20, 'floorArea': 10, 'height': 2.5,
                   'surfaces': [{'assembly': 'wall', 'area': 10, 'to': 'outdoors'},
                                {'assembly': 'wall', 'area': 20, 'to': 'loft'}],
                   'air': {'changeRate': 1},
                   'heatedFloor': {'area': 10, 'zone': 'occupied', 'to': 'outdoors',
                     'below': [{'resistance': 0.96}]}}]}"""));
        assertThat(answer.at("/spaces/0/temperature").doubleValue()).isCloseTo(-2.5, within(1e-12));
        assertThat(answer.at("/rooms/0/heatLoss/total").doubleValue()).isCloseTo(150 + 225 + 255, within(1e-9));
        JsonNode floor = answer.at("/rooms/0/floor");
        assertThat(floor.get("requiredFlux").doubleValue()).isCloseTo(63, within(1e-10));
        double surface = floor.get("surfaceTemperature").doubleValue();
        assertThat(8.92 * Math.pow(surface - 20, 1.1)).isCloseTo(63, within(1e-9));
        assertThat(floor.get("downwardFlux").doubleValue()).isCloseTo(surface + 10, within(1e-9));
        // The loss is 21 W per kelvin of outdoor temperature: 630 W / 30 K.
        double outdoor = 20 - 10 * floor.get("carryingFlux").doubleValue() / 21;
        assertThat(floor.get("holdsDownTo").doubleValue()).isCloseTo(outdoor, within(1e-9));
    }
}
