package org.treadwarm.store;

import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/** Invented jobs of the invented firm Quillfen Floors. */
final class Samples {
    static final Change BY_ANNA = Change.by("Anna");

    private Samples() {}

    static JobContent job(String name, String... rooms) {
        Stream<Piece> site = Stream.of(new Piece("site", "site", "{\"outside\":-8}"));
        Stream<Piece> numbered =
                IntStream.range(0, rooms.length).mapToObj(index -> new Piece("room", "room-" + index, rooms[index]));
        return new JobContent(name, false, Stream.concat(site, numbered).toList());
    }

    static JobContent jobOf(int rooms, int changedRoom, String changedText) {
        List<Piece> pieces = IntStream.range(0, rooms)
                .mapToObj(index -> new Piece("room", "r" + index, index == changedRoom ? changedText : "room " + index))
                .toList();
        return new JobContent("Large house", false, pieces);
    }
}
