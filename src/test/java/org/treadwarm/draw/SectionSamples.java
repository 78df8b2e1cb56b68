package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleBinaryOperator;

/** Invented heated floors in section: a row of line sources under a film, with a drop in a layer beneath. */
final class SectionSamples {
    private SectionSamples() {}

    /** A cable at 150 mm in a screed on insulation board on a slab on the ground. */
    static IsothermSection cable() {
        List<Layer> layers = List.of(
                Samples.layer("Porcelain tile", 0.01, 0.01),
                Samples.layer("Tile adhesive", 0.005, 0.005),
                Samples.layer("Cement screed", 0.06, 0.043),
                new Layer(
                        "Insulation board, XPS",
                        OptionalDouble.empty(),
                        0.57,
                        MaterialFamily.INSULATION,
                        Optional.empty(),
                        List.of()),
                Samples.layer("Concrete slab", 0.1, 0.05));
        return section("Bathroom, Mill Lane", layers, new HeaterCut("cable 6 mm", 0.04, 0.006), 0.15, 0.15, 70);
    }

    /** A pipe at 200 mm in a thick screed. */
    static IsothermSection pipe() {
        List<Layer> layers = List.of(
                Samples.layer("Oak parquet", 0.014, 0.08),
                Samples.layer("Cement screed", 0.065, 0.046),
                Samples.layer("Insulation board, EPS", 0.03, 0.86),
                Samples.layer("Concrete slab", 0.14, 0.07));
        return section("Hall, Mill Lane", layers, new HeaterCut("pipe 16 mm", 0.055, 0.016), 0.2, 0.1, 55);
    }

    static IsothermSection section(
            String name, List<Layer> layers, HeaterCut heater, double spacing, double window, double flux) {
        double[] x = new double[(int) Math.round(80 * window / spacing) + 1];
        Arrays.setAll(x, i -> window * i / (x.length - 1));
        List<Double> y = new ArrayList<>();
        List<double[]> field = new ArrayList<>();
        DoubleBinaryOperator warm = (along, down) -> temperature(along, down, heater.depth(), spacing, flux);
        double face = 0;
        double drop = 0;
        for (Layer layer : layers) {
            double thickness = layer.thickness().orElse(0);
            double fall = face >= heater.depth() ? 11.8 * layer.resistance() : 0;
            for (int i = 0; thickness > 0 && i <= 40; i++) {
                double down = face + thickness * i / 40;
                boolean again = i == 0 && !y.isEmpty() && fallsBetween(layers, layer);
                if (i > 0 || y.isEmpty() || again) {
                    double fallen = drop + fall * i / 40;
                    y.add(again ? y.get(y.size() - 1) : down);
                    field.add(Arrays.stream(x)
                            .map(along -> inside(along, down, heater, spacing)
                                    ? Double.NaN
                                    : warm.applyAsDouble(along, down) - fallen)
                            .toArray());
                }
            }
            face += thickness;
            drop += fall;
        }
        List<Double> surface = Arrays.stream(x)
                .map(along -> warm.applyAsDouble(along, 0))
                .boxed()
                .toList();
        double mean =
                surface.stream().mapToDouble(Double::doubleValue).average().orElseThrow();
        double highest = surface.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
        double lowest = surface.stream().mapToDouble(Double::doubleValue).min().orElseThrow();
        return new IsothermSection(
                name,
                new AirSide("bathroom", 22),
                layers,
                heater,
                spacing,
                new TemperatureField(
                        x, y.stream().mapToDouble(Double::doubleValue).toArray(), field.toArray(double[][]::new)),
                new SurfaceProfile(surface, highest, mean, lowest, OptionalDouble.of(31)),
                new Beneath(Beneath.Kind.GROUND, "ground", OptionalDouble.of(9)),
                flux,
                11.8);
    }

    /** Whether the layer before this one is known only by its resistance. */
    private static boolean fallsBetween(List<Layer> layers, Layer layer) {
        return layers.get(layers.indexOf(layer) - 1).thickness().isEmpty();
    }

    private static boolean inside(double x, double y, HeaterCut heater, double spacing) {
        double nearest = Math.min(x, Math.abs(spacing - x));
        return Math.hypot(nearest, y - heater.depth()) < heater.diameter() / 2;
    }

    /** Over a row of line sources in a half-space whose film is reckoned as so much more of it. */
    private static double temperature(double x, double y, double depth, double spacing, double flux) {
        double conductivity = 1.4;
        double film = conductivity / 10.8;
        double turn = 2 * Math.PI / spacing;
        double image = Math.cosh(turn * (y + depth + 2 * film)) - Math.cos(turn * x);
        double source = Math.cosh(turn * (y - depth)) - Math.cos(turn * x);
        return 22 + flux * spacing / (4 * Math.PI * conductivity) * Math.log(image / Math.max(source, 1e-9));
    }
}
