package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.net.URI;
import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Demo;
import org.treadwarm.jobs.Job;
import org.treadwarm.units.Basis;

/** A wall foot solved for a room, without script. */
class WallFootPagesTest {
    private static final String SUNROOM = "/rooms/2";

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
        job = server.job("demo", Demo.survey());
    }

    private String room() {
        return "/jobs/" + job.id() + "/rooms/"
                + job.document().at(SUNROOM + "/id").textValue();
    }

    private String foot() {
        return room() + "/wall-foot/"
                + job.document().at(SUNROOM + "/junctions/0/id").textValue();
    }

    private Form typed() {
        return visitor.open(foot())
                .form("wall")
                .type("/heatedPlane", "0.15")
                .type("/foundation", "0,6")
                .type("/footConductivity", "1.3");
    }

    /** Follows where a page leads, as a browser does that looks again. */
    private static Page result(Page first) {
        Page page = first;
        while (page.status() == 303
                || page.response().headers().firstValue("Refresh").isPresent()) {
            String where = page.status() == 303
                    ? URI.create(page.location()).getRawPath()
                    : page.response().uri().getRawPath();
            page = visitor.open(where);
        }
        return page;
    }

    @Test
    void aRoomLeadsToItsFoot() {
        assertThat(visitor.open(room()).text()).contains(foot());
    }

    @Test
    void aSolvedPsiIsStoredWithWhatItWasSolvedFrom() {
        Page solved = result(visitor.send(typed().press("solve")));

        assertThat(solved.status()).isEqualTo(200);
        assertThat(solved.offers("with-edge")).isFalse();
        Page stored = visitor.send(
                solved.form("csrf").to(solved.response().uri().getPath()).press("without-edge"));

        assertThat(stored.status()).isEqualTo(303);
        JsonNode psi = server.now(job).document().at(SUNROOM + "/junctions/0/psi");
        assertThat(psi.path("basis").textValue()).isEqualTo("solved");
        assertThat(psi.path("remark").textValue()).contains("old brick wall", "0.15 m", "without edge insulation");
        assertThat(server.now(job)
                        .survey()
                        .orElseThrow()
                        .rooms()
                        .get(2)
                        .junctions()
                        .get(0)
                        .psi()
                        .basis())
                .isEqualTo(Optional.of(Basis.SOLVED));
        assertThat(visitor.open(room()).text()).contains("solved: in section with the wall");
    }

    @Test
    void whatIsNotKnownCanBeAssumed() {
        Page page = visitor.send(typed().press("assume:/foundation"));

        assertThat(page.status()).isEqualTo(200);
        assertThat(page.value("/foundation")).isEqualTo("0.6 m");
        assertThat(page.value("/heatedPlane")).isEqualTo("0.15");
    }

    @Test
    void whatIsMissingIsMarked() {
        Page page = visitor.send(
                typed().type("/heatedPlane", "").type("/edgeDepth", "300").press("solve"));

        assertThat(page.status()).isEqualTo(422);
        assertThat(page.id("f-heatedPlane-error")).isPresent();
        assertThat(page.id("f-edgeThickness-error")).isPresent();
    }

    private void wallOfU(String uValue) {
        ObjectNode survey = (ObjectNode) Demo.survey();
        ObjectNode wall = (ObjectNode) survey.at("/assemblies/old brick wall");
        wall.remove("layers");
        wall.put("uValue", uValue);
        job = server.job("known by U", survey);
    }

    @Test
    void aWallKnownByItsUValueIsSolvedAsOneMaterial() {
        wallOfU("1.9 W/(m2.K)");

        Page solved = result(visitor.send(typed().press("solve")));

        assertThat(solved.status()).isEqualTo(200);
        assertThat(solved.text()).contains("1.900 W/(m²·K) times");
    }

    @Test
    void aWallOfNothingButFilmsSaysWhatIsMissing() {
        wallOfU("6 W/(m2.K)");

        Page page = visitor.send(typed().press("solve"));

        assertThat(page.status()).isEqualTo(422);
        assertThat(page.text()).contains("more than its films", "/assemblies/old%20brick%20wall");
    }

    @Test
    void theRoomSaysWhyASlopeIsNoWall() {
        ObjectNode survey = (ObjectNode) Demo.survey();
        ((ObjectNode) survey.at("/assemblies/old brick wall")).put("heatFlow", "up");
        job = server.job("sloped", survey);

        Page page = visitor.open(room());

        assertThat(page.text())
                .contains("cannot be solved in section", "flows up, so it counts as a roof")
                .doesNotContain(foot());
    }

    @Test
    void theRoomSaysThatOnlyASlabHasAFoot() {
        ObjectNode survey = (ObjectNode) Demo.survey();
        ((ObjectNode) survey.at(SUNROOM + "/heatedFloor/ground")).put("kind", "suspended");
        job = server.job("suspended", survey);

        Page page = visitor.open(room());

        assertThat(page.text()).contains("cannot be solved in section", "Only a heated floor on a slab");
    }

    @Test
    void aSolvedFootIsDrawnWithAndWithoutEdgeInsulation() {
        Page plain = result(visitor.send(typed().press("solve")));

        assertThat(plain.text()).contains("Wall foot in section: wall old brick wall, without edge insulation");
        assertThat(plain.id("foot-with-title")).isEmpty();

        Page both = result(visitor.send(typed().type("/edgeThickness", "50")
                .type("/edgeConductivity", "0.035")
                .type("/edgeDepth", "300")
                .press("solve")));

        assertThat(both.offers("with-edge")).isTrue();
        assertThat(both.id("foot-without-title")).isPresent();
        assertThat(both.id("foot-with-title")).isPresent();
    }

    @Test
    void externalDimensionsAreNotMixedIn() {
        ObjectNode survey = (ObjectNode) Demo.survey();
        survey.withObject("/site").put("dimensions", "external");
        job = server.job("external", survey);

        Page page = visitor.open(foot());

        assertThat(page.text()).contains("taped by external dimensions");
        assertThat(page.has("wall")).isFalse();
    }

    @Test
    void aRoomThatHasChangedIsSolvedAnew() {
        Page solved = result(visitor.send(typed().press("solve")));
        visitor.submit(visitor.open(room())
                .form("revision")
                .type(SUNROOM + "/heatedFloor/ground/wallThickness", "0.31")
                .press("save"));

        Page answer = visitor.send(
                solved.form("csrf").to(solved.response().uri().getPath()).press("without-edge"));

        assertThat(answer.status()).isEqualTo(409);
        assertThat(answer.text()).contains("solve it anew");
    }

    @Test
    void noOtherJunctionHasAFoot() {
        String living = "/jobs/" + job.id() + "/rooms/"
                + job.document().at("/rooms/0/id").textValue();
        String corner = job.document().at("/rooms/0/junctions/1/id").textValue();

        assertThat(visitor.open(living + "/wall-foot/" + corner).status()).isEqualTo(404);
        assertThat(visitor.open(living + "/wall-foot/none").status()).isEqualTo(404);
    }
}
