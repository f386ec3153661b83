/**
 * Torque of medium and inertia about the pivot of a hair, per unit acceleration. Leaves the suspension, and so the
 * movement, to {@code response}.
 */
package flowshy.torque;
