package flowshy.response;

import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.stat.regression.SimpleRegression;
import org.apache.commons.math3.transform.DftNormalization;
import org.apache.commons.math3.transform.FastFourierTransformer;
import org.apache.commons.math3.transform.TransformType;
import org.apache.commons.math3.util.FastMath;

/**
 * First guess of frequency and decay of a swing in a record.
 *
 * @param frequency of the largest line of the spectrum [Hz]
 * @param rate fall of the logarithm of the amplitude [1/s]
 */
record FreeSwingStart(double frequency, double rate) {
    private static final int LARGEST_TRANSFORM = 1 << 17;
    private static final int WINDOWS = 12;

    /** From a record without its mean; times rise. */
    static FreeSwingStart of(double[] times, double[] signal) {
        int size = Math.max(16, Math.min(LARGEST_TRANSFORM, Integer.highestOneBit(2 * times.length - 1)));
        double span = times[times.length - 1] - times[0];
        double[] even = even(times, signal, size);
        Complex[] lines = new FastFourierTransformer(DftNormalization.STANDARD).transform(even, TransformType.FORWARD);
        int largest = 1;
        for (int k = 1; k < size / 2; k++) {
            if (lines[k].abs() > lines[largest].abs()) {
                largest = k;
            }
        }
        double frequency = largest * (size - 1.0) / size / span;
        return new FreeSwingStart(frequency, rate(times, signal, frequency, Math.min(WINDOWS, largest)));
    }

    private static double[] even(double[] times, double[] signal, int size) {
        double[] even = new double[size];
        int i = 0;
        for (int k = 0; k < size; k++) {
            double t = times[0] + (times[times.length - 1] - times[0]) * k / (size - 1.0);
            while (i < times.length - 2 && times[i + 1] < t) {
                i++;
            }
            double share = (t - times[i]) / (times[i + 1] - times[i]);
            even[k] = signal[i] + Math.min(1.0, share) * (signal[i + 1] - signal[i]);
        }
        return even;
    }

    /** Slope of the logarithm of the amplitude over windows of time; weak windows are noise and left out. */
    private static double rate(double[] times, double[] signal, double frequency, int windows) {
        double span = times[times.length - 1] - times[0];
        double[] real = new double[windows];
        double[] imaginary = new double[windows];
        int[] count = new int[windows];
        for (int i = 0; i < times.length; i++) {
            int window = Math.min(windows - 1, (int) (windows * (times[i] - times[0]) / span));
            double turn = 2.0 * FastMath.PI * frequency * times[i];
            real[window] += signal[i] * FastMath.cos(turn);
            imaginary[window] += signal[i] * FastMath.sin(turn);
            count[window]++;
        }
        SimpleRegression line = new SimpleRegression();
        double strongest = 0.0;
        for (int w = 0; w < windows; w++) {
            double amplitude = FastMath.hypot(real[w], imaginary[w]) / Math.max(1, count[w]);
            strongest = Math.max(strongest, amplitude);
            if (amplitude > 0.05 * strongest) {
                line.addData((w + 0.5) * span / windows, FastMath.log(amplitude));
            }
        }
        double slope = line.getN() > 1 ? line.getSlope() : Double.NaN;
        return slope < 0.0 ? -slope : 1.0 / span;
    }
}
