package flowshy.stream.record;

import flowshy.math.ThirdOctave;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** The two usual sets of bands, both on third-octave mid-bands (IEC 61260-1). */
enum BandSet {
    THIRD_OCTAVE("third-octave", 1),
    OCTAVE("octave", 3);

    private final String word;
    private final int width;

    BandSet(String word, int width) {
        this.word = word;
        this.width = width;
    }

    /** The set whose step two neighbouring frequencies keep; names are rounded, so to 5 %. A gap of three third-octaves reads as an octave. */
    static Optional<BandSet> of(double first, double second) {
        for (BandSet set : values()) {
            double step = FastMath.pow(10.0, set.width / 10.0);
            if (FastMath.abs(second / first / step - 1.0) < 0.05
                    && set.index(first).isPresent()) {
                return Optional.of(set);
            }
        }
        return Optional.empty();
    }

    String word() {
        return word;
    }

    /** Index of the third-octave that a mid-band frequency names, if it is within 3 % of its exact or rounded value. */
    Optional<Integer> index(double frequency) {
        ThirdOctave band = ThirdOctave.holding(frequency);
        boolean near = FastMath.abs(frequency / band.middle() - 1.0) < 0.03
                || FastMath.abs(frequency / band.nominal() - 1.0) < 1e-6;
        return near && FastMath.floorMod(band.index(), width) == 0 ? Optional.of(band.index()) : Optional.empty();
    }

    double low(int index) {
        return 1000.0 * FastMath.pow(10.0, (2 * index - width) / 20.0);
    }

    double high(int index) {
        return 1000.0 * FastMath.pow(10.0, (2 * index + width) / 20.0);
    }
}
