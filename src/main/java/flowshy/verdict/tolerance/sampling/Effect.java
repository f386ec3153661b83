package flowshy.verdict.tolerance.sampling;

/**
 * What one input does to the variance of one output.
 *
 * @param first first-order index: share of the variance that would go if the input were known
 * @param total total index: share that would stay if all other inputs were known
 */
public record Effect(Interval first, Interval total) {}
