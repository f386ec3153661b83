/**
 * The standing hair as a solid: its profile, mass, moments and first bending frequency. Leaves the forces of the medium to
 * {@code cylinder} and {@code torque}.
 */
package flowshy.hair;
