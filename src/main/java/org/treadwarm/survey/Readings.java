package org.treadwarm.survey;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.units.Declared;
import org.treadwarm.units.Reading;

/** Walks every reading of a survey with its address and its declaration. */
public final class Readings {
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

    /** The way down to an object, so that an address is written out only when it is told. */
    private record Trail(Trail above, String step) {
        @Override
        public String toString() {
            return above == null ? step : Pointer.to(above.toString(), step);
        }
    }

    private Readings(Choice choice, Visitor visitor) {
        this.choice = choice;
        this.visitor = visitor;
    }

    /** Visits every reading below a record, in document order. */
    public static void visit(Record record, String pointer, Visitor visitor) {
        visit(record, pointer, (declared, reading) -> true, visitor);
    }

    /** Visits the readings below a record that a choice wants, in document order. */
    public static void visit(Record record, String pointer, Choice choice, Visitor visitor) {
        new Readings(choice, visitor).record(record, new Trail(null, pointer));
    }

    private void record(Record record, Trail trail) {
        for (Shape.Key key : Shape.of(record.getClass()).holdingReadings()) {
            value(key, key.in(record), trail, key.name());
        }
    }

    private void value(Shape.Key key, Object value, Trail trail, String step) {
        if (value instanceof Reading reading) {
            Declared declared = key.quantity().orElseThrow();
            if (choice.wants(declared, reading)) {
                visitor.reading(new Trail(trail, step).toString(), declared, reading);
            }
        } else if (value instanceof Optional<?> optional) {
            if (optional.isPresent()) {
                value(key, optional.get(), trail, step);
            }
        } else if (value instanceof Record record) {
            record(record, new Trail(trail, step));
        } else if (value instanceof List<?> list) {
            Trail below = list.isEmpty() ? trail : new Trail(trail, step);
            for (int i = 0; i < list.size(); i++) {
                value(key, list.get(i), below, Integer.toString(i));
            }
        } else if (value instanceof Map<?, ?> map) {
            Trail below = new Trail(trail, step);
            map.forEach((name, held) -> value(key, held, below, (String) name));
        }
    }
}
