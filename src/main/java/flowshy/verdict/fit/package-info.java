/**
 * A device fitted to what was measured on it: which stiffness, damping, gain, density or size explains the data, how sure that is, and
 * whether model and measurement then agree. What was measured is read elsewhere; nothing here knows files.
 */
package flowshy.verdict.fit;
