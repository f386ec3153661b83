package flowshy.response;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.hipparchus.exception.MathRuntimeException;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LeastSquaresBuilder;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LeastSquaresOptimizer.Optimum;
import org.hipparchus.optim.nonlinear.vector.leastsquares.LevenbergMarquardtOptimizer;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.Pair;

/**
 * Least-squares fit of one decaying swing, x(t) = c + e^{−λt} (a cos ωt + b sin ωt), to a record.
 *
 * <p>Every sample weighs the same: right for white noise. Inside, time counts in periods of the first guess.
 */
public final class FreeSwingFit {
    private static final int FEWEST = 12;
    /** More unexplained rms than this is not one free swing. */
    private static final double LARGEST_REST = 0.3;
    /** Within less than a period a drift passes for a swing. */
    private static final double FEWEST_TURNS = 1.0;
    /** A decay known worse than this decides nothing. */
    private static final double LARGEST_UNCERTAINTY = 0.2;
    /** The guess of the frequency is coarse where few periods are left; neighbours are tried too. */
    private static final double[] TRIALS = {1.0, 0.8, 1.25};

    private final double[] periods;
    private final double[] signal;
    private final double period;

    private FreeSwingFit(double[] periods, double[] signal, double period) {
        this.periods = periods;
        this.signal = signal;
        this.period = period;
    }

    /**
     * Fits a swing.
     *
     * @param times of the samples, rising [s]
     * @param signal one a time, same order, in any unit
     * @return the swing
     * @throws SuspensionException if the record holds no free swing, or too little of it
     */
    public static FreeSwing of(List<Double> times, List<Double> signal) {
        if (times.size() < FEWEST) {
            throw refused("%d samples are too few for a swing; %d or more are needed", times.size(), FEWEST);
        }
        double[] t = times.stream().mapToDouble(v -> v - times.get(0)).toArray();
        double mean = signal.stream().mapToDouble(Double::doubleValue).average().orElseThrow();
        double[] x = signal.stream().mapToDouble(v -> v - mean).toArray();
        double size = FastMath.sqrt(square(x) / x.length);
        if (!(size > 0.0) || Double.isInfinite(size)) {
            throw refused("the signal does not change");
        }
        for (int i = 0; i < x.length; i++) {
            x[i] /= size;
        }
        FreeSwingStart start = FreeSwingStart.of(t, x);
        double period = 1.0 / start.frequency();
        double[] periods = new double[t.length];
        for (int i = 0; i < t.length; i++) {
            periods[i] = t[i] / period;
        }
        return new FreeSwingFit(periods, x, period).best(start.rate() * period);
    }

    private FreeSwing best(double rate) {
        Optimum best = null;
        for (double trial : TRIALS) {
            Optional<Optimum> found = fit(rate, 2.0 * FastMath.PI * trial);
            if (found.isPresent() && (best == null || found.get().getRMS() < best.getRMS())) {
                best = found.get();
            }
        }
        if (best == null) {
            throw refused("no swing could be fitted to the record");
        }
        return judged(best);
    }

    /** The nearest minimum; empty if this start leads nowhere, for the others may. */
    private Optional<Optimum> fit(double rate, double turn) {
        try {
            Optimum found = new LevenbergMarquardtOptimizer()
                    .optimize(new LeastSquaresBuilder()
                            .model(this::model)
                            .target(signal)
                            .start(new double[] {signal[0], 0.0, 0.0, rate, turn})
                            .maxIterations(500)
                            .maxEvaluations(2000)
                            .build());
            return Optional.of(found).filter(f -> Double.isFinite(f.getRMS()));
        } catch (MathRuntimeException e) {
            return Optional.empty();
        }
    }

    /** Values and derivatives for a, b, c, λ, ω; λ and ω per period of the first guess. */
    private Pair<RealVector, RealMatrix> model(RealVector point) {
        double a = point.getEntry(0);
        double b = point.getEntry(1);
        double[] values = new double[periods.length];
        double[][] slopes = new double[periods.length][];
        for (int i = 0; i < periods.length; i++) {
            double t = periods[i];
            double fall = FastMath.exp(-point.getEntry(3) * t);
            double cos = fall * FastMath.cos(point.getEntry(4) * t);
            double sin = fall * FastMath.sin(point.getEntry(4) * t);
            double swing = a * cos + b * sin;
            values[i] = point.getEntry(2) + swing;
            slopes[i] = new double[] {cos, sin, 1.0, -t * swing, t * (b * cos - a * sin)};
        }
        return new Pair<>(new ArrayRealVector(values, false), new Array2DRowRealMatrix(slopes, false));
    }

    private FreeSwing judged(Optimum optimum) {
        double rate = optimum.getPoint().getEntry(3);
        double turn = FastMath.abs(optimum.getPoint().getEntry(4));
        double rest = FastMath.sqrt(square(optimum.getResiduals().toArray()) / signal.length);
        if (!(rest <= LARGEST_REST)) {
            throw refused(
                    "one free swing explains the record badly (%.0f %% rms is left); cut what lies before the release"
                            + " and where other motion comes in",
                    100.0 * rest);
        }
        if (!(rate > 0.0) || !(turn > 0.0)) {
            throw refused("the swing in the record does not die out");
        }
        double turns = turn * periods[periods.length - 1] / (2.0 * FastMath.PI);
        if (!(turns >= FEWEST_TURNS)) {
            throw refused("the record holds %.2g of one period of the swing; record longer", turns);
        }
        RealVector sigma = sigma(optimum);
        double noise = rest * FastMath.sqrt(signal.length / (signal.length - 5.0));
        double rateShare = noise * sigma.getEntry(3) / rate;
        if (!(rateShare <= LARGEST_UNCERTAINTY)) {
            throw refused(
                    "the decay time is known to %.0f %% only; a longer or quieter record is needed", 100.0 * rateShare);
        }
        double frequency = turn / (2.0 * FastMath.PI * period);
        double decay = period / rate;
        return new FreeSwing(
                frequency, decay, noise * sigma.getEntry(4) / (2.0 * FastMath.PI * period), decay * rateShare, rest);
    }

    private static RealVector sigma(Optimum optimum) {
        try {
            return optimum.getSigma(1e-14);
        } catch (MathRuntimeException e) {
            throw refused("the record creeps back without swinging; state a damping or a quality factor");
        }
    }

    private static double square(double[] values) {
        double sum = 0.0;
        for (double value : values) {
            sum += value * value;
        }
        return sum;
    }

    private static SuspensionException refused(String message, Object... values) {
        return new SuspensionException("ring-down", String.format(Locale.ROOT, message, values));
    }
}
