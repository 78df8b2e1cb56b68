package org.treadwarm.web.security;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ClientAddressTest {
    @ParameterizedTest
    @CsvSource({
        "192.0.2.1, 192.0.2.1",
        "192.0.2.1:5123, 192.0.2.1",
        "2001:db8:1:2:3:4:5:6, 2001:db8:1:2::/64",
        "2001:db8:1:2::, 2001:db8:1:2::/64",
        "[2001:db8:1:2::9]:443, 2001:db8:1:2::/64",
        "[2001:DB8:1:2::9], 2001:db8:1:2::/64",
        "::ffff:192.0.2.1, 192.0.2.1",
        "unknown, unknown",
        "_hidden, _hidden",
        "999.1.1.1, 999.1.1.1"
    })
    void countsNetworksOfVersionSixAsOne(String given, String counted) {
        assertThat(ClientAddress.network(given)).isEqualTo(counted);
    }

    @Test
    void looksUpNoNamesAndKeepsNothingLong() {
        assertThat(ClientAddress.network("quillfen.example")).isEqualTo("quillfen.example");
        assertThat(ClientAddress.network("x".repeat(9000))).hasSize(100);
    }
}
