package flowshy.verdict.fit;

/** The data do not tell the free parameters apart; the caller knows their names and says so. */
final class DegenerateException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final double[] direction;

    DegenerateException(double[] direction) {
        super("the data do not tell the parameters apart");
        this.direction = direction.clone();
    }

    /** How the parameters may change together without changing what is predicted; one share a parameter, squares sum to one. */
    double[] direction() {
        return direction.clone();
    }
}
