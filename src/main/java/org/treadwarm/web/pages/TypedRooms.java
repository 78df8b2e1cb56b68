package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.security.SecureRandom;
import java.time.Duration;
import java.util.Base64;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.LongSupplier;

/** What was typed about one room without a job, kept in memory for some time, so that waiting for its answer loses nothing. */
final class TypedRooms {
    static final Duration KEPT = Duration.ofHours(1);
    static final int MOST_KEPT = 100;
    private static final SecureRandom RANDOM = new SecureRandom();

    private final Map<String, Typed> rooms = new LinkedHashMap<>();
    private final LongSupplier clock;

    /** A document, whose it is, and when it was kept. */
    private record Typed(JsonNode document, String person, long nanos) {}

    /** @param clock nanoseconds from any start */
    TypedRooms(LongSupplier clock) {
        this.clock = clock;
    }

    /** Keeps a document for a person; its id, which nobody can guess. */
    synchronized String keep(JsonNode document, String person) {
        byte[] bytes = new byte[16];
        RANDOM.nextBytes(bytes);
        String id = Base64.getUrlEncoder().withoutPadding().encodeToString(bytes);
        rooms.put(id, new Typed(document.deepCopy(), person, clock.getAsLong()));
        forget();
        return id;
    }

    /** The document of an id, for the person that it was kept for. */
    synchronized Optional<JsonNode> find(String id, String person) {
        forget();
        return Optional.ofNullable(rooms.get(id))
                .filter(typed -> typed.person().equals(person))
                .map(typed -> typed.document().deepCopy());
    }

    private void forget() {
        long now = clock.getAsLong();
        for (Iterator<Typed> all = rooms.values().iterator(); all.hasNext(); ) {
            Typed eldest = all.next();
            if (now - eldest.nanos() < KEPT.toNanos() && rooms.size() <= MOST_KEPT) {
                return;
            }
            all.remove();
        }
    }
}
