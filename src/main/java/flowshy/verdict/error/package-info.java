/**
 * What the flows that are really there do to the reading: the error of every source as equivalent acceleration, its offset, the noise
 * beside it, and the bands that follow. Leaves the flows to {@code stream} and the force law to {@code cylinder.excursion}.
 */
package flowshy.verdict.error;
