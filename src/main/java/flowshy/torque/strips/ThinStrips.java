package flowshy.torque.strips;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Profile;
import flowshy.hair.Strip;
import flowshy.medium.Medium;
import org.hipparchus.util.FastMath;

/** How much of a hair's viscous torque rests on parts that are thin against the mean free path, such as a pointed tip. */
public final class ThinStrips {
    /** The edge of the thin part lies between two points: with many the share is good to a per cent or so of itself. */
    private static final int FINE = 8;

    private ThinStrips() {}

    /**
     * Whether no part is thin; a map asks this of every place.
     *
     * @param profile shape of the hair
     * @param medium around it
     * @param knudsen mean free path over radius above which a part counts as thin [-]
     * @return true also if no mean free path is known
     */
    public static boolean none(Profile profile, Medium medium, double knudsen) {
        double tip = profile.radius(profile.length()); // the smallest radius passes over a point or a round end
        return medium.meanFreePath().orElse(0.0) <= knudsen * FastMath.min(profile.smallestRadius(), tip);
    }

    /**
     * Share of the thin parts in the torque of a uniform stream.
     *
     * @param profile shape of the hair
     * @param medium around it
     * @param omega angular frequency [rad/s]; thin parts weigh most at the lowest
     * @param knudsen mean free path over radius above which a part counts as thin [-]
     * @return ∫ |Γ| a² z dz over the thin parts by that over the hair [-]; zero if no mean free path is known
     */
    public static double share(Profile profile, Medium medium, double omega, double knudsen) {
        if (none(profile, medium, knudsen)) {
            return 0.0;
        }
        double thin = 0.0;
        double whole = 0.0;
        for (Strip strip : new StripMesh(profile, FINE).strips()) {
            OscillatingCylinder law = new OscillatingCylinder(strip.radius(), medium);
            double torque = strip.weight()
                    * FastMath.pow(strip.radius(), 2)
                    * strip.height()
                    * law.hydrodynamicFunction(omega).norm();
            whole += torque;
            thin += law.knudsen() > knudsen ? torque : 0.0;
        }
        return thin / whole;
    }
}
