package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BooleanSupplier;
import org.treadwarm.draw.FootDrawing;
import org.treadwarm.draw.FootSection;
import org.treadwarm.draw.FootSection.EdgeStrip;
import org.treadwarm.draw.MaterialFamily;
import org.treadwarm.draw.Sheet;
import org.treadwarm.draw.TemperatureField;
import org.treadwarm.sizing.WallFootView;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.LayerMatter;
import org.treadwarm.survey.WallFootQuestion;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** From a solved wall foot to its drawings, without edge insulation and, where there is one, with it. */
final class WallFootPicture {
    private static final int WIDE = 620;

    private WallFootPicture() {}

    /** The drawings; none where one cannot be drawn. */
    static List<Answer.Picture> all(WallFootQuestion question, String wall, BooleanSupplier stopped) {
        List<Answer.Picture> pictures = new ArrayList<>();
        boolean strip = question.edgeThickness().isPresent();
        try {
            pictures.add(picture(
                    strip ? "Without edge insulation" : "The wall's foot in section",
                    "without",
                    section(question, wall, WallFootView.of(question, false, stopped))));
            if (strip) {
                pictures.add(picture(
                        "With edge insulation",
                        "with",
                        section(question, wall, WallFootView.of(question, true, stopped))));
            }
        } catch (IllegalArgumentException beyondAnyDrawing) {
            return List.of();
        }
        return pictures;
    }

    private static Answer.Picture picture(String title, String id, FootSection section) {
        return new Answer.Picture(
                title,
                FootDrawing.draw(new Sheet("foot-" + id, WIDE), section),
                FootDrawing.draw(Sheet.narrow("foot-" + id + "-slim"), section));
    }

    private static FootSection section(WallFootQuestion question, String wall, WallFootView view) {
        List<org.treadwarm.draw.Layer> slab = new ArrayList<>();
        for (int i = 0; i < question.below().size(); i++) {
            slab.add(layer(question.below().get(i), i + 1));
        }
        return new FootSection(
                "wall " + wall + (view.edge() ? ", with edge insulation" : ", without edge insulation"),
                slab,
                question.above().value(),
                question.heatedPlane().value(),
                solid("wall: " + wall, view.wallThickness(), view.wallResistance(), family(question)),
                question.foundation().value(),
                conductivity(question.footConductivity()),
                conductivity(question.soilConductivity()),
                strip(question, view),
                view.inward(),
                view.outward(),
                view.upward(),
                view.downward(),
                field(view));
    }

    private static Optional<EdgeStrip> strip(WallFootQuestion question, WallFootView view) {
        return question.edgeThickness()
                .filter(thickness -> view.edge())
                .map(thickness -> new EdgeStrip(
                        solid(
                                "edge insulation",
                                thickness.value(),
                                thickness.value()
                                        / question.edgeConductivity()
                                                .orElseThrow()
                                                .value(),
                                MaterialFamily.INSULATION),
                        question.edgeDepth().orElseThrow().value()));
    }

    private static String conductivity(Reading reading) {
        return "λ " + Numbers.significant(reading.value(), 3) + " W/(m·K)";
    }

    /** The wall is hatched as its thickest layer. */
    private static MaterialFamily family(WallFootQuestion question) {
        Layer thickest = question.wall().get(0);
        for (Layer layer : question.wall()) {
            if (thickness(layer) > thickness(thickest)) {
                thickest = layer;
            }
        }
        return MaterialFamily.of(thickest.title(1) + " " + thickest.material().orElse(""));
    }

    private static double thickness(Layer layer) {
        return layer.anyThickness().map(Reading::value).orElse(0.0);
    }

    private static org.treadwarm.draw.Layer layer(Layer given, int number) {
        LayerMatter matter = LayerMatter.of(given);
        double thickness = matter.thickness().orElseThrow();
        return solid(
                given.title(number),
                thickness,
                thickness / matter.conductivity().orElseThrow(),
                MaterialFamily.of(given.title(number) + " " + given.material().orElse("")));
    }

    private static org.treadwarm.draw.Layer solid(
            String name, double thickness, double resistance, MaterialFamily family) {
        return new org.treadwarm.draw.Layer(
                name, OptionalDouble.of(thickness), resistance, family, Optional.empty(), List.of());
    }

    /** In percent. */
    private static TemperatureField field(WallFootView view) {
        double[][] percent = Arrays.stream(view.share())
                .map(row -> Arrays.stream(row).map(share -> 100 * share).toArray())
                .toArray(double[][]::new);
        return new TemperatureField(view.x(), view.depth(), percent);
    }
}
