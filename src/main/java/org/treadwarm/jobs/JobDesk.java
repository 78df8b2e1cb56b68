package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.function.UnaryOperator;
import org.treadwarm.intake.Document;
import org.treadwarm.store.Change;
import org.treadwarm.store.JobContent;
import org.treadwarm.store.JobListings;
import org.treadwarm.store.JobRevision;
import org.treadwarm.store.JobSearch;
import org.treadwarm.store.Jobs;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.store.SaveResult;

/** The jobs of the firm, read and judged. A survey with problems is kept as a draft. */
public final class JobDesk {
    private final Jobs jobs;
    private final Rooms rooms;

    public JobDesk(Jobs jobs) {
        this.jobs = jobs;
        this.rooms = new Rooms(jobs, this);
    }

    /** The rooms of the jobs, each saved for itself. */
    public Rooms rooms() {
        return rooms;
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

    /** Reads and judges a job that shall be started, which takes its time when it is large. */
    public Prepared prepared(String name, JsonNode survey) {
        JsonNode document = survey.deepCopy();
        Ids.give(document, Document.mapper().createObjectNode());
        return new Prepared(name, document, Judgement.unsized(document));
    }

    /** Starts a job, which only has to be kept. */
    public Job create(Prepared prepared, Change change) {
        RevisionHeader header = jobs.create(
                content(prepared.name(), prepared.document(), prepared.judged()),
                words(prepared.name(), prepared.document()),
                change);
        return job(header, prepared.document(), prepared.judged());
    }

    /** Saves a whole job as its next revision, if it still is at the expected one. */
    public Saving save(String id, long expectedRevision, String name, JsonNode survey, Change change) {
        return preparedSave(id, expectedRevision, name, survey, change).get();
    }

    /** Reads and judges a job as its next revision; what is given back only keeps it. */
    public Supplier<Saving> preparedSave(
            String id, long expectedRevision, String name, JsonNode survey, Change change) {
        JsonNode document = survey.deepCopy();
        Optional<JobRevision> current = jobs.current(id);
        if (current.isEmpty()) {
            return Saving.Missing::new;
        }
        Ids.give(document, Pieces.survey(current.get().content().pieces()));
        Prepared prepared = new Prepared(name, document, Judgement.unsized(document));
        return () -> keep(id, expectedRevision, prepared, change);
    }

    private Saving keep(String id, long expectedRevision, Prepared prepared, Change change) {
        String name = prepared.name();
        JsonNode document = prepared.document();
        Judgement judged = prepared.judged();
        SaveResult result =
                jobs.save(id, expectedRevision, content(name, document, judged), words(name, document), change);
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

    /** The document of one revision of a job as it was typed, without judging it. */
    public Optional<JsonNode> document(String id, long revision) {
        return jobs.revision(id, revision)
                .map(found -> Pieces.survey(found.content().pieces()));
    }

    /**
     * The revision that made a part of the newest revision what it is.
     *
     * @param since looked for after this revision
     * @param part takes the part out of a document
     */
    public Optional<RevisionHeader> lastChange(String id, long since, UnaryOperator<JsonNode> part) {
        List<RevisionHeader> later = jobs.revisions(id).stream()
                .filter(header -> header.revision() > since)
                .toList();
        Optional<RevisionHeader> last = Optional.empty();
        JsonNode now = MissingNode.getInstance();
        for (RevisionHeader header : later) {
            JsonNode then = part.apply(document(id, header.revision()).orElseThrow());
            if (last.isPresent() && !then.equals(now)) {
                return last;
            }
            now = then;
            last = Optional.of(header);
        }
        return last;
    }

    /** The revisions of a job, newest first. */
    public List<RevisionHeader> revisions(String id) {
        return jobs.revisions(id);
    }

    /** A part of the revisions of a job, newest first, see {@link Jobs#revisions(String, int, long)}. */
    public List<RevisionHeader> revisions(String id, int limit, long before) {
        return jobs.revisions(id, limit, before);
    }

    /** The newest revision of every job, the one saved last first. */
    public List<RevisionHeader> list() {
        return jobs.list();
    }

    /** The jobs that match by name, names of rooms, and who surveyed, see {@link org.treadwarm.store.JobShelf#find}. */
    public JobListings find(JobSearch search) {
        for (String id : jobs.shelf().withoutWords()) {
            jobs.current(id)
                    .ifPresent(job -> jobs.shelf()
                            .note(
                                    id,
                                    words(
                                            job.header().name(),
                                            Pieces.survey(job.content().pieces()))));
        }
        return jobs.shelf().find(search);
    }

    private static String words(String name, JsonNode document) {
        StringBuilder words = new StringBuilder(name);
        document.path("rooms")
                .forEach(room -> words.append('\n').append(room.path("name").asText("")));
        words.append('\n').append(document.path("site").path("surveyedBy").asText(""));
        return words.toString();
    }

    /** Whether a job is archived; empty if there is no such job. */
    public Optional<Boolean> isArchived(String id) {
        return jobs.shelf().isArchived(id);
    }

    /** Archives a job or brings it back; says whether there is such a job. */
    public boolean archive(String id, boolean archived, String who) {
        return jobs.shelf().archive(id, archived, who);
    }

    /** A copy of a document in which every part has the id that a save would give it. */
    public static JsonNode withIds(JsonNode document, JsonNode before) {
        JsonNode copy = document.deepCopy();
        Ids.give(copy, before);
        return copy;
    }

    /** Old revisions brought back, and jobs made from jobs. */
    public JobCopies copies() {
        return new JobCopies(this);
    }

    private static JobContent content(String name, JsonNode document, Judgement judged) {
        return new JobContent(name, !judged.problems().isEmpty(), Pieces.of(document));
    }

    private static Job job(JobRevision revision) {
        JsonNode document = Pieces.survey(revision.content().pieces());
        return job(revision.header(), document, Judgement.unsized(document));
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
                judged.problems());
    }
}
