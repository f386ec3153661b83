package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.math.Range;
import flowshy.stream.HeightShare;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.Stated;
import flowshy.stream.turbulence.TurbulenceSpectrum;
import flowshy.stream.turbulence.WallTurbulence;
import flowshy.stream.wall.FluctuatingLayer;
import flowshy.stream.wall.TurbulentWall;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * A mean flow over the wall and the turbulence that it carries past.
 *
 * <p>Laminar layer: the fluctuation of the layer's own equations. Turbulent layer, an estimate: the local rms is the larger of what the
 * stream brings, σ U(z)/U, and what the wall makes, u_τ min(0.4 z⁺, 2.7); what the wall adds has the wall's own spectrum. Between the
 * two the shares are mixed by the share of time that the layer is turbulent.
 */
public abstract class CarriedFlow implements Source {
    private static final double TWO_PI = 2.0 * FastMath.PI;
    /** Above this intensity turbulence is not frozen while it is carried past (common practice, no source). */
    private static final double FROZEN = 0.3;

    private final String name;
    private final double direction;
    private final Layer layer;
    private final Optional<TurbulenceSpectrum> spectrum;
    private final List<Stated> numbers;

    /**
     * @param spectrum what the stream carries; empty for a laminar duct of which nothing is known
     * @param numbers turbulence, length scale and what else may have been assumed
     */
    CarriedFlow(
            String name, double direction, Layer layer, Optional<TurbulenceSpectrum> spectrum, List<Stated> numbers) {
        this.name = name;
        this.direction = direction;
        this.layer = layer;
        this.spectrum = spectrum;
        this.numbers = List.copyOf(numbers);
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public double direction() {
        return direction;
    }

    @Override
    public double meanSpeed() {
        return layer.streamSpeed();
    }

    @Override
    public double meanSpeedAt(double height) {
        return layer.speedAt(height);
    }

    @Override
    public double density(double frequency) {
        return spectrum.map(s -> s.along(frequency)).orElse(0.0);
    }

    @Override
    public double acrossDensity(double frequency) {
        return spectrum.map(s -> s.across(frequency)).orElse(0.0);
    }

    @Override
    public HeightShare share(double omega) {
        return share(
                FluctuatingLayer.ALONG,
                omega,
                density(omega / TWO_PI),
                wall -> WallTurbulence.spectrum(wall.frictionVelocity(), wall.kinematicViscosity())
                        .along(omega / TWO_PI));
    }

    @Override
    public HeightShare acrossShare(double omega) {
        return share(
                FluctuatingLayer.ACROSS,
                omega,
                acrossDensity(omega / TWO_PI),
                wall -> WallTurbulence.spectrum(wall.frictionVelocity(), wall.kinematicViscosity())
                        .across(omega / TWO_PI));
    }

    private HeightShare share(
            FluctuatingLayer component, double omega, double density, ToDoubleFunction<TurbulentWall> ofWall) {
        double gamma = layer.intermittency();
        if (gamma == 0.0) {
            return height -> layer.laminarShare(component, height, omega);
        }
        TurbulentWall wall = layer.wall();
        double deviation = spectrum.map(TurbulenceSpectrum::deviation).orElse(0.0);
        double peak = 2.7 * wall.frictionVelocity(); // rms for which the wall's spectrum is given
        double ratio = density > 0.0 ? ofWall.applyAsDouble(wall) / (peak * peak * density) : 0.0;
        return height -> {
            double carried = FastMath.min(1.0, wall.speedAt(height) / layer.streamSpeed());
            double made =
                    component == FluctuatingLayer.ALONG ? wall.fluctuationAt(height) : wall.acrossFluctuationAt(height);
            double excess = made * made - carried * carried * deviation * deviation;
            double turbulent = FastMath.sqrt(carried * carried + FastMath.max(0.0, excess) * ratio);
            Complex laminar = gamma < 1.0 ? layer.laminarShare(component, height, omega) : Complex.ZERO;
            return laminar.multiply(1.0 - gamma).add(gamma * turbulent);
        };
    }

    @Override
    public boolean driven() {
        return false;
    }

    @Override
    public List<Line> lines() {
        return List.of();
    }

    /** From n = 1e-4, below which 4e-4 of the variance lies, to κη = 2 (a hundredth of a per cent beyond), or the wall's own if higher. */
    @Override
    public Range support() {
        String what = "frequency [Hz]";
        double speed = layer.streamSpeed();
        if (spectrum.isEmpty()) {
            return new Range(what, 1e-3, 1.0);
        }
        TurbulenceSpectrum carried = spectrum.get();
        double low = 1e-4 * speed / carried.lengthScale();
        double high = 2.0 / carried.kolmogorovLength() * speed / TWO_PI;
        if (layer.intermittency() > 0.0) {
            TurbulentWall wall = layer.wall();
            // the wall's spectrum in wall units: smallest eddies 1.8, carried at 10, hence 1.8 u_τ²/ν
            high = FastMath.max(
                    high, 1.8 * wall.frictionVelocity() * wall.frictionVelocity() / wall.kinematicViscosity());
        }
        return new Range(what, low, high);
    }

    @Override
    public List<Double> breaks() {
        return List.of();
    }

    @Override
    public List<Stated> assumed() {
        return numbers.stream().filter(Stated::assumed).toList();
    }

    @Override
    public Source varied(String key, double factor) {
        if (assumed().stream().noneMatch(number -> number.key().equals(key))) {
            throw new IllegalArgumentException(name + ": " + key + " is no assumed number of this source");
        }
        return with(numbers.stream()
                .map(number -> number.key().equals(key) ? number.times(factor) : number)
                .toList());
    }

    /** The same flow with other numbers, same keys in the same order. */
    abstract CarriedFlow with(List<Stated> changed);

    /**
     * Frequency above which viscosity has taken more than half of what the form without viscosity gives.
     *
     * @return [Hz]; empty if nothing is carried
     */
    public Optional<Double> cutOff() {
        return spectrum.map(TurbulenceSpectrum::cutOff);
    }

    /**
     * Rms of the free stream's fluctuation along.
     *
     * @return σ [m/s], zero if nothing is carried
     */
    public double deviation() {
        return spectrum.map(TurbulenceSpectrum::deviation).orElse(0.0);
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        List<Caveat> caveats = new ArrayList<>(layer.caveats(hairLength));
        spectrum.ifPresent(carried -> about(carried, hairLength, caveats));
        if (spectrum.isEmpty()) {
            add(
                    caveats,
                    Weight.NOTE,
                    "No fluctuation is stated and a laminar duct makes none; give turbulence, or a pump as a tone.");
        }
        if (layer.intermittency() > 0.0) {
            add(
                    caveats,
                    Weight.WEAK,
                    "In a turbulent layer the local fluctuation is an estimate: the larger of the stream's share and what the"
                            + " wall makes, good to about a third.");
        }
        return caveats;
    }

    private void about(TurbulenceSpectrum carried, double hairLength, List<Caveat> caveats) {
        double intensity = carried.deviation() / layer.streamSpeed();
        if (!TurbulenceSpectrum.REYNOLDS.contains(carried.reynolds())) {
            add(
                    caveats,
                    Weight.WEAK,
                    say(
                            "The turbulence has a Reynolds number of %.3g (rms speed times length scale over viscosity); its"
                                    + " spectrum is meant above %.3g.",
                            carried.reynolds(), TurbulenceSpectrum.REYNOLDS.low()));
        }
        if (intensity > FROZEN) {
            add(
                    caveats,
                    Weight.WEAK,
                    say(
                            "A turbulence of %.3g %% changes while it is carried past: the spectrum is smeared towards higher"
                                    + " frequencies by about that share.",
                            100.0 * intensity));
        }
        if (carried.lengthScale() < 5.0 * hairLength) {
            add(
                    caveats,
                    Weight.WEAK,
                    say(
                            "The length scale of %.3g mm is not large against the hair of %.3g mm: eddies no longer act on the"
                                    + " whole hair at once, the error is overstated.",
                            1e3 * carried.lengthScale(), 1e3 * hairLength));
        }
    }

    private static void add(List<Caveat> caveats, Weight weight, String text) {
        caveats.add(new Caveat(Subject.ERROR, weight, text));
    }
}
