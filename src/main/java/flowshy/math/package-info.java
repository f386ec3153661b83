/**
 * Special functions and quadrature that no library gives, and the plain statements of validity (ranges, caveats) that every
 * result carries. Knows nothing of hairs or fluids.
 */
package flowshy.math;
