package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** Where the job is and how cold it gets there. */
public record Site(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                plausibleFrom = -45,
                plausibleTo = 12,
                label = "design outdoor temperature",
                help = "The coldest design day of the place, from the national annex or the local authority.")
        Reading outdoorTemperature,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                plausibleFrom = -8,
                plausibleTo = 25,
                label = "annual mean outdoor temperature",
                help = "Needed only when something lies on the ground.",
                assume = "9 °C",
                assumeWhy = "Common practice for temperate lowland, no source; the weather service has the figure.")
        Optional<Reading> annualMeanTemperature,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = -430,
                max = 5000,
                plausibleTo = 3000,
                label = "altitude",
                help = "Thin air carries less heat away.",
                fallback = "0 m")
        Reading altitude,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 0,
                max = 10,
                moreThanMin = true,
                plausibleFrom = 0.8,
                plausibleTo = 2,
                label = "season factor of the ground",
                help = "How much colder the ground is on the design day than over the year (EN 12831-1, from memory).",
                fallback = "1.45")
        Reading groundSeasonFactor,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 0,
                max = 10,
                moreThanMin = true,
                plausibleFrom = 0.8,
                plausibleTo = 1.5,
                label = "groundwater factor",
                help = "1.15 where groundwater stands less than 1 m below the slab, else 1 (EN 12831-1, from memory).",
                fallback = "1")
        Reading groundwaterFactor,

        @Quantity(
                kind = QuantityKind.PRESSURE,
                min = 0,
                max = 200000,
                plausibleFrom = 500,
                plausibleTo = 60000,
                formUnit = "kPa",
                label = "pressure drop of the heat source",
                help =
                        "Boiler or heat pump and the pipes to the manifolds, at the flow of the whole job, as the maker states it."
                                + " The pump must overcome it too.")
        Optional<Reading> heatSourceDrop,

        @Wording(
                label = "dimensions",
                help = "How areas were taped; it must match the column of the psi values.",
                fallback = "internal")
        Dimensions dimensions,

        @Wording(label = "reference") Optional<String> reference,
        @Wording(label = "surveyed by") Optional<String> surveyedBy,
        @Wording(label = "surveyed on") Optional<String> surveyedOn) {}
