package org.treadwarm.sizing;

/** Steps of surface films: the table's, or one over a coefficient that the survey gives. */
final class FilmSteps {
    private final Addresses addresses;
    private final Steps steps;

    FilmSteps(Addresses addresses, Steps steps) {
        this.addresses = addresses;
        this.steps = steps;
    }

    /**
     * One film.
     *
     * @param coefficient input of the coefficient that replaces the table's film, else {@link Stack#NONE}
     */
    void film(String at, int coefficient, String table) {
        if (coefficient == Stack.NONE) {
            steps.add(at, "film-of-the-table", "R_s", Symbol.of("R_table", table));
        } else {
            steps.add(at, "film-of-a-coefficient", "R_s", Symbol.of("h", addresses.input(coefficient)));
        }
    }
}
