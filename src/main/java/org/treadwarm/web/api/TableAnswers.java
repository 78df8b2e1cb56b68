package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.Optional;
import org.treadwarm.jobs.Job;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Survey;
import org.treadwarm.web.csv.CellProblem;

/** What is answered to a table that shall be read into a job. */
final class TableAnswers {
    private TableAnswers() {}

    /**
     * What a table changes.
     *
     * @param id the job's id
     * @param revision the revision that the save made; where nothing was saved, the one that the table was compared with
     * @param kept whether the changes were saved
     * @param draft whether problems stand in the way of a sizing of the job with the changes
     * @param changes each value that is other than before; empty when the table says what stands in the job already
     */
    record TableAnswer(String id, long revision, boolean kept, boolean draft, List<DifferenceAnswer> changes) {
        static TableAnswer looked(Job before, JsonNode after, boolean draft) {
            return new TableAnswer(before.id(), before.revision(), false, draft, changes(before, after));
        }

        static TableAnswer kept(Job before, Job after) {
            return new TableAnswer(
                    after.id(), after.revision(), true, after.draft(), changes(before, after.document()));
        }

        private static List<DifferenceAnswer> changes(Job before, JsonNode after) {
            return DifferenceAnswer.between(before.document(), after, Survey.class);
        }
    }

    /**
     * What is wrong in one cell.
     *
     * @param pointer the row and the column's title as steps of a JSON Pointer; the row alone when it is wrong as a whole
     * @param row the row of the table, counted from 1, the header being 1
     * @param column the column's title; left out for the row as a whole
     */
    record CellError(String pointer, int row, Optional<String> column, String given, String message, String allowed) {
        static CellError of(CellProblem problem) {
            String row = Pointer.to("", problem.row());
            Optional<String> column = Optional.of(problem.column()).filter(title -> !title.isEmpty());
            return new CellError(
                    column.map(title -> Pointer.to(row, title)).orElse(row),
                    problem.row(),
                    column,
                    problem.given(),
                    problem.message(),
                    problem.allowed());
        }
    }

    /** The problem that cells of a table cannot be read in, each told for itself. */
    record TableProblems(
            String type, String title, int status, String detail, List<CellError> errors, Optional<String> requestId) {
        /** The status it is answered with. */
        static final int STATUS = 422;

        static TableProblems of(List<CellProblem> problems, Optional<String> request) {
            String cells = problems.size() == 1 ? "One cell" : problems.size() + " cells";
            return new TableProblems(
                    "urn:treadwarm:problem:table",
                    "The table has problems",
                    STATUS,
                    cells + " cannot be read in. Nothing was kept.",
                    problems.stream().map(CellError::of).toList(),
                    request);
        }
    }
}
