package org.treadwarm.web;

import java.io.ByteArrayOutputStream;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Collectors;
import org.w3c.dom.Element;
import org.w3c.dom.Node;

/** A form as a browser without script would send it. */
final class Form {
    private String action;
    private final Map<String, String> fields = new LinkedHashMap<>();

    private Form(String action) {
        this.action = action;
    }

    static Form of(Element element, String page) {
        Form form = new Form(element.hasAttribute("action") ? element.getAttribute("action") : page);
        form.collect(element);
        return form;
    }

    private void collect(Node node) {
        if (node instanceof Element element && !element.getAttribute("name").isEmpty()) {
            switch (element.getTagName()) {
                case "input" -> {
                    if (!element.getAttribute("type").equals("radio") || element.hasAttribute("checked")) {
                        fields.put(element.getAttribute("name"), element.getAttribute("value"));
                    }
                }
                case "textarea" -> fields.put(element.getAttribute("name"), element.getTextContent());
                case "select" -> fields.put(element.getAttribute("name"), chosen(element));
                default -> {}
            }
        }
        for (Node child = node.getFirstChild(); child != null; child = child.getNextSibling()) {
            collect(child);
        }
    }

    /** A list without a choice shows, and sends, its first option. */
    private static String chosen(Element select) {
        Element first = null;
        for (int i = 0; i < select.getElementsByTagName("option").getLength(); i++) {
            Element option = (Element) select.getElementsByTagName("option").item(i);
            if (option.hasAttribute("selected")) {
                return option.getAttribute("value");
            }
            first = first == null ? option : first;
        }
        return first == null ? "" : first.getAttribute("value");
    }

    String action() {
        return action;
    }

    String value(String name) {
        return fields.get(name);
    }

    Map<String, String> fields() {
        return fields;
    }

    /** Types into a field that the form has. */
    Form type(String name, String text) {
        if (!fields.containsKey(name)) {
            throw new AssertionError("the form has no field " + name + ": " + fields.keySet());
        }
        fields.put(name, text);
        return this;
    }

    /** Sends what no browser would: a field that the form has not, or has no more. */
    Form forge(String name, String text) {
        fields.put(name, text);
        return this;
    }

    /** Leaves a field out. */
    Form without(String name) {
        fields.remove(name);
        return this;
    }

    /** Presses the button that does this. */
    Form press(String action) {
        fields.put("do", action);
        return this;
    }

    /** Goes to another address than the page says. */
    Form to(String address) {
        action = address;
        return this;
    }

    /** The body it sends as a form that brings a file. */
    byte[] withFile(String boundary, String field, String name, byte[] file) {
        ByteArrayOutputStream body = new ByteArrayOutputStream();
        fields.forEach((key, value) -> {
            if (!key.equals(field)) {
                body.writeBytes(head(boundary, key, "").getBytes(StandardCharsets.UTF_8));
                body.writeBytes(value.getBytes(StandardCharsets.UTF_8));
            }
        });
        body.writeBytes(head(boundary, field, "; filename=\"" + name + "\"").getBytes(StandardCharsets.UTF_8));
        body.writeBytes(file);
        body.writeBytes(("\r\n--" + boundary + "--\r\n").getBytes(StandardCharsets.UTF_8));
        return body.toByteArray();
    }

    private static String head(String boundary, String field, String more) {
        return "\r\n--" + boundary + "\r\nContent-Disposition: form-data; name=\"" + field + "\"" + more + "\r\n\r\n";
    }

    /** The body it sends. */
    String encoded() {
        return fields.entrySet().stream()
                .map(field -> encode(field.getKey()) + "=" + encode(field.getValue()))
                .collect(Collectors.joining("&"));
    }

    private static String encode(String text) {
        return URLEncoder.encode(text, StandardCharsets.UTF_8);
    }
}
