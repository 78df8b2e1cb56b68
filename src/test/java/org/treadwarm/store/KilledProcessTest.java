package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.OptionalLong;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class KilledProcessTest {
    private static final int KILLS = 3;
    private static final int ACKNOWLEDGED = 20;

    @TempDir
    Path folder;

    @Test
    void everyAcknowledgedRevisionOutlivesTheProcess() throws Exception {
        String id = createJob();
        long newest = 1;
        for (int kill = 0; kill < KILLS; kill++) {
            long acknowledged = killWhileSaving(id, newest);
            newest = checkedNewest(id, acknowledged);
        }
        assertThat(newest).isGreaterThanOrEqualTo(1 + KILLS * ACKNOWLEDGED);
    }

    private String createJob() {
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            return store.jobs()
                    .create(SavingChild.content(1), Change.by("parent"))
                    .jobId();
        }
    }

    private long killWhileSaving(String id, long from) throws IOException, InterruptedException {
        String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
        List<String> command = List.of(
                java,
                "-cp",
                System.getProperty("java.class.path"),
                SavingChild.class.getName(),
                folder.toString(),
                id,
                Long.toString(from));
        Process child = new ProcessBuilder(command)
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start();
        try (BufferedReader output = child.inputReader()) {
            long last = from;
            while (last < from + ACKNOWLEDGED) {
                last = acknowledged(output.readLine()).orElse(last);
            }
            return last;
        } finally {
            child.destroyForcibly().waitFor();
        }
    }

    private static OptionalLong acknowledged(String line) {
        assertThat(line).as("the child ended by itself").isNotNull();
        return line.startsWith("saved ") ? OptionalLong.of(Long.parseLong(line.substring(6))) : OptionalLong.empty();
    }

    private long checkedNewest(String id, long acknowledged) {
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            long newest = store.jobs().current(id).orElseThrow().header().revision();
            assertThat(newest).isGreaterThanOrEqualTo(acknowledged);
            LongStream.rangeClosed(1, newest)
                    .forEach(revision -> assertThat(store.jobs().revision(id, revision))
                            .map(JobRevision::content)
                            .contains(SavingChild.content(revision)));
            assertThat(new DataFile(DataHome.folder(folder)).text("pragma integrity_check"))
                    .isEqualTo("ok");
            return newest;
        }
    }
}
