package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.Intake;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.RoomVersion;
import org.treadwarm.jobs.Rooms;
import org.treadwarm.jobs.Rooms.Saving;
import org.treadwarm.store.KeptAnswer;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Room;
import org.treadwarm.web.Problems;
import org.treadwarm.wire.Json;

/** Single rooms over the API: each has a tag of its own, so that work in two rooms never collides. */
final class RoomsApi {
    private static final String ID = "[A-Za-z0-9-]{1,40}";

    private final Rooms rooms;
    private final Repeats repeats;

    RoomsApi(JobDesk desk, Repeats repeats) {
        this.rooms = desk.rooms();
        this.repeats = repeats;
    }

    /** A room as it was typed, in the revision of its job that it was read from or that its save made. */
    record RoomAnswer(String job, long revision, Instant savedAt, String savedBy, String id, JsonNode room) {
        static RoomAnswer of(RoomVersion version) {
            return new RoomAnswer(
                    version.job().jobId(),
                    version.job().revision(),
                    version.job().savedAt(),
                    version.job().savedBy(),
                    version.id(),
                    version.room());
        }
    }

    /**
     * The problem that somebody else saved the room in between, with all that is needed to settle it.
     *
     * @param yours what was to be saved; left out when the room was to be taken out
     * @param theirs what stands there now
     * @param differences from theirs to yours
     * @param requestId the id of the request that met it
     */
    record RoomConflict(
            String type,
            String title,
            int status,
            String detail,
            List<Problem> errors,
            Optional<JsonNode> yours,
            JsonNode theirs,
            List<DifferenceAnswer> differences,
            Optional<String> requestId) {
        static RoomConflict of(Saving.Stale stale, Optional<String> requestId) {
            JsonNode yours = stale.yours();
            JsonNode theirs = stale.theirs().room();
            return new RoomConflict(
                    "urn:treadwarm:problem:stale",
                    "The room was saved by somebody else in between",
                    412,
                    "Both versions are here. Take theirs in, and send yours again with the tag of theirs.",
                    List.of(),
                    yours.isMissingNode() ? Optional.empty() : Optional.of(yours),
                    theirs,
                    yours.isMissingNode() ? List.of() : DifferenceAnswer.between(theirs, yours, Room.class),
                    requestId);
        }
    }

    /** {@code GET /api/v1/jobs/{id}/rooms/{room}}. */
    void get(Context ctx) {
        Optional<RoomVersion> room = rooms.current(ctx.pathParam("id"), ctx.pathParam("room"));
        if (room.isPresent()) {
            answer(ctx, 200, room.get());
        } else {
            JobsApi.missing(ctx);
        }
    }

    /** {@code POST /api/v1/jobs/{id}/rooms}. */
    void add(Context ctx) {
        Optional<ObjectNode> room = body(ctx);
        if (room.isEmpty()) {
            return;
        }
        JsonNode id = room.get().path("id");
        if (!id.isMissingNode() && !(id.isTextual() && id.textValue().matches(ID))) {
            refuseId(ctx, id, "this is no id of a room", "1 to 40 letters, digits and hyphens, or none");
            return;
        }
        String job = ctx.pathParam("id");
        rooms.inTurn(job, () -> {
            repeats.create(ctx, () -> added(ctx, id, rooms.add(job, room.get(), JobsApi.change(ctx))));
            return true;
        });
    }

    private static Optional<KeptAnswer> added(Context ctx, JsonNode id, Saving saving) {
        if (saving instanceof Saving.Saved saved) {
            RoomVersion room = saved.room();
            String location = "/api/v1/jobs/" + room.job().jobId() + "/rooms/" + room.id();
            String text = new String(Json.bytes(RoomAnswer.of(room)), StandardCharsets.UTF_8);
            return Optional.of(new KeptAnswer(201, location, Tags.quoted(room.tag()), text));
        }
        if (saving instanceof Saving.Taken) {
            refuseId(ctx, id, "the job has a room of this id already", "an id that is free, or none");
        } else {
            refuse(ctx, saving);
        }
        return Optional.empty();
    }

    /** {@code PUT /api/v1/jobs/{id}/rooms/{room}} with If-Match. */
    void put(Context ctx) {
        String id = ctx.pathParam("room");
        if (rooms.current(ctx.pathParam("id"), id).isEmpty()) {
            JobsApi.missing(ctx);
            return;
        }
        Optional<Predicate<String>> expected = Tags.expected(ctx, "room");
        Optional<ObjectNode> room = expected.isEmpty() ? Optional.empty() : body(ctx);
        if (room.isEmpty()) {
            return;
        }
        JsonNode given = room.get().path("id");
        if (!given.isMissingNode() && !given.asText().equals(id)) {
            refuseId(ctx, given, "a room keeps its id", id + ", or none");
            return;
        }
        Saving saving = rooms.save(ctx.pathParam("id"), id, expected.get(), room.get(), JobsApi.change(ctx));
        if (saving instanceof Saving.Saved saved) {
            answer(ctx, 200, saved.room());
        } else {
            refuse(ctx, saving);
        }
    }

    /** {@code DELETE /api/v1/jobs/{id}/rooms/{room}} with If-Match. The room stays in the job's history. */
    void remove(Context ctx) {
        String id = ctx.pathParam("room");
        if (rooms.current(ctx.pathParam("id"), id).isEmpty()) {
            JobsApi.missing(ctx);
            return;
        }
        Optional<Predicate<String>> expected = Tags.expected(ctx, "room");
        if (expected.isEmpty()) {
            return;
        }
        Saving saving = rooms.remove(ctx.pathParam("id"), id, expected.get(), JobsApi.change(ctx));
        if (saving instanceof Saving.Saved saved) {
            SizingApi.json(ctx, 200, RoomAnswer.of(saved.room()));
        } else {
            refuse(ctx, saving);
        }
    }

    private static void answer(Context ctx, int status, RoomVersion room) {
        ctx.header("ETag", Tags.quoted(room.tag()));
        SizingApi.json(ctx, status, RoomAnswer.of(room));
    }

    private static void refuse(Context ctx, Saving saving) {
        if (saving instanceof Saving.Stale stale) {
            ctx.header("ETag", Tags.quoted(stale.theirs().tag()));
            Problems.write(ctx, 412, RoomConflict.of(stale, Problems.requestId(ctx)));
        } else if (saving instanceof Saving.Crowded) {
            Problems.plain(
                    ctx,
                    503,
                    "crowded",
                    "The job is being saved by many at once",
                    "Nothing of this was kept. Send it again in a moment.");
        } else {
            JobsApi.missing(ctx);
        }
    }

    private static void refuseId(Context ctx, JsonNode given, String message, String allowed) {
        Problems.invalid(ctx, List.of(new Problem("/id", JobsApi.shortened(given.toString()), message, allowed)));
    }

    private static Optional<ObjectNode> body(Context ctx) {
        Optional<JsonNode> tree = Bodies.read(ctx, Bodies.SIZING);
        if (tree.isEmpty()) {
            return Optional.empty();
        }
        if (!(tree.get() instanceof ObjectNode room)) {
            Problems.invalid(ctx, List.of(new Problem("", "no object", "a room is an object", "{\"name\": ...}")));
            return Optional.empty();
        }
        ObjectNode survey = Document.mapper().createObjectNode();
        survey.putArray("rooms").add(room);
        Intake.tidy(survey);
        return Optional.of(room);
    }
}
