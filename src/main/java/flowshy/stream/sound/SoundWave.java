package flowshy.stream.sound;

import flowshy.math.Positive;
import org.hipparchus.util.FastMath;

/**
 * Particle velocity that goes with a sound pressure.
 *
 * <p>Plane progressive wave: u = p/(ρc). At a distance r from a small source: u = p/(ρc) √(1 + 1/(kr)²), k = ω/c. Textbook acoustics
 * (Kinsler and Frey, from memory). No standing wave: near a reflecting wall the velocity may be anything between none and
 * twice this.
 *
 * @param density ρ [kg/m³]
 * @param soundSpeed c [m/s]
 * @param distance r to the source [m]; infinite for a plane wave
 */
public record SoundWave(double density, double soundSpeed, double distance) {
    /** @throws IllegalArgumentException if a value is not positive, or density or sound speed not finite */
    public SoundWave {
        Positive.check("density [kg/m3]", density);
        Positive.check("sound speed [m/s]", soundSpeed);
        if (!(distance > 0.0)) {
            throw new IllegalArgumentException("distance to the source must be positive, was " + distance + " m");
        }
    }

    /**
     * A wave from far away.
     *
     * @param density ρ [kg/m³]
     * @param soundSpeed c [m/s]
     * @return the plane wave
     */
    public static SoundWave plane(double density, double soundSpeed) {
        return new SoundWave(density, soundSpeed, Double.POSITIVE_INFINITY);
    }

    /**
     * Velocity over pressure.
     *
     * @param frequency f &gt; 0 [Hz]
     * @return |u|/|p| [m/s/Pa]
     */
    public double velocityPerPressure(double frequency) {
        double kr = 2.0 * FastMath.PI * frequency / soundSpeed * distance;
        return FastMath.sqrt(1.0 + 1.0 / (kr * kr)) / (density * soundSpeed);
    }
}
