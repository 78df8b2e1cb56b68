package org.treadwarm.sizing;

import static java.util.OptionalDouble.empty;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.treadwarm.physics.envelope.CombinedMethod;
import org.treadwarm.physics.moisture.SurfaceTemperature;
import org.treadwarm.physics.moisture.WaterVapour;
import org.treadwarm.sizing.Sizing.LayerSizing;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Place;
import org.treadwarm.tables.Films;
import org.treadwarm.units.Reading;

/**
 * One assembly under given temperatures: its resistance, its U-value, the temperature at every interface, and how near its
 * inside surface comes to mould and dew.
 *
 * <p>Interface temperatures go through the layers' mean resistances (isothermal planes, ISO 6946:2017, 6.7.2.4, from memory);
 * beside framing the true temperatures differ.
 *
 * @param side outdoors or indoors
 * @param insideFilm Rsi, m²·K/W
 * @param outsideFilm film of the other side, m²·K/W
 * @param layers resistance of each layer and of the framing through it
 * @param upperLimit R', m²·K/W
 * @param lowerLimit R'', m²·K/W
 * @param largestRelativeError of the combined method, as a fraction
 * @param resistance total R, m²·K/W
 * @param uValue W/(m²·K)
 * @param indoorTemperature degrees Celsius
 * @param outdoorTemperature of the other side, degrees Celsius
 * @param interfaces temperatures from the inside surface through every interface to the other surface
 * @param temperatureFactor f_Rsi with Rsi 0.25
 * @param dewPoint of the indoor air, degrees Celsius
 * @param relativeHumidity indoors, as a fraction
 */
public record AssemblyEvaluation(
        String side,
        double insideFilm,
        double outsideFilm,
        List<LayerSizing> layers,
        OptionalDouble upperLimit,
        OptionalDouble lowerLimit,
        OptionalDouble largestRelativeError,
        double resistance,
        double uValue,
        double indoorTemperature,
        double outdoorTemperature,
        List<Interface> interfaces,
        double temperatureFactor,
        double dewPoint,
        double relativeHumidity) {
    /** A plane between two layers, or a surface. */
    public record Interface(String name, double temperature) {}

    /** The conditions to look at an assembly under: degrees Celsius, and the relative humidity indoors (more than 0, to 1). */
    public record Conditions(boolean outdoors, double indoor, double outdoor, double relativeHumidity) {}

    /** Evaluates an assembly that intake accepted. */
    public static AssemblyEvaluation of(Assembly assembly, Conditions conditions) {
        String direction = assembly.heatFlow().word();
        double inside = assembly.insideCoefficient()
                .map(coefficient -> 1 / coefficient.value())
                .orElse(Films.inside(direction));
        double outside = conditions.outdoors()
                ? assembly.outsideCoefficient()
                        .map(coefficient -> 1 / coefficient.value())
                        .orElse(Films.outside(direction))
                : inside;
        return assembly.uValue()
                .map(Reading::value)
                .map(uValue -> ofUValue(uValue, inside, outside, conditions))
                .orElseGet(() -> ofLayers(assembly, inside, outside, conditions));
    }

    private static AssemblyEvaluation ofUValue(double uValue, double inside, double outside, Conditions conditions) {
        double resistance = 1 / uValue;
        double core = Math.max(0, resistance - inside - outside);
        return new AssemblyEvaluation(
                side(conditions),
                inside,
                outside,
                List.of(),
                empty(),
                empty(),
                empty(),
                resistance,
                uValue,
                conditions.indoor(),
                conditions.outdoor(),
                interfaces(List.of("component"), new double[] {core}, inside, outside, conditions),
                SurfaceTemperature.factorOfPlaneElement(resistance - inside + SurfaceTemperature.MOULD_FILM),
                WaterVapour.dewPoint(conditions.indoor(), conditions.relativeHumidity()),
                conditions.relativeHumidity());
    }

    private static AssemblyEvaluation ofLayers(
            Assembly assembly, double inside, double outside, Conditions conditions) {
        Inputs inputs = new Inputs();
        StackBuilder builder = new StackBuilder(inputs);
        builder.add(
                Place.ROOT.at("/layers"), assembly.layers(), assembly.heatFlow().heatFlow());
        Stack stack = builder.all().get(0);
        double[] in = inputs.values();
        double[] layer = new double[stack.layers];
        double[] framing = new double[stack.layers];
        Stack.Frames scratch = new Stack.Frames();
        stack.evaluate(in, layer, framing);
        double upper = stack.upperLimit(inside + outside, in, layer, framing, scratch);
        double lower = stack.lowerLimit(inside + outside, in, layer, framing);
        double resistance = CombinedMethod.total(upper, lower);
        double mould = stack.total(SurfaceTemperature.MOULD_FILM + outside, in, layer, framing, scratch);
        List<LayerSizing> layers = new ArrayList<>();
        List<String> names = new ArrayList<>();
        double[] mean = new double[stack.layers];
        for (int i = 0; i < stack.layers; i++) {
            boolean framed = stack.frame[i] != Stack.NONE;
            names.add(assembly.layers().get(i).title(i + 1));
            layers.add(new LayerSizing(names.get(i), layer[i], framed ? OptionalDouble.of(framing[i]) : empty()));
            mean[i] = framed ? CombinedMethod.sideBySide(in[stack.share[i]], layer[i], framing[i]) : layer[i];
        }
        return new AssemblyEvaluation(
                side(conditions),
                inside,
                outside,
                List.copyOf(layers),
                OptionalDouble.of(upper),
                OptionalDouble.of(lower),
                OptionalDouble.of(CombinedMethod.largestRelativeError(upper, lower)),
                resistance,
                1 / resistance,
                conditions.indoor(),
                conditions.outdoor(),
                interfaces(names, mean, inside, outside, conditions),
                SurfaceTemperature.factorOfPlaneElement(mould),
                WaterVapour.dewPoint(conditions.indoor(), conditions.relativeHumidity()),
                conditions.relativeHumidity());
    }

    private static String side(Conditions conditions) {
        return conditions.outdoors() ? "outdoors" : "indoors";
    }

    private static List<Interface> interfaces(
            List<String> names, double[] layers, double inside, double outside, Conditions conditions) {
        double total = inside + outside;
        for (double layer : layers) {
            total += layer;
        }
        double drop = conditions.indoor() - conditions.outdoor();
        double passed = inside;
        List<Interface> interfaces = new ArrayList<>();
        interfaces.add(new Interface("inside surface", conditions.indoor() - drop * passed / total));
        for (int i = 0; i < layers.length; i++) {
            passed += layers[i];
            String name = i + 1 < layers.length
                    ? names.get(i) + " | " + names.get(i + 1)
                    : conditions.outdoors() ? "outside surface" : "far surface";
            interfaces.add(new Interface(name, conditions.indoor() - drop * passed / total));
        }
        return List.copyOf(interfaces);
    }
}
