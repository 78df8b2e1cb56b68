package org.treadwarm.store;

import java.time.Clock;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.Query;

/** Finding jobs by the words noted for them, and putting them away without losing them. */
public final class JobShelf {
    private final Database database;
    private final Audit audit;
    private final Clock clock;

    JobShelf(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
    }

    /** A page of the jobs that match, the one changed last first. */
    public JobListings find(JobSearch search) {
        String condition = Jobs.NEWEST
                + search.archived()
                        .map(archived -> " and archived_at is " + (archived ? "not null" : "null"))
                        .orElse("")
                + (search.text().isBlank() ? "" : " and words like :words escape '!'")
                + (search.after().isPresent() ? " and (saved_at < :time or saved_at = :time and job_id > :job)" : "");
        List<JobListing> found = database.read(handle -> {
            Query query = handle.createQuery("select " + Jobs.HEADER_COLUMNS
                            + ", archived_at from job join revision on revision.job_id = job.id where " + condition
                            + " order by saved_at desc, job_id limit :limit")
                    .bind("limit", search.limit() + 1);
            if (!search.text().isBlank()) {
                query.bind("words", "%" + escaped(folded(search.text().strip())) + "%");
            }
            search.afterTime().ifPresent(time -> query.bind("time", time));
            search.afterJob().ifPresent(job -> query.bind("job", job));
            return query.map((row, context) -> new JobListing(Jobs.header(row), row.getString("archived_at") != null))
                    .list();
        });
        boolean more = found.size() > search.limit();
        List<JobListing> shown = more ? found.subList(0, search.limit()) : found;
        return new JobListings(
                List.copyOf(shown),
                more ? Optional.of(JobSearch.place(shown.get(shown.size() - 1).newest())) : Optional.empty());
    }

    private static String escaped(String text) {
        return text.replace("!", "!!").replace("%", "!%").replace("_", "!_");
    }

    private static String folded(String text) {
        return text.toLowerCase(Locale.ROOT);
    }

    /** Notes what a job is found by, within a change of it. */
    static void note(Handle handle, String id, String words) {
        handle.createUpdate("update job set words = :words where id = :id")
                .bind("id", id)
                .bind("words", folded(words))
                .execute();
    }

    /** Notes what a job is found by. */
    public void note(String id, String words) {
        database.change(handle -> {
            note(handle, id, words);
            return true;
        });
    }

    /** Jobs that an older program saved: nothing is noted of what they are found by. */
    public List<String> withoutWords() {
        return database.read(handle -> handle.createQuery("select id from job where words is null")
                .mapTo(String.class)
                .list());
    }

    /** Whether a job is archived; empty if there is no such job. */
    public Optional<Boolean> isArchived(String id) {
        return database.read(handle -> isArchived(handle, id));
    }

    private static Optional<Boolean> isArchived(Handle handle, String id) {
        return handle.createQuery("select case when archived_at is null then 0 else 1 end from job where id = :id")
                .bind("id", id)
                .mapTo(Integer.class)
                .findOne()
                .map(archived -> archived == 1);
    }

    /**
     * Archives a job or brings it back. Its revisions stay as they are.
     *
     * @return whether there is such a job
     */
    public boolean archive(String id, boolean archived, String who) {
        return database.change(handle -> {
            Optional<Boolean> before = isArchived(handle, id);
            if (before.isPresent() && before.get() != archived) {
                handle.createUpdate("update job set archived_at = :at where id = :id")
                        .bind("id", id)
                        .bind("at", archived ? Times.text(Times.now(clock)) : null)
                        .execute();
                audit.append(handle, who, archived ? "archived job" : "brought back job", id);
            }
            return before.isPresent();
        });
    }
}
