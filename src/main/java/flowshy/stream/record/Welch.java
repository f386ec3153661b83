package flowshy.stream.record;

import flowshy.math.StepDensity;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.transform.DftNormalization;
import org.apache.commons.math3.transform.FastFourierTransformer;
import org.apache.commons.math3.transform.TransformType;
import org.apache.commons.math3.util.FastMath;

/**
 * One-sided density of a record by averaging modified periodograms.
 *
 * <p>Segments of a power of two, each half over the next, the record's mean taken off, Hann's window w;
 * G_k = 2 |Σ w x e^{−2πikn/N}|² / (f_s Σ w²), averaged; Σ G Δf is the mean square under the windows. Source: Welch 1967, IEEE Trans. Audio
 * Electroacoust. 15:70 (from memory). The line at zero frequency, which holds the rest of the mean, is left out.
 */
final class Welch {
    /** With fewer averages a line is known to no better than a third. */
    private static final int WANTED_AVERAGES = 8;

    static final int FEWEST_SAMPLES = 64;
    private static final int SHORTEST = 16;

    private final Averaging averaging;
    private final double[] density;

    /**
     * The density of a record.
     *
     * @param samples the signal, {@value #FEWEST_SAMPLES} or more
     * @param rate samples per second [Hz]
     * @param segment samples in a segment, a power of two, not above the length of the record
     */
    Welch(double[] samples, double rate, int segment) {
        int half = segment / 2;
        int averages = (samples.length - segment) / half + 1;
        this.averaging = new Averaging(rate, samples.length, segment, averages);
        this.density = new double[half + 1];
        double mean = mean(samples);
        double[] window = new double[segment];
        double power = 0.0;
        for (int n = 0; n < segment; n++) {
            window[n] = 0.5 - 0.5 * FastMath.cos(2.0 * FastMath.PI * n / segment);
            power += window[n] * window[n];
        }
        FastFourierTransformer transformer = new FastFourierTransformer(DftNormalization.STANDARD);
        double[] part = new double[segment];
        for (int s = 0; s < averages; s++) {
            for (int n = 0; n < segment; n++) {
                part[n] = window[n] * (samples[s * half + n] - mean);
            }
            Complex[] lines = transformer.transform(part, TransformType.FORWARD);
            for (int k = 0; k <= half; k++) {
                double square =
                        lines[k].getReal() * lines[k].getReal() + lines[k].getImaginary() * lines[k].getImaginary();
                // the lines at zero and half the rate have no mirror image
                density[k] += (k == 0 || k == half ? 1.0 : 2.0) * square / (rate * power * averages);
            }
        }
    }

    /** Longest segment that leaves the wanted number of averages, never below sixteen samples. */
    static int usualSegment(int samples) {
        int segment = SHORTEST;
        while (2 * segment * (WANTED_AVERAGES + 1) / 2 <= samples) {
            segment *= 2;
        }
        return segment;
    }

    static double mean(double[] samples) {
        double sum = 0.0;
        for (double sample : samples) {
            sum += sample;
        }
        return sum / samples.length;
    }

    Averaging averaging() {
        return averaging;
    }

    /** Σ G Δf over all lines, that at zero included. */
    double meanSquare() {
        double sum = 0.0;
        for (double line : density) {
            sum += line * averaging.resolution();
        }
        return sum;
    }

    /**
     * The density around each line above zero, half a line's distance to both sides, so that its integral is Σ G Δf; a curve drawn
     * through the lines would lose a quarter of a narrow peak.
     */
    StepDensity density() {
        double step = averaging.resolution();
        int last = density.length - 1;
        List<StepDensity.Band> bands = new ArrayList<>();
        for (int k = 1; k <= last; k++) {
            double high = k == last ? k * step : (k + 0.5) * step;
            bands.add(new StepDensity.Band((k - 0.5) * step, high, density[k] * step));
        }
        return new StepDensity(bands, StepDensity.Inside.FLAT);
    }
}
