package org.treadwarm.tables;

import java.util.List;
import java.util.OptionalDouble;

/**
 * One row of the materials table.
 *
 * @param name its name, unique
 * @param alsoCalled other names it is found under
 * @param family what it is drawn as
 * @param conductivity design value, W/(m·K); empty where the source gives only a range
 * @param conductivityFrom lower end of the range, W/(m·K)
 * @param conductivityTo upper end of the range, W/(m·K)
 * @param density kg/m³
 * @param specificHeat J/(kg·K)
 * @param vapourResistance vapour resistance factor mu as printed, wet to dry; empty when unknown
 * @param confidence "read" or "memory"; the source tells what is from elsewhere than the conductivity
 * @param source where the row comes from
 */
public record Material(
        String name,
        List<String> alsoCalled,
        String family,
        OptionalDouble conductivity,
        OptionalDouble conductivityFrom,
        OptionalDouble conductivityTo,
        OptionalDouble density,
        OptionalDouble specificHeat,
        String vapourResistance,
        String confidence,
        String source) {}
