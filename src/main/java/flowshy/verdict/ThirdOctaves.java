package flowshy.verdict;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** Third-octave mid-band frequencies, base ten: 1000 Hz · 10^(x/10), x whole (IEC 61260-1). */
public final class ThirdOctaves {
    private ThirdOctaves() {}

    /**
     * Exact mid-band frequencies inside a band.
     *
     * @param band ends included, with a rounding allowance of 1e-9
     * @return frequencies [Hz], rising; the two ends of the band if no mid-band frequency lies inside
     */
    public static List<Double> in(Band band) {
        List<Double> centres = new ArrayList<>();
        int first = (int) FastMath.ceil(10.0 * FastMath.log10(band.from() / 1000.0) - 1e-9);
        int last = (int) FastMath.floor(10.0 * FastMath.log10(band.to() / 1000.0) + 1e-9);
        for (int x = first; x <= last; x++) {
            centres.add(1000.0 * FastMath.pow(10.0, x / 10.0));
        }
        return centres.isEmpty() ? List.of(band.from(), band.to()) : List.copyOf(centres);
    }
}
