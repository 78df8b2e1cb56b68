package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Person;
import org.treadwarm.store.Scope;

/**
 * Requests to every route of the API and the pages, each spoiled at random but repeatably: no fault, and every refusal says
 * so. {@code -Dmutants=100000} tries more of them.
 */
class MutatedRequestsTest {
    private static final int MUTANTS = Integer.getInteger("mutants", 5000);
    private static final long SEED = 20_261_103;
    private static final List<String> ODD = List.of(
            "",
            " ",
            "%00",
            "%zz",
            "..",
            "%2F",
            ";",
            "?",
            "#",
            "\u00e9",
            "null",
            "-1",
            "99999999999999999999",
            "\t",
            "a".repeat(3000),
            "\"",
            "{}",
            "[]",
            "1e999",
            "NaN",
            "\\u0000",
            "\ud83c",
            ": :",
            "${7*7}",
            "'--",
            "*",
            "0");

    private static final String FIELDS = "&name=Mill+Lane&role=surveyor&password=a+long+enough+word&scope=read"
            + "&last=2027-03-31&%2Fsite%2FoutdoorTemperature=-8+%C2%B0C&%2Frooms%2Fstudio%2Ftemperature=20&do=save";

    private final Random random = new Random(SEED);

    @Test
    void noneIsAFaultAndEveryRefusalIsAProblem() throws Exception {
        try (RunningServer server = RunningServer.start()) {
            Job job = server.job("yard", RunningServer.studio());
            List<RawRequest> seeds = new ArrayList<>(seeds(server, job.id()));
            seeds.addAll(partsOfJobs(server, job.id()));
            seeds.addAll(pages(server, job.id()));
            assertThat(server.routes()).allMatch(route -> seeds.stream().anyMatch(seed -> reaches(seed, route)));
            List<String> faults = new ArrayList<>();
            int refused = 0;
            for (int i = 0; i < MUTANTS; i++) {
                RawRequest request = mutant(seeds.get(i % seeds.size()));
                RawAnswer answer = request.sendTo(server);
                if (answer.status() >= 300) {
                    refused++;
                }
                answer.fault(request.isOfApi()).ifPresent(fault -> faults.add(fault + " after " + request.shown()));
            }
            assertThat(faults).isEmpty();
            assertThat(refused).isGreaterThan(MUTANTS / 3);
            assertThat(server.desk().revision(job.id(), 1).orElseThrow().document())
                    .isEqualTo(job.document());
            assertThat(server.store().keys().find(server.key(Scope.WRITE))).isPresent();
        }
    }

    private static List<RawRequest> seeds(RunningServer server, String job) {
        String survey = RunningServer.studio().toString();
        String body = "{\"name\": \"yard\", \"survey\": " + survey + "}";
        String key = server.key(Scope.WRITE);
        String jobs = "/api/v1/jobs";
        return List.of(
                RawRequest.get("/api/v1/health", key),
                RawRequest.get("/api/v1/openapi.json", key),
                RawRequest.get("/api/v1/materials?find=oak", key),
                RawRequest.get(jobs, key),
                RawRequest.get(jobs + "/" + job, key),
                RawRequest.get(jobs + "/" + job + "/sizing", key),
                RawRequest.get(jobs + "/" + job + "/revisions", key),
                RawRequest.get(jobs + "/" + job + "/revisions/1", key),
                RawRequest.with("POST", "/api/v1/sizings?working=true", key, survey),
                RawRequest.with(
                        "POST",
                        "/api/v1/assemblies/evaluations",
                        key,
                        RunningServer.studio().at("/assemblies/shed wall").toString()),
                RawRequest.with(
                        "POST",
                        "/api/v1/warmups",
                        key,
                        WarmUpsApiTest.question().toString()),
                RawRequest.with("POST", "/api/v1/sizings/batch", key, "{\"surveys\": [" + survey + ", {}]}"),
                RawRequest.with(
                        "POST", "/api/v1/sections", key, SectionsApiTest.cable().toString()),
                RawRequest.get(jobs + "?limit=1&cursor=am9icyA1IDM", key).header("X-Request-Id", "request-0001"),
                RawRequest.get(jobs + "/" + job + "/revisions?limit=1&cursor=cmV2aXNpb25zIDI", key),
                RawRequest.get("/api/v1/materials?find=o&limit=3&cursor=bWF0ZXJpYWxzIDM", key),
                RawRequest.get("/metrics", key),
                RawRequest.with("POST", jobs, key, body).header("Idempotency-Key", "order-1"),
                RawRequest.with("POST", jobs, key, body),
                RawRequest.with("POST", jobs + "/" + job + "/sheets", key, "{\"revision\": 1}"),
                RawRequest.get("/api/v1/sheets", key),
                RawRequest.get("/api/v1/sheets/2026-0001", key),
                RawRequest.get("/api/v1/sheets/2026-0001/verification", key),
                RawRequest.with("POST", "/api/v1/sheets/2026-0001/withdrawal", key, "{\"reason\": \"wrong\"}"),
                RawRequest.with("PUT", jobs + "/" + job, key, body).header("If-Match", "\"1\""));
    }

    private static List<RawRequest> partsOfJobs(RunningServer server, String job) {
        String key = server.key(Scope.WRITE);
        String at = "/api/v1/jobs/" + job;
        String room = RunningServer.studio().at("/rooms/0").toString();
        return List.of(
                RawRequest.get(at + "/rooms/studio-1", key),
                RawRequest.with("POST", at + "/rooms", key, room),
                RawRequest.with("PUT", at + "/rooms/studio-1", key, room).header("If-Match", "\"none\""),
                RawRequest.get(at + "/rooms/studio-1", key).method("DELETE").header("If-Match", "\"none\""),
                RawRequest.get(at + "/tables/rooms", key),
                RawRequest.get(at + "/tables/results", key),
                table(at + "/tables/rooms?preview=true", key, "room,height [m]\nstudio,3.3\n"),
                table(at + "/tables/openings", key, "room;surface;opening;area [m2]\nstudio;north wall;sash;1,7\n"),
                RawRequest.get(at + "/revisions/1/changes", key),
                RawRequest.with("POST", at + "/revisions/1/restore", key, "").header("If-Match", "\"1\""),
                RawRequest.with("POST", at + "/copy", key, ""),
                RawRequest.with("POST", at + "/archive", key, ""),
                RawRequest.with("POST", at + "/unarchive", key, ""),
                RawRequest.with(
                        "POST",
                        "/api/v1/wall-feet",
                        key,
                        WallFeetApiTest.question().toString()));
    }

    private static RawRequest table(String path, String key, String text) {
        return new RawRequest(
                        "POST",
                        path,
                        List.of("Host: 127.0.0.1", "Authorization: Bearer " + key, "Content-Type: text/csv"),
                        text)
                .header("If-Match", "*");
    }

    /** Whoever is signed out or loses the account by one of them has a session of its own for that. */
    private static List<RawRequest> pages(RunningServer server, String job) {
        Person owner = server.owner();
        List<RawRequest> seeds = new ArrayList<>();
        for (ServedRoute route : server.routes()) {
            boolean api = route.path().startsWith("/api/");
            if (api && !route.method().equals("HEAD")) {
                continue;
            }
            String path = filled(route.path(), job);
            seeds.add(
                    api
                            ? RawRequest.get(path, server.key(Scope.WRITE)).method("HEAD")
                            : RawRequest.form(route.method(), path, server.session(owner), FIELDS));
        }
        return seeds;
    }

    private static String filled(String route, String job) {
        return route.replace("{job}", job)
                .replace("{id}", job)
                .replace("{n}", "1")
                .replace("{part}", "rooms")
                .replace("{name}", "studio")
                .replace("<name>", "treadwarm.css")
                .replaceAll("\\{[a-z]+}", "nothing");
    }

    private static boolean reaches(RawRequest seed, ServedRoute route) {
        String pattern = route.path().replaceAll("\\{[a-z]+}|<[a-z]+>", "[^/]+");
        return seed.method().equals(route.method())
                && seed.path().split("[?]")[0].matches(pattern);
    }

    private RawRequest mutant(RawRequest seed) {
        RawRequest request = seed;
        int times = 1 + random.nextInt(3);
        for (int i = 0; i < times; i++) {
            request = switch (random.nextInt(4)) {
                case 0 -> request.path(spoiled(request.path()));
                case 1 -> request.spoilHeader(random.nextInt(100), this::spoiled);
                case 2 -> request.method(pick(List.of("GET", "POST", "PUT", "DELETE", "PATCH", "HEAD", "BREW", "get")));
                default -> request.body(spoiled(request.body()));
            };
        }
        return request;
    }

    private String pick(List<String> choices) {
        return choices.get(random.nextInt(choices.size()));
    }

    /** The text with something cut out, put in, doubled or replaced somewhere. */
    private String spoiled(String text) {
        int from = random.nextInt(text.length() + 1);
        int to = Math.min(text.length(), from + random.nextInt(12));
        return switch (random.nextInt(5)) {
            case 0 -> text.substring(0, from) + text.substring(to);
            case 1 -> text.substring(0, from) + pick(ODD) + text.substring(from);
            case 2 -> text.substring(0, to) + text.substring(from);
            case 3 -> text.substring(0, from) + pick(ODD) + text.substring(to);
            default -> text.substring(0, from) + (char) random.nextInt(0x2000) + text.substring(to);
        };
    }
}
