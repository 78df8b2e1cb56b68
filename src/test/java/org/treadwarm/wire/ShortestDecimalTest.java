package org.treadwarm.wire;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.fasterxml.jackson.core.io.NumberOutput;
import java.nio.charset.StandardCharsets;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The oracle is Jackson's own writer of shortest decimals, the JDK's reader checks that each is the same double. */
class ShortestDecimalTest {
    @ParameterizedTest
    @ValueSource(
            doubles = {
                0,
                -0.0,
                1,
                -1,
                10,
                100,
                0.1,
                0.2,
                0.3,
                1.0 / 3,
                2.0 / 3,
                20.5,
                0.001,
                9.999999999999999E-4,
                0.0099,
                9999999,
                1e7,
                12345678,
                123456.7,
                1e15,
                1e16,
                1e17,
                9007199254740991.0,
                9007199254740992.0,
                9007199254740993.0,
                1e22,
                1e23,
                2e23,
                8.41E21,
                2.0E-3,
                1.1E-5,
                5e-324,
                Double.MIN_NORMAL,
                2.2250738585072011E-308,
                Double.MAX_VALUE,
                -Double.MAX_VALUE,
                4503599627370496.5,
                1.7976931348623155E308,
                8.98846567431158E307,
                9.5367431640625E-7,
                1.1920928955078125E-7
            })
    void numbersOnTheEdgeReadBackTheSame(double value) {
        String text = text(value);
        assertEquals(Double.doubleToRawLongBits(value), Double.doubleToRawLongBits(Double.parseDouble(text)), text);
        if (Math.abs(value) != Double.MIN_VALUE) {
            assertEquals(NumberOutput.toString(value, true), text);
        }
    }

    @Test
    void anyDoubleIsWrittenLikeTheLibraryWritesIt() {
        Random random = new Random(17);
        for (int i = 0; i < 1_000_000; i++) {
            double value = Double.longBitsToDouble(random.nextLong());
            if (Double.isFinite(value)) {
                assertEquals(NumberOutput.toString(value, true), text(value));
            }
        }
    }

    @Test
    void numbersOfDailyUseAreWrittenLikeTheLibraryWritesThem() {
        Random random = new Random(18);
        for (int i = 0; i < 1_000_000; i++) {
            double measured = random.nextInt(2_000_000) / 1000.0 - 500;
            double computed = (random.nextDouble() - 0.2) * Math.pow(10, random.nextInt(14) - 6);
            assertEquals(NumberOutput.toString(measured, true), text(measured));
            assertEquals(NumberOutput.toString(computed, true), text(computed));
        }
    }

    @Test
    void everyPowerOfTwoAndItsNeighboursReadBackTheSame() {
        for (int exponent = Double.MIN_EXPONENT; exponent <= Double.MAX_EXPONENT; exponent++) {
            double power = Math.scalb(1.0, exponent);
            for (double value : new double[] {power, Math.nextUp(power), Math.nextDown(power)}) {
                assertEquals(value, Double.parseDouble(text(value)));
                assertEquals(NumberOutput.toString(value, true), text(value));
            }
        }
    }

    private static String text(double value) {
        byte[] characters = new byte[ShortestDecimal.LONGEST];
        return new String(characters, 0, ShortestDecimal.write(value, characters, 0), StandardCharsets.US_ASCII);
    }
}
