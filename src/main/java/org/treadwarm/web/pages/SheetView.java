package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.sheets.FrozenText;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Sizing.Caution;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.store.Sheet;
import org.treadwarm.store.SheetHeader;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.Numbers;
import org.treadwarm.wire.FrozenSizing;

/** A sheet as its page shows it: what was frozen, and drawings of it. Numbers are the kept ones, never computed anew. */
final class SheetView {
    private SheetView() {}

    /** What stands at the head of a sheet, and in the list of sheets. */
    public record Head(
            String number,
            String jobId,
            long revision,
            String jobName,
            String method,
            String fingerprint,
            String issuedAt,
            String issuedBy,
            String replaces,
            String replacedBy,
            boolean withdrawn,
            String withdrawnAt,
            String withdrawnBy,
            String reason) {
        static Head of(SheetHeader sheet) {
            return new Head(
                    sheet.number(),
                    sheet.jobId(),
                    sheet.revision(),
                    sheet.jobName(),
                    sheet.methodVersion(),
                    sheet.fingerprint(),
                    Moments.minute(sheet.issuedAt()),
                    sheet.issuedBy(),
                    sheet.replaces().orElse(""),
                    sheet.replacedBy().orElse(""),
                    sheet.withdrawal().isPresent(),
                    sheet.withdrawal().map(each -> Moments.minute(each.at())).orElse(""),
                    sheet.withdrawal().map(each -> each.by()).orElse(""),
                    sheet.withdrawal().map(each -> each.reason()).orElse(""));
        }

        /** Whether it holds, in a word. */
        public String state() {
            return withdrawn ? "withdrawn" : replacedBy.isEmpty() ? "holds" : "replaced";
        }
    }

    /** A limit of a heated floor. */
    public record LimitRow(String name, String flux, String margin, String governs, String source) {}

    /** A room: its name, what the answer beside a form says too, and the limits. */
    public record RoomPart(String name, Map<String, Object> answer, List<LimitRow> limits) {}

    /** What the page is made from. */
    static Map<String, Object> model(Sheet sheet) {
        JsonNode document = FrozenText.tree(sheet.content().survey());
        Optional<Sizing> sizing = FrozenSizing.read(sheet.content().sizing());
        boolean sameMethod = sheet.header().methodVersion().equals(Sizing.METHOD_VERSION);
        Judgement today = sameMethod ? Judgement.of(document) : Judgement.unsized(document);
        Optional<Survey> survey = today.survey();
        Map<String, Object> model = new HashMap<>();
        model.put("sheet", Head.of(sheet.header()));
        model.put("intact", sheet.hasItsFingerprint());
        model.put("inputs", TypedInputs.of(document));
        model.put("totals", sizing.map(JobView::totals).orElse(List.of()));
        model.put("rooms", rooms(today, sizing));
        model.put("cautions", sizing.map(SheetView::cautions).orElse(List.of()));
        model.put("drawn", survey.isPresent() && sizing.isPresent());
        model.put(
                "kept",
                sizing.isPresent() && survey.isPresent() ? "" : sheet.content().sizing());
        return model;
    }

    private static List<RoomPart> rooms(Judgement today, Optional<Sizing> sizing) {
        Optional<Survey> survey = today.survey();
        List<RoomPart> rooms = new ArrayList<>();
        if (survey.isPresent() && sizing.isPresent()) {
            for (int i = 0; i < sizing.get().rooms().size(); i++) {
                RoomSizing room = sizing.get().rooms().get(i);
                Map<String, Object> answer = Answer.issued(survey.get(), sizing.get(), i, today.sized());
                rooms.add(new RoomPart(room.name(), answer, limits(room)));
            }
        }
        return rooms;
    }

    private static List<LimitRow> limits(RoomSizing room) {
        return room.floor().limits().stream()
                .map(limit -> new LimitRow(
                        limit.name(),
                        Numbers.fixed(limit.maximumFlux(), 1),
                        Numbers.fixed(limit.margin(), 1),
                        limit.governs() ? "governs" : "",
                        limit.source()))
                .toList();
    }

    /** Every caution once, with the rooms it is for. */
    private static List<RoomCaution> cautions(Sizing sizing) {
        Map<Caution, List<String>> rooms = new LinkedHashMap<>();
        sizing.rooms()
                .forEach(room -> room.cautions()
                        .forEach(caution -> rooms.computeIfAbsent(caution, each -> new ArrayList<>())
                                .add(room.name())));
        return rooms.entrySet().stream()
                .map(each -> new RoomCaution(
                        each.getKey().text(), each.getKey().source(), String.join(", ", each.getValue())))
                .toList();
    }

    /** A caution and whom it concerns. */
    public record RoomCaution(String text, String source, String rooms) {}
}
