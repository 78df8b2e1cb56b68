package org.treadwarm.sheets;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.treadwarm.sheets.Verification.Difference;

class ComparisonTest {
    private static Comparison compare(String issued, String today) {
        return Comparison.of(FrozenText.tree(issued), FrozenText.tree(today));
    }

    @Test
    void numbersMayDifferByABillionthOfTheLarger() {
        assertThat(compare("{\"a\":1000000000.0,\"b\":2}", "{\"a\":1000000001.0,\"b\":2.0}")
                        .differences())
                .isEmpty();
        assertThat(compare("{\"a\":[1,100000000]}", "{\"a\":[1,100000001]}").differences())
                .containsExactly(new Difference("/a/1", "100000000", "100000001"));
        assertThat(compare("{\"a\":0}", "{\"a\":1e-300}").differences()).hasSize(1);
        assertThat(compare("{\"a\":0.0}", "{\"a\":-0.0}").differences()).isEmpty();
    }

    @Test
    void everythingElseMustBeTheSame() {
        assertThat(compare("{\"a\":\"x\",\"b\":true}", "{\"a\":\"y\",\"b\":1}").differences())
                .containsExactly(new Difference("/a", "\"x\"", "\"y\""), new Difference("/b", "true", "1"));
        assertThat(compare("{\"a\":[1]}", "{\"a\":[1,{}]}").differences())
                .containsExactly(new Difference("/a/1", "nothing", "an object"));
        assertThat(compare("{\"a\":[]}", "{}").differences())
                .containsExactly(new Difference("/a", "a list", "nothing"));
    }

    @Test
    void fieldsThatTheMethodGainedAreToldApart() {
        Comparison comparison = compare("{\"a\":{}}", "{\"a\":{\"new/one\":1},\"b\":2}");

        assertThat(comparison.differences()).isEmpty();
        assertThat(comparison.added()).containsExactly("/a/new~1one", "/b");
        assertThat(comparison.compared()).isZero();
    }
}
