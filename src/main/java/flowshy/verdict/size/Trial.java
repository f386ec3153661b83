package flowshy.verdict.size;

import java.util.List;

/**
 * What a choice of numbers gives.
 *
 * @param objective the figure to be made least or largest, finite
 * @param found the limited figures, one a constraint, same order; may be infinite, not NaN
 * @param reason why the numbers make no device; empty where they do
 */
public record Trial(double objective, List<Double> found, String reason) {
    /** @throws IllegalArgumentException if numbers are missing where there is a device */
    public Trial {
        found = List.copyOf(found);
        if (reason.isEmpty() && (!Double.isFinite(objective) || found.stream().anyMatch(x -> x.isNaN()))) {
            throw new IllegalArgumentException("undefined without a reason: " + objective + ", " + found);
        }
    }

    /**
     * A device with its figures.
     *
     * @param objective finite
     * @param found one a constraint
     * @return the trial
     */
    public static Trial of(double objective, List<Double> found) {
        return new Trial(objective, found, "");
    }

    /**
     * No device.
     *
     * @param reason why, a short clause
     * @return the trial
     */
    public static Trial none(String reason) {
        return new Trial(Double.NaN, List.of(), reason);
    }

    /**
     * Whether there is a device.
     *
     * @return false where there is a reason instead
     */
    public boolean there() {
        return reason.isEmpty();
    }
}
