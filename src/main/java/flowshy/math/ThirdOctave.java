package flowshy.math;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.hipparchus.util.FastMath;

/**
 * A third-octave band, base ten: mid-band 1000 · 10^(i/10) Hz, edges a factor 10^(±1/20) from it. Source: IEC 61260-1 (values seen
 * on two public pages).
 *
 * @param index i, 0 for the band at 1 kHz
 */
public record ThirdOctave(int index) {
    private static final double[] NOMINAL = {1.0, 1.25, 1.6, 2.0, 2.5, 3.15, 4.0, 5.0, 6.3, 8.0};

    /**
     * The band that holds a frequency; an edge belongs to the band above it.
     *
     * @param frequency [Hz]
     * @return its band
     * @throws IllegalArgumentException if the frequency is not positive and finite
     */
    public static ThirdOctave holding(double frequency) {
        if (!(frequency > 0.0) || Double.isInfinite(frequency)) {
            throw new IllegalArgumentException("frequency must be positive and finite, was " + frequency);
        }
        int index = (int) FastMath.floor(10.0 * FastMath.log10(frequency / 1000.0) + 0.5);
        if (frequency < new ThirdOctave(index).low()) {
            return new ThirdOctave(index - 1); // rounding of the logarithm at an edge
        }
        return frequency >= new ThirdOctave(index).high() ? new ThirdOctave(index + 1) : new ThirdOctave(index);
    }

    /**
     * All bands that overlap an interval, rising.
     *
     * @param low lower end [Hz]
     * @param high upper end, above {@code low} [Hz]
     * @return one band or more; the first and the last may reach beyond the interval
     */
    public static List<ThirdOctave> covering(double low, double high) {
        if (!(low < high)) {
            throw new IllegalArgumentException("interval from " + low + " to " + high + " Hz is upside down");
        }
        List<ThirdOctave> bands = new ArrayList<>();
        ThirdOctave band = holding(low);
        while (band.low() < high) {
            bands.add(band);
            band = new ThirdOctave(band.index() + 1);
        }
        return bands;
    }

    /**
     * Exact mid-band frequency.
     *
     * @return [Hz]
     */
    public double middle() {
        return 1000.0 * FastMath.pow(10.0, index / 10.0);
    }

    /**
     * Lower edge, part of the band.
     *
     * @return [Hz]
     */
    public double low() {
        return 1000.0 * FastMath.pow(10.0, (2 * index - 1) / 20.0);
    }

    /**
     * Upper edge, part of the next band.
     *
     * @return [Hz]
     */
    public double high() {
        return 1000.0 * FastMath.pow(10.0, (2 * index + 1) / 20.0);
    }

    /**
     * The rounded name of the mid-band frequency.
     *
     * @return [Hz], 1, 1.25, 1.6, 2, 2.5, 3.15, 4, 5, 6.3, 8 times a power of ten
     */
    public double nominal() {
        double power = FastMath.pow(10.0, FastMath.abs(FastMath.floorDiv(index, 10) + 3));
        double digits = NOMINAL[FastMath.floorMod(index, 10)];
        return FastMath.floorDiv(index, 10) + 3 >= 0 ? digits * power : digits / power;
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "third-octave at %.6g Hz", nominal());
    }
}
