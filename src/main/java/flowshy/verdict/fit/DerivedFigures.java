package flowshy.verdict.fit;

import flowshy.response.Device;
import flowshy.verdict.Band;
import flowshy.verdict.DeviceFacts;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import org.hipparchus.util.FastMath;

/** Resonance and quality factor of a fitted device, with the uncertainty that the fitted numbers hand on. */
final class DerivedFigures {
    private final FitModel model;
    private final List<Freed> free;
    private final double[] values;
    private final FitStatistics statistics;
    private final Device base;
    private final Band band;

    DerivedFigures(
            FitModel model, List<Freed> free, double[] values, FitStatistics statistics, Device base, Band band) {
        this.model = model;
        this.free = free;
        this.values = values.clone();
        this.statistics = statistics;
        this.base = base;
        this.band = band;
    }

    /** Those that there are: none without a suspension, no quality factor without damping. */
    List<Derived> all() {
        List<Derived> derived = new ArrayList<>();
        for (boolean vacuum : new boolean[] {true, false}) {
            Function<DeviceFacts, Optional<DeviceFacts.Swing>> swing =
                    vacuum ? DeviceFacts::vacuum : DeviceFacts::medium;
            String where = vacuum ? " in vacuum" : " in the medium";
            String prefix = vacuum ? "vacuum_" : "";
            figure(
                            "resonance" + where,
                            prefix + "resonance_hz",
                            "Hz",
                            facts -> swing.apply(facts)
                                    .map(DeviceFacts.Swing::resonance)
                                    .orElse(Double.NaN))
                    .ifPresent(derived::add);
            figure(
                            "Q" + where,
                            prefix + "quality",
                            "",
                            facts -> swing.apply(facts)
                                    .map(s -> s.decay().quality())
                                    .orElse(Double.NaN))
                    .ifPresent(derived::add);
        }
        return derived;
    }

    private Optional<Derived> figure(String name, String key, String unit, ToDoubleFunction<DeviceFacts> figure) {
        double here = at(values, figure);
        double variance = 0.0;
        double[] slopes = new double[values.length];
        for (int i = 0; i < values.length; i++) {
            slopes[i] = slope(i, figure);
        }
        for (int i = 0; i < slopes.length; i++) {
            for (int j = 0; j < slopes.length; j++) {
                variance += slopes[i] * slopes[j] * statistics.covariance(i, j);
            }
        }
        if (!Double.isFinite(here) || !Double.isFinite(variance)) {
            return Optional.empty();
        }
        double before = figure.applyAsDouble(DeviceFacts.of(base, band));
        return Optional.of(new Derived(name, key, unit, before, here, FastMath.sqrt(FastMath.max(0.0, variance))));
    }

    private double slope(int index, ToDoubleFunction<DeviceFacts> figure) {
        double step = 0.1 * FastMath.sqrt(statistics.covariance(index, index));
        double[] above = values.clone();
        double[] below = values.clone();
        above[index] += step;
        below[index] = FastMath.max(free.get(index).least(), below[index] - step);
        return (at(above, figure) - at(below, figure)) / (above[index] - below[index]);
    }

    private double at(double[] numbers, ToDoubleFunction<DeviceFacts> figure) {
        return model.device(numbers)
                .map(device -> figure.applyAsDouble(DeviceFacts.of(device, band)))
                .orElse(Double.NaN);
    }
}
