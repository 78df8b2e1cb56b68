package org.treadwarm.checks;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.StreamSupport;

/** The inputs of a case by their names; a missing one is a fault of the case file and throws IllegalStateException. */
public final class Inputs {
    private final JsonNode tree;

    Inputs(JsonNode tree) {
        this.tree = tree;
    }

    /** Whether there is an input of this name. */
    public boolean has(String name) {
        return tree.has(name);
    }

    /** The number of this name. */
    public double number(String name) {
        return number(name, tree.path(name));
    }

    /** The list of numbers of this name. */
    public DoubleStream numbers(String name) {
        return elements(name).stream().mapToDouble(element -> number(name, element));
    }

    /** The list of texts of this name. */
    public List<String> texts(String name) {
        return elements(name).stream().map(JsonNode::asText).toList();
    }

    /** The list of groups of inputs of this name. */
    public List<Inputs> groups(String name) {
        return elements(name).stream().map(Inputs::new).toList();
    }

    /** The group of inputs of this name. */
    public Inputs group(String name) {
        return new Inputs(tree.path(name));
    }

    /** The inputs themselves, where a group is a plain list of numbers. */
    double at(int index) {
        return number("item " + index, tree.path(index));
    }

    private List<JsonNode> elements(String name) {
        if (!tree.path(name).isArray()) {
            throw new IllegalStateException("no list " + name + " in " + tree);
        }
        return StreamSupport.stream(tree.path(name).spliterator(), false).toList();
    }

    private double number(String name, JsonNode node) {
        if (!node.isNumber()) {
            throw new IllegalStateException("no number " + name + " in " + tree);
        }
        return node.doubleValue();
    }
}
