package flowshy.verdict.tolerance;

/** What an uncertain input moves. */
public sealed interface Target {
    /**
     * Moves it.
     *
     * @param point what is being put together
     * @param deviation in units of the input's size
     */
    void move(Point point, double deviation);

    /**
     * A number of the study.
     *
     * @param index which of the numbers that vary
     * @param size of the spread: a share of the nominal value, or in the number's own SI unit
     * @param relative whether it is a share
     */
    record OfNumber(int index, double size, boolean relative) implements Target {
        @Override
        public void move(Point point, double deviation) {
            point.numbers[index] += deviation * size * (relative ? point.nominal[index] : 1.0);
        }
    }

    /**
     * Density of the medium around the hair.
     *
     * @param size relative
     */
    record OfDensity(double size) implements Target {
        @Override
        public void move(Point point, double deviation) {
            point.density *= 1.0 + deviation * size;
        }
    }

    /**
     * Viscosity of the medium around the hair.
     *
     * @param size relative
     */
    record OfViscosity(double size) implements Target {
        @Override
        public void move(Point point, double deviation) {
            point.viscosity *= 1.0 + deviation * size;
        }
    }

    /** Torque of the flow, by as much as the model is uncertain at each frequency. */
    record OfFlow() implements Target {
        @Override
        public void move(Point point, double deviation) {
            point.flow += deviation;
        }
    }

    /** One choice of all uncertain numbers. */
    final class Point {
        final double[] nominal;
        final double[] numbers;
        double density = 1.0;
        double viscosity = 1.0;
        double flow;

        Point(double[] nominal) {
            this.nominal = nominal;
            this.numbers = nominal.clone();
        }
    }
}
