package org.treadwarm.survey;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.treadwarm.intake.AssemblyQuestion;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.properties.Trees;

/** What is known of a layer's matter. */
class LayerMatterTest {
    private static Layer layer(String text) {
        Outcome<AssemblyQuestion> outcome = Intake.assembly(Trees.json("{'layers': [" + text + "]}"));
        return ((Outcome.Accepted<AssemblyQuestion>) outcome).value().layers().get(0);
    }

    @Test
    void takesTheMaterialsFigures() {
        LayerMatter screed = LayerMatter.of(layer("{'thickness': '65 mm', 'material': 'cement screed'}"));
        assertThat(screed.thickness()).hasValue(0.065);
        assertThat(screed.conductivity()).hasValue(1.4);
        assertThat(screed.density()).hasValue(2000);
        assertThat(screed.specificHeat()).hasValue(1000);
        assertThat(screed.missing()).isEmpty();
    }

    @Test
    void theLayersOwnFiguresComeFirst() {
        LayerMatter screed = LayerMatter.of(layer("{'thickness': '65 mm', 'material': 'cement screed',"
                + " 'conductivity': 1.2, 'density': 1900, 'specificHeat': 1100}"));
        assertThat(screed.conductivity()).hasValue(1.2);
        assertThat(screed.density()).hasValue(1900);
        assertThat(screed.specificHeat()).hasValue(1100);
    }

    @Test
    void namesWhatIsMissing() {
        Layer bare = layer("{'thickness': '65 mm', 'conductivity': 1.2}");
        assertThat(LayerMatter.of(bare).missing()).isEqualTo(List.of("density", "specificHeat"));
        assertThat(LayerMatter.isResistanceAlone(bare)).isFalse();
    }

    @Test
    void aResistanceHoldsHeatOnlyWhenAllElseIsKnown() {
        assertThat(LayerMatter.isResistanceAlone(layer("{'resistance': 0.1}"))).isTrue();
        assertThat(LayerMatter.isResistanceAlone(layer("{'airGap': {'thickness': '20 mm'}}")))
                .isTrue();
        Layer carpet = layer("{'resistance': 0.1, 'thickness': '8 mm', 'density': 200, 'specificHeat': 1300}");
        assertThat(LayerMatter.isResistanceAlone(carpet)).isFalse();
        assertThat(LayerMatter.of(carpet).conductivity()).hasValue(0.08);
    }
}
