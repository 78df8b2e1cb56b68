package org.treadwarm.sheets;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.store.Sheet;
import org.treadwarm.store.SheetContent;
import org.treadwarm.store.SheetHeader;
import org.treadwarm.store.SheetOrder;
import org.treadwarm.store.SheetPlace;
import org.treadwarm.store.SheetWithdrawal;
import org.treadwarm.store.Sheets;
import org.treadwarm.wire.Json;

/** Issues the sizings of jobs as sheets, and computes issued ones anew. */
public final class SheetDesk {
    private final JobDesk jobs;
    private final Sheets sheets;

    public SheetDesk(JobDesk jobs, Sheets sheets) {
        this.jobs = jobs;
        this.sheets = sheets;
    }

    /**
     * Issues the sizing of one revision of a job. Only a survey without problems can be issued.
     *
     * @param replaces the number of a sheet of the same job that the new one replaces, if any
     * @param who the person or key that issues it
     */
    public Issuing issue(String jobId, long revision, Optional<String> replaces, String who) {
        return preparedIssue(jobId, revision, replaces, who).get();
    }

    /** Reads and sizes what {@link #issue} freezes, which may take long; what is given back only keeps it. */
    public Supplier<Issuing> preparedIssue(String jobId, long revision, Optional<String> replaces, String who) {
        Optional<Job> job = jobs.revision(jobId, revision);
        if (job.isEmpty()) {
            return Issuing.Missing::new;
        }
        Judgement judged = Judgement.of(job.get().document());
        if (judged.sizing().isEmpty()) {
            return () -> new Issuing.Draft(judged.problems());
        }
        SheetContent content = frozen(job.get().document(), judged.sizing().get());
        return () -> Issuing.of(sheets.issue(new SheetOrder(jobId, revision, content, replaces), who));
    }

    private static SheetContent frozen(JsonNode document, Sizing sizing) {
        return new SheetContent(sizing.method().version(), text(document), written(sizing));
    }

    private static String text(JsonNode document) {
        try {
            return Document.mapper().writeValueAsString(document);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("a survey that was accepted cannot be written", e);
        }
    }

    private static String written(Sizing sizing) {
        return new String(Json.bytes(sizing), StandardCharsets.UTF_8);
    }

    /** The sheet with this number. */
    public Optional<Sheet> find(String number) {
        return sheets.find(number);
    }

    /** All sheets, the newest first. */
    public List<SheetHeader> list() {
        return sheets.list();
    }

    /** A part of the sheets, see {@link Sheets#list(int, Optional)}. */
    public List<SheetHeader> list(int limit, Optional<SheetPlace> after) {
        return sheets.list(limit, after);
    }

    /** The sheets of a job, the newest first. */
    public List<SheetHeader> ofJob(String jobId) {
        return sheets.ofJob(jobId);
    }

    /** Withdraws a sheet, see {@link Sheets#withdraw}. */
    public SheetWithdrawal withdraw(String number, String reason, String who) {
        return sheets.withdraw(number, reason, who);
    }

    /** Sizes the kept survey by today's method, and compares; empty if there is no such sheet. */
    public Optional<Verification> verify(String number) {
        return sheets.find(number).map(SheetDesk::verified);
    }

    private static Verification verified(Sheet sheet) {
        Judgement today = Judgement.of(FrozenText.tree(sheet.content().survey()));
        Comparison comparison = today.sizing()
                .map(sizing ->
                        Comparison.of(FrozenText.tree(sheet.content().sizing()), FrozenText.tree(written(sizing))))
                .orElse(Comparison.NOTHING_COMPARED);
        return new Verification(
                sheet.header().number(),
                sheet.hasItsFingerprint()
                        && today.sizing().isPresent()
                        && comparison.differences().isEmpty(),
                sheet.hasItsFingerprint(),
                sheet.header().fingerprint(),
                sheet.content().fingerprint(),
                sheet.header().methodVersion(),
                Sizing.METHOD_VERSION,
                comparison.compared(),
                comparison.differences(),
                comparison.added(),
                today.problems());
    }
}
