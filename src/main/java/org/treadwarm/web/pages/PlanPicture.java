package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.draw.FixedUnit;
import org.treadwarm.draw.FloorPlanDrawing;
import org.treadwarm.draw.FloorPlanStrip;
import org.treadwarm.draw.HeaterRuns;
import org.treadwarm.draw.Sheet;
import org.treadwarm.sizing.Sizing.ElectricLayout;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.WaterLayout;
import org.treadwarm.survey.FixedPart;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.HeaterKind;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.RoomPlan;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** From the plan of a room's floor and the layout of its heater to a drawing. */
final class PlanPicture {
    /** What cables keep from walls and units, m: 50 to 100 mm, read on a trade page. */
    private static final double CABLE_CLEARANCE = 0.05;

    /** What pipes keep from walls and units, m: read in a trade design guide. */
    private static final double PIPE_CLEARANCE = 0.15;

    private PlanPicture() {}

    /** The floor in plan; empty without a plan, and where it cannot be drawn. */
    static Optional<String> of(Room room, RoomSizing answer, Sheet sheet) {
        Optional<HeatedFloor> floor = room.heatedFloor();
        try {
            return floor.flatMap(HeatedFloor::plan)
                    .map(plan -> FloorPlanDrawing.draw(sheet, strip(plan, floor.orElseThrow(), answer)));
        } catch (IllegalArgumentException beyondAnyDrawing) {
            return Optional.empty();
        }
    }

    private static FloorPlanStrip strip(RoomPlan plan, HeatedFloor floor, RoomSizing answer) {
        List<FixedUnit> units = new ArrayList<>();
        for (int i = 0; i < plan.fixed().size(); i++) {
            units.add(unit(plan, plan.fixed().get(i), i + 1));
        }
        return new FloorPlanStrip(
                answer.name(),
                plan.width().value(),
                plan.length().value(),
                OptionalDouble.of(floor.area().value()),
                units,
                floor.parts().isEmpty() ? runs(floor.heater(), answer.floor()) : inParts(floor),
                Optional.empty(),
                floor.parts().isEmpty() ? loops(answer.floor()) : 1,
                Optional.empty());
    }

    /** The survey measures from the lower wall to the lower side, the drawing from the upper wall to the upper side. */
    private static FixedUnit unit(RoomPlan plan, FixedPart part, int number) {
        double fromLower = part.y().value() + part.length().value();
        // At the wall the sum of two readings may miss it by a rounding.
        double fromUpper = Math.max(0, plan.length().value() - fromLower);
        return new FixedUnit(
                part.title(number),
                part.x().value(),
                fromUpper,
                part.width().value(),
                part.length().value());
    }

    private static HeaterRuns runs(Optional<Heater> heater, FloorSizing floor) {
        boolean water = heater.map(given -> given.kind() == HeaterKind.WATER).orElse(false);
        if (water) {
            double diameter =
                    heater.flatMap(Heater::diameter).map(Reading::value).orElse(Heater.PIPE_DIAMETER);
            String words = "Pipe " + Numbers.significant(1000 * diameter, 3) + " mm";
            return new HeaterRuns(words, spacing(heater), PIPE_CLEARANCE);
        }
        boolean mats = floor.electric().flatMap(ElectricLayout::mats).isPresent();
        return mats
                ? new HeaterRuns("Heating mats", OptionalDouble.empty(), CABLE_CLEARANCE)
                : new HeaterRuns(heater.isPresent() ? "Heating cable" : "Heater", spacing(heater), CABLE_CLEARANCE);
    }

    /** Where each part lies in the room is not told, so its runs are not drawn. */
    private static HeaterRuns inParts(HeatedFloor floor) {
        boolean water =
                floor.heater().map(given -> given.kind() == HeaterKind.WATER).orElse(false);
        return new HeaterRuns(
                (water ? "Pipe" : "Heating cable") + ", " + floor.parts().size() + " parts with spacings of their own",
                OptionalDouble.empty(),
                water ? PIPE_CLEARANCE : CABLE_CLEARANCE);
    }

    private static OptionalDouble spacing(Optional<Heater> heater) {
        return heater.flatMap(Heater::spacing)
                .map(given -> OptionalDouble.of(given.value()))
                .orElse(OptionalDouble.empty());
    }

    private static int loops(FloorSizing floor) {
        int elements = floor.electric().map(layout -> layout.elements().size()).orElse(1);
        return floor.water().map(WaterLayout::loops).orElse(Math.max(1, elements));
    }
}
