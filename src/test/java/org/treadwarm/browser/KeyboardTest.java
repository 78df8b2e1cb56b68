package org.treadwarm.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.Page;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.treadwarm.jobs.Job;
import org.treadwarm.web.RunningServer;

/** Everything can be done with the keyboard alone. */
@ExtendWith(Chromium.class)
class KeyboardTest {
    private static final int MOST_STEPS = 600;

    private RunningServer server;
    private Job job;

    @BeforeEach
    void start() {
        server = RunningServer.start();
        job = server.job("yard", RunningServer.studio());
    }

    @AfterEach
    void stop() {
        server.close();
    }

    private Tab room(Browser browser) {
        return Tab.desk(server, browser)
                .as(server.session(server.owner()))
                .open("/jobs/" + job.id() + "/rooms/studio-1");
    }

    private static String focused(Page page, String property) {
        return String.valueOf(page.evaluate("name => document.activeElement[name]", property));
    }

    /** Steps on until something is reached, and fails if it never is. */
    private static void stepTo(Page page, String property, String wanted) {
        for (int i = 0; i < MOST_STEPS; i++) {
            if (focused(page, property).equals(wanted)) {
                return;
            }
            page.keyboard().press("Tab");
        }
        throw new AssertionError("the keyboard never reaches " + wanted);
    }

    @Test
    void theFirstStepSkipsToTheContent(Browser browser) {
        try (Tab tab = room(browser)) {
            Page page = tab.page();
            page.keyboard().press("Tab");
            assertThat(focused(page, "hash")).isEqualTo("#content");
            assertThat(page.locator(":focus").boundingBox().x).isNotNegative();

            page.keyboard().press("Enter");
            page.keyboard().press("Tab");

            assertThat(page.evaluate("document.getElementById('content').contains(document.activeElement)"))
                    .isEqualTo(true);
        }
    }

    @Test
    void fieldsAndTheButtonToSaveAreReachedByStepping(Browser browser) {
        try (Tab tab = room(browser)) {
            Page page = tab.page();
            stepTo(page, "name", "/rooms/0/height");
            page.keyboard().press("Control+a");
            page.keyboard().type("2.95");
            stepTo(page, "value", "save");
            assertThat(page.locator(":focus").boundingBox().height).isGreaterThan(40);

            page.waitForNavigation(() -> page.keyboard().press("Enter"));

            assertThat(server.now(job).revision()).isEqualTo(2);
            assertThat(tab.field("/rooms/0/height").inputValue()).isEqualTo("2.95");
            assertThat(tab.complaints()).isEmpty();
        }
    }

    @Test
    void enterInAFieldSavesAndDoesNothingElse(Browser browser) {
        try (Tab tab = room(browser)) {
            Page page = tab.page();
            tab.field("/rooms/0/height").fill("2.95");

            page.waitForNavigation(() -> page.keyboard().press("Enter"));

            var before = job.document().deepCopy();
            var after = server.now(job).document();
            ((com.fasterxml.jackson.databind.node.ObjectNode) before.at("/rooms/0"))
                    .set("height", after.at("/rooms/0/height"));
            assertThat(after.at("/rooms/0/height").textValue()).startsWith("2.95");
            assertThat(after).isEqualTo(before);
        }
    }

    @Test
    void theSummaryOfErrorsIsFocusedAndLeadsToTheField(Browser browser) {
        try (Tab tab = room(browser)) {
            Page page = tab.page();
            tab.field("/rooms/0/height").fill("so high");
            page.waitForNavigation(() -> page.keyboard().press("Enter"));
            assertThat(focused(page, "id")).isEqualTo("summary");

            page.keyboard().press("Tab");
            page.keyboard().press("Enter");

            page.waitForCondition(() -> focused(page, "name").equals("/rooms/0/height"));
        }
    }
}
