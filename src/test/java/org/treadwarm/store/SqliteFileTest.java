package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.sqlite.SQLiteDataSource;

class SqliteFileTest {
    @TempDir
    Path folder;

    @Test
    void aTransactionHoldsTheWriteLockFromItsBeginToItsCommitOnly() throws SQLException {
        try (Connection writer = impatient().getConnection();
                Connection other = impatient().getConnection()) {
            engine().beforeBegin(writer);
            writer.setAutoCommit(false);
            engine().afterBegin(writer);
            execute(writer, "select 1");
            assertThatThrownBy(() -> execute(other, "create table refused (id integer)"))
                    .isInstanceOfSatisfying(
                            SQLException.class,
                            problem -> assertThat(engine().explain(problem))
                                    .hasValueSatisfying(text -> assertThat(text).contains("locked")));

            execute(writer, "create table made (id integer)");
            writer.commit();

            execute(other, "insert into made values (1)");
        }
    }

    @Test
    void leavesFaultsOfTheProgramUnexplained() throws SQLException {
        try (Connection connection = impatient().getConnection()) {
            assertThatThrownBy(() -> execute(connection, "select nonsense"))
                    .isInstanceOfSatisfying(
                            SQLException.class,
                            problem -> assertThat(engine().explain(problem)).isEmpty());
        }
    }

    private SqliteFile engine() {
        return new SqliteFile(folder);
    }

    private SQLiteDataSource impatient() {
        SQLiteDataSource connections = engine().connections();
        connections.getConfig().setBusyTimeout(0);
        return connections;
    }

    private static void execute(Connection connection, String sql) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute(sql);
        }
    }
}
