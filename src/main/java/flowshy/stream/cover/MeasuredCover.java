package flowshy.stream.cover;

import flowshy.math.Caveat;
import flowshy.math.LogTable;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import flowshy.stream.WallShare;
import java.util.List;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * A cover whose attenuation was measured.
 *
 * @param file where it came from, for reports
 * @param attenuation level by which the flow at the hair lies below that outside [dB], by frequency [Hz]
 * @param phase of the flow at the hair against that outside [deg], by frequency [Hz]; empty: 0° is taken
 */
public record MeasuredCover(String file, LogTable attenuation, Optional<LogTable> phase) implements Cover {
    @Override
    public String kind() {
        return "measured";
    }

    @Override
    public String words() {
        return "measured, " + file;
    }

    /**
     * {@inheritDoc}
     *
     * @throws UnmeasuredFrequencyException outside the measured frequencies, where the nearest value would be a guess
     */
    @Override
    public Complex factor(double omega, Medium around) {
        double frequency = omega / (2.0 * FastMath.PI);
        if (!attenuation.covers(frequency)) {
            throw new UnmeasuredFrequencyException(file, attenuation.range(), frequency);
        }
        double size = FastMath.pow(10.0, -attenuation.at(frequency) / 20.0);
        double angle =
                FastMath.toRadians(phase.map(table -> table.at(frequency)).orElse(0.0));
        return new Complex(size * FastMath.cos(angle), size * FastMath.sin(angle));
    }

    /**
     * Factor at the lowest frequency that was measured, taken for a steady stream.
     *
     * @return below or equal to one where the cover attenuates [-]
     */
    public double slowest() {
        return FastMath.pow(10.0, -attenuation.values().get(0) / 20.0);
    }

    @Override
    public WallShare profile(Medium around) {
        return new StokesLayer(around.kinematicViscosity());
    }

    @Override
    public List<Caveat> assumptions(Medium around) {
        return List.of(new Caveat(
                Caveat.Subject.COVER,
                phase.isPresent() ? Caveat.Weight.NOTE : Caveat.Weight.WEAK,
                "Measured cover: the attenuation of " + file + " acts on the whole flow at the hair alike; "
                        + (phase.isPresent()
                                ? "its phase as measured."
                                : "its phase is not stated, 0 deg is taken; the motion response is uncertain by the flow response either"
                                        + " way.")));
    }
}
