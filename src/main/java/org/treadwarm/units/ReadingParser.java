package org.treadwarm.units;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.treadwarm.units.ReadingMeaning.Factor;
import org.treadwarm.units.ReadingMeaning.Spread;

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

    private static final int INCHES_IN_A_FOOT = 12;

    private final String text;
    private final QuantityKind kind;
    private final ReadingScanner scanner;
    private final ReadingMeaning meaning;

    private ReadingParser(String text, QuantityKind kind) {
        this.text = text;
        this.kind = kind;
        this.scanner = new ReadingScanner(text);
        this.meaning = new ReadingMeaning(kind);
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
        Optional<Reading> plain = PlainReading.in(text, kind);
        return plain.isPresent() ? plain.get() : thoroughly(text, kind);
    }

    /** The reading in a text, whichever form it has. */
    static Reading thoroughly(String text, QuantityKind kind) throws ReadingException {
        return new ReadingParser(text, kind).reading();
    }

    /** Whether a text is a number or a sum of products with no unit anywhere, so that a form may add the unit it shows. */
    public static boolean isBare(String text) {
        boolean digit = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            digit |= Character.isDigit(c) || ReadingScanner.fraction(c) > 0;
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

    private Reading reading() throws ReadingException {
        scanner.skipSpace();
        if (scanner.isAtEnd()) {
            throw new ReadingException("nothing is written here");
        }
        boolean thermalR = takeThermalR();
        List<List<Factor>> terms = terms();
        Optional<Spread> spread = scanner.takePlusMinus() ? Optional.of(spread()) : Optional.empty();
        Optional<String> endUnit = unitTextIfAny();
        if (spread.isEmpty() && scanner.takePlusMinus()) {
            spread = Optional.of(spreadAtEnd());
        }
        scanner.skipSpace();
        if (!scanner.isAtEnd()) {
            throw new ReadingException("\"" + scanner.rest() + "\" is left over after the reading");
        }
        Optional<Unit> end = thermalR ? meaning.endOfThermalR(endUnit) : meaning.resolveEnd(endUnit, terms);
        double value = meaning.sum(terms, end);
        double plusOrMinus = spread.isPresent() ? meaning.spreadValue(spread.get(), value, end) : 0;
        return new Reading(value, plusOrMinus, text, Optional.empty());
    }

    private boolean takeThermalR() throws ReadingException {
        boolean thermalR = scanner.takeThermalR();
        if (thermalR && kind != QuantityKind.RESISTANCE) {
            throw new ReadingException("an R-value is a thermal resistance, but " + kind.words() + " is asked for");
        }
        return thermalR;
    }

    private List<List<Factor>> terms() throws ReadingException {
        List<List<Factor>> terms = new ArrayList<>();
        terms.add(product(scanner.takeSign()));
        while (scanner.takePlus()) {
            terms.add(product(1));
        }
        return terms;
    }

    private List<Factor> product(double sign) throws ReadingException {
        List<Factor> factors = new ArrayList<>();
        factors.add(factor(sign));
        while (scanner.takeTimes()) {
            factors.add(factor(1));
        }
        return factors;
    }

    private Factor factor(double sign) throws ReadingException {
        scanner.skipSpace();
        double number = sign * scanner.number();
        scanner.skipSpace();
        if (kind.lengthPower() > 0) {
            Optional<String> own = scanner.ownUnit();
            if (own.isPresent()) {
                return withOwnUnit(number, own.get());
            }
        }
        return new Factor(number, Optional.empty());
    }

    private Factor withOwnUnit(double number, String unitText) throws ReadingException {
        Unit unit = meaning.lengthLike(unitText);
        scanner.skipSpace();
        boolean feet = unit.symbol().equals("ft") && unit.kind() == QuantityKind.LENGTH;
        return feet && scanner.takeJoint() ? feetAndInches(unit, number) : new Factor(number, Optional.of(unit));
    }

    private Factor feetAndInches(Unit foot, double feet) throws ReadingException {
        double inches = scanner.number();
        scanner.skipSpace();
        String mark = scanner.startsUnit() ? scanner.unitText() : "";
        Optional<Unit> inch = UnitTable.find(QuantityKind.LENGTH, mark);
        if (inch.isEmpty() || !inch.get().symbol().equals("in")) {
            throw new ReadingException("after feet, inches are written with \" or in, as in 12' 6 1/2\"");
        }
        if (inches >= INCHES_IN_A_FOOT) {
            throw new ReadingException("after feet there are less than 12 inches");
        }
        double metres = foot.toSi(feet) + Math.copySign(inch.get().toSi(inches), feet);
        return new Factor(metres, UnitTable.find(QuantityKind.LENGTH, "m"));
    }

    private Spread spread() throws ReadingException {
        scanner.skipSpace();
        if (scanner.startsMinus()) {
            throw new ReadingException("the spread must not be negative");
        }
        double number = scanner.number();
        scanner.skipSpace();
        boolean percent = kind != QuantityKind.RATIO && scanner.takePercent();
        return new Spread(number, percent ? Optional.of("%") : Optional.empty());
    }

    /** A spread after the unit, with a unit of its own or without. */
    private Spread spreadAtEnd() throws ReadingException {
        Spread spread = spread();
        return spread.unit().isPresent() ? spread : new Spread(spread.number(), unitTextIfAny());
    }

    private Optional<String> unitTextIfAny() throws ReadingException {
        scanner.skipSpace();
        return scanner.isAtEnd() ? Optional.empty() : Optional.of(scanner.unitText());
    }
}
