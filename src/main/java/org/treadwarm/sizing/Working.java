package org.treadwarm.sizing;

import java.util.List;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Survey;

/**
 * The working of a sizing: for every number of the answer's rooms, spaces, total, assemblies and network one step, with its
 * formula and the addresses of what went in. It computes nothing.
 */
public final class Working {
    private final Plan plan;
    private final Sizing sizing;
    private final Addresses addresses;
    private final Steps steps = new Steps();

    private Working(Survey survey, Sizing sizing) {
        this.plan = Plan.of(survey);
        this.sizing = sizing;
        this.addresses = new Addresses(plan);
    }

    /**
     * The steps of a sizing, in the order of the answer.
     *
     * @param survey one that intake accepted
     * @param sizing the answer of this very survey
     */
    public static List<Step> of(Survey survey, Sizing sizing) {
        return new Working(survey, sizing).steps();
    }

    private List<Step> steps() {
        PathSteps paths = new PathSteps(plan, addresses, steps);
        BalanceSteps balances = new BalanceSteps(plan, addresses, steps);
        for (int i = 0; i < plan.rooms; i++) {
            Sizing.RoomSizing room = sizing.rooms().get(i);
            balances.room(i, room);
            paths.all(i, room.heatLoss().paths());
            if (plan.floors[i] != null) {
                floor(plan.floors[i], room.floor());
            }
        }
        for (int i = 0; i < plan.floatingNodes.length; i++) {
            Sizing.SpaceSizing space = sizing.spaces().get(i);
            balances.space(plan.floatingNodes[i], space);
            paths.all(plan.floatingNodes[i], space.paths());
        }
        new TotalSteps(plan, addresses, steps).all(sizing);
        sizing.total()
                .water()
                .ifPresent(water -> new LayoutSteps(addresses, steps).total(sizing.rooms(), plan.survey, water));
        new AssemblySteps(plan, addresses, steps).all(sizing.assemblies());
        return steps.all();
    }

    private void floor(FloorPlan floor, Sizing.FloorSizing answer) {
        HeatedFloor given = plan.survey.rooms().get(floor.room()).heatedFloor().orElseThrow();
        new FloorSteps(plan, addresses, steps, floor).all(answer);
        new BuildUpSteps(plan, addresses, steps, floor, given).all(answer);
        new BelowSteps(plan, addresses, steps, floor).all(answer);
        new LimitSteps(addresses, steps, floor, given.zone()).all(answer);
        LayoutSteps layouts = new LayoutSteps(addresses, steps);
        answer.electric()
                .ifPresent(
                        layout -> layouts.electric(floor, layout, answer.plan().isPresent()));
        answer.plan().ifPresent(found -> new PlanSteps(addresses, steps).all(floor, found));
        answer.water().ifPresent(layout -> layouts.water(floor, layout));
        answer.warmup().ifPresent(found -> layouts.warmUp(floor, plan.roomIndexes[floor.room()], found));
    }
}
