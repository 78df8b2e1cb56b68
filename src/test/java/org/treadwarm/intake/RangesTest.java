package org.treadwarm.intake;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.properties.Surveys;
import org.treadwarm.properties.Trees;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Readings;
import org.treadwarm.units.Declared;

/** Possible ranges: a bound is accepted or refused as declared, the next number beyond it is refused. */
class RangesTest {
    private static final String WALL = "/rooms/2/heatedFloor/heater/wallThickness";

    private static final String FIXED = "/rooms/0/heatedFloor/plan/fixed/";

    /**
     * Readings whose range depends on others: the pipe's wall; a reheat beside a setback, and the setback beside its room; fixed parts
     * within their plan.
     */
    private static final Set<String> JUDGED_WITH_OTHERS = Set.of(
            WALL,
            "/rooms/2/reheat",
            "/rooms/2/warmUp/from",
            FIXED + "0/width",
            FIXED + "0/length",
            FIXED + "0/x",
            FIXED + "0/y",
            FIXED + "1/width",
            FIXED + "1/length",
            FIXED + "1/x",
            FIXED + "1/y");

    private static List<Problem> at(String pointer, double value) {
        ObjectNode survey = Surveys.everything();
        Trees.set(survey, pointer, DoubleNode.valueOf(value));
        return Surveys.problems(survey).stream()
                .filter(problem -> problem.pointer().equals(pointer))
                .toList();
    }

    private static void assertRefused(String pointer, double value) {
        List<Problem> problems = at(pointer, value);
        assertThat(problems).as("%s = %s", pointer, value).hasSize(1);
        assertThat(problems.get(0).given()).isNotBlank();
        assertThat(problems.get(0).message()).isNotBlank();
        assertThat(problems.get(0).allowed()).isNotBlank();
    }

    /** The ranges of the published contract, written out once more. */
    @ParameterizedTest
    @CsvSource({
        "/site/outdoorTemperature, -60, true, 60, true",
        "/site/annualMeanTemperature, -60, true, 60, true",
        "/site/altitude, -430, true, 5000, true",
        "/spaces/neighbour/temperature, -60, true, 60, true",
        "/rooms/0/indoorTemperature, -60, true, 60, true",
        "/rooms/0/floorArea, 0, false, 10000, true",
        "/rooms/0/height, 0, false, 1000, true",
        "/rooms/1/surfaces/0/area, 0, false, 10000, true",
        "/rooms/0/surfaces/2/width, 0, false, 1000, true",
        "/rooms/0/surfaces/2/height, 0, false, 1000, true",
        "/rooms/0/surfaces/0/openings/0/area, 0, false, 10000, true",
        "/rooms/0/surfaces/4/ground/exposedPerimeter, 0, false, 1000, true",
        "/rooms/0/surfaces/4/ground/wallThickness, 0.00001, true, 10, true",
        "/rooms/0/surfaces/4/ground/soilConductivity, 0.001, true, 500, true",
        "/rooms/0/surfaces/5/ground/floorHeight, 0, true, 1000, true",
        "/rooms/0/surfaces/5/ground/wallUValue, 0.01, true, 20, true",
        "/rooms/0/junctions/0/psi, -2, true, 5, true",
        "/rooms/0/junctions/0/length, 0, true, 1000, true",
        "/rooms/1/air/changeRate, 0, true, 50, true",
        "/rooms/0/heatedFloor/area, 0, false, 10000, true",
        "/rooms/0/heatedFloor/heater/density, 0, true, 2000, true",
        "/rooms/0/heatedFloor/heater/spacing, 0, false, 1000, true",
        "/rooms/0/heatedFloor/maximumSurfaceTemperature, -60, true, 60, true",
        "/rooms/0/reheat, 0, true, 2000, true",
        "/assemblies/window/uValue, 0.01, true, 20, true",
        "/assemblies/timber wall/insideCoefficient, 0.5, true, 100, true",
        "/assemblies/timber wall/outsideCoefficient, 0.5, true, 100, true",
        "/assemblies/roof/layers/0/resistance, 0, true, 50, true",
        "/assemblies/roof/layers/1/thickness, 0.00001, true, 10, true",
        "/assemblies/roof/layers/1/conductivity, 0.001, true, 500, true",
        "/assemblies/timber wall/layers/1/bridging/share, 0, false, 1, false",
    })
    void areThoseOfTheContract(String pointer, double min, boolean minAllowed, double max, boolean maxAllowed) {
        assertThat(at(pointer, min).isEmpty()).isEqualTo(minAllowed);
        assertThat(at(pointer, max).isEmpty()).isEqualTo(maxAllowed);
        assertRefused(pointer, Math.nextDown(min));
        assertRefused(pointer, Math.nextUp(max));
    }

    static List<Arguments> everyReading() {
        List<Arguments> readings = new ArrayList<>();
        Readings.visit(Surveys.accepted(Surveys.everything()), "", (pointer, declared, reading) -> {
            if (!JUDGED_WITH_OTHERS.contains(pointer)) {
                readings.add(Arguments.of(pointer, declared));
            }
        });
        return readings;
    }

    /** Not of its declared range alone: the wall must leave room for the water in its pipe of 17 mm. */
    @Test
    void aPipesWallIsThinnerThanItsRadius() {
        assertThat(at(WALL, 0.0084)).isEmpty();
        assertRefused(WALL, 0.0085);
        assertRefused(WALL, 0.05);
        assertRefused(WALL, 0.00009);
    }

    /** Not of its declared range alone: the plan is 6.1 m wide and 5.2 m long, the part 2.4 m by 0.6 m. */
    @Test
    void aFixedPartLiesWithinThePlan() {
        assertThat(at(FIXED + "0/x", 0)).isEmpty();
        assertThat(at(FIXED + "0/x", 3.7)).isEmpty();
        assertRefused(FIXED + "0/x", 3.71);
        assertRefused(FIXED + "0/x", -0.01);
        assertThat(at(FIXED + "0/y", 4.6)).isEmpty();
        assertRefused(FIXED + "0/y", 4.61);
        assertRefused(FIXED + "0/width", 6.11);
        assertRefused(FIXED + "0/width", 0);
        assertRefused(FIXED + "0/length", 5.21);
        assertRefused(FIXED + "0/length", 0);
    }

    @Test
    void aPlanHasAtMostTwelveFixedParts() {
        ObjectNode survey = Surveys.everything();
        ArrayNode parts = (ArrayNode) survey.at("/rooms/0/heatedFloor/plan/fixed");
        while (parts.size() < 12) {
            parts.add(parts.get(0).deepCopy());
        }
        assertThat(Surveys.problems(survey)).isEmpty();
        parts.add(parts.get(0).deepCopy());
        assertThat(Surveys.problems(survey))
                .extracting(Problem::pointer)
                .containsExactly("/rooms/0/heatedFloor/plan/fixed");
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyReading")
    void holdForEveryReading(String pointer, Declared declared) {
        assertThat(at(pointer, declared.min()).isEmpty()).isEqualTo(!declared.moreThanMin());
        assertThat(at(pointer, declared.max()).isEmpty()).isEqualTo(!declared.lessThanMax());
        assertRefused(pointer, Math.nextDown(declared.min()));
        assertRefused(pointer, Math.nextUp(declared.max()));
        assertRefused(pointer, Double.MAX_VALUE);
        assertRefused(pointer, -Double.MAX_VALUE);
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("everyReading")
    void plausibleRangesLieInsidePossibleOnes(String pointer, Declared declared) {
        assertThat(declared.plausibleFrom()).isLessThan(declared.plausibleTo());
        assertThat(Math.max(declared.plausibleFrom(), declared.min())).isBetween(declared.min(), declared.max());
        assertThat(Math.min(declared.plausibleTo(), declared.max())).isBetween(declared.min(), declared.max());
    }

    @Test
    void countsAreWholeNumbers() {
        String pointer = "/rooms/0/surfaces/0/openings/0/count";
        assertThat(at(pointer, 2)).isEmpty();
        assertThat(at(pointer, 1000)).isEmpty();
        assertRefused(pointer, 1.5);
        assertRefused(pointer, 0);
        assertRefused(pointer, 1001);
        assertRefused(pointer, -1);
    }

    @Test
    void theRefusalNamesGivenAndAllowed() {
        ObjectNode survey = Surveys.studio();
        Trees.set(survey, "/rooms/0/surfaces/0/area", Trees.json("'-4 m2'"));
        assertThat(Surveys.problems(survey)).hasSize(1).first().satisfies(problem -> {
            assertThat(problem.pointer()).isEqualTo("/rooms/0/surfaces/0/area");
            assertThat(problem.given()).isEqualTo("-4 m2");
            assertThat(problem.allowed()).isEqualTo("more than 0 m2, at most 10 000 m2");
        });
    }

    @Test
    void oneOpeningMayFillItsSurfaceAndNotExceedIt() {
        ObjectNode survey = Surveys.studio();
        Trees.set(survey, "/rooms/0/surfaces/0/openings/0/area", Trees.json("12"));
        assertThat(Surveys.problems(survey)).isEmpty();
        Trees.set(survey, "/rooms/0/surfaces/0/openings/0/area", Trees.json("12.000001"));
        assertThat(Surveys.problems(survey)).hasSize(1);
    }
}
