package org.treadwarm.survey;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.units.Declared;
import org.treadwarm.units.Reading;

/** Walks every reading of a survey with its address and its declaration. */
public final class Readings {
    /** Steps of the longest address there can be, with room to spare; the shapes nest, they do not recur. */
    private static final int DEEPEST = 32;

    /** What is told of each reading. */
    @FunctionalInterface
    public interface Visitor {
        void reading(String pointer, Declared declared, Reading reading);
    }

    /** Which readings are told of. */
    @FunctionalInterface
    interface Choice {
        boolean wants(Declared declared, Reading reading);
    }

    private final Choice choice;
    private final Visitor visitor;

    // The way down, so that an address is written out only when it is told: where the walk starts, then names of keys,
    // or
    // places in lists where the name is absent.
    private Place start = Place.ROOT;
    private final String[] names = new String[DEEPEST];
    private final int[] places = new int[DEEPEST];
    private int depth;

    /** Walks that tell of the readings that a choice wants. Not for two threads at once. */
    Readings(Choice choice, Visitor visitor) {
        this.choice = choice;
        this.visitor = visitor;
    }

    /** Visits every reading below a record, in document order. */
    public static void visit(Record record, String pointer, Visitor visitor) {
        new Readings((declared, reading) -> true, visitor).visit(record, Place.ROOT.at(pointer));
    }

    /** Visits the chosen readings below a record that stands at a place, in document order. */
    void visit(Record record, Place at) {
        start = at;
        depth = 0;
        record(record);
    }

    private String address() {
        String address = start.pointer();
        for (int i = 0; i < depth; i++) {
            address = names[i] == null ? Pointer.to(address, places[i]) : Pointer.to(address, names[i]);
        }
        return address;
    }

    private void record(Record record) {
        for (Shape.Key key : Shape.of(record.getClass()).holdingReadings()) {
            Object value = key.in(record);
            if (key.many() == Shape.Many.OPTIONAL) {
                value = ((Optional<?>) value).orElse(null);
            }
            if (value != null) {
                names[depth++] = key.name();
                value(key, value);
                depth--;
            }
        }
    }

    private void value(Shape.Key key, Object value) {
        switch (key.many()) {
            case ONE, OPTIONAL -> one(key, value);
            case LIST -> {
                List<?> list = (List<?>) value;
                names[depth++] = null;
                for (int i = 0; i < list.size(); i++) {
                    places[depth - 1] = i;
                    one(key, list.get(i));
                }
                depth--;
            }
            case MAP -> {
                depth++;
                ((Map<?, ?>) value).forEach((name, held) -> {
                    names[depth - 1] = (String) name;
                    one(key, held);
                });
                depth--;
            }
        }
    }

    private void one(Shape.Key key, Object value) {
        if (key.holds() == Shape.Holds.OBJECT) {
            record((Record) value);
            return;
        }
        Declared declared = key.quantity().orElseThrow();
        Reading reading = (Reading) value;
        if (choice.wants(declared, reading)) {
            visitor.reading(address(), declared, reading);
        }
    }
}
