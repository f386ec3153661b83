package flowshy.verdict.compare;

import flowshy.verdict.BandsQuestion;
import flowshy.verdict.figure.Figure;

/**
 * What was done to make a device equal.
 *
 * @param figure the quantity that is equal now
 * @param what is changed, in words, or the path of a key
 * @param change what was done, for people
 * @param ratio of the number changed, after over before [-]
 * @param before the quantity before, SI
 * @param after the quantity after, worked out anew on the scaled device, SI
 * @param question about the scaled device
 */
public record Scaled(
        Figure figure, String what, String change, double ratio, double before, double after, BandsQuestion question) {}
