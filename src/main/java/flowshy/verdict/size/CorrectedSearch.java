package flowshy.verdict.size;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.hipparchus.util.FastMath;

/**
 * Search by an estimate for an answer of the full model. At the place where a search has ended the full model is evaluated; the estimate is
 * corrected there to first order and searched again within a reach of that place, until the full model keeps every limit and nothing is
 * left to be gained: model management with first-order consistency (Alexandrov, Lewis, Gumbert, Green &amp; Newman 2001, J. Aircraft
 * 38:1093), whose limit satisfies the full model's own conditions of an optimum. A step counts if violation or cost falls below what every
 * place before had (a filter: Fletcher &amp; Leyffer 2002, Math. Program. 91:239), else the reach is cut. Both recalled from memory.
 */
final class CorrectedSearch {
    /** Rounds from one start; three or four serve where the full model is smooth. */
    private static final int ROUNDS = 10;

    /** How far a correction is trusted at first, in shares of the ranges, and where there is nothing left to try. */
    private static final double REACH = 0.25;

    private static final double LEAST_REACH = 1e-6;
    private static final double CUT = 0.2;

    /** A gain of this share of the objective, or of a limit's scale, no longer counts. */
    private static final double SETTLED = 1e-6;

    /** Room left to every limit, in its scale, so that the full model keeps it behind a correction that is not exact. */
    private static final double ROOM = 1e-7;

    /** Steps shorter than this, in shares, that miss a limit have met a step of the full model itself: more room is left then. */
    private static final double SHORT = 1e-3;

    private final Sizer sizer;
    private final SizingProblem estimate;
    private final SizingProblem solved;
    private final AtomicInteger solutions = new AtomicInteger();
    private final List<Round> rounds = new ArrayList<>();
    private final double[] room;

    /**
     * Where a search ended.
     *
     * @param place the best of the full model
     * @param settled whether nothing was left to be gained there
     */
    record Ended(Candidate place, boolean settled) {
        private static Ended better(Ended one, Ended other) {
            return Candidate.better(one.place, other.place).equals(one.place) ? one : other;
        }
    }

    CorrectedSearch(Sizer sizer, SizingProblem estimate, SizingProblem.Trials full) {
        this.sizer = sizer;
        this.estimate = estimate;
        this.solved = estimate.by(values -> {
            solutions.incrementAndGet();
            return full.at(values);
        });
        this.room = new double[estimate.constraints().size()];
        Arrays.fill(room, ROOM);
    }

    /** Places at which both models were asked. */
    List<Round> rounds() {
        return rounds;
    }

    /** How often the full model was asked. */
    int solutions() {
        return solutions.get();
    }

    /** The problem by the full model. */
    SizingProblem solved() {
        return solved;
    }

    /**
     * The best place of the full model near the best of the estimate; if it keeps no limits near there, once more from the best place of the
     * estimate shifted by what was found.
     *
     * @param start best place of the estimate
     * @return by the full model
     */
    Ended from(Candidate start) {
        Ended first = walk(start);
        Candidate best = first.place();
        if (!best.trial().there() || best.keepsAll()) {
            return first;
        }
        SizingProblem shifted = Correction.at(estimate, solved, best, 0.0).on(estimate);
        Candidate elsewhere = sizer.best(shifted, List.of(best.values()));
        return distance(elsewhere, best) < SHORT ? first : Ended.better(first, walk(elsewhere));
    }

    /** The estimate corrected at a place of the full model. */
    SizingProblem correctedAt(Candidate place) {
        return Correction.at(estimate, solved, place, REACH).on(estimate);
    }

    private Ended walk(Candidate start) {
        Candidate here = solve(start);
        Candidate best = here;
        if (!here.trial().there()) {
            return new Ended(best, false);
        }
        List<Candidate> filter = new ArrayList<>(List.of(here));
        SizingProblem corrected = correctedAt(here);
        double reach = REACH;
        for (int round = 1; round < ROUNDS && reach > LEAST_REACH; round++) {
            Candidate next = sizer.near(roomier(corrected).near(here.values(), reach), here.values());
            if (nothingToGain(here, next)) {
                return new Ended(best, true);
            }
            Candidate found = solve(next);
            best = Candidate.better(best, found);
            if (distance(found, here) < SHORT) {
                leaveRoom(found);
            }
            if (counts(found, filter)) {
                filter.add(found);
                here = found;
                corrected = correctedAt(here);
                reach = FastMath.min(REACH, 2.0 * reach);
            } else {
                reach *= CUT;
            }
        }
        return new Ended(best, reach <= LEAST_REACH);
    }

    private Candidate solve(Candidate expected) {
        Candidate found = solved.at(expected.values());
        rounds.add(new Round(expected.values(), expected.trial(), found.trial()));
        return found;
    }

    private SizingProblem roomier(SizingProblem corrected) {
        SizingProblem roomier = corrected;
        for (int c = 0; c < room.length; c++) {
            Constraint limit = corrected.constraints().get(c);
            double left = room[c] * limit.scale();
            roomier = roomier.withLimit(c, limit.limit() + (limit.least() ? left : -left));
        }
        return roomier;
    }

    private void leaveRoom(Candidate found) {
        for (int c = 0; c < found.shortfalls().size(); c++) {
            room[c] += 2.0 * FastMath.max(0.0, found.shortfalls().get(c));
        }
    }

    private static boolean nothingToGain(Candidate here, Candidate next) {
        if (here.keepsAll()) {
            return here.cost() - next.cost() <= SETTLED * FastMath.abs(here.cost());
        }
        return FastMath.sqrt(here.violation()) - FastMath.sqrt(next.violation()) <= 0.1 * ROOM;
    }

    /** Whether a place has a smaller violation, or a smaller cost, than each of those before. */
    private static boolean counts(Candidate found, List<Candidate> filter) {
        return found.trial().there()
                && filter.stream()
                        .allMatch(before -> found.violation() < before.violation() || found.cost() < before.cost());
    }

    private double distance(Candidate one, Candidate other) {
        double[] a = estimate.shares(one.values());
        double[] b = estimate.shares(other.values());
        double largest = 0.0;
        for (int i = 0; i < a.length; i++) {
            largest = FastMath.max(largest, FastMath.abs(a[i] - b[i]));
        }
        return largest;
    }
}
