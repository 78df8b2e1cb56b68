package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Job;

/** The plan of a floor and its mats, filled in without script. */
class PlanFormTest {
    private static final String FLOOR = "/rooms/0/heatedFloor";
    private static final String PLAN = FLOOR + "/plan";
    private static final String MATS = FLOOR + "/heater/mats";

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

    private Form form() {
        return visitor.open("/jobs/" + job.id() + "/rooms/studio-1").form("revision");
    }

    private JsonNode kept(String pointer) {
        return server.now(job).document().at(pointer);
    }

    @Test
    void aPlanIsDrawnWithItsFixedParts() {
        visitor.submit(form().press("add:" + PLAN));
        visitor.submit(
                form().type(PLAN + "/width", "7").type(PLAN + "/length", "6").press("add:" + PLAN + "/fixed"));
        Page drawn = visitor.submit(form().type(PLAN + "/fixed/0/name", "bench")
                .type(PLAN + "/fixed/0/width", "3")
                .type(PLAN + "/fixed/0/length", "0.7")
                .type(PLAN + "/fixed/0/x", "0")
                .type(PLAN + "/fixed/0/y", "5.3")
                .press("save"));

        assertThat(kept(PLAN + "/fixed/0/name").textValue()).isEqualTo("bench");
        String answer = drawn.id("answer").orElseThrow().getTextContent();
        assertThat(answer).contains("The floor in plan", "39.90\u00a0m²", "90 % of it is heated");

        visitor.submit(form().press("remove:" + PLAN));
        assertThat(kept(PLAN).isMissingNode()).isTrue();
    }

    @Test
    void aFixedPartBeyondTheWallIsToldAtItsField() {
        visitor.submit(form().press("add:" + PLAN));
        visitor.submit(
                form().type(PLAN + "/width", "7").type(PLAN + "/length", "6").press("add:" + PLAN + "/fixed"));
        Page wrong = visitor.submit(form().type(PLAN + "/fixed/0/width", "3")
                .type(PLAN + "/fixed/0/length", "0.7")
                .type(PLAN + "/fixed/0/x", "5")
                .type(PLAN + "/fixed/0/y", "0")
                .press("save"));

        assertThat(wrong.field(PLAN + "/fixed/0/x").getAttribute("aria-invalid"))
                .isEqualTo("true");
        assertThat(wrong.text()).contains("reaches beyond the right wall", "at most 4 m");
    }

    @Test
    void matsAreAddedChosenAndTakenOut() {
        visitor.submit(form().press("add:" + MATS));
        Page chosen = visitor.submit(form().type(FLOOR + "/heater/voltage", "230")
                .type(MATS + "/0/name", "wide mat")
                .type(MATS + "/0/area", "6")
                .type(MATS + "/0/power", "900")
                .press("save"));

        String answer = chosen.id("answer").orElseThrow().getTextContent();
        assertThat(answer)
                .contains("6 × wide mat", "wide mat, resistance", "Power of the mats", "Insulation resistance");

        visitor.submit(form().press("remove:" + MATS + "/0"));
        assertThat(kept(MATS).isMissingNode()).isTrue();
    }

    @Test
    void matsAreNotOfferedForWarmWater() {
        visitor.submit(form().type(FLOOR + "/heater/density", "")
                .type(FLOOR + "/heater/kind", "water")
                .press("save"));

        assertThat(visitor.open("/jobs/" + job.id() + "/rooms/studio-1").offers("add:" + MATS))
                .isFalse();
    }
}
