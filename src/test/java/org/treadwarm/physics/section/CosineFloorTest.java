package org.treadwarm.physics.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.reference.CosineFloor;
import org.treadwarm.reference.CosineFloor.Slab;

/** Sections of random floors with cables beside the series that was written from the physics alone. */
class CosineFloorTest {
    private static final double ERROR = 0.001;

    @Test
    void aHundredFloorsAgree() {
        RandomFloors floors = new RandomFloors(4703);
        int compared = 0;
        while (compared < 100) {
            FloorSection floor = floors.next();
            if (floor.heater() instanceof HeatingCable cable && floor.above() instanceof Film above) {
                compare(floor, cable, above);
                compared++;
            }
        }
    }

    private static void compare(FloorSection floor, HeatingCable cable, Film above) {
        CosineFloor.Found expected = series(floor, cable, above)
                .with(
                        cable.heat(),
                        cable.diameter() / 2,
                        above.temperature(),
                        floor.below().temperature());
        FloorTemperatures got = floor.solve();
        double room = above.temperature();
        assertThat(got.upwardFlux()).as("%s", floor).isCloseTo(expected.upward(), within(ERROR * expected.upward()));
        assertThat(got.surfaceMaximum() - room)
                .as("over the cable, %s", floor)
                .isCloseTo(expected.over() - room, within(ERROR * (expected.over() - room)));
        assertThat(got.surfaceMinimum() - room)
                .as("between cables, %s", floor)
                .isCloseTo(expected.between() - room, within(ERROR * (expected.over() - room)));
        assertThat(got.heaterTemperature() - room)
                .as("skin, %s", floor)
                .isCloseTo(expected.skin() - room, within(ERROR * (expected.skin() - room)));
    }

    private static CosineFloor series(FloorSection floor, HeatingCable cable, Film above) {
        Solid around = (Solid) floor.layers().get(cable.layer());
        List<Slab> upward = new ArrayList<>();
        for (int i = 0; i < cable.layer(); i++) {
            upward.add(slab(floor.layers().get(i)));
        }
        upward.add(new Slab(cable.depth(), around.conductivity(), 0));
        Collections.reverse(upward);
        List<Slab> downward = new ArrayList<>();
        downward.add(new Slab(around.thickness() - cable.depth(), around.conductivity(), 0));
        for (int i = cable.layer() + 1; i < floor.layers().size(); i++) {
            downward.add(slab(floor.layers().get(i)));
        }
        return new CosineFloor(
                floor.spacing(),
                upward,
                downward,
                above.coefficient(),
                floor.below().coefficient());
    }

    private static Slab slab(FloorLayer layer) {
        return layer instanceof Solid solid
                ? new Slab(solid.thickness(), solid.conductivity(), 0)
                : new Slab(0, 0, layer.resistance());
    }
}
