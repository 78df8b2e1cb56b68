package org.treadwarm.physics.warmup;

/**
 * A solid without end, at one temperature until something happens at its face: closed forms to hold the numerical solution
 * against, and for estimates by hand. Source: H. S. Carslaw, J. C. Jaeger, Conduction of Heat in Solids, 2.4, 2.7 and 2.9 (from
 * memory).
 *
 * @param conductivity W/(m·K), more than 0
 * @param diffusivity m²/s, more than 0
 */
public record SemiInfiniteSolid(double conductivity, double diffusivity) {
    /** Throws IllegalArgumentException when a number is not finite and more than 0. */
    public SemiInfiniteSolid {
        Require.positive("conductivity", conductivity);
        Require.positive("diffusivity", diffusivity);
    }

    /** Rise at a depth (m) and a time (s, more than 0) after a flux of so many W/m² began, K. */
    public double riseUnderFlux(double depth, double seconds, double flux) {
        double length = length(depth, seconds);
        double argument = depth / (2 * length);
        return flux
                / conductivity
                * (2 * length / Math.sqrt(Math.PI) * Math.exp(-argument * argument)
                        - depth * ErrorFunction.complement(argument));
    }

    /**
     * Share of the step that has arrived at a depth at a time after a fluid beyond a film of so many W/(m²·K) became warmer.
     */
    public double shareBehindFilm(double depth, double seconds, double coefficient) {
        Require.positive("coefficient", coefficient);
        double length = length(depth, seconds);
        double argument = depth / (2 * length);
        double film = argument + coefficient * length / conductivity;
        // exp(h x/k + h² a t/k²) erfc(film) = exp(-argument²) erfcx(film), which does not overflow.
        return Math.exp(-argument * argument)
                * (ErrorFunction.scaledComplement(argument) - ErrorFunction.scaledComplement(film));
    }

    /** Share of the step that has arrived at a depth at a time after the face itself became warmer. */
    public double shareOfFace(double depth, double seconds) {
        return ErrorFunction.complement(depth / (2 * length(depth, seconds)));
    }

    /** How far heat spreads, sqrt(a t), m. */
    private double length(double depth, double seconds) {
        Require.atLeastZero("depth", depth);
        Require.positive("time", seconds);
        return Math.sqrt(diffusivity * seconds);
    }
}
