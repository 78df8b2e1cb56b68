package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Optional;
import java.util.function.Supplier;
import org.treadwarm.store.Change;

/** Old revisions brought back, and jobs made from jobs. */
public final class JobCopies {
    private static final String COPY = " (copy)";
    private static final int LONGEST_NAME = 200;

    private final JobDesk desk;

    JobCopies(JobDesk desk) {
        this.desk = desk;
    }

    /**
     * Saves an old revision again, with its name, as the job's next one.
     *
     * @param expectedRevision the revision that the job must still be at
     */
    public JobDesk.Saving restore(String id, long revision, long expectedRevision, String who) {
        return preparedRestore(id, revision, expectedRevision, who).get();
    }

    /** Reads and judges what {@link #restore} saves; what is given back only keeps it. */
    public Supplier<JobDesk.Saving> preparedRestore(String id, long revision, long expectedRevision, String who) {
        Optional<JsonNode> document = desk.document(id, revision);
        if (document.isEmpty()) {
            return JobDesk.Saving.Missing::new;
        }
        String name = desk.revisions(id).stream()
                .filter(header -> header.revision() == revision)
                .findFirst()
                .orElseThrow()
                .name();
        return desk.preparedSave(
                id, expectedRevision, name, document.get(), new Change(who, "revision " + revision + " restored"));
    }

    /** Starts a job with the newest revision of another; empty if there is no such job. */
    public Optional<Job> copy(String id, String who) {
        return preparedCopy(id, who).map(Supplier::get);
    }

    /** Reads and judges what {@link #copy} starts; what is given back only keeps it. */
    public Optional<Supplier<Job>> preparedCopy(String id, String who) {
        return desk.current(id).map(job -> {
            JobDesk.Prepared prepared = desk.prepared(copied(job.name()), job.document());
            Change change = new Change(who, "copy of job " + id + ", revision " + job.revision());
            return () -> desk.create(prepared, change);
        });
    }

    private static String copied(String name) {
        int most = LONGEST_NAME - COPY.length();
        if (name.length() <= most) {
            return name + COPY;
        }
        int end = Character.isHighSurrogate(name.charAt(most - 1)) ? most - 1 : most;
        return name.substring(0, end) + COPY;
    }
}
