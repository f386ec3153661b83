package flowshy.verdict.tolerance;

/**
 * How much is run.
 *
 * @param samples devices tried, at most; rounded up by 6 % at most
 * @param precision when to stop before
 * @param seed of the randomisation
 */
public record Effort(int samples, Precision precision, long seed) {
    /** Least number that leaves something in every replicate. */
    public static final int LEAST = 256;

    /** Beyond this the counts of a bin could overflow. */
    public static final int MOST = 100_000_000;

    /** Enough for percentiles to some hundredths of a decibel; about a second for a cylinder. */
    public static final int USUAL = 16_384;

    /** With a stated precision and no number of samples. */
    public static final int USUAL_MOST = 1 << 20;

    /** Devices whose error by the surroundings is worked out, one in so many; each takes as long as a thousand others. */
    static final int ERROR_ONE_IN = 64;

    /** At least so many. */
    static final int ERROR_LEAST = 256;

    /** Base points of the Sobol indices at most; each takes as many trials as there are inputs, and two. */
    static final int BASE = 4096;

    /** @throws IllegalArgumentException if the number of samples is out of its range */
    public Effort {
        if (samples < LEAST || samples > MOST) {
            throw new IllegalArgumentException("samples from " + LEAST + " to " + MOST + ", not " + samples);
        }
    }

    /** Devices whose error is worked out. */
    int errorSamples() {
        return Math.max(ERROR_LEAST, samples / ERROR_ONE_IN);
    }

    /** Points of the indices. */
    int base() {
        return Math.min(BASE, samples / 4);
    }
}
