package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.URI;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Demo;
import org.treadwarm.jobs.Job;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

/** What a fitter finds on a room's page: the loops of each part side by side, and what limits them. */
class LayoutPagesTest {
    private static RunningServer server;
    private static Visitor visitor;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        visitor = new Visitor(server, server.session(server.owner()));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    /** The page of a room of the demo job, waited for as a browser does. */
    private static Page room(int index) {
        Job job = server.job("demo", Demo.survey());
        String address = "/jobs/" + job.id() + "/rooms/"
                + job.document().at("/rooms/" + index + "/id").textValue();
        Page page = visitor.open(address);
        while (page.status() == 303
                || page.response().headers().firstValue("Refresh").isPresent()) {
            page = visitor.open(
                    page.status() == 303
                            ? URI.create(page.location()).getRawPath()
                            : page.response().uri().getRawPath());
        }
        return page;
    }

    private static Element table(Page page, String caption) {
        return page.all("table")
                .filter(table -> table.getElementsByTagName("caption").getLength() == 1
                        && table.getElementsByTagName("caption")
                                .item(0)
                                .getTextContent()
                                .equals(caption))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no table " + caption));
    }

    private static List<String> heads(Element table) {
        NodeList heads = ((Element) table.getElementsByTagName("thead").item(0)).getElementsByTagName("th");
        return IntStream.range(0, heads.getLength())
                .mapToObj(i -> heads.item(i).getTextContent())
                .toList();
    }

    @Test
    void theLoopsOfEachPartStandSideBySide() {
        Page page = room(0);

        Element loops = table(page, "Loops to lay, and their valves");
        assertThat(heads(loops)).containsExactly("Laid in", "strip by the window", "middle");
        assertThat(loops.getTextContent())
                .contains("Loops", "Length of each", "Flow of each", "Drop of each", "throttled at each valve");
        assertThat(heads(table(page, "Parts of the floor"))).containsExactly("Part", "strip by the window", "middle");
        assertThat(page.text().replace('\u00a0', ' '))
                .containsPattern("Strip by the window: [0-9]+ loops? of [0-9.]+ m")
                .contains("Limits of practice: ");
    }

    @Test
    void aFloorOfOnePieceHasOneColumn() {
        assertThat(heads(table(room(3), "Loops to lay, and their valves"))).containsExactly("Laid in", "whole floor");
    }
}
