package org.treadwarm.wire;

import java.util.List;
import java.util.Optional;
import org.treadwarm.survey.Findings;
import org.treadwarm.survey.Problem;

/**
 * A problem as RFC 9457 has it.
 *
 * @param type a name for the kind of problem
 * @param title the kind in words
 * @param status the HTTP status
 * @param detail this problem in words
 * @param errors every single thing that is wrong, each with its address; empty when none has one
 * @param requestId the id of the request that met it; empty outside of the server
 */
public record ProblemDocument(
        String type, String title, int status, String detail, List<Problem> errors, Optional<String> requestId) {
    /** The media type of problem documents. */
    public static final String MEDIA_TYPE = "application/problem+json";

    private ProblemDocument(String type, String title, int status, String detail, List<Problem> errors) {
        this(type, title, status, detail, errors, Optional.empty());
    }

    /** The same problem, met by a request. */
    public ProblemDocument metBy(Optional<String> request) {
        return new ProblemDocument(type, title, status, detail, errors, request);
    }

    /** A text that is no JSON of ours. */
    public static ProblemDocument notJson(Problem problem) {
        return new ProblemDocument(
                "urn:treadwarm:problem:not-json",
                "The text is not a JSON document",
                400,
                problem.message(),
                List.of(problem));
    }

    /** A survey, or another document, that has problems. */
    public static ProblemDocument invalid(List<Problem> problems) {
        String detail = problems.size() == 1
                ? "There is 1 problem."
                : problems.size() < Findings.MOST
                        ? "There are " + problems.size() + " problems."
                        : "There are " + problems.size() + " problems or more; the first " + problems.size()
                                + " are listed.";
        return new ProblemDocument(
                "urn:treadwarm:problem:invalid", "The document has problems", 422, detail, List.copyOf(problems));
    }

    /** A file that cannot be read. */
    public static ProblemDocument unreadable(String file) {
        Problem problem = new Problem("", file, "this file cannot be read", "a survey file, or - for standard input");
        return new ProblemDocument(
                "urn:treadwarm:problem:file", "The file cannot be read", 400, problem.message(), List.of(problem));
    }

    /** A problem that has no address in a document. */
    public static ProblemDocument plain(int status, String kind, String title, String detail) {
        return new ProblemDocument("urn:treadwarm:problem:" + kind, title, status, detail, List.of());
    }
}
