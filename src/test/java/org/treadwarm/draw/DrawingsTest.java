package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every drawing owes its reader, on many seeded inputs and on sheets from the narrowest up. */
class DrawingsTest {
    private static final String[] WORDS = {
        "wall", "insulated", "<b>", "timber", "concrete", "\"A&B\"", "air", "Außenwand", "tile", "waterproofing", "7"
    };

    static Stream<Case> cases() {
        return IntStream.range(0, 25)
                .boxed()
                .flatMap(seed -> Stream.of(340, 360, 559, 720).map(width -> new Case(seed, width)));
    }

    /** A seed and the width of a sheet. */
    record Case(int seed, int width) {
        Sheet sheet() {
            return new Sheet("d" + seed, width);
        }

        Random random() {
            return new Random(seed);
        }
    }

    @Test
    void theCheckSeesLettersOverLettersAndLines() {
        Canvas canvas = new Canvas(Sheet.narrow("d"));
        canvas.text(new Point(20, 20), "under", TextStyle.PLAIN);
        canvas.text(new Point(30, 24), "over", TextStyle.PLAIN);
        canvas.line(new Point(10, 20), new Point(25, 20), Stroke.THIN);
        DrawingCheck check = DrawingCheck.read(canvas.write(60, "Fault", "Letters over each other"));
        assertThat(check.overlapping()).hasSize(1);
        assertThat(check.crossed()).hasSize(1);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void balancesAreLegible(Case one) {
        Random random = one.random();
        List<HeatPath> paths = some(random, 31, 0).stream()
                .map(i -> new HeatPath(name(random), watts(random), OptionalDouble.of(random.nextDouble())))
                .toList();
        double total = paths.stream().mapToDouble(HeatPath::watts).sum();
        double carried = Math.abs(watts(random));
        FloorHeat heat = new FloorHeat(total, carried, Math.max(0, total - carried));
        Optional<FloorHeat> floor = random.nextInt(4) == 0 ? Optional.empty() : Optional.of(heat);
        check(BalanceDrawing.draw(one.sheet(), new Balance(name(random), paths, total, floor)));
    }

    @ParameterizedTest
    @MethodSource("cases")
    void limitScalesAreLegible(Case one) {
        Random random = one.random();
        List<FluxLimit> limits = some(random, 9, 0).stream()
                .map(i -> new FluxLimit(name(random), random.nextDouble() * 300 - 20, random.nextBoolean()))
                .toList();
        double required = random.nextDouble() * 150 - 10;
        double carried = random.nextInt(5) == 0 ? required : random.nextDouble() * 150 - 10;
        check(LimitScale.draw(one.sheet(), new FluxScale(name(random), required, carried, limits)));
    }

    @ParameterizedTest
    @MethodSource("cases")
    void buildUpsAreLegible(Case one) {
        Random random = one.random();
        List<Layer> layers = layers(random, 1);
        List<Double> temperatures = new ArrayList<>();
        double temperature = 21;
        for (int i = 0; i <= layers.size(); i++) {
            temperatures.add(temperature);
            temperature -= random.nextDouble() * 6 - 0.5;
        }
        OptionalDouble dewPoint =
                random.nextBoolean() ? OptionalDouble.of(random.nextDouble() * 20) : OptionalDouble.empty();
        AirSide last = new AirSide(name(random), temperature);
        check(BuildUpDrawing.draw(
                one.sheet(),
                new BuildUp(
                        name(random),
                        random.nextBoolean(),
                        new AirSide(name(random), 21.5),
                        last,
                        layers,
                        temperatures,
                        dewPoint)));
    }

    @ParameterizedTest
    @MethodSource("cases")
    void floorsAreLegible(Case one) {
        Random random = one.random();
        Beneath.Kind kind = Beneath.Kind.values()[random.nextInt(3)];
        check(FloorBuildUpDrawing.draw(
                one.sheet(),
                new FloorSection(
                        name(random),
                        new AirSide(name(random), 21.5),
                        layers(random, 0),
                        name(random),
                        layers(random, 1),
                        new Beneath(kind, name(random), OptionalDouble.of(8)),
                        29,
                        33,
                        random.nextDouble() * 200 - 30,
                        random.nextDouble() * 50 - 20,
                        random.nextBoolean()
                                ? OptionalDouble.of(random.nextDouble() * 9 - 3)
                                : OptionalDouble.empty())));
    }

    private static void check(String svg) {
        DrawingCheck.read(svg).holds();
    }

    private static List<Integer> some(Random random, int bound, int least) {
        return IntStream.range(0, least + random.nextInt(bound)).boxed().toList();
    }

    private static double watts(Random random) {
        return (random.nextDouble() - 0.25) * Math.pow(10, random.nextInt(5));
    }

    static String name(Random random) {
        return some(random, 7, 1).stream()
                .map(i -> WORDS[random.nextInt(WORDS.length)])
                .collect(Collectors.joining(" "));
    }

    static List<Layer> layers(Random random, int least) {
        return some(random, 15, least).stream()
                .map(i -> {
                    double thickness = Math.pow(10, -random.nextDouble() * 4);
                    String name = name(random);
                    return new Layer(
                            name,
                            random.nextInt(4) == 0 ? OptionalDouble.empty() : OptionalDouble.of(thickness),
                            random.nextDouble() * 4,
                            MaterialFamily.of(name),
                            random.nextInt(4) == 0 ? Optional.of(new Bridge(0.12, name)) : Optional.empty(),
                            random.nextBoolean() ? List.of(name(random)) : List.of());
                })
                .toList();
    }
}
