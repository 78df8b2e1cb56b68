package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.StatementContext;

/** The jobs with all their revisions. Nothing saved is ever changed or removed. */
public final class Jobs {
    static final String HEADER_COLUMNS = "job_id, revision, name, draft, manifest_sha256, saved_at, saved_by, note";
    static final String NEWEST = " from job join revision on save_number = last_save";

    private final Database database;
    private final Audit audit;
    private final Clock clock;
    private final JobShelf shelf;

    Jobs(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
        this.shelf = new JobShelf(database, audit, clock);
    }

    /** Finding jobs, and putting them away. */
    public JobShelf shelf() {
        return shelf;
    }

    /** Starts a job that is found by its name. */
    public RevisionHeader create(JobContent content, Change change) {
        return create(content, content.name(), change);
    }

    /**
     * Starts a job: revision 1, under a new id of 12 characters a-z and 2-9.
     *
     * @param words what it is found by
     */
    public RevisionHeader create(JobContent content, String words, Change change) {
        Manifest manifest = Manifest.of(content.pieces());
        return database.change(handle -> {
            RevisionHeader header = header(Secrets.id(), 1, content, change);
            handle.createUpdate("insert into job (id, created_at) values (:id, :createdAt)")
                    .bind("id", header.jobId())
                    .bind("createdAt", Times.text(header.savedAt()))
                    .execute();
            insert(handle, header, manifest);
            JobShelf.note(handle, header.jobId(), words);
            audit.append(handle, change.who(), "created job", header.jobId());
            return header;
        });
    }

    /** Adds a revision of a job that is found by its name. */
    public SaveResult save(String id, long expectedRevision, JobContent content, Change change) {
        return save(id, expectedRevision, content, content.name(), change);
    }

    /**
     * Adds a revision if the job still is at the expected one. Every accepted save is a revision, be it the same as the one
     * before: its number rises by exactly one each time, and what did not change takes no new room.
     *
     * @param expectedRevision the revision the change was made from
     * @param words what the job is found by
     */
    public SaveResult save(String id, long expectedRevision, JobContent content, String words, Change change) {
        Manifest manifest = Manifest.of(content.pieces());
        return database.change(handle -> newest(handle, id)
                .map(current -> save(
                        handle,
                        current,
                        expectedRevision,
                        header(id, expectedRevision + 1, content, change),
                        manifest,
                        words))
                .orElseGet(SaveResult.Missing::new));
    }

    private SaveResult save(
            Handle handle, Row current, long expectedRevision, RevisionHeader next, Manifest manifest, String words) {
        long revision = current.header().revision();
        if (expectedRevision != revision) {
            return new SaveResult.Stale(revision);
        }
        insert(handle, next, manifest);
        JobShelf.note(handle, next.jobId(), words);
        audit.append(handle, next.savedBy(), "saved job", next.jobId() + " revision " + next.revision());
        return new SaveResult.Saved(next.revision());
    }

    private RevisionHeader header(String id, long revision, JobContent content, Change change) {
        return new RevisionHeader(
                id, revision, content.name(), content.draft(), Times.now(clock), change.who(), change.note());
    }

    /** The newest revision of the job; empty if there is no such job. */
    public Optional<JobRevision> current(String id) {
        return database.read(handle -> newest(handle, id).map(row -> row.read(handle)));
    }

    /** One revision of the job; empty if there is no such job or it has no such revision. */
    public Optional<JobRevision> revision(String id, long revision) {
        return database.read(handle -> handle.createQuery(
                        "select " + HEADER_COLUMNS + " from revision where job_id = :id and revision = :revision")
                .bind("id", id)
                .bind("revision", revision)
                .map(Row::of)
                .findOne()
                .map(row -> row.read(handle)));
    }

    /** The job's history, newest first; empty if there is no such job. */
    public List<RevisionHeader> revisions(String id) {
        return database.read(handle -> handle.createQuery(
                        "select " + HEADER_COLUMNS + " from revision where job_id = :id order by revision desc")
                .bind("id", id)
                .map((row, context) -> Row.of(row, context).header())
                .list());
    }

    /** The newest revision of every job, the one saved last first. */
    public List<RevisionHeader> list() {
        return database.read(
                handle -> handle.createQuery("select " + HEADER_COLUMNS + NEWEST + " order by last_save desc")
                        .map((row, context) -> Row.of(row, context).header())
                        .list());
    }

    /**
     * A part of the job's history, newest first; empty if there is no such job or nothing before.
     *
     * @param limit at most so many revisions
     * @param before only revisions of lower numbers
     */
    public List<RevisionHeader> revisions(String id, int limit, long before) {
        return database.read(handle -> handle.createQuery(
                        "select " + HEADER_COLUMNS
                                + " from revision where job_id = :id and revision < :before order by revision desc limit :limit")
                .bind("id", id)
                .bind("before", before)
                .bind("limit", limit)
                .map((row, context) -> Row.of(row, context).header())
                .list());
    }

    private static Optional<Row> newest(Handle handle, String id) {
        return handle.createQuery(
                        "select " + HEADER_COLUMNS + " from revision where job_id = :id order by revision desc limit 1")
                .bind("id", id)
                .map(Row::of)
                .findOne();
    }

    private static void insert(Handle handle, RevisionHeader header, Manifest manifest) {
        Contents.add(handle, manifest);
        long saveNumber = JobShelf.lastSave(handle) + 1;
        handle.createUpdate("insert into revision (" + HEADER_COLUMNS
                        + ", save_number) values (:jobId, :revision, :name, :draft, :manifest, :savedAt, :savedBy, :note,"
                        + " :saveNumber)")
                .bind("jobId", header.jobId())
                .bind("revision", header.revision())
                .bind("name", header.name())
                .bind("draft", header.draft() ? 1 : 0)
                .bind("manifest", manifest.root())
                .bind("savedAt", Times.text(header.savedAt()))
                .bind("savedBy", header.savedBy())
                .bind("note", header.note())
                .bind("saveNumber", saveNumber)
                .execute();
        JobShelf.saved(handle, header.jobId(), saveNumber);
    }

    static RevisionHeader header(ResultSet row) throws SQLException {
        return new RevisionHeader(
                row.getString("job_id"),
                row.getLong("revision"),
                row.getString("name"),
                row.getInt("draft") == 1,
                Times.instant(row.getString("saved_at")),
                row.getString("saved_by"),
                row.getString("note"));
    }

    private record Row(RevisionHeader header, String manifest) {
        static Row of(ResultSet row, StatementContext context) throws SQLException {
            return new Row(Jobs.header(row), row.getString("manifest_sha256"));
        }

        JobRevision read(Handle handle) {
            return new JobRevision(
                    header, new JobContent(header.name(), header.draft(), Contents.read(handle, manifest)));
        }
    }
}
