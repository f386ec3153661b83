package flowshy.torque.finite;

/** How finely a whole hair is solved; each level works on two meshes, the first of them only for the error. */
public enum Accuracy {
    /** better than one per cent; a third of the time of the other */
    ONE_PER_CENT(2.0),
    /** one or two tenths of a per cent, thin layers on round or narrow parts half a per cent */
    FINE(4.0);

    private final double perDecade;

    Accuracy(double perDecade) {
        this.perDecade = perDecade;
    }

    Refinement first() {
        return this == FINE ? Refinement.COARSE : Refinement.ROUGH;
    }

    Refinement second() {
        return this == FINE ? Refinement.FINE : Refinement.COARSE;
    }

    /** Solutions a decade between which cubic curves hold. */
    double perDecade() {
        return perDecade;
    }
}
