package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.Query;
import org.jdbi.v3.core.statement.StatementContext;

/** Reads and writes the rows of sheets. */
final class SheetRows {
    private static final String HEADER = "sheet.number, sheet.job_id, sheet.revision, sheet.job_name,"
            + " sheet.method_version, sheet.sha256, sheet.issued_at, sheet.issued_by, sheet.replaces,"
            + " newer.number as replaced_by, withdrawn_at, withdrawn_by, reason";
    private static final String FROM = " from sheet left join sheet newer on newer.replaces = sheet.number"
            + " left join sheet_withdrawal on sheet_withdrawal.number = sheet.number";
    private static final String NEWEST_FIRST = " order by sheet.issue_year desc, sheet.running desc";

    private SheetRows() {}

    static Optional<SheetHeader> header(Handle handle, String number) {
        return handle.createQuery("select " + HEADER + FROM + " where sheet.number = :number")
                .bind("number", number)
                .map(SheetRows::header)
                .findOne();
    }

    static Optional<Sheet> sheet(Handle handle, String number) {
        return handle.createQuery(
                        "select " + HEADER + ", sheet.survey, sheet.sizing" + FROM + " where sheet.number = :number")
                .bind("number", number)
                .map((row, context) -> new Sheet(
                        header(row, context),
                        new SheetContent(
                                row.getString("method_version"), row.getString("survey"), row.getString("sizing"))))
                .findOne();
    }

    static List<SheetHeader> all(Handle handle) {
        return handle.createQuery("select " + HEADER + FROM + NEWEST_FIRST)
                .map(SheetRows::header)
                .list();
    }

    static List<SheetHeader> part(Handle handle, int limit, Optional<SheetPlace> after) {
        String condition = after.isPresent()
                ? " where sheet.issue_year < :year or sheet.issue_year = :year and sheet.running < :running"
                : "";
        Query query = handle.createQuery("select " + HEADER + FROM + condition + NEWEST_FIRST + " limit :limit")
                .bind("limit", limit);
        after.ifPresent(place -> query.bind("year", place.year()).bind("running", place.running()));
        return query.map(SheetRows::header).list();
    }

    static List<SheetHeader> ofJob(Handle handle, String jobId) {
        return handle.createQuery("select " + HEADER + FROM + " where sheet.job_id = :job" + NEWEST_FIRST)
                .bind("job", jobId)
                .map(SheetRows::header)
                .list();
    }

    static Optional<String> jobName(Handle handle, SheetOrder order) {
        return handle.createQuery("select name from revision where job_id = :job and revision = :revision")
                .bind("job", order.jobId())
                .bind("revision", order.revision())
                .mapTo(String.class)
                .findOne();
    }

    static int lastOf(Handle handle, int year) {
        return handle.createQuery("select coalesce(max(running), 0) from sheet where issue_year = :year")
                .bind("year", year)
                .mapTo(Integer.class)
                .one();
    }

    static void insert(Handle handle, SheetHeader header, SheetContent content, int year, int running) {
        handle.createUpdate("insert into sheet (number, issue_year, running, job_id, revision, job_name,"
                        + " method_version, survey, sizing, sha256, issued_at, issued_by, replaces) values (:number,"
                        + " :year, :running, :job, :revision, :jobName, :method, :survey, :sizing, :sha256, :at, :by,"
                        + " :replaces)")
                .bind("number", header.number())
                .bind("year", year)
                .bind("running", running)
                .bind("job", header.jobId())
                .bind("revision", header.revision())
                .bind("jobName", header.jobName())
                .bind("method", content.methodVersion())
                .bind("survey", content.survey())
                .bind("sizing", content.sizing())
                .bind("sha256", header.fingerprint())
                .bind("at", Times.text(header.issuedAt()))
                .bind("by", header.issuedBy())
                .bind("replaces", header.replaces().orElse(null))
                .execute();
    }

    static void insert(Handle handle, String number, Withdrawal withdrawal) {
        handle.createUpdate("insert into sheet_withdrawal (number, withdrawn_at, withdrawn_by, reason)"
                        + " values (:number, :at, :by, :reason)")
                .bind("number", number)
                .bind("at", Times.text(withdrawal.at()))
                .bind("by", withdrawal.by())
                .bind("reason", withdrawal.reason())
                .execute();
    }

    private static SheetHeader header(ResultSet row, StatementContext context) throws SQLException {
        return new SheetHeader(
                row.getString("number"),
                row.getString("job_id"),
                row.getLong("revision"),
                row.getString("job_name"),
                row.getString("method_version"),
                row.getString("sha256"),
                Times.instant(row.getString("issued_at")),
                row.getString("issued_by"),
                Optional.ofNullable(row.getString("replaces")),
                Optional.ofNullable(row.getString("replaced_by")),
                withdrawal(row));
    }

    private static Optional<Withdrawal> withdrawal(ResultSet row) throws SQLException {
        String at = row.getString("withdrawn_at");
        return at == null
                ? Optional.empty()
                : Optional.of(
                        new Withdrawal(Times.instant(at), row.getString("withdrawn_by"), row.getString("reason")));
    }
}
