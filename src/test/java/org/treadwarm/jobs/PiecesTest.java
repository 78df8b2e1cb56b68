package org.treadwarm.jobs;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.store.Piece;

class PiecesTest {
    @Test
    void keepsSiteAssembliesSpacesAndEachRoomApart() {
        List<Piece> pieces = Pieces.of(Trees.tree("""
                {"name": "yard", "site": {"a": 1}, "assemblies": {}, "spaces": {},
                 "rooms": [{"id": "r1", "name": "one"}, {"id": "r2", "name": "two"}]}"""));

        assertThat(pieces)
                .extracting(piece -> piece.role() + " " + piece.id())
                .containsExactlyInAnyOrder(
                        "site site", "assemblies assemblies", "spaces spaces", "survey survey", "room r1", "room r2");
    }

    @Test
    void anotherRoomsChangeLeavesAPieceAsItWas() {
        JsonNode before = Trees.tree("{\"rooms\": [{\"id\": \"r1\", \"height\": 1}, {\"id\": \"r2\"}]}");
        JsonNode after = Trees.tree("{\"rooms\": [{\"id\": \"r1\", \"height\": 2}, {\"id\": \"r2\"}]}");

        assertThat(Pieces.of(after)).contains(Pieces.of(before).get(1));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{\"rooms\": []}",
                "{\"site\": null, \"rooms\": []}",
                "{\"site\": 5, \"assemblies\": [1, 2], \"spaces\": \"none\", \"rooms\": []}",
                "{\"survey\": {\"site\": 1}, \"document\": 2, \"room\": 3, \"rooms\": []}",
                "{\"rooms\": [{\"id\": \"a\", \"rooms\": [], \"deep\": [[[{}]]]}]}",
                "{\"rooms\": [{\"id\": \"a\"}, {\"id\": \"a\"}]}",
                "{\"rooms\": [{\"id\": \"a b\"}]}",
                "{\"rooms\": [{\"id\": 5}, 7, null, \"x\", []]}",
                "{\"rooms\": {\"first\": 1}}",
                "{\"rooms\": null}",
                "{}",
                "{\"\": {\"\": \"\"}, \"/~\": \"\\u00e9\\ud83d\\ude00\"}",
                "{\"site\": {\"a\": 1.10, \"b\": 1e3, \"c\": 12345678901234567890, \"d\": true}, \"rooms\": []}",
                "[1, 2]",
                "\"text\"",
                "null"
            })
    void keepsDocumentsOfAnyShapeUnchanged(String text) {
        JsonNode document = Trees.tree(text);

        assertThat(Pieces.survey(Pieces.of(document))).isEqualTo(document);
    }

    @Test
    void keepsTheOrderOfTheRooms() {
        JsonNode document = Trees.tree("{\"rooms\": [{\"id\": \"z\"}, {\"id\": \"a\"}, {\"id\": \"m\"}]}");

        assertThat(Pieces.survey(Pieces.of(document))).isEqualTo(document);
    }
}
