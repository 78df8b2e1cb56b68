package org.treadwarm.physics.section;

/** The temperatures of a section and the heat it gives to each known temperature. Immutable. */
public final class Field {
    private final Balances balances;
    private final double[] known;
    private final double heatFactor;
    private final double[] temperature;
    private final double[] heat;
    private final Convergence convergence;

    Field(
            Balances balances,
            double[] known,
            double heatFactor,
            double[] temperature,
            double[] heat,
            Convergence convergence) {
        this.balances = balances;
        this.known = known;
        this.heatFactor = heatFactor;
        this.temperature = temperature;
        this.heat = heat;
        this.convergence = convergence;
        fillKnown();
    }

    /** Cells inside pipes and air show those temperatures. */
    private void fillKnown() {
        for (int cell = 0; cell < temperature.length; cell++) {
            if (balances.materials.knownIn(cell) >= 0) {
                temperature[cell] = known[balances.materials.knownIn(cell)];
            }
        }
    }

    /** Heat into what an edge of the section gives its heat to, W/m; by the edge's place in the list. */
    public double heatToEdge(int edge) {
        return heat[edge];
    }

    /** Heat into a rectangle of air, W/m; by its place in the list. */
    public double heatToAir(int air) {
        return heat[balances.section.edges().size() + air];
    }

    /** Heat that a pipe gives, W/m, of the part that lies in the section; by its place in the list. */
    public double heatOfPipe(int pipe) {
        return -heat[balances.section.edges().size() + balances.section.airs().size() + pipe];
    }

    /** Heat made by the cables in the section, W/m. */
    public double heatOfCables() {
        double sum = 0;
        for (double made : balances.heat) {
            sum += made;
        }
        return heatFactor * sum;
    }

    /** What the heat made and the heat given away differ by, relative to all heat that is given away or taken in. */
    public double imbalance() {
        double sum = heatOfCables();
        double all = Math.abs(sum);
        for (double given : heat) {
            sum -= given;
            all += Math.abs(given);
        }
        return all == 0 ? 0 : Math.abs(sum) / (all / 2);
    }

    /** What is left of the balances, relative, as the root of the sum of squares. */
    public double residual() {
        return convergence.residual();
    }

    /** Steps the solver took. */
    public int iterations() {
        return convergence.iterations();
    }

    /** The grid. */
    public Grid grid() {
        return balances.grid;
    }

    Balances balances() {
        return balances;
    }

    double[] temperatures() {
        return temperature;
    }

    double[] known() {
        return known;
    }

    /** Temperature at a point; inside pipes and air, theirs. Points outside count as on the edge. */
    public double temperature(double x, double y) {
        return new PointReading(balances, temperature, known).at(x, y);
    }
}
