package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** One SVG element: name, attributes, children and text. It escapes everything it is given. */
final class Svg {
    private final String name;
    private final Map<String, String> attributes = new LinkedHashMap<>();
    private final List<Svg> children = new ArrayList<>();
    private final String text;

    private Svg(String name, String text) {
        this.name = name;
        this.text = text;
    }

    static Svg element(String name) {
        return new Svg(name, "");
    }

    static Svg text(String name, String text) {
        return new Svg(name, text);
    }

    Svg with(String attribute, String value) {
        attributes.put(attribute, value);
        return this;
    }

    /** @throws IllegalArgumentException if the value is not finite or too large to draw */
    Svg with(String attribute, double value) {
        return with(attribute, Figures.coordinate(value));
    }

    Svg add(Svg child) {
        children.add(child);
        return this;
    }

    boolean isEmpty() {
        return children.isEmpty();
    }

    String write() {
        StringBuilder out = new StringBuilder();
        writeTo(out, "");
        return out.toString();
    }

    private void writeTo(StringBuilder out, String indent) {
        out.append(indent).append('<').append(name);
        attributes.forEach((key, value) ->
                out.append(' ').append(key).append("=\"").append(escape(value)).append('"'));
        if (children.isEmpty()) {
            out.append(text.isEmpty() ? "/>" : ">" + escape(text) + "</" + name + ">")
                    .append('\n');
            return;
        }
        out.append(">\n");
        children.forEach(child -> child.writeTo(out, indent + " "));
        out.append(indent).append("</").append(name).append(">\n");
    }

    static String escape(String raw) {
        int plain = 0;
        while (plain < raw.length() && isPlain(raw.charAt(plain))) {
            plain++;
        }
        if (plain == raw.length()) {
            return raw;
        }
        StringBuilder out = new StringBuilder();
        raw.codePoints().forEach(point -> {
            switch (point) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                case '\'' -> out.append("&#39;");
                default -> out.appendCodePoint(allowed(point) ? point : 0xFFFD);
            }
        });
        return out.toString();
    }

    private static boolean isPlain(char character) {
        return character >= 0x20
                && character < 0xD800
                && character != '&'
                && character != '<'
                && character != '>'
                && character != '"'
                && character != '\'';
    }

    /** XML 1.0 forbids most control characters and lone surrogates even when escaped. */
    private static boolean allowed(int point) {
        boolean control = point < 0x20 && point != '\t' && point != '\n' && point != '\r';
        boolean surrogate = point >= 0xD800 && point <= 0xDFFF;
        return !control && !surrogate && point != 0xFFFE && point != 0xFFFF;
    }
}
