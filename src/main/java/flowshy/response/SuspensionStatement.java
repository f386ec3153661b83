package flowshy.response;

import flowshy.medium.Medium;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What is known of a suspension, as it was computed or measured.
 *
 * @param stiffness how the stiffness is stated; empty only if a ring-down gives it
 * @param damping how the damping is stated
 * @param plateInertia [kg·m²]
 * @param pivotDepth [m]
 * @param attitude in gravity, both when measured and when used
 * @param readoutNoise [rad/√Hz]
 */
public record SuspensionStatement(
        Optional<Stiffness> stiffness,
        Damping damping,
        double plateInertia,
        double pivotDepth,
        Attitude attitude,
        OptionalDouble readoutNoise) {
    /** @throws IllegalArgumentException if the stiffness is left out without a ring-down that has a frequency */
    public SuspensionStatement {
        if (stiffness.isEmpty()
                && !(damping instanceof RingDown ring && ring.frequency().isPresent())) {
            throw new IllegalArgumentException("a stiffness, a resonance or a ring-down with its frequency is needed");
        }
    }

    /** A way of stating the stiffness. */
    public sealed interface Stiffness permits Spring, Resonance {}

    /**
     * Stiffness itself.
     *
     * @param value S [N·m/rad]
     */
    public record Spring(double value) implements Stiffness {}

    /**
     * Frequency at which the response turns through 90°.
     *
     * @param frequency [Hz]
     * @param in what surrounded the hair, empty for vacuum
     */
    public record Resonance(double frequency, Optional<Medium> in) implements Stiffness {}

    /** A way of stating the damping. */
    public sealed interface Damping permits Dashpot, Quality, RingDown {}

    /**
     * Damping coefficient, measured at the resonance in that medium or, in vacuum, the suspension's own.
     *
     * @param value [N·m·s/rad]
     * @param in what surrounded the hair, empty for vacuum
     */
    public record Dashpot(double value, Optional<Medium> in) implements Damping {}

    /**
     * Quality factor.
     *
     * @param value Q [-]
     * @param in what surrounded the hair, empty for vacuum
     */
    public record Quality(double value, Optional<Medium> in) implements Damping {}

    /**
     * Free swing a(t) ∝ e^{−t/τ} cos(2πft).
     *
     * @param frequency f of the decaying swing [Hz], absent if only the decay is known
     * @param decayTime τ [s]
     * @param in what surrounded the hair, empty for vacuum
     */
    public record RingDown(OptionalDouble frequency, double decayTime, Optional<Medium> in) implements Damping {}
}
