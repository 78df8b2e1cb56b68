package org.treadwarm.store;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.util.Optional;
import org.treadwarm.meter.Durations;

/**
 * Everything the program keeps, in one folder or database: jobs with all their revisions, people, sessions, keys and the audit list.
 *
 * <p>All parts may be used from any number of threads. Several processes may open the same folder or database at once. Every
 * change is one transaction, made alone, and on disk when its method returns. Changes of jobs, people and keys, and sign-ins, append to the
 * audit list in the same transaction.
 */
public final class Store implements AutoCloseable {
    private static final Duration LONGEST_CHECK = Duration.ofSeconds(10);

    // Less than the four seconds that the command that asks for the health waits.
    private static final Duration LONGEST_LOOK = Duration.ofSeconds(2);

    private final Database database;
    private final Optional<FolderLock> lock;
    private final Audit audit;
    private final Jobs jobs;
    private final People people;
    private final Sessions sessions;
    private final ApiKeys keys;
    private final Team team;
    private final Links links;
    private final Sheets sheets;
    private final SheetLinks sheetLinks;
    private final KeptAnswers keptAnswers;
    private final BoundedCheck check;

    Store(Database database, Clock clock, Optional<FolderLock> lock) {
        this.database = database;
        this.lock = lock;
        this.audit = new Audit(database, clock);
        this.jobs = new Jobs(database, audit, clock);
        Passwords passwords = new Passwords();
        this.people = new People(database, audit, passwords, clock);
        this.sessions = new Sessions(database, audit, clock);
        this.team = new Team(database, audit, clock);
        this.links = new Links(database, audit, passwords, clock);
        this.keys = new ApiKeys(database, audit, clock);
        this.sheets = new Sheets(database, audit, clock);
        this.sheetLinks = new SheetLinks(database, audit, clock);
        this.keptAnswers = new KeptAnswers(database, clock);
        this.check = new BoundedCheck(
                () -> database.read(handle -> handle.createQuery("select count(*) from job where id = ''")
                        .mapTo(Long.class)
                        .one()),
                LONGEST_LOOK);
    }

    /**
     * Opens the folder or database, creating folder and tables as needed.
     *
     * @throws StoreUnavailable if it cannot be written or reached, is no database of this program, or a newer program
     *     wrote it
     */
    public static Store open(DataHome home, Clock clock) {
        return new Store(Database.open(Engine.of(home)), clock, Optional.empty());
    }

    /** Opens a folder. */
    public static Store open(Path folder, Clock clock) {
        return open(DataHome.folder(folder), clock);
    }

    /**
     * Opens the folder or database as {@link #open} does, for a server: a folder is looked through for damage, at most ten
     * seconds long, and belongs to this server alone until the store is closed. A database may have several servers.
     *
     * @throws StoreUnavailable also if another server has the folder, or its file is damaged
     */
    public static Store openToServe(DataHome home, Clock clock) {
        if (!(home instanceof DataHome.Folder folder)) {
            return open(home, clock);
        }
        FolderLock lock = FolderLock.take(folder.path());
        try {
            SqliteFile engine = new SqliteFile(folder.path());
            StartCheck.run(engine, LONGEST_CHECK);
            return new Store(Database.open(engine), clock, Optional.of(lock));
        } catch (RuntimeException problem) {
            lock.close();
            throw problem;
        }
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

    public Sheets sheets() {
        return sheets;
    }

    public SheetLinks sheetLinks() {
        return sheetLinks;
    }

    public Sessions sessions() {
        return sessions;
    }

    public ApiKeys keys() {
        return keys;
    }

    public KeptAnswers keptAnswers() {
        return keptAnswers;
    }

    public Audit audit() {
        return audit;
    }

    /**
     * Reads a little, to see whether it can be read.
     *
     * @throws StoreUnavailable if not, or not within two seconds
     */
    public void check() {
        check.run();
    }

    /** How long reads lasted since it was opened. */
    public Durations.Reading readsLasted() {
        return database.readsLasted();
    }

    /** How long changes lasted since it was opened, with the wait for their turn. */
    public Durations.Reading changesLasted() {
        return database.changesLasted();
    }

    @Override
    public void close() {
        database.close();
        lock.ifPresent(FolderLock::close);
    }
}
