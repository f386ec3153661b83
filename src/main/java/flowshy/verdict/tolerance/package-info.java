/**
 * How sure a verdict is: what tolerances of the device, the model's own uncertainty and that of the medium's properties make of it. The
 * statistics stand in {@code sampling}.
 */
package flowshy.verdict.tolerance;
