package org.treadwarm.survey;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.Reading;

/** Walks every reading of a survey with its address and its declaration. */
public final class Readings {
    /** What is told of each reading. */
    @FunctionalInterface
    public interface Visitor {
        void reading(String pointer, Quantity declared, Reading reading);
    }

    private Readings() {}

    /** Visits every reading below a record, in document order. */
    public static void visit(Record record, String pointer, Visitor visitor) {
        for (Shape.Key key : Shape.of(record.getClass()).keys().values()) {
            visitValue(key, key.in(record), Pointer.to(pointer, key.name()), visitor);
        }
    }

    private static void visitValue(Shape.Key key, Object value, String pointer, Visitor visitor) {
        if (value instanceof Reading reading) {
            visitor.reading(pointer, key.quantity().orElseThrow(), reading);
        } else if (value instanceof Record record) {
            visit(record, pointer, visitor);
        } else if (value instanceof Optional<?> optional) {
            optional.ifPresent(held -> visitValue(key, held, pointer, visitor));
        } else if (value instanceof List<?> list) {
            for (int i = 0; i < list.size(); i++) {
                visitValue(key, list.get(i), Pointer.to(pointer, i), visitor);
            }
        } else if (value instanceof Map<?, ?> map) {
            map.forEach((name, held) -> visitValue(key, held, Pointer.to(pointer, (String) name), visitor));
        }
    }
}
