package org.treadwarm.wire;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.sizing.Sizing.Caution;
import org.treadwarm.sizing.Sizing.GroundPath;
import org.treadwarm.sizing.Sizing.LayerSizing;
import org.treadwarm.sizing.Sizing.PathLoss;
import org.treadwarm.sizing.Sizing.SideSizing;

/** What is written key by key has every component of its record, in order, and nothing else. */
class RowsTest {
    private static final ObjectMapper PLAIN = new ObjectMapper();
    private static final OptionalDouble NONE = OptionalDouble.empty();

    static Stream<Record> rows() {
        GroundPath ground = new GroundPath(4.8, 6.25, 1.45, some(0.17), NONE, NONE);
        return Stream.of(
                new PathLoss(
                        "wall \"ä\"\n€",
                        Optional.of("outdoors"),
                        "transmission",
                        some(8.32),
                        some(0.3),
                        some(2.5),
                        some(-29),
                        72.705,
                        some(0.07),
                        Optional.of(ground)),
                new PathLoss("air", Optional.empty(), "air", NONE, NONE, NONE, NONE, 0, NONE, Optional.empty()),
                new LayerSizing("brick", 0.125, some(1e-9)),
                new LayerSizing("plaster", 1e9, NONE),
                new SideSizing(
                        "outdoors", some(0.13), some(0.04), some(3.1), some(2.9), some(0.03), some(3), some(1.0 / 3)),
                new SideSizing("ground", NONE, NONE, NONE, NONE, NONE, NONE, NONE),
                new Caution("frost", "Frost: 5 °C or \"less\".", "invented for this test"),
                new Caution("frost", "Frost: another text.", "invented for this test"));
    }

    private static OptionalDouble some(double value) {
        return OptionalDouble.of(value);
    }

    @ParameterizedTest
    @MethodSource("rows")
    void writesEveryComponentInOrder(Record row) throws Exception {
        List<String> expected = new ArrayList<>();
        JsonNode written = PLAIN.readTree(Json.bytes(row));
        for (RecordComponent component : row.getClass().getRecordComponents()) {
            Object value = component.getAccessor().invoke(row);
            if (value instanceof Optional<?> optional) {
                value = optional.orElse(null);
            } else if (value instanceof OptionalDouble optional) {
                value = optional.isPresent() ? optional.getAsDouble() : null;
            }
            if (value == null) {
                continue;
            }
            expected.add(component.getName());
            JsonNode at = written.path(component.getName());
            if (value instanceof Record record) {
                assertThat(at).isEqualTo(PLAIN.readTree(Json.bytes(record)));
            } else {
                assertThat(at.isTextual() ? at.textValue() : at.doubleValue()).isEqualTo(value);
            }
        }
        List<String> keys = new ArrayList<>();
        written.fieldNames().forEachRemaining(keys::add);
        assertThat(keys).isEqualTo(expected);
        assertThat(Json.tree(row)).isEqualTo(written);
    }

    @Test
    void numbersAreWholeAcrossTheEndsOfTheBuffer() throws IOException {
        Random random = new Random(20261202);
        double[] numbers =
                random.doubles(20_000, 1e-4, 1e9).map(value -> -1 / value).toArray();

        assertThat(PLAIN.readValue(Json.bytes(numbers), double[].class)).isEqualTo(numbers);
        List<Double> boxed = random.doubles(20_000).boxed().toList();
        assertThat(PLAIN.readValue(Json.bytes(boxed), Double[].class)).isEqualTo(boxed.toArray());
    }
}
