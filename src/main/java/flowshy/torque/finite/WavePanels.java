package flowshy.torque.finite;

import flowshy.math.GaussLegendre;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Gauss–Legendre panels along the wavenumber: doubling from the scale of the hair's height, then of the width that the Bessel
 * functions of the largest ring still present allow.
 *
 * @param from lower end
 * @param to upper end
 */
record WavePanels(double from, double to) {
    /** First panel in units of one over the height. */
    private static final double FIRST = 0.5;

    /** Width in units of one over the radius: the product of two Bessel functions turns by 20 in it, three times. */
    private static final double TURN = 10.0;

    private static final GaussLegendre RULE = GaussLegendre.of(8);

    static List<WavePanels> over(List<Ring> rings, double[] cutoffs) {
        double height = 0.0;
        double end = 0.0;
        for (int i = 0; i < rings.size(); i++) {
            height = FastMath.max(height, rings.get(i).top());
            end = FastMath.max(end, cutoffs[i]);
        }
        List<WavePanels> panels = new ArrayList<>();
        double from = 0.0;
        double to = FIRST / height;
        while (from < end) {
            panels.add(new WavePanels(from, to));
            double widest = 0.0;
            for (int i = 0; i < rings.size(); i++) {
                if (cutoffs[i] > to) {
                    widest = FastMath.max(widest, rings.get(i).outerRadius());
                }
            }
            from = to;
            to += FastMath.min(to, TURN / widest);
        }
        return panels;
    }

    int size() {
        return RULE.size();
    }

    Wave wave(int n, double beta) {
        double half = 0.5 * (to - from);
        return new Wave(from + half * (1.0 + RULE.point(n)), half * RULE.weight(n), beta);
    }
}
