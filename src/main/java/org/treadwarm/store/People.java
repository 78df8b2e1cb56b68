package org.treadwarm.store;

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
    private final Passwords passwords;

    People(Database database, Audit audit, Passwords passwords, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.passwords = passwords;
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
            PersonRows.insert(handle, owner, hash);
            audit.append(handle, owner.name(), "created the owner's account", owner.name());
            return new OwnerCreation.Created(owner);
        });
    }

    /**
     * Tries a name and password. An unknown name, and one whose account is closed, takes as long as a wrong password. After
     * several failures under a name from one address the answer to that address is to wait, for at most a minute.
     *
     * @param from the address that the try comes from, in a form that whoever tries cannot choose freely
     */
    public SignIn signIn(String name, String password, String from) {
        String key = PersonName.key(name);
        Optional<Duration> wait = begin(key, from);
        if (wait.isPresent()) {
            return new SignIn.Wait(wait.get());
        }
        Optional<Person> person = tried(key, password);
        if (person.isEmpty()) {
            return new SignIn.Refused();
        }
        return database.change(handle -> {
            SignInThrottle.clear(handle, key, from);
            audit.append(handle, person.get().name(), "signed in", person.get().name());
            return new SignIn.SignedIn(person.get());
        });
    }

    /**
     * Changes somebody's own password and ends all sessions but the one it is done in. Wrong tries slow down as those of a
     * sign-in do, and count with them.
     */
    public PasswordChange changePassword(Session session, String present, String fresh, String from) {
        if (!PasswordRule.accepts(fresh)) {
            return new PasswordChange.PasswordRefused();
        }
        String key = PersonName.key(session.person().name());
        Optional<Duration> wait = begin(key, from);
        if (wait.isPresent()) {
            return new PasswordChange.Wait(wait.get());
        }
        if (tried(key, present).isEmpty()) {
            return new PasswordChange.WrongPassword();
        }
        String hash = passwords.hash(fresh);
        Person person = session.person();
        return database.change(handle -> {
            SignInThrottle.clear(handle, key, from);
            PersonRows.setPassword(handle, person.id(), hash);
            Sessions.endAllBut(handle, person.id(), session.token());
            audit.append(handle, person.name(), "changed password", person.name());
            return new PasswordChange.Changed();
        });
    }

    private Optional<Duration> begin(String key, String from) {
        Instant now = Times.now(clock);
        return database.change(handle -> SignInThrottle.begin(handle, key, from, now));
    }

    /** The person of this name, if the password is right. */
    private Optional<Person> tried(String key, String password) {
        Optional<PersonRows.Account> account =
                PersonName.canBeKept(key) ? database.read(handle -> PersonRows.byName(handle, key)) : Optional.empty();
        String hash = account.map(PersonRows.Account::passwordHash).orElseGet(passwords::hashOfNothing);
        // A password outside the rule matches no account; hashing a short text instead bounds the work.
        boolean matches = passwords.matches(PasswordRule.accepts(password) ? password : "", hash);
        return account.filter(found -> matches).map(PersonRows.Account::person);
    }

    private static boolean hasOwner(Handle handle) {
        return handle.createQuery("select count(*) from person where role = :role")
                        .bind("role", Role.OWNER.text())
                        .mapTo(Integer.class)
                        .one()
                > 0;
    }
}
