package flowshy.response;

import java.util.Optional;
import org.hipparchus.complex.Complex;

/**
 * Free swing of the device.
 *
 * @param quality quality factor: |s|/(−2 Re s) of the complex root s, or |S|/(ωR) at the resonance if overdamped; infinite without
 *     any damping
 * @param root complex frequency s [1/s], empty if overdamped or without damping
 */
public record Decay(double quality, Optional<Complex> root) {
    /**
     * Whether the device creeps back without swinging, or nearly so (quality 0.55 or less).
     *
     * @return true if overdamped
     */
    public boolean overdamped() {
        return root.isEmpty() && Double.isFinite(quality);
    }
}
