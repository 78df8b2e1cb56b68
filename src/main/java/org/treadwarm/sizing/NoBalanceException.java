package org.treadwarm.sizing;

import org.treadwarm.survey.Problem;

/** The balances of a survey have no answer in finite numbers; carries the problem to show. */
public final class NoBalanceException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient Problem problem;

    NoBalanceException(Problem problem) {
        super(problem.message());
        this.problem = problem;
    }

    /** What is wrong and where. */
    public Problem problem() {
        return problem;
    }
}
