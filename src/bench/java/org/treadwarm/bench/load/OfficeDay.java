package org.treadwarm.bench.load;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.net.CookieManager;
import java.net.URI;
import java.net.URLEncoder;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Queue;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.treadwarm.bench.BenchSurveys;
import org.treadwarm.wire.Json;

/**
 * What an office asks of the program: of 20 requests 10 sizings by the quoting system, 6 pages by people, 2 jobs read and 2
 * saved. The mix is invented.
 */
final class OfficeDay {
    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final int JOBS = 200;
    private static final int ROUND = 20;
    private static final int LOOKS = 60;
    private static final String PASSWORD = "an invented password";

    private final ServedProgram program;
    private final String key;
    private final HttpClient client = HttpClient.newBuilder()
            .version(HttpClient.Version.HTTP_1_1)
            .cookieHandler(new CookieManager())
            .build();
    private final HttpRequest sizing;
    private final List<HttpRequest> pages;
    private final Queue<Saved> idle = new ConcurrentLinkedQueue<>();
    private final AtomicInteger turn = new AtomicInteger();

    /** A job that nobody is saving just now, with the tag of its newest revision. */
    private record Saved(String id, String tag) {}

    OfficeDay(ServedProgram program, Path jar, Path data) throws IOException, InterruptedException {
        this.program = program;
        this.key = key(jar, data);
        this.sizing = api("/api/v1/sizings")
                .POST(BodyPublishers.ofByteArray(Json.bytes(BenchSurveys.twelveSurfaces())))
                .build();
        for (int i = 0; i < JOBS; i++) {
            HttpResponse<String> made =
                    client.send(api("/api/v1/jobs").POST(job(i)).build(), BodyHandlers.ofString());
            require(made, 201);
            idle.add(new Saved(MAPPER.readTree(made.body()).get("id").asText(), tag(made)));
        }
        this.pages = pages();
    }

    /** The next request of the mix. */
    CompletableFuture<Boolean> next() {
        int at = turn.getAndIncrement() % ROUND;
        if (at % 2 == 0) {
            return sizing();
        }
        if (at % 10 == 5) {
            return save(at);
        }
        if (at % 10 == 9) {
            Saved job = idle.peek();
            return job == null
                    ? sizing()
                    : ask(api("/api/v1/jobs/" + job.id() + "/sizing").build());
        }
        return page();
    }

    /** One sizing. */
    CompletableFuture<Boolean> sizing() {
        return ask(sizing);
    }

    /** One page: the list of jobs, a job, a room. */
    CompletableFuture<Boolean> page() {
        return ask(pages.get(turn.getAndIncrement() % pages.size()));
    }

    private CompletableFuture<Boolean> save(int at) {
        Saved job = idle.poll();
        if (job == null) {
            return sizing();
        }
        HttpRequest put = api("/api/v1/jobs/" + job.id())
                .header("If-Match", job.tag())
                .PUT(job(at))
                .build();
        return client.sendAsync(put, BodyHandlers.discarding()).thenApply(answer -> {
            idle.add(new Saved(job.id(), tag(answer)));
            return isRight(answer);
        });
    }

    private CompletableFuture<Boolean> ask(HttpRequest request) {
        return client.sendAsync(request, BodyHandlers.ofByteArray()).thenApply(OfficeDay::isRight);
    }

    private static boolean isRight(HttpResponse<?> answer) {
        if (answer.statusCode() != 200) {
            System.err.println(
                    answer.request().method() + " " + answer.uri().getPath() + " answered " + answer.statusCode());
        }
        return answer.statusCode() == 200;
    }

    private HttpRequest.Builder api(String path) {
        return HttpRequest.newBuilder(program.at(path))
                .header("Authorization", "Bearer " + key)
                .header("Content-Type", "application/json");
    }

    private static HttpRequest.BodyPublisher job(int number) {
        ObjectNode body = MAPPER.createObjectNode();
        body.put("name", "Invented job " + number);
        body.set("survey", MAPPER.valueToTree(BenchSurveys.twelveSurfaces()));
        return BodyPublishers.ofString(body.toString());
    }

    private static String tag(HttpResponse<?> answer) {
        return answer.headers().firstValue("ETag").orElse("none");
    }

    private static String key(Path jar, Path data) throws IOException, InterruptedException {
        Process create = new ProcessBuilder(
                        "java",
                        "-jar",
                        jar.toString(),
                        "key",
                        "create",
                        "--name",
                        "load",
                        "--scope",
                        "write",
                        "--data",
                        data.toString())
                .start();
        String[] lines = new String(create.getInputStream().readAllBytes(), StandardCharsets.UTF_8)
                .strip()
                .split("\n");
        if (create.waitFor() != 0) {
            throw new IOException("no key was made");
        }
        return lines[lines.length - 1].strip();
    }

    /** Becomes the owner by the link that the program prints, and finds the demo job's pages. */
    private List<HttpRequest> pages() throws IOException, InterruptedException {
        URI link = program.at(first(program.printed(), "(/owner/\\S+)"));
        String form = page(link);
        HttpResponse<String> entered = client.send(
                HttpRequest.newBuilder(link)
                        .header("Content-Type", "application/x-www-form-urlencoded")
                        .POST(BodyPublishers.ofString(form(Map.of(
                                "csrf",
                                first(form, "name=\"csrf\" value=\"([^\"]+)\""),
                                "name",
                                "Owner",
                                "password",
                                PASSWORD,
                                "again",
                                PASSWORD))))
                        .build(),
                BodyHandlers.ofString());
        require(entered, 303);
        String list = page(program.at("/jobs?find=Quillfen"));
        String job = first(list.contains("/jobs/") ? list : page(program.at("/jobs")), "(/jobs/[a-z2-9]{12})\"");
        String room = first(pageWithFloors(program.at(job)), "(" + job + "/rooms/[^\"/?#]+)\"");
        return List.of("/jobs", job, room).stream()
                .map(path -> HttpRequest.newBuilder(program.at(path)).build())
                .toList();
    }

    /** A page that shows floors, once they have been solved. */
    private String pageWithFloors(URI at) throws IOException, InterruptedException {
        for (int look = 0; look < LOOKS; look++) {
            HttpResponse<String> page = client.send(HttpRequest.newBuilder(at).build(), BodyHandlers.ofString());
            if (page.statusCode() == 200) {
                return page.body();
            }
            TimeUnit.MILLISECONDS.sleep(500);
        }
        throw new IOException("the floors of " + at + " are not solved");
    }

    private String page(URI at) throws IOException, InterruptedException {
        HttpResponse<String> page = client.send(HttpRequest.newBuilder(at).build(), BodyHandlers.ofString());
        require(page, 200);
        return page.body();
    }

    private static void require(HttpResponse<String> answer, int status) throws IOException {
        if (answer.statusCode() != status) {
            throw new IOException(answer.uri() + " answered " + answer.statusCode() + ": " + answer.body());
        }
    }

    private static String form(Map<String, String> fields) {
        return fields.entrySet().stream()
                .map(field -> field.getKey() + "=" + URLEncoder.encode(field.getValue(), StandardCharsets.UTF_8))
                .collect(Collectors.joining("&"));
    }

    private static String first(String text, String pattern) throws IOException {
        Matcher matcher = Pattern.compile(pattern).matcher(text);
        if (!matcher.find()) {
            throw new IOException("nothing is like " + pattern);
        }
        return matcher.group(1);
    }
}
