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
    public interface Choice {
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
    public Readings(Choice choice, Visitor visitor) {
        this.choice = choice;
        this.visitor = visitor;
    }

    /** Visits every reading below a record, in document order. */
    public static void visit(Record record, String pointer, Visitor visitor) {
        new Readings((declared, reading) -> true, visitor).visit(record, Place.ROOT.at(pointer));
    }

    /** Visits the chosen readings below a record that stands at a place, in document order. */
    public void visit(Record record, Place at) {
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
            if (value instanceof Optional<?> optional) {
                if (optional.isEmpty()) {
                    continue;
                }
                value = optional.get();
            }
            names[depth++] = key.name();
            value(key, value);
            depth--;
        }
    }

    private void value(Shape.Key key, Object value) {
        if (value instanceof Reading reading) {
            Declared declared = key.quantity().orElseThrow();
            if (choice.wants(declared, reading)) {
                visitor.reading(address(), declared, reading);
            }
        } else if (value instanceof Record record) {
            record(record);
        } else if (value instanceof List<?> list) {
            names[depth++] = null;
            for (int i = 0; i < list.size(); i++) {
                places[depth - 1] = i;
                value(key, list.get(i));
            }
            depth--;
        } else if (value instanceof Map<?, ?> map) {
            depth++;
            map.forEach((name, held) -> {
                names[depth - 1] = (String) name;
                value(key, held);
            });
            depth--;
        }
    }
}
