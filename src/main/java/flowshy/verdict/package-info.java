/**
 * What is decided: the bands in which a device reads motion or flow, and the limits a study asks for. Leaves asking to
 * {@code study} and telling to {@code report}.
 */
package flowshy.verdict;
