package org.treadwarm.intake;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.NullNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.Basis;
import org.treadwarm.units.Reading;

/** How a tree becomes records: unknown keys, readings as objects, null and wrong types in every place. */
class BinderTest {
    private static List<Problem> changed(String pointer, JsonNode value) {
        ObjectNode survey = Surveys.everything();
        Trees.set(survey, pointer, value);
        return Surveys.problems(survey);
    }

    static List<String> everyPointer() {
        List<String> pointers = new ArrayList<>();
        Trees.visit("", Surveys.everything(), (pointer, node) -> pointers.add(pointer));
        pointers.remove("");
        return pointers;
    }

    @ParameterizedTest
    @CsvSource({
        "/romms, rooms",
        "/Site, site",
        "/site/outdoorTemprature, outdoorTemperature",
        "/assemblies/roof/u_value, uValue",
        "/assemblies/roof/layers/0/conductivty, conductivity",
        "/assemblies/timber wall/layers/1/bridging/fraction, frame",
        "/assemblies/timber wall/layers/3/airGap/emissivity, emissivities",
        "/spaces/loft/temperatur, temperature",
        "/rooms/0/indoorTemp, indoorTemperature",
        "/rooms/0/surfaces/0/areas, area",
        "/rooms/0/surfaces/0/openings/0/counts, count",
        "/rooms/0/surfaces/4/ground/exposedPerimetre, exposedPerimeter",
        "/rooms/0/junctions/0/lenght, length",
        "/rooms/0/air/changerate, changeRate",
        "/rooms/0/heatedFloor/zones, zone",
        "/rooms/0/heatedFloor/heater/power, name",
    })
    void anUnknownKeyNamesTheNearest(String pointer, String nearest) {
        assertThat(changed(pointer, Trees.json("1"))).hasSize(1).first().satisfies(problem -> {
            assertThat(problem.pointer()).isEqualTo(pointer);
            assertThat(problem.message()).contains("nearest is \"" + nearest + "\"");
            assertThat(problem.allowed()).contains(nearest);
        });
    }

    @Test
    void slashAndTildeInNamesAreEscapedInPointers() {
        ObjectNode survey = Surveys.everything();
        ((ObjectNode) survey.get("assemblies"))
                .set("1/2 ~ brick", Trees.json("{'layers': [{'thickness': -1, 'a/b': 1}]}"));
        assertThat(Surveys.problems(survey))
                .extracting(Problem::pointer)
                .contains("/assemblies/1~12 ~0 brick/layers/0/thickness", "/assemblies/1~12 ~0 brick/layers/0/a~1b");
        Surveys.problems(survey)
                .forEach(problem ->
                        assertThat(survey.at(problem.pointer()).isMissingNode()).isFalse());
    }

    @Test
    void everyProblemIsToldAtOnce() {
        ObjectNode survey = Surveys.everything();
        Trees.set(survey, "/site/altitude", Trees.json("'far up'"));
        Trees.set(survey, "/assemblies/window/uValue", Trees.json("99"));
        Trees.set(survey, "/spaces/loft/kind", Trees.json("'cold'"));
        Trees.set(survey, "/rooms/0/surfaces/0/to", Trees.json("'nowhere'"));
        Trees.set(survey, "/rooms/0/heatedFloor/heater/kind", Trees.json("'gas'"));
        Trees.set(survey, "/rooms/1/air/flow", Trees.json("0.1"));
        Trees.remove(survey, "/rooms/2/height");
        assertThat(Surveys.problems(survey))
                .extracting(Problem::pointer)
                .containsExactlyInAnyOrder(
                        "/site/altitude",
                        "/assemblies/window/uValue",
                        "/spaces/loft/kind",
                        "/rooms/0/surfaces/0/to",
                        "/rooms/0/heatedFloor/heater/kind",
                        "/rooms/1/air",
                        "/rooms/2/height");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyPointer")
    void nullIsNoValueAnywhere(String pointer) {
        assertThat(changed(pointer, NullNode.instance)).anySatisfy(problem -> {
            assertThat(problem.pointer()).isEqualTo(pointer);
            assertThat(problem.given()).isEqualTo("null");
        });
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyPointer")
    void aTruthValueIsNowhereExpected(String pointer) {
        assertThat(changed(pointer, Trees.json("true")))
                .extracting(Problem::pointer)
                .contains(pointer);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyPointer")
    void aListIsReadOnlyWhereOneIsExpected(String pointer) {
        JsonNode here = Surveys.everything().at(pointer);
        List<Problem> problems = changed(pointer, Trees.json("[[]]"));
        assertThat(problems).extracting(Problem::pointer).contains(here.isArray() ? pointer + "/0" : pointer);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyPointer")
    void aTextIsReadOnlyWhereOneIsExpected(String pointer) {
        if (!Surveys.everything().at(pointer).isTextual()) {
            assertThat(changed(pointer, Trees.json("'some text'")))
                    .extracting(Problem::pointer)
                    .contains(pointer);
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyPointer")
    void aNumberIsReadOnlyWhereOneIsExpected(String pointer) {
        if (!Surveys.everything().at(pointer).isNumber()) {
            assertThat(changed(pointer, Trees.json("1")))
                    .extracting(Problem::pointer)
                    .contains(pointer);
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/site",
                "/assemblies/roof",
                "/assemblies/roof/layers/0",
                "/assemblies/roof/layers/1/thickness",
                "/assemblies/timber wall/layers/1/bridging",
                "/assemblies/timber wall/layers/3/airGap",
                "/spaces/loft",
                "/spaces/loft/air",
                "/rooms/0/surfaces",
                "/rooms/0/surfaces/0",
                "/rooms/0/surfaces/0/area",
                "/rooms/0/surfaces/0/openings/0",
                "/rooms/0/surfaces/4/ground",
                "/rooms/0/junctions/0",
                "/rooms/0/air",
                "/rooms/0/air/recovery",
                "/rooms/0/heatedFloor",
                "/rooms/0/heatedFloor/ground",
                "/rooms/0/heatedFloor/above/0",
                "/rooms/0/heatedFloor/heater",
            })
    void oneMistakeIsToldOnce(String pointer) {
        assertThat(changed(pointer, Trees.json("true")))
                .extracting(Problem::pointer)
                .containsExactly(pointer);
        assertThat(changed(pointer, NullNode.instance))
                .extracting(Problem::pointer)
                .containsExactly(pointer);
    }

    @Test
    void aReadingThatCouldNotBeReadIsNotMissedAsWell() {
        String thickness = "/assemblies/roof/layers/1/thickness";
        assertThat(changed(thickness, Trees.json("{'reading': -1}")))
                .extracting(Problem::pointer)
                .containsExactly(thickness + "/reading");
        assertThat(changed("/rooms/0/surfaces/0/area", Trees.json("{'reading': 'wide'}")))
                .extracting(Problem::pointer)
                .containsExactly("/rooms/0/surfaces/0/area/reading");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {"[] | a list", "3 | 3", "'x' | x", "null | null", "true | true"})
    void theDocumentItselfIsAnObject(String text, String given) {
        assertThat(Surveys.problems(Trees.json(text))).hasSize(1).first().satisfies(problem -> {
            assertThat(problem.pointer()).isEmpty();
            assertThat(problem.given()).contains(given);
        });
    }

    @Test
    void aReadingMayStandWithItsBasis() {
        ObjectNode tree = Surveys.studio();
        Trees.set(tree, "/rooms/0/height", Trees.json("{'reading': '3.10 ± 0.02 m', 'basis': 'taped'}"));
        Trees.set(tree, "/rooms/0/floorArea", Trees.json("{'reading': 42, 'remark': 'by eye', 'basis': ' assumed '}"));
        Survey survey = Surveys.accepted(tree);
        Reading height = survey.rooms().get(0).height();
        assertThat(height.value()).isEqualTo(3.1);
        assertThat(height.spread()).isEqualTo(0.02);
        assertThat(height.basis()).contains(Basis.TAPED);
        assertThat(height.typed()).isEqualTo("3.10 ± 0.02 m");
        assertThat(survey.rooms().get(0).floorArea().basis()).contains(Basis.ASSUMED);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "{} | /rooms/0/height/reading | missing",
                "{'basis': 'taped'} | /rooms/0/height/reading | missing",
                "{'reading': {}} | /rooms/0/height/reading | missing",
                "{'reading': []} | /rooms/0/height/reading | missing",
                "{'reading': null} | /rooms/0/height/reading | number or a text",
                "{'reading': '3 K'} | /rooms/0/height/reading | measures a temperature",
                "{'reading': -1} | /rooms/0/height/reading | outside what is possible",
                "{'reading': 3, 'basis': 'guessed'} | /rooms/0/height/basis | no basis",
                "{'reading': 3, 'basis': 1} | /rooms/0/height/basis | no basis",
                "{'reading': 3, 'unit': 'm'} | /rooms/0/height/unit | no key of a reading",
            })
    void aReadingThatIsNoneIsFoundAtItsPlace(String value, String pointer, String message) {
        assertThat(changed("/rooms/0/height", Trees.json(value)))
                .hasSize(1)
                .first()
                .satisfies(problem -> {
                    assertThat(problem.pointer()).isEqualTo(pointer);
                    assertThat(problem.message()).contains(message);
                });
    }

    @Test
    void namesAreTrimmedAndTextsLimited() {
        ObjectNode tree = Surveys.studio();
        Trees.set(tree, "/rooms/0/name", Trees.json("' studio '"));
        assertThat(Surveys.accepted(tree).rooms().get(0).name()).isEqualTo("studio");
        Trees.set(tree, "/rooms/0/name", Trees.json("'" + "x".repeat(201) + "'"));
        assertThat(Surveys.problems(tree)).extracting(Problem::pointer).contains("/rooms/0/name");
        assertThat(Surveys.problems(tree))
                .allSatisfy(problem -> assertThat(problem.given()).hasSizeLessThanOrEqualTo(200));
    }

    @Test
    void namesThatDifferOnlyInSpacesAreTheSame() {
        ObjectNode tree = Surveys.studio();
        Trees.set(tree, "/spaces/ loft ", Trees.json("{'kind': 'held', 'temperature': 3}"));
        assertThat(Surveys.problems(tree)).extracting(Problem::pointer).containsExactly("/spaces/ loft ");
    }

    @Test
    void endlessProblemsAreCutOff() {
        ObjectNode tree = Surveys.studio();
        for (int i = 0; i < 3000; i++) {
            tree.put("key " + i, 1);
        }
        assertThat(Surveys.problems(tree)).hasSize(1000);
    }
}
