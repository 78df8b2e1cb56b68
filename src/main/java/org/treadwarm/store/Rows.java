package org.treadwarm.store;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.HexFormat;

/**
 * What stands in a table, in one number that does not depend on the order of the rows or on the database.
 *
 * @param count how many rows there are
 * @param sum the SHA-256 of every row, added up modulo 2^256
 */
record Rows(long count, BigInteger sum) {
    private static final BigInteger MODULUS = BigInteger.ONE.shiftLeft(256);
    private static final int FETCH = 500;

    /** Reads a whole table. */
    static Rows of(Connection connection, Table table) throws SQLException {
        long count = 0;
        BigInteger sum = BigInteger.ZERO;
        try (Statement statement = connection.createStatement()) {
            statement.setFetchSize(FETCH);
            try (ResultSet rows = statement.executeQuery(table.selectAll())) {
                while (rows.next()) {
                    count++;
                    sum = sum.add(digest(rows, table)).mod(MODULUS);
                }
            }
        }
        return new Rows(count, sum);
    }

    private static BigInteger digest(ResultSet row, Table table) throws SQLException {
        MessageDigest digest = sha256();
        for (int column = 1; column <= table.columns().size(); column++) {
            byte[] bytes = text(row.getObject(column)).getBytes(StandardCharsets.UTF_8);
            digest.update((bytes.length + ":").getBytes(StandardCharsets.UTF_8));
            digest.update(bytes);
        }
        return new BigInteger(1, digest.digest());
    }

    private static String text(Object value) {
        if (value == null) {
            return "nothing";
        }
        if (value instanceof Number number) {
            return "number "
                    + new BigDecimal(number.toString()).stripTrailingZeros().toPlainString();
        }
        if (value instanceof Boolean truth) {
            return "number " + (truth ? "1" : "0");
        }
        return value instanceof byte[] bytes ? "bytes " + HexFormat.of().formatHex(bytes) : "text " + value;
    }

    private static MessageDigest sha256() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException problem) {
            throw new IllegalStateException("Every Java runtime has SHA-256", problem);
        }
    }
}
