package org.treadwarm.sizing;

/** How well solved sections are remembered, since the program started. */
public final class SectionCache {
    private SectionCache() {}

    /**
     * At one time.
     *
     * @param kept sections remembered now
     * @param remembered how often one was found
     * @param solved how often one had to be solved
     */
    public record Reading(int kept, long remembered, long solved) {}

    /** How it is now. */
    public static Reading read() {
        return Sections.reading();
    }
}
