package org.treadwarm.physics.section;

/**
 * What a wall foot loses per metre and kelvin between inside and outside, and the parts its psi value is made of.
 *
 * @param coupling L2D, W/(m·K)
 * @param slabCoefficient of the slab with its ground, computed in section without the wall, W/(m²·K)
 * @param wallCoefficient of the wall, W/(m²·K)
 * @param halfWidth of floor in the section, m
 * @param wallHeight of wall in the section, inside, m
 * @param accuracy of the coupling
 */
public record WallFootCoupling(
        double coupling,
        double slabCoefficient,
        double wallCoefficient,
        double halfWidth,
        double wallHeight,
        Accuracy accuracy) {
    /** Psi for internal dimensions with the slab coefficient computed in section, W/(m·K). */
    public double psi() {
        return psi(slabCoefficient);
    }

    /**
     * Psi for internal dimensions: L2D less floor and wall, W/(m·K) (ISO 10211:2017, 10.4, from memory).
     *
     * @param slab the slab coefficient that the loss of the floor is computed with, W/(m²·K)
     */
    public double psi(double slab) {
        return psi(slab, wallHeight);
    }

    /**
     * The same where the loss of the wall is computed with less of it than the section holds.
     *
     * @param slab the slab coefficient that the loss of the floor is computed with, W/(m²·K)
     * @param height of wall whose loss is computed with its own coefficient, m
     */
    public double psi(double slab, double height) {
        return coupling - slab * halfWidth - wallCoefficient * height;
    }
}
