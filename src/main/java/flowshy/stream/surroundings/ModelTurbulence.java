package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.math.Range;
import flowshy.stream.turbulence.TurbulenceSpectrum;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * Turbulence by its model spectrum.
 *
 * @param spectrum of the free stream
 * @param speed that carries it past [m/s]
 */
record ModelTurbulence(TurbulenceSpectrum spectrum, double speed) implements Turbulence {
    /** Above this intensity turbulence is not frozen while it is carried past (common practice, no source). */
    private static final double FROZEN = 0.3;

    @Override
    public double along(double frequency) {
        return spectrum.along(frequency);
    }

    @Override
    public double across(double frequency) {
        return spectrum.across(frequency);
    }

    @Override
    public double deviation() {
        return spectrum.deviation();
    }

    /** From n = 1e-4, below which 4e-4 of the variance lies, to κη = 2, beyond which a hundredth of a per cent. */
    @Override
    public Range support() {
        double low = 1e-4 * speed / spectrum.lengthScale();
        double high = 2.0 / spectrum.kolmogorovLength() * speed / (2.0 * FastMath.PI);
        return new Range("frequency [Hz]", low, FastMath.max(high, 10.0 * low));
    }

    @Override
    public List<Double> breaks() {
        return List.of();
    }

    @Override
    public Optional<Double> cutOff() {
        return Optional.of(spectrum.cutOff());
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        List<Caveat> caveats = new ArrayList<>();
        if (!TurbulenceSpectrum.REYNOLDS.contains(spectrum.reynolds())) {
            caveats.add(weak(say(
                    "The turbulence has a Reynolds number of %.3g (rms speed times length scale over viscosity); its"
                            + " spectrum is meant above %.3g.",
                    spectrum.reynolds(), TurbulenceSpectrum.REYNOLDS.low())));
        }
        double intensity = spectrum.deviation() / speed;
        if (intensity > FROZEN) {
            caveats.add(weak(say(
                    "A turbulence of %.3g %% changes while it is carried past: the spectrum is smeared towards higher"
                            + " frequencies by about that share.",
                    100.0 * intensity)));
        }
        if (spectrum.lengthScale() < 5.0 * hairLength) {
            caveats.add(weak(say(
                    "The length scale of %.3g mm is not large against the hair of %.3g mm: eddies no longer act on the"
                            + " whole hair at once, the error is overstated.",
                    1e3 * spectrum.lengthScale(), 1e3 * hairLength)));
        }
        return caveats;
    }

    private static Caveat weak(String text) {
        return new Caveat(Subject.ERROR, Weight.WEAK, text);
    }
}
