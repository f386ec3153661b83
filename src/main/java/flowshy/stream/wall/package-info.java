/**
 * What a wall does to a stream: laminar and turbulent layers over a plate, transition between them, friction, ducts and channels.
 * Each law gives velocities as a share of the stream or in m/s; spectra are left to {@code stream.turbulence}.
 */
package flowshy.stream.wall;
