package org.treadwarm.sizing;

import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Shielding;
import org.treadwarm.survey.Zone;
import org.treadwarm.tables.Films;
import org.treadwarm.tables.Material;
import org.treadwarm.tables.Materials;

/**
 * The numbers of the tables that a sizing uses, each with an address and its source. Addresses begin with {@code table:} and go
 * on as pointers do: {@code materials/NAME/conductivity}, {@code films/DIRECTION/inside}, {@code constants/NAME}.
 */
public final class TableNumbers {
    private static final String TABLE = "table:";
    private static final String EMISSIVITY = constant("ordinary emissivity");

    private static final Map<String, TableNumber> ALL = Stream.of(materials(), films(), constants())
            .flatMap(Function.identity())
            .collect(Collectors.toUnmodifiableMap(TableNumber::address, Function.identity()));

    private TableNumbers() {}

    /** A number of a table: its address, its value in SI units, and where it comes from. */
    public record TableNumber(String address, double value, String source) {}

    /** The number at an address; empty when there is none. */
    public static Optional<TableNumber> find(String address) {
        return Optional.ofNullable(ALL.get(address));
    }

    static String conductivity(String material) {
        return material(Materials.find(material).orElseThrow(), "conductivity");
    }

    static String density(String material) {
        return material(Materials.find(material).orElseThrow(), "density");
    }

    static String insideFilm(HeatFlow direction) {
        return film(direction.word(), "inside");
    }

    static String outsideFilm(HeatFlow direction) {
        return film(direction.word(), "outside");
    }

    static String ordinaryEmissivity() {
        return EMISSIVITY;
    }

    static String zone(Zone zone) {
        return constant("zone " + zone.word());
    }

    static String shielding(Shielding shielding) {
        return constant("shielding " + shielding.word());
    }

    private static String material(Material row, String column) {
        return Pointer.to(Pointer.to(TABLE + "materials", row.name()), column);
    }

    private static String film(String direction, String side) {
        return TABLE + "films/" + direction + "/" + side;
    }

    private static String constant(String name) {
        return TABLE + "constants/" + name;
    }

    private static Stream<TableNumber> materials() {
        return Materials.all().stream()
                .flatMap(row -> Stream.concat(
                        number(row, "conductivity", row.conductivity()), number(row, "density", row.density())));
    }

    private static Stream<TableNumber> number(Material row, String column, OptionalDouble value) {
        return value.stream().mapToObj(number -> new TableNumber(material(row, column), number, row.source()));
    }

    private static Stream<TableNumber> films() {
        return Films.all().stream()
                .flatMap(row -> Stream.of(
                        new TableNumber(film(row.heatFlow(), "inside"), row.inside(), row.source()),
                        new TableNumber(film(row.heatFlow(), "outside"), row.outside(), row.source())));
    }

    private static Stream<TableNumber> constants() {
        Stream<TableNumber> shieldings = Arrays.stream(Shielding.values())
                .map(word -> new TableNumber(shielding(word), word.factor(), "ISO 13370:2017, table 2 (from memory)"));
        return Stream.concat(
                shieldings,
                Stream.of(
                        new TableNumber(EMISSIVITY, Stack.ORDINARY_EMISSIVITY, "ISO 6946:2017, 6.9.2 (from memory)"),
                        new TableNumber(zone(Zone.OCCUPIED), Limits.OCCUPIED, Limits.ZONE_SOURCE),
                        new TableNumber(zone(Zone.PERIPHERAL), Limits.PERIPHERAL, Limits.ZONE_SOURCE),
                        new TableNumber(zone(Zone.BATHROOM), Limits.BATHROOM_RISE, Limits.ZONE_SOURCE)));
    }
}
