package flowshy.verdict.fit;

import flowshy.response.FreeSwing;

/**
 * A free swing that was recorded on the device as it stands, in its medium and under its cover.
 *
 * @param name under which it is reported
 * @param swing frequency and decay found in the record, with their uncertainties
 */
public record MeasuredSwing(String name, FreeSwing swing) {}
