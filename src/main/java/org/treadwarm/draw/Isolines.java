package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Lines of equal value through a field sampled at the nodes of a rectilinear grid, by marching squares.
 *
 * <p>Between nodes the value is taken as bilinear, so that a cell whose opposite corners are above the level is joined
 * the way the bilinear surface runs. Cells with a corner that is not a number are left out.
 */
final class Isolines {
    private final double[] x;
    private final double[] y;
    private final double[][] values;

    /**
     * A field on a grid.
     *
     * @param x places of the columns, rising
     * @param y places of the rows, rising
     * @param values value by row and column; NaN where there is none
     */
    Isolines(double[] x, double[] y, double[][] values) {
        this.x = x;
        this.y = y;
        this.values = values;
    }

    /** The lines at a level; one that closes ends with the point it starts with. */
    List<List<Point>> at(double level) {
        Map<Integer, List<Integer>> joined = new HashMap<>();
        for (int row = 0; row + 1 < y.length; row++) {
            for (int column = 0; column + 1 < x.length; column++) {
                cell(row, column, level, joined);
            }
        }
        return chains(joined, level);
    }

    /** The crossings of a cell's edges, joined in pairs. */
    private void cell(int row, int column, double level, Map<Integer, List<Integer>> joined) {
        double northWest = values[row][column];
        double northEast = values[row][column + 1];
        double southWest = values[row + 1][column];
        double southEast = values[row + 1][column + 1];
        int above = (northWest >= level ? 1 : 0)
                + (northEast >= level ? 1 : 0)
                + (southWest >= level ? 1 : 0)
                + (southEast >= level ? 1 : 0);
        // Most cells: none of their edges is crossed.
        if (above == 0 || above == 4 || Double.isNaN(northWest + northEast + southWest + southEast)) {
            return;
        }
        int north = across(row, column);
        int south = across(row + 1, column);
        int west = down(row, column);
        int east = down(row, column + 1);
        List<Integer> crossed = new ArrayList<>();
        add(crossed, north, northWest >= level, northEast >= level);
        add(crossed, east, northEast >= level, southEast >= level);
        add(crossed, south, southEast >= level, southWest >= level);
        add(crossed, west, southWest >= level, northWest >= level);
        if (crossed.size() == 2) {
            join(crossed.get(0), crossed.get(1), joined);
        } else if (crossed.size() == 4) {
            double saddle =
                    (northWest * southEast - northEast * southWest) / (northWest + southEast - northEast - southWest);
            boolean northWestStandsAlone = (saddle >= level) != (northWest >= level);
            join(north, northWestStandsAlone ? west : east, joined);
            join(south, northWestStandsAlone ? east : west, joined);
        }
    }

    private static void add(List<Integer> crossed, int edge, boolean one, boolean other) {
        if (one != other) {
            crossed.add(edge);
        }
    }

    private static void join(int one, int other, Map<Integer, List<Integer>> joined) {
        joined.computeIfAbsent(one, edge -> new ArrayList<>(2)).add(other);
        joined.computeIfAbsent(other, edge -> new ArrayList<>(2)).add(one);
    }

    /** Open lines from their ends first, then what closes. */
    private List<List<Point>> chains(Map<Integer, List<Integer>> joined, double level) {
        List<List<Point>> lines = new ArrayList<>();
        Set<Integer> done = new HashSet<>();
        List<Integer> starts = new ArrayList<>(joined.keySet().stream()
                .filter(edge -> joined.get(edge).size() == 1)
                .sorted()
                .toList());
        starts.addAll(joined.keySet().stream().sorted().toList());
        for (int start : starts) {
            if (!done.contains(start)) {
                lines.add(chain(start, joined, done, level));
            }
        }
        return lines;
    }

    private List<Point> chain(int start, Map<Integer, List<Integer>> joined, Set<Integer> done, double level) {
        List<Point> line = new ArrayList<>();
        int edge = start;
        boolean further = true;
        while (further) {
            done.add(edge);
            line.add(crossing(edge, level));
            further = false;
            for (int next : joined.get(edge)) {
                if (!further && !done.contains(next)) {
                    edge = next;
                    further = true;
                }
            }
        }
        if (line.size() > 2 && joined.get(edge).contains(start)) {
            line.add(line.get(0));
        }
        return line;
    }

    /** Number of the edge from a node to the next column. */
    private int across(int row, int column) {
        return 2 * (row * x.length + column);
    }

    /** Number of the edge from a node to the next row. */
    private int down(int row, int column) {
        return across(row, column) + 1;
    }

    private Point crossing(int edge, double level) {
        int node = edge / 2;
        int row = node / x.length;
        int column = node % x.length;
        double value = values[row][column];
        if (edge % 2 == 0) {
            double share = (level - value) / (values[row][column + 1] - value);
            return new Point(x[column] + share * (x[column + 1] - x[column]), y[row]);
        }
        double share = (level - value) / (values[row + 1][column] - value);
        return new Point(x[column], y[row] + share * (y[row + 1] - y[row]));
    }
}
