package flowshy.torque.finite;

import flowshy.math.BesselJ01;
import flowshy.math.GaussLegendre;

/**
 * How the wall takes part in the hair's turning: inside the foot's radius it moves with the hair, over the gap its motion
 * falls evenly to nothing. Without a gap the torque would grow without end, as the logarithm.
 *
 * @param radius of the foot, zero for a body clear of the wall
 * @param gap width of the slot round it, positive
 */
record FootSlot(double radius, double gap) {
    private static final GaussLegendre RULE = GaussLegendre.of(24);

    /** Turns of the Bessel functions over the gap that the rule still follows; beyond, the transforms are below 1e-4. */
    private static final double FOLLOWED = 40.0;

    static final FootSlot NONE = new FootSlot(0.0, 1.0);

    /** Hankel transforms of the slope p(r), as ∫ p J₀ r dr and ∫ p J₁ r² dr. */
    void transforms(double kappa, double[] out) {
        out[0] = 0.0;
        out[1] = 0.0;
        if (radius == 0.0 || kappa * gap > FOLLOWED) {
            return;
        }
        double[] pair = new double[2];
        for (int n = 0; n < RULE.size(); n++) {
            double r = radius + 0.5 * gap * (1.0 + RULE.point(n));
            BesselJ01.at(kappa * r, pair);
            double share = 0.5 * RULE.weight(n) / kappa;
            out[0] += share * r * pair[1];
            out[1] += share * r * r * second(kappa * r, pair);
        }
    }

    private static double second(double x, double[] pair) {
        double y = 0.25 * x * x;
        return x < 0.1 ? y * (0.5 - y * (1.0 / 6.0 - y * (1.0 / 48.0))) : 2.0 * pair[1] / x - pair[0];
    }
}
