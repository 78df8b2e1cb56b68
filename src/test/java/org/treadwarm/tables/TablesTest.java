package org.treadwarm.tables;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;

/** What must hold in every row of the tables. */
class TablesTest {
    @Test
    void everyMaterialConductsAndNamesItsSource() {
        assertThat(Materials.all()).isNotEmpty().allSatisfy(row -> {
            assertThat(row.source()).isNotBlank();
            assertThat(row.confidence()).isIn("read", "memory");
            assertThat(row.family()).isNotBlank();
            if (row.conductivity().isPresent()) {
                assertThat(row.conductivity().getAsDouble()).isBetween(0.001, 500.0);
            } else {
                assertThat(row.conductivityFrom().orElseThrow())
                        .isLessThanOrEqualTo(row.conductivityTo().orElseThrow());
            }
            row.density().ifPresent(density -> assertThat(density).isBetween(0.5, 25_000.0));
            row.specificHeat().ifPresent(heat -> assertThat(heat).isBetween(50.0, 20_000.0));
        });
    }

    /** Of the rows with but a range of conductivities, the maker's sheet must tell the rest too. */
    @Test
    void everyMaterialWithItsConductivityHoldsHeat() {
        assertThat(Materials.all())
                .filteredOn(row -> row.conductivity().isPresent())
                .allSatisfy(row -> {
                    assertThat(row.density()).as(row.name()).isPresent();
                    assertThat(row.specificHeat()).as(row.name()).isPresent();
                });
    }

    @Test
    void materialsAreFoundByEitherNameAndAnyCapitals() {
        Materials.all().forEach(row -> {
            assertThat(Materials.find(row.name().toUpperCase(Locale.ROOT))).contains(row);
            row.alsoCalled()
                    .forEach(name -> assertThat(Materials.find(name)).as(name).contains(row));
        });
        assertThat(Materials.find("moonstone")).isEmpty();
        assertThat(Materials.search("gypsum")).isNotEmpty().isSubsetOf(Materials.all());
        assertThat(Materials.search("no such words at all")).isEmpty();
    }

    @Test
    void filmsFallWithTheConvection() {
        assertThat(Films.inside("up")).isLessThan(Films.inside("horizontal"));
        assertThat(Films.inside("horizontal")).isLessThan(Films.inside("down"));
        assertThat(Films.all())
                .hasSize(3)
                .allSatisfy(film -> assertThat(film.source()).isNotBlank());
    }

    @Test
    void coveringsAndJunctionsNameTheirSource() {
        assertThat(Coverings.all()).isNotEmpty().allSatisfy(row -> {
            assertThat(row.resistance()).isNotNegative();
            assertThat(row.source()).isNotBlank();
        });
        assertThat(PsiDefaults.all()).isNotEmpty().allSatisfy(row -> {
            assertThat(row.source()).isNotBlank();
            assertThat(row.external().isPresent()
                            || row.overallInternal().isPresent()
                            || row.internal().isPresent())
                    .isTrue();
        });
    }

    @Test
    void factorsOfWarmWaterFloorsNameTheirSource() {
        assertThat(List.of(
                        FloorFactors.screedSpacing(),
                        FloorFactors.thickLimitCoefficient(),
                        FloorFactors.thickLimitExponent(),
                        FloorFactors.sheetSpacing(),
                        FloorFactors.sheetContact(),
                        FloorFactors.sheetScreedShare()))
                .allSatisfy(line -> assertThat(line.points())
                        .isNotEmpty()
                        .allSatisfy(row -> assertThat(row.source()).contains("from memory, not read")));
        assertThat(List.of(
                        FloorFactors.screedCover(),
                        FloorFactors.screedDiameter(),
                        FloorFactors.limitCoefficient(),
                        FloorFactors.limitExponent()))
                .allSatisfy(grid -> assertThat(grid.cells())
                        .isNotEmpty()
                        .allSatisfy(row -> assertThat(row.source()).contains("from memory, not read")));
    }

    /** A wider spacing makes the surface less even, a thicker screed more even: B_G and n_G must run in one direction. */
    @Test
    void limitCurvesFallWithTheSpacingAndRiseWithTheCover() {
        runsOneWay(FloorFactors.limitCoefficient(), 1);
        runsOneWay(FloorFactors.limitExponent(), -1);
    }

    private static void runsOneWay(FloorFactors.Grid grid, int sign) {
        for (FloorFactors.Grid.Cell one : grid.cells()) {
            for (FloorFactors.Grid.Cell other : grid.cells()) {
                if (one.column() == other.column() && one.row() < other.row()) {
                    assertThat(sign * one.value())
                            .as("%s and %s", one, other)
                            .isGreaterThanOrEqualTo(sign * other.value());
                }
                if (one.row() == other.row() && one.column() < other.column()) {
                    assertThat(sign * one.value())
                            .as("%s and %s", one, other)
                            .isLessThanOrEqualTo(sign * other.value());
                }
            }
        }
    }

    @Test
    void practiceAndMixturesNameTheirSource() {
        assertThat(PracticeLimits.all()).isNotEmpty().allSatisfy(row -> {
            assertThat(row.source()).isNotBlank();
            assertThat(row.unit()).isNotBlank();
            assertThat(row.subject()).isIn("water", "electric");
            assertThat(row.sense()).isIn("at most", "at least");
        });
        assertThat(Breakers.all()).isNotEmpty().allSatisfy(row -> {
            assertThat(row.source()).isNotBlank();
            assertThat(row.continuousShare()).isGreaterThan(0).isLessThanOrEqualTo(1);
        });
    }
}
