package org.treadwarm.web.pages;

import java.util.List;
import org.treadwarm.units.Numbers;

/**
 * One field of a form.
 *
 * @param pointer the address of what it holds, and its name
 * @param id its id in the page
 * @param kind quantity, text, choice or long
 * @param label its label, without the unit
 * @param unit the unit shown beside it and added to a bare number; empty for none
 * @param value the text in it, as typed
 * @param help a sentence of help; empty for none
 * @param range what is possible, in words; empty for none
 * @param fallback what stands when it is left empty; empty for none
 * @param error what is wrong with it; empty for nothing
 * @param basis how the reading was come by; empty when not said
 * @param assume what "not known" puts in; empty when there is no such way
 * @param assumeWhy why that
 * @param choices what can be chosen
 * @param suggestions id of a list of suggestions; empty for none
 */
public record FieldView(
        String pointer,
        String id,
        String kind,
        String label,
        String unit,
        String value,
        String help,
        String range,
        String fallback,
        String error,
        String basis,
        String assume,
        String assumeWhy,
        List<Choice> choices,
        String suggestions) {
    /** One thing to choose: the word in the document, and its words on the page. */
    public record Choice(String value, String label, boolean chosen) {}

    /** The unit as print has it. */
    public String printedUnit() {
        return Numbers.printed(unit);
    }

    /** The ids of what describes the field to a screen reader. */
    public String describedBy() {
        StringBuilder ids = new StringBuilder(id).append("-help");
        if (!error.isEmpty()) {
            ids.append(' ').append(id).append("-error");
        }
        return ids.toString();
    }
}
