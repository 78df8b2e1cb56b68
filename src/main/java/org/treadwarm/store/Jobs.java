package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.Query;
import org.jdbi.v3.core.statement.StatementContext;

/** The jobs with all their revisions. Nothing saved is ever changed or removed. */
public final class Jobs {
    private static final String HEADER_COLUMNS =
            "job_id, revision, name, draft, manifest_sha256, saved_at, saved_by, note";
    private static final String NEWEST =
            "revision = (select max(newest.revision) from revision newest where" + " newest.job_id = revision.job_id)";

    private final Database database;
    private final Audit audit;
    private final Clock clock;

    Jobs(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
    }

    /** Starts a job: revision 1, under a new id of 12 characters a-z and 2-9. */
    public RevisionHeader create(JobContent content, Change change) {
        Manifest manifest = Manifest.of(content.pieces());
        return database.change(handle -> {
            RevisionHeader header = header(Secrets.id(), 1, content, change);
            handle.createUpdate("insert into job (id, created_at) values (:id, :createdAt)")
                    .bind("id", header.jobId())
                    .bind("createdAt", Times.text(header.savedAt()))
                    .execute();
            insert(handle, header, manifest);
            audit.append(handle, change.who(), "created job", header.jobId());
            return header;
        });
    }

    /**
     * Adds a revision if the job still is at the expected one. Every accepted save is a revision, be it the same as the one
     * before: its number rises by exactly one each time, and what did not change takes no new room.
     *
     * @param expectedRevision the revision the change was made from
     */
    public SaveResult save(String id, long expectedRevision, JobContent content, Change change) {
        Manifest manifest = Manifest.of(content.pieces());
        return database.change(handle -> newest(handle, id)
                .map(current -> save(
                        handle, current, expectedRevision, header(id, expectedRevision + 1, content, change), manifest))
                .orElseGet(SaveResult.Missing::new));
    }

    private SaveResult save(Handle handle, Row current, long expectedRevision, RevisionHeader next, Manifest manifest) {
        long revision = current.header().revision();
        if (expectedRevision != revision) {
            return new SaveResult.Stale(revision);
        }
        insert(handle, next, manifest);
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

    /** The newest revision of every job, the most recently changed job first. */
    public List<RevisionHeader> list() {
        return database.read(handle -> handle.createQuery("select " + HEADER_COLUMNS
                        + " from job join revision on revision.job_id = job.id where " + NEWEST
                        + " order by saved_at desc, job_id")
                .map((row, context) -> Row.of(row, context).header())
                .list());
    }

    /**
     * A part of {@link #list}. The list holds still while it is read part by part: it is of the jobs as they were when its
     * first part was read, to the millisecond.
     *
     * @param limit at most so many jobs, at least 1
     * @param after where to go on; empty for the first part
     */
    public JobsPage page(int limit, Optional<JobCursor> after) {
        return database.read(handle -> {
            Optional<Instant> asOf = after.map(JobCursor::asOf).or(() -> lastSave(handle));
            return asOf.map(then -> page(handle, limit, then, after))
                    .orElseGet(() -> new JobsPage(List.of(), Optional.empty()));
        });
    }

    private static Optional<Instant> lastSave(Handle handle) {
        return handle.createQuery("select saved_at from revision order by saved_at desc limit 1")
                .mapTo(String.class)
                .findOne()
                .map(Times::instant);
    }

    private static JobsPage page(Handle handle, int limit, Instant asOf, Optional<JobCursor> after) {
        String goOn = after.isPresent() ? " and (saved_at < :savedAt or saved_at = :savedAt and job_id > :jobId)" : "";
        Query query = handle.createQuery("select " + HEADER_COLUMNS + " from revision where saved_at <= :asOf"
                        + " and not exists (select 1 from revision later where later.job_id = revision.job_id"
                        + " and later.revision > revision.revision and later.saved_at <= :asOf)" + goOn
                        + " order by saved_at desc, job_id limit :limit")
                .bind("asOf", Times.text(asOf))
                .bind("limit", limit + 1);
        after.ifPresent(
                last -> query.bind("savedAt", Times.text(last.savedAt())).bind("jobId", last.jobId()));
        List<RevisionHeader> found =
                query.map((row, context) -> Row.of(row, context).header()).list();
        if (found.size() <= limit) {
            return new JobsPage(found, Optional.empty());
        }
        RevisionHeader last = found.get(limit - 1);
        return new JobsPage(
                List.copyOf(found.subList(0, limit)), Optional.of(new JobCursor(asOf, last.savedAt(), last.jobId())));
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
        handle.createUpdate("insert into revision (" + HEADER_COLUMNS
                        + ") values (:jobId, :revision, :name, :draft, :manifest, :savedAt, :savedBy, :note)")
                .bind("jobId", header.jobId())
                .bind("revision", header.revision())
                .bind("name", header.name())
                .bind("draft", header.draft() ? 1 : 0)
                .bind("manifest", manifest.root())
                .bind("savedAt", Times.text(header.savedAt()))
                .bind("savedBy", header.savedBy())
                .bind("note", header.note())
                .execute();
    }

    private record Row(RevisionHeader header, String manifest) {
        static Row of(ResultSet row, StatementContext context) throws SQLException {
            RevisionHeader header = new RevisionHeader(
                    row.getString("job_id"),
                    row.getLong("revision"),
                    row.getString("name"),
                    row.getInt("draft") == 1,
                    Times.instant(row.getString("saved_at")),
                    row.getString("saved_by"),
                    row.getString("note"));
            return new Row(header, row.getString("manifest_sha256"));
        }

        JobRevision read(Handle handle) {
            return new JobRevision(
                    header, new JobContent(header.name(), header.draft(), Contents.read(handle, manifest)));
        }
    }
}
