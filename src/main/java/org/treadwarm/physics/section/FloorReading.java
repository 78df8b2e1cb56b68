package org.treadwarm.physics.section;

import java.util.Arrays;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;

/** Reads the numbers of a floor off a computed section. Every one of them is linear in the temperatures. */
final class FloorReading {
    /** Points on the right half of a cable's skin over which its temperature is averaged. */
    private static final int SKIN_POINTS = 48;

    private final FloorLayout layout;
    private final Field field;
    private final Balances balances;
    private final Grid grid;

    FloorReading(FloorLayout layout, Field field) {
        this.layout = layout;
        this.field = field;
        this.balances = field.balances();
        this.grid = balances.grid;
    }

    /** Flux from the finished surface, W/m². */
    double upwardFlux() {
        return field.heatToEdge(FloorLayout.ABOVE) / layout.halfSpacing();
    }

    /** Flux from the lowest face, W/m². */
    double downwardFlux() {
        return field.heatToEdge(FloorLayout.BELOW) / layout.halfSpacing();
    }

    /** Heat from the heater, W/m². */
    double heatInput() {
        double heat = layout.heater() instanceof WaterPipe ? field.heatOfPipe(0) : field.heatOfCables();
        return heat / layout.halfSpacing();
    }

    /** Mean temperature of the heater's outside, degrees Celsius. */
    double heaterTemperature() {
        double radius = layout.heater().diameter() / 2;
        if (layout.heater() instanceof WaterPipe pipe) {
            double water = field.known()[field.known().length - 1];
            return water
                    - field.heatOfPipe(0) / (Math.PI * radius) * pipe.at(0, 0).resistance();
        }
        double sum = 0;
        for (int i = 0; i < SKIN_POINTS; i++) {
            double angle = Math.PI * ((i + 0.5) / SKIN_POINTS - 0.5);
            sum += field.temperature(radius * Math.cos(angle), layout.axis() + radius * Math.sin(angle));
        }
        return sum / SKIN_POINTS;
    }

    /** Temperatures of the finished surface, column by column. */
    double[] surface() {
        double[] surface = new double[grid.columns()];
        for (int column = 0; column < surface.length; column++) {
            int link = balances.links.find(balances.lattice.cell(column, grid.rows() - 1), Heading.UP);
            double flux = balances.links.flux(link, field.temperatures(), field.known());
            surface[column] = field.known()[FloorLayout.ABOVE] + flux * balances.links.film(link);
        }
        return surface;
    }

    /** The mean of a line of temperatures. */
    double mean(double[] line) {
        double sum = 0;
        for (int column = 0; column < line.length; column++) {
            sum += line[column] * grid.width(column);
        }
        return sum / layout.halfSpacing();
    }

    /** A line of temperatures at the plane through the heater's axis, where it is level. */
    double atHeater(double[] line) {
        return level(line[0], line[1], grid.x(0), grid.x(1));
    }

    /** A line of temperatures midway between two heaters, where it is level. */
    double between(double[] line) {
        int last = line.length - 1;
        return level(
                line[last],
                line[last - 1],
                layout.halfSpacing() - grid.x(last),
                layout.halfSpacing() - grid.x(last - 1));
    }

    /** The top of the parabola through two values at two distances from it. */
    private static double level(double near, double far, double distance, double farDistance) {
        double share = distance * distance / (farDistance * farDistance - distance * distance);
        return near + (near - far) * share;
    }

    /** Temperatures of a layer's face towards the heater; of the heater's own layer, its upper face. */
    double[] warmFace(int layer) {
        boolean above = layer < layout.heater().layer();
        double height = above ? layout.bottomOf(layer) : layout.topOf(layer);
        int line = grid.lineAt(height);
        double between = resistanceDownTo(layer, above, height);
        double[] face = line == grid.rows() ? surface() : overLine(line);
        for (int column = 0; column < face.length; column++) {
            face[column] += flux(column, line) * between;
        }
        return face;
    }

    /** Resistance of the layers without thickness at a height, from the topmost one there down to a layer's warm face. */
    private double resistanceDownTo(int layer, boolean andItself, double height) {
        double sum = 0;
        for (int i = 0; andItself ? i <= layer : i < layer; i++) {
            boolean here = FloorLayout.thickness(layout.layers().get(i)) == 0 && layout.topOf(i) == height;
            sum += here ? layout.layers().get(i).resistance() : 0;
        }
        return sum;
    }

    private double[] overLine(int line) {
        double[] face = new double[grid.columns()];
        Arrays.setAll(face, column -> overLine(column, line));
        return face;
    }

    /** Temperature of the face just above a line. */
    private double overLine(int column, int line) {
        int above = balances.lattice.cell(column, line);
        double flux = flux(column, line);
        if (balances.materials.isSolid(above)) {
            return field.temperatures()[above] + flux * balances.materials.halfHeight(column, line);
        }
        int below = above - grid.columns();
        return field.temperatures()[below]
                - flux * (balances.materials.halfHeight(column, line - 1) + balances.materials.sheet(column, line));
    }

    /** Upward flux through a line, W/m². */
    private double flux(int column, int line) {
        double[] temperature = field.temperatures();
        if (line > 0 && balances.materials.isSolid(balances.lattice.cell(column, line - 1))) {
            return balances.flux(column, line - 1, Heading.UP, temperature, field.known());
        }
        return -balances.flux(column, line, Heading.DOWN, temperature, field.known());
    }
}
