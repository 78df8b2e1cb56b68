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

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;

    QuickPages(JobDesk desk, Visitors visitors, View view) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
    }

    void show(Context ctx) {
        show(ctx, 200, start(), "");
    }

    private static JsonNode start() {
        try (InputStream in = QuickPages.class.getResourceAsStream("/demo/one-room.json")) {
            return Document.mapper().readTree(in);
        } catch (IOException e) {
            throw new UncheckedIOException("the example room is missing from the program", e);
        }
    }

    private void show(Context ctx, int status, JsonNode document, String notice) {
        Part part = part(document);
        Forms forms = new Forms(document, Judgement.of(document).problems());
        Map<String, Object> model = new HashMap<>();
        model.put("part", part);
        model.put("partName", "");
        model.put("nameError", "");
        model.put("site", forms.form(SITE, "Site", Site.class));
        model.put("form", forms.form(part.pointer(), part.formTitle(), part.type()));
        model.put("errors", forms.errors());
        model.put("notice", notice);
        model.put("action", "/one-room");
        model.put("back", "/jobs");
        model.put("backWords", "Jobs");
        model.put("quick", true);
        model.put("feet", WallFootOffers.NONE);
        model.put("document", text(document));
        model.put("materials", Materials.all());
        model.put("revision", 0);
        model.put("jobName", "One room without a job");
        model.putAll(Answer.of(document, part));
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
        Map<String, Object> model = new HashMap<>(Answer.of(document, part(document)));
        model.put("part", part(document));
        view.show(ctx, 200, "answer", model);
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
        boolean problems = !Judgement.of(document).problems().isEmpty();
        boolean size = action.equals("save");
        show(
                ctx,
                size && problems ? 422 : 200,
                document,
                size && problems ? "What is marked must be put right before it can be sized." : "");
    }
}
