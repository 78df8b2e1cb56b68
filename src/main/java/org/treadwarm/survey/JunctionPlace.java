package org.treadwarm.survey;

/** Which temperature a junction sees on its warm side. */
public enum JunctionPlace implements Word {
    ROOM("room"),
    HEATED_FLOOR("heated floor");

    private final String word;

    JunctionPlace(String word) {
        this.word = word;
    }

    @Override
    public String word() {
        return word;
    }
}
