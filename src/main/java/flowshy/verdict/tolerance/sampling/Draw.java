package flowshy.verdict.tolerance.sampling;

/**
 * What one trial gave.
 *
 * @param values one an output, same order in every trial; not a finite number where there is none
 * @param events one an event, true where it happened
 */
@SuppressWarnings("ArrayRecordComponent") // lives between a trial and its sums, a hundred thousand times in a run
public record Draw(double[] values, boolean[] events) {
    /**
     * The same without the first values.
     *
     * @param first how many are left out
     * @return the rest of the values, the same events
     */
    public Draw from(int first) {
        return new Draw(java.util.Arrays.copyOfRange(values, first, values.length), events);
    }
}
