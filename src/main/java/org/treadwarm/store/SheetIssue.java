package org.treadwarm.store;

/** What became of an attempt to issue a sheet. */
public sealed interface SheetIssue {
    /** It is issued. */
    record Issued(SheetHeader header) implements SheetIssue {}

    /** There is no such job, or it has no such revision. */
    record NoRevision() implements SheetIssue {}

    /** A sheet of this job with the same content holds already. */
    record SameHolds(String number) implements SheetIssue {}

    /** There is no sheet of this job with the number that was to be replaced. */
    record NothingToReplace(String number) implements SheetIssue {}

    /** Another sheet replaces that one already. */
    record ReplacedAlready(String number, String by) implements SheetIssue {}
}
