package org.treadwarm.store;

import java.sql.Connection;
import java.sql.DatabaseMetaData;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Types;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/**
 * A table as the database describes it.
 *
 * @param columns names in alphabetical order, so that two databases agree on it
 * @param types the kind of each column, of {@link Types}
 */
record Table(String name, List<String> columns, List<Integer> types) {
    /** The tables of the migration library are not ours. */
    private static final String LIBRARYS = "flyway_schema_history";

    Table {
        columns = List.copyOf(columns);
        types = List.copyOf(types);
    }

    String selectAll() {
        return "select " + String.join(", ", columns) + " from " + name;
    }

    String insert() {
        return "insert into " + name + " (" + String.join(", ", columns) + ") values ("
                + String.join(", ", Collections.nCopies(columns.size(), "?")) + ")";
    }

    /** All tables, each after those it refers to. */
    static List<Table> all(Connection connection) throws SQLException {
        DatabaseMetaData data = connection.getMetaData();
        Map<String, Set<String>> refersTo = new TreeMap<>();
        try (ResultSet tables = data.getTables(null, connection.getSchema(), "%", new String[] {"TABLE"})) {
            while (tables.next()) {
                String name = tables.getString("TABLE_NAME");
                if (!name.equals(LIBRARYS) && !name.startsWith("sqlite_")) {
                    refersTo.put(name, new LinkedHashSet<>());
                }
            }
        }
        for (Map.Entry<String, Set<String>> table : refersTo.entrySet()) {
            try (ResultSet keys = data.getImportedKeys(null, connection.getSchema(), table.getKey())) {
                while (keys.next()) {
                    table.getValue().add(keys.getString("PKTABLE_NAME"));
                }
            }
        }
        List<Table> ordered = new ArrayList<>();
        for (String name : inOrder(refersTo)) {
            ordered.add(described(data, connection.getSchema(), name));
        }
        return ordered;
    }

    private static Set<String> inOrder(Map<String, Set<String>> refersTo) {
        Set<String> ordered = new LinkedHashSet<>();
        while (ordered.size() < refersTo.size()) {
            int before = ordered.size();
            refersTo.forEach((table, others) -> {
                if (others.stream().allMatch(other -> other.equals(table) || ordered.contains(other))) {
                    ordered.add(table);
                }
            });
            if (ordered.size() == before) {
                throw new IllegalStateException("Tables refer to each other in a circle: " + refersTo);
            }
        }
        return ordered;
    }

    private static Table described(DatabaseMetaData data, String schema, String name) throws SQLException {
        Map<String, Integer> types = new TreeMap<>();
        try (ResultSet columns = data.getColumns(null, schema, name, "%")) {
            while (columns.next()) {
                types.put(columns.getString("COLUMN_NAME"), columns.getInt("DATA_TYPE"));
            }
        }
        Map<String, Integer> ordered = new LinkedHashMap<>(types);
        return new Table(name, List.copyOf(ordered.keySet()), List.copyOf(ordered.values()));
    }
}
