package org.treadwarm.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;

class PlainReadingTest {
    private static final List<String> GAPS = List.of("", " ", "  ", "\t", "\u00a0");

    /** Pieces of which readings and slips are made. */
    private static final List<String> PIECES = List.of(
            "0",
            "1",
            "12",
            "007",
            "3.2",
            "3,2",
            ".5",
            "5.",
            "1e3",
            "1/2",
            "½",
            "-",
            "+",
            "+-",
            "±",
            "x",
            " ",
            "  ",
            "'",
            "\"",
            "R ",
            "m",
            "mm",
            "m2",
            "ft",
            "%",
            "1/h",
            "°C",
            "W/m2",
            "m2.K/W",
            "123456789012345",
            "1234567890123456");

    @Test
    void everyUnitWithAnyNumberMeansWhatTheThoroughWayMakesOfIt() throws ReadingException {
        Random random = new Random(20261202);
        int plain = 0;
        for (Unit unit : UnitTable.all()) {
            for (int i = 0; i < 200; i++) {
                String text = number(random) + GAPS.get(random.nextInt(GAPS.size())) + unit.symbol();
                Optional<Reading> quick = PlainReading.in(text, unit.kind());
                if (quick.isPresent()) {
                    plain++;
                    assertSame(text, unit.kind(), quick.get());
                }
            }
        }
        assertTrue(plain > 60 * UnitTable.all().size(), plain + " were plain");
    }

    @Test
    void whateverItReadsTheThoroughWayReadsAlike() throws ReadingException {
        Random random = new Random(3);
        QuantityKind[] kinds = QuantityKind.values();
        int plain = 0;
        for (int i = 0; i < 400_000; i++) {
            StringBuilder text = new StringBuilder();
            for (int pieces = random.nextInt(5); pieces >= 0; pieces--) {
                text.append(PIECES.get(random.nextInt(PIECES.size())));
            }
            QuantityKind kind = kinds[random.nextInt(kinds.length)];
            Optional<Reading> quick = PlainReading.in(text.toString(), kind);
            if (quick.isPresent()) {
                plain++;
                assertSame(text.toString(), kind, quick.get());
            }
        }
        assertTrue(plain > 500, plain + " were plain");
    }

    private static void assertSame(String text, QuantityKind kind, Reading quick) throws ReadingException {
        Reading thorough = ReadingParser.thoroughly(text, kind);
        assertEquals(thorough, quick, text);
        assertEquals(Double.doubleToRawLongBits(thorough.value()), Double.doubleToRawLongBits(quick.value()), text);
    }

    private static String number(Random random) {
        StringBuilder text = new StringBuilder(random.nextInt(4) == 0 ? "-" : "");
        for (int digits = random.nextInt(random.nextInt(5) == 0 ? 17 : 5); digits >= 0; digits--) {
            text.append(random.nextInt(10));
        }
        if (random.nextBoolean()) {
            text.append(random.nextBoolean() ? '.' : ',');
            for (int digits = random.nextInt(6); digits >= 0; digits--) {
                text.append(random.nextInt(10));
            }
        }
        return text.toString();
    }
}
