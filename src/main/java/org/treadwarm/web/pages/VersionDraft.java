package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Site;
import org.treadwarm.survey.Space;

/**
 * What somebody typed about a part that somebody else saved meanwhile; it travels in the form that lets choose.
 *
 * @param kind rooms, spaces, assemblies, or {@value #SITE}
 * @param key a room's id, or the name of a space or an assembly, or {@value #SITE}
 * @param base the revision that it began from
 * @param seen the revision that it is compared with
 * @param mine what was typed; a missing node if the part was to be taken out
 * @param name the name that a space or an assembly was to have
 */
record VersionDraft(String kind, String key, long base, long seen, JsonNode mine, String name) {
    /** The kind and the key of a job's site, which has its fields in the page of the job. */
    static final String SITE = "site";

    private static final Map<String, Class<? extends Record>> TYPES =
            Map.of("rooms", Room.class, "spaces", Space.class, "assemblies", Assembly.class, SITE, Site.class);

    /** The draft in a form; empty when it is none. */
    static Optional<VersionDraft> read(Context ctx) {
        String base = EntryPages.text(ctx, "base");
        String seen = EntryPages.text(ctx, "seen");
        if (!base.matches("[0-9]{1,15}") || !seen.matches("[0-9]{1,15}")) {
            return Optional.empty();
        }
        String typed = EntryPages.text(ctx, "mine");
        try {
            JsonNode mine =
                    typed.isEmpty() ? MissingNode.getInstance() : Document.read(typed.getBytes(StandardCharsets.UTF_8));
            return Optional.of(new VersionDraft(
                            ctx.pathParam("part"),
                            ctx.pathParam("name"),
                            Long.parseLong(base),
                            Long.parseLong(seen),
                            mine,
                            EntryPages.text(ctx, "part-name").strip()))
                    .filter(VersionDraft::isPossible);
        } catch (NotJsonException e) {
            return Optional.empty();
        }
    }

    private boolean isPossible() {
        return switch (kind) {
            case "rooms" ->
                mine.isMissingNode()
                        || mine.isObject() && mine.path("id").asText().equals(key);
            case SITE -> key.equals(SITE) && mine.isObject();
            default -> TYPES.containsKey(kind) && (mine.isMissingNode() || mine.isObject());
        };
    }

    /** The shape of the part. */
    Class<? extends Record> type() {
        return TYPES.get(kind);
    }

    /** What a page calls it. */
    String title(JsonNode theirs) {
        return switch (kind) {
            case "rooms" -> (mine.isMissingNode() ? theirs : mine).path("name").asText("a room");
            case SITE -> "the site";
            default -> key;
        };
    }

    /** The part in a document; a missing node if the document has it not. */
    JsonNode in(JsonNode document) {
        return kind.equals(SITE)
                ? document.path(SITE)
                : Part.find(document, kind, key)
                        .map(part -> document.at(part.pointer()))
                        .orElse(MissingNode.getInstance());
    }

    /** Where the choice is sent to. */
    String action(String jobId) {
        return Links.part(jobId, kind, key) + "/versions";
    }

    /** The page that shows the part. */
    String page(String jobId, JsonNode document, String keyNow) {
        return Part.find(document, kind, keyNow).isPresent() ? Links.part(jobId, kind, keyNow) : "/jobs/" + jobId;
    }

    /** Puts the result where the part stands or stood, and gives its key then. */
    String put(ObjectNode document, JsonNode result) {
        Optional<Part> there = Part.find(document, kind, key);
        if (result.isMissingNode()) {
            there.ifPresent(part -> part.remove(document));
            return key;
        }
        if (kind.equals(SITE)) {
            document.set(SITE, result);
            return key;
        }
        return kind.equals("rooms") ? putRoom(document, there, result) : putNamed(document, result);
    }

    private String putRoom(ObjectNode document, Optional<Part> there, JsonNode result) {
        ArrayNode rooms = document.path("rooms") instanceof ArrayNode known ? known : document.putArray("rooms");
        if (there.isPresent()) {
            rooms.set(Integer.parseInt(there.get().pointer().substring("/rooms/".length())), result);
        } else {
            rooms.add(result);
        }
        return key;
    }

    private String putNamed(ObjectNode document, JsonNode result) {
        (document.path(kind) instanceof ObjectNode all ? all : document.putObject(kind)).set(key, result);
        Part part = Part.find(document, kind, key).orElseThrow();
        return part.refusal(document, name).isEmpty() ? part.act(document, "", name) : key;
    }
}
