package org.treadwarm.store;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * The list of pieces of one revision, as text: a line "role id sha256" for each piece, on pages of 64 lines, and a root
 * with the SHA-256 of each page on a line.
 *
 * <p>Pages and roots are kept under their own SHA-256, like the pieces, so revisions share them. Saving one room of a
 * thousand then writes that room, one page of about 5 kB and a root of about 1 kB, not a list of a thousand rows. And
 * two revisions have the same pieces exactly if they have the same root.
 */
final class Manifest {
    private static final int LINES_ON_A_PAGE = 64;

    private final String root;
    private final Map<String, String> bodies;
    private final Map<String, String> pieces;

    private Manifest(String root, Map<String, String> bodies, Map<String, String> pieces) {
        this.root = root;
        this.bodies = bodies;
        this.pieces = pieces;
    }

    static Manifest of(List<Piece> pieces) {
        Map<String, String> texts = new LinkedHashMap<>();
        Map<String, String> bodies = new LinkedHashMap<>();
        List<String> pages = new ArrayList<>();
        for (int start = 0; start < pieces.size(); start += LINES_ON_A_PAGE) {
            List<Piece> onPage = pieces.subList(start, Math.min(start + LINES_ON_A_PAGE, pieces.size()));
            String page = onPage.stream().map(piece -> line(piece, texts)).collect(Collectors.joining("\n"));
            pages.add(keep(page, bodies));
        }
        return new Manifest(keep(String.join("\n", pages), bodies), bodies, texts);
    }

    private static String line(Piece piece, Map<String, String> texts) {
        return piece.role() + " " + piece.id() + " " + keep(piece.text(), texts);
    }

    private static String keep(String body, Map<String, String> bodies) {
        String sha256 = Secrets.sha256(body);
        bodies.put(sha256, body);
        return sha256;
    }

    /** SHA-256 of the root: the identity of the whole list and of every text in it. */
    String root() {
        return root;
    }

    /** Root and pages by SHA-256. */
    Map<String, String> bodies() {
        return bodies;
    }

    /** Texts of the pieces by SHA-256. */
    Map<String, String> pieces() {
        return pieces;
    }

    /** One line of a page. */
    record Line(String role, String id, String sha256) {
        private static Line parse(String line) {
            String[] parts = line.split(" ", -1);
            return new Line(parts[0], parts[1], parts[2]);
        }
    }

    static List<String> pagesOf(String root) {
        return root.lines().toList();
    }

    static List<Line> linesOf(String page) {
        return page.lines().map(Line::parse).toList();
    }
}
