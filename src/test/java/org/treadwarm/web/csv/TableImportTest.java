package org.treadwarm.web.csv;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.jobs.Demo;
import org.treadwarm.web.RunningServer;
import org.treadwarm.web.csv.TableImport.Result;

class TableImportTest {
    private static final ObjectNode STUDIO = RunningServer.studio();

    private static Result rooms(String... rows) {
        return TableImport.read(TableKind.ROOMS, String.join("\n", rows), STUDIO);
    }

    @ParameterizedTest
    @EnumSource(TableKind.class)
    void whatGoesOutComesBackAsItWas(TableKind kind) {
        ObjectNode studio = STUDIO.deepCopy();
        ((ObjectNode) studio.at("/rooms/1/surfaces/0/openings/0")).put("id", "door-1");
        for (JsonNode survey : List.of(studio, Demo.survey())) {
            Result result = TableImport.read(kind, TableExport.survey(kind, survey), survey);

            assertThat(result.problems()).isEmpty();
            assertThat(result.document()).isEqualTo(survey);
        }
    }

    @Test
    void theExportFillsAnEmptyHouse() {
        ObjectNode empty = Demo.survey().deepCopy();
        empty.putArray("rooms");

        Result result = TableImport.read(TableKind.ROOMS, TableExport.survey(TableKind.ROOMS, Demo.survey()), empty);

        assertThat(result.problems()).isEmpty();
        assertThat(TableExport.survey(TableKind.ROOMS, result.document()))
                .isEqualTo(TableExport.survey(TableKind.ROOMS, Demo.survey()));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "room,room height [m]|studio,2.75|2.75\u00a0m",
                "room;height (ft);|studio;9 1/2|9 1/2\u00a0ft",
                "ROOM\tHeight [m]|studio\t2750 mm|2750 mm",
                "height [m],room|2.75,studio|2.75\u00a0m",
                "room,height [m]|studio,1.5 x 2|1.5 x 2\u00a0m",
            })
    void aUnitInTheHeaderCountsForBareNumbers(String header, String row, String height) {
        Result result = rooms(header, row);

        assertThat(result.document().at("/rooms/0/height").textValue()).isEqualTo(height);
        assertThat(result.document().at("/rooms/1")).isEqualTo(STUDIO.at("/rooms/1"));
    }

    @Test
    void aNewNameAddsARoomAndEmptyCellsLeaveWhatStands() {
        Result result = rooms("room,indoor temperature [°C],height [m]", "studio,,2.75", ",,", "attic,18,2.1");

        assertThat(result.problems()).isEmpty();
        assertThat(result.document().at("/rooms/0/indoorTemperature"))
                .isEqualTo(STUDIO.at("/rooms/0/indoorTemperature"));
        assertThat(result.document().at("/rooms/2/name").textValue()).isEqualTo("attic");
        assertThat(result.document().at("/rooms/2/indoorTemperature").textValue())
                .isEqualTo("18\u00a0°C");
    }

    @Test
    void everyWrongCellIsToldByItsRowAndColumn() {
        Result result = rooms("room,height [m],floor area [m2]", "studio,so high,12", "attic,2.1,-4", "barn,2500,3");

        assertThat(result.problems())
                .extracting(CellProblem::row, CellProblem::column, CellProblem::given)
                .contains(
                        tuple(2, "room height", "so high"),
                        tuple(3, "floor area", "-4"),
                        tuple(4, "room height", "2500"));
        assertThat(result.problems()).allSatisfy(problem -> {
            assertThat(problem.message()).isNotBlank();
            assertThat(problem.allowed()).isNotBlank();
        });
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "height [m]|2.5|1|column is missing",
                "room,colour|a,b|1|no column is called this",
                "room,remark [m]|a,b|1|no column is called this",
                "room,height,room height|a,1 m,2 m|1|twice",
                "room,height|a,1 m,2 m|2|a header above it",
                "room,id|a,nosuchroom|2|no room of this job",
                "room,height|,1 m|2|name is missing",
            })
    void refusesWhatItCannotPlace(String header, String row, int number, String message) {
        assertThat(rooms(header, row).problems()).singleElement().satisfies(problem -> {
            assertThat(problem.row()).isEqualTo(number);
            assertThat(problem.message() + problem.allowed()).contains(message);
        });
    }

    @Test
    void refusesARoomThatStandsTwice() {
        assertThat(rooms("room,height", "attic,1 m", "attic,2 m").problems())
                .singleElement()
                .satisfies(problem -> assertThat(problem.row()).isEqualTo(3));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "\"room", "room,height\n\"a,1"})
    void refusesWhatIsNoTable(String text) {
        assertThat(TableImport.read(TableKind.ROOMS, text, STUDIO).problems()).isNotEmpty();
    }

    @Test
    void anOpeningIsPlacedByRoomAndSurface() {
        JsonNode survey = Demo.survey();
        Result result = TableImport.read(
                TableKind.OPENINGS,
                String.join(
                        "\n",
                        "room,surface,opening,assembly,width [cm],height [cm],how many",
                        "living room,north wall,skylight,\"window, double low-e\",60,80,2",
                        "living room,no wall,x,door,1,1,1",
                        "no room,north wall,x,door,1,1,1"),
                survey);

        assertThat(result.problems())
                .extracting(CellProblem::row, CellProblem::column)
                .containsExactly(tuple(3, "surface"), tuple(4, "room"));
        assertThat(result.document().at("/rooms/0/surfaces/0/openings/1/name").textValue())
                .isEqualTo("skylight");
        assertThat(result.document().at("/rooms/0/surfaces/0/openings/1/width").textValue())
                .startsWith("60");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "=1+1",
                "+cmd|' /C calc'!A0",
                "@SUM(A1)",
                "-2+3*cmd",
                "\tx",
                "\rx",
                "'=1",
                "''x",
                "'x",
                "-12 °C",
                "-12",
                "+3,5 %",
                "-1/A1",
                "x\"y,z;\n"
            })
    void cellsThatStartAFormulaAreMarkedAndNumbersAreNot(String text) throws IOException {
        String guarded = CsvText.guarded(text);

        assertThat(CsvText.unguarded(guarded)).isEqualTo(text);
        boolean number = text.matches("[-+][0-9,]+( (°C|%))?");
        boolean special = "=+-@\t\r".indexOf(text.charAt(0)) >= 0;
        assertThat(guarded.equals("'" + text))
                .isEqualTo(special && !number || text.startsWith("'=") || text.startsWith("''"));
        assertThat(CsvText.read(CsvText.write(List.of(List.of("head", "more"), List.of(text, "b"))))
                        .get(1))
                .containsExactly(text, "b");
    }
}
