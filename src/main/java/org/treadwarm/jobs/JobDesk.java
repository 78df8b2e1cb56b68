package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.Optional;
import org.treadwarm.intake.Document;
import org.treadwarm.store.Change;
import org.treadwarm.store.JobContent;
import org.treadwarm.store.JobCursor;
import org.treadwarm.store.JobRevision;
import org.treadwarm.store.Jobs;
import org.treadwarm.store.JobsPage;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.store.SaveResult;

/** The jobs of the firm, read and judged. A survey with problems is kept as a draft. */
public final class JobDesk {
    private final Jobs jobs;

    public JobDesk(Jobs jobs) {
        this.jobs = jobs;
    }

    /** What became of a save. */
    public sealed interface Saving {
        /** It is kept as this revision. */
        record Saved(Job job) implements Saving {}

        /** Somebody saved in between: the job is at this revision now. */
        record Stale(long revision) implements Saving {}

        /** There is no such job. */
        record Missing() implements Saving {}
    }

    /** Starts a job. */
    public Job create(String name, JsonNode survey, Change change) {
        return create(prepared(name, survey), change);
    }

    /** A job read and judged, but not kept yet. */
    public record Prepared(String name, JsonNode document, Judgement judged) {}

    /** Reads and judges a job that shall be started, which may take long. */
    public Prepared prepared(String name, JsonNode survey) {
        JsonNode document = survey.deepCopy();
        Ids.give(document, Document.mapper().createObjectNode());
        return new Prepared(name, document, Judgement.of(document));
    }

    /** Starts a job, which only has to be kept. */
    public Job create(Prepared prepared, Change change) {
        RevisionHeader header = jobs.create(content(prepared.name(), prepared.document(), prepared.judged()), change);
        return job(header, prepared.document(), prepared.judged());
    }

    /** Saves a whole job as its next revision, if it still is at the expected one. */
    public Saving save(String id, long expectedRevision, String name, JsonNode survey, Change change) {
        JsonNode document = survey.deepCopy();
        Optional<JobRevision> current = jobs.current(id);
        if (current.isEmpty()) {
            return new Saving.Missing();
        }
        Ids.give(document, Pieces.survey(current.get().content().pieces()));
        Judgement judged = Judgement.of(document);
        SaveResult result = jobs.save(id, expectedRevision, content(name, document, judged), change);
        if (result instanceof SaveResult.Saved saved) {
            RevisionHeader header =
                    jobs.revision(id, saved.revision()).orElseThrow().header();
            return new Saving.Saved(job(header, document, judged));
        }
        return result instanceof SaveResult.Stale stale
                ? new Saving.Stale(stale.currentRevision())
                : new Saving.Missing();
    }

    /** The document of a job's newest revision, read but not judged. */
    public Optional<JsonNode> document(String id) {
        return jobs.current(id).map(revision -> Pieces.survey(revision.content().pieces()));
    }

    /** The newest revision of a job. */
    public Optional<Job> current(String id) {
        return jobs.current(id).map(JobDesk::job);
    }

    /** One revision of a job. */
    public Optional<Job> revision(String id, long revision) {
        return jobs.revision(id, revision).map(JobDesk::job);
    }

    /** The revisions of a job, newest first. */
    public List<RevisionHeader> revisions(String id) {
        return jobs.revisions(id);
    }

    /** A part of the revisions of a job, newest first, see {@link Jobs#revisions(String, int, long)}. */
    public List<RevisionHeader> revisions(String id, int limit, long before) {
        return jobs.revisions(id, limit, before);
    }

    /** A part of the list of jobs, see {@link Jobs#page}. */
    public JobsPage page(int limit, Optional<JobCursor> after) {
        return jobs.page(limit, after);
    }

    /** The newest revision of every job, the one changed last first. */
    public List<RevisionHeader> list() {
        return jobs.list();
    }

    private static JobContent content(String name, JsonNode document, Judgement judged) {
        return new JobContent(name, !judged.problems().isEmpty(), Pieces.of(document));
    }

    private static Job job(JobRevision revision) {
        JsonNode document = Pieces.survey(revision.content().pieces());
        return job(revision.header(), document, Judgement.of(document));
    }

    private static Job job(RevisionHeader header, JsonNode document, Judgement judged) {
        return new Job(
                header.jobId(),
                header.revision(),
                header.name(),
                header.savedAt(),
                header.savedBy(),
                header.note(),
                document,
                judged.survey(),
                judged.sizing(),
                judged.problems());
    }
}
