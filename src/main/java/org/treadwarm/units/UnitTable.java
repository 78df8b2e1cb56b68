package org.treadwarm.units;

import static org.treadwarm.units.QuantityKind.AIR_FLOW;
import static org.treadwarm.units.QuantityKind.AREA;
import static org.treadwarm.units.QuantityKind.AREAL_HEAT_CAPACITY;
import static org.treadwarm.units.QuantityKind.AREA_PER_LENGTH;
import static org.treadwarm.units.QuantityKind.CHANGE_RATE;
import static org.treadwarm.units.QuantityKind.CONDUCTIVITY;
import static org.treadwarm.units.QuantityKind.DENSITY;
import static org.treadwarm.units.QuantityKind.DURATION;
import static org.treadwarm.units.QuantityKind.HEAT_FLUX;
import static org.treadwarm.units.QuantityKind.LENGTH;
import static org.treadwarm.units.QuantityKind.LINEAR_POWER;
import static org.treadwarm.units.QuantityKind.LINEAR_TRANSMITTANCE;
import static org.treadwarm.units.QuantityKind.POWER;
import static org.treadwarm.units.QuantityKind.PRESSURE;
import static org.treadwarm.units.QuantityKind.RATIO;
import static org.treadwarm.units.QuantityKind.RESISTANCE;
import static org.treadwarm.units.QuantityKind.SPECIFIC_HEAT;
import static org.treadwarm.units.QuantityKind.SPEED;
import static org.treadwarm.units.QuantityKind.TEMPERATURE;
import static org.treadwarm.units.QuantityKind.TEMPERATURE_DIFFERENCE;
import static org.treadwarm.units.QuantityKind.TRANSMITTANCE;
import static org.treadwarm.units.QuantityKind.VOLTAGE;
import static org.treadwarm.units.QuantityKind.VOLUME;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Every unit the program reads, each factor exact. Codes are those of UCUM where it has one, beside the everyday
 * spellings of the trade.
 */
public final class UnitTable {
    private static final String SI = "SI brochure, 9th edition";
    private static final String YARD =
            "international yard and pound agreement, 1959: 1 ft = 0.3048 m, 1 lb = 0.45359237 kg";
    private static final String BTU = "Btu (International Table) = 1055.05585262 J, ISO 80000-5; 1 ft = 0.3048 m";
    private static final String FAHRENHEIT = "ISO 80000-5: 1 °F = 5/9 K, 32 °F = 0 °C";

    private static final String WATER_COLUMN =
            "conventional column of water: 1000 kg/m3 and 9.80665 m/s2 (UCUM m[H2O]); 1 ft = 0.3048 m";
    private static final String POUND_FORCE =
            "1 lbf/in2: 1 lb = 0.45359237 kg, 9.80665 m/s2 (ISO 80000-3), 1 in = 0.0254 m";

    private static final double FOOT = 0.3048;
    private static final double BTU_JOULES = 1055.05585262;
    private static final double POUND = 0.45359237;

    private static final List<Unit> UNITS = units();
    private static final Map<QuantityKind, Map<String, Unit>> BY_KIND = byKind();
    private static final Map<QuantityKind, TextTable<Unit>> AS_WRITTEN = asWritten();

    private UnitTable() {}

    /** Every unit, in the order of the kinds. */
    public static List<Unit> all() {
        return UNITS;
    }

    /** The unit of a kind that is written so, if there is one. */
    public static Optional<Unit> find(QuantityKind kind, String text) {
        Map<String, Unit> ofKind = BY_KIND.get(kind);
        Unit asWritten = ofKind.get(text);
        return Optional.ofNullable(asWritten != null ? asWritten : ofKind.get(normal(text)));
    }

    /** The unit of a kind that is written to the letter as the table has it, from a place in a text to its end. */
    static Optional<Unit> asWritten(QuantityKind kind, String text, int from) {
        return Optional.ofNullable(AS_WRITTEN.get(kind).at(text, from));
    }

    /** The kinds that know this unit text, for telling somebody that metres do not measure heat. */
    static Set<QuantityKind> kindsOf(String text) {
        String normal = normal(text);
        Set<QuantityKind> kinds = new LinkedHashSet<>();
        BY_KIND.forEach((kind, units) -> {
            if (units.containsKey(normal)) {
                kinds.add(kind);
            }
        });
        return kinds;
    }

    /** The symbols of a kind's units, for messages. */
    static List<String> symbols(QuantityKind kind) {
        return UNITS.stream()
                .filter(unit -> unit.kind() == kind)
                .map(Unit::symbol)
                .toList();
    }

    /**
     * The normal form of a unit text: no spaces, one sign for the product, plain digits for exponents, one spelling each
     * for degrees, Btu, foot, inch and hour.
     */
    static String normal(String text) {
        StringBuilder plain = new StringBuilder(text.length());
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case ' ', '\t', '\u00a0', '\u202f' -> {}
                case '·', '⋅', '*', '×' -> plain.append('.');
                case '²', '₂' -> plain.append('2');
                case '³' -> plain.append('3');
                case '⁻' -> plain.append('-');
                case '¹' -> plain.append('1');
                case 'º', '˚' -> plain.append('°');
                case '′', '’' -> plain.append('\'');
                case '″', '”' -> plain.append('"');
                default -> plain.append(c);
            }
        }
        String normal = plain.toString();
        if (normal.indexOf('[') >= 0) {
            normal = normal.replace("[Btu_IT]", "Btu")
                    .replace("[ft_i]", "ft")
                    .replace("[in_i]", "in")
                    .replace("[yd_i]", "yd")
                    .replace("[sft_i]", "ft2")
                    .replace("[sin_i]", "in2")
                    .replace("[syd_i]", "yd2")
                    .replace("[cft_i]", "ft3")
                    .replace("[lb_av]", "lb")
                    .replace("[degF]", "°F")
                    .replace("[mi_i]", "mi");
        }
        return normal.replace("BTU", "Btu")
                .replace("btu", "Btu")
                .replace("/hr", "/h")
                .replace("(hr", "(h")
                .replace("hr.", "h.")
                .replace("degF", "°F")
                .replace("degC", "°C")
                .replace("Cel", "°C");
    }

    private static List<Unit> units() {
        List<Unit> units = new ArrayList<>();
        lengthsAndAreas(units);
        temperatures(units);
        conduction(units);
        heat(units);
        air(units);
        matter(units);
        times(units);
        pressures(units);
        add(units, RATIO, "%", 1, 100, SI, "percent");
        return List.copyOf(units);
    }

    private static void lengthsAndAreas(List<Unit> units) {
        add(units, LENGTH, "m", 1, 1, SI);
        add(units, LENGTH, "mm", 1, 1000, SI);
        add(units, LENGTH, "cm", 1, 100, SI);
        add(units, LENGTH, "dm", 1, 10, SI);
        add(units, LENGTH, "km", 1000, 1, SI);
        add(units, LENGTH, "ft", 3048, 10000, YARD, "'", "feet", "foot");
        add(units, LENGTH, "in", 254, 10000, YARD, "\"", "''", "inch", "inches");
        add(units, LENGTH, "yd", 9144, 10000, YARD);
        add(units, AREA, "m2", 1, 1, SI, "sqm", "m^2");
        add(units, AREA, "cm2", 1, 1e4, SI);
        add(units, AREA, "mm2", 1, 1e6, SI);
        add(units, AREA, "ft2", 9290304, 1e8, YARD, "sqft", "sq.ft", "ft^2");
        add(units, AREA, "in2", 64516, 1e8, YARD, "sqin");
        add(units, AREA, "yd2", 83612736, 1e8, YARD, "sqyd");
        add(units, VOLUME, "m3", 1, 1, SI, "m^3", "cbm");
        add(units, VOLUME, "l", 1, 1000, SI, "L", "dm3");
        add(units, VOLUME, "ft3", 28316846592.0, 1e12, YARD, "cuft");
        add(units, AREA_PER_LENGTH, "m2/m", 1, 1, SI);
        add(units, AREA_PER_LENGTH, "cm2/m", 1, 1e4, SI);
        add(units, AREA_PER_LENGTH, "mm2/m", 1, 1e6, SI);
        add(units, AREA_PER_LENGTH, "in2/ft", 64516, 30480000, YARD);
    }

    private static void temperatures(List<Unit> units) {
        units.add(new Unit("°C", TEMPERATURE, 1, 1, 0, SI, List.of("C")));
        units.add(new Unit("°F", TEMPERATURE, 5, 9, -32, FAHRENHEIT, List.of("F")));
        units.add(new Unit("K", TEMPERATURE, 1, 1, -273.15, SI, List.of()));
        add(units, TEMPERATURE_DIFFERENCE, "K", 1, 1, SI, "°C", "C");
        add(units, TEMPERATURE_DIFFERENCE, "°F", 5, 9, FAHRENHEIT, "F");
    }

    private static void conduction(List<Unit> units) {
        for (QuantityKind kind : List.of(CONDUCTIVITY, LINEAR_TRANSMITTANCE)) {
            add(units, kind, "W/(m.K)", 1, 1, SI, "W/mK", "W/m.K", "W/m/K", "W/(mK)", "W.m-1.K-1", "W/m°C", "W/(m.°C)");
            add(units, kind, "mW/(m.K)", 1, 1000, SI, "mW/mK", "mW/(mK)", "mW/m/K");
            add(
                    units,
                    kind,
                    "Btu/(h.ft.°F)",
                    BTU_JOULES * 9,
                    3600 * FOOT * 5,
                    BTU,
                    "Btu/h.ft.°F",
                    "Btu/(h.ft.F)",
                    "Btu/h.ft.F",
                    "Btu/(ft.h.°F)",
                    "Btu/h/ft/°F",
                    "Btu/(hft°F)",
                    "Btu/(hftF)",
                    "Btu/hft°F",
                    "Btu/hftF");
            add(
                    units,
                    kind,
                    "Btu.in/(h.ft2.°F)",
                    BTU_JOULES * 9,
                    3600 * FOOT * 5 * 12,
                    BTU,
                    "Btu.in/h.ft2.°F",
                    "Btu.in/(h.ft2.F)",
                    "Btu.in/h.ft2.F",
                    "Btuin/(hft2°F)",
                    "Btuin/(hft2F)",
                    "Btuin/hft2°F",
                    "Btuin/hft2F");
        }
        add(
                units,
                TRANSMITTANCE,
                "W/(m2.K)",
                1,
                1,
                SI,
                "W/m2K",
                "W/m2.K",
                "W/m2/K",
                "W/(m2K)",
                "W.m-2.K-1",
                "W/(m2.°C)");
        add(
                units,
                TRANSMITTANCE,
                "Btu/(h.ft2.°F)",
                BTU_JOULES * 9,
                3600 * FOOT * FOOT * 5,
                BTU,
                "Btu/h.ft2.°F",
                "Btu/(h.ft2.F)",
                "Btu/h.ft2.F",
                "Btu/(ft2.h.°F)",
                "Btu/h/ft2/°F",
                "Btu/(hft2°F)",
                "Btu/(hft2F)",
                "Btu/hft2°F",
                "Btu/hft2F");
        add(units, RESISTANCE, "m2.K/W", 1, 1, SI, "m2K/W", "(m2.K)/W", "K.m2/W", "m2.°C/W");
        add(
                units,
                RESISTANCE,
                "h.ft2.°F/Btu",
                3600 * FOOT * FOOT * 5,
                BTU_JOULES * 9,
                BTU,
                "ft2.h.°F/Btu",
                "ft2.°F.h/Btu",
                "h.ft2.F/Btu",
                "ft2.h.F/Btu",
                "(h.ft2.°F)/Btu",
                "hft2°F/Btu",
                "hft2F/Btu");
    }

    private static void heat(List<Unit> units) {
        add(units, HEAT_FLUX, "W/m2", 1, 1, SI, "W.m-2");
        add(units, HEAT_FLUX, "kW/m2", 1000, 1, SI);
        add(
                units,
                HEAT_FLUX,
                "Btu/(h.ft2)",
                BTU_JOULES,
                3600 * FOOT * FOOT,
                BTU,
                "Btu/h.ft2",
                "Btu/h/ft2",
                "Btu/(ft2.h)");
        add(units, HEAT_FLUX, "W/ft2", 1e8, 9290304, YARD, "W/sqft");
        add(units, POWER, "W", 1, 1, SI);
        add(units, POWER, "kW", 1000, 1, SI);
        add(units, POWER, "Btu/h", BTU_JOULES, 3600, BTU, "Btuh");
        add(units, LINEAR_POWER, "W/m", 1, 1, SI);
        add(units, LINEAR_POWER, "W/ft", 10000, 3048, YARD);
        add(units, VOLTAGE, "V", 1, 1, SI, "volt", "volts");
    }

    private static void air(List<Unit> units) {
        add(units, CHANGE_RATE, "1/h", 1, 1, SI, "/h", "h-1", "ach", "ACH", "/hour", "perhour");
        add(units, AIR_FLOW, "m3/s", 1, 1, SI);
        add(units, AIR_FLOW, "m3/h", 1, 3600, SI);
        add(units, AIR_FLOW, "l/s", 1, 1000, SI, "L/s");
        add(units, AIR_FLOW, "l/min", 1, 60000, SI, "L/min");
        add(units, AIR_FLOW, "ft3/min", 28316846592.0, 60e12, YARD, "cfm", "CFM");
        add(units, SPEED, "m/s", 1, 1, SI);
        add(units, SPEED, "km/h", 1000, 3600, SI);
        add(units, SPEED, "mi/h", 1609344, 3600e3, YARD, "mph");
        add(units, SPEED, "ft/min", 3048, 600000, YARD);
    }

    private static void matter(List<Unit> units) {
        add(units, DENSITY, "kg/m3", 1, 1, SI, "kg.m-3");
        add(units, DENSITY, "lb/ft3", POUND, FOOT * FOOT * FOOT, YARD, "pcf");
        add(units, SPECIFIC_HEAT, "J/(kg.K)", 1, 1, SI, "J/kgK", "J/kg/K", "J/(kgK)");
        add(units, SPECIFIC_HEAT, "kJ/(kg.K)", 1000, 1, SI, "kJ/kgK", "kJ/kg/K", "kJ/(kgK)");
        add(units, SPECIFIC_HEAT, "Btu/(lb.°F)", BTU_JOULES * 9, POUND * 5, BTU, "Btu/lb.°F", "Btu/(lb.F)", "Btu/lb.F");
    }

    private static void times(List<Unit> units) {
        add(units, AREAL_HEAT_CAPACITY, "J/(m2.K)", 1, 1, SI, "J/m2K", "J/m2.K", "J/m2/K", "J/(m2K)");
        add(units, AREAL_HEAT_CAPACITY, "kJ/(m2.K)", 1000, 1, SI, "kJ/m2K", "kJ/m2.K", "kJ/m2/K", "kJ/(m2K)");
        add(units, AREAL_HEAT_CAPACITY, "W.h/(m2.K)", 3600, 1, SI, "Wh/(m2.K)", "Wh/m2K", "Wh/m2.K", "Wh/(m2K)");
        add(
                units,
                AREAL_HEAT_CAPACITY,
                "Btu/(ft2.°F)",
                BTU_JOULES * 9,
                FOOT * FOOT * 5,
                BTU,
                "Btu/ft2.°F",
                "Btu/(ft2.F)",
                "Btu/ft2.F");
        add(units, DURATION, "h", 1, 1, SI, "hr", "hour", "hours");
        add(units, DURATION, "min", 1, 60, SI, "minute", "minutes");
        add(units, DURATION, "s", 1, 3600, SI);
        add(units, DURATION, "d", 24, 1, SI, "day", "days");
    }

    private static void pressures(List<Unit> units) {
        add(units, PRESSURE, "Pa", 1, 1, SI);
        add(units, PRESSURE, "kPa", 1000, 1, SI);
        add(units, PRESSURE, "mbar", 100, 1, SI, "hPa");
        add(units, PRESSURE, "bar", 1e5, 1, SI);
        add(units, PRESSURE, "mH2O", 980665, 100, WATER_COLUMN, "mWC", "m[H2O]");
        add(units, PRESSURE, "ftH2O", 298906692, 100000, WATER_COLUMN, "ftWC", "ft[H2O]");
        add(units, PRESSURE, "psi", 44482216152605.0, 6451600000.0, POUND_FORCE, "[psi]", "lbf/in2", "[lbf_av]/in2");
    }

    private static void add(
            List<Unit> units,
            QuantityKind kind,
            String symbol,
            double numerator,
            double denominator,
            String source,
            String... spellings) {
        units.add(new Unit(symbol, kind, numerator, denominator, 0, source, List.of(spellings)));
    }

    private static Map<QuantityKind, Map<String, Unit>> byKind() {
        Map<QuantityKind, Map<String, Unit>> index = new EnumMap<>(QuantityKind.class);
        for (QuantityKind kind : QuantityKind.values()) {
            index.put(kind, new HashMap<>());
        }
        for (Unit unit : UNITS) {
            Map<String, Unit> ofKind = index.get(unit.kind());
            claim(ofKind, normal(unit.symbol()), unit);
            unit.spellings().forEach(spelling -> claim(ofKind, spelling, unit));
        }
        return index;
    }

    private static Map<QuantityKind, TextTable<Unit>> asWritten() {
        Map<QuantityKind, TextTable<Unit>> index = new EnumMap<>(QuantityKind.class);
        BY_KIND.forEach((kind, units) -> index.put(kind, new TextTable<>(units)));
        return index;
    }

    private static void claim(Map<String, Unit> ofKind, String spelling, Unit unit) {
        Unit other = ofKind.put(spelling, unit);
        if (other != null && !other.equals(unit)) {
            throw new IllegalStateException(spelling + " is both " + other.symbol() + " and " + unit.symbol());
        }
    }
}
