package org.treadwarm.store;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.PreparedBatch;

/** The tables of texts kept under their SHA-256. Rows are added and never changed. */
final class Contents {
    private Contents() {}

    static void add(Handle handle, Manifest manifest) {
        insert(handle, "piece", manifest.pieces());
        insert(handle, "manifest", manifest.bodies());
    }

    private static void insert(Handle handle, String table, Map<String, String> bodies) {
        if (bodies.isEmpty()) {
            return;
        }
        try (PreparedBatch batch = handle.prepareBatch(
                "insert into " + table + " (sha256, body) values (:sha256, :body) on conflict do nothing")) {
            bodies.forEach((sha256, body) ->
                    batch.bind("sha256", sha256).bind("body", body).add());
            batch.execute();
        }
    }

    static List<Piece> read(Handle handle, String root) {
        List<String> pageNames = Manifest.pagesOf(one(find(handle, "manifest", List.of(root)), root));
        Map<String, String> pages = find(handle, "manifest", pageNames);
        List<Piece> pieces = new ArrayList<>();
        for (String pageName : pageNames) {
            List<Manifest.Line> lines = Manifest.linesOf(one(pages, pageName));
            Map<String, String> texts = find(
                    handle, "piece", lines.stream().map(Manifest.Line::sha256).toList());
            lines.forEach(line -> pieces.add(new Piece(line.role(), line.id(), one(texts, line.sha256()))));
        }
        return pieces;
    }

    private static Map<String, String> find(Handle handle, String table, List<String> names) {
        Map<String, String> found = new HashMap<>();
        if (!names.isEmpty()) {
            handle.createQuery("select sha256, body from " + table + " where sha256 in (<names>)")
                    .bindList("names", names)
                    .map((row, context) -> Map.entry(row.getString("sha256"), row.getString("body")))
                    .forEach(entry -> found.put(entry.getKey(), entry.getValue()));
        }
        return found;
    }

    // SQLite keeps no checksums, so this is where a silently damaged disk shows.
    private static String one(Map<String, String> found, String sha256) {
        String body = found.get(sha256);
        if (body == null || !Secrets.sha256(body).equals(sha256)) {
            throw new StoreUnavailable("The data file is damaged: the text " + sha256
                    + (body == null ? " is missing" : " has changed") + ". Restore a backup.");
        }
        return body;
    }
}
