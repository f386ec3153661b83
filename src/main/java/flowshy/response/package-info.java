/**
 * The device: hair, suspension and surroundings together, its resonance, transfer functions and noise. Leaves the decision
 * to {@code verdict}.
 */
package flowshy.response;
