package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Iterator;
import org.junit.jupiter.api.Test;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;

/**
 * The whole answer for the stored studio, as method version 1 gives it: words to the letter, numbers to 1e-9. A number that
 * moves is a new method version, with a stored answer of its own under its number. To write one, print
 * {@code Json.tree(Surveys.sized(Surveys.studio())).toPrettyString()} and store it by hand, after reading what changed.
 */
class GoldenTest {
    private static final double RELATIVE = 1e-9;

    @Test
    void theStudioIsSizedAsItWas() {
        assertSame(
                "",
                Trees.resource("/golden/studio.v" + Sizing.METHOD_VERSION + ".json"),
                Surveys.answer(Surveys.studio()));
    }

    private static void assertSame(String pointer, JsonNode expected, JsonNode got) {
        assertThat(got.getNodeType()).as(pointer).isEqualTo(expected.getNodeType());
        if (expected.isNumber()) {
            double number = expected.doubleValue();
            double tolerance = pointer.endsWith("/residual") ? 1e-9 : RELATIVE * Math.abs(number);
            assertThat(got.doubleValue()).as(pointer).isCloseTo(number, within(tolerance));
        } else if (expected.isObject()) {
            assertThat(got.fieldNames()).as(pointer).toIterable().containsExactlyElementsOf(expected::fieldNames);
            for (Iterator<String> names = expected.fieldNames(); names.hasNext(); ) {
                String name = names.next();
                assertSame(pointer + "/" + Trees.escape(name), expected.get(name), got.get(name));
            }
        } else if (expected.isArray()) {
            assertThat(got).as(pointer).hasSameSizeAs(expected);
            for (int i = 0; i < expected.size(); i++) {
                assertSame(pointer + "/" + i, expected.get(i), got.get(i));
            }
        } else {
            assertThat(got).as(pointer).isEqualTo(expected);
        }
    }
}
