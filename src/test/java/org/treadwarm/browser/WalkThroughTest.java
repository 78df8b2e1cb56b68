package org.treadwarm.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.Browser;
import com.microsoft.playwright.Page;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.treadwarm.web.RunningServer;

/** From the sign-in to a sized room in a real browser: by taps on a tablet, and without script. */
@ExtendWith(Chromium.class)
class WalkThroughTest {
    private RunningServer server;

    @BeforeEach
    void start() {
        server = RunningServer.start();
        server.owner();
    }

    @AfterEach
    void stop() {
        server.close();
    }

    private void assertSized() {
        assertThat(server.desk().list())
                .singleElement()
                .satisfies(header -> assertThat(header.draft()).isFalse());
    }

    @Test
    void onATablet(Browser browser) {
        try (Tab tab = Tab.tablet(server, browser)) {
            Walk walk = new Walk(tab).signIn().startJob().addAssembly().addRoom();

            walk.assertShownAsTyped();
            assertSized();
            theAnswerFollowsTheTyping(tab);
            assertThat(tab.complaints()).isEmpty();
        }
    }

    private void theAnswerFollowsTheTyping(Tab tab) {
        Page page = tab.page();
        String saved = page.locator("#answer").innerText();
        tab.field(Walk.ROOM + "/height").tap();
        page.keyboard().press("Home");
        page.keyboard().type("1");

        page.waitForCondition(() -> !page.locator("#answer").innerText().equals(saved));

        assertThat(page.evaluate("document.activeElement.name")).isEqualTo(Walk.ROOM + "/height");
        assertThat(page.evaluate("document.activeElement.selectionStart")).isEqualTo(1);
        assertThat(tab.field(Walk.ROOM + "/height").inputValue()).isEqualTo("18' 2 1/2\"");
        tab.press(tab.button("save"));
        page.reload();
        assertThat(tab.field(Walk.ROOM + "/height").inputValue()).isEqualTo("18' 2 1/2\"");
        assertThat(page.locator("#answer").innerText()).isNotEqualTo(saved);
    }

    @Test
    void withoutScript(Browser browser) {
        try (Tab tab = Tab.withoutScript(server, browser)) {
            Walk walk = new Walk(tab).signIn().startJob().addAssembly().addRoom();

            walk.assertShownAsTyped();
            assertSized();
            tab.type(Walk.ROOM + "/height", "so high");
            tab.press(tab.button("save"));
            assertThat(tab.field(Walk.ROOM + "/height").inputValue()).isEqualTo("so high");
            assertThat(tab.field(Walk.ROOM + "/height").getAttribute("aria-invalid"))
                    .isEqualTo("true");
            tab.type(Walk.ROOM + "/height", "2.6 m");
            tab.press(tab.button("save"));
            assertThat(tab.field(Walk.ROOM + "/height").getAttribute("aria-invalid"))
                    .isNull();
            assertSized();
        }
    }

    @Test
    void aLostNetworkLosesNothingThatWasTyped(Browser browser) {
        try (Tab tab = Tab.tablet(server, browser)) {
            new Walk(tab).signIn().startJob().addAssembly().addRoom();
            String answer = tab.page().locator("#answer").innerText();
            tab.page().context().setOffline(true);

            tab.field(Walk.ROOM + "/height").fill("2.8 m");

            tab.page().waitForCondition(() -> !tab.complaints().isEmpty());
            assertThat(tab.field(Walk.ROOM + "/height").inputValue()).isEqualTo("2.8 m");
            assertThat(tab.page().locator("#answer").innerText()).isEqualTo(answer);
            tab.page().context().setOffline(false);
            tab.press(tab.button("save"));
            assertThat(tab.field(Walk.ROOM + "/height").inputValue()).isEqualTo("2.8 m");
        }
    }
}
