package flowshy.verdict.error;

import static flowshy.math.Figures.say;

/** The flow at the hair is beyond the drag law; the user can mend the surroundings or the hair. */
public final class StreamTooFastException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * States how far beyond.
     *
     * @param reynolds of the fastest moments, mean and eight standard deviations together [-]
     */
    public StreamTooFastException(double reynolds) {
        super(say(
                "at its fastest the flow has a Reynolds number of %.3g on the hair's diameter; the drag law ends at 200000."
                        + " State slower surroundings or a thinner hair.",
                reynolds));
    }
}
