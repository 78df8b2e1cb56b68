package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;

class SvgTest {
    @Test
    void escapesTextAndAttributes() {
        Svg svg = Svg.element("g").with("a", "\"<'&>").add(Svg.text("text", "<script>&'\""));
        assertThat(svg.write()).isEqualTo("""
                        <g a="&quot;&lt;&#39;&amp;&gt;">
                         <text>&lt;script&gt;&amp;&#39;&quot;</text>
                        </g>
                        """);
    }

    @Test
    void replacesWhatXmlForbidsEvenEscaped() {
        assertThat(Svg.escape("a\u0000b\u001bc\ud800d\uffffe")).isEqualTo("a\ufffdb\ufffdc\ufffdd\ufffde");
        assertThat(Svg.escape("ß²\ud83d\udd25")).isEqualTo("ß²\ud83d\udd25");
    }

    @Test
    void refusesNumbersThatAreNone() {
        Svg svg = Svg.element("g");
        assertThatIllegalArgumentException().isThrownBy(() -> svg.with("x", Double.NaN));
        assertThatIllegalArgumentException().isThrownBy(() -> svg.with("x", Double.POSITIVE_INFINITY));
    }
}
