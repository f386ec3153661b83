package flowshy.verdict.size;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.hipparchus.util.FastMath;

/**
 * What is added to an estimate so that, at one place, its figures and their slopes are those of the full model: the difference there and
 * its slopes along every variable, in shares of the ranges. Further off than the slopes are trusted the addition stays as it is there.
 */
final class Correction {
    /** Step of a slope, in shares of the ranges: small against any bend, large against steps of the full model's meshes. */
    private static final double STEP = 2e-3;

    private final double[] place;
    private final double reach;
    private final List<Double> here;
    private final List<List<Double>> slopes;

    private Correction(double[] place, double reach, List<Double> here, List<List<Double>> slopes) {
        this.place = place;
        this.reach = reach;
        this.here = here;
        this.slopes = slopes;
    }

    /**
     * The difference at a place, and its slopes.
     *
     * @param estimate of the problem
     * @param solved the same by the full model
     * @param at makes a device by both
     * @param reach how far the slopes are trusted, in shares of the ranges; with 0 they are not asked for
     */
    static Correction at(SizingProblem estimate, SizingProblem solved, Candidate at, double reach) {
        double[] place = estimate.shares(at.values());
        List<Double> here = differences(estimate.at(at.values()).trial(), at.trial());
        if (reach == 0.0) {
            return new Correction(place, reach, here, List.of());
        }
        List<List<Double>> slopes = IntStream.range(0, place.length)
                .parallel()
                .mapToObj(i -> slope(estimate, solved, place, here, i))
                .toList();
        return new Correction(place, reach, here, slopes);
    }

    private static List<Double> slope(
            SizingProblem estimate, SizingProblem solved, double[] place, List<Double> here, int variable) {
        double[] low = place.clone();
        double[] high = place.clone();
        low[variable] = FastMath.max(0.0, place[variable] - STEP);
        high[variable] = FastMath.min(1.0, place[variable] + STEP);
        List<Double> below = differences(estimate, solved, low);
        List<Double> above = differences(estimate, solved, high);
        double from = below.isEmpty() ? place[variable] : low[variable];
        double to = above.isEmpty() ? place[variable] : high[variable];
        List<Double> slope = new ArrayList<>();
        for (int k = 0; k < here.size(); k++) {
            double rise = (above.isEmpty() ? here : above).get(k) - (below.isEmpty() ? here : below).get(k);
            slope.add(to > from ? rise / (to - from) : 0.0);
        }
        return slope;
    }

    /** Empty where one of them makes no device. */
    private static List<Double> differences(SizingProblem estimate, SizingProblem solved, double... shares) {
        Trial one = estimate.at(shares).trial();
        Trial other = one.there() ? solved.at(shares).trial() : one;
        return other.there() ? differences(one, other) : List.of();
    }

    /** Objective first, then the limited figures; nothing is added to what has no bound. */
    private static List<Double> differences(Trial estimate, Trial solved) {
        List<Double> differences = new ArrayList<>();
        differences.add(solved.objective() - estimate.objective());
        for (int c = 0; c < estimate.found().size(); c++) {
            double difference = solved.found().get(c) - estimate.found().get(c);
            differences.add(Double.isFinite(difference) ? difference : 0.0);
        }
        return differences;
    }

    /** The problem by the corrected estimate. */
    SizingProblem on(SizingProblem estimate) {
        return estimate.by(values -> {
            Trial trial = estimate.trials().at(values);
            return trial.there() ? on(trial, estimate.shares(values)) : trial;
        });
    }

    private Trial on(Trial trial, double... shares) {
        List<Double> found = new ArrayList<>();
        for (int c = 0; c < trial.found().size(); c++) {
            found.add(trial.found().get(c) + added(c + 1, shares));
        }
        return Trial.of(trial.objective() + added(0, shares), found);
    }

    private double added(int figure, double... shares) {
        double sum = here.get(figure);
        for (int i = 0; i < slopes.size(); i++) {
            double moved = FastMath.max(-reach, FastMath.min(shares[i] - place[i], reach));
            sum += slopes.get(i).get(figure) * moved;
        }
        return sum;
    }
}
