package org.treadwarm.sheets;

import java.util.List;
import org.treadwarm.store.SheetHeader;
import org.treadwarm.store.SheetIssue;
import org.treadwarm.survey.Problem;

/** What became of an attempt to issue a job's sizing. */
public sealed interface Issuing {
    /** It is issued. */
    record Issued(SheetHeader sheet) implements Issuing {}

    /** The revision is a draft: these problems stand in the way. */
    record Draft(List<Problem> problems) implements Issuing {
        public Draft {
            problems = List.copyOf(problems);
        }
    }

    /** There is no such job, or it has no such revision. */
    record Missing() implements Issuing {}

    /** A sheet of the job with the same content holds already. */
    record SameHolds(String number) implements Issuing {}

    /**
     * The sheet that was to be replaced cannot be.
     *
     * @param number that sheet
     * @param why a sentence
     */
    record CannotReplace(String number, String why) implements Issuing {}

    /** The store's answer in the words of the desk. */
    static Issuing of(SheetIssue result) {
        if (result instanceof SheetIssue.Issued issued) {
            return new Issued(issued.header());
        }
        if (result instanceof SheetIssue.SameHolds same) {
            return new SameHolds(same.number());
        }
        if (result instanceof SheetIssue.NothingToReplace nothing) {
            return new CannotReplace(nothing.number(), "This job has no sheet " + nothing.number() + ".");
        }
        if (result instanceof SheetIssue.ReplacedAlready already) {
            return new CannotReplace(
                    already.number(), "Sheet " + already.number() + " is already replaced by " + already.by() + ".");
        }
        return new Missing();
    }
}
