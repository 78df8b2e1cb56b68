package org.treadwarm.units;

/**
 * What a number measures. Two kinds may share a unit (a conductivity and a linear transmittance) but never a meaning:
 * a temperature and a temperature difference are different kinds, since 10 °C is 50 °F but 10 K is 18 °F.
 */
public enum QuantityKind {
    LENGTH("m", "a length", 1),
    AREA("m2", "an area", 2),
    VOLUME("m3", "a volume", 3),
    TEMPERATURE("°C", "a temperature", 0),
    TEMPERATURE_DIFFERENCE("K", "a temperature difference", 0),
    CONDUCTIVITY("W/(m.K)", "a conductivity", 0),
    LINEAR_TRANSMITTANCE("W/(m.K)", "a linear transmittance", 0),
    TRANSMITTANCE("W/(m2.K)", "a U-value or surface coefficient", 0),
    RESISTANCE("m2.K/W", "a thermal resistance", 0),
    HEAT_FLUX("W/m2", "a heat flux", 0),
    POWER("W", "a heat flow", 0),
    LINEAR_POWER("W/m", "a heat per metre", 0),
    VOLTAGE("V", "a voltage", 0),
    CHANGE_RATE("1/h", "an air change rate", 0),
    AIR_FLOW("m3/s", "an air flow", 0),
    AREA_PER_LENGTH("m2/m", "an opening area per metre", 0),
    SPEED("m/s", "a speed", 0),
    DENSITY("kg/m3", "a density", 0),
    SPECIFIC_HEAT("J/(kg.K)", "a specific heat capacity", 0),
    AREAL_HEAT_CAPACITY("J/(m2.K)", "a heat capacity per area", 0),
    DURATION("h", "a time", 0),
    PRESSURE("Pa", "a pressure", 0),
    RATIO("", "a pure ratio", 0);

    private final String siUnit;
    private final String words;
    private final int lengthPower;

    QuantityKind(String siUnit, String words, int lengthPower) {
        this.siUnit = siUnit;
        this.words = words;
        this.lengthPower = lengthPower;
    }

    /** The unit in which every double of this kind is held; empty for a pure ratio. */
    public String siUnit() {
        return siUnit;
    }

    /** The kind in words, with its article, for messages. */
    public String words() {
        return words;
    }

    /** How many lengths make one of this kind by multiplication (1, 2, 3), or 0 for kinds that are no product of lengths. */
    int lengthPower() {
        return lengthPower;
    }

    /** The kind of a plus-or-minus on a number of this kind: a difference for a temperature, else the kind itself. */
    QuantityKind spreadKind() {
        return this == TEMPERATURE ? TEMPERATURE_DIFFERENCE : this;
    }
}
