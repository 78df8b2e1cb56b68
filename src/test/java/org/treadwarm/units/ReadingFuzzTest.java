package org.treadwarm.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Garbage of every sort is refused in words or read as a finite number; nothing else ever happens. */
class ReadingFuzzTest {
    private static final int TEXTS = 20_000;
    private static final List<String> PIECES = List.of(
            "1",
            "0",
            "12",
            "3.5",
            "3,5",
            ".",
            ",",
            " ",
            "\u00a0",
            "\t",
            "\n",
            "x",
            "×",
            "*",
            "+",
            "-",
            "−",
            "/",
            "1/2",
            "½",
            "±",
            "+-",
            "+/-",
            "%",
            "'",
            "\"",
            "''",
            "′",
            "’",
            "”",
            "ft",
            "in",
            "m",
            "mm",
            "m2",
            "m²",
            "m3",
            "°C",
            "°F",
            "K",
            "W/(m.K)",
            "R",
            "R-",
            "e",
            "E5",
            "e400",
            "(",
            ")",
            "[",
            "]",
            "[ft_i]",
            "Btu",
            "h",
            "NaN",
            "Infinity",
            "\u0000",
            "\ud83d",
            "\ud83d\ude00",
            "٣",
            "²",
            "\u202e",
            "\ufeff");

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void onlyReadingExceptionIsThrown(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < TEXTS; i++) {
            String text = random.nextInt(4) == 0 ? garbage(random) : pieces(random);
            QuantityKind kind = QuantityKind.values()[random.nextInt(QuantityKind.values().length)];
            judge(seed, text, kind);
        }
    }

    private static void judge(long seed, String text, QuantityKind kind) {
        try {
            Reading reading = ReadingParser.parse(text, kind);
            assertThat(reading.value()).as("seed %d: <%s>", seed, text).isFinite();
            assertThat(reading.spread())
                    .as("seed %d: <%s>", seed, text)
                    .isFinite()
                    .isNotNegative();
            assertThat(reading.typed()).isEqualTo(text);
        } catch (ReadingException e) {
            assertThat(e.getMessage()).as("seed %d: <%s>", seed, text).isNotBlank();
        } catch (RuntimeException e) {
            fail("seed %d: <%s> as %s".formatted(seed, text, kind), e);
        }
        ReadingParser.isBare(text);
    }

    private static String pieces(SplittableRandom random) {
        StringBuilder text = new StringBuilder();
        for (int count = random.nextInt(1, 9); count > 0; count--) {
            text.append(PIECES.get(random.nextInt(PIECES.size())));
        }
        return text.toString();
    }

    private static String garbage(SplittableRandom random) {
        StringBuilder text = new StringBuilder();
        int range = random.nextBoolean() ? 128 : 0x3000;
        for (int count = random.nextInt(0, 230); count > 0; count--) {
            text.append((char) random.nextInt(range));
        }
        return text.toString();
    }
}
