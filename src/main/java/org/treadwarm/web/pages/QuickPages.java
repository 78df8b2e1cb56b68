package org.treadwarm.web.pages;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.store.Change;
import org.treadwarm.survey.Site;
import org.treadwarm.tables.Materials;
import org.treadwarm.web.security.Visitors;

/** One room without a job: the whole survey travels in the form, and nothing is kept until it is made a job. */
final class QuickPages {
    private static final String SITE = "/site";
    private static final String ADDRESS = "/one-room";

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;
    private final WrittenAnswers answers;
    private final SolvingAhead ahead;
    private final TypedRooms typed = new TypedRooms(System::nanoTime);

    QuickPages(JobDesk desk, Visitors visitors, View view, SolvingAhead ahead, WrittenAnswers answers) {
        this.ahead = ahead;
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
        this.answers = answers;
    }

    void show(Context ctx) {
        show(ctx, 200, start(), "");
    }

    /** {@code GET /one-room/{id}}: a room as it was typed, after its floor was solved. */
    void showTyped(Context ctx) {
        Optional<JsonNode> document = typed(ctx);
        if (document.isPresent()) {
            show(ctx, 200, document.get(), "");
        } else {
            ctx.redirect(ADDRESS, HttpStatus.SEE_OTHER);
        }
    }

    /** The room that was kept under the id in the address. */
    Optional<JsonNode> typed(Context ctx) {
        return typed.find(ctx.pathParam("id"), person(ctx));
    }

    private String person(Context ctx) {
        return visitors.session(ctx).orElseThrow().person().id();
    }

    /** The example that the form starts with. */
    static JsonNode start() {
        try (InputStream in = QuickPages.class.getResourceAsStream("/demo/one-room.json")) {
            return Document.mapper().readTree(in);
        } catch (IOException e) {
            throw new UncheckedIOException("the example room is missing from the program", e);
        }
    }

    private void show(Context ctx, int status, JsonNode document, String notice) {
        Part part = part(document);
        Forms forms = new Forms(document, Judgement.unsized(document).problems());
        Map<String, Object> model = new HashMap<>();
        model.put("part", part);
        model.put("partName", "");
        model.put("nameError", "");
        model.put("site", forms.form(SITE, "Site", Site.class));
        model.put("form", forms.form(part.pointer(), part.formTitle(), part.type()));
        model.put("errors", forms.errors());
        model.put("notice", notice);
        model.put("action", ADDRESS);
        model.put("back", "/jobs");
        model.put("backWords", "Jobs");
        model.put("quick", true);
        model.put("feet", WallFootOffers.NONE);
        model.put("document", text(document));
        model.put("materials", Materials.all());
        model.put("revision", 0);
        model.put("jobName", "One room without a job");
        model.put(
                "answer",
                SolvingAhead.isUnsized(ctx)
                        ? answers.unsized(document, part, SolvingAhead.STOPPED)
                        : answers.of(document, part));
        view.show(ctx, status, "part", model);
    }

    private static Part part(JsonNode document) {
        return Part.room(0, "", document.at("/rooms/0/name").asText());
    }

    private static String text(JsonNode document) {
        try {
            return Document.mapper().writeValueAsString(document);
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException("the room cannot be written", e);
        }
    }

    /** The survey in the form, with what was typed; empty when it is no survey any more. */
    private static Optional<ObjectNode> document(Context ctx) {
        try {
            JsonNode tree = Document.read(EntryPages.text(ctx, "document").getBytes(StandardCharsets.UTF_8));
            if (!(tree instanceof ObjectNode document)
                    || !document.at("/rooms/0").isObject()) {
                return Optional.empty();
            }
            part(document).write(document, ctx.formParamMap());
            FormData data = new FormData();
            ctx.formParamMap().forEach((field, values) -> {
                if (field.startsWith(SITE + "/")) {
                    data.write(
                            FormData.steps(field.substring(SITE.length())),
                            Site.class,
                            document.path("site"),
                            values.get(0));
                }
            });
            return Optional.of(document);
        } catch (NotJsonException e) {
            return Optional.empty();
        }
    }

    void preview(Context ctx) {
        ObjectNode document = document(ctx).orElseGet(() -> (ObjectNode) start());
        ahead.preview(ctx, answers, document, part(document));
    }

    /** Makes the room a job. */
    void keep(Context ctx) {
        Optional<ObjectNode> read = document(ctx);
        if (read.isEmpty()) {
            incomplete(ctx);
            return;
        }
        String name = read.get().at("/rooms/0/name").asText().strip();
        String who = visitors.session(ctx).orElseThrow().person().name();
        Job job = desk.create(name.isEmpty() ? "One room" : name, read.get(), Change.by(who));
        ctx.redirect("/jobs/" + job.id(), HttpStatus.SEE_OTHER);
    }

    private void incomplete(Context ctx) {
        show(ctx, 422, start(), "The form came back incomplete, so the example stands here again.");
    }

    void change(Context ctx) {
        Optional<ObjectNode> read = document(ctx);
        if (read.isEmpty()) {
            incomplete(ctx);
            return;
        }
        ObjectNode document = read.get();
        String action = EntryPages.text(ctx, "do");
        part(document).act(document, action, "");
        if (action.startsWith("assume:" + SITE + "/")) {
            new FormData()
                    .assume(
                            FormData.steps(action.substring(("assume:" + SITE).length())),
                            Site.class,
                            document.path("site"));
        }
        boolean problems = !Judgement.unsized(document).problems().isEmpty();
        String address = problems ? ADDRESS : ADDRESS + "/" + typed.keep(document, person(ctx));
        if (!problems && ahead.waits(ctx, document, address, address + "?" + SolvingAhead.UNSIZED)) {
            return;
        }
        boolean size = action.equals("save");
        show(
                ctx,
                size && problems ? 422 : 200,
                document,
                size && problems ? "What is marked must be put right before it can be sized." : "");
    }
}
