package org.treadwarm.jobs;

import java.lang.ref.SoftReference;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.function.Supplier;
import java.util.function.ToIntFunction;

/**
 * What was made of texts last, to be had again without making it: for what follows from its text alone, and so never goes stale.
 * Texts and what was made of them have a bounded size together; what was made gives way when memory runs short. For any number
 * of threads.
 */
public final class Remembered<V> {
    private final int largest;
    private final ToIntFunction<V> sizeOf;
    private final Map<String, Entry<V>> last = new LinkedHashMap<>(64, 0.75f, true);
    private int size;

    private record Entry<V>(SoftReference<V> value, int size) {}

    /**
     * Remembers nothing yet.
     *
     * @param largest size of everything remembered, in characters
     * @param sizeOf about how many characters a value is worth
     */
    public Remembered(int largest, ToIntFunction<V> sizeOf) {
        this.largest = largest;
        this.sizeOf = sizeOf;
    }

    /** What is made of a text; made only when it is not remembered. */
    public V of(String text, Supplier<V> make) {
        return of(text, make, made -> true);
    }

    /** The same, but only what is lasting is remembered. */
    public V of(String text, Supplier<V> make, Predicate<V> lasting) {
        return find(text).orElseGet(() -> {
            V made = make.get();
            if (lasting.test(made)) {
                remember(text, made);
            }
            return made;
        });
    }

    private synchronized Optional<V> find(String text) {
        return Optional.ofNullable(last.get(text)).map(entry -> entry.value().get());
    }

    private synchronized void remember(String text, V made) {
        int added = text.length() + sizeOf.applyAsInt(made);
        if (added > largest) {
            return;
        }
        Entry<V> before = last.put(text, new Entry<>(new SoftReference<>(made), added));
        size += added - (before == null ? 0 : before.size());
        while (size > largest) {
            String eldest = last.keySet().iterator().next();
            size -= last.remove(eldest).size();
        }
    }
}
