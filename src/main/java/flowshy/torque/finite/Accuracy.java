package flowshy.torque.finite;

/** How finely a whole hair is solved; each level works on two meshes, the first of them only for the error. */
public enum Accuracy {
    /** about one per cent; the better half of the time of the other */
    ONE_PER_CENT(Refinement.ROUGH, Refinement.COARSE, 2.0),
    /** one or two tenths of a per cent, thin layers on round or narrow parts half a per cent */
    FINE(Refinement.COARSE, Refinement.FINE, 4.0);

    private final Refinement first;
    private final Refinement second;
    private final double perDecade;

    Accuracy(Refinement first, Refinement second, double perDecade) {
        this.first = first;
        this.second = second;
        this.perDecade = perDecade;
    }

    Refinement first() {
        return first;
    }

    Refinement second() {
        return second;
    }

    /** Solutions a decade between which cubic curves hold. */
    double perDecade() {
        return perDecade;
    }
}
