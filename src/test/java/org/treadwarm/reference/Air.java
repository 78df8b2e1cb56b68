package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;

/** Heat carried by the air of a room or space. */
final class Air {
    /** Wh/(m³K) at sea level. */
    private static final double HEAT_CAPACITY = 0.34;

    private static final double SECONDS_PER_HOUR = 3600;

    private Air() {}

    /** W/K towards outdoors at an altitude in m, for an owner that has {@code air}. */
    static double conductance(JsonNode owner, double altitude) {
        double pressureRatio = Math.pow(1 - 2.25577e-5 * altitude, 5.25588);
        return HEAT_CAPACITY * cubicMetresPerHour(owner, owner.get("air")) * pressureRatio;
    }

    private static double cubicMetresPerHour(JsonNode owner, JsonNode air) {
        if (air.has("changeRate")) {
            double volume = air.has("volume")
                    ? Fields.number(air, "volume")
                    : Fields.number(owner, "floorArea") * Fields.number(owner, "height");
            return Fields.number(air, "changeRate") * volume;
        }
        if (air.has("flow")) {
            return Fields.number(air, "flow") * SECONDS_PER_HOUR;
        }
        return Fields.number(air, "supply") * SECONDS_PER_HOUR * (1 - Fields.number(air, "recovery"));
    }
}
