package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Change;
import org.treadwarm.web.csv.TableFile;

/** Tables into a job and out of it: nothing is kept before it was seen. */
class TransferPagesTest {
    private static RunningServer server;
    private static Visitor visitor;

    private Job job;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        visitor = new Visitor(server, server.session(server.owner()));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    @BeforeEach
    void fresh() {
        job = server.job("yard", RunningServer.studio());
    }

    private Page look(String table) {
        Form form = visitor.open("/jobs/" + job.id() + "/files").form("table");
        return visitor.send(form.type("table", table).press("look").to("/jobs/" + job.id() + "/files/rooms.csv"));
    }

    @Test
    void showsWhatATableWouldChangeAndKeepsItWhenToldTo() {
        Page seen = look("room,height [m]\nstudio,3.3\nattic,2.1\n");

        assertThat(seen.status()).isEqualTo(200);
        assertThat(seen.text())
                .contains("What the table would change", "rooms › studio › room height", "3.3", "rooms › attic");
        assertThat(server.now(job).revision()).isEqualTo(1);

        assertThat(visitor.send(seen.form("table").press("keep")).status()).isEqualTo(303);
        assertThat(server.now(job).document().at("/rooms/0/height").textValue()).isEqualTo("3.3\u00a0m");
        assertThat(server.now(job).document().at("/rooms/2/name").textValue()).isEqualTo("attic");
        assertThat(server.now(job).note()).isEqualTo("rooms from a table");
    }

    @Test
    void tellsWhichCellsAreWrongAndGivesTheTextBack() {
        Page seen = look("room,height [m]\nstudio,so high\n");

        assertThat(seen.status()).isEqualTo(422);
        assertThat(seen.text()).contains("One cell cannot be read in", "so high", "room height");
        assertThat(seen.form("table").value("table")).contains("studio,so high");
        assertThat(visitor.send(seen.form("table").press("keep")).status()).isEqualTo(422);
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void keepsNothingOverASaveThatWasNotSeen() {
        Form keep = look("room,height [m]\nstudio,3.3\n").form("table").press("keep");
        server.desk().save(job.id(), 1, "yard two", job.document(), Change.by("Ben"));

        Page again = visitor.send(keep);

        assertThat(again.status()).isEqualTo(409);
        assertThat(server.now(job).revision()).isEqualTo(2);
        assertThat(visitor.send(again.form("table").press("keep")).status()).isEqualTo(303);
        assertThat(server.now(job).document().at("/rooms/0/height").textValue()).isEqualTo("3.3\u00a0m");
    }

    private Form filesForm() {
        return visitor.open("/jobs/" + job.id() + "/files").form("table").to("/jobs/" + job.id() + "/files/rooms.csv");
    }

    private Page lookAtFile(String pasted, String name, byte[] file) {
        return visitor.send(filesForm().type("table", pasted).press("look"), "file", name, file);
    }

    private static byte[] utf8(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    @Test
    void aFileIsLookedAtAndKeptWithoutBeingSentAgain() throws IOException {
        List<String> before = temporaryFiles();

        Page seen = lookAtFile("room\nbarn", "rooms.csv", utf8("\uFEFFroom,remark\r\nstudio,Küche 20 °C\r\n"));

        assertThat(seen.status()).isEqualTo(200);
        assertThat(seen.text())
                .contains("What the table would change", "Küche 20 °C")
                .doesNotContain("barn");
        assertThat(visitor.send(seen.form("table").press("keep")).status()).isEqualTo(303);
        assertThat(server.now(job).document().at("/rooms/0/remark").textValue()).isEqualTo("Küche 20 °C");
        assertThat(server.now(job).document().at("/rooms").size()).isEqualTo(2);
        assertThat(temporaryFiles()).isEqualTo(before);
    }

    private static List<String> temporaryFiles() throws IOException {
        try (Stream<Path> files = Files.list(Path.of(System.getProperty("java.io.tmpdir")))) {
            return files.map(Path::toString)
                    .filter(name -> name.toLowerCase(Locale.ROOT).contains("multipart"))
                    .sorted()
                    .toList();
        }
    }

    @Test
    void whereNoFileIsChosenWhatIsPastedCounts() {
        Page seen = lookAtFile("room,remark\nstudio,Küche 20 °C\n", "", new byte[0]);

        assertThat(seen.status()).isEqualTo(200);
        assertThat(seen.text()).contains("What the table would change", "<td>Küche 20 °C</td>");
    }

    @Test
    void muchMayBePastedBesideTheFieldForAFile() {
        String table = "room,remark\n" + "studio,\n".repeat(150_000);
        Page seen = lookAtFile(table, "", new byte[0]);

        assertThat(seen.status()).isEqualTo(422);
        assertThat(seen.text()).contains("up to 2000 rows");
        Page tooMuch = lookAtFile("x".repeat(TableFile.LARGEST + 1), "", new byte[0]);
        assertThat(tooMuch.status()).isEqualTo(422);
        assertThat(tooMuch.id("table-rooms-error").orElseThrow().getTextContent())
                .contains("too large");
    }

    static Stream<Arguments> badFiles() {
        byte[] latin = "room,remark\nstudio,Küche\n".getBytes(StandardCharsets.ISO_8859_1);
        return Stream.of(
                Arguments.of(new byte[0], "This file is empty"),
                Arguments.of(latin, "no text in UTF-8"),
                Arguments.of("room\nattic\n".getBytes(StandardCharsets.UTF_16), "no text in UTF-8"),
                Arguments.of(new byte[TableFile.LARGEST + 11_000], "It has 2.01 MiB; at most 2 MiB are read"));
    }

    @ParameterizedTest
    @MethodSource("badFiles")
    void tellsAtTheFieldWhatIsWrongWithAFileAndKeepsWhatIsTyped(byte[] file, String message) {
        Page seen = lookAtFile("room\nbarn", "rooms.csv", file);

        assertThat(seen.status()).isEqualTo(422);
        assertThat(seen.id("file-rooms-error").orElseThrow().getTextContent()).contains(message);
        assertThat(seen.id("file-rooms").orElseThrow().getAttribute("aria-invalid"))
                .isEqualTo("true");
        assertThat(seen.id("summary").orElseThrow().getTextContent()).contains(message);
        assertThat(seen.id("table-rooms").orElseThrow().getTextContent()).isEqualTo("room\nbarn");
        assertThat(seen.id("file-openings-error")).isEmpty();
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void tellsWhenThereIsNoTableAtAllOrTooMuchOfIt() {
        Page none = look("");
        assertThat(none.status()).isEqualTo(422);
        assertThat(none.id("table-rooms-error").orElseThrow().getTextContent()).contains("Paste a table, or choose");

        Page much = look("x".repeat(TableFile.LARGEST + 1));
        assertThat(much.status()).isEqualTo(422);
        assertThat(much.id("table-rooms-error").orElseThrow().getTextContent()).contains("too large");
    }

    @Test
    void aFormWithAFileCarriesItsSecretLikeAnyOther() {
        byte[] file = utf8("room\nbarn\n");
        assertThat(visitor.send(filesForm().without("csrf").press("keep"), "file", "rooms.csv", file)
                        .status())
                .isEqualTo(403);
        Form forged = filesForm().forge("csrf", "somebody else's").press("keep");
        assertThat(visitor.send(forged, "file", "rooms.csv", file).status()).isEqualTo(403);
        assertThat(server.now(job).revision()).isEqualTo(1);
    }

    @Test
    void refusesAFormWithFilesThatCannotBeReadOrIsNotAskedFor() {
        String path = "/jobs/" + job.id() + "/files/rooms.csv";
        for (String body :
                List.of("no parts at all", "--x\r\nContent-Disposition: form-data; name=\"csrf\"\r\n\r\nab")) {
            Page refused = visitor.sendRaw(path, "x", utf8(body));
            assertThat(refused.status()).as(body).isEqualTo(400);
            // the server ends this connection, and a caller that were not told would lose its next request in it
            assertThat(refused.response().headers().firstValue("Connection"))
                    .as(body)
                    .hasValue("close");
        }
        Page large = lookAtFile("", "rooms.csv", new byte[17 * 1024 * 1024]);
        assertThat(large.status()).isEqualTo(422);
        assertThat(large.id("file-rooms-error").orElseThrow().getTextContent()).contains("At most 2 MiB are read");
        Form rename = visitor.open("/jobs/" + job.id()).form("job-name");
        assertThat(visitor.send(rename, "file", "rooms.csv", utf8("x")).status())
                .isEqualTo(415);
    }

    @Test
    void givesTheJobAsFiles() {
        for (String file : new String[] {"rooms.csv", "openings.csv", "results.csv", "survey.json"}) {
            assertThat(visitor.open("/jobs/" + job.id() + "/files/" + file).status())
                    .as(file)
                    .isEqualTo(200);
        }
        assertThat(visitor.open("/jobs/" + job.id() + "/files/other.csv").status())
                .isEqualTo(404);
        assertThat(visitor.open("/jobs/nosuchjob123/files/rooms.csv").status()).isEqualTo(404);
        assertThat(visitor.open("/jobs/nosuchjob123/files").status()).isEqualTo(404);
    }
}
