/**
 * Force of a medium per unit length of a circular cylinder, law by law, each with its source and range. Leaves the
 * integration along a hair to {@code torque}.
 */
package flowshy.cylinder;
