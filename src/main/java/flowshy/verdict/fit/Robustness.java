package flowshy.verdict.fit;

import java.util.Arrays;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * How much a residual far out still counts. M-estimators by iteratively reweighted least squares (Holland &amp; Welsch 1977); tuned to 95 %
 * of the efficiency of least squares on normal errors.
 */
public enum Robustness {
    /** plain least squares: every residual counts in full */
    NONE("none", "plain least squares", 1.0) {
        @Override
        double weight(double residual) {
            return 1.0;
        }

        @Override
        double slope(double residual) {
            return 1.0;
        }
    },
    /** Huber 1964: beyond 1.345 standard deviations the pull no longer grows */
    HUBER("huber", "Huber's M-estimator (1964), constant 1.345", 0.95) {
        @Override
        double weight(double residual) {
            return FastMath.abs(residual) <= HUBER_CONSTANT ? 1.0 : HUBER_CONSTANT / FastMath.abs(residual);
        }

        @Override
        double slope(double residual) {
            return FastMath.abs(residual) <= HUBER_CONSTANT ? 1.0 : 0.0;
        }
    },
    /** Beaton &amp; Tukey 1974: the pull falls to zero at 4.685 standard deviations */
    TUKEY("tukey", "Tukey's biweight (Beaton and Tukey 1974), constant 4.685", 0.95) {
        @Override
        double weight(double residual) {
            double share = residual / TUKEY_CONSTANT;
            double left = 1.0 - share * share;
            return left > 0.0 ? left * left : 0.0;
        }

        @Override
        double slope(double residual) {
            double square = residual * residual / (TUKEY_CONSTANT * TUKEY_CONSTANT);
            return square < 1.0 ? (1.0 - square) * (1.0 - 5.0 * square) : 0.0;
        }
    };

    private static final double HUBER_CONSTANT = 1.345;
    private static final double TUKEY_CONSTANT = 4.685;

    private final String word;
    private final String name;
    private final double efficiency;

    Robustness(String word, String name, double efficiency) {
        this.word = word;
        this.name = name;
        this.efficiency = efficiency;
    }

    /**
     * The word of the command line.
     *
     * @return one word
     */
    public String word() {
        return word;
    }

    /**
     * Its name with its source.
     *
     * @return a few words
     */
    public String words() {
        return name;
    }

    /**
     * By its word.
     *
     * @param word as written
     * @return empty if there is none
     */
    public static Optional<Robustness> of(String word) {
        return Arrays.stream(values()).filter(r -> r.word.equals(word)).findFirst();
    }

    /** Variance of least squares over its own, on normal errors [-]. */
    double efficiency() {
        return efficiency;
    }

    /** Weight ψ(r)/r of a residual in standard deviations. */
    abstract double weight(double residual);

    /** ψ′(r). */
    abstract double slope(double residual);
}
