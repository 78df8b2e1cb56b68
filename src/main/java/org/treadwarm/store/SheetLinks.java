package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.statement.StatementContext;

/** Links that show a sheet without a session. Only the digest of their secret is kept. */
public final class SheetLinks {
    private static final String COLUMNS = "id, number, made_at, made_by";

    private final Database database;
    private final Audit audit;
    private final Clock clock;

    SheetLinks(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
    }

    /** Makes a link to a sheet; empty if there is no such sheet. */
    public Optional<NewSheetLink> create(String number, String who) {
        SheetLink link = new SheetLink(Secrets.id(), number, Times.now(clock), who);
        String token = Secrets.token();
        return database.change(handle -> SheetRows.header(handle, number).map(sheet -> {
            handle.createUpdate("insert into sheet_link (id, number, sha256, made_at, made_by)"
                            + " values (:id, :number, :sha256, :at, :by)")
                    .bind("id", link.id())
                    .bind("number", number)
                    .bind("sha256", Secrets.sha256(token))
                    .bind("at", Times.text(link.madeAt()))
                    .bind("by", who)
                    .execute();
            audit.append(handle, who, "made a link to sheet", number + " (" + link.id() + ")");
            return new NewSheetLink(link, token);
        }));
    }

    /** The links to a sheet that still work, the newest first. */
    public List<SheetLink> list(String number) {
        return database.read(handle -> handle.createQuery("select " + COLUMNS + " from sheet_link"
                        + " where number = :number and revoked_at is null order by made_at desc, id")
                .bind("number", number)
                .map(SheetLinks::link)
                .list());
    }

    /** Ends a link to this sheet at once. Returns whether there was one with this id. */
    public boolean revoke(String number, String id, String who) {
        return database.change(handle -> {
            int ended = handle.createUpdate("update sheet_link set revoked_at = :now"
                            + " where id = :id and number = :number and revoked_at is null")
                    .bind("now", Times.text(Times.now(clock)))
                    .bind("id", id)
                    .bind("number", number)
                    .execute();
            if (ended > 0) {
                audit.append(handle, who, "revoked a link to sheet", number + " (" + id + ")");
            }
            return ended > 0;
        });
    }

    /** The sheet that a link with this token shows; empty if there is none or it was revoked. */
    public Optional<Sheet> find(String token) {
        return database.read(handle -> handle.createQuery(
                        "select " + COLUMNS + " from sheet_link where sha256 = :sha256 and revoked_at is null")
                .bind("sha256", Secrets.sha256(token))
                .map(SheetLinks::link)
                .findOne()
                .flatMap(link -> SheetRows.sheet(handle, link.number())));
    }

    private static SheetLink link(ResultSet row, StatementContext context) throws SQLException {
        return new SheetLink(
                row.getString("id"),
                row.getString("number"),
                Times.instant(row.getString("made_at")),
                row.getString("made_by"));
    }
}
