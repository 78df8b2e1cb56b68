package org.treadwarm.physics.section;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;

/** The program's side of the comparison script: times {@link TwoLayers} and leaves its temperatures in a file. */
final class CompareSection {
    private static final int RUNS = 15;

    private CompareSection() {}

    /** Takes the number of cells along a side and the file; prints seconds of the first and the median later run, and the steps. */
    public static void main(String[] arguments) throws IOException {
        int cellsAlong = Integer.parseInt(arguments[0]);
        double[] seconds = new double[RUNS];
        double[] temperature = new double[0];
        int steps = 0;
        for (int run = 0; run < RUNS; run++) {
            long start = System.nanoTime();
            TwoLayers section = new TwoLayers(cellsAlong);
            temperature = new double[section.lattice.cells()];
            steps = section.solve(temperature).iterations();
            seconds[run] = (System.nanoTime() - start) / 1e9;
        }
        double[] later = Arrays.copyOfRange(seconds, 5, RUNS);
        Arrays.sort(later);
        System.out.printf(Locale.ROOT, "%.6f %.6f %d%n", seconds[0], later[later.length / 2], steps);
        ByteBuffer bytes = ByteBuffer.allocate(8 * temperature.length);
        bytes.asDoubleBuffer().put(temperature);
        Files.write(Path.of(arguments[1]), bytes.array());
    }
}
