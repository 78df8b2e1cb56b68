package org.treadwarm.physics.section;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.physics.section.Workers.Stretch;

/**
 * An approximate inverse of a lattice's balances: one symmetric cycle through grids that each keep every second column of the
 * finer one, down to a single column.
 *
 * <p>Whole columns are solved at once and only the columns are thinned out, so that the cycle is as good on cells that are far
 * longer than wide, or wider than long, and beside jumps of conductivity. Sources of the idea: J. E. Dendy, S. F. McCormick, J. W.
 * Ruge, T. F. Russell, S. Schaffer, "Multigrid methods for three-dimensional petroleum reservoir simulation", 1989 (semicoarsening
 * with line relaxation); S. F. Ashby, R. D. Falgout, "A parallel multigrid preconditioned conjugate gradient algorithm for
 * groundwater flow simulations", 1996 (coarse balances of the same shape); both from memory.
 */
final class Multigrid {
    private final List<Level> levels = new ArrayList<>();
    private final List<Steps> steps = new ArrayList<>();

    Multigrid(Lattice lattice) {
        Level level = Level.of(lattice);
        levels.add(level);
        while (level.columns > 1) {
            Level coarse = level.coarser();
            levels.add(coarse);
            steps.add(Steps.between(level, coarse));
            level = coarse;
        }
    }

    Level finest() {
        return levels.get(0);
    }

    /** From the finest level's load to its answer. */
    void cycle() {
        for (int depth = 0; depth < steps.size(); depth++) {
            down(levels.get(depth), steps.get(depth));
        }
        Level single = levels.get(levels.size() - 1);
        single.startEvens(0, 1);
        for (int depth = steps.size() - 1; depth >= 0; depth--) {
            up(levels.get(depth), steps.get(depth));
        }
    }

    private static void down(Level level, Steps steps) {
        Workers.run(level.evens, level.cells(), steps.startEvens);
        Workers.run(level.odds, level.cells(), steps.relaxOdds);
        Workers.run(level.rows, level.cells(), steps.restrict);
    }

    private static void up(Level level, Steps steps) {
        Workers.run(level.rows, level.cells(), steps.correct);
        Workers.run(level.odds, level.cells(), steps.relaxOdds);
        Workers.run(level.evens, level.cells(), steps.relaxEvens);
    }

    /** The works of one level, made once so that a cycle makes no garbage. */
    private record Steps(Stretch startEvens, Stretch relaxOdds, Stretch relaxEvens, Stretch restrict, Stretch correct) {
        static Steps between(Level level, Level coarse) {
            return new Steps(
                    level::startEvens,
                    level::relaxOdds,
                    level::relaxEvens,
                    (from, to) -> level.restrict(coarse, from, to),
                    (from, to) -> level.correct(coarse, from, to));
        }
    }
}
