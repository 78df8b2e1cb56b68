package org.treadwarm.meter;

import java.util.ArrayList;
import java.util.List;

/** A text in the format OpenMetrics 1.0, from memory of its specification: families of samples, and an end mark. */
public final class OpenMetrics {
    /** Its media type. */
    public static final String MEDIA_TYPE = "application/openmetrics-text; version=1.0.0; charset=utf-8";

    private final StringBuilder text = new StringBuilder();

    /**
     * A name and a value that tell samples of one family apart.
     *
     * @param name of a-z and _
     */
    public record Label(String name, String value) {}

    /** Begins a family that only grows. */
    public OpenMetrics counters(String name, String help) {
        return family(name, "counter", "", help);
    }

    /** Adds a sample to a family that only grows. */
    public OpenMetrics count(String name, long value, Label... labels) {
        return sample(name + "_total", Long.toString(value), List.of(labels));
    }

    /**
     * Adds a family of one sample that goes up and down.
     *
     * @param unit the last word of the name, such as bytes; empty for a plain number
     */
    public OpenMetrics gauge(String name, String unit, String help, long value) {
        return family(name, "gauge", unit, help).sample(name, Long.toString(value), List.of());
    }

    /** Begins a family of durations; its name ends in _seconds. */
    public OpenMetrics durations(String name, String help) {
        return family(name, "histogram", "seconds", help);
    }

    /** Adds durations to their family. */
    public OpenMetrics duration(String name, Durations.Reading reading, Label... labels) {
        for (Durations.Bucket bucket : reading.buckets()) {
            bucket(name, Double.toString(bucket.seconds()), bucket.count(), labels);
        }
        bucket(name, "+Inf", reading.count(), labels);
        sample(name + "_count", Long.toString(reading.count()), List.of(labels));
        return sample(name + "_sum", Double.toString(reading.seconds()), List.of(labels));
    }

    private void bucket(String name, String bound, long count, Label... labels) {
        List<Label> all = new ArrayList<>(List.of(labels));
        all.add(new Label("le", bound));
        sample(name + "_bucket", Long.toString(count), all);
    }

    private OpenMetrics family(String name, String type, String unit, String help) {
        text.append("# TYPE ").append(name).append(' ').append(type).append('\n');
        if (!unit.isEmpty()) {
            text.append("# UNIT ").append(name).append(' ').append(unit).append('\n');
        }
        text.append("# HELP ").append(name).append(' ').append(escaped(help)).append('\n');
        return this;
    }

    private OpenMetrics sample(String name, String value, List<Label> labels) {
        text.append(name);
        if (!labels.isEmpty()) {
            text.append('{');
            String comma = "";
            for (Label label : labels) {
                text.append(comma)
                        .append(label.name())
                        .append("=\"")
                        .append(escaped(label.value()))
                        .append('"');
                comma = ",";
            }
            text.append('}');
        }
        text.append(' ').append(value).append('\n');
        return this;
    }

    private static String escaped(String value) {
        return value.replace("\\", "\\\\").replace("\"", "\\\"").replace("\n", "\\n");
    }

    /** The whole text. */
    public String end() {
        return text + "# EOF\n";
    }
}
