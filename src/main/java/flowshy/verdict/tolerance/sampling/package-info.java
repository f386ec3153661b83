/**
 * What a randomised sample says about a function of uncertain numbers: percentiles, probabilities, shares of the variance, each with
 * its interval of confidence. Knows nothing of devices.
 */
package flowshy.verdict.tolerance.sampling;
