/**
 * Spectra of the turbulence that a stream carries past the hair, along and across it, and what a duct makes when nothing is
 * stated. Leaves the profile over the wall to {@code stream.wall}.
 */
package flowshy.stream.turbulence;
