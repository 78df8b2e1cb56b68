package org.treadwarm.units;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * Reads a quantity as people write it: {@code 140 ± 10 mm}, {@code 12' 6 1/2"}, {@code 3,81 m}, {@code R 19},
 * {@code 0.5 1/h ± 30 %}, {@code 4.10 x 3.20 + 1.2 x 0.8 m2}.
 *
 * <p>A reading is a sum of products, a plus-or-minus before or after the unit, and a unit. Comma or point is the decimal
 * mark, never grouping. The unit at the end serves every factor that has none of its own; products are read only for areas
 * and volumes. One pass over at most {@value #LONGEST} characters, without going back.
 */
public final class ReadingParser {
    /** The longest text that is read. */
    public static final int LONGEST = 200;

    private static final Set<String> FEET_OR_INCHES = Set.of("'", "\"", "′", "″", "’", "”", "''");

    private final String text;
    private final QuantityKind kind;
    private int at;
    private char decimalMark;

    private ReadingParser(String text, QuantityKind kind) {
        this.text = text;
        this.kind = kind;
    }

    /**
     * The reading in a text.
     *
     * @throws ReadingException when the text is no reading of this kind; its message is fit for a surveyor
     */
    public static Reading parse(String text, QuantityKind kind) throws ReadingException {
        if (text.length() > LONGEST) {
            throw new ReadingException("this is longer than " + LONGEST + " characters");
        }
        return new ReadingParser(text, kind).reading();
    }

    /** Whether a text is a number or a sum of products with no unit anywhere, so that a form may add the unit it shows. */
    public static boolean isBare(String text) {
        boolean digit = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            digit |= Character.isDigit(c) || fraction(c) > 0;
            if (Character.isLetter(c) && "xXeE".indexOf(c) < 0
                    || "'\"%°′″’”/[".indexOf(c) >= 0 && !isFractionBar(text, i)) {
                return false;
            }
        }
        return digit;
    }

    private static boolean isFractionBar(String text, int i) {
        return text.charAt(i) == '/'
                && (i > 0
                                && Character.isDigit(text.charAt(i - 1))
                                && i + 1 < text.length()
                                && Character.isDigit(text.charAt(i + 1))
                        || i > 0 && text.charAt(i - 1) == '+' && i + 1 < text.length() && text.charAt(i + 1) == '-');
    }

    /** A factor: a number in a unit of its own, or a bare number that waits for the unit at the end. */
    private record Factor(double number, Optional<Unit> unit) {}

    private record Spread(double number, Optional<String> unit) {}

    private Reading reading() throws ReadingException {
        skipSpace();
        if (at == text.length()) {
            throw new ReadingException("nothing is written here");
        }
        boolean thermalR = takeThermalR();
        double sign = takeSign();
        List<List<Factor>> terms = new ArrayList<>();
        Optional<Spread> spread = Optional.empty();
        Optional<String> endUnit = Optional.empty();
        terms.add(product(sign));
        while (takePlus()) {
            terms.add(product(1));
        }
        if (takePlusMinus()) {
            spread = Optional.of(spread());
        }
        skipSpace();
        if (at < text.length()) {
            endUnit = Optional.of(unitText());
        }
        if (spread.isEmpty() && takePlusMinus()) {
            spread = Optional.of(spread());
            skipSpace();
            if (at < text.length() && spread.get().unit().isEmpty()) {
                spread = Optional.of(new Spread(spread.get().number(), Optional.of(unitText())));
            }
        }
        skipSpace();
        if (at < text.length()) {
            throw new ReadingException("\"" + text.substring(at) + "\" is left over after the reading");
        }
        Optional<Unit> end = thermalR ? endOfThermalR(endUnit) : resolveEnd(endUnit, terms);
        double value = sum(terms, end);
        if (!Double.isFinite(value)) {
            throw new ReadingException("this number is too large");
        }
        double plusOrMinus = spread.isPresent() ? spreadValue(spread.get(), value, end) : 0;
        return new Reading(value, plusOrMinus, text, Optional.empty());
    }

    private Optional<Unit> endOfThermalR(Optional<String> endUnit) throws ReadingException {
        if (endUnit.isPresent()) {
            throw new ReadingException(
                    "\"R\" in front already means h.ft2.°F/Btu; leave the unit out, or write a number with m2.K/W");
        }
        return UnitTable.find(QuantityKind.RESISTANCE, "h.ft2.°F/Btu");
    }

    private Optional<Unit> resolveEnd(Optional<String> endUnit, List<List<Factor>> terms) throws ReadingException {
        if (endUnit.isEmpty()) {
            if (kind != QuantityKind.RATIO && hasBareFactor(terms)) {
                throw new ReadingException(
                        "the unit is missing: " + kind.words() + " is asked for, for example in " + someUnits());
            }
            return Optional.empty();
        }
        return Optional.of(unit(endUnit.get(), kind));
    }

    private static boolean hasBareFactor(List<List<Factor>> terms) {
        for (List<Factor> term : terms) {
            for (Factor factor : term) {
                if (factor.unit().isEmpty()) {
                    return true;
                }
            }
        }
        return false;
    }

    private static boolean isBare(List<Factor> term) {
        for (Factor factor : term) {
            if (factor.unit().isPresent()) {
                return false;
            }
        }
        return true;
    }

    private double sum(List<List<Factor>> terms, Optional<Unit> end) throws ReadingException {
        if (terms.size() > 1 && kind == QuantityKind.TEMPERATURE) {
            throw new ReadingException("temperatures cannot be added");
        }
        double sum = 0;
        for (List<Factor> term : terms) {
            sum += termValue(term, end);
        }
        return sum;
    }

    private double termValue(List<Factor> term, Optional<Unit> end) throws ReadingException {
        if (term.size() > 1 && kind.lengthPower() < 2) {
            throw new ReadingException("a product is read only for an area or a volume, not for " + kind.words());
        }
        if (isBare(term) && (end.isEmpty() || end.get().kind() == kind)) {
            if (term.size() > 1 && term.size() != kind.lengthPower()) {
                throw wrongProduct(term.size());
            }
            double product = 1;
            for (Factor factor : term) {
                product *= factor.number();
            }
            return end.isPresent() ? end.get().toSi(product) : product;
        }
        if (lastUnitServesAll(term)) {
            double product = 1;
            for (Factor factor : term) {
                product *= factor.number();
            }
            return term.get(term.size() - 1).unit().orElseThrow().toSi(product);
        }
        double product = 1;
        int power = 0;
        for (Factor factor : term) {
            Unit unit = factor.unit().orElseGet(() -> rootOf(end));
            product *= unit.toSi(factor.number());
            power += unit.kind().lengthPower();
        }
        if (term.size() > 1 && power != kind.lengthPower()) {
            throw wrongProduct(power);
        }
        Unit first = term.get(0).unit().orElseGet(end::orElseThrow);
        if (term.size() == 1 && first.kind() != kind) {
            throw new ReadingException("\"" + first.symbol() + "\" measures "
                    + first.kind().words() + ", but " + kind.words() + " is asked for");
        }
        return product;
    }

    /** Whether a product within a sum is written like a whole one: bare factors, then the unit of the product. */
    private boolean lastUnitServesAll(List<Factor> term) {
        int last = term.size() - 1;
        return last > 0
                && term.size() == kind.lengthPower()
                && term.get(last).unit().filter(unit -> unit.kind() == kind).isPresent()
                && term.subList(0, last).stream()
                        .allMatch(factor -> factor.unit().isEmpty());
    }

    /** The unit that a bare factor in a product takes from the unit at the end: the length whose power that unit is. */
    private static Unit rootOf(Optional<Unit> end) {
        Unit unit = end.orElseThrow();
        String symbol = unit.symbol();
        String root = symbol.endsWith("2") || symbol.endsWith("3") ? symbol.substring(0, symbol.length() - 1) : symbol;
        return UnitTable.find(QuantityKind.LENGTH, root).orElse(unit);
    }

    private ReadingException wrongProduct(int lengths) {
        return new ReadingException("a product of " + lengths + " lengths is not " + kind.words());
    }

    private double spreadValue(Spread spread, double value, Optional<Unit> end) throws ReadingException {
        boolean relative = spread.unit().isPresent() && spread.unit().get().equals("%") && kind != QuantityKind.RATIO;
        double plusOrMinus;
        if (relative) {
            if (kind == QuantityKind.TEMPERATURE) {
                throw new ReadingException("a temperature has no percentage; write the spread in K");
            }
            plusOrMinus = Math.abs(value) * spread.number() / 100;
        } else if (spread.unit().isPresent()) {
            plusOrMinus =
                    spreadUnit(unit(spread.unit().get(), kind.spreadKind())).toSi(spread.number());
        } else if (end.isPresent()) {
            Unit shared = kind == QuantityKind.TEMPERATURE ? end.get() : spreadUnit(end.get());
            plusOrMinus = spread.number() * shared.numerator() / shared.denominator();
        } else if (kind == QuantityKind.RATIO) {
            plusOrMinus = spread.number();
        } else {
            throw spreadWithoutUnit();
        }
        if (!Double.isFinite(plusOrMinus)) {
            throw new ReadingException("the spread is too large");
        }
        if (kind == QuantityKind.RATIO && end.isPresent() && spread.unit().isEmpty() && plusOrMinus > Math.abs(value)) {
            throw new ReadingException("it is not clear what the % belongs to; write both, as in 12 % ± 2 %");
        }
        return plusOrMinus;
    }

    /** A product of lengths has a spread in its own kind of unit or in per cent, never in a length. */
    private Unit spreadUnit(Unit unit) throws ReadingException {
        if (unit.kind() != kind.spreadKind()) {
            throw spreadWithoutUnit();
        }
        return unit;
    }

    private ReadingException spreadWithoutUnit() {
        return new ReadingException("write the spread with its own unit, that of "
                + kind.words().replaceFirst("^an? ", "") + ", or in %; for example in " + someUnits());
    }

    private List<Factor> product(double sign) throws ReadingException {
        List<Factor> factors = new ArrayList<>();
        factors.add(factor(sign));
        while (takeTimes()) {
            factors.add(factor(1));
        }
        return factors;
    }

    private Factor factor(double sign) throws ReadingException {
        skipSpace();
        double number = sign * number();
        skipSpace();
        if (kind.lengthPower() > 0) {
            Optional<String> own = ownUnit();
            if (own.isPresent()) {
                return withOwnUnit(number, own.get());
            }
        }
        return new Factor(number, Optional.empty());
    }

    private Factor withOwnUnit(double number, String unitText) throws ReadingException {
        Unit unit = lengthLike(unitText);
        skipSpace();
        if (unit.symbol().equals("ft")
                && unit.kind() == QuantityKind.LENGTH
                && (startsNumber(at) || isHyphenBeforeDigit())) {
            at += startsNumber(at) ? 0 : 1;
            double inches = number();
            skipSpace();
            String mark = at < text.length() && !startsOperator(at) && !startsPlusMinus(at) ? unitText() : "";
            Optional<Unit> inch = UnitTable.find(QuantityKind.LENGTH, mark);
            if (inch.isEmpty() || !inch.get().symbol().equals("in")) {
                throw new ReadingException("after feet, inches are written with \" or in, as in 12' 6 1/2\"");
            }
            double metres = unit.toSi(number) + Math.copySign(inch.get().toSi(inches), number);
            return new Factor(metres, UnitTable.find(QuantityKind.LENGTH, "m"));
        }
        return new Factor(number, Optional.of(unit));
    }

    /** The hyphen of 12'-6". */
    private boolean isHyphenBeforeDigit() {
        return at < text.length() && text.charAt(at) == '-' && isDigitAt(at + 1);
    }

    private Unit lengthLike(String unitText) throws ReadingException {
        Optional<Unit> found = UnitTable.find(QuantityKind.LENGTH, unitText)
                .or(() -> UnitTable.find(QuantityKind.AREA, unitText))
                .or(() -> UnitTable.find(QuantityKind.VOLUME, unitText));
        return found.isPresent() ? found.get() : unit(unitText, kind);
    }

    /**
     * A unit that belongs to this factor alone, because more of the sum or product follows it. A unit at the very end is left
     * for the whole.
     */
    private Optional<String> ownUnit() throws ReadingException {
        int start = at;
        if (at >= text.length() || startsOperator(at) || startsPlusMinus(at)) {
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

    private Spread spread() throws ReadingException {
        skipSpace();
        if (at < text.length() && isMinus(text.charAt(at))) {
            throw new ReadingException("the spread must not be negative");
        }
        double number = number();
        skipSpace();
        if (kind != QuantityKind.RATIO && at < text.length() && text.charAt(at) == '%') {
            at++;
            return new Spread(number, Optional.of("%"));
        }
        return new Spread(number, Optional.empty());
    }

    private double number() throws ReadingException {
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

    /** The unit text from here to the next operator, spread or number. */
    private String unitText() throws ReadingException {
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

    private Unit unit(String unitText, QuantityKind wanted) throws ReadingException {
        Optional<Unit> found = UnitTable.find(wanted, unitText);
        if (found.isPresent()) {
            return found.get();
        }
        Optional<Unit> root =
                wanted.lengthPower() > 1 ? UnitTable.find(QuantityKind.LENGTH, unitText) : Optional.empty();
        if (root.isPresent()) {
            return root.get();
        }
        if (isDigit(unitText.charAt(0))) {
            throw new ReadingException("\"" + unitText
                    + "\" follows a number that is complete already; numbers are written without gaps, as in 1200.5");
        }
        String others =
                UnitTable.kindsOf(unitText).stream().map(QuantityKind::words).collect(Collectors.joining(" or "));
        if (!others.isEmpty()) {
            throw new ReadingException(
                    "\"" + unitText + "\" measures " + others + ", but " + wanted.words() + " is asked for");
        }
        throw new ReadingException("\"" + unitText + "\" is no unit of "
                + wanted.words().replaceFirst("^an? ", "") + "; use " + someUnits());
    }

    private String someUnits() {
        List<String> symbols = UnitTable.symbols(kind);
        return symbols.isEmpty() ? "a bare number" : String.join(", ", symbols.subList(0, Math.min(4, symbols.size())));
    }

    private boolean takeThermalR() throws ReadingException {
        if (at < text.length() && text.charAt(at) == 'R') {
            int next = at + 1;
            while (next < text.length() && (isSpace(text.charAt(next)) || text.charAt(next) == '-')) {
                next++;
            }
            if (startsNumber(next)) {
                if (kind != QuantityKind.RESISTANCE) {
                    throw new ReadingException(
                            "an R-value is a thermal resistance, but " + kind.words() + " is asked for");
                }
                at = next;
                return true;
            }
        }
        return false;
    }

    private double takeSign() {
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

    private static boolean isMinus(char c) {
        return c == '-' || c == '−' || c == '–';
    }

    private boolean takePlus() {
        skipSpace();
        if (at < text.length() && text.charAt(at) == '+' && !startsPlusMinus(at)) {
            at++;
            return true;
        }
        return false;
    }

    private boolean takeTimes() {
        skipSpace();
        if (at < text.length() && startsTimes(at)) {
            at++;
            return true;
        }
        return false;
    }

    private boolean takePlusMinus() {
        skipSpace();
        if (at >= text.length() || !startsPlusMinus(at)) {
            return false;
        }
        at += text.charAt(at) == '±' ? 1 : text.charAt(at + 1) == '-' ? 2 : 3;
        return true;
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

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }

    private boolean skipSpace() {
        int start = at;
        while (at < text.length() && isSpace(text.charAt(at))) {
            at++;
        }
        return at > start;
    }

    private static boolean isSpace(char c) {
        return c == ' ' || c == '\t' || c == '\n' || c == '\r' || c == '\u00a0' || c == '\u202f';
    }

    private static double fraction(char c) {
        return switch (c) {
            case '½' -> 0.5;
            case '¼' -> 0.25;
            case '¾' -> 0.75;
            default -> 0;
        };
    }
}
