/**
 * The undisturbed flow where the hair stands: profiles over the wall, and what a cover makes of the flow outside. Leaves the
 * force that the flow exerts to {@code cylinder}.
 */
package flowshy.stream;
