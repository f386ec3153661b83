/**
 * Does a device need a lid, how good must the lid be, and what does the lid do to the device? Covers side by side. Leaves the laws of
 * covers to {@code stream.cover}.
 */
package flowshy.verdict.lid;
