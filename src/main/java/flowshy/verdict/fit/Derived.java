package flowshy.verdict.fit;

/**
 * A figure of the fitted device that follows from the fitted numbers.
 *
 * @param name e.g. {@code resonance in the medium}
 * @param key its name for programs, ends in its unit
 * @param unit printed, empty for a pure number
 * @param before of the study as it stood; NaN if it had none
 * @param value of the fitted device
 * @param uncertainty standard uncertainty by that of the fitted numbers (JCGM 100:2008, 5.2)
 */
public record Derived(String name, String key, String unit, double before, double value, double uncertainty) {}
