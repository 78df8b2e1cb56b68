package org.treadwarm.jobs;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class IdsTest {
    private static final JsonNode NOTHING = Trees.tree("{}");

    private static ObjectNode given(ObjectNode survey, JsonNode before) {
        Ids.give(survey, before);
        return survey;
    }

    private static List<String> ids(JsonNode survey) {
        List<String> ids = new ArrayList<>();
        survey.path("rooms").forEach(room -> {
            ids.add(room.path("id").asText());
            partIds(room, ids);
        });
        survey.path("spaces").forEach(space -> partIds(space, ids));
        return ids;
    }

    private static void partIds(JsonNode owner, List<String> ids) {
        owner.path("surfaces").forEach(surface -> {
            ids.add(surface.path("id").asText());
            surface.path("openings")
                    .forEach(opening -> ids.add(opening.path("id").asText()));
        });
        owner.path("junctions").forEach(junction -> ids.add(junction.path("id").asText()));
    }

    private static void swapRooms(ObjectNode survey) {
        ArrayNode rooms = (ArrayNode) survey.get("rooms");
        rooms.insert(0, rooms.remove(1));
    }

    private static JsonNode roomNamed(JsonNode survey, String name) {
        for (JsonNode room : survey.get("rooms")) {
            if (room.path("name").asText().equals(name)) {
                return room;
            }
        }
        throw new AssertionError(name);
    }

    @Test
    void givesEveryPartAnIdOfItsOwnAndKeepsThoseItHas() {
        List<String> ids = ids(given(Trees.studio(), NOTHING));

        assertThat(ids)
                .doesNotHaveDuplicates()
                .contains("studio-1", "n-wall")
                .allMatch(id -> id.matches("[A-Za-z0-9-]{1,40}"));
    }

    @Test
    void givesTheSameIdsAgainToTheSameSurvey() {
        ObjectNode before = given(Trees.studio(), NOTHING);

        assertThat(given(Trees.studio(), before)).isEqualTo(before);
    }

    @Test
    void roomsKeepTheirIdsWhenTheirOrderChanges() {
        ObjectNode before = given(Trees.studio(), NOTHING);
        ObjectNode after = Trees.studio();
        swapRooms(after);
        given(after, before);

        assertThat(roomNamed(after, "shower room")).isEqualTo(roomNamed(before, "shower room"));
        assertThat(roomNamed(after, "studio")).isEqualTo(roomNamed(before, "studio"));
    }

    @Test
    void partsThatFollowANewOneNeverShareAnIdWithIt() {
        ObjectNode before = given(Trees.studio(), NOTHING);
        ObjectNode after = before.deepCopy();
        ((ArrayNode) roomNamed(after, "shower room").get("surfaces"))
                .insertObject(0)
                .put("name", "new");
        given(after, before);

        assertThat(ids(after)).doesNotHaveDuplicates().containsAll(ids(before));
    }

    @Test
    void twoRoomsOfOneNameGetTwoIds() {
        ObjectNode before = given((ObjectNode) Trees.tree("{\"rooms\": [{\"name\": \"a\"}]}"), NOTHING);
        ObjectNode after =
                given((ObjectNode) Trees.tree("{\"rooms\": [{\"name\": \"a\"}, {\"name\": \"a\"}]}"), before);

        assertThat(ids(after)).doesNotHaveDuplicates().startsWith(ids(before).get(0));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{}",
                "{\"rooms\": 5, \"spaces\": [1, 2]}",
                "{\"rooms\": [1, null, \"x\", [2]]}",
                "{\"rooms\": [{\"id\": 5, \"surfaces\": {\"a\": 1}, \"junctions\": \"none\"}]}",
                "{\"rooms\": {\"a\": {\"id\": \"b\"}}, \"spaces\": {\"c\": null}}"
            })
    void whatIsNoSurveyStaysAsItIs(String text) {
        JsonNode document = Trees.tree(text);

        Ids.give(document, NOTHING);

        assertThat(document).isEqualTo(Trees.tree(text));
    }
}
