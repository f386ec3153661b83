package flowshy.verdict.tolerance;

import org.hipparchus.special.Erf;
import org.hipparchus.util.FastMath;

/** How an uncertain number is spread about its nominal value. */
public enum Shape {
    /** normal law; the size is the standard deviation */
    NORMAL("sd") {
        @Override
        double deviate(double uniform) {
            return FastMath.sqrt(2.0) * Erf.erfInv(2.0 * uniform - 1.0);
        }
    },
    /** evenly spread to both sides; the size is half the width */
    UNIFORM("within") {
        @Override
        double deviate(double uniform) {
            return 2.0 * uniform - 1.0;
        }
    };

    private final String word;

    Shape(String word) {
        this.word = word;
    }

    /**
     * The word a study uses.
     *
     * @return sd or within
     */
    public String word() {
        return word;
    }

    /**
     * Deviation in units of the size.
     *
     * @param uniform between 0 and 1
     * @return [-]
     */
    abstract double deviate(double uniform);
}
