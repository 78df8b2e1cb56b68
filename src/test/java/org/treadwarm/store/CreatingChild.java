package org.treadwarm.store;

import java.nio.file.Path;
import java.time.Clock;

/** Runs in a process of its own: creates a job for a named request and dies before the answer is kept. */
final class CreatingChild {
    private CreatingChild() {}

    public static void main(String[] arguments) {
        Store store = Store.open(Path.of(arguments[0]), Clock.systemUTC());
        store.keptAnswers().once(new NamedRequest(arguments[1], "q-1", "a".repeat(64)), () -> {
            store.jobs().create(Samples.job("Mill Lane"), Samples.BY_ANNA);
            Runtime.getRuntime().halt(7);
            throw new IllegalStateException("it lives on");
        });
    }
}
