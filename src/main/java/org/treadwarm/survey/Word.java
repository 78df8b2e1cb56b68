package org.treadwarm.survey;

/** A choice that the document writes as a word. */
public interface Word {
    /** The word in the document. */
    String word();

    /** The words on a page. */
    default String label() {
        return word();
    }
}
