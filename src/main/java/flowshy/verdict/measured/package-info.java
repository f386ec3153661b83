/**
 * What was measured on a device beside what the model says of it: deviation point by point, and whether both agree within their
 * uncertainties. Nothing is fitted here but one common factor, where the gain of the readout is not known.
 */
package flowshy.verdict.measured;
