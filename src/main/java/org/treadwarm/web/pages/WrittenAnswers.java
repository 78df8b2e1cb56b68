package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.HashMap;
import java.util.Map;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.jobs.Remembered;
import org.treadwarm.sizing.SizedSurvey;

/** The answers beside forms, as HTML. Those of rooms, with their drawings and their working, are worth remembering. */
final class WrittenAnswers {
    private static final int LARGEST = 12_000_000;

    private final View view;
    private final Remembered<String> rooms = new Remembered<>(LARGEST, String::length);

    WrittenAnswers(View view) {
        this.view = view;
    }

    /** The answer for a part of a document. */
    String of(JsonNode document, Part part) {
        boolean lasting = part.isRoom()
                && Judgement.of(document).sized().filter(SizedSurvey::isLasting).isPresent();
        return lasting
                ? rooms.of(part.pointer() + document, () -> write(Answer.of(document, part), part))
                : write(Answer.of(document, part), part);
    }

    /** What stands there when the document is not sized, for a reason in words. */
    String unsized(JsonNode document, Part part, String reason) {
        return write(Answer.unsized(document, part, reason), part);
    }

    private String write(Map<String, Object> answer, Part part) {
        Map<String, Object> model = new HashMap<>(answer);
        model.put("part", part);
        return view.fragment("answer", model);
    }
}
