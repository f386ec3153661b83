package flowshy.stream.cover;

import flowshy.math.Caveat;
import flowshy.medium.Medium;
import flowshy.stream.WallShare;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;

/**
 * What stands between the flow outside and the hair.
 *
 * <p>For every linear cover the torque of a shaken base is that of the fluid carried along less that of the flow:
 * T_motion = T_carried − T_flow, with T_flow = φ ρ P[1 + Γ s].
 */
public sealed interface Cover permits OpenCover, SealedCover, RoofedCover, VentedCover, MeasuredCover {
    /**
     * The word a study uses.
     *
     * @return open, sealed, roofed, vented or measured
     */
    String kind();

    /**
     * The cover in words, with its dimensions.
     *
     * @return e.g. {@code roofed, gap 1.2 mm, length 5 mm}
     */
    String words();

    /**
     * Free stream under the cover over that outside, for sound and tones, which a pressure gradient drives.
     *
     * @param omega angular frequency [rad/s]
     * @param around the medium under the cover
     * @return φ [-]
     */
    Complex factor(double omega, Medium around);

    /**
     * Flow over the wall under the cover.
     *
     * @param around the medium under the cover
     * @return profile s(z)
     */
    WallShare profile(Medium around);

    /**
     * Whether no flow enters at all, so that the fluid is carried along as a whole.
     *
     * @return true for a sealed cover
     */
    default boolean closed() {
        return false;
    }

    /**
     * Radius of the cavity around the hair, which confines the fluid that its own turning moves.
     *
     * @return b [m], absent where no wall is near
     */
    default OptionalDouble cavityRadius() {
        return OptionalDouble.empty();
    }

    /**
     * What the cover's law assumes.
     *
     * @param around the medium under the cover
     * @return caveats that stand beside every figure under this cover
     */
    List<Caveat> assumptions(Medium around);
}
