package org.treadwarm.reference;

import java.util.List;

/**
 * A floor of plain layers over parallel cables, by cosine series. The heat of a row of lines a spacing T apart is a mean and the waves
 * cos(2 pi n x / T); each wave passes the layers by itself. Outside a cable whose heat is made evenly in its round, the field is that
 * of a line in its axis, since the mean of a harmonic function over a circle is its value at the centre.
 */
public final class CosineFloor {
    private static final int WAVES = 4000;

    private final double spacing;
    private final List<Slab> above;
    private final List<Slab> below;
    private final double filmAbove;
    private final double filmBelow;

    /** A layer: with a thickness in m and a conductivity in W/(m·K), or with a resistance in m²·K/W alone. */
    public record Slab(double thickness, double conductivity, double resistance) {}

    /** W/m² upward, and degrees Celsius of the surface over the cable, between two cables, and of the cable's skin, its mean. */
    public record Found(double upward, double over, double between, double skin) {}

    /**
     * A floor.
     *
     * @param spacing of the cables, m
     * @param above layers from the axis of the cables up; the first holds the upper half of the cable
     * @param below layers from the axis of the cables down; the first is of the same material
     * @param filmAbove W/(m²·K)
     * @param filmBelow W/(m²·K)
     */
    public CosineFloor(double spacing, List<Slab> above, List<Slab> below, double filmAbove, double filmBelow) {
        this.spacing = spacing;
        this.above = above;
        this.below = below;
        this.filmAbove = filmAbove;
        this.filmBelow = filmBelow;
    }

    /**
     * The floor with so much heat.
     *
     * @param heat of a cable, W/m
     * @param radius of a cable, m
     * @param room degrees Celsius
     * @param under degrees Celsius
     */
    public Found with(double heat, double radius, double room, double under) {
        double up = resistance(above, filmAbove, 0);
        double down = resistance(below, filmBelow, 0);
        double plane = (heat / spacing + room / up + under / down) / (1 / up + 1 / down);
        double upward = (plane - room) / up;
        double mean = room + upward / filmAbove;
        double over = mean;
        double between = mean;
        double conductivity = above.get(0).conductivity();
        double skin = plane - heat / (2 * Math.PI * conductivity) * Math.log(2 * Math.PI * radius / spacing);
        for (int n = 1; n <= WAVES; n++) {
            double wave = 2 * Math.PI * n / spacing;
            double amplitude = 2
                    * heat
                    / spacing
                    / (1 / resistance(above, filmAbove, wave) + 1 / resistance(below, filmBelow, wave));
            double surface = amplitude * passed(above, filmAbove, wave);
            over += surface;
            between += n % 2 == 0 ? surface : -surface;
            skin += amplitude - heat / spacing / (conductivity * wave);
        }
        return new Found(upward, over, between, skin);
    }

    /** Temperature over flux of a wave at the inner face of layers, towards a film. */
    private static double resistance(List<Slab> layers, double film, double wave) {
        double found = 1 / film;
        for (int i = layers.size() - 1; i >= 0; i--) {
            found = through(layers.get(i), found, wave);
        }
        return found;
    }

    private static double through(Slab slab, double beyond, double wave) {
        if (slab.thickness() == 0) {
            return beyond + slab.resistance();
        }
        if (wave == 0) {
            return beyond + slab.thickness() / slab.conductivity();
        }
        double own = slab.conductivity() * wave;
        double tangent = Math.tanh(wave * slab.thickness());
        return (beyond + tangent / own) / (1 + own * beyond * tangent);
    }

    /** The share of a wave's temperature that is left at the outermost face. */
    private static double passed(List<Slab> layers, double film, double wave) {
        double share = 1;
        double beyond = 1 / film;
        for (int i = layers.size() - 1; i >= 0; i--) {
            Slab slab = layers.get(i);
            if (slab.thickness() == 0) {
                share *= beyond / (beyond + slab.resistance());
            } else {
                double angle = wave * slab.thickness();
                share /= Math.cosh(angle) + Math.sinh(angle) / (slab.conductivity() * wave * beyond);
            }
            beyond = through(slab, beyond, wave);
        }
        return share;
    }
}
