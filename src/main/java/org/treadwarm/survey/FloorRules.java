package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.physics.water.PropyleneGlycol;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** What must hold for the heated floor of a room. */
final class FloorRules {
    private final Findings findings;
    private final OtherSides otherSides;
    private final GroundRules ground;

    FloorRules(Findings findings, OtherSides otherSides, GroundRules ground) {
        this.findings = findings;
        this.otherSides = otherSides;
        this.ground = ground;
    }

    void check(Place at, Room room, HeatedFloor floor) {
        boolean judged = findings.clean(at, "/ground") && findings.clean(at, "/to");
        if (floor.ground().isPresent() == floor.to().isPresent() && judged) {
            findings.add(
                    at.pointer(),
                    floor.to().isPresent() ? "ground and to" : "neither ground nor to",
                    "a heated floor lies either on the ground or over something",
                    "exactly one of ground and to");
        }
        floor.ground().ifPresent(slab -> ground.floor(at.at("/ground"), slab));
        floor.to().ifPresent(to -> {
            if (to.equals(Survey.GROUND)) {
                findings.add(
                        at,
                        "/to",
                        to,
                        "a heated floor on the ground is described by \"ground\"",
                        "outdoors, or the name of a space or of another room");
            } else {
                otherSides.check(at, to, room.name(), true);
            }
        });
        layers(at, floor);
        heater(at, floor);
        floor.plan()
                .ifPresent(plan -> new PlanRules(findings).check(at.at("/plan").pointer(), plan));
        new PartRules(findings, at, floor).check();
    }

    private void layers(Place at, HeatedFloor floor) {
        LayerRules layers = new LayerRules(findings);
        layers.layers(at.at("/above"), floor.above());
        layers.layers(at.at("/below"), floor.below());
        for (int i = 0; i < floor.above().size(); i++) {
            if (floor.above().get(i).bridging().isPresent()) {
                findings.add(
                        at.item("/above", i),
                        "/bridging",
                        "framing",
                        "layers above the heater cannot be crossed by framing",
                        "leave it out");
            }
        }
    }

    private void heater(Place at, HeatedFloor floor) {
        floor.heater()
                .filter(heater -> findings.clean(at, "/heater/kind"))
                .ifPresent(heater -> heater(at.at("/heater"), heater));
    }

    private void heater(Place at, Heater heater) {
        if (heater.kind() == HeaterKind.WATER) {
            notHis(at, "/density", heater.density(), "only an electric heater has an installed density");
            notHis(at, "/linearPower", heater.linearPower(), "only an electric heater has a power per metre");
            notHis(at, "/voltage", heater.voltage(), "only an electric heater has a voltage");
            if (!heater.mats().isEmpty()) {
                findings.add(at, "/mats", words(heater.mats()), "only an electric heater has mats", "leave them out");
            }
            heater.glycol().ifPresent(share -> mixture(at.at("/glycol"), share));
        } else {
            notHis(at, "/wallThickness", heater.wallThickness(), "only a pipe has a wall");
            notHis(at, "/wallConductivity", heater.wallConductivity(), "only a pipe has a wall");
            notHis(at, "/supplyTemperature", heater.supplyTemperature(), "only warm water has a supply temperature");
            notHis(at, "/spread", heater.spread(), "only warm water has a spread");
            notHis(at, "/feederLength", heater.feederLength(), "only warm water has feeders");
            mats(at, heater);
            notHis(at, "/manifoldDrop", heater.manifoldDrop(), "only warm water comes from a manifold");
            notHis(at, "/glycol", heater.glycol(), "only warm water may hold glycol");
            heater.manifold()
                    .ifPresent(name -> findings.add(
                            at, "/manifold", name, "only warm water comes from a manifold", "leave it out"));
        }
        sizes(at, heater);
    }

    private void mats(Place at, Heater heater) {
        if (heater.mats().size() > Heater.MOST_MATS) {
            findings.add(
                    at,
                    "/mats",
                    words(heater.mats()),
                    "a list of so many kinds of mats has too many combinations",
                    "at most " + Heater.MOST_MATS);
        }
        if (!heater.mats().isEmpty() && heater.voltage().isEmpty()) {
            findings.missing(at, "/voltage", "the power of mats is told at a voltage", "the voltage they are made for");
        }
    }

    private static String words(List<HeatingMat> mats) {
        return mats.size() == 1 ? "1 mat" : mats.size() + " mats";
    }

    private void mixture(Place at, Reading share) {
        if (share.value() > 0 && share.value() < PropyleneGlycol.WEAKEST) {
            findings.add(
                    at.pointer(),
                    share.typed(),
                    "so weak a mixture is not described",
                    "0 for water alone, or 15 to 57 %");
        }
    }

    private void notHis(Place at, String below, Optional<Reading> reading, String message) {
        reading.ifPresent(given -> findings.add(at, below, given.typed(), message, "leave it out"));
    }

    private void sizes(Place at, Heater heater) {
        boolean water = heater.kind() == HeaterKind.WATER;
        double diameter = heater.outsideDiameter();
        if (water && 2 * value(heater.wallThickness(), Heater.WALL_THICKNESS) >= diameter) {
            findings.add(
                    at,
                    heater.wallThickness().isPresent() ? "/wallThickness" : "/diameter",
                    heater.wallThickness()
                            .or(heater::diameter)
                            .map(Reading::typed)
                            .orElse(""),
                    "the pipe's wall leaves no room for the water",
                    "a wall of less than half the diameter");
        }
        heater.spacing()
                .filter(spacing -> spacing.value() <= diameter)
                .ifPresent(spacing -> findings.add(
                        at,
                        "/spacing",
                        spacing.typed(),
                        "the cables or pipes would lie inside one another",
                        "more than the outside diameter of " + Numbers.significant(diameter * 1000, 3) + " mm"));
    }

    private static double value(Optional<Reading> reading, double otherwise) {
        return reading.map(Reading::value).orElse(otherwise);
    }
}
