package org.treadwarm.store;

import java.time.Clock;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.Query;

/** Finding jobs by the words noted for them, and putting them away without losing them. */
public final class JobShelf {
    private static final String LISTED = Jobs.HEADER_COLUMNS + ", archived_at";
    private static final String LAST_BEFORE = "(select max(early.save_number) from revision early"
            + " where early.job_id = job.id and early.save_number <= :begin)";

    private final Database database;
    private final Audit audit;
    private final Clock clock;

    JobShelf(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
    }

    /**
     * A page of the jobs that match. They come in the order of their last saves before the list began, the last first, so every
     * job that was there then comes exactly once, whatever is saved meanwhile. Each is shown as it is now, and must match as it
     * is now.
     */
    public JobListings find(JobSearch search) {
        return database.read(handle -> {
            long begin = search.after().map(JobPlace::begin).orElseGet(() -> lastSave(handle));
            long before = search.after().map(JobPlace::last).orElse(begin + 1);
            List<Told> found = query(handle, search)
                    .bind("begin", begin)
                    .bind("before", before)
                    .bind("limit", search.limit() + 1)
                    .map((row, context) -> new Told(
                            new JobListing(Jobs.header(row), row.getString("archived_at") != null),
                            row.getLong("told_by")))
                    .list();
            List<Told> shown = found.size() > search.limit() ? found.subList(0, search.limit()) : found;
            Optional<JobPlace> next = found.size() > search.limit()
                    ? Optional.of(
                            new JobPlace(begin, shown.get(shown.size() - 1).save()))
                    : Optional.empty();
            return new JobListings(shown.stream().map(Told::job).toList(), next);
        });
    }

    /** A job, and the number of its last save before the list began. */
    private record Told(JobListing job, long save) {}

    /** The number of the last save, 0 for none. Changes come one after the other, so what is saved later has a higher one. */
    static long lastSave(Handle handle) {
        return handle.createQuery("select coalesce(max(save_number), 0) from revision")
                .mapTo(Long.class)
                .one();
    }

    private static Query query(Handle handle, JobSearch search) {
        String archived = search.archived()
                .map(each -> " and archived_at is " + (each ? "not null" : "null"))
                .orElse("");
        boolean anyWords = search.text().isBlank();
        String matches = archived + (anyWords ? "" : " and words like :words escape '!'");
        String unchanged = "select " + LISTED + ", last_save as told_by" + Jobs.NEWEST
                + " where last_save <= :begin and last_save < :before" + matches
                + " order by last_save desc limit :limit";
        String savedSince = "select " + LISTED + ", " + LAST_BEFORE + " as told_by" + Jobs.NEWEST
                + " where last_save > :begin" + matches;
        Query query = handle.createQuery("select * from (" + unchanged + ") unchanged union all"
                + " select * from (" + savedSince + ") saved_since where told_by < :before"
                + " order by told_by desc limit :limit");
        return anyWords
                ? query
                : query.bind("words", "%" + escaped(folded(search.text().strip())) + "%");
    }

    private static String escaped(String text) {
        return text.replace("!", "!!").replace("%", "!%").replace("_", "!_");
    }

    private static String folded(String text) {
        return text.toLowerCase(Locale.ROOT);
    }

    /** Notes the number of a job's last save, within that save. */
    static void saved(Handle handle, String id, long saveNumber) {
        handle.createUpdate("update job set last_save = :number where id = :id")
                .bind("id", id)
                .bind("number", saveNumber)
                .execute();
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
