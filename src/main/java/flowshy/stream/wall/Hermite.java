package flowshy.stream.wall;

/** Cubic through two values and two slopes. */
final class Hermite {
    private Hermite() {}

    /**
     * Value inside one cell.
     *
     * @param t place in the cell, 0 at the left end, 1 at the right
     * @param width of the cell, in the unit of the slopes' denominator
     */
    static double between(double t, double width, double left, double right, double leftSlope, double rightSlope) {
        double u = 1.0 - t;
        return u * u * ((1.0 + 2.0 * t) * left + t * width * leftSlope)
                + t * t * ((3.0 - 2.0 * t) * right - u * width * rightSlope);
    }
}
