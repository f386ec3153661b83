package flowshy.stream.sound;

import flowshy.medium.Phase;
import java.util.Locale;
import org.hipparchus.util.FastMath;

/**
 * Sound pressure level, 20 lg(p/p₀), p the rms pressure. Reference p₀: 20 µPa in gas, 1 µPa in liquid (ISO 1683); the same pressure
 * differs by 26.02 dB between the two.
 */
public enum SoundLevel {
    /** re 20 µPa */
    IN_GAS(20e-6),
    /** re 1 µPa */
    IN_LIQUID(1e-6);

    private final double reference;

    SoundLevel(double reference) {
        this.reference = reference;
    }

    /**
     * The reference that is usual in a phase; a medium of unstated phase is taken for a gas up to 50 kg/m³, since no gas at common
     * pressures is denser and no liquid lighter.
     *
     * @param phase of the medium
     * @param density ρ [kg/m³]
     * @return the reference
     */
    public static SoundLevel usualIn(Phase phase, double density) {
        boolean liquid = phase == Phase.LIQUID || (phase == Phase.UNSTATED && density > 50.0);
        return liquid ? IN_LIQUID : IN_GAS;
    }

    /**
     * Reference pressure.
     *
     * @return p₀ [Pa]
     */
    public double reference() {
        return reference;
    }

    /**
     * Pressure of a level.
     *
     * @param level [dB]
     * @return rms pressure [Pa]
     */
    public double pressure(double level) {
        return reference * FastMath.pow(10.0, level / 20.0);
    }

    /**
     * Level of a pressure.
     *
     * @param pressure rms, positive [Pa]
     * @return [dB]
     */
    public double level(double pressure) {
        return 20.0 * FastMath.log10(pressure / reference);
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "dB re %.0f uPa", reference * 1e6);
    }
}
