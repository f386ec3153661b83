/**
 * Sound at the hair: levels, band levels and the particle velocity that goes with a pressure. What the wall makes of that
 * velocity is left to {@code flowshy.stream}.
 */
package flowshy.stream.sound;
