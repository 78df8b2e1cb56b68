package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.treadwarm.program.Program.Result;
import org.treadwarm.store.Change;
import org.treadwarm.store.JobContent;
import org.treadwarm.store.Piece;
import org.treadwarm.store.Store;

/** What the program says, in one line, when it cannot start. */
class StartFaultsTest {
    @TempDir
    Path folder;

    private Result serve(Path data) {
        return Program.run("serve", "--port", "0", "--data", data.toString());
    }

    private static void saysInOneLine(Result result, int status, String... words) {
        assertThat(result.errors().lines()).as(result.errors()).hasSize(1);
        assertThat(result.errors()).contains(words);
        assertThat(result.output() + result.errors()).doesNotContain("Exception", "\tat ");
        assertThat(result.status()).isEqualTo(status);
    }

    @Test
    void theFolderIsInUse() throws IOException {
        Path data = folder.resolve("data");
        Path copy = folder.resolve("copy");
        try (Program server = Program.start("serve", "--port", "0", "--data", data.toString())) {
            server.address();

            saysInOneLine(serve(data), 1, "is in use", "--data", data.toString());

            Result key = Program.run("key", "create", "--name", "k", "--scope", "read", "--data", data.toString());
            assertThat(key.status()).isZero();
            Result backup = Program.run("backup", copy.toString(), "--data", data.toString());
            assertThat(backup.errors()).isEmpty();
            assertThat(backup.status()).isZero();
            assertThat(backup.output()).contains("Backed up and checked");
            saysInOneLine(
                    Program.run("restore", copy.toString(), "--replace", "--data", data.toString()), 1, "is in use");
        }
        Result restored = Program.run("restore", copy.toString(), "--replace", "--data", data.toString());
        assertThat(restored.status()).isZero();
        assertThat(restored.output()).contains("Restored into", "is kept in");
    }

    @Test
    void aKilledServerKeepsNothingLocked() {
        Path data = folder.resolve("data");
        try (Program server = Program.start("serve", "--port", "0", "--data", data.toString())) {
            server.address();
            server.kill();
        }
        try (Program server = Program.start("serve", "--port", "0", "--data", data.toString())) {
            assertThat(server.address()).startsWith("http://");
        }
    }

    @Test
    void theFolderIsReadOnly() {
        // Files cannot be made there, by nobody.
        Path kernels = Path.of("/sys");
        assumeThat(kernels).isDirectory();

        saysInOneLine(serve(kernels), 1, "The data folder /sys cannot be written");
    }

    @Test
    void thePortIsTaken() throws IOException {
        try (ServerSocket taken = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
            saysInOneLine(
                    Program.run(
                            "serve",
                            "--port",
                            "" + taken.getLocalPort(),
                            "--data",
                            folder.resolve("data").toString()),
                    1,
                    "port " + taken.getLocalPort(),
                    "in use already");
        }
    }

    @Test
    void theFileIsDamaged() throws IOException {
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            for (int i = 0; i < 200; i++) {
                store.jobs()
                        .create(
                                new JobContent("job", true, java.util.List.of(new Piece("room", "r", "text " + i))),
                                Change.by("tests"));
            }
        }
        Path file = folder.resolve("treadwarm.sqlite");
        try (RandomAccessFile change = new RandomAccessFile(file.toFile(), "rw")) {
            // Page by page: the first holds the list of tables.
            for (long at = 3 * 4096; at + 4096 <= change.length(); at += 4096) {
                change.seek(at);
                change.write(new byte[200]);
            }
        }

        saysInOneLine(serve(folder), 1, "is damaged", "restore a backup", folder.toString());
    }

    @Test
    void theFileIsNoDatabase() throws IOException {
        Files.writeString(folder.resolve("treadwarm.sqlite"), "Dear diary, ".repeat(100));

        saysInOneLine(serve(folder), 1, "is not a database", folder.toString());
    }

    @Test
    void theTablesAreNewer() throws Exception {
        Store.open(folder, Clock.systemUTC()).close();
        try (java.sql.Connection connection =
                java.sql.DriverManager.getConnection("jdbc:sqlite:" + folder.resolve("treadwarm.sqlite"))) {
            connection
                    .createStatement()
                    .execute("insert into flyway_schema_history select 90, '77', 'new', type, 'V77__new.sql', 1,"
                            + " installed_by, installed_on, execution_time, success from flyway_schema_history"
                            + " where installed_rank = 1");
        }
        saysInOneLine(serve(folder), 1, "newer Treadwarm", "77");
    }

    @Test
    void theDatabaseDoesNotAnswer() throws IOException {
        int free;
        try (ServerSocket socket = new ServerSocket(0, 1, InetAddress.getLoopbackAddress())) {
            free = socket.getLocalPort();
        }
        String url = "jdbc:postgresql://127.0.0.1:" + free + "/floors?user=anna&password=hunter2-invented";

        Result result = Program.runIn(Map.of("TREADWARM_DATABASE", url), "serve", "--port", "0");

        saysInOneLine(result, 1, "database postgresql://127.0.0.1:" + free + "/floors", "does not answer");
        assertThat(result.errors()).doesNotContain("hunter2");
    }

    @Test
    void aPlaceIsNamedTwiceOrWrongly() {
        Map<String, String> environment = Map.of("TREADWARM_DATABASE", "jdbc:postgresql://127.0.0.1/floors");
        Result both = Program.runIn(environment, "serve", "--port", "0", "--data", folder.toString());
        assertThat(both.status()).isEqualTo(2);
        assertThat(both.errors()).contains("both named");

        Result wrong = Program.run("serve", "--database", "jdbc:other://hunter2@host/floors");
        assertThat(wrong.status()).isEqualTo(2);
        assertThat(wrong.errors()).contains("jdbc:postgresql:").doesNotContain("hunter2");

        Result backup =
                Program.runIn(environment, "backup", folder.resolve("copy").toString());
        assertThat(backup.status()).isEqualTo(2);
        assertThat(backup.errors()).contains("pg_dump");
    }
}
