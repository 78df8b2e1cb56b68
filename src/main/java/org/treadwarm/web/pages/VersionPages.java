package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.jobs.Difference;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.store.Change;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.web.security.Visitors;

/**
 * Two people changed one room, space, assembly or site: both versions side by side, and a choice wherever they differ. What was
 * typed travels in the form, so it is not lost however often others save meanwhile.
 */
final class VersionPages {
    private static final int MOST_TRIES = 20;

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;

    VersionPages(JobDesk desk, Visitors visitors, View view) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
    }

    private TwoVersions versions(Job job, VersionDraft draft) {
        JsonNode base = desk.document(job.id(), draft.base()).map(draft::in).orElse(MissingNode.getInstance());
        return new TwoVersions(draft.type(), base, draft.in(job.document()), draft.mine());
    }

    /** Shows what was typed beside what others saved. */
    void begin(Context ctx, Job job, VersionDraft draft) {
        show(ctx, 409, job, draft, Map.of(), false, "");
    }

    private void show(
            Context ctx,
            int status,
            Job job,
            VersionDraft draft,
            Map<String, String> chosen,
            boolean sent,
            String notice) {
        TwoVersions versions = versions(job, draft);
        List<Choice> choices = versions.choices(chosen, sent);
        RevisionHeader theirs = desk.lastChange(job.id(), draft.base(), draft::in)
                .orElseGet(() -> desk.revisions(job.id()).get(0));
        Map<String, Object> model = new HashMap<>();
        model.put("partTitle", draft.title(versions.theirs()));
        model.put("jobName", job.name());
        model.put("back", "/jobs/" + job.id());
        model.put("who", theirs.savedBy());
        model.put("when", Moments.minute(theirs.savedAt()));
        model.put("action", draft.action(job.id()));
        model.put("base", draft.base());
        model.put("seen", job.revision());
        model.put("mine", draft.mine().isMissingNode() ? "" : draft.mine().toString());
        model.put("partName", draft.name());
        model.put("choices", choices);
        model.put("notice", notice);
        model.put(
                "errors",
                choices.stream()
                        .filter(Choice::wrong)
                        .map(choice -> new ErrorView(choice.id(), "", choice.where() + ": say which shall stand.", ""))
                        .toList());
        view.show(ctx, status, "versions", model);
    }

    /** Saves what was chosen, or shows the two versions again when a choice is missing or somebody saved once more. */
    void settle(Context ctx) {
        Optional<VersionDraft> draft = VersionDraft.read(ctx);
        for (int i = 0; i < MOST_TRIES; i++) {
            Optional<Job> job = desk.current(ctx.pathParam("job"));
            if (job.isEmpty() || draft.isEmpty()) {
                JobPages.missing(ctx, view);
                return;
            }
            if (settled(ctx, job.get(), draft.get())) {
                return;
            }
        }
        show(
                ctx,
                409,
                desk.current(ctx.pathParam("job")).orElseThrow(),
                draft.orElseThrow(),
                Map.of(),
                false,
                "Others are saving this job at the same time. Nothing of yours is lost: try again.");
    }

    private boolean settled(Context ctx, Job job, VersionDraft draft) {
        TwoVersions now = versions(job, draft);
        boolean moved = isMoved(job, draft, now);
        Map<String, String> chosen = moved ? stillTrue(ctx, job, draft, now) : chosen(ctx, now);
        boolean complete = now.differences().stream().allMatch(each -> chosen.containsKey(each.address()));
        if (moved || !complete) {
            String notice =
                    moved ? "It was saved once more while you chose. What has changed is to be chosen anew." : "";
            show(ctx, moved ? 409 : 422, job, draft, chosen, !moved, notice);
            return true;
        }
        return keep(ctx, job, draft, now.settled(chosen));
    }

    private boolean isMoved(Job job, VersionDraft draft, TwoVersions now) {
        Optional<JsonNode> compared = desk.document(job.id(), draft.seen()).map(draft::in);
        return compared.isEmpty() || !compared.get().equals(now.theirs());
    }

    private static Map<String, String> chosen(Context ctx, TwoVersions versions) {
        String action = EntryPages.text(ctx, "do");
        Map<String, String> chosen = new HashMap<>();
        for (Difference difference : versions.differences()) {
            if (action.equals("all-theirs") || action.equals("all-mine")) {
                chosen.put(difference.address(), action.substring("all-".length()));
            } else {
                TwoVersions.chosen(ctx.formParamMap(), difference)
                        .ifPresent(side -> chosen.put(difference.address(), side));
            }
        }
        return chosen;
    }

    /** The choices between values that still are what they were when they were chosen. */
    private Map<String, String> stillTrue(Context ctx, Job job, VersionDraft draft, TwoVersions now) {
        JsonNode compared = desk.document(job.id(), draft.seen()).map(draft::in).orElse(MissingNode.getInstance());
        List<Difference> before = new TwoVersions(now.type(), now.base(), compared, now.mine()).differences();
        Map<String, String> chosen = new HashMap<>();
        now.differences().stream()
                .filter(before::contains)
                .forEach(difference -> TwoVersions.chosen(ctx.formParamMap(), difference)
                        .ifPresent(side -> chosen.put(difference.address(), side)));
        return chosen;
    }

    private boolean keep(Context ctx, Job job, VersionDraft draft, JsonNode result) {
        ObjectNode document = (ObjectNode) job.document().deepCopy();
        String key = draft.put(document, result);
        Job saved = job;
        if (!document.equals(job.document())) {
            String who = visitors.session(ctx).orElseThrow().person().name();
            Saving saving = desk.save(
                    job.id(), job.revision(), job.name(), document, new Change(who, "two versions brought together"));
            if (!(saving instanceof Saving.Saved done)) {
                return false;
            }
            saved = done.job();
        }
        ctx.redirect(draft.page(job.id(), saved.document(), key), HttpStatus.SEE_OTHER);
        return true;
    }
}
