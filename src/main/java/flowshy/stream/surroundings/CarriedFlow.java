package flowshy.stream.surroundings;

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

    private final String name;
    private final double direction;
    private final Layer layer;
    private final Optional<Turbulence> carried;
    private final List<Stated> numbers;
    private final double streamSpeed;
    private final double gamma;
    /** The wall and its own turbulence, where some of the layer is turbulent. */
    private final Optional<TurbulentWall> wall;

    private final Optional<TurbulenceSpectrum> made;

    /**
     * @param carried what the stream carries; empty for a laminar duct of which nothing is known
     * @param numbers turbulence, length scale and what else may have been assumed
     */
    CarriedFlow(String name, double direction, Layer layer, Optional<Turbulence> carried, List<Stated> numbers) {
        this.name = name;
        this.direction = direction;
        this.layer = layer;
        this.carried = carried;
        this.numbers = List.copyOf(numbers);
        this.streamSpeed = layer.streamSpeed();
        this.gamma = layer.intermittency();
        this.wall = gamma > 0.0 ? Optional.of(layer.wall()) : Optional.empty();
        this.made = wall.map(w -> WallTurbulence.spectrum(w.frictionVelocity(), w.kinematicViscosity()));
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
        return streamSpeed;
    }

    @Override
    public double meanSpeedAt(double height) {
        return layer.speedAt(height);
    }

    @Override
    public double density(double frequency) {
        return carried.map(s -> s.along(frequency)).orElse(0.0);
    }

    @Override
    public double acrossDensity(double frequency) {
        return carried.map(s -> s.across(frequency)).orElse(0.0);
    }

    @Override
    public HeightShare share(double omega) {
        double frequency = omega / TWO_PI;
        double density = density(frequency);
        double ratio = density > 0.0 ? made.map(m -> m.along(frequency)).orElse(0.0) / density : 0.0;
        return share(FluctuatingLayer.ALONG, omega, ratio);
    }

    @Override
    public HeightShare acrossShare(double omega) {
        double frequency = omega / TWO_PI;
        double density = acrossDensity(frequency);
        double ratio = density > 0.0 ? made.map(m -> m.across(frequency)).orElse(0.0) / density : 0.0;
        return share(FluctuatingLayer.ACROSS, omega, ratio);
    }

    /**
     * Share in the mixture of laminar and turbulent layer.
     *
     * @param ratio density of the wall's own turbulence at its peak rms over that of the stream
     */
    private HeightShare share(FluctuatingLayer component, double omega, double ratio) {
        if (wall.isEmpty()) {
            return height -> layer.laminarShare(component, height, omega);
        }
        TurbulentWall turbulentWall = wall.get();
        double deviation = deviation();
        double peak = made.orElseThrow().deviation();
        return height -> {
            double brought = FastMath.min(1.0, turbulentWall.speedAt(height) / streamSpeed);
            double local = component == FluctuatingLayer.ALONG
                    ? turbulentWall.fluctuationAt(height)
                    : turbulentWall.acrossFluctuationAt(height);
            double excess = local * local - brought * brought * deviation * deviation;
            double added = FastMath.max(0.0, excess) / (peak * peak) * ratio;
            double turbulent = FastMath.sqrt(brought * brought + added);
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

    /** What is carried, or the wall's own turbulence where that reaches higher. */
    @Override
    public Range support() {
        if (carried.isEmpty()) {
            return new Range("frequency [Hz]", 1e-3, 1.0);
        }
        Range outside = carried.get().support();
        if (wall.isEmpty()) {
            return outside;
        }
        // the wall's smallest eddies are 1.8 ν/u_τ and carried at 10 u_τ: κη = 2 at 1.8 u_τ²/ν
        double friction = wall.get().frictionVelocity();
        double high = 1.8 * friction * friction / wall.get().kinematicViscosity();
        return new Range(outside.name(), outside.low(), FastMath.max(outside.high(), high));
    }

    @Override
    public List<Double> breaks() {
        return carried.map(Turbulence::breaks).orElse(List.of());
    }

    /** Turbulence, length scale and what else was stated or assumed, in its order. */
    List<Stated> numbers() {
        return numbers;
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
        return carried.flatMap(Turbulence::cutOff);
    }

    /**
     * Rms of the free stream's fluctuation along.
     *
     * @return σ [m/s], zero if nothing is carried
     */
    public double deviation() {
        return carried.map(Turbulence::deviation).orElse(0.0);
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        List<Caveat> caveats = new ArrayList<>(layer.caveats(hairLength));
        carried.ifPresent(fluctuation -> caveats.addAll(fluctuation.caveats(hairLength)));
        if (carried.isEmpty()) {
            add(
                    caveats,
                    Weight.NOTE,
                    "No fluctuation is stated and a laminar duct makes none; give turbulence, or a pump as a tone.");
        }
        if (wall.isPresent()) {
            add(
                    caveats,
                    Weight.WEAK,
                    "In a turbulent layer the local fluctuation is an estimate: the larger of the stream's share and what the"
                            + " wall makes, good to about a third.");
        }
        return caveats;
    }

    private static void add(List<Caveat> caveats, Weight weight, String text) {
        caveats.add(new Caveat(Subject.ERROR, weight, text));
    }
}
