package org.treadwarm.web.pages;

import java.util.stream.Collectors;
import org.treadwarm.web.csv.Column;
import org.treadwarm.web.csv.TableKind;

/** A table that can be read in, with its columns in words. */
public record IncomingTable(String word, String columns) {
    static IncomingTable of(TableKind kind) {
        String columns = kind.columns().stream().map(Column::header).collect(Collectors.joining(", "));
        return new IncomingTable(kind.word(), columns);
    }
}
