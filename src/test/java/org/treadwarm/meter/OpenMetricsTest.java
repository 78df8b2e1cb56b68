package org.treadwarm.meter;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.treadwarm.meter.OpenMetrics.Label;

class OpenMetricsTest {
    @Test
    void writesFamiliesAndTheEnd() {
        String text = new OpenMetrics()
                .counters("answers", "Answers given.")
                .count("answers", 3, new Label("route", "GET /a"), new Label("status", "2xx"))
                .gauge("heap_bytes", "bytes", "Heap in use.", 17)
                .end();

        assertThat(text)
                .isEqualTo("# TYPE answers counter\n# HELP answers Answers given.\n"
                        + "answers_total{route=\"GET /a\",status=\"2xx\"} 3\n"
                        + "# TYPE heap_bytes gauge\n# UNIT heap_bytes bytes\n# HELP heap_bytes Heap in use.\n"
                        + "heap_bytes 17\n# EOF\n");
    }

    @Test
    void escapesLabels() {
        String text = new OpenMetrics()
                .count("a", 1, new Label("l", "quote \" backslash \\ line\n"))
                .end();

        assertThat(text).isEqualTo("a_total{l=\"quote \\\" backslash \\\\ line\\n\"} 1\n# EOF\n");
    }

    @Test
    void countsDurationsUpToTheirBounds() {
        Durations durations = new Durations();
        durations.add(500_000);
        durations.add(500_001);
        durations.add(11_000_000_000L);

        String text = new OpenMetrics().duration("d_seconds", durations.read()).end();

        assertThat(text)
                .startsWith("d_seconds_bucket{le=\"5.0E-4\"} 1\nd_seconds_bucket{le=\"0.001\"} 2\n")
                .contains("d_seconds_bucket{le=\"10.0\"} 2\nd_seconds_bucket{le=\"+Inf\"} 3\nd_seconds_count 3\n")
                .contains("d_seconds_sum 11.001");
    }
}
