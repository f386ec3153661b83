package flowshy.verdict.fit;

/**
 * A number that was fitted.
 *
 * @param freed which
 * @param value best value, in the unit of the freed number; of a gain negative where the readout turns the sense round
 * @param uncertainty standard uncertainty
 * @param low lower end of the 95 % interval, by Student's t
 * @param high upper end
 * @param bound whether it stands at a bound, so that the interval means little
 */
public record Estimate(Freed freed, double value, double uncertainty, double low, double high, boolean bound) {}
