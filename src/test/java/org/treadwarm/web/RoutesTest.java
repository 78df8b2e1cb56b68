package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.treadwarm.store.Person;
import org.treadwarm.store.Role;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Session;
import org.treadwarm.web.security.Access;

/** Every route of the running server, tried by everybody, answers as the table says. */
class RoutesTest {
    private static final String HEAD = "| route | nobody | surveyor | estimator | owner | key: size | read | write |\n"
            + "| --- | --- | --- | --- | --- | --- | --- | --- |\n";
    private static final String SECRET = "a-secret-of-a-form-made-up-here";
    private static final HttpClient CLIENT = HttpClient.newBuilder()
            .followRedirects(HttpClient.Redirect.NEVER)
            .version(HttpClient.Version.HTTP_1_1)
            .build();

    private static RunningServer server;
    private static Person surveyor;
    private static Person estimator;
    private static Person owner;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        owner = server.owner();
        estimator = server.member("Emmet of Quillfen Floors", Role.ESTIMATOR);
        surveyor = server.member("Silvie of Quillfen Floors", Role.SURVEYOR);
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    @Test
    void answersAsTheTableSays() throws IOException {
        StringBuilder table = new StringBuilder(HEAD);
        List<String> unlike = new ArrayList<>();
        server.routes().stream()
                .sorted(Comparator.comparing(ServedRoute::path).thenComparing(ServedRoute::method))
                .forEach(route -> {
                    List<String> seen = row(route);
                    table.append("| `").append(route.method()).append(' ').append(route.path());
                    table.append("` | ").append(String.join(" | ", seen)).append(" |\n");
                    if (!seen.equals(declared(route))) {
                        unlike.add(route + " answered " + seen + " instead of " + declared(route));
                    }
                });
        assertThat(unlike).isEmpty();
        assertThat(written()).isEqualTo(table.toString());
    }

    /** The table as it stands in DEVELOPERS.md, up to the first line that is none of it. */
    private static String written() throws IOException {
        String text = Files.readString(Path.of("DEVELOPERS.md"));
        return text.substring(text.indexOf(HEAD))
                .lines()
                .takeWhile(line -> line.startsWith("|"))
                .map(line -> line + "\n")
                .collect(Collectors.joining());
    }

    private static List<String> row(ServedRoute route) {
        return Stream.of(
                        stranger(route),
                        signedIn(route, surveyor),
                        signedIn(route, estimator),
                        signedIn(route, owner),
                        withKey(route, Scope.SIZE),
                        withKey(route, Scope.READ),
                        withKey(route, Scope.WRITE))
                .toList();
    }

    private static List<String> declared(ServedRoute route) {
        Access access = route.access();
        // The test runs on the server's machine, where watchers need no key.
        if (access instanceof Access.Anybody || access instanceof Access.Watcher) {
            return List.of("yes", "yes", "yes", "yes", "yes", "yes", "yes");
        }
        List<String> expected = new ArrayList<>();
        boolean forPeople = access instanceof Access.Member;
        expected.add(forPeople ? "sign in" : "no");
        for (Role role : List.of(Role.SURVEYOR, Role.ESTIMATOR, Role.OWNER)) {
            boolean may = access instanceof Access.Member member && role.allows(member.least());
            expected.add(may ? "yes" : "no");
        }
        for (Scope scope : Scope.values()) {
            boolean may = access instanceof Access.Key key && scope.allows(key.least());
            expected.add(may ? "yes" : forPeople ? "sign in" : "no");
        }
        return expected;
    }

    private static String stranger(ServedRoute route) {
        return outcome(route, request(route, "csrf=" + SECRET).header("Cookie", "treadwarm-form=" + SECRET));
    }

    /** Each time a session of its own, as some routes end it. */
    private static String signedIn(ServedRoute route, Person person) {
        Session session = server.session(person);
        String cookie = "treadwarm-session=" + session.token();
        return outcome(route, request(route, "csrf=" + session.csrfToken()).header("Cookie", cookie));
    }

    private static String withKey(ServedRoute route, Scope scope) {
        return outcome(
                route,
                request(route, "csrf=" + SECRET)
                        .header("Cookie", "treadwarm-form=" + SECRET)
                        .header("Authorization", "Bearer " + server.key(scope)));
    }

    private static HttpRequest.Builder request(ServedRoute route, String form) {
        boolean api = route.path().startsWith("/api/");
        String path = route.path().replaceAll("[{<][a-z]+[}>]", "nothing");
        boolean bare = List.of("GET", "HEAD").contains(route.method());
        return HttpRequest.newBuilder(URI.create(server.origin() + path))
                .timeout(Duration.ofSeconds(30))
                .header("Content-Type", api ? "application/json" : "application/x-www-form-urlencoded")
                .method(route.method(), bare ? BodyPublishers.noBody() : BodyPublishers.ofString(api ? "{}" : form));
    }

    private static String outcome(ServedRoute route, HttpRequest.Builder request) {
        try {
            HttpResponse<String> answer = CLIENT.send(request.build(), BodyHandlers.ofString());
            String to = answer.headers().firstValue("Location").orElse("");
            assertThat(answer.statusCode()).as(route.toString()).isLessThan(500);
            if (to.startsWith("/sign-in?back=")) {
                return "sign in";
            }
            return List.of(401, 403).contains(answer.statusCode()) ? "no" : "yes";
        } catch (IOException e) {
            throw new IllegalStateException(route.toString(), e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }
}
