package org.treadwarm.wire;

import java.lang.invoke.MethodHandles;
import java.lang.invoke.VarHandle;
import java.math.BigInteger;
import java.nio.ByteOrder;

/**
 * The shortest decimal that reads back as a given double, as bytes of ASCII. A sizing writes hundreds of numbers, and their digits
 * are the largest part of writing an answer.
 *
 * <p>Source: R. Giulietti, "The Schubfach way to render doubles" (2020), from memory; the numbers' form is that of
 * {@link Double#toString(double)}.
 */
final class ShortestDecimal {
    /** The room that a number needs: sign, 17 digits, point, E, sign, and an exponent that is written as eight bytes. */
    static final int LONGEST = 29;

    private static final int FRACTION_BITS = 52;
    private static final int EXPONENT_MASK = 0x7ff;
    private static final int LEAST_EXPONENT = -1074;
    private static final long HIDDEN_BIT = 1L << FRACTION_BITS;
    private static final long FRACTION_MASK = HIDDEN_BIT - 1;
    private static final long MASK_63 = Long.MAX_VALUE;

    private static final long HUNDRED_MILLION = 100_000_000;

    private static final long EIGHT_ZEROS = 0x3030_3030_3030_3030L;
    private static final VarHandle EIGHT_BYTES =
            MethodHandles.byteArrayViewVarHandle(long[].class, ByteOrder.LITTLE_ENDIAN);

    /** The least number of 1, 2, 3 digits and so on. */
    private static final long[] POWERS_OF_TEN = new long[18];

    /** Powers of ten that are needed: the least and the largest decimal exponent of a double's rounding interval. */
    private static final int LEAST_POWER = -324;

    private static final int LARGEST_POWER = 292;

    /** For each k, 10^-k as a fraction of 126 bits, rounded up, in two halves of 63 bits. */
    private static final long[] HIGH = new long[LARGEST_POWER - LEAST_POWER + 1];

    private static final long[] LOW = new long[HIGH.length];

    static {
        POWERS_OF_TEN[0] = 1;
        for (int i = 1; i < POWERS_OF_TEN.length; i++) {
            POWERS_OF_TEN[i] = 10 * POWERS_OF_TEN[i - 1];
        }
        for (int k = LEAST_POWER; k <= LARGEST_POWER; k++) {
            BigInteger power = BigInteger.TEN.pow(Math.abs(k));
            int shift = 125 - floorLog2PowerOf10(-k);
            BigInteger fraction = k <= 0
                    ? shift >= 0 ? power.shiftLeft(shift) : power.shiftRight(-shift)
                    : BigInteger.ONE.shiftLeft(shift).divide(power);
            fraction = fraction.add(BigInteger.ONE);
            HIGH[k - LEAST_POWER] = fraction.shiftRight(63).longValueExact();
            LOW[k - LEAST_POWER] = fraction.and(BigInteger.valueOf(MASK_63)).longValueExact();
        }
    }

    private ShortestDecimal() {}

    /**
     * Writes a finite number.
     *
     * @return where it ends
     */
    static int write(double value, byte[] to, int start) {
        long bits = Double.doubleToRawLongBits(value);
        int at = start;
        if (bits < 0) {
            to[at++] = '-';
        }
        long fraction = bits & FRACTION_MASK;
        int exponent = (int) (bits >>> FRACTION_BITS) & EXPONENT_MASK;
        if (exponent == 0 && fraction == 0) {
            return layOut(0, 0, to, at);
        }
        long mantissa = exponent == 0 ? fraction : fraction | HIDDEN_BIT;
        int scale = LEAST_EXPONENT + Math.max(0, exponent - 1);
        if (scale <= 0 && scale > -FRACTION_BITS - 1 && mantissa >>> -scale << -scale == mantissa) {
            return layOut(mantissa >>> -scale, 0, to, at);
        }
        return shortest(mantissa, scale, fraction == 0 && exponent > 1, to, at);
    }

    /** The shortest decimal within the interval that rounds to mantissa x 2^scale; the nearest of those that are as short. */
    private static int shortest(long mantissa, int scale, boolean narrowBelow, byte[] to, int at) {
        int k = narrowBelow ? floorLog10ThreeQuartersOfPowerOf2(scale) : floorLog10PowerOf2(scale);
        int shift = scale + floorLog2PowerOf10(-k) + 2;
        long high = HIGH[k - LEAST_POWER];
        long low = LOW[k - LEAST_POWER];
        long four = mantissa << 2;
        long out = mantissa & 1;
        long middle = roundToOdd(high, low, four << shift);
        long lower = roundToOdd(high, low, (narrowBelow ? four - 1 : four - 2) << shift);
        long upper = roundToOdd(high, low, (four + 2) << shift);
        long digits = middle >> 2;
        if (digits >= 100) {
            long below = digits / 10 * 10;
            boolean belowFits = lower + out <= below << 2;
            boolean aboveFits = (below + 10 << 2) + out <= upper;
            if (belowFits != aboveFits) {
                return layOut(belowFits ? below : below + 10, k, to, at);
            }
        }
        boolean digitsFit = lower + out <= digits << 2;
        boolean nextFits = (digits + 1 << 2) + out <= upper;
        if (digitsFit != nextFits) {
            return layOut(digitsFit ? digits : digits + 1, k, to, at);
        }
        long side = middle - (2 * digits + 1 << 1);
        return layOut(side < 0 || side == 0 && (digits & 1) == 0 ? digits : digits + 1, k, to, at);
    }

    /** The product with a power of ten, its last bit set when something was cut off. */
    private static long roundToOdd(long high, long low, long factor) {
        long carried = Math.multiplyHigh(low, factor);
        long middle = high * factor;
        long top = Math.multiplyHigh(high, factor);
        long sum = (middle >>> 1) + carried;
        return top + (sum >>> 63) | (sum & MASK_63) + MASK_63 >>> 63;
    }

    /** Lays out digits x 10^exponent: plainly from 0.001 to below 10 000 000, else with one digit before the point and an exponent. */
    private static int layOut(long digits, int exponent, byte[] to, int at) {
        long significant = digits;
        int power = exponent;
        if (significant != 0 && significant % 10 == 0) {
            while (significant % HUNDRED_MILLION == 0) {
                significant /= HUNDRED_MILLION;
                power += 8;
            }
            while (significant % 10 == 0) {
                significant /= 10;
                power++;
            }
        }
        int count = count(significant);
        int point = count + power;
        if (point > -3 && point <= 7) {
            return plain(significant, count, point, to, at);
        }
        int end = plain(significant, count, 1, to, at);
        to[end++] = 'E';
        return whole(point - 1, to, end);
    }

    /** Digits with the point after so many of them; with zeros where there are none. */
    private static int plain(long digits, int count, int point, byte[] to, int start) {
        int at = start;
        if (point <= 0) {
            to[at++] = '0';
            to[at++] = '.';
            for (int i = point; i < 0; i++) {
                to[at++] = '0';
            }
            return digits(digits, count, to, at);
        }
        if (point >= count) {
            at = digits(digits, count, to, at);
            for (int i = count; i < point; i++) {
                to[at++] = '0';
            }
            to[at++] = '.';
            to[at++] = '0';
            return at;
        }
        // All digits one place to the right, then those before the point back to where they belong.
        int end = digits(digits, count, to, at + 1);
        for (int i = 0; i < point; i++) {
            to[at] = to[at + 1];
            at++;
        }
        to[at] = '.';
        return end;
    }

    /** Writes so many digits; up to seven bytes beyond their end are written over. */
    private static int digits(long digits, int count, byte[] to, int start) {
        int end = start + count;
        int at = start;
        long rest = digits;
        if (count > 16) {
            long first = rest / HUNDRED_MILLION / HUNDRED_MILLION;
            to[at++] = (byte) ('0' + first);
            rest -= first * HUNDRED_MILLION * HUNDRED_MILLION;
        }
        if (count > 8) {
            long upper = rest / HUNDRED_MILLION;
            EIGHT_BYTES.set(to, at, eightDigits(upper) >>> 8 * (8 - (end - at - 8)));
            rest -= upper * HUNDRED_MILLION;
            at = end - 8;
        }
        EIGHT_BYTES.set(to, at, eightDigits(rest) >>> 8 * (8 - (end - at)));
        return end;
    }

    /** The eight digits of a number as bytes, the first one lowest: all of them are found side by side in one long. */
    private static long eightDigits(long number) {
        long upper = number / 10_000;
        long fours = upper | number - 10_000 * upper << 32;
        long hundreds = (fours * 5243 >>> 19) & 0x7f_0000_007fL;
        long twos = hundreds | fours - 100 * hundreds << 16;
        long tens = (twos * 103 >>> 10) & 0xf_000f_000f_000fL;
        return (tens | twos - 10 * tens << 8) + EIGHT_ZEROS;
    }

    private static int whole(int number, byte[] to, int start) {
        int at = start;
        int size = number;
        if (number < 0) {
            to[at++] = '-';
            size = -number;
        }
        return digits(size, count(size), to, at);
    }

    /** How many digits a number has: its bits times log10 2, which may be one too many. */
    private static int count(long number) {
        int most = ((Long.SIZE - Long.numberOfLeadingZeros(number | 1)) * 1233 >> 12) + 1;
        return number < POWERS_OF_TEN[most - 1] && most > 1 ? most - 1 : most;
    }

    /** floor(log10(2^e)) for the exponents of doubles: log10 2 in 41 bits. */
    private static int floorLog10PowerOf2(int e) {
        return (int) (e * 661_971_961_083L >> 41);
    }

    /** floor(log10(3/4 2^e)) for the exponents of doubles. */
    private static int floorLog10ThreeQuartersOfPowerOf2(int e) {
        return (int) (e * 661_971_961_083L + -274_743_187_321L >> 41);
    }

    /** floor(log2(10^e)) for the exponents of doubles: log2 10 in 38 bits. */
    private static int floorLog2PowerOf10(int e) {
        return (int) (e * 913_124_641_741L >> 38);
    }
}
