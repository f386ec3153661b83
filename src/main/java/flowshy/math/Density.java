package flowshy.math;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** A one-sided density over frequency, known between two frequencies and zero outside. */
public sealed interface Density permits LogLogDensity, StepDensity {
    /**
     * Density at a frequency.
     *
     * @param frequency f [Hz]
     * @return square of the unit of the signal per Hz
     */
    double at(double frequency);

    /**
     * Mean square of all.
     *
     * @return square of the unit of the signal
     */
    double meanSquare();

    /**
     * Mean square over a range.
     *
     * @param from lower end [Hz]
     * @param to upper end, not below {@code from} [Hz]
     * @return ∫ G df, square of the unit of the signal
     */
    double meanSquare(double from, double to);

    /**
     * Frequencies at its ends and at its steps or corners.
     *
     * @return rising [Hz], two or more
     */
    List<Double> edges();

    /**
     * A density with no more steps or corners than a smooth response can tell apart; every band keeps its mean square.
     *
     * @param perDecade bands in a decade of frequency at most
     * @return this, if its edges are not closer than that; else flat bands over groups of its pieces
     */
    default Density coarse(int perDecade) {
        double ratio = FastMath.pow(10.0, 1.0 / perDecade) * (1.0 - 1e-9);
        List<Double> edges = edges();
        List<Double> kept = new ArrayList<>(List.of(edges.get(0)));
        int last = edges.size() - 1;
        for (int i = 1; i <= last; i++) {
            if (edges.get(i) >= kept.get(kept.size() - 1) * ratio || i == last) {
                kept.add(edges.get(i));
            }
        }
        if (kept.size() == edges.size()) {
            return this;
        }
        List<StepDensity.Band> bands = new ArrayList<>();
        for (int i = 1; i < kept.size(); i++) {
            bands.add(new StepDensity.Band(kept.get(i - 1), kept.get(i), meanSquare(kept.get(i - 1), kept.get(i))));
        }
        return new StepDensity(bands, StepDensity.Inside.FLAT);
    }
}
