package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.sizing.WallFootEvaluation;
import org.treadwarm.sizing.WallFootEvaluation.FootPsi;
import org.treadwarm.store.Change;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.WallFootQuestion;
import org.treadwarm.web.Computations;
import org.treadwarm.web.security.Visitors;

/** A room's wall foot, solved in section: what must be known for it, its psi values, and the way of one into its junction. */
final class WallFootPages {
    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;
    private final Computations computations;
    private final ComputationPages waiting;

    WallFootPages(JobDesk desk, Visitors visitors, View view, Computations computations, ComputationPages waiting) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
        this.computations = computations;
        this.waiting = waiting;
    }

    /** The room of an address and its junction. */
    private record Place(Job job, Part part, JsonNode junction, int index) {
        String address() {
            return Links.part(job.id(), part.kind(), part.key()) + "/wall-foot/" + id();
        }

        String id() {
            return junction.path("id").asText();
        }

        String room() {
            return Links.part(job.id(), part.kind(), part.key());
        }

        String title() {
            return junction.path("name").asText("junction");
        }
    }

    /** A solved foot, with what it was solved from. */
    record Solved(
            String junction,
            String wall,
            Map<String, List<String>> typed,
            JsonNode question,
            WallFootEvaluation answer,
            List<Answer.Picture> pictures) {}

    private Optional<Place> place(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("job"));
        Optional<Part> part = job.flatMap(found -> Part.find(found.document(), "rooms", ctx.pathParam("name")));
        if (part.isEmpty()) {
            return Optional.empty();
        }
        JsonNode room = job.get().document().at(part.get().pointer());
        for (int i = 0; i < room.path("junctions").size(); i++) {
            JsonNode junction = room.path("junctions").get(i);
            if (junction.path("id").asText().equals(ctx.pathParam("junction"))
                    && WallFootDraft.isFoot(room, junction)) {
                return Optional.of(new Place(job.get(), part.get(), junction, i));
            }
        }
        return Optional.empty();
    }

    void show(Context ctx) {
        Optional<Place> place = place(ctx);
        if (place.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        WallFootDraft.Made made =
                WallFootDraft.of(place.get().job().document(), place.get().part());
        if (made.draft().isEmpty() || made.draft().get().walls().isEmpty()) {
            blocked(ctx, place.get(), made);
            return;
        }
        String wall = made.draft().get().walls().keySet().iterator().next();
        form(ctx, 200, place.get(), made.draft().get(), wall, made.draft().get().question(wall, Map.of()), List.of());
    }

    private void blocked(Context ctx, Place place, WallFootDraft.Made made) {
        Map<String, Object> model = model(place);
        model.put("blocked", made.draft().isEmpty() ? made.whyNot() : WallFootDraft.NO_WALL);
        view.show(ctx, 200, "wall-foot", model);
    }

    private static Map<String, Object> model(Place place) {
        Map<String, Object> model = new HashMap<>();
        model.put("blocked", "");
        model.put("jobName", place.job().name());
        model.put("roomName", place.part().title());
        model.put("room", place.room());
        model.put("action", place.address());
        model.put("title", "Psi of " + place.title() + ", solved in section");
        model.put("errors", List.of());
        model.put("notice", "");
        return model;
    }

    private void form(
            Context ctx,
            int status,
            Place place,
            WallFootDraft draft,
            String wall,
            ObjectNode question,
            List<Problem> problems) {
        Map<String, Object> model = model(place);
        Forms forms = new Forms(question, problems);
        model.put("fields", forms.fields(WallFootQuestion.class, WallFootDraft.ASKED, "The foot"));
        model.put("errors", forms.errors());
        model.put("lacks", lacks(place, wall, problems));
        model.put("wall", wall);
        model.put("walls", draft.walls());
        view.show(ctx, status, "wall-foot", model);
    }

    /** What the room or the wall lacks, each with the page where it is typed. */
    private static Map<String, String> lacks(Place place, String wall, List<Problem> problems) {
        Map<String, String> lacks = new LinkedHashMap<>();
        for (Problem problem : problems) {
            String key = FormData.steps(problem.pointer() + "/").get(0);
            if (!WallFootDraft.ASKED.contains(key)) {
                boolean ofWall = key.equals("wall");
                String words = ofWall && problem.pointer().equals("/wall")
                        ? "the wall \"" + wall
                                + "\" is known neither by layers nor by a U-value that is more than its films"
                        : problem.message() + (ofWall ? " (wall \"" + wall + "\")" : "");
                lacks.put(words, ofWall ? Links.part(place.job().id(), "assemblies", wall) : place.room());
            }
        }
        return lacks;
    }

    void change(Context ctx) {
        Optional<Place> place = place(ctx);
        WallFootDraft.Made made = place.map(at -> WallFootDraft.of(at.job().document(), at.part()))
                .orElse(WallFootDraft.Made.not(""));
        String wall = EntryPages.text(ctx, "wall");
        if (place.isEmpty()
                || made.draft().isEmpty()
                || !made.draft().get().walls().containsKey(wall)) {
            JobPages.missing(ctx, view);
            return;
        }
        ObjectNode question = made.draft().get().question(wall, ctx.formParamMap());
        String action = EntryPages.text(ctx, "do");
        if (action.startsWith("assume:/") && WallFootDraft.ASKED.contains(action.substring(8))) {
            new FormData().assume(List.of(action.substring(8)), WallFootQuestion.class, question);
            form(ctx, 200, place.get(), made.draft().get(), wall, question, List.of());
            return;
        }
        Outcome<WallFootQuestion> outcome = Intake.wallFoot(question);
        if (outcome instanceof Outcome.Refused<WallFootQuestion> refused) {
            form(ctx, 422, place.get(), made.draft().get(), wall, question, refused.problems());
            return;
        }
        WallFootQuestion accepted = ((Outcome.Accepted<WallFootQuestion>) outcome).value();
        Map<String, List<String>> typed = typed(ctx);
        waiting.begin(
                ctx,
                "Psi of " + place.get().title() + ", " + place.get().part().title(),
                id -> place.get().address() + "/" + id,
                place.get().address(),
                (stopped, progress) -> {
                    WallFootEvaluation answer =
                            WallFootEvaluation.of(accepted, stopped, share -> progress.accept(0.9 * share));
                    List<Answer.Picture> pictures = WallFootPicture.all(accepted, wall, stopped);
                    return new Solved(place.get().id(), wall, typed, question, answer, pictures);
                });
    }

    private static Map<String, List<String>> typed(Context ctx) {
        Map<String, List<String>> typed = new HashMap<>();
        WallFootDraft.ASKED.forEach(key -> typed.put("/" + key, List.of(EntryPages.text(ctx, "/" + key))));
        return typed;
    }

    /** {@code GET .../wall-foot/{junction}/{id}}: the solved psi values. */
    void result(Context ctx) {
        Optional<Place> place = place(ctx);
        Optional<Solved> solved = place.flatMap(at -> solved(ctx, at));
        if (solved.isEmpty()) {
            gone(ctx, place);
            return;
        }
        result(ctx, 200, place.get(), solved.get(), "");
    }

    private Optional<Solved> solved(Context ctx, Place place) {
        return computations
                .result(ctx.pathParam("id"), Solved.class)
                .filter(found -> found.junction().equals(place.id()));
    }

    private void gone(Context ctx, Optional<Place> place) {
        if (place.isEmpty()) {
            JobPages.missing(ctx, view);
        } else {
            ctx.redirect(place.get().address(), HttpStatus.SEE_OTHER);
        }
    }

    private void result(Context ctx, int status, Place place, Solved solved, String notice) {
        Map<String, Object> model = model(place);
        model.put("notice", notice);
        model.put("action", place.address() + "/" + ctx.pathParam("id"));
        model.put("again", place.address());
        model.put("wall", solved.wall());
        model.put("now", Forms.shown(place.junction().path("psi")));
        model.put("without", WallFootWords.line(solved.answer().withoutEdge()));
        model.put("with", solved.answer().withEdge().map(WallFootWords::line));
        model.put("pictures", solved.pictures());
        model.put("takenOff", WallFootWords.takenOff(solved.answer()));
        view.show(ctx, status, "wall-foot-result", model);
    }

    /** Puts one of the psi values into the junction. */
    void store(Context ctx) {
        Optional<Place> place = place(ctx);
        Optional<Solved> solved = place.flatMap(at -> solved(ctx, at));
        if (solved.isEmpty()) {
            gone(ctx, place);
            return;
        }
        Job job = place.get().job();
        if (!stillHolds(place.get(), solved.get())) {
            result(
                    ctx,
                    409,
                    place.get(),
                    solved.get(),
                    "The room, its wall or its site has changed since; solve it anew.");
            return;
        }
        boolean edge = EntryPages.text(ctx, "do").equals("with-edge");
        Optional<FootPsi> psi = edge
                ? solved.get().answer().withEdge()
                : Optional.of(solved.get().answer().withoutEdge());
        if (psi.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        ObjectNode document = (ObjectNode) job.document().deepCopy();
        ObjectNode junction = (ObjectNode) document.at(place.get().part().pointer())
                .path("junctions")
                .get(place.get().index());
        junction.putObject("psi")
                .put("reading", WallFootWords.reading(psi.get()))
                .put("basis", "solved")
                .put("remark", WallFootWords.remark(solved.get(), edge));
        String who = visitors.session(ctx).orElseThrow().person().name();
        Saving saving = desk.save(job.id(), job.revision(), job.name(), document, Change.by(who));
        if (saving instanceof Saving.Saved) {
            String anchor = Forms.id(
                    place.get().part().pointer() + "/junctions/" + place.get().index());
            ctx.redirect(place.get().room() + "#" + anchor, HttpStatus.SEE_OTHER);
        } else {
            result(ctx, 409, place.get(), solved.get(), "Somebody saved this job in the same moment; store it again.");
        }
    }

    private static boolean stillHolds(Place place, Solved solved) {
        return WallFootDraft.of(place.job().document(), place.part())
                .draft()
                .filter(draft -> draft.walls().containsKey(solved.wall()))
                .map(draft -> draft.question(solved.wall(), solved.typed()).equals(solved.question()))
                .orElse(false);
    }
}
