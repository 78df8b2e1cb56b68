package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import org.treadwarm.intake.AssemblyQuestion;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.WarmUpQuestion;
import org.treadwarm.sheets.Verification;
import org.treadwarm.sizing.AssemblyEvaluation;
import org.treadwarm.sizing.SectionEvaluation;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.WallFootEvaluation;
import org.treadwarm.sizing.WarmUpEvaluation;
import org.treadwarm.survey.SectionQuestion;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.WallFootQuestion;
import org.treadwarm.tables.Material;
import org.treadwarm.wire.ProblemDocument;
import org.treadwarm.wire.WorkingAnswer;

/**
 * The description of the API: the routes as written in the file, the schemas made from the declarations that read and write
 * the documents, so that they cannot drift apart.
 */
final class OpenApi {
    private OpenApi() {}

    /** The OpenAPI 3.1 document as UTF-8 text. */
    static byte[] document() {
        ObjectMapper mapper = Document.mapper();
        try (InputStream in = OpenApi.class.getResourceAsStream("/openapi.json")) {
            ObjectNode description = (ObjectNode) mapper.readTree(in);
            ObjectNode schemas = (ObjectNode) description.path("components").path("schemas");
            new SurveySchemas(schemas).add(Survey.class);
            new SurveySchemas(schemas).add(AssemblyQuestion.class);
            new SurveySchemas(schemas).add(SectionQuestion.class);
            new SurveySchemas(schemas).add(WarmUpQuestion.class);
            new SurveySchemas(schemas).add(WallFootQuestion.class);
            AnswerSchemas answers = new AnswerSchemas(schemas);
            answers.add(Sizing.class);
            answers.add(WorkingAnswer.class);
            answers.addOptionalList(Sizing.class, "working", WorkingAnswer.class);
            answers.add(AssemblyEvaluation.class);
            answers.add(SectionEvaluation.class);
            answers.add(WarmUpEvaluation.class);
            answers.add(WallFootEvaluation.class);
            answers.add(ProblemDocument.class);
            answers.add(Material.class);
            answers.add(JobsApi.JobAnswer.class);
            answers.add(JobsApi.JobsAnswer.class);
            answers.add(SheetAnswers.SheetAnswer.class);
            answers.add(SheetAnswers.SheetsAnswer.class);
            answers.add(Verification.class);
            answers.add(SizingApi.MaterialsAnswer.class);
            answers.add(HistoryApi.RevisionsAnswer.class);
            answers.add(HistoryApi.ChangesAnswer.class);
            answers.add(HistoryApi.ArchiveAnswer.class);
            answers.add(RoomsApi.RoomAnswer.class);
            answers.add(RoomsApi.RoomConflict.class);
            answers.add(TableAnswers.TableAnswer.class);
            answers.add(TableAnswers.TableProblems.class);
            answers.add(Api.Health.class);
            return mapper.writeValueAsBytes(description);
        } catch (IOException e) {
            throw new UncheckedIOException("the description of the API cannot be made", e);
        }
    }
}
