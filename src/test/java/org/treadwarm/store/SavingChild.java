package org.treadwarm.store;

import java.nio.file.Path;
import java.time.Clock;

/** Runs in a process of its own: saves revision after revision of a job and prints each number once it is saved. */
final class SavingChild {
    private SavingChild() {}

    public static void main(String[] arguments) {
        try (Store store = Store.open(Path.of(arguments[0]), Clock.systemUTC())) {
            long revision = Long.parseLong(arguments[2]);
            while (store.jobs().save(arguments[1], revision, content(revision + 1), Change.by("child"))
                    instanceof SaveResult.Saved saved) {
                revision = saved.revision();
                System.out.println("saved " + revision);
            }
        }
    }

    static JobContent content(long revision) {
        return Samples.jobOf(100, (int) (revision % 100), "text of revision " + revision);
    }
}
