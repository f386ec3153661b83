package flowshy.verdict.error;

import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.cover.Exposure;
import flowshy.verdict.Band;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;
import java.util.function.IntToDoubleFunction;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** Equivalent acceleration of every source over a band, density by frequency and lines apart. */
final class Spectrum {
    private static final double POINTS_A_DECADE = 60.0;
    private static final double TWO_PI = 2.0 * FastMath.PI;

    private final Response response;
    private final FlowLoad load;
    private final List<Double> grid;
    private final List<double[]> densities = new ArrayList<>();
    private final List<Double> noises = new ArrayList<>();
    private final List<List<Tone>> tones = new ArrayList<>();

    /**
     * A line as equivalent acceleration.
     *
     * @param frequency [Hz]
     * @param meanSquare [(m/s²)²]
     */
    record Tone(double frequency, double meanSquare) {}

    Spectrum(Response response, FlowLoad load, Band band) {
        this.response = response;
        this.load = load;
        this.grid = grid(band);
        for (double frequency : grid) {
            ResponsePoint point = response.at(frequency);
            double[] all = new double[load.exposures().size()];
            for (int i = 0; i < all.length; i++) {
                all[i] = density(load.exposures().get(i), frequency, point.motionTorque());
            }
            densities.add(all);
            double thermal = point.thermalNoise().orElse(0.0);
            double readout = point.readoutNoise().orElse(0.0);
            noises.add(thermal * thermal + readout * readout);
        }
        for (Exposure exposure : load.exposures()) {
            tones.add(lines(exposure, band));
        }
    }

    private List<Double> grid(Band band) {
        int count = 2 + (int) FastMath.ceil(POINTS_A_DECADE * FastMath.log10(band.to() / band.from()));
        TreeSet<Double> all = new TreeSet<>(band.even(FastMath.max(24, count)));
        for (Exposure exposure : load.exposures()) {
            for (double edge : exposure.source().breaks()) {
                for (double beside : new double[] {edge * (1.0 - 1e-9), edge * (1.0 + 1e-9)}) {
                    if (beside > band.from() && beside < band.to()) {
                        all.add(beside);
                    }
                }
            }
        }
        return List.copyOf(all);
    }

    /** cos²φ |T_along|² S_u + sin²φ |T_across|² S_v over |T_motion|². */
    private double density(Exposure exposure, double frequency, Complex motion) {
        Source source = exposure.source();
        if (!source.support().contains(frequency)) {
            return 0.0;
        }
        double omega = TWO_PI * frequency;
        double cosine = FlowLoad.cosine(source);
        double sine = FastMath.sin(source.direction());
        double sum = 0.0;
        double along = source.density(frequency);
        if (along > 0.0 && cosine != 0.0) {
            double torque = load.along(exposure, omega).norm();
            sum += cosine * cosine * torque * torque * along;
        }
        double across = source.acrossDensity(frequency);
        if (across > 0.0 && sine != 0.0) {
            double torque = load.across(exposure, omega).norm();
            sum += sine * sine * torque * torque * across;
        }
        return sum / (motion.norm() * motion.norm());
    }

    private List<Tone> lines(Exposure exposure, Band band) {
        List<Tone> found = new ArrayList<>();
        double cosine = FlowLoad.cosine(exposure.source());
        for (Line line : exposure.source().lines()) {
            if (line.frequency() >= band.from() && line.frequency() <= band.to()) {
                Complex motion = response.at(line.frequency()).motionTorque();
                double size = load.along(exposure, TWO_PI * line.frequency()).norm()
                        * FastMath.abs(cosine)
                        * line.deviation()
                        / motion.norm();
                found.add(new Tone(line.frequency(), size * size));
            }
        }
        return found;
    }

    List<Double> grid() {
        return grid;
    }

    double[] densities(int point) {
        return densities.get(point);
    }

    double noise(int point) {
        return noises.get(point);
    }

    /**
     * Mean square of a source between two frequencies, lines included.
     *
     * @param source index
     * @param from [Hz]
     * @param to [Hz]
     * @return [(m/s²)²]
     */
    double meanSquare(int source, double from, double to) {
        double sum = integral(point -> densities.get(point)[source], from, to);
        for (Tone tone : tones.get(source)) {
            sum += (tone.frequency() >= from && tone.frequency() < to) || tone.frequency() == to
                    ? tone.meanSquare()
                    : 0.0;
        }
        return sum;
    }

    /**
     * Mean square of the noise between two frequencies.
     *
     * @param from [Hz]
     * @param to [Hz]
     * @return [(m/s²)²]
     */
    double noiseMeanSquare(double from, double to) {
        return integral(noises::get, from, to);
    }

    /**
     * Mean square of all sources from the lower end of the band up to each point of the grid, lines included.
     *
     * @return [(m/s²)²], one a point
     */
    double[] runningMeanSquares() {
        double[] running = running(point -> Arrays.stream(densities.get(point)).sum());
        for (List<Tone> ofSource : tones) {
            for (Tone tone : ofSource) {
                for (int i = 0; i < running.length; i++) {
                    running[i] += tone.frequency() <= grid.get(i) ? tone.meanSquare() : 0.0;
                }
            }
        }
        return running;
    }

    /**
     * Mean square of the noise from the lower end of the band up to each point of the grid.
     *
     * @return [(m/s²)²], one a point
     */
    double[] runningNoiseMeanSquares() {
        return running(noises::get);
    }

    private double[] running(IntToDoubleFunction density) {
        double[] running = new double[grid.size()];
        for (int i = 1; i < running.length; i++) {
            double left = grid.get(i - 1) * density.applyAsDouble(i - 1);
            double right = grid.get(i) * density.applyAsDouble(i);
            running[i] = running[i - 1] + 0.5 * (left + right) * FastMath.log(grid.get(i) / grid.get(i - 1));
        }
        return running;
    }

    /** Trapezoids over ln f of f·S, cut at the ends; 60 points a decade leave under 1e-4. */
    private double integral(IntToDoubleFunction density, double from, double to) {
        double sum = 0.0;
        for (int i = 1; i < grid.size(); i++) {
            double low = FastMath.max(from, grid.get(i - 1));
            double high = FastMath.min(to, grid.get(i));
            if (low < high) {
                double left = grid.get(i - 1) * density.applyAsDouble(i - 1);
                double right = grid.get(i) * density.applyAsDouble(i);
                double width = FastMath.log(grid.get(i) / grid.get(i - 1));
                double a = left + (right - left) * FastMath.log(low / grid.get(i - 1)) / width;
                double b = left + (right - left) * FastMath.log(high / grid.get(i - 1)) / width;
                sum += 0.5 * (a + b) * FastMath.log(high / low);
            }
        }
        return sum;
    }
}
