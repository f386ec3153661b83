package flowshy.verdict.error;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.cylinder.excursion.CombinedResistance;
import flowshy.cylinder.excursion.Fluctuation;
import flowshy.cylinder.excursion.OperatingPoint;
import flowshy.cylinder.excursion.Regime;
import flowshy.hair.Profile;
import flowshy.hair.Strip;
import flowshy.response.Device;
import flowshy.stream.HeightShare;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.cover.Exposure;
import flowshy.torque.finite.LengthFactors;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Torques that the flows of a place exert on a hair: one operating point a strip, found from all sources together, and the linearised
 * law that every source is then multiplied by.
 */
final class FlowLoad {
    /** Shares of the length at which strips are cut beside the profile's own breaks, so that thin and thick layers are resolved. */
    private static final double[] CUTS = {0.01, 0.03, 0.08, 0.18, 0.35, 0.6};

    private static final int POINTS = 6;

    /** Reynolds number at which the drag law is cut. */
    private static final double DRAG_END = 2e5;

    /** Samples of a spectrum for the rms at a strip; a tenth of a per cent. */
    private static final int SAMPLES = 64;

    private final Device device;
    private final List<Exposure> exposures;
    private final List<Strip> strips;
    private final List<CombinedResistance> laws;
    private final List<double[]> means;
    private final Optional<LengthFactors> finite;

    FlowLoad(Device device, List<Source> sources) {
        this.device = device;
        this.exposures = sources.stream()
                .map(source -> new Exposure(source, device.cover(), device.around()))
                .toList();
        this.strips = strips(device.hair().profile());
        this.finite = LengthFactors.of(device.hair(), device.around(), device.pivotDepth());
        this.means = strips.stream().map(strip -> mean(strip.height())).toList();
        double[] variances =
                variances(strips.stream().mapToDouble(Strip::height).toArray());
        this.laws = new ArrayList<>();
        for (int i = 0; i < strips.size(); i++) {
            double speed = FastMath.hypot(means.get(i)[0], means.get(i)[1]);
            OperatingPoint point = new OperatingPoint(speed, FastMath.sqrt(variances[i]), fluctuation());
            checkSpeed(strips.get(i).radius(), point);
            laws.add(CombinedResistance.at(new OscillatingCylinder(strips.get(i).radius(), device.around()), point));
        }
    }

    /** The averages of the drag reach eight deviations out, and the drag law ends. */
    private void checkSpeed(double radius, OperatingPoint point) {
        double fastest = FastMath.abs(point.mean()) + 8.0 * point.deviation();
        double reynolds = fastest * 2.0 * radius / device.around().kinematicViscosity();
        if (!(reynolds < DRAG_END)) {
            throw new StreamTooFastException(reynolds);
        }
    }

    List<Exposure> exposures() {
        return exposures;
    }

    private static List<Strip> strips(Profile profile) {
        List<Double> breaks = new ArrayList<>(profile.breaks());
        for (double cut : CUTS) {
            double z = cut * profile.length();
            if (breaks.stream().noneMatch(b -> FastMath.abs(b - z) < 1e-3 * profile.length())) {
                breaks.add(z);
            }
        }
        breaks.sort(Double::compare);
        return Strip.along(profile, breaks, POINTS);
    }

    /** Mean velocity along and across the sensitive axis [m/s]. */
    private double[] mean(double height) {
        double along = 0.0;
        double across = 0.0;
        for (Exposure exposure : exposures) {
            double speed = exposure.meanSpeedAt(height);
            along += speed * cosine(exposure.source());
            across += speed * FastMath.sin(exposure.source().direction());
        }
        return new double[] {along, across};
    }

    /** Cosine of a source's direction; a right angle is exactly across. */
    static double cosine(Source source) {
        double cosine = FastMath.cos(source.direction());
        return FastMath.abs(cosine) < 1e-12 ? 0.0 : cosine;
    }

    /**
     * Operating point of all sources together at any height.
     *
     * @param height above the wall [m]
     * @return mean speed and rms there
     */
    OperatingPoint pointAt(double height) {
        double[] mean = mean(height);
        double[] variance = variances(new double[] {height});
        return new OperatingPoint(FastMath.hypot(mean[0], mean[1]), FastMath.sqrt(variance[0]), fluctuation());
    }

    private double[] variances(double[] heights) {
        double[] variances = new double[heights.length];
        for (Exposure exposure : exposures) {
            Source source = exposure.source();
            List<Double> grid = samples(source);
            for (int n = 0; n < grid.size(); n++) {
                double frequency = grid.get(n);
                double from = grid.get(FastMath.max(0, n - 1));
                double to = grid.get(FastMath.min(grid.size() - 1, n + 1));
                // trapezoids over ln f of f·S
                double meanSquare = 0.5 * FastMath.log(to / from) * frequency * source.density(frequency);
                if (meanSquare > 0.0) {
                    add(variances, heights, exposure.along(2.0 * FastMath.PI * frequency), meanSquare);
                }
            }
            for (Line line : source.lines()) {
                add(
                        variances,
                        heights,
                        exposure.along(2.0 * FastMath.PI * line.frequency()),
                        line.deviation() * line.deviation());
            }
        }
        return variances;
    }

    /** Frequencies even on a logarithmic scale over the source's support, and close beside each of its steps and corners. */
    private static List<Double> samples(Source source) {
        double low = source.support().low();
        double high = source.support().high();
        TreeSet<Double> samples = new TreeSet<>();
        for (int n = 0; n <= SAMPLES; n++) {
            samples.add(low * FastMath.pow(high / low, (double) n / SAMPLES));
        }
        for (double edge : source.breaks()) {
            samples.add(FastMath.min(high, FastMath.max(low, edge * (1.0 - 1e-9))));
            samples.add(FastMath.min(high, FastMath.max(low, edge * (1.0 + 1e-9))));
        }
        return List.copyOf(samples);
    }

    private static void add(double[] variances, double[] heights, HeightShare share, double meanSquare) {
        for (int i = 0; i < variances.length; i++) {
            double size = share.at(heights[i]).norm();
            variances[i] += size * size * meanSquare;
        }
    }

    /** A lone tone is a sinusoid; everything else counts as random. */
    private Fluctuation fluctuation() {
        boolean tone = exposures.size() == 1
                && exposures.get(0).source().lines().size() == 1
                && exposures.get(0).source().meanSpeed() == 0.0;
        return tone ? Fluctuation.SINUSOIDAL : Fluctuation.RANDOM;
    }

    /**
     * Torque of one source's fluctuation along its direction, per unit velocity of the free stream outside.
     *
     * @param exposure the source under the cover
     * @param omega [rad/s]
     * @return [N·m per m/s]
     */
    Complex along(Exposure exposure, double omega) {
        return torque(exposure.gradient(omega), exposure.along(omega), omega, true);
    }

    /**
     * Torque of its fluctuation across, as felt by a hair whose sensitive axis lies across.
     *
     * @param exposure the source under the cover
     * @param omega [rad/s]
     * @return [N·m per m/s]
     */
    Complex across(Exposure exposure, double omega) {
        return torque(exposure.gradient(omega), exposure.across(omega), omega, false);
    }

    private Complex torque(Complex gradient, HeightShare share, double omega, boolean along) {
        double real = 0.0;
        double imaginary = 0.0;
        double rho = device.around().density();
        double radius = Double.NaN;
        for (int i = 0; i < strips.size(); i++) {
            Strip strip = strips.get(i);
            radius = strip.radius();
            CombinedResistance law = laws.get(i);
            Complex gamma = along ? law.hydrodynamicFunction(omega) : law.acrossHydrodynamicFunction(omega);
            Complex force = gamma.multiply(share.at(strip.height())).add(gradient);
            double moment = strip.weight()
                    * FastMath.PI
                    * radius
                    * radius
                    * rho
                    * omega
                    * (strip.height() + device.pivotDepth());
            real -= force.getImaginary() * moment; // times iω
            imaginary += force.getReal() * moment;
        }
        Complex torque = new Complex(real, imaginary);
        return finite.map(factors -> torque.multiply(factors.at(omega).stream()))
                .orElse(torque);
    }

    /**
     * Steady torque of the mean streams about the sensitive axis.
     *
     * @return ∫ E[f] cos α ℓ dz [N·m], α the direction of the local mean; for a hair solved whole at least its creeping torque in the same
     *     streams, which the endless cylinder's law falls short of
     */
    double steadyTorque() {
        double torque = 0.0;
        for (int i = 0; i < strips.size(); i++) {
            double[] mean = means.get(i);
            double speed = FastMath.hypot(mean[0], mean[1]);
            if (speed > 0.0) {
                Strip strip = strips.get(i);
                torque += strip.weight()
                        * laws.get(i).quasiSteady().offset()
                        * (mean[0] / speed)
                        * (strip.height() + device.pivotDepth());
            }
        }
        if (finite.isEmpty() || torque == 0.0) {
            return torque;
        }
        double creeping = finite.get().creepingTorque(height -> mean(height)[0]);
        return FastMath.abs(creeping) > FastMath.abs(torque) ? creeping : torque;
    }

    /**
     * Where the flow's torque comes from at a frequency: the regime of the strip that adds most to it.
     *
     * @param exposure a source
     * @param omega [rad/s]
     * @return height and regime
     */
    Place place(Exposure exposure, double omega) {
        HeightShare share = exposure.along(omega);
        Complex gradient = exposure.gradient(omega);
        int most = 0;
        double largest = -1.0;
        for (int i = 0; i < strips.size(); i++) {
            Strip strip = strips.get(i);
            double density = strip.radius()
                    * strip.radius()
                    * (strip.height() + device.pivotDepth())
                    * laws.get(i)
                            .hydrodynamicFunction(omega)
                            .multiply(share.at(strip.height()))
                            .add(gradient)
                            .norm();
            if (density > largest) {
                largest = density;
                most = i;
            }
        }
        return new Place(strips.get(most).height(), laws.get(most).regime(omega));
    }

    /**
     * A place on the hair.
     *
     * @param height [m]
     * @param regime there
     */
    record Place(double height, Regime regime) {}

    /** The law of every strip, from wall to tip. */
    List<CombinedResistance> laws() {
        return laws;
    }
}
