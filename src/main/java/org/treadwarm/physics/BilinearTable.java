package org.treadwarm.physics;

import java.util.Map;
import java.util.NavigableMap;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;

/** A function known on a grid of two arguments, taken as bilinear between neighbours and as unknown outside. */
public final class BilinearTable {
    private final String rowName;
    private final NavigableMap<Double, LinearTable> rows;

    private BilinearTable(String rowName, NavigableMap<Double, LinearTable> rows) {
        this.rowName = rowName;
        this.rows = rows;
    }

    /**
     * A table from its rows.
     *
     * @param rowName what the argument of the rows is, as an error shall call it
     * @param columnName what the argument within a row is
     * @param values by row, then by column
     * @throws IllegalArgumentException unless there are rows, all with the same columns and finite numbers
     */
    public static BilinearTable of(String rowName, String columnName, Map<Double, Map<Double, Double>> values) {
        Set<Set<Double>> columns = values.values().stream().map(Map::keySet).collect(Collectors.toSet());
        if (columns.size() != 1) {
            throw new IllegalArgumentException(
                    "a table over the " + rowName + " needs rows with the same columns, not " + columns);
        }
        TreeMap<Double, LinearTable> rows = new TreeMap<>();
        values.forEach((argument, row) -> rows.put(argument, LinearTable.of(columnName, row)));
        return new BilinearTable(rowName, rows);
    }

    /**
     * The value at a row and a column.
     *
     * @throws IllegalArgumentException outside the table
     */
    public double at(double row, double column) {
        Map.Entry<Double, LinearTable> below = rows.floorEntry(row);
        Map.Entry<Double, LinearTable> above = rows.ceilingEntry(row);
        if (below == null || above == null) {
            throw new IllegalArgumentException(
                    "the " + rowName + " is " + row + ", allowed is " + rows.firstKey() + " to " + rows.lastKey());
        }
        double low = below.getValue().at(column);
        if (below.getKey().equals(above.getKey())) {
            return low;
        }
        double share = (row - below.getKey()) / (above.getKey() - below.getKey());
        return low + share * (above.getValue().at(column) - low);
    }
}
