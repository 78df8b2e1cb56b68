package org.treadwarm.physics.electric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.PracticeLimit.Judged;
import org.treadwarm.physics.electric.ElectricCircuits.Circuit;
import org.treadwarm.physics.electric.ElectricCircuits.Load;
import org.treadwarm.sizing.Practice;

/** Elements, circuits, breakers and limits of electric floors. */
class ElectricCircuitsTest {
    @Test
    void anElementIsAResistance() {
        HeatingElement element = new HeatingElement(600, 230);
        assertThat(element.powerAt(230)).isEqualTo(600);
        assertThat(element.current() * element.resistance()).isCloseTo(230, within(1e-12));
        assertThat(element.lowestResistance()).isCloseTo(83.758, within(1e-3));
        assertThat(element.highestResistance()).isCloseTo(96.983, within(1e-3));
        assertThatIllegalArgumentException().isThrownBy(() -> new HeatingElement(0, 230));
    }

    @Test
    void spacingDensityAndLengthBelongTogether() {
        double spacing = CableLaying.spacing(17, 150);
        assertThat(CableLaying.density(17, spacing)).isCloseTo(150, within(1e-12));
        assertThat(CableLaying.length(4, spacing) * 17).isCloseTo(4 * 150, within(1e-9));
        assertThatIllegalArgumentException().isThrownBy(() -> CableLaying.spacing(17, 0));
    }

    @Test
    void aBreakerCarriesItsCircuitForHours() {
        SplittableRandom random = new SplittableRandom(29);
        for (int i = 0; i < 500; i++) {
            BreakerPractice practice = random.nextBoolean() ? Practice.europeanBreakers() : Practice.usBreakers();
            List<Load> loads = new ArrayList<>();
            int count = random.nextInt(1, 12);
            for (int k = 0; k < count; k++) {
                loads.add(new Load("element " + k, random.nextDouble(50, 2700)));
            }
            List<Circuit> circuits = ElectricCircuits.of(loads, 230, practice, 16);
            double share = practice.continuousShare();
            assertThat(circuits.stream().flatMap(circuit -> circuit.loads().stream()))
                    .containsExactlyInAnyOrderElementsOf(
                            loads.stream().map(Load::name).toList());
            assertThat(circuits).allSatisfy(circuit -> {
                assertThat(circuit.breaker()).isLessThanOrEqualTo(16);
                assertThat(circuit.current()).isLessThanOrEqualTo(share * circuit.breaker());
                assertThat(practice.ratings().stream().filter(rating -> rating < circuit.breaker()))
                        .allMatch(smaller -> share * smaller < circuit.current());
            });
            double total = circuits.stream().mapToDouble(Circuit::current).sum();
            assertThat(total).isCloseTo(loads.stream().mapToDouble(Load::power).sum() / 230, within(1e-9));
        }
    }

    /** 3 400 W at 230 V are 14.8 A: a breaker of 16 A where it may be used up, of 20 A where only 80 % of it may. */
    @Test
    void theRuleOfEightyPerCentTakesALargerBreaker() {
        List<Load> load = List.of(new Load("hall", 3400));
        assertThat(ElectricCircuits.of(load, 230, Practice.europeanBreakers(), 32))
                .singleElement()
                .satisfies(circuit -> assertThat(circuit.breaker()).isEqualTo(16));
        assertThat(ElectricCircuits.of(load, 230, Practice.usBreakers(), 30))
                .singleElement()
                .satisfies(circuit -> assertThat(circuit.breaker()).isEqualTo(20));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ElectricCircuits.of(load, 230, Practice.usBreakers(), 15))
                .withMessageContaining("hall");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> ElectricCircuits.of(load, 230, Practice.usBreakers(), 10));
        assertThatIllegalArgumentException().isThrownBy(() -> new BreakerPractice(List.of(16.0, 10.0), 1, "invented"));
    }

    @Test
    void timberHasLimitsOfItsOwn() {
        List<Judged> timber = CableLimits.judge(17, 100, true, Practice.electric());
        assertThat(timber)
                .filteredOn(limit -> !limit.keeps())
                .extracting(Judged::name)
                .containsExactlyInAnyOrder("density under timber", "power per metre under timber");
        assertThat(CableLimits.judge(17, 100, false, Practice.electric()))
                .singleElement()
                .satisfies(limit -> assertThat(limit.margin()).isCloseTo(0.17 - 0.08, within(1e-12)));
    }
}
