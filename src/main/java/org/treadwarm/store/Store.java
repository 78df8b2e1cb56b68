package org.treadwarm.store;

import java.nio.file.Path;
import java.time.Clock;

/**
 * Everything the program keeps, in one folder: jobs with all their revisions, people, sessions, keys and the audit list.
 *
 * <p>All parts may be used from any number of threads. Several processes may open the same folder at once. Every change
 * is one transaction and on disk when its method returns. Changes of jobs, people and keys, and sign-ins, append to the
 * audit list in the same transaction.
 */
public final class Store implements AutoCloseable {
    private final Database database;
    private final Audit audit;
    private final Jobs jobs;
    private final People people;
    private final Sessions sessions;
    private final ApiKeys keys;
    private final Team team;
    private final Links links;

    private Store(Database database, Clock clock) {
        this.database = database;
        this.audit = new Audit(database, clock);
        this.jobs = new Jobs(database, audit, clock);
        Passwords passwords = new Passwords();
        this.people = new People(database, audit, passwords, clock);
        this.sessions = new Sessions(database, audit, clock);
        this.team = new Team(database, audit, clock);
        this.links = new Links(database, audit, passwords, clock);
        this.keys = new ApiKeys(database, audit, clock);
    }

    /**
     * Opens the folder, creating it and its tables as needed.
     *
     * @throws StoreUnavailable if the folder cannot be written, its file is no database, or a newer program wrote it
     */
    public static Store open(Path folder, Clock clock) {
        return new Store(Database.open(folder), clock);
    }

    public Jobs jobs() {
        return jobs;
    }

    public People people() {
        return people;
    }

    public Team team() {
        return team;
    }

    public Links links() {
        return links;
    }

    public Sessions sessions() {
        return sessions;
    }

    public ApiKeys keys() {
        return keys;
    }

    public Audit audit() {
        return audit;
    }

    @Override
    public void close() {
        database.close();
    }
}
