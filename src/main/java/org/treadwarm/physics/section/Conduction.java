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
            Solved last = solveDifferences(balances, solver, known, 1, guess, tolerance, stopped);
            iterations += last.convergence().iterations();
            if (linear || filmChange(balances, known, guess) <= FILM_TOLERANCE) {
                // With the films that were solved with: with others the heat given off would not be the heat put in.
                Convergence all = new Convergence(last.convergence().residual(), iterations);
                return new Field(balances, known, 1, guess, last.heat(), all);
            }
            adaptFilms(balances, known, guess);
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
        Solved solved = solveDifferences(balances, solver, known, heatFactor, guess, tolerance, stopped);
        return new Field(balances, known, heatFactor, guess, solved.heat(), solved.convergence());
    }

    /** How the solver ended, and the heat into each known temperature, W/m. */
    private record Solved(Convergence convergence, double[] heat) {}

    /**
     * Temperatures are solved as differences from that known one which holds its cells the most. So the right-hand side, by which the
     * residual is measured, is of the size of the heat, and a pipe of copper, whose cells are as warm as its water but for
     * millionths of a kelvin, gives its heat to the last digits.
     */
    private static Solved solveDifferences(
            Balances balances,
            ConjugateGradients solver,
            double[] known,
            double heatFactor,
            double[] guess,
            double tolerance,
            BooleanSupplier stopped) {
        double reference = known[balances.links.stiffest()];
        double[] differences = new double[known.length];
        for (int i = 0; i < known.length; i++) {
            differences[i] = known[i] - reference;
        }
        for (int cell = 0; cell < guess.length; cell++) {
            guess[cell] = balances.materials.isSolid(cell) ? guess[cell] - reference : 0;
        }
        Convergence convergence = solver.solve(balances.load(differences, heatFactor), guess, tolerance, stopped);
        double[] heat = close(balances, differences, heatFactor, guess);
        for (int cell = 0; cell < guess.length; cell++) {
            guess[cell] += reference;
        }
        return new Solved(convergence, heat);
    }

    /**
     * Shifts all temperatures by the constant that closes the balance of the whole section: the one part of what the solver leaves
     * over that does not cancel between cells. Less than a millionth of a kelvin.
     *
     * @return heat into each known temperature, W/m
     */
    private static double[] close(Balances balances, double[] known, double heatFactor, double[] temperature) {
        double left = heatFactor * Arrays.stream(balances.heat).sum()
                - Arrays.stream(balances.links.heat(temperature, known)).sum();
        double shift = left / balances.links.conductance();
        for (int cell = 0; cell < temperature.length; cell++) {
            temperature[cell] += shift;
        }
        return balances.links.heat(temperature, known);
    }

    /** The largest relative change that the films of the basic characteristic would make at these temperatures. */
    private static double filmChange(Balances balances, double[] known, double[] temperature) {
        double largest = 0;
        for (int link = 0; link < balances.links.count(); link++) {
            if (isCharacteristic(balances, link)) {
                double film = film(balances, link, known, temperature);
                largest = Math.max(largest, Math.abs(film / balances.links.film(link) - 1));
            }
        }
        return largest;
    }

    /** Sets the films that go by the basic characteristic. */
    private static void adaptFilms(Balances balances, double[] known, double[] temperature) {
        for (int link = 0; link < balances.links.count(); link++) {
            if (isCharacteristic(balances, link)) {
                balances.links.setFilm(link, film(balances, link, known, temperature));
            }
        }
        balances.filmsChanged();
    }

    private static boolean isCharacteristic(Balances balances, int link) {
        int edge = balances.links.known(link);
        return edge < balances.section.edges().size()
                && balances.section.edges().get(edge).condition() instanceof BasicCharacteristic;
    }

    private static double film(Balances balances, int link, double[] known, double[] temperature) {
        double over = balances.links.flux(link, temperature, known) * balances.links.film(link);
        if (!(over > 0)) {
            throw new IllegalArgumentException(
                    "the basic characteristic holds for a floor warmer than its room; here it is colder");
        }
        return 1 / BasicCharacteristic.coefficient(over);
    }
}
