package org.treadwarm.physics.floor;

import org.treadwarm.physics.Require;

/**
 * A heated floor parted into a peripheral strip and an occupied area: A_F q_des = A_R q_R + A_A q_A.
 *
 * <p>Source: EN 1264-3, as read in a trade journal on NBN EN 1264-3 (viewer.pmg.be/fr/fichier/ESNbe1918W00_01), which also says
 * that the strip is at most 1 m wide.
 */
public final class ZoneSplit {
    private ZoneSplit() {}

    /**
     * Flux q_A that is left for the occupied area, W/m²; negative when the strip alone gives more than the room needs.
     *
     * @param area A_F, whole heated area, m²
     * @param peripheralArea A_R, m², at least 0 and less than A_F
     * @param peripheralFlux q_R, W/m²
     * @param designFlux q_des, the room's load over A_F, W/m²
     */
    public static double occupiedFlux(double area, double peripheralArea, double peripheralFlux, double designFlux) {
        Require.positive("heated area", area);
        Require.within("peripheral area", peripheralArea, 0, Math.nextDown(area));
        return (area * designFlux - peripheralArea * peripheralFlux) / (area - peripheralArea);
    }
}
