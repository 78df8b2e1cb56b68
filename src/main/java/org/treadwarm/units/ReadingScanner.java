package org.treadwarm.units;

import java.util.Optional;
import java.util.Set;

/** Walks along the characters of one reading and takes its signs, operators, numbers and unit texts, whatever they mean. */
final class ReadingScanner {
    private static final Set<String> FEET_OR_INCHES = Set.of("'", "\"", "′", "″", "’", "”", "''");

    private final String text;
    private int at;
    private char decimalMark;

    ReadingScanner(String text) {
        this.text = text;
    }

    boolean isAtEnd() {
        return at >= text.length();
    }

    /** What is not taken yet. */
    String rest() {
        return text.substring(at);
    }

    boolean skipSpace() {
        int start = at;
        while (at < text.length() && isSpace(text.charAt(at))) {
            at++;
        }
        return at > start;
    }

    /** Takes the R of R 19; it stands in front of a number. */
    boolean takeThermalR() {
        if (at < text.length() && text.charAt(at) == 'R') {
            int next = at + 1;
            while (next < text.length() && (isSpace(text.charAt(next)) || text.charAt(next) == '-')) {
                next++;
            }
            if (startsNumber(next)) {
                at = next;
                return true;
            }
        }
        return false;
    }

    /** Takes a sign in front of a number: -1 or 1, which it is without a sign too. */
    double takeSign() {
        if (at < text.length() && isMinus(text.charAt(at))) {
            at++;
            skipSpace();
            return -1;
        }
        if (at < text.length() && text.charAt(at) == '+' && startsNumber(at + 1)) {
            at++;
        }
        return 1;
    }

    boolean takePlus() {
        skipSpace();
        if (at < text.length() && text.charAt(at) == '+' && !startsPlusMinus(at)) {
            at++;
            return true;
        }
        return false;
    }

    boolean takeTimes() {
        skipSpace();
        if (at < text.length() && startsTimes(at)) {
            at++;
            return true;
        }
        return false;
    }

    boolean takePlusMinus() {
        skipSpace();
        if (at >= text.length() || !startsPlusMinus(at)) {
            return false;
        }
        at += text.charAt(at) == '±' ? 1 : text.charAt(at + 1) == '-' ? 2 : 3;
        return true;
    }

    boolean takePercent() {
        if (at < text.length() && text.charAt(at) == '%') {
            at++;
            return true;
        }
        return false;
    }

    /** Takes the hyphen of 12'-6", if there is one, and tells whether a number follows at once. */
    boolean takeJoint() {
        if (startsNumber(at)) {
            return true;
        }
        if (startsJoint()) {
            at++;
            return true;
        }
        return false;
    }

    private boolean startsJoint() {
        return at < text.length() && text.charAt(at) == '-' && isDigitAt(at + 1);
    }

    boolean startsMinus() {
        return at < text.length() && isMinus(text.charAt(at));
    }

    /** Whether anything but an operator or a spread stands here. */
    boolean startsUnit() {
        return at < text.length() && !startsOperator(at) && !startsPlusMinus(at);
    }

    /**
     * A unit that belongs to this factor alone, because more of the sum or product follows it. A unit at the very end is left
     * for the whole.
     */
    Optional<String> ownUnit() throws ReadingException {
        int start = at;
        if (!startsUnit()) {
            return Optional.empty();
        }
        String unit = unitText();
        skipSpace();
        boolean more = at < text.length();
        boolean feetOrInches = FEET_OR_INCHES.contains(unit);
        if (more || feetOrInches) {
            if (more && startsPlusMinus(at)) {
                at = start;
                return Optional.empty();
            }
            return Optional.of(unit);
        }
        at = start;
        return Optional.empty();
    }

    /**
     * The unit text from here to the next operator, spread or number.
     *
     * @throws ReadingException when there is none
     */
    String unitText() throws ReadingException {
        int start = at;
        boolean slash = false;
        while (at < text.length() && !startsPlusMinus(at) && !startsOperator(at)) {
            char c = text.charAt(at);
            boolean afterGap = at > start && isSpace(text.charAt(at - 1));
            if (Character.isDigit(c) && afterGap && !slash) {
                break;
            }
            slash = c == '/';
            at++;
            if ((c == '\'' || c == '′' || c == '’') && at < text.length() && text.charAt(at) != '\'') {
                break;
            }
        }
        String unit = text.substring(start, at).strip();
        if (unit.isEmpty()) {
            throw new ReadingException("\"" + text.substring(start) + "\" could not be read");
        }
        return unit;
    }

    /**
     * The number here: with a decimal mark and an exponent, or with a fraction as in 6 1/2, 6-1/2 and 6½.
     *
     * @throws ReadingException when there is none
     */
    double number() throws ReadingException {
        if (!startsNumber(at)) {
            String rest = text.substring(at).strip();
            throw new ReadingException(
                    rest.isEmpty()
                            ? "a number is missing at the end"
                            : "\"" + rest + "\" does not start with a number");
        }
        int start = at;
        double whole = plainNumber();
        if (at < text.length() && text.charAt(at) == '/' && isDigitAt(at + 1) && isWholeSince(start)) {
            at++;
            return divide(whole);
        }
        int mark = at;
        if (at < text.length() && fraction(text.charAt(at)) > 0) {
            return whole + fraction(text.charAt(at++));
        }
        boolean space = skipSpace();
        if (space && at < text.length() && fraction(text.charAt(at)) > 0 && isWholeSince(start)) {
            return whole + fraction(text.charAt(at++));
        }
        boolean gap = space || at < text.length() && text.charAt(at) == '-' && isDigitAt(at + 1);
        if (at < text.length() && text.charAt(at) == '-' && isDigitAt(at + 1)) {
            at++;
        }
        if (gap && isDigitAt(at) && isWholeSince(start)) {
            int digits = at;
            while (isDigitAt(digits)) {
                digits++;
            }
            if (digits < text.length() && text.charAt(digits) == '/' && isDigitAt(digits + 1)) {
                double over = Double.parseDouble(text.substring(at, digits));
                at = digits + 1;
                return whole + divide(over);
            }
        }
        at = mark;
        return whole;
    }

    private boolean isWholeSince(int start) {
        for (int i = start; i < at; i++) {
            if (text.charAt(i) == '.' || text.charAt(i) == ',') {
                return false;
            }
        }
        return true;
    }

    private double divide(double over) throws ReadingException {
        int start = at;
        while (isDigitAt(at)) {
            at++;
        }
        double under = Double.parseDouble(text.substring(start, at));
        if (under == 0) {
            throw new ReadingException("a fraction cannot have 0 below the bar");
        }
        return over / under;
    }

    private double plainNumber() throws ReadingException {
        if (fraction(text.charAt(at)) > 0) {
            return fraction(text.charAt(at++));
        }
        int start = at;
        boolean marked = false;
        while (at < text.length()) {
            char c = text.charAt(at);
            if (c == '.' || c == ',') {
                if (marked || decimalMark != 0 && decimalMark != c) {
                    throw new ReadingException(
                            "comma or point is the decimal mark, and there is one of them: write 1234.5 or 1234,5, with no grouping");
                }
                if (!isDigitAt(at + 1)) {
                    break;
                }
                marked = true;
                decimalMark = c;
            } else if (!isDigitAt(at)) {
                break;
            }
            at++;
        }
        int exponent = exponentEnd();
        String digits = text.substring(start, exponent).replace(',', '.');
        at = exponent;
        return Double.parseDouble(digits);
    }

    private int exponentEnd() {
        if (at < text.length() && (text.charAt(at) == 'e' || text.charAt(at) == 'E')) {
            int digits = at + 1;
            if (digits < text.length() && (text.charAt(digits) == '-' || text.charAt(digits) == '+')) {
                digits++;
            }
            if (isDigitAt(digits)) {
                while (isDigitAt(digits)) {
                    digits++;
                }
                return digits;
            }
        }
        return at;
    }

    private boolean startsPlusMinus(int i) {
        return text.charAt(i) == '±' || text.startsWith("+-", i) || text.startsWith("+/-", i);
    }

    private boolean startsOperator(int i) {
        return text.charAt(i) == '+' || startsTimes(i);
    }

    private boolean startsTimes(int i) {
        char c = text.charAt(i);
        if (c != 'x' && c != 'X' && c != '×' && c != '*') {
            return false;
        }
        int next = i + 1;
        while (next < text.length() && isSpace(text.charAt(next))) {
            next++;
        }
        return startsNumber(next);
    }

    private boolean startsNumber(int i) {
        return isDigitAt(i)
                || i < text.length() && fraction(text.charAt(i)) > 0
                || i < text.length() && (text.charAt(i) == '.' || text.charAt(i) == ',') && isDigitAt(i + 1);
    }

    private boolean isDigitAt(int i) {
        return i < text.length() && isDigit(text.charAt(i));
    }

    static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }

    private static boolean isMinus(char c) {
        return c == '-' || c == '−' || c == '–';
    }

    private static boolean isSpace(char c) {
        return c == ' ' || c == '\t' || c == '\n' || c == '\r' || c == '\u00a0' || c == '\u202f';
    }

    /** The value of a character that is a fraction by itself, 0 for every other. */
    static double fraction(char c) {
        return switch (c) {
            case '½' -> 0.5;
            case '¼' -> 0.25;
            case '¾' -> 0.75;
            default -> 0;
        };
    }
}
