package org.treadwarm.physics.section;

/** What heats a floor: parallel pipes or cables in one of its layers. */
public sealed interface FloorHeater {
    /** Which layer it lies in; the topmost one is 0. */
    int layer();

    /** Of its axis below the top face of that layer, m. */
    double depth();

    /** Outside, m. */
    double diameter();

    /**
     * The same heater with another drive.
     *
     * @param drive water temperature of a pipe, degrees Celsius; heat of a cable, W per metre
     */
    FloorHeater driven(double drive);

    /**
     * A pipe with warm water.
     *
     * @param wallThickness m, more than 0 and less than the radius
     * @param wallConductivity W/(m·K), more than 0
     * @param insideCoefficient from the water to the wall, W/(m²·K) of inside area, more than 0
     * @param water temperature, degrees Celsius
     */
    record WaterPipe(
            int layer,
            double depth,
            double diameter,
            double wallThickness,
            double wallConductivity,
            double insideCoefficient,
            double water)
            implements FloorHeater {
        public WaterPipe {
            at(0, 0, diameter, wallThickness, wallConductivity, insideCoefficient, water);
        }

        /** The pipe at a place of a section. */
        Section.Pipe at(double x, double y) {
            return at(x, y, diameter, wallThickness, wallConductivity, insideCoefficient, water);
        }

        private static Section.Pipe at(
                double x,
                double y,
                double diameter,
                double wall,
                double conductivity,
                double coefficient,
                double water) {
            return new Section.Pipe(x, y, diameter / 2, wall, conductivity, coefficient, water);
        }

        @Override
        public WaterPipe driven(double drive) {
            return new WaterPipe(layer, depth, diameter, wallThickness, wallConductivity, insideCoefficient, drive);
        }
    }

    /**
     * A heating cable.
     *
     * @param heat W per metre of cable
     */
    record HeatingCable(int layer, double depth, double diameter, double heat) implements FloorHeater {
        public HeatingCable {
            Require.positive("diameter of a cable, m", diameter);
            Require.finite("heat of a cable, W/m", heat);
        }

        @Override
        public HeatingCable driven(double drive) {
            return new HeatingCable(layer, depth, diameter, drive);
        }
    }
}
