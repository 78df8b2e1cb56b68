package org.treadwarm.survey;

/** How much of a breaker's rating a heater that runs for hours may draw; the local code decides. Common practice, no source. */
public enum CircuitRule implements Word {
    FULL("full", "the whole rating", 1),
    EIGHTY_PERCENT("80 percent", "80 % of the rating, as US practice has it for continuous loads", 0.8);

    private final String word;
    private final String label;
    private final double share;

    CircuitRule(String word, String label, double share) {
        this.word = word;
        this.label = label;
        this.share = share;
    }

    @Override
    public String word() {
        return word;
    }

    @Override
    public String label() {
        return label;
    }

    /** The share of the rating that may be drawn. */
    public double share() {
        return share;
    }
}
