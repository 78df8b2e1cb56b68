package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PieceTest {
    @ParameterizedTest
    @ValueSource(strings = {"", " ", "a b", "a\nb", "a\tb", "a\u2028b", "a\u00a0b", "a\u0000b"})
    void refusesRolesAndIdsThatWouldBreakTheList(String word) {
        assertThatThrownBy(() -> new Piece(word, "id", "")).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Piece("room", word, "")).isInstanceOf(IllegalArgumentException.class);
    }

    @ParameterizedTest
    @ValueSource(strings = {"a\u0000b", "half \ud834 character", "\udd1e"})
    void refusesTextsADatabaseWouldChange(String text) {
        assertThatThrownBy(() -> new Piece("room", "id", text)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Change.by(text)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new JobContent(text, false, List.of())).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void refusesTwoPiecesOfOneName() {
        Piece piece = new Piece("room", "a", "1");
        assertThatThrownBy(() -> new JobContent("", false, List.of(piece, new Piece("room", "a", "2"))))
                .isInstanceOf(IllegalArgumentException.class);
        assertThat(new JobContent("", false, List.of(piece, new Piece("door", "a", "1"))).pieces())
                .hasSize(2);
    }
}
