package org.treadwarm.store;

/** What became of a save. */
public sealed interface SaveResult {
    /** The content is on disk as this revision. */
    record Saved(long revision) implements SaveResult {}

    /** Nothing was written: the job is not at the expected revision but at this one. */
    record Stale(long currentRevision) implements SaveResult {}

    /** Nothing was written: there is no such job. */
    record Missing() implements SaveResult {}
}
