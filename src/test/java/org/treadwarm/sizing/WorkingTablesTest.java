package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.tables.Formulas;

class WorkingTablesTest {
    @ParameterizedTest
    @CsvSource({
        "table:films/down/inside, 0.17",
        "table:films/up/outside, 0.04",
        "table:materials/cement screed/conductivity, 1.4",
        "table:materials/cement screed/density, 2000",
        "table:materials/ceramic~1porcelain tiles/conductivity, 1.3",
        "table:constants/zone occupied, 29",
        "table:constants/zone peripheral, 35",
        "table:constants/zone bathroom, 9",
        "table:constants/ordinary emissivity, 0.9",
        "table:constants/shielding average, 0.05",
    })
    void findsNumbersWithTheirSource(String address, double value) {
        assertThat(TableNumbers.find(address)).hasValueSatisfying(number -> {
            assertThat(number.value()).isEqualTo(value);
            assertThat(number.source()).isNotBlank();
        });
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "films/down/inside",
                "table:films/down",
                "table:materials/screed/conductivity",
                "table:materials/ceramic/porcelain tiles/conductivity",
                "table:materials/aerogel (range)/conductivity",
            })
    void findsNothingElse(String address) {
        assertThat(TableNumbers.find(address)).isEmpty();
    }

    @Test
    void findsFormulasByTheirId() {
        assertThat(Formulas.find("u-value"))
                .hasValueSatisfying(row -> assertThat(row.formula()).isEqualTo("U = 1 / R_T"));
        assertThat(Formulas.find("no such formula")).isEmpty();
    }
}
