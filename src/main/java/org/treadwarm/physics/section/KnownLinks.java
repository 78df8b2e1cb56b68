package org.treadwarm.physics.section;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;

/** Links from cells to known temperatures, in flat lists. */
final class KnownLinks {
    /** No link. */
    static final int NONE = -1;

    private static final int SIDES = Heading.values().length;

    private final int knownCount;
    private final Map<Integer, Integer> places = new HashMap<>();
    private int count;
    private int[] cell = new int[64];
    private int[] known = new int[64];
    private Heading[] heading = new Heading[64];
    private double[] area = new double[64];
    private double[] inside = new double[64];
    private double[] film = new double[64];

    KnownLinks(int knownCount) {
        this.knownCount = knownCount;
    }

    /**
     * Adds a link.
     *
     * @param from the cell
     * @param side where the link leaves it
     * @param to number of the known temperature
     * @param face m² per metre of depth
     * @param insideResistance from the cell's middle to the surface, m²·K/W
     * @param filmResistance from the surface on, m²·K/W
     */
    void add(int from, Heading side, int to, double face, double insideResistance, double filmResistance) {
        if (count == cell.length) {
            cell = Arrays.copyOf(cell, 2 * count);
            known = Arrays.copyOf(known, 2 * count);
            heading = Arrays.copyOf(heading, 2 * count);
            area = Arrays.copyOf(area, 2 * count);
            inside = Arrays.copyOf(inside, 2 * count);
            film = Arrays.copyOf(film, 2 * count);
        }
        cell[count] = from;
        heading[count] = side;
        known[count] = to;
        area[count] = face;
        inside[count] = insideResistance;
        film[count] = filmResistance;
        places.put(place(from, side), count);
        count++;
    }

    private static int place(int from, Heading side) {
        return SIDES * from + side.ordinal();
    }

    /** The link that leaves a cell by a side, or {@link #NONE}. */
    int find(int from, Heading side) {
        return places.getOrDefault(place(from, side), NONE);
    }

    int count() {
        return count;
    }

    int cell(int link) {
        return cell[link];
    }

    int known(int link) {
        return known[link];
    }

    Heading heading(int link) {
        return heading[link];
    }

    double area(int link) {
        return area[link];
    }

    double film(int link) {
        return film[link];
    }

    void setFilm(int link, double resistance) {
        film[link] = resistance;
    }

    double conductance(int link) {
        return area[link] / (inside[link] + film[link]);
    }

    /** Flux through a link's face towards the known temperature, W/m². */
    double flux(int link, double[] temperature, double[] knownTemperatures) {
        return (temperature[cell[link]] - knownTemperatures[known[link]]) / (inside[link] + film[link]);
    }

    void addTo(double[] held) {
        for (int link = 0; link < count; link++) {
            held[cell[link]] += conductance(link);
        }
    }

    void addHeat(double[] knownTemperatures, double[] load) {
        for (int link = 0; link < count; link++) {
            load[cell[link]] += conductance(link) * knownTemperatures[known[link]];
        }
    }

    /** Heat into all known temperatures when all cells are 1 K warmer than they, W/m. */
    double conductance() {
        double sum = 0;
        for (int link = 0; link < count; link++) {
            sum += conductance(link);
        }
        return sum;
    }

    /** The known temperature whose links conduct the most together; the first of equal ones. */
    int stiffest() {
        double[] sums = new double[knownCount];
        for (int link = 0; link < count; link++) {
            sums[known[link]] += conductance(link);
        }
        int stiffest = 0;
        for (int i = 1; i < knownCount; i++) {
            stiffest = sums[i] > sums[stiffest] ? i : stiffest;
        }
        return stiffest;
    }

    /** Heat into each known temperature, W/m. */
    double[] heat(double[] temperature, double[] knownTemperatures) {
        double[] heat = new double[knownCount];
        for (int link = 0; link < count; link++) {
            heat[known[link]] += flux(link, temperature, knownTemperatures) * area[link];
        }
        return heat;
    }
}
