/**
 * How the medium's force is spread along a hair, solved whole and strip by strip. Leaves what the device makes of its torque to other
 * questions.
 */
package flowshy.verdict.force;
