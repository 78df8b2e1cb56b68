package org.treadwarm.store;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;

/**
 * Moves everything from a data folder into an empty PostgreSQL database, in one transaction. Before it commits, every row
 * is read back and compared, every text that is kept under its SHA-256 is hashed anew, and so is what every sheet freezes. The
 * folder stays as it was.
 */
public final class Move {
    private static final int BATCH = 500;

    private final Connection from;
    private final Connection to;
    private final Engine target;

    private Move(Connection from, Connection to, Engine target) {
        this.from = from;
        this.to = to;
        this.target = target;
    }

    /**
     * What was moved.
     *
     * @param table its name
     * @param rows how many rows it has
     */
    public record Moved(String table, long rows) {}

    /**
     * Moves it all.
     *
     * @return each table with its rows, as they were found on the other side
     * @throws StoreUnavailable if a server runs on the folder, there is nothing in it, the database is not empty, or
     *     anything differs afterwards; then nothing was moved
     */
    public static List<Moved> run(Path folder, DataHome.Postgresql database, Clock clock) {
        SqliteFile source = new SqliteFile(folder);
        if (!Files.exists(source.file())) {
            throw new StoreUnavailable("The data folder " + folder + " holds no " + SqliteFile.NAME + " to move.");
        }
        Engine target = Engine.of(database);
        try (FolderLock alone = FolderLock.take(folder)) {
            // Opening brings both to the newest tables.
            Store.open(folder, clock).close();
            Store.open(database, clock).close();
            return copy(source, target);
        }
    }

    private static List<Moved> copy(SqliteFile source, Engine target) {
        try (Connection from = source.connections().getConnection();
                Connection to = target.connections().getConnection()) {
            to.setAutoCommit(false);
            try {
                List<Moved> moved = new Move(from, to, target).all();
                to.commit();
                return moved;
            } finally {
                // After a commit there is nothing to take back.
                to.rollback();
            }
        } catch (SQLException problem) {
            String meaning =
                    target.explain(problem).or(() -> source.explain(problem)).orElseGet(problem::getMessage);
            throw new StoreUnavailable("Nothing was moved: " + meaning + ".", problem);
        }
    }

    private List<Moved> all() throws SQLException {
        List<Table> sources = Table.all(from);
        List<Table> targets = Table.all(to);
        if (!names(sources).equals(names(targets))) {
            throw new StoreUnavailable("Nothing was moved: the folder has the tables " + names(sources)
                    + ", the database " + names(targets) + ".");
        }
        for (Table table : targets) {
            refuseRows(table);
        }
        List<Moved> moved = new ArrayList<>();
        for (Table table : targets) {
            copyRows(table);
            moved.add(new Moved(table.name(), compared(table)));
        }
        hashAnew("piece");
        hashAnew("manifest");
        fingerprintAnew();
        return moved;
    }

    private static List<String> names(List<Table> tables) {
        return tables.stream()
                .map(table -> table.name() + table.columns())
                .sorted()
                .toList();
    }

    private void refuseRows(Table table) throws SQLException {
        try (Statement statement = to.createStatement();
                ResultSet rows = statement.executeQuery("select 1 from " + table.name() + " limit 1")) {
            if (rows.next()) {
                throw new StoreUnavailable("The " + target.name() + " is not empty: there are rows in its table "
                        + table.name() + ". Nothing was moved; name an empty database.");
            }
        }
    }

    private void copyRows(Table table) throws SQLException {
        try (Statement statement = from.createStatement();
                ResultSet rows = statement.executeQuery(table.selectAll());
                PreparedStatement insert = to.prepareStatement(table.insert())) {
            int waiting = 0;
            while (rows.next()) {
                for (int column = 1; column <= table.columns().size(); column++) {
                    insert.setObject(
                            column, rows.getObject(column), table.types().get(column - 1));
                }
                insert.addBatch();
                waiting++;
                if (waiting == BATCH) {
                    insert.executeBatch();
                    waiting = 0;
                }
            }
            insert.executeBatch();
        }
    }

    private long compared(Table table) throws SQLException {
        Rows there = Rows.of(from, table);
        Rows here = Rows.of(to, table);
        if (!there.equals(here)) {
            throw new StoreUnavailable("Nothing was moved: the rows of the table " + table.name()
                    + " arrived differently (" + there.count() + " and " + here.count() + " rows).");
        }
        return here.count();
    }

    private void fingerprintAnew() throws SQLException {
        try (Statement statement = to.createStatement()) {
            statement.setFetchSize(BATCH);
            try (ResultSet rows =
                    statement.executeQuery("select number, method_version, survey, sizing, sha256 from sheet")) {
                while (rows.next()) {
                    SheetContent content = new SheetContent(rows.getString(2), rows.getString(3), rows.getString(4));
                    if (!content.fingerprint().equals(rows.getString(5))) {
                        throw new StoreUnavailable("Nothing was moved: sheet " + rows.getString(1)
                                + " has not its fingerprint, the SHA-256 " + rows.getString(5)
                                + ". The data file is damaged; restore a backup.");
                    }
                }
            }
        }
    }

    private void hashAnew(String table) throws SQLException {
        try (Statement statement = to.createStatement()) {
            statement.setFetchSize(BATCH);
            try (ResultSet rows = statement.executeQuery("select sha256, body from " + table)) {
                while (rows.next()) {
                    if (!Secrets.sha256(rows.getString(2)).equals(rows.getString(1))) {
                        throw new StoreUnavailable("Nothing was moved: a text in the table " + table
                                + " has not the SHA-256 it is kept under, " + rows.getString(1)
                                + ". The data file is damaged; restore a backup.");
                    }
                }
            }
        }
    }
}
