package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import javax.xml.parsers.DocumentBuilderFactory;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

/** Reads a drawing back as XML and holds it against what every drawing owes its reader. */
final class DrawingCheck {
    /** The lettering of one text element and the box it is reckoned to take up. */
    record Lettered(String text, Rectangle2D box) {}

    private final Document document;
    private final String svg;

    private DrawingCheck(String svg) {
        this.svg = svg;
        this.document = parse(svg);
    }

    static DrawingCheck read(String svg) {
        return new DrawingCheck(svg);
    }

    /** Well formed, finite, described, free of styles and scripts, and nothing written over anything. */
    DrawingCheck holds() {
        assertThat(svg).doesNotContain("NaN", "Infinity", "style=", "<style", "<script", "null", "Optional");
        Element root = document.getDocumentElement();
        assertThat(root.getAttribute("role")).isEqualTo("img");
        assertThat(root.getAttribute("width")).isEqualTo("100%");
        assertThat(document.getElementsByTagName("title").item(0).getTextContent())
                .isNotBlank();
        assertThat(document.getElementsByTagName("desc").item(0).getTextContent())
                .isNotBlank();
        assertThat(outside()).isEmpty();
        assertThat(overlapping()).isEmpty();
        assertThat(crossed()).isEmpty();
        return this;
    }

    String words() {
        return String.join("\n", letters().stream().map(Lettered::text).toList())
                .replace('\u00a0', ' ');
    }

    /** The boxes of the rectangles that are outlined, in the order they are drawn. */
    List<Box> outlined() {
        return elements("rect").stream()
                .filter(rect -> rect.hasAttribute("stroke-width"))
                .map(rect ->
                        new Box(number(rect, "x"), number(rect, "y"), number(rect, "width"), number(rect, "height")))
                .toList();
    }

    private List<String> outside() {
        String[] view = document.getDocumentElement().getAttribute("viewBox").split(" ");
        Rectangle2D sheet = new Rectangle2D.Double(0, 0, Double.parseDouble(view[2]), Double.parseDouble(view[3]));
        return letters().stream()
                .filter(letter -> !sheet.contains(letter.box()))
                .map(letter -> letter + " is outside the sheet")
                .toList();
    }

    List<String> overlapping() {
        List<String> faults = new ArrayList<>();
        List<Lettered> letters = letters();
        for (int i = 0; i < letters.size(); i++) {
            for (int j = i + 1; j < letters.size(); j++) {
                if (letters.get(i).box().intersects(letters.get(j).box())) {
                    faults.add(letters.get(i) + " is over " + letters.get(j));
                }
            }
        }
        return faults;
    }

    List<String> crossed() {
        List<String> faults = new ArrayList<>();
        List<Line2D> lines = lines();
        for (Lettered letter : letters()) {
            lines.stream()
                    .filter(line -> line.intersects(letter.box()))
                    .forEach(line -> faults.add(letter + " is crossed by " + line.getP1() + line.getP2()));
        }
        return faults;
    }

    List<Lettered> letters() {
        return elements("text").stream().map(DrawingCheck::lettered).toList();
    }

    private static Lettered lettered(Element text) {
        double width = Lettering.width(text.getTextContent(), text.hasAttribute("font-weight"));
        double shift = switch (text.getAttribute("text-anchor")) {
            case "middle" -> width / 2;
            case "end" -> width;
            default -> 0;
        };
        double top = number(text, "y") - 0.78 * TextStyle.SIZE;
        Rectangle2D box = new Rectangle2D.Double(number(text, "x") - shift, top, width, TextStyle.SIZE);
        return new Lettered(text.getTextContent(), box);
    }

    private List<Line2D> lines() {
        List<Line2D> lines = new ArrayList<>();
        elements("line")
                .forEach(line -> lines.add(new Line2D.Double(
                        number(line, "x1"), number(line, "y1"), number(line, "x2"), number(line, "y2"))));
        elements("polyline").forEach(line -> joined(line.getAttribute("points").split("[ ,]"), lines));
        elements("path").forEach(line -> joined(line.getAttribute("d").split("[ ,MC]+", 0), lines));
        for (Box box : outlined()) {
            lines.add(new Line2D.Double(box.x(), box.y(), box.right(), box.y()));
            lines.add(new Line2D.Double(box.x(), box.bottom(), box.right(), box.bottom()));
            lines.add(new Line2D.Double(box.x(), box.y(), box.x(), box.bottom()));
            lines.add(new Line2D.Double(box.right(), box.y(), box.right(), box.bottom()));
        }
        return lines;
    }

    /** For a curve these are the lines between its control points, which hold it. */
    private static void joined(String[] numbers, List<Line2D> lines) {
        List<Double> places = new ArrayList<>();
        for (String number : numbers) {
            if (!number.isEmpty()) {
                places.add(Double.parseDouble(number));
            }
        }
        for (int i = 0; i + 3 < places.size(); i += 2) {
            lines.add(new Line2D.Double(places.get(i), places.get(i + 1), places.get(i + 2), places.get(i + 3)));
        }
    }

    /** The elements outside the hatching. */
    private List<Element> elements(String name) {
        List<Element> found = new ArrayList<>();
        NodeList all = document.getElementsByTagName(name);
        for (int i = 0; i < all.getLength(); i++) {
            Element element = (Element) all.item(i);
            if (!element.getParentNode().getNodeName().equals("pattern")) {
                found.add(element);
            }
        }
        return found;
    }

    private static double number(Element element, String attribute) {
        return element.hasAttribute(attribute) ? Double.parseDouble(element.getAttribute(attribute)) : 0;
    }

    private static Document parse(String svg) {
        try {
            return DocumentBuilderFactory.newInstance()
                    .newDocumentBuilder()
                    .parse(new InputSource(new StringReader(svg)));
        } catch (Exception broken) {
            throw new AssertionError("Not well formed: " + svg, broken);
        }
    }
}
