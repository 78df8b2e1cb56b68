package org.treadwarm.web.pages;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.TextNode;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;

class TypedRoomsTest {
    private static final JsonNode ROOM = TextNode.valueOf("a room");

    private final AtomicLong clock = new AtomicLong();
    private final TypedRooms rooms = new TypedRooms(clock::get);

    @Test
    void isForWhoTypedIt() {
        String id = rooms.keep(ROOM, "ottilie");

        assertThat(rooms.find(id, "ottilie")).contains(ROOM);
        assertThat(rooms.find(id, "silvie")).isEmpty();
        assertThat(rooms.find("no such id", "ottilie")).isEmpty();
    }

    @Test
    void isForgottenAfterItsTimeAndWhenThereAreTooMany() {
        String first = rooms.keep(ROOM, "ottilie");
        clock.addAndGet(TypedRooms.KEPT.toNanos());
        assertThat(rooms.find(first, "ottilie")).isEmpty();

        String second = rooms.keep(ROOM, "ottilie");
        for (int i = 0; i < TypedRooms.MOST_KEPT; i++) {
            rooms.keep(ROOM, "silvie");
        }
        assertThat(rooms.find(second, "ottilie")).isEmpty();
    }
}
