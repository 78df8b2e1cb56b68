package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.jobs.Job;

/** What people type is shown as they typed it: never evaluated by the templates, never taken for HTML or SVG. */
class HostileTextTest {
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

    /** The studio, with this text wherever a name or a note may stand. */
    private static ObjectNode survey(String text) {
        ObjectNode survey = RunningServer.studio();
        survey.put("name", text);
        ((ObjectNode) survey.get("site")).put("reference", text);
        ObjectNode assemblies = (ObjectNode) survey.get("assemblies");
        assemblies.set(text, assemblies.remove("shed wall"));
        ((ObjectNode) assemblies.get(text).at("/layers/1")).put("name", text);
        ((ObjectNode) assemblies.get(text).at("/layers/1/bridging")).put("frame", text);
        ObjectNode spaces = (ObjectNode) survey.get("spaces");
        String space = text + " space";
        spaces.set(space, spaces.remove("loft"));
        for (var room : survey.get("rooms")) {
            for (var surface : room.get("surfaces")) {
                replace((ObjectNode) surface, Map.of("shed wall", text, "loft", space));
            }
        }
        ObjectNode room = (ObjectNode) survey.get("rooms").get(0);
        room.put("name", text + " room").put("remark", text);
        ((ObjectNode) room.at("/surfaces/0")).put("name", text);
        ((ObjectNode) room.at("/surfaces/0/openings/0")).put("name", text);
        ((ObjectNode) room.at("/junctions/0")).put("name", text);
        ((ObjectNode) room.at("/heatedFloor/above/1")).put("name", text);
        return survey;
    }

    private static void replace(ObjectNode surface, Map<String, String> names) {
        for (String key : List.of("assembly", "to")) {
            String now = surface.get(key).textValue();
            surface.put(key, names.getOrDefault(now, now));
        }
    }

    private static String segment(String text) {
        return URLEncoder.encode(text, StandardCharsets.UTF_8).replace("+", "%20");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "${7919*7907}",
                "__${7919*7907}__",
                "*{7919*7907} #{7919*7907} @{7919*7907} ~{layout} [[${7919*7907}]] [(${7919*7907})] ${T(java.lang.Runtime)}",
                "<script>alert(49)</script>",
                "\"><img src=x onerror=alert(49)>&lt;",
                "</text></svg><script>alert(49)</script>",
                "'\"&<>/\\?#%;:@ é ½ 庭",
                "{{7919*7907}} %{7919*7907} $7919*7907",
                "javascript:alert(49)",
                "&#60;b&#62; &amp;"
            })
    void isShownAsItWasTyped(String text) {
        Job job = server.job(text, survey(text));
        assertThat(job.problems()).isEmpty();
        String base = "/jobs/" + job.id();

        Page list = visitor.open("/jobs");
        assertThat(list.document().getDocumentElement().getTextContent()).contains(text);
        Page whole = visitor.open(base);
        assertThat(whole.value("job-name")).isEqualTo(text);
        assertThat(whole.value("/site/reference")).isEqualTo(text);
        Page room = visitor.open(base + "/rooms/studio-1");
        assertThat(room.value("/rooms/0/name")).isEqualTo(text + " room");
        assertThat(room.value("/rooms/0/remark").strip()).isEqualTo(text);
        assertThat(room.value("/rooms/0/surfaces/0/assembly")).isEqualTo(text);
        assertThat(room.value("/rooms/0/surfaces/0/openings/0/name")).isEqualTo(text);
        Page assembly = visitor.open(base + "/assemblies/" + segment(text));
        assertThat(assembly.value("part-name")).isEqualTo(text);
        Page space = visitor.open(base + "/spaces/" + segment(text + " space"));
        assertThat(space.value("part-name")).isEqualTo(text + " space");
        for (Page page : List.of(list, whole, room, assembly, space)) {
            assertHarmless(page);
        }
        assertThat(room.all("svg")).isNotEmpty();
        assertThat(assembly.all("svg")).isNotEmpty();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "${7919*7907}",
                "<script>alert(49)</script>",
                "\"><img src=x onerror=alert(49)>",
                "__${7919*7907}__"
            })
    void isShownAsTypedInErrorsToo(String text) {
        ObjectNode survey = survey(text);
        ObjectNode room = (ObjectNode) survey.get("rooms").get(0);
        room.put("height", text).put(text, text);
        ((ObjectNode) room.at("/surfaces/1")).put("to", text).put("assembly", text + "?");
        ((ArrayNode) room.get("surfaces")).addObject().put("name", text);
        Job job = server.job(text, survey);

        Page page = visitor.open("/jobs/" + job.id() + "/rooms/studio-1");
        assertThat(page.value("/rooms/0/height")).isEqualTo(text);
        assertHarmless(page);
        assertHarmless(visitor.open("/jobs/" + job.id()));
        assertHarmless(visitor.open("/materials?find=" + segment(text)));
        assertHarmless(visitor.open("/sign-in?back=" + segment("/" + text)));
        assertHarmless(visitor.open("/" + segment(text)));
    }

    private static void assertHarmless(Page page) {
        assertThat(page.status()).isLessThan(500);
        assertThat(page.all("script"))
                .allMatch(script -> script.getAttribute("src").startsWith("/static/"));
        assertThat(page.all("img")).allMatch(image -> image.getAttribute("src").startsWith("/static/"));
        assertThat(page.all("b")).isEmpty();
        assertThat(page.all("a"))
                .allMatch(link -> link.getAttribute("href").startsWith("/")
                        || link.getAttribute("href").startsWith("#"));
        assertThat(page.all("*")).noneMatch(element -> element.hasAttribute("onerror"));
        assertThat(page.text()).doesNotContain("62615533");
    }
}
