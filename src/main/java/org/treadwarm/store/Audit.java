package org.treadwarm.store;

import java.time.Clock;
import java.util.List;
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
        return database.read(handle -> handle.createQuery(
                        "select happened_at, who, what, subject from audit order by number desc limit :limit")
                .bind("limit", limit)
                .map((row, context) -> new AuditEntry(
                        Times.instant(row.getString("happened_at")),
                        row.getString("who"),
                        row.getString("what"),
                        row.getString("subject")))
                .list());
    }

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
