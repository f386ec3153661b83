/**
 * What is around the device, put together from the laws: streams, ducts, tones, sound, measured spectra; named starting values and
 * defaults with their sources. Leaves the force on the hair to {@code cylinder} and its error to {@code verdict}.
 */
package flowshy.stream.surroundings;
