package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import org.jdbi.v3.core.Handle;

/** The people who can sign in. The first is the owner, who comes in through a link shown where the program runs. */
public final class People {
    private final Database database;
    private final Audit audit;
    private final Clock clock;
    private final Passwords passwords = new Passwords();

    People(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
    }

    /** Whether the owner's account has been made. */
    public boolean hasOwner() {
        return database.read(People::hasOwner);
    }

    /**
     * A token for making the owner's account, good once and for 24 hours; older ones end. Empty once there is an owner.
     */
    public Optional<String> inviteOwner() {
        return database.change(handle -> {
            if (hasOwner(handle)) {
                return Optional.empty();
            }
            String token = OwnerInvitation.replace(handle, Times.now(clock));
            audit.append(handle, "the program", "made a link for the owner", "");
            return Optional.of(token);
        });
    }

    /** Whether {@link #createOwner} would take the token now. */
    public boolean invitationIsOpen(String token) {
        return database.read(handle -> OwnerInvitation.isOpen(handle, token, Times.now(clock)));
    }

    /** Makes the owner's account and spends the token, both or neither. */
    public OwnerCreation createOwner(String token, String name, String password) {
        if (!invitationIsOpen(token)) {
            return new OwnerCreation.LinkRefused();
        }
        if (!PersonName.accepts(name)) {
            return new OwnerCreation.NameRefused();
        }
        if (!PasswordRule.accepts(password)) {
            return new OwnerCreation.PasswordRefused();
        }
        Person owner = new Person(Secrets.id(), name.strip(), Role.OWNER, Times.now(clock));
        String hash = passwords.hash(password);
        return database.change(handle -> {
            if (!OwnerInvitation.spend(handle, token, owner.createdAt())) {
                return new OwnerCreation.LinkRefused();
            }
            insert(handle, owner, hash);
            audit.append(handle, owner.name(), "created the owner's account", owner.name());
            return new OwnerCreation.Created(owner);
        });
    }

    /**
     * Tries a name and password. An unknown name takes as long as a wrong password. After several failures under a name
     * the answer is to wait, for at most a minute.
     */
    public SignIn signIn(String name, String password) {
        String key = PersonName.key(name);
        Instant now = Times.now(clock);
        Optional<Duration> wait = database.change(handle -> SignInThrottle.begin(handle, key, now));
        if (wait.isPresent()) {
            return new SignIn.Wait(wait.get());
        }
        Optional<Account> account =
                PersonName.accepts(name) ? database.read(handle -> find(handle, key)) : Optional.empty();
        String hash = account.map(Account::passwordHash).orElseGet(passwords::hashOfNothing);
        // A password outside the rule matches no account; hashing a short text instead bounds the work.
        boolean matches = passwords.matches(PasswordRule.accepts(password) ? password : "", hash);
        if (account.isEmpty() || !matches) {
            return new SignIn.Refused();
        }
        return signedIn(account.get().person(), key);
    }

    private SignIn signedIn(Person person, String key) {
        return database.change(handle -> {
            SignInThrottle.clear(handle, key);
            audit.append(handle, person.name(), "signed in", person.name());
            return new SignIn.SignedIn(person);
        });
    }

    private record Account(Person person, String passwordHash) {}

    private static boolean hasOwner(Handle handle) {
        return handle.createQuery("select count(*) from person where role = :role")
                        .bind("role", Role.OWNER.text())
                        .mapTo(Integer.class)
                        .one()
                > 0;
    }

    private static Optional<Account> find(Handle handle, String key) {
        return handle.createQuery(
                        "select id, name, role, created_at, password_hash from person where name_key = :nameKey")
                .bind("nameKey", key)
                .map((row, context) -> new Account(person(row), row.getString("password_hash")))
                .findOne();
    }

    static Person person(ResultSet row) throws SQLException {
        return new Person(
                row.getString("id"),
                row.getString("name"),
                Role.of(row.getString("role")),
                Times.instant(row.getString("created_at")));
    }

    private static void insert(Handle handle, Person person, String hash) {
        handle.createUpdate("insert into person (id, name, name_key, role, password_hash, created_at)"
                        + " values (:id, :name, :nameKey, :role, :hash, :createdAt)")
                .bind("id", person.id())
                .bind("name", person.name())
                .bind("nameKey", PersonName.key(person.name()))
                .bind("role", person.role().text())
                .bind("hash", hash)
                .bind("createdAt", Times.text(person.createdAt()))
                .execute();
    }
}
