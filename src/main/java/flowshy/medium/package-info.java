/**
 * What the hair stands in: density, viscosity, sound speed and mean free path of gases and liquids at a state, each with its
 * source, range and uncertainty. Leaves the motion of the medium to {@code stream}.
 */
package flowshy.medium;
