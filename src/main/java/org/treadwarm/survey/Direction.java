package org.treadwarm.survey;

import org.treadwarm.physics.envelope.HeatFlow;

/** Direction of the heat flow in the document. */
public enum Direction implements Word {
    UP(HeatFlow.UP, "up (ceiling, roof)"),
    HORIZONTAL(HeatFlow.HORIZONTAL, "horizontal (wall, window)"),
    DOWN(HeatFlow.DOWN, "down (floor)");

    private final HeatFlow heatFlow;
    private final String label;

    Direction(HeatFlow heatFlow, String label) {
        this.heatFlow = heatFlow;
        this.label = label;
    }

    /** The direction as the physics takes it. */
    public HeatFlow heatFlow() {
        return heatFlow;
    }

    @Override
    public String word() {
        return heatFlow.word();
    }

    @Override
    public String label() {
        return label;
    }
}
