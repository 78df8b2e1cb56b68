package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.treadwarm.web.pages.ContractTypes.Term;

/** What the routes of the API answer; what most of them answer in the same words is told once. */
final class ContractAnswers {
    private final List<JsonNode> calls;
    private final ContractTypes types;
    private final Map<String, Integer> counts = new HashMap<>();

    ContractAnswers(List<JsonNode> calls, ContractTypes types) {
        this.calls = List.copyOf(calls);
        this.types = types;
        calls.stream().flatMap(ContractAnswers::all).forEach(each -> counts.merge(key(each), 1, Integer::sum));
    }

    /** What a route answers with one status. */
    public record Answer(String status, String words, String media, List<Term> type, String headers) {}

    /** What most routes answer. */
    List<Answer> usual() {
        Map<String, Answer> found = new TreeMap<>();
        calls.stream()
                .flatMap(ContractAnswers::all)
                .filter(this::isUsual)
                .forEach(each -> found.putIfAbsent(each.getKey(), answer(each)));
        return List.copyOf(found.values());
    }

    /** What a route answers otherwise than most. */
    List<Answer> own(JsonNode call) {
        return all(call).filter(Predicate.not(this::isUsual)).map(this::answer).toList();
    }

    /** The statuses that a route answers as most do, in words. */
    String usualOf(JsonNode call) {
        return all(call).filter(this::isUsual).map(Map.Entry::getKey).collect(Collectors.joining(", "));
    }

    private static Stream<Map.Entry<String, JsonNode>> all(JsonNode call) {
        return call.path("responses").properties().stream().sorted(Map.Entry.comparingByKey());
    }

    private boolean isUsual(Map.Entry<String, JsonNode> response) {
        return counts.get(key(response)) * 2 > calls.size();
    }

    private static String key(Map.Entry<String, JsonNode> response) {
        return response.getKey() + " " + response.getValue().path("description").asText();
    }

    private Answer answer(Map.Entry<String, JsonNode> response) {
        List<Map.Entry<String, JsonNode>> contents =
                List.copyOf(response.getValue().path("content").properties());
        String headers = response.getValue().path("headers").properties().stream()
                .map(Map.Entry::getKey)
                .collect(Collectors.joining(", "));
        return new Answer(
                response.getKey(),
                response.getValue().path("description").asText(),
                contents.isEmpty() ? "" : contents.get(0).getKey(),
                contents.isEmpty()
                        ? List.of()
                        : types.type(contents.get(0).getValue().path("schema")),
                headers);
    }
}
