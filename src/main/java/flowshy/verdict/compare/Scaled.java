package flowshy.verdict.compare;

import flowshy.verdict.BandsQuestion;
import flowshy.verdict.figure.Figure;

/**
 * What was done to make a device equal.
 *
 * @param figure the quantity that is equal now
 * @param what was changed, in words
 * @param from its number before, for people
 * @param to its number after, for people
 * @param ratio after over before [-]
 * @param before the quantity before, SI
 * @param after the quantity after, worked out anew on the scaled device, SI
 * @param question about the scaled device
 */
public record Scaled(
        Figure figure,
        String what,
        String from,
        String to,
        double ratio,
        double before,
        double after,
        BandsQuestion question) {}
