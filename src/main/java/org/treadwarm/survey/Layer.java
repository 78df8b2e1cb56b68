package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** One layer: a resistance, or a thickness with a conductivity or a material, or an air gap. */
public record Layer(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.RESISTANCE,
                min = 0,
                max = 50,
                plausibleFrom = 0.005,
                plausibleTo = 12,
                label = "resistance")
        Optional<Reading> resistance,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 1e-5,
                max = 10,
                plausibleFrom = 1e-3,
                plausibleTo = 1,
                formUnit = "mm",
                label = "thickness")
        Optional<Reading> thickness,

        @Quantity(
                kind = QuantityKind.CONDUCTIVITY,
                min = 0.001,
                max = 500,
                plausibleFrom = 0.015,
                plausibleTo = 4,
                label = "conductivity",
                help = "The design value; leave it out to take the material's.")
        Optional<Reading> conductivity,

        @Wording(label = "material", help = "A name from the materials table.")
        Optional<String> material,

        @Wording(label = "air gap") Optional<AirGap> airGap,
        @Wording(label = "framing that crosses the layer") Optional<Bridging> bridging,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                plausibleFrom = 20,
                plausibleTo = 60,
                label = "highest temperature the layer may have",
                help = "The maker's limit, at the warm lower face of a layer above the heater.")
        Optional<Reading> maximumTemperature,

        @Quantity(
                kind = QuantityKind.DENSITY,
                min = 0.5,
                max = 25000,
                plausibleFrom = 10,
                plausibleTo = 9000,
                label = "density")
        Optional<Reading> density,

        @Quantity(
                kind = QuantityKind.SPECIFIC_HEAT,
                min = 50,
                max = 20000,
                plausibleFrom = 300,
                plausibleTo = 5000,
                label = "specific heat capacity")
        Optional<Reading> specificHeat) {
    /** The thickness, be it the layer's or its air gap's. */
    public Optional<Reading> anyThickness() {
        return thickness.or(() -> airGap.map(AirGap::thickness));
    }

    /** What the layer is called: its name, its material, or "layer" and its number from 1. */
    public String title(int number) {
        return name.or(() -> material).orElse("layer " + number);
    }
}
