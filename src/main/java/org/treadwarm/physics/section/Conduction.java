package org.treadwarm.physics.section;

import java.util.Arrays;
import java.util.function.BooleanSupplier;
import org.treadwarm.physics.section.Condition.BasicCharacteristic;

/** Steady conduction through a section on one grid. */
public final class Conduction {
    /** Most cells of a grid; a bound on memory and time of any one request. */
    public static final int MOST_CELLS = 1_200_000;

    /** Relative change of the films at which the basic characteristic counts as met. */
    private static final double FILM_TOLERANCE = 1e-9;

    private static final int MOST_FILM_STEPS = 60;

    private Conduction() {}

    /**
     * The temperatures at which every cell's balance holds.
     *
     * @param section what to compute
     * @param grid its cells; must have lines where materials change
     * @param tolerance largest relative residual, e.g. 1e-10
     * @param stopped asked at every step of the solver whether to give up
     * @throws IllegalArgumentException when the grid has too many cells or does not fit the section
     * @throws IllegalStateException when the solver does not converge
     * @throws java.util.concurrent.CancellationException when asked to give up
     */
    public static Field solve(Section section, Grid grid, double tolerance, BooleanSupplier stopped) {
        Require.that(
                grid.cells() <= MOST_CELLS, "a grid may have at most " + MOST_CELLS + " cells, not " + grid.cells());
        double[] guess = new double[(int) grid.cells()];
        Arrays.fill(guess, section.known()[0]);
        return solve(new Balances(section, grid), guess, tolerance, stopped);
    }

    /** The same from a first guess, which is overwritten. */
    static Field solve(Balances balances, double[] guess, double tolerance, BooleanSupplier stopped) {
        Section section = balances.section;
        double[] known = section.known();
        boolean linear = section.edges().stream().noneMatch(edge -> edge.condition() instanceof BasicCharacteristic);
        int iterations = 0;
        for (int step = 0; step < MOST_FILM_STEPS; step++) {
            ConjugateGradients solver = new ConjugateGradients(balances.lattice);
            Convergence last = solveDifferences(balances, solver, known, 1, guess, tolerance, stopped);
            iterations += last.iterations();
            if (linear || adaptFilms(balances, known, guess) <= FILM_TOLERANCE) {
                return new Field(balances, known, 1, guess, new Convergence(last.residual(), iterations));
            }
            balances.filmsChanged();
        }
        throw new IllegalStateException("the films of the basic characteristic did not settle");
    }

    /** Solves once, with the films as they are, for known temperatures and so many times the cables' heat. */
    static Field linear(
            Balances balances,
            ConjugateGradients solver,
            double[] known,
            double heatFactor,
            double[] guess,
            double tolerance,
            BooleanSupplier stopped) {
        Convergence convergence = solveDifferences(balances, solver, known, heatFactor, guess, tolerance, stopped);
        return new Field(balances, known, heatFactor, guess, convergence);
    }

    /** Temperatures are solved as differences from one of the known ones, so that what is left over is measured by real heat. */
    private static Convergence solveDifferences(
            Balances balances,
            ConjugateGradients solver,
            double[] known,
            double heatFactor,
            double[] guess,
            double tolerance,
            BooleanSupplier stopped) {
        double reference = known[0];
        double[] differences = new double[known.length];
        for (int i = 0; i < known.length; i++) {
            differences[i] = known[i] - reference;
        }
        for (int cell = 0; cell < guess.length; cell++) {
            guess[cell] = balances.materials.isSolid(cell) ? guess[cell] - reference : 0;
        }
        Convergence convergence = solver.solve(balances.load(differences, heatFactor), guess, tolerance, stopped);
        for (int cell = 0; cell < guess.length; cell++) {
            guess[cell] += reference;
        }
        return convergence;
    }

    /** Sets the films that go by the basic characteristic; the largest relative change. */
    private static double adaptFilms(Balances balances, double[] known, double[] temperature) {
        double largest = 0;
        KnownLinks links = balances.links;
        for (int link = 0; link < links.count(); link++) {
            int edge = links.known(link);
            if (edge < balances.section.edges().size()
                    && balances.section.edges().get(edge).condition() instanceof BasicCharacteristic) {
                double over = links.flux(link, temperature, known) * links.film(link);
                if (!(over > 0)) {
                    throw new IllegalArgumentException(
                            "the basic characteristic holds for a floor warmer than its room; here it is colder");
                }
                double film = 1 / BasicCharacteristic.coefficient(over);
                largest = Math.max(largest, Math.abs(film / links.film(link) - 1));
                links.setFilm(link, film);
            }
        }
        return largest;
    }
}
