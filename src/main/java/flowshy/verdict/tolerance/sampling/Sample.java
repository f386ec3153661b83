package flowshy.verdict.tolerance.sampling;

import java.util.List;

/**
 * What a run has found.
 *
 * @param replicates independent randomisations
 * @param size points of each
 * @param outputs one an output of the trial, same order
 * @param events probability of each event of the trial, same order
 */
public record Sample(int replicates, int size, List<Output> outputs, List<Interval> events) {
    /** Copies the lists. */
    public Sample {
        outputs = List.copyOf(outputs);
        events = List.copyOf(events);
    }

    /**
     * Trials in all.
     *
     * @return replicates times size
     */
    public int trials() {
        return replicates * size;
    }
}
