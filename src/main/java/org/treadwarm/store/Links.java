package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.StatementContext;

/** Links that work once: they let a new person make an account, or a known one choose a new password. */
public final class Links {
    /** How long an invitation is good, and a reset that an owner makes. */
    public static final Duration VALID_FOR = Duration.ofHours(72);

    private static final String COLUMNS = "id, for_whom, role, person_id, made_by, made_at, expires_at";

    private final Database database;
    private final Audit audit;
    private final Passwords passwords;
    private final Clock clock;

    Links(Database database, Audit audit, Passwords passwords, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.passwords = passwords;
        this.clock = clock;
    }

    /**
     * Invites somebody.
     *
     * @param forWhom whom it is for, 1 to 80 characters as {@link PersonName} has it; who uses the link may choose another name
     * @throws IllegalArgumentException if the name breaks that rule
     */
    public NewLink invite(String forWhom, Role role, String who) {
        if (!PersonName.accepts(forWhom)) {
            throw new IllegalArgumentException("the name of whom the link is for breaks the rule for names");
        }
        NewLink made = make(forWhom.strip(), new Link.Join(role), who, VALID_FOR);
        return database.change(handle -> {
            insert(handle, made);
            audit.append(handle, who, "invited", made.link().forWhom() + " (" + role.text() + ")");
            return made;
        });
    }

    /** A link for somebody's new password, good for the given time; earlier ones end. Empty if there is no open account. */
    public Optional<NewLink> resetPassword(String personId, String who, Duration validFor) {
        return database.change(handle -> PersonRows.byId(handle, personId).map(account -> {
            String name = account.person().name();
            NewLink made = make(name, new Link.NewPassword(personId), who, validFor);
            handle.execute("delete from one_time_link where person_id = ?", personId);
            insert(handle, made);
            audit.append(handle, who, "made a link for a new password", name);
            return made;
        }));
    }

    /** The links that can still be used, the newest first. */
    public List<Link> list() {
        return database.read(handle -> handle.createQuery(
                        "select " + COLUMNS + " from one_time_link where expires_at > :now order by made_at desc, id")
                .bind("now", Times.text(Times.now(clock)))
                .map(Links::link)
                .list());
    }

    /** Ends a link at once. Returns whether there was one with this id. */
    public boolean revoke(String id, String who) {
        return database.change(handle -> {
            Optional<String> forWhom = handle.createQuery("select for_whom from one_time_link where id = :id")
                    .bind("id", id)
                    .mapTo(String.class)
                    .findOne();
            forWhom.ifPresent(name -> {
                handle.execute("delete from one_time_link where id = ?", id);
                audit.append(handle, who, "revoked link", name);
            });
            return forWhom.isPresent();
        });
    }

    /** The link with this token, if it can still be used. */
    public Optional<Link> find(String token) {
        return database.read(handle -> handle.createQuery(
                        "select " + COLUMNS + " from one_time_link" + " where sha256 = :sha256 and expires_at > :now")
                .bind("sha256", Secrets.sha256(token))
                .bind("now", Times.text(Times.now(clock)))
                .map(Links::link)
                .findOne());
    }

    /** Makes the account of somebody invited, and spends the link, both or neither. */
    public LinkUse join(String token, String name, String password) {
        Optional<Link> found = find(token);
        if (found.isEmpty() || !(found.get().purpose() instanceof Link.Join join)) {
            return new LinkUse.LinkRefused();
        }
        if (!PersonName.accepts(name)) {
            return new LinkUse.NameRefused();
        }
        if (!PasswordRule.accepts(password)) {
            return new LinkUse.PasswordRefused();
        }
        Person person = new Person(Secrets.id(), name.strip(), join.role(), Times.now(clock));
        String hash = passwords.hash(password);
        return database.change(handle -> {
            if (!PersonRows.insert(handle, person, hash)) {
                return new LinkUse.NameTaken();
            }
            if (!spend(handle, token, person.createdAt())) {
                handle.execute("delete from person where id = ?", person.id());
                return new LinkUse.LinkRefused();
            }
            audit.append(handle, person.name(), "joined", person.role().text());
            return new LinkUse.Done(person);
        });
    }

    /** Gives an account its new password, ends all its sessions and spends the link, all or none. */
    public LinkUse changePassword(String token, String password) {
        Optional<Link> found = find(token);
        if (found.isEmpty() || !(found.get().purpose() instanceof Link.NewPassword reset)) {
            return new LinkUse.LinkRefused();
        }
        if (!PasswordRule.accepts(password)) {
            return new LinkUse.PasswordRefused();
        }
        String hash = passwords.hash(password);
        Instant now = Times.now(clock);
        return database.change(handle -> {
            Optional<PersonRows.Account> account = PersonRows.byId(handle, reset.personId());
            if (account.isEmpty() || !spend(handle, token, now)) {
                return new LinkUse.LinkRefused();
            }
            Person person = account.get().person();
            PersonRows.setPassword(handle, person.id(), hash);
            handle.execute("delete from session where person_id = ?", person.id());
            audit.append(handle, person.name(), "chose a new password by a link", person.name());
            return new LinkUse.Done(person);
        });
    }

    private NewLink make(String forWhom, Link.Purpose purpose, String who, Duration validFor) {
        Instant now = Times.now(clock);
        return new NewLink(new Link(Secrets.id(), forWhom, purpose, who, now, now.plus(validFor)), Secrets.token());
    }

    private static void insert(Handle handle, NewLink made) {
        Link link = made.link();
        handle.createUpdate("insert into one_time_link (" + COLUMNS + ", sha256)"
                        + " values (:id, :forWhom, :role, :personId, :madeBy, :madeAt, :expiresAt, :sha256)")
                .bind("id", link.id())
                .bind("forWhom", link.forWhom())
                .bind(
                        "role",
                        link.purpose() instanceof Link.Join join ? join.role().text() : null)
                .bind("personId", link.purpose() instanceof Link.NewPassword reset ? reset.personId() : null)
                .bind("madeBy", link.madeBy())
                .bind("madeAt", Times.text(link.madeAt()))
                .bind("expiresAt", Times.text(link.expiresAt()))
                .bind("sha256", Secrets.sha256(made.token()))
                .execute();
    }

    /** Whether the token was good; it no longer is. */
    private static boolean spend(Handle handle, String token, Instant now) {
        return handle.createUpdate("delete from one_time_link where sha256 = :sha256 and expires_at > :now")
                        .bind("sha256", Secrets.sha256(token))
                        .bind("now", Times.text(now))
                        .execute()
                == 1;
    }

    private static Link link(ResultSet row, StatementContext context) throws SQLException {
        Optional<String> personId = Optional.ofNullable(row.getString("person_id"));
        return new Link(
                row.getString("id"),
                row.getString("for_whom"),
                personId.isPresent()
                        ? new Link.NewPassword(personId.get())
                        : new Link.Join(Role.of(row.getString("role"))),
                row.getString("made_by"),
                Times.instant(row.getString("made_at")),
                Times.instant(row.getString("expires_at")));
    }
}
