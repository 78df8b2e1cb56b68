package org.treadwarm.store;

import java.time.Clock;
import java.util.List;
import java.util.OptionalLong;
import org.jdbi.v3.core.Handle;

/** The list of what was done. The store appends its own changes to it, each in the transaction of the change. */
public final class Audit {
    private final Database database;
    private final Clock clock;

    Audit(Database database, Clock clock) {
        this.database = database;
        this.clock = clock;
    }

    /** Appends an act that is no change of the store, such as an export. */
    public void append(String who, String what, String subject) {
        database.change(handle -> append(handle, who, what, subject));
    }

    /** The newest entries first, at most the given number. */
    public List<AuditEntry> latest(int limit) {
        return page(OptionalLong.empty(), limit).entries();
    }

    /**
     * A page of the list, newest entries first.
     *
     * @param before the entries before the one of this number; empty for the newest
     * @param limit how many at most, 1 or more
     */
    public AuditPage page(OptionalLong before, int limit) {
        List<Numbered> found = database.read(handle -> handle.createQuery(
                        "select number, happened_at, who, what, subject from audit where number < :before"
                                + " order by number desc limit :limit")
                .bind("before", before.orElse(Long.MAX_VALUE))
                .bind("limit", limit + 1)
                .map((row, context) -> new Numbered(
                        row.getLong("number"),
                        new AuditEntry(
                                Times.instant(row.getString("happened_at")),
                                row.getString("who"),
                                row.getString("what"),
                                row.getString("subject"))))
                .list());
        List<Numbered> shown = found.size() > limit ? found.subList(0, limit) : found;
        OptionalLong older =
                found.size() > limit ? OptionalLong.of(shown.get(limit - 1).number()) : OptionalLong.empty();
        return new AuditPage(shown.stream().map(Numbered::entry).toList(), older);
    }

    private record Numbered(long number, AuditEntry entry) {}

    int append(Handle handle, String who, String what, String subject) {
        return handle.createUpdate("insert into audit (number, happened_at, who, what, subject)"
                        + " select coalesce(max(number), 0) + 1, :at, :who, :what, :subject from audit")
                .bind("at", Times.text(Times.now(clock)))
                .bind("who", who)
                .bind("what", what)
                .bind("subject", subject)
                .execute();
    }
}
