package org.treadwarm.survey;

import java.lang.invoke.MethodHandle;
import java.lang.invoke.MethodHandles;
import java.lang.invoke.MethodType;
import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.lang.reflect.Type;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.treadwarm.units.Declared;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.Reading;
import org.treadwarm.units.ReadingException;
import org.treadwarm.units.ReadingParser;
import org.treadwarm.units.TextTable;
import org.treadwarm.units.Wording;

/**
 * The keys of one kind of object in the document, read once from its record: what each holds, whether it is required, and
 * its one declaration. Reading the document, walking it, the API's schema and the forms all go by this.
 */
public final class Shape {
    private static final ClassValue<Shape> SHAPES = new ClassValue<>() {
        @Override
        protected Shape computeValue(Class<?> type) {
            return new Shape(type.asSubclass(Record.class));
        }
    };

    private final Class<? extends Record> type;
    private final Map<String, Key> keys;

    private final TextTable<Integer> places;
    private final Key[] inOrder;
    private final Key[] holding;
    private final Object[] whenAbsent;
    private final long required;
    private final Constructor<?> constructor;

    /** What a key holds. */
    public enum Holds {
        QUANTITY,
        TEXT,
        WORD,
        OBJECT
    }

    /** How many a key holds. */
    public enum Many {
        ONE,
        OPTIONAL,
        LIST,
        MAP
    }

    /**
     * One key of the object.
     *
     * @param name the key in the document
     * @param holds what it holds
     * @param many how many of it
     * @param type Reading, String, the enum of words, or the record of the object
     * @param quantity its declaration, when it holds a quantity
     * @param label its label
     * @param help its sentence of help; empty for none
     * @param longest the most characters of a text
     * @param fallback the text that stands when it is left out; empty for none
     * @param whenAbsent what stands when it is left out; empty when the document must have it
     * @param words the words that may stand here, when it holds a word
     * @param accessor takes it out of a record
     */
    public record Key(
            String name,
            Holds holds,
            Many many,
            Class<?> type,
            Optional<Declared> quantity,
            String label,
            String help,
            int longest,
            String fallback,
            Optional<Object> whenAbsent,
            List<Word> words,
            MethodHandle accessor) {
        /** Whether the document must have it. */
        public boolean required() {
            return whenAbsent.isEmpty();
        }

        /** What a record holds under this key. */
        public Object in(Record owner) {
            try {
                return accessor.invokeExact(owner);
            } catch (Throwable e) {
                throw new IllegalStateException("cannot read " + name, e);
            }
        }
    }

    private Shape(Class<? extends Record> type) {
        this.type = type;
        this.keys = new LinkedHashMap<>();
        RecordComponent[] components = type.getRecordComponents();
        Class<?>[] parameters = new Class<?>[components.length];
        for (int i = 0; i < components.length; i++) {
            Key key = key(components[i]);
            keys.put(key.name(), key);
            parameters[i] = components[i].getType();
        }
        inOrder = keys.values().toArray(Key[]::new);
        whenAbsent =
                keys.values().stream().map(key -> key.whenAbsent().orElse(null)).toArray();
        required = required(inOrder);
        Map<String, Integer> numbered = new HashMap<>();
        for (int i = 0; i < inOrder.length; i++) {
            numbered.put(inOrder[i].name(), i);
        }
        places = new TextTable<>(numbered);
        holding = keys.values().stream()
                .filter(key -> key.holds() == Holds.QUANTITY || key.holds() == Holds.OBJECT)
                .toArray(Key[]::new);
        try {
            this.constructor = type.getDeclaredConstructor(parameters);
        } catch (NoSuchMethodException e) {
            throw new IllegalStateException(e);
        }
    }

    /** The shape of a record. */
    public static Shape of(Class<? extends Record> type) {
        return SHAPES.get(type);
    }

    private static long required(Key[] keys) {
        if (keys.length > Long.SIZE) {
            throw new IllegalStateException("more than " + Long.SIZE + " keys");
        }
        long required = 0;
        for (int i = 0; i < keys.length; i++) {
            required |= keys[i].required() ? 1L << i : 0;
        }
        return required;
    }

    /** The record this is the shape of. */
    public Class<? extends Record> type() {
        return type;
    }

    /** Its keys by name, in the order of the record. */
    public Map<String, Key> keys() {
        return keys;
    }

    /** A key by its place in the order of the record. */
    public Key key(int index) {
        return inOrder[index];
    }

    /** The place of a key in the order of the record; -1 when there is no such key. */
    public int indexOf(String name) {
        Integer place = places.at(name, 0);
        return place == null ? -1 : place;
    }

    /** What stands under each key when it is left out, in order; null where the document must have it. */
    public Object[] whenAbsent() {
        return whenAbsent.clone();
    }

    /** The keys that the document must have, as the bits of their places. */
    public long required() {
        return required;
    }

    /** The keys below which readings may lie. */
    Key[] holdingReadings() {
        return holding;
    }

    /** A record of this shape from the values of its keys, in order. */
    public Record make(Object[] values) {
        try {
            return (Record) constructor.newInstance(values);
        } catch (InstantiationException | IllegalAccessException | InvocationTargetException e) {
            throw new IllegalStateException("cannot make " + type.getSimpleName(), e);
        }
    }

    private static Key key(RecordComponent component) {
        Class<?> outer = component.getType();
        Many many = outer == Optional.class
                ? Many.OPTIONAL
                : outer == List.class ? Many.LIST : outer == Map.class ? Many.MAP : Many.ONE;
        Class<?> held = many == Many.ONE ? outer : lastArgument(component.getGenericType());
        Holds holds = held == Reading.class
                ? Holds.QUANTITY
                : held == String.class ? Holds.TEXT : held.isEnum() ? Holds.WORD : Holds.OBJECT;
        Optional<Declared> quantity =
                Optional.ofNullable(component.getAnnotation(Quantity.class)).map(Declared::by);
        Optional<Wording> wording = Optional.ofNullable(component.getAnnotation(Wording.class));
        String fallback = quantity.map(Declared::fallback)
                .or(() -> wording.map(Wording::fallback))
                .orElse("");
        return new Key(
                component.getName(),
                holds,
                many,
                held,
                quantity,
                quantity.map(Declared::label)
                        .or(() -> wording.map(Wording::label))
                        .orElse(component.getName()),
                quantity.map(Declared::help)
                        .or(() -> wording.map(Wording::help))
                        .orElse(""),
                wording.map(Wording::longest).orElse(0),
                fallback,
                whenAbsent(many, fallback, holds, held, quantity),
                holds == Holds.WORD ? words(held) : List.of(),
                accessor(component));
    }

    private static MethodHandle accessor(RecordComponent component) {
        try {
            return MethodHandles.publicLookup()
                    .unreflect(component.getAccessor())
                    .asType(MethodType.methodType(Object.class, Record.class));
        } catch (IllegalAccessException e) {
            throw new IllegalStateException("cannot read " + component.getName(), e);
        }
    }

    private static Optional<Object> whenAbsent(
            Many many, String fallback, Holds holds, Class<?> type, Optional<Declared> quantity) {
        return switch (many) {
            case OPTIONAL -> Optional.of(Optional.empty());
            case LIST -> Optional.of(List.of());
            case MAP -> Optional.of(Map.of());
            case ONE -> fallback.isEmpty() ? Optional.empty() : Optional.of(meaning(fallback, holds, type, quantity));
        };
    }

    private static List<Word> words(Class<?> type) {
        return Stream.of(type.getEnumConstants()).map(Word.class::cast).toList();
    }

    private static Object meaning(String text, Holds holds, Class<?> type, Optional<Declared> quantity) {
        if (holds == Holds.WORD) {
            for (Object constant : type.getEnumConstants()) {
                if (((Word) constant).word().equals(text)) {
                    return constant;
                }
            }
            throw new IllegalStateException(text + " is no " + type.getSimpleName());
        }
        if (holds == Holds.TEXT) {
            return text;
        }
        try {
            return ReadingParser.parse(text, quantity.orElseThrow().kind());
        } catch (ReadingException e) {
            throw new IllegalStateException(text + " is no reading", e);
        }
    }

    private static Class<?> lastArgument(Type type) {
        Type[] arguments = ((ParameterizedType) type).getActualTypeArguments();
        return (Class<?>) arguments[arguments.length - 1];
    }
}
