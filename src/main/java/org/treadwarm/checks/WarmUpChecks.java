package org.treadwarm.checks;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.treadwarm.physics.warmup.Accuracy;
import org.treadwarm.physics.warmup.BuildUp;
import org.treadwarm.physics.warmup.Film;
import org.treadwarm.physics.warmup.FloorLayer;
import org.treadwarm.physics.warmup.LumpedLayer;
import org.treadwarm.physics.warmup.Moment;
import org.treadwarm.physics.warmup.PlaneWall;
import org.treadwarm.physics.warmup.Room;
import org.treadwarm.physics.warmup.SemiInfiniteSolid;
import org.treadwarm.physics.warmup.Underside;
import org.treadwarm.physics.warmup.WarmUp;

/** Warming up: closed forms, and a floor with its room over a day. */
final class WarmUpChecks {
    /** The downward flux of the first half hour is a ten-thousandth of the heat put in; it needs the fine grid. */
    private static final Accuracy FINE = new Accuracy(1e-6, 8);

    private static final double HOUR = 3600;

    private WarmUpChecks() {}

    static Map<String, Computation> bindings() {
        return Map.of(
                "semi-*", WarmUpChecks::semiInfinite,
                "wall-Bi-*", WarmUpChecks::planeWall,
                "lumped-1", WarmUpChecks::lumped,
                "warmup-electric-1", WarmUpChecks::warmUp,
                "warmup-electric-1-steady", WarmUpChecks::steady);
    }

    private static Map<String, DoubleStream> semiInfinite(Inputs given) {
        SemiInfiniteSolid solid = new SemiInfiniteSolid(given.number("k"), given.number("alpha"));
        double depth = given.number("x");
        double seconds = given.number("t");
        return Map.of(
                "const_flux_dT", DoubleStream.of(solid.riseUnderFlux(depth, seconds, given.number("q"))),
                "conv_theta", DoubleStream.of(solid.shareBehindFilm(depth, seconds, given.number("h"))),
                "const_T_theta", DoubleStream.of(solid.shareOfFace(depth, seconds)));
    }

    private static Map<String, DoubleStream> planeWall(Inputs given) {
        PlaneWall wall = new PlaneWall(given.number("Bi"));
        return Map.of(
                "zeta", IntStream.range(0, 3).mapToDouble(wall::root),
                "C", IntStream.range(0, 3).mapToDouble(wall::root).map(PlaneWall::factor),
                "theta_centre", given.numbers("Fo").map(fourier -> wall.share(0, fourier)),
                "theta_face", given.numbers("Fo").map(fourier -> wall.share(1, fourier)),
                "Q_fraction", given.numbers("Fo").map(wall::heatGivenOff));
    }

    private static Map<String, DoubleStream> lumped(Inputs given) {
        LumpedLayer layer =
                new LumpedLayer(given.number("thickness") * given.number("rho") * given.number("c"), given.number("h"));
        return Map.of(
                "tau_s", DoubleStream.of(layer.timeConstant()),
                "dT_cooling_1h", DoubleStream.of(layer.left(given.number("dT0"), HOUR)),
                "dT_heating_1h", DoubleStream.of(layer.rise(given.number("q"), HOUR)));
    }

    private static Map<String, DoubleStream> warmUp(Inputs given) {
        WarmUp warmUp = floor(given);
        List<Moment> moments = given.numbers("t_s")
                .mapToObj(seconds -> warmUp.curve(
                                warmUp.uniform(given.number("T0")), given.number("heat_W_m2"), seconds, 1, () -> false)
                        .moments()
                        .get(1))
                .toList();
        return Map.of(
                "T_floor", each(moments, Moment::surface),
                "T_air", each(moments, Moment::air),
                "T_mass", each(moments, Moment::mass),
                "q_up", each(moments, Moment::upwardFlux),
                "q_dn", each(moments, Moment::downwardFlux));
    }

    private static DoubleStream each(List<Moment> moments, ToDoubleFunction<Moment> number) {
        return moments.stream().mapToDouble(number);
    }

    private static Map<String, DoubleStream> steady(Inputs given) {
        WarmUp warmUp = floor(given);
        Moment moment = warmUp.moment(warmUp.steady(given.number("heat_W_m2")));
        double[] constants = warmUp.timeConstants(2);
        return Map.of(
                "T_air", DoubleStream.of(moment.air()),
                "T_mass", DoubleStream.of(moment.mass()),
                "T_floor", DoubleStream.of(moment.surface()),
                "slowest_tau_h", DoubleStream.of(constants[0] / HOUR),
                "second_tau_h", DoubleStream.of(constants[1] / HOUR));
    }

    private static WarmUp floor(Inputs given) {
        List<FloorLayer> fromBelow = new ArrayList<>();
        given.groups("layers_bottom_to_top")
                .forEach(layer -> fromBelow.add(new FloorLayer.Massive(
                        layer.number("d"), layer.number("k"), layer.number("rho"), layer.number("c"))));
        int heated = (int) given.number("heated_layer_from_below") - 1;
        Inputs room = given.group("room_per_m2");
        return new WarmUp(
                new BuildUp(
                        downward(fromBelow.subList(heated, fromBelow.size())),
                        downward(fromBelow.subList(0, heated)),
                        new Film.Constant(given.number("h_up")),
                        new Underside.Exchange(given.number("h_dn"), given.number("T_below"))),
                new Room(
                        room.number("C_air"),
                        room.number("C_mass"),
                        room.number("H_am"),
                        room.number("H_out"),
                        room.number("T_out"),
                        0),
                FINE);
    }

    private static List<FloorLayer> downward(List<FloorLayer> fromBelow) {
        List<FloorLayer> downward = new ArrayList<>(fromBelow);
        Collections.reverse(downward);
        return downward;
    }
}
