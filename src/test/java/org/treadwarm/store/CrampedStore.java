package org.treadwarm.store;

import com.zaxxer.hikari.HikariDataSource;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Optional;
import org.sqlite.SQLiteDataSource;

/** A store on a file that may hold few pages more than it does: beyond that SQLite reports what it reports on a full disk. */
public final class CrampedStore implements AutoCloseable {
    private final SQLiteDataSource connections;
    private final HikariDataSource pool;
    private final Store store;

    /**
     * Opens a folder.
     *
     * @param spare how many pages there is room for
     */
    public CrampedStore(Path folder, int spare) {
        Store.open(folder, Clock.systemUTC()).close();
        SqliteFile engine = new SqliteFile(folder);
        connections = engine.connections();
        long pages = Long.parseLong(new DataFile(DataHome.folder(folder)).text("pragma page_count"));
        connections.getConfig().setMaxPageCount((int) pages + spare);
        pool = engine.pool(connections);
        store = new Store(new Database(engine, pool), Clock.systemUTC(), Optional.empty());
    }

    /** The store. */
    public Store store() {
        return store;
    }

    /** Makes room, for connections that are made from now on; the others are given up. */
    public void makeRoom() {
        connections.getConfig().setMaxPageCount(1_000_000);
        pool.getHikariPoolMXBean().softEvictConnections();
    }

    @Override
    public void close() {
        store.close();
    }
}
