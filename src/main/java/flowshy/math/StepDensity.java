package flowshy.math;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * A one-sided density given by the mean square in each of some bands, zero outside them.
 *
 * @param bands rising, none overlapping another
 * @param inside how a band's mean square is spread over it
 */
public record StepDensity(List<Band> bands, Inside inside) implements Density {
    /** How the mean square of a band is spread over it. */
    public enum Inside {
        /** the same density everywhere */
        FLAT {
            @Override
            double density(Band band, double frequency) {
                return band.meanSquare() / (band.high() - band.low());
            }

            @Override
            double part(Band band, double from, double to) {
                return band.meanSquare() * (to - from) / (band.high() - band.low());
            }
        },
        /** the same mean square in equal ratios of frequency, so that the density falls as 1/f (pink) */
        PINK {
            @Override
            double density(Band band, double frequency) {
                return band.meanSquare() / (frequency * FastMath.log(band.high() / band.low()));
            }

            @Override
            double part(Band band, double from, double to) {
                return band.meanSquare() * FastMath.log(to / from) / FastMath.log(band.high() / band.low());
            }
        };

        abstract double density(Band band, double frequency);

        abstract double part(Band band, double from, double to);
    }

    /**
     * One band.
     *
     * @param low lower edge [Hz]
     * @param high upper edge [Hz]
     * @param meanSquare what the band holds, in the square of the unit of the signal
     */
    public record Band(double low, double high, double meanSquare) {
        /** @throws IllegalArgumentException if the edges do not rise from above zero or the mean square is negative */
        public Band {
            if (!(low > 0.0) || !(high > low) || Double.isInfinite(high)) {
                throw new IllegalArgumentException(
                        "band from " + low + " to " + high + " Hz does not rise from above zero");
            }
            if (!(meanSquare >= 0.0) || Double.isInfinite(meanSquare)) {
                throw new IllegalArgumentException("mean square must be zero or more and finite, was " + meanSquare);
            }
        }
    }

    /** @throws IllegalArgumentException if there is no band or two overlap */
    public StepDensity {
        bands = List.copyOf(bands);
        if (bands.isEmpty()) {
            throw new IllegalArgumentException("a density needs one band or more");
        }
        for (int i = 1; i < bands.size(); i++) {
            // edges computed from nominal names meet to rounding only
            if (bands.get(i).low() < bands.get(i - 1).high() * (1.0 - 1e-9)) {
                throw new IllegalArgumentException("band " + (i + 1) + " begins below the end of the one before");
            }
        }
    }

    /**
     * Density at a frequency.
     *
     * @param frequency f [Hz]
     * @return square of the unit of the signal per Hz; at a common edge that of the upper band
     */
    @Override
    public double at(double frequency) {
        if (!(frequency >= bands.get(0).low())) {
            return 0.0;
        }
        int at = 0;
        int end = bands.size();
        while (end - at > 1) {
            int middle = (at + end) >>> 1;
            if (bands.get(middle).low() <= frequency) {
                at = middle;
            } else {
                end = middle;
            }
        }
        Band band = bands.get(at);
        boolean last = at == bands.size() - 1;
        boolean within = frequency < band.high() || (last && frequency == band.high());
        return within ? inside.density(band, frequency) : 0.0;
    }

    /**
     * Mean square of all bands.
     *
     * @return square of the unit of the signal
     */
    @Override
    public double meanSquare() {
        double sum = 0.0;
        for (Band band : bands) {
            sum += band.meanSquare();
        }
        return sum;
    }

    /**
     * Frequencies at which the density may step.
     *
     * @return rising [Hz], two or more
     */
    @Override
    public double meanSquare(double from, double to) {
        double sum = 0.0;
        for (Band band : bands) {
            double low = FastMath.max(from, band.low());
            double high = FastMath.min(to, band.high());
            if (low < high) {
                sum += inside.part(band, low, high);
            }
        }
        return sum;
    }

    @Override
    public List<Double> edges() {
        List<Double> edges = new ArrayList<>();
        for (Band band : bands) {
            // bands that touch share an edge, be it to rounding only
            if (edges.isEmpty() || band.low() > edges.get(edges.size() - 1) * (1.0 + 1e-9)) {
                edges.add(band.low());
            }
            edges.add(band.high());
        }
        return edges;
    }
}
