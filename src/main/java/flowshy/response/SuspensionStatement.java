package flowshy.response;

import flowshy.medium.Medium;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
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
 * @param film film under the plate, whose share of what was measured is then not the suspension's own
 */
public record SuspensionStatement(
        Optional<Stiffness> stiffness,
        Damping damping,
        double plateInertia,
        double pivotDepth,
        Attitude attitude,
        OptionalDouble readoutNoise,
        Optional<TiltingPlateFilm> film) {
    /** @throws IllegalArgumentException if the stiffness is left out without a ring-down that has a frequency */
    public SuspensionStatement {
        if (stiffness.isEmpty()
                && !(damping instanceof RingDown ring && ring.frequency().isPresent())) {
            throw new IllegalArgumentException("a stiffness, a resonance or a ring-down with its frequency is needed");
        }
    }

    /**
     * A statement without a film.
     *
     * @param stiffness how the stiffness is stated
     * @param damping how the damping is stated
     * @param plateInertia [kg·m²]
     * @param pivotDepth [m]
     * @param attitude in gravity
     * @param readoutNoise [rad/√Hz]
     */
    public SuspensionStatement(
            Optional<Stiffness> stiffness,
            Damping damping,
            double plateInertia,
            double pivotDepth,
            Attitude attitude,
            OptionalDouble readoutNoise) {
        this(stiffness, damping, plateInertia, pivotDepth, attitude, readoutNoise, Optional.empty());
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
     * @param under the cover that stood over it, whose wall may have confined the fluid
     */
    public record Resonance(double frequency, Optional<Medium> in, Cover under) implements Stiffness {
        /**
         * Measured without a cover.
         *
         * @param frequency [Hz]
         * @param in what surrounded the hair, empty for vacuum
         */
        public Resonance(double frequency, Optional<Medium> in) {
            this(frequency, in, Covers.OPEN);
        }
    }

    /** A way of stating the damping. */
    public sealed interface Damping permits Dashpot, Quality, RingDown {}

    /**
     * Damping coefficient, measured at the resonance in that medium or, in vacuum, the suspension's own.
     *
     * @param value [N·m·s/rad]
     * @param in what surrounded the hair, empty for vacuum
     * @param under the cover that stood over it, whose wall may have confined the fluid
     */
    public record Dashpot(double value, Optional<Medium> in, Cover under) implements Damping {
        /**
         * Measured without a cover.
         *
         * @param value [N·m·s/rad]
         * @param in what surrounded the hair, empty for vacuum
         */
        public Dashpot(double value, Optional<Medium> in) {
            this(value, in, Covers.OPEN);
        }
    }

    /**
     * Quality factor.
     *
     * @param value Q [-]
     * @param in what surrounded the hair, empty for vacuum
     * @param under the cover that stood over it, whose wall may have confined the fluid
     */
    public record Quality(double value, Optional<Medium> in, Cover under) implements Damping {
        /**
         * Measured without a cover.
         *
         * @param value Q [-]
         * @param in what surrounded the hair, empty for vacuum
         */
        public Quality(double value, Optional<Medium> in) {
            this(value, in, Covers.OPEN);
        }
    }

    /**
     * Free swing a(t) ∝ e^{−t/τ} cos(2πft).
     *
     * @param frequency f of the decaying swing [Hz], absent if only the decay is known
     * @param decayTime τ [s]
     * @param in what surrounded the hair, empty for vacuum
     * @param under the cover that stood over it, whose wall may have confined the fluid
     */
    public record RingDown(OptionalDouble frequency, double decayTime, Optional<Medium> in, Cover under)
            implements Damping {
        /**
         * Measured without a cover.
         *
         * @param frequency f of the decaying swing [Hz], absent if only the decay is known
         * @param decayTime τ [s]
         * @param in what surrounded the hair, empty for vacuum
         */
        public RingDown(OptionalDouble frequency, double decayTime, Optional<Medium> in) {
            this(frequency, decayTime, in, Covers.OPEN);
        }
    }
}
