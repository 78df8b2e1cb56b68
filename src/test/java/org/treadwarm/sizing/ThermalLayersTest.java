package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.treadwarm.intake.AssemblyQuestion;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.physics.warmup.FloorLayer;
import org.treadwarm.properties.Trees;

/** A survey's layers as they pass and hold heat. */
class ThermalLayersTest {
    private static FloorLayer layer(String text) {
        Outcome<AssemblyQuestion> outcome = Intake.assembly(Trees.json("{'layers': [" + text + "]}"));
        AssemblyQuestion question = ((Outcome.Accepted<AssemblyQuestion>) outcome).value();
        List<FloorLayer> layers = ThermalLayers.of(question.layers(), HeatFlow.UP);
        assertThat(layers).hasSize(1);
        return layers.get(0);
    }

    @Test
    void aLayerOfAMaterialHoldsItsHeat() {
        FloorLayer.Massive screed = (FloorLayer.Massive) layer("{'thickness': '65 mm', 'material': 'cement screed'}");
        assertThat(screed.resistance()).isCloseTo(0.065 / 1.4, within(1e-15));
        assertThat(screed.capacity()).isCloseTo(130_000, within(1e-9));
    }

    /** 10 % timber of 0.13 between insulation of 0.035 side by side: 0.1 * 0.13 + 0.9 * 0.035 = 0.0445 W/(m·K). */
    @Test
    void framingPassesHeatBesideTheLayer() {
        FloorLayer framed = layer("{'thickness': '150 mm', 'material': 'mineral wool',"
                + " 'bridging': {'share': '10 %', 'conductivity': 0.13}}");
        assertThat(framed.resistance()).isCloseTo(0.15 / 0.0445, within(1e-12));
        assertThat(framed).isInstanceOf(FloorLayer.Massive.class);
    }

    @Test
    void resistancesAndAirGapsHoldNone() {
        assertThat(layer("{'resistance': 0.1}")).isEqualTo(new FloorLayer.Massless(0.1));
        assertThat(layer("{'resistance': 0}")).isEqualTo(new FloorLayer.Massless(0));
        assertThat(layer("{'airGap': {'thickness': '20 mm'}}"))
                .isInstanceOfSatisfying(
                        FloorLayer.Massless.class,
                        gap -> assertThat(gap.resistance()).isBetween(0.1, 0.2));
    }
}
