/**
 * Named quantities of a device, one table for all that ask for one by name: limits, comparisons, maps, sizing, tolerances. Leaves the
 * physics to {@code response} and {@code verdict}, and each asks only for what it needs.
 */
package flowshy.verdict.figure;
