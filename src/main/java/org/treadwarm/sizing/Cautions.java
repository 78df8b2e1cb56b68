package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.treadwarm.sizing.Sizing.Caution;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.HeaterKind;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.Zone;

/** What can hurt somebody around a heated floor. Local codes and licensed practice decide; these only remind. */
final class Cautions {
    private static final String PRACTICE = "common practice, no source; local codes decide";

    private static final Caution ELECTRICIAN = new Caution(
            "licensed-electrician",
            "Electric shock and fire: connection and testing by a licensed electrician, on a circuit with a residual-current"
                    + " device (RCD or GFCI, at most 30 mA); insulation resistance is measured before and after covering.",
            "BS 7671, section 753 (from memory); local codes decide");
    private static final Caution SENSOR = new Caution(
            "floor-sensor",
            "Burns and damaged covering: a floor sensor and a limit thermostat hold the surface below its limit; a steady-state"
                    + " sizing does not replace them.",
            PRACTICE);
    private static final Caution WATER = new Caution(
            "water-limit",
            "Scalding and damaged covering: the supply has a mixing valve and a safety limit; pressure-test before covering.",
            PRACTICE);
    private static final Caution GLYCOL = new Caution(
            "glycol-maker",
            "Corrosion, leaks and frost: kind and share of glycol and its inhibitors are decided by the makers of boiler, pipes and"
                    + " seals; too weak a mixture corrodes, and the frost it stands is measured, not computed.",
            PRACTICE);
    private static final Caution FURNITURE = new Caution(
            "no-covered-heater",
            "Fire and overheating: no heater under fixed furniture, baths or cupboards, none across expansion joints; rugs and"
                    + " mattresses trap heat.",
            PRACTICE);
    private static final Caution COVERING = new Caution(
            "covering-maker",
            "The maker of the covering and of its glue states the highest temperature and resistance; that figure decides.",
            PRACTICE);
    private static final Caution LOAD = new Caution(
            "floor-load",
            "Screed and tile weigh 20 kg/m2 and more per 10 mm: a structural engineer clears the load on suspended and timber floors.",
            PRACTICE);
    private static final Caution FROST = new Caution(
            "frost",
            "Frost: a house that is switched off or loses power in winter can freeze its pipes; keep frost protection on.",
            PRACTICE);
    private static final Caution DAMP = new Caution(
            "damp",
            "Damp and mould grow where inside surfaces stay cold, above all at corners and openings; insulate and air before you heat harder.",
            "ISO 13788 (from memory)");
    private static final Caution DRAUGHT = new Caution(
            "cold-draught",
            "Tall cold glazing drops a cold draught that a warm floor does not stop; place heat below it.",
            PRACTICE);
    private static final Caution WET_ROOM = new Caution(
            "wet-room",
            "Wet room: zones, earthed grid over the heater and protection class are set by the local code.",
            "IEC 60364-7-701 (from memory); local codes decide");

    private Cautions() {}

    static List<Caution> of(Room room, Survey survey) {
        List<Caution> cautions = new ArrayList<>();
        Optional<HeatedFloor> floor = room.heatedFloor();
        if (floor.isPresent()) {
            Optional<HeaterKind> kind = floor.get().heater().map(Heater::kind);
            if (kind.isEmpty() || kind.get() == HeaterKind.ELECTRIC) {
                cautions.add(ELECTRICIAN);
                cautions.add(SENSOR);
            }
            if (kind.isEmpty() || kind.get() == HeaterKind.WATER) {
                cautions.add(WATER);
            }
            if (floor.get()
                    .heater()
                    .flatMap(Heater::glycol)
                    .filter(share -> share.value() > 0)
                    .isPresent()) {
                cautions.add(GLYCOL);
            }
            if (floor.get().zone() == Zone.BATHROOM) {
                cautions.add(WET_ROOM);
            }
            cautions.add(FURNITURE);
            cautions.add(COVERING);
            cautions.add(LOAD);
            cautions.add(FROST);
        }
        if (room.surfaces().stream().anyMatch(surface -> !surface.openings().isEmpty())) {
            cautions.add(DRAUGHT);
        }
        cautions.add(DAMP);
        return List.copyOf(cautions);
    }
}
