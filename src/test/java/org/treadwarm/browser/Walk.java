package org.treadwarm.browser;

import static org.assertj.core.api.Assertions.assertThat;

import com.microsoft.playwright.Page;
import org.treadwarm.web.RunningServer;

/** The way from the sign-in to a room that is sized, as somebody goes it who has nothing yet. */
final class Walk {
    static final String WALL = "/assemblies/yard wall";
    static final String ROOM = "/rooms/0";

    private final Tab tab;

    Walk(Tab tab) {
        this.tab = tab;
    }

    private void press(String action) {
        tab.press(tab.button(action));
    }

    Walk signIn() {
        Page page = tab.open("/jobs").page();
        page.locator("#name").fill(RunningServer.OWNER);
        page.locator("#password").fill(RunningServer.PASSWORD);
        tab.press(page.locator("form:has(#password) button"));
        assertThat(page.url()).endsWith("/jobs");
        return this;
    }

    Walk startJob() {
        Page page = tab.page();
        page.locator("#name").fill("Mill Lane");
        tab.press(page.locator("form:has(#name) button"));
        tab.type("/site/outdoorTemperature", "-9");
        tab.type("/site/annualMeanTemperature", "8,5 °C");
        press("save");
        return this;
    }

    Walk addAssembly() {
        String job = tab.page().url();
        tab.page().locator("#new-name").fill("yard wall");
        press("add-assembly");
        press("add:" + WALL + "/layers");
        tab.type(WALL + "/layers/0/name", "brick");
        tab.type(WALL + "/layers/0/thickness", "215");
        tab.type(WALL + "/layers/0/conductivity", "0.77");
        press("add:" + WALL + "/layers");
        tab.type(WALL + "/layers/1/name", "boards");
        tab.type(WALL + "/layers/1/thickness", "80 mm");
        tab.type(WALL + "/layers/1/conductivity", "0.035 W/(m.K)");
        press("save");
        assertThat(tab.page().locator("#answer svg").count()).isPositive();
        tab.open(job);
        return this;
    }

    /** Ends at the form of the room, saved and sized. */
    Walk addRoom() {
        tab.page().locator("#new-name").fill("den");
        press("add-room");
        tab.type(ROOM + "/indoorTemperature", "20");
        tab.type(ROOM + "/floorArea", "4.10 x 3.20 + 1.2 x 0.8");
        tab.type(ROOM + "/height", "8' 2 1/2\"");
        press("add:" + ROOM + "/surfaces");
        tab.type(ROOM + "/surfaces/0/name", "north");
        tab.choose(ROOM + "/surfaces/0/assembly", "yard wall");
        tab.type(ROOM + "/surfaces/0/area", "11.5");
        tab.choose(ROOM + "/surfaces/0/to", "outdoors");
        tab.type(ROOM + "/air/changeRate", "0.5 1/h ± 30 %");
        press("add:" + ROOM + "/heatedFloor");
        floor(ROOM + "/heatedFloor");
        press("save");
        return this;
    }

    private void floor(String floor) {
        tab.type(floor + "/area", "10");
        tab.type(floor + "/ground/exposedPerimeter", "4.1");
        tab.type(floor + "/ground/wallThickness", "0.3 m");
        tab.type(floor + "/ground/soilConductivity", "2.0");
        tab.choose(floor + "/heater/kind", "electric");
        tab.type(floor + "/heater/density", "150");
        press("add:" + floor + "/below");
        tab.type(floor + "/below/0/material", "EPS");
        tab.type(floor + "/below/0/thickness", "100");
    }

    /** Whether everything typed on the way is shown as it was typed. */
    void assertShownAsTyped() {
        assertThat(tab.field(ROOM + "/name").inputValue()).isEqualTo("den");
        assertThat(tab.field(ROOM + "/floorArea").inputValue()).isEqualTo("4.10 x 3.20 + 1.2 x 0.8");
        assertThat(tab.field(ROOM + "/height").inputValue()).isEqualTo("8' 2 1/2\"");
        assertThat(tab.field(ROOM + "/surfaces/0/assembly").inputValue()).isEqualTo("yard wall");
        assertThat(tab.field(ROOM + "/surfaces/0/area").inputValue()).isEqualTo("11.5");
        assertThat(tab.field(ROOM + "/air/changeRate").inputValue()).isEqualTo("0.5 1/h ± 30 %");
        assertThat(tab.field(ROOM + "/heatedFloor/area").inputValue()).isEqualTo("10");
        assertThat(tab.field(ROOM + "/heatedFloor/below/0/thickness").inputValue())
                .isEqualTo("100");
        assertThat(tab.field(ROOM + "/heatedFloor/heater/kind").inputValue()).isEqualTo("electric");
    }
}
