/**
 * What a cover makes of the flow outside: the channel under a roof, holes and a cavity, a measured attenuation. Each law says what it
 * assumes. Leaves the force on the hair to {@code cylinder} and {@code torque}.
 */
package flowshy.stream.cover;
