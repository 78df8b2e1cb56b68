package org.treadwarm.units;

import static tech.units.indriya.unit.Units.CELSIUS;
import static tech.units.indriya.unit.Units.CUBIC_METRE;
import static tech.units.indriya.unit.Units.HOUR;
import static tech.units.indriya.unit.Units.JOULE;
import static tech.units.indriya.unit.Units.KELVIN;
import static tech.units.indriya.unit.Units.KILOGRAM;
import static tech.units.indriya.unit.Units.LITRE;
import static tech.units.indriya.unit.Units.METRE;
import static tech.units.indriya.unit.Units.MINUTE;
import static tech.units.indriya.unit.Units.NEWTON;
import static tech.units.indriya.unit.Units.PASCAL;
import static tech.units.indriya.unit.Units.PERCENT;
import static tech.units.indriya.unit.Units.SECOND;
import static tech.units.indriya.unit.Units.SQUARE_METRE;
import static tech.units.indriya.unit.Units.VOLT;
import static tech.units.indriya.unit.Units.WATT;

import java.util.HashMap;
import java.util.Map;
import javax.measure.IncommensurableException;
import javax.measure.MetricPrefix;
import javax.measure.Unit;
import systems.uom.common.USCustomary;
import tech.units.indriya.AbstractUnit;

/**
 * The same units from an independent library of units (JSR 385). The British thermal unit and the Rankine difference are built
 * by hand, since the library's temperatures are absolute.
 */
final class UnitOracle {
    private static final Unit<?> BTU = JOULE.multiply(1055.05585262);
    private static final Unit<?> RANKINE = KELVIN.multiply(5).divide(9);
    private static final Unit<?> FOOT = USCustomary.FOOT;
    private static final Unit<?> INCH = USCustomary.INCH;
    private static final Unit<?> SQUARE_FOOT = FOOT.pow(2);
    private static final Unit<?> MILLIMETRE = MetricPrefix.MILLI(METRE);
    private static final Unit<?> CENTIMETRE = MetricPrefix.CENTI(METRE);
    private static final Unit<?> KILOWATT = MetricPrefix.KILO(WATT);
    private static final Unit<?> METRE_KELVIN = METRE.multiply(KELVIN);
    private static final Unit<?> BTU_PER_HOUR = BTU.divide(HOUR);

    private static final Map<QuantityKind, Unit<?>> SI = si();
    private static final Map<String, Unit<?>> UNITS = units();

    private UnitOracle() {}

    /** Whether the other library can tell what this unit is. */
    static boolean knows(org.treadwarm.units.Unit unit) {
        return UNITS.containsKey(key(unit));
    }

    /** The SI value of a number in this unit. */
    static double toSi(org.treadwarm.units.Unit unit, double number) {
        try {
            return UNITS.get(key(unit))
                    .getConverterToAny(SI.get(unit.kind()))
                    .convert((Number) number)
                    .doubleValue();
        } catch (IncommensurableException e) {
            throw new AssertionError(unit + " is of another dimension", e);
        }
    }

    private static String key(org.treadwarm.units.Unit unit) {
        return switch (unit.kind()) {
            case TEMPERATURE -> "theta " + unit.symbol();
            case TEMPERATURE_DIFFERENCE -> "delta " + unit.symbol();
            default -> unit.symbol();
        };
    }

    private static Map<QuantityKind, Unit<?>> si() {
        Map<QuantityKind, Unit<?>> si = new HashMap<>();
        si.put(QuantityKind.LENGTH, METRE);
        si.put(QuantityKind.AREA, SQUARE_METRE);
        si.put(QuantityKind.VOLUME, CUBIC_METRE);
        si.put(QuantityKind.TEMPERATURE, CELSIUS);
        si.put(QuantityKind.TEMPERATURE_DIFFERENCE, KELVIN);
        si.put(QuantityKind.CONDUCTIVITY, WATT.divide(METRE_KELVIN));
        si.put(QuantityKind.LINEAR_TRANSMITTANCE, WATT.divide(METRE_KELVIN));
        si.put(QuantityKind.TRANSMITTANCE, WATT.divide(SQUARE_METRE.multiply(KELVIN)));
        si.put(QuantityKind.RESISTANCE, SQUARE_METRE.multiply(KELVIN).divide(WATT));
        si.put(QuantityKind.HEAT_FLUX, WATT.divide(SQUARE_METRE));
        si.put(QuantityKind.POWER, WATT);
        si.put(QuantityKind.LINEAR_POWER, WATT.divide(METRE));
        si.put(QuantityKind.VOLTAGE, VOLT);
        si.put(QuantityKind.CHANGE_RATE, HOUR.inverse());
        si.put(QuantityKind.AIR_FLOW, CUBIC_METRE.divide(SECOND));
        si.put(QuantityKind.AREA_PER_LENGTH, SQUARE_METRE.divide(METRE));
        si.put(QuantityKind.SPEED, METRE.divide(SECOND));
        si.put(QuantityKind.DENSITY, KILOGRAM.divide(CUBIC_METRE));
        si.put(QuantityKind.SPECIFIC_HEAT, JOULE.divide(KILOGRAM.multiply(KELVIN)));
        si.put(QuantityKind.AREAL_HEAT_CAPACITY, JOULE.divide(SQUARE_METRE.multiply(KELVIN)));
        si.put(QuantityKind.DURATION, HOUR);
        si.put(QuantityKind.PRESSURE, PASCAL);
        si.put(QuantityKind.RATIO, AbstractUnit.ONE);
        return si;
    }

    private static Map<String, Unit<?>> units() {
        Map<String, Unit<?>> units = new HashMap<>();
        lengths(units);
        units.put("theta °C", CELSIUS);
        units.put("theta °F", USCustomary.FAHRENHEIT);
        units.put("theta K", KELVIN);
        units.put("delta K", KELVIN);
        units.put("delta °F", RANKINE);
        heat(units);
        air(units);
        units.put("kg/m3", KILOGRAM.divide(CUBIC_METRE));
        units.put("lb/ft3", USCustomary.POUND.divide(FOOT.pow(3)));
        units.put("J/(kg.K)", JOULE.divide(KILOGRAM.multiply(KELVIN)));
        units.put("kJ/(kg.K)", MetricPrefix.KILO(JOULE).divide(KILOGRAM.multiply(KELVIN)));
        units.put("Btu/(lb.°F)", BTU.divide(USCustomary.POUND.multiply(RANKINE)));
        units.put("W/m", WATT.divide(METRE));
        units.put("W/ft", WATT.divide(FOOT));
        units.put("V", VOLT);
        times(units);
        pressures(units);
        units.put("%", PERCENT);
        return units;
    }

    private static void times(Map<String, Unit<?>> units) {
        units.put("J/(m2.K)", JOULE.divide(SQUARE_METRE.multiply(KELVIN)));
        units.put("kJ/(m2.K)", MetricPrefix.KILO(JOULE).divide(SQUARE_METRE.multiply(KELVIN)));
        units.put("W.h/(m2.K)", WATT.multiply(HOUR).divide(SQUARE_METRE.multiply(KELVIN)));
        units.put("Btu/(ft2.°F)", BTU.divide(SQUARE_FOOT.multiply(RANKINE)));
        units.put("h", HOUR);
        units.put("min", MINUTE);
        units.put("s", SECOND);
        units.put("d", HOUR.multiply(24));
    }

    /** A column of water weighs 1000 kg/m³ under the standard fall, and a pound-force is a pound under it. */
    private static void pressures(Map<String, Unit<?>> units) {
        Unit<?> kilogramForce = NEWTON.multiply(9.80665);
        Unit<?> metreOfWater = kilogramForce.multiply(1000).divide(SQUARE_METRE);
        units.put("Pa", PASCAL);
        units.put("kPa", MetricPrefix.KILO(PASCAL));
        units.put("mbar", MetricPrefix.HECTO(PASCAL));
        units.put("bar", PASCAL.multiply(100_000));
        units.put("mH2O", metreOfWater);
        units.put("ftH2O", metreOfWater.multiply(FOOT).divide(METRE));
        units.put("psi", kilogramForce.multiply(0.45359237).divide(INCH.pow(2)));
    }

    private static void lengths(Map<String, Unit<?>> units) {
        units.put("m", METRE);
        units.put("mm", MILLIMETRE);
        units.put("cm", CENTIMETRE);
        units.put("dm", MetricPrefix.DECI(METRE));
        units.put("km", MetricPrefix.KILO(METRE));
        units.put("ft", FOOT);
        units.put("in", INCH);
        units.put("yd", USCustomary.YARD);
        units.put("m2", SQUARE_METRE);
        units.put("cm2", CENTIMETRE.pow(2));
        units.put("mm2", MILLIMETRE.pow(2));
        units.put("ft2", SQUARE_FOOT);
        units.put("in2", INCH.pow(2));
        units.put("yd2", USCustomary.YARD.pow(2));
        units.put("m3", CUBIC_METRE);
        units.put("l", LITRE);
        units.put("ft3", FOOT.pow(3));
        units.put("m2/m", SQUARE_METRE.divide(METRE));
        units.put("cm2/m", CENTIMETRE.pow(2).divide(METRE));
        units.put("mm2/m", MILLIMETRE.pow(2).divide(METRE));
        units.put("in2/ft", INCH.pow(2).divide(FOOT));
    }

    private static void heat(Map<String, Unit<?>> units) {
        units.put("W/(m.K)", WATT.divide(METRE_KELVIN));
        units.put("mW/(m.K)", MetricPrefix.MILLI(WATT).divide(METRE_KELVIN));
        units.put("Btu/(h.ft.°F)", BTU_PER_HOUR.divide(FOOT.multiply(RANKINE)));
        units.put("Btu.in/(h.ft2.°F)", BTU_PER_HOUR.multiply(INCH).divide(SQUARE_FOOT.multiply(RANKINE)));
        units.put("W/(m2.K)", WATT.divide(SQUARE_METRE.multiply(KELVIN)));
        units.put("Btu/(h.ft2.°F)", BTU_PER_HOUR.divide(SQUARE_FOOT.multiply(RANKINE)));
        units.put("m2.K/W", SQUARE_METRE.multiply(KELVIN).divide(WATT));
        units.put("h.ft2.°F/Btu", SQUARE_FOOT.multiply(RANKINE).divide(BTU_PER_HOUR));
        units.put("W/m2", WATT.divide(SQUARE_METRE));
        units.put("kW/m2", KILOWATT.divide(SQUARE_METRE));
        units.put("Btu/(h.ft2)", BTU_PER_HOUR.divide(SQUARE_FOOT));
        units.put("W/ft2", WATT.divide(SQUARE_FOOT));
        units.put("W", WATT);
        units.put("kW", KILOWATT);
        units.put("Btu/h", BTU_PER_HOUR);
    }

    private static void air(Map<String, Unit<?>> units) {
        units.put("1/h", HOUR.inverse());
        units.put("m3/s", CUBIC_METRE.divide(SECOND));
        units.put("m3/h", CUBIC_METRE.divide(HOUR));
        units.put("l/s", LITRE.divide(SECOND));
        units.put("l/min", LITRE.divide(MINUTE));
        units.put("ft3/min", FOOT.pow(3).divide(MINUTE));
        units.put("m/s", METRE.divide(SECOND));
        units.put("km/h", MetricPrefix.KILO(METRE).divide(HOUR));
        units.put("mi/h", USCustomary.MILE.divide(HOUR));
        units.put("ft/min", FOOT.divide(MINUTE));
    }
}
