package flowshy.verdict.map;

/** What is mapped: a number over a plane, line by line. Asked by several threads at once, each with lines of its own. */
@FunctionalInterface
public interface Surface {
    /**
     * The surface along one line across.
     *
     * @param down value of the second number, in SI
     * @return asked by one thread only
     */
    Line line(double down);

    /** The surface along one line. */
    @FunctionalInterface
    interface Line {
        /**
         * What is found at a place.
         *
         * @param across value of the first number, in SI
         * @return the number, or why there is none
         */
        Spot at(double across);
    }
}
