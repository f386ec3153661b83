package flowshy.verdict.tolerance.sampling;

/** A function of uncertain numbers; several threads may ask it at once. */
@FunctionalInterface
public interface Trial {
    /**
     * One trial.
     *
     * @param uniform one number between 0 and 1 an input, never 0 or 1
     * @return what came out
     */
    Draw at(double[] uniform);
}
