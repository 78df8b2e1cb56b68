package org.treadwarm.store;

import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.jdbi.v3.core.Handle;

/** The issued sheets. Nothing issued is ever changed or removed; the database refuses it, too. */
public final class Sheets {
    /** The most characters of a reason for withdrawing. */
    public static final int LONGEST_REASON = 1000;

    private final Database database;
    private final Audit audit;
    private final Clock clock;

    Sheets(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
    }

    /**
     * Issues a sheet under the next number of the year.
     *
     * @param who the person or key that issues it
     */
    public SheetIssue issue(SheetOrder order, String who) {
        String fingerprint = order.content().fingerprint();
        return database.change(handle -> {
            Optional<String> name = SheetRows.jobName(handle, order);
            if (name.isEmpty()) {
                return new SheetIssue.NoRevision();
            }
            Optional<SheetIssue> refusal = refusal(handle, order, fingerprint);
            if (refusal.isPresent()) {
                return refusal.get();
            }
            Instant now = Times.now(clock);
            int year = now.atOffset(ZoneOffset.UTC).getYear();
            int running = SheetRows.lastOf(handle, year) + 1;
            SheetHeader header = header(order, name.get(), number(year, running), fingerprint, now, who);
            SheetRows.insert(handle, header, order.content(), year, running);
            audit.append(handle, who, "issued sheet", subject(header));
            return new SheetIssue.Issued(header);
        });
    }

    private static String number(int year, int running) {
        return String.format(Locale.ROOT, "%d-%04d", year, running);
    }

    private static SheetHeader header(
            SheetOrder order, String jobName, String number, String fingerprint, Instant now, String who) {
        return new SheetHeader(
                number,
                order.jobId(),
                order.revision(),
                jobName,
                order.content().methodVersion(),
                fingerprint,
                now,
                who,
                order.replaces(),
                Optional.empty(),
                Optional.empty());
    }

    private static String subject(SheetHeader header) {
        return header.number() + " of job " + header.jobId() + " revision " + header.revision()
                + header.replaces().map(number -> ", replacing " + number).orElse("");
    }

    private static Optional<SheetIssue> refusal(Handle handle, SheetOrder order, String fingerprint) {
        Optional<SheetIssue> same = SheetRows.ofJob(handle, order.jobId()).stream()
                .filter(sheet -> sheet.holds() && sheet.fingerprint().equals(fingerprint))
                .findFirst()
                .map(sheet -> new SheetIssue.SameHolds(sheet.number()));
        return same.isPresent() || order.replaces().isEmpty()
                ? same
                : replacing(handle, order, order.replaces().get());
    }

    private static Optional<SheetIssue> replacing(Handle handle, SheetOrder order, String number) {
        Optional<SheetHeader> replaced =
                SheetRows.header(handle, number).filter(sheet -> sheet.jobId().equals(order.jobId()));
        if (replaced.isEmpty()) {
            return Optional.of(new SheetIssue.NothingToReplace(number));
        }
        return replaced.get().replacedBy().map(by -> new SheetIssue.ReplacedAlready(number, by));
    }

    /** The sheet with this number, whether it holds or not. */
    public Optional<Sheet> find(String number) {
        return database.read(handle -> SheetRows.sheet(handle, number));
    }

    /** The sheet with this number without what it freezes. */
    public Optional<SheetHeader> header(String number) {
        return database.read(handle -> SheetRows.header(handle, number));
    }

    /** All sheets, the newest first. */
    public List<SheetHeader> list() {
        return database.read(SheetRows::all);
    }

    /**
     * A part of all sheets, the newest first. A sheet issued meanwhile stands before all others, so it moves none.
     *
     * @param limit how many at most
     * @param after the last sheet of the part before; empty for the first part
     */
    public List<SheetHeader> list(int limit, Optional<SheetPlace> after) {
        return database.read(handle -> SheetRows.part(handle, limit, after));
    }

    /** The sheets of a job, the newest first. */
    public List<SheetHeader> ofJob(String jobId) {
        return database.read(handle -> SheetRows.ofJob(handle, jobId));
    }

    /**
     * Withdraws a sheet. It stays readable.
     *
     * @param reason why, 1 to {@value #LONGEST_REASON} characters, not blank
     * @throws IllegalArgumentException if the reason breaks that rule, or has a NUL or half a character
     */
    public SheetWithdrawal withdraw(String number, String reason, String who) {
        if (reason.isBlank() || reason.length() > LONGEST_REASON) {
            throw new IllegalArgumentException("A reason for withdrawing has 1 to " + LONGEST_REASON + " characters");
        }
        Texts.storable("reason for withdrawing", reason);
        return database.change(handle -> {
            Optional<SheetHeader> before = SheetRows.header(handle, number);
            if (before.isEmpty()) {
                return new SheetWithdrawal.Missing();
            }
            if (before.get().withdrawal().isPresent()) {
                return new SheetWithdrawal.DoneBefore(before.get());
            }
            SheetRows.insert(handle, number, new Withdrawal(Times.now(clock), who, reason));
            audit.append(handle, who, "withdrew sheet", number + ": " + reason);
            return new SheetWithdrawal.Done(SheetRows.header(handle, number).orElseThrow());
        });
    }
}
