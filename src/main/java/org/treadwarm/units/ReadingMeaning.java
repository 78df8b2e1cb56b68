package org.treadwarm.units;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;

/** What the parts of a reading come to in SI, for one kind of quantity: its factors, terms, units and spread. */
final class ReadingMeaning {
    private final QuantityKind kind;

    ReadingMeaning(QuantityKind kind) {
        this.kind = kind;
    }

    /** A factor: a number in a unit of its own, or a bare number that waits for the unit at the end. */
    record Factor(double number, Optional<Unit> unit) {}

    /** A plus-or-minus as written: its number, and its unit where it has one of its own. */
    record Spread(double number, Optional<String> unit) {}

    /** The unit at the end of a reading that begins with R. */
    Optional<Unit> endOfThermalR(Optional<String> endUnit) throws ReadingException {
        if (endUnit.isPresent()) {
            throw new ReadingException(
                    "\"R\" in front already means h.ft2.°F/Btu; leave the unit out, or write a number with m2.K/W");
        }
        return UnitTable.find(QuantityKind.RESISTANCE, "h.ft2.°F/Btu");
    }

    /** The unit at the end, which every factor needs that has none; only a ratio does without. */
    Optional<Unit> resolveEnd(Optional<String> endUnit, List<List<Factor>> terms) throws ReadingException {
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

    /**
     * The sum of the terms in the SI unit of this kind.
     *
     * @throws ReadingException when the terms cannot be added, are no such quantity, or come to more than a number holds
     */
    double sum(List<List<Factor>> terms, Optional<Unit> end) throws ReadingException {
        if (terms.size() > 1 && kind == QuantityKind.TEMPERATURE) {
            throw new ReadingException("temperatures cannot be added");
        }
        double sum = 0;
        for (List<Factor> term : terms) {
            sum += termValue(term, end);
        }
        if (!Double.isFinite(sum)) {
            throw new ReadingException("this number is too large");
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
                && isBare(term.subList(0, last));
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

    /**
     * The spread in the SI unit of differences of this kind, 0 or more.
     *
     * @throws ReadingException when it has no unit, a wrong one, or could mean two things
     */
    double spreadValue(Spread spread, double value, Optional<Unit> end) throws ReadingException {
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

    /** The unit of a factor in a product: a length, or already an area or a volume. */
    Unit lengthLike(String unitText) throws ReadingException {
        Optional<Unit> found = UnitTable.find(QuantityKind.LENGTH, unitText)
                .or(() -> UnitTable.find(QuantityKind.AREA, unitText))
                .or(() -> UnitTable.find(QuantityKind.VOLUME, unitText));
        return found.isPresent() ? found.get() : unit(unitText, kind);
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
        if (ReadingScanner.isDigit(unitText.charAt(0))) {
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
}
