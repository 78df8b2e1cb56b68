package org.treadwarm.web.csv;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.survey.Findings;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;

/**
 * Reads rooms or openings from CSV into a copy of a survey. An empty cell leaves what stands there; nothing is taken out. Only
 * without a problem is the result fit to be kept.
 */
public final class TableImport {
    /** The most rows of one file. */
    public static final int MOST_ROWS = 2000;

    private static final String ALLOWED_TEXT = "at most " + Document.LONGEST_TEXT + " characters, none of them NUL";
    private static final Pattern WITH_UNIT = Pattern.compile("(.*?)\\s*[\\[(]([^\\])]*)[\\])]\\s*");

    private final TableKind kind;
    private final ObjectNode document;
    private final RowTarget target;
    private final List<CellProblem> problems = new ArrayList<>();
    private final Map<Integer, Column> columns = new LinkedHashMap<>();
    private final Map<String, CellProblem> cells = new HashMap<>();

    private TableImport(TableKind kind, JsonNode survey) {
        this.kind = kind;
        this.document = survey.deepCopy();
        this.target = new RowTarget(document);
    }

    /** The survey with what the file says, and everything that is wrong with the file. */
    public record Result(JsonNode document, List<CellProblem> problems) {}

    /** Reads a file into a survey. */
    public static Result read(TableKind kind, String text, JsonNode survey) {
        TableImport reading = new TableImport(kind, survey);
        try {
            reading.rows(CsvText.read(text));
        } catch (IOException e) {
            reading.problems.add(new CellProblem(
                    1, "", "", "this is no CSV", "cells separated by commas, semicolons or tabs, quoted with \""));
        }
        reading.problems.sort(Comparator.comparingInt(CellProblem::row));
        return new Result(reading.document, List.copyOf(reading.problems));
    }

    private void rows(List<List<String>> rows) {
        if (rows.isEmpty() || rows.size() > MOST_ROWS + 1) {
            problems.add(new CellProblem(
                    1,
                    "",
                    rows.size() + " rows",
                    "this cannot be read in",
                    "a header and up to " + MOST_ROWS + " rows"));
            return;
        }
        header(rows.get(0));
        if (problems.isEmpty()) {
            for (int i = 1; i < rows.size() && problems.size() < Findings.MOST; i++) {
                row(i + 1, rows.get(i));
            }
            judge();
        }
    }

    private void header(List<String> titles) {
        String allowed = kind.columns().stream().map(Column::header).collect(Collectors.joining(", "));
        for (int i = 0; i < titles.size(); i++) {
            Matcher withUnit = WITH_UNIT.matcher(titles.get(i));
            String name = withUnit.matches() ? withUnit.group(1) : titles.get(i);
            Optional<Column> column =
                    kind.columns().stream().filter(each -> each.isCalled(name)).findFirst();
            if (titles.get(i).isBlank()) {
                continue;
            }
            if (column.isEmpty() || withUnit.matches() && !column.get().quantity()) {
                problems.add(new CellProblem(1, titles.get(i), titles.get(i), "no column is called this", allowed));
            } else if (columns.values().stream()
                    .anyMatch(each -> each.title().equals(column.get().title()))) {
                problems.add(new CellProblem(1, titles.get(i), titles.get(i), "this column stands here twice", "once"));
            } else {
                columns.put(
                        i,
                        withUnit.matches()
                                ? column.get().inUnit(withUnit.group(2).strip())
                                : column.get().inUnit(""));
            }
        }
        if (columns.values().stream().noneMatch(each -> each.title().equals("room"))) {
            problems.add(new CellProblem(1, "room", "", "this column is missing", allowed));
        }
    }

    private void row(int number, List<String> texts) {
        Map<String, String> row = new HashMap<>();
        for (int i = 0; i < texts.size(); i++) {
            String cell = texts.get(i).strip();
            if (!isText(cell)) {
                String column = columns.containsKey(i) ? columns.get(i).title() : "";
                problems.add(new CellProblem(number, column, cell, "this cell cannot be kept", ALLOWED_TEXT));
            } else if (columns.containsKey(i)) {
                row.put(columns.get(i).title(), cell);
            } else if (!cell.isEmpty()) {
                problems.add(new CellProblem(number, "", cell, "this cell has no column", "a header above it"));
            }
        }
        if (row.values().stream().allMatch(String::isEmpty)) {
            return;
        }
        Optional<RowTarget.Found> found =
                kind == TableKind.ROOMS ? target.room(number, row, problems) : target.opening(number, row, problems);
        found.ifPresent(part -> write(number, row, part));
    }

    private static boolean isText(String cell) {
        return cell.length() <= Document.LONGEST_TEXT && cell.indexOf('\0') < 0;
    }

    private void write(int number, Map<String, String> row, RowTarget.Found found) {
        for (Column column : columns.values()) {
            String cell = row.getOrDefault(column.title(), "");
            if (!column.key().isEmpty() && !cell.isEmpty()) {
                column.write(found.part(), cell);
                cells.put(found.pointer() + "/" + column.key(), new CellProblem(number, column.title(), cell, "", ""));
            }
        }
    }

    /** Tells what the survey's own rules say about the cells that were read. */
    private void judge() {
        Outcome<Survey> outcome = Intake.survey(document);
        if (outcome instanceof Outcome.Refused<Survey> refused) {
            for (Problem problem : refused.problems()) {
                CellProblem cell = cells.get(problem.pointer());
                if (cell != null) {
                    problems.add(new CellProblem(
                            cell.row(), cell.column(), cell.given(), problem.message(), problem.allowed()));
                }
            }
        }
    }
}
