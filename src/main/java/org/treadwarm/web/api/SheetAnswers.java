package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.util.RawValue;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.treadwarm.store.Sheet;
import org.treadwarm.store.SheetHeader;
import org.treadwarm.store.Withdrawal;

/** What the API says of sheets. */
final class SheetAnswers {
    private SheetAnswers() {}

    /** A sheet without what it freezes. */
    record IssuedSheet(
            String number,
            String jobId,
            long revision,
            String jobName,
            boolean holds,
            String methodVersion,
            String fingerprint,
            Instant issuedAt,
            String issuedBy,
            Optional<String> replaces,
            Optional<String> replacedBy,
            Optional<Withdrawal> withdrawal) {
        static IssuedSheet of(SheetHeader sheet) {
            return new IssuedSheet(
                    sheet.number(),
                    sheet.jobId(),
                    sheet.revision(),
                    sheet.jobName(),
                    sheet.holds(),
                    sheet.methodVersion(),
                    sheet.fingerprint(),
                    sheet.issuedAt(),
                    sheet.issuedBy(),
                    sheet.replaces(),
                    sheet.replacedBy(),
                    sheet.withdrawal());
        }
    }

    /** A part of the list of sheets, and where the next part begins, if there is one. */
    record SheetsAnswer(List<IssuedSheet> sheets, Optional<String> next) {}

    /** A sheet with survey and sizing, which stand in the answer byte by byte as they are kept. */
    record SheetAnswer(IssuedSheet sheet, JsonNode survey, JsonNode sizing) {
        static SheetAnswer of(Sheet sheet) {
            return new SheetAnswer(
                    IssuedSheet.of(sheet.header()),
                    asKept(sheet.content().survey()),
                    asKept(sheet.content().sizing()));
        }

        private static JsonNode asKept(String json) {
            return JsonNodeFactory.instance.rawValueNode(new RawValue(json));
        }
    }
}
