package org.treadwarm.intake;

import org.treadwarm.survey.Problem;

/** A text that is no JSON document of ours; carries the one problem to show. */
public final class NotJsonException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient Problem problem;

    NotJsonException(Problem problem) {
        super(problem.message());
        this.problem = problem;
    }

    /** What is wrong and where. */
    public Problem problem() {
        return problem;
    }
}
