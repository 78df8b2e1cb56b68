package org.treadwarm.web;

import java.io.StringReader;
import java.net.http.HttpResponse;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javax.xml.transform.TransformerException;
import javax.xml.transform.TransformerFactory;
import javax.xml.transform.dom.DOMResult;
import javax.xml.transform.sax.SAXSource;
import org.ccil.cowan.tagsoup.Parser;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;
import org.xml.sax.SAXException;

/** An answer as a browser without script sees it. */
record Page(HttpResponse<String> response, Document document) {
    static Page of(HttpResponse<String> response) {
        try {
            Parser parser = new Parser();
            parser.setFeature(Parser.namespacesFeature, false);
            DOMResult tree = new DOMResult();
            TransformerFactory.newInstance()
                    .newTransformer()
                    .transform(new SAXSource(parser, new InputSource(new StringReader(response.body()))), tree);
            return new Page(response, (Document) tree.getNode());
        } catch (SAXException | TransformerException e) {
            throw new IllegalStateException("the page cannot be parsed", e);
        }
    }

    int status() {
        return response.statusCode();
    }

    String text() {
        return response.body();
    }

    /** Where it leads, or empty. */
    String location() {
        return response.headers().firstValue("Location").orElse("");
    }

    /** All elements of a name, in order. */
    Stream<Element> all(String name) {
        List<Element> found = new ArrayList<>();
        // One list for all: a new one would walk through the page for each of them.
        NodeList list = document.getElementsByTagName(name);
        for (int i = 0; i < list.getLength(); i++) {
            found.add((Element) list.item(i));
        }
        return found.stream();
    }

    /** The element with this id. */
    Optional<Element> id(String id) {
        return all("*").filter(element -> element.getAttribute("id").equals(id)).findFirst();
    }

    /** The control with this name. */
    Element field(String name) {
        return all("*").filter(element -> element.getAttribute("name").equals(name))
                .findFirst()
                .orElseThrow(() -> new AssertionError("the page has no field " + name));
    }

    /** Whether the page has a control with this name. */
    boolean has(String name) {
        return all("*").anyMatch(element -> element.getAttribute("name").equals(name));
    }

    /** Whether the page has a button that does this. */
    boolean offers(String action) {
        return all("button").anyMatch(button -> button.getAttribute("value").equals(action));
    }

    /** The form that has a field of this name, as it would be sent. */
    Form form(String withField) {
        Node form = field(withField);
        while (!form.getNodeName().equals("form")) {
            form = form.getParentNode();
        }
        return Form.of((Element) form, response.uri().getPath());
    }

    /** What a control holds. */
    String value(String name) {
        return form(name).value(name);
    }
}
