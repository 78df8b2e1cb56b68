package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Optional;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Predicate;
import java.util.function.Supplier;
import org.treadwarm.store.Change;
import org.treadwarm.store.JobRevision;
import org.treadwarm.store.Jobs;

/**
 * The rooms of the jobs, each saved for itself: a save of one room is never in the way of a save of another. Every save is a
 * revision of the job.
 */
public final class Rooms {
    private static final int MOST_TRIES = 100;

    private final Jobs jobs;
    private final JobDesk desk;

    // Savers of one job queue here, in order. Judging a job takes too long to keep the store's only writer waiting.
    private final ReentrantLock[] queues = new ReentrantLock[32];

    Rooms(Jobs jobs, JobDesk desk) {
        this.jobs = jobs;
        this.desk = desk;
        for (int i = 0; i < queues.length; i++) {
            queues[i] = new ReentrantLock(true);
        }
    }

    /** What became of a save. */
    public sealed interface Saving {
        /** It is kept; the room as it was taken out stands here too. */
        record Saved(RoomVersion room) implements Saving {}

        /** Somebody saved this room in between; {@code yours} is what was to be saved, with the ids of its parts. */
        record Stale(RoomVersion theirs, JsonNode yours) implements Saving {}

        /** The job has a room of this id already. */
        record Taken(RoomVersion room) implements Saving {}

        /** There is no such job or room, or what stands at the job's rooms is no list. */
        record Missing() implements Saving {}

        /** Others saved the job so often meanwhile that this save found no gap; nothing was kept. */
        record Crowded() implements Saving {}
    }

    private interface Edit {
        /** Changes the rooms in place and says which one to look at afterwards, or how the save ends without a revision. */
        Edited of(RoomVersion before, ObjectNode document);
    }

    private record Edited(Optional<Saving> end, Optional<RoomVersion> removed) {
        static final Edited GO_ON = new Edited(Optional.empty(), Optional.empty());

        static Edited end(Saving saving) {
            return new Edited(Optional.of(saving), Optional.empty());
        }
    }

    /** The room in the newest revision of its job. */
    public Optional<RoomVersion> current(String job, String id) {
        return jobs.current(job)
                .flatMap(revision ->
                        find(revision, Pieces.survey(revision.content().pieces()), id));
    }

    private static Optional<RoomVersion> find(JobRevision revision, JsonNode document, String id) {
        int index = index(document, id);
        return index < 0
                ? Optional.empty()
                : Optional.of(new RoomVersion(
                        revision.header(), id, document.path("rooms").get(index)));
    }

    private static int index(JsonNode document, String id) {
        JsonNode rooms = document.path("rooms");
        for (int i = 0; rooms.isArray() && i < rooms.size(); i++) {
            if (rooms.get(i).path("id").isTextual()
                    && rooms.get(i).path("id").textValue().equals(id)) {
                return i;
            }
        }
        return -1;
    }

    /**
     * Saves a room, if it still has one of the expected tags.
     *
     * @param room the room; its id becomes the given one
     */
    public Saving save(String job, String id, Predicate<String> expected, ObjectNode room, Change change) {
        ObjectNode named = room.deepCopy().put("id", id);
        return edit(job, id, change, (before, document) -> {
            JsonNode unchanged = document.deepCopy();
            ArrayNode rooms = (ArrayNode) document.path("rooms");
            rooms.set(index(document, id), named.deepCopy());
            if (expected.test(before.tag())) {
                return Edited.GO_ON;
            }
            Ids.give(document, unchanged);
            return Edited.end(new Saving.Stale(before, rooms.get(index(document, id))));
        });
    }

    /** Takes a room out, if it still has one of the expected tags. */
    public Saving remove(String job, String id, Predicate<String> expected, Change change) {
        return edit(job, id, change, (before, document) -> {
            if (!expected.test(before.tag())) {
                return Edited.end(new Saving.Stale(before, MissingNode.getInstance()));
            }
            ((ArrayNode) document.path("rooms")).remove(index(document, id));
            return new Edited(Optional.empty(), Optional.of(before));
        });
    }

    private Saving edit(String job, String id, Change change, Edit edit) {
        return oneAfterTheOther(job, () -> {
            Optional<JobRevision> current = jobs.current(job);
            if (current.isEmpty()) {
                return Optional.of(new Saving.Missing());
            }
            JsonNode document = Pieces.survey(current.get().content().pieces());
            Optional<RoomVersion> before = find(current.get(), document, id);
            if (before.isEmpty()) {
                return Optional.of(new Saving.Missing());
            }
            RoomVersion untouched =
                    new RoomVersion(before.get().job(), id, before.get().room().deepCopy());
            Edited edited = edit.of(untouched, (ObjectNode) document);
            return edited.end().isPresent()
                    ? edited.end()
                    : keep(current.get(), document, id, edited.removed(), change);
        });
    }

    /** Adds a room as the last; a room without an id gets one. */
    public Saving add(String job, ObjectNode room, Change change) {
        return oneAfterTheOther(job, () -> {
            Optional<JobRevision> current = jobs.current(job);
            if (current.isEmpty()) {
                return Optional.of(new Saving.Missing());
            }
            JsonNode document = Pieces.survey(current.get().content().pieces());
            Optional<RoomVersion> taken =
                    find(current.get(), document, room.path("id").asText());
            if (taken.isPresent()) {
                return Optional.of(new Saving.Taken(taken.get()));
            }
            JsonNode listed = document.path("rooms");
            if (!listed.isMissingNode() && !listed.isArray()) {
                return Optional.of(new Saving.Missing());
            }
            JsonNode before = document.deepCopy();
            ObjectNode added = room.deepCopy();
            ArrayNode rooms = document.path("rooms") instanceof ArrayNode known
                    ? known
                    : ((ObjectNode) document).putArray("rooms");
            rooms.add(added);
            Ids.give(document, before);
            return keep(current.get(), document, added.path("id").asText(), Optional.empty(), change);
        });
    }

    private Optional<Saving> keep(
            JobRevision current, JsonNode document, String id, Optional<RoomVersion> removed, Change change) {
        String job = current.header().jobId();
        JobDesk.Saving saving =
                desk.save(job, current.header().revision(), current.header().name(), document, change);
        if (saving instanceof JobDesk.Saving.Saved saved) {
            JobRevision now = jobs.revision(job, saved.job().revision()).orElseThrow();
            return removed.map(room -> new RoomVersion(now.header(), id, room.room()))
                    .or(() -> find(now, saved.job().document(), id))
                    .map(Saving.Saved::new);
        }
        return saving instanceof JobDesk.Saving.Missing ? Optional.of(new Saving.Missing()) : Optional.empty();
    }

    private interface Try {
        /** Saves; empty when somebody saved the job in the same moment. */
        Optional<Saving> run();
    }

    private Saving oneAfterTheOther(String job, Try save) {
        return inTurn(job, () -> {
            for (int i = 0; i < MOST_TRIES; i++) {
                Optional<Saving> saving = save.run();
                if (saving.isPresent()) {
                    return saving.get();
                }
            }
            return new Saving.Crowded();
        });
    }

    /**
     * Does something when no other save of this job's rooms runs in this process. Whoever saves a room within a transaction of
     * the store must be here first: savers wait for their turn and then for the store, never the other way round.
     */
    public <T> T inTurn(String job, Supplier<T> work) {
        ReentrantLock queue = queues[Math.floorMod(job.hashCode(), queues.length)];
        queue.lock();
        try {
            return work.get();
        } finally {
            queue.unlock();
        }
    }
}
