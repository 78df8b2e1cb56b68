package org.treadwarm.web.pages;

import java.util.List;

/**
 * One object of a form: its fields, then what lies within it.
 *
 * @param pointer its address
 * @param id its id in the page
 * @param key what it is, such as surfaces or heatedFloor
 * @param title its heading
 * @param facts what it is in a few words, for when it is folded
 * @param fields its fields
 * @param more fields that are seldom needed
 * @param moreOpen whether any of those holds something
 * @param parts objects and lists within it, in order
 * @param removable whether it can be taken out
 * @param error what is wrong with it as a whole; empty for nothing
 * @param open whether to unfold it at once: something in it is wrong, or it is new
 */
public record ObjectView(
        String pointer,
        String id,
        String key,
        String title,
        String facts,
        List<FieldView> fields,
        List<FieldView> more,
        boolean moreOpen,
        List<PartView> parts,
        boolean removable,
        String error,
        boolean open) {
    /**
     * A part of an object: one object, a list of them, or the offer to add one.
     *
     * @param pointer its address
     * @param id its id in the page
     * @param key what it is
     * @param title its heading
     * @param items the objects; one for a single object
     * @param list whether there can be many
     * @param add the words of the button that adds one; empty when none can be added
     * @param help a sentence of help; empty for none
     * @param error what is wrong with it as a whole; empty for nothing
     */
    public record PartView(
            String pointer,
            String id,
            String key,
            String title,
            List<ObjectView> items,
            boolean list,
            String add,
            String help,
            String error) {}
}
