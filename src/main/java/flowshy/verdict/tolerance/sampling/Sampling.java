package flowshy.verdict.tolerance.sampling;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import java.util.stream.IntStream;
import org.hipparchus.random.SobolSequenceGenerator;

/**
 * Randomised quasi-Monte Carlo on a trial. Trials run on all cores; what they gave is added up by one thread in the order of the points, so
 * that the same seed gives the same digits whatever the number of threads. Nothing is kept of a trial but counts and sums.
 */
public final class Sampling {
    /** Independent replicates at least; one less than twice as many at most. Enough for Student's t, few enough for long runs of points. */
    static final int REPLICATES = 16;

    /** Trials whose results are held at a time. */
    private static final int WAVE = 512;

    /** Points of a replicate at which a rule to stop is first asked. */
    private static final int FIRST_LOOK = 256;

    private final int inputs;
    private final Trial trial;
    private final long seed;
    private final SobolSequenceGenerator sequence;

    /**
     * A sampling of a trial.
     *
     * @param inputs number of uncertain inputs, one or more
     * @param trial what is tried
     * @param seed of the randomisation
     */
    public Sampling(int inputs, Trial trial, long seed) {
        this.inputs = inputs;
        this.trial = trial;
        this.seed = seed;
        this.sequence = new SobolSequenceGenerator(inputs);
    }

    /** Points of a replicate: a power of two, and so many that the least number of replicates does not go beyond what is wanted. */
    static int size(int wanted) {
        return Integer.highestOneBit(Math.max(1, wanted / REPLICATES));
    }

    /**
     * Replicates for a number of trials.
     *
     * @param wanted trials at least
     * @return 16 to 31, for 16 trials and more
     */
    static int replicates(int wanted) {
        int size = size(wanted);
        return Math.max(REPLICATES, (wanted + size - 1) / size);
    }

    /**
     * Runs.
     *
     * @param wanted trials; rounded up by 6 % at most to 16 to 32 replicates of 2^m points
     * @param enough asked after every doubling of the points, from 256 a replicate; ends the run before all trials are done
     * @param progress is told
     * @return what was found
     */
    public Sample run(int wanted, Predicate<Sample> enough, Progress progress) {
        Sums sums = new Sums(replicates(wanted));
        int size = size(wanted);
        Sample found = null;
        for (int done = 0; done < size; ) {
            int next = Math.min(size, Math.max(FIRST_LOOK, 2 * done));
            sums.run(done, next, size, progress);
            done = next;
            found = sums.sample(done);
            if (enough.test(found)) {
                return found;
            }
        }
        return found;
    }

    /** Counts and sums of a run so far. */
    private final class Sums {
        private final ScrambledSobol[] points;
        private final List<Tally> tallies = new ArrayList<>();
        private long[][] hits = new long[0][];

        Sums(int replicates) {
            points = new ScrambledSobol[replicates];
            for (int r = 0; r < replicates; r++) {
                points[r] = new ScrambledSobol(sequence, inputs, seed, r);
            }
        }

        /** Points from one index to another of every replicate. */
        void run(int from, int to, int most, Progress progress) {
            int length = to - from;
            long all = (long) length * points.length;
            long before = (long) from * points.length;
            for (long wave = 0; wave < all; wave += WAVE) {
                int count = (int) Math.min(WAVE, all - wave);
                double[][] at = new double[count][];
                for (int i = 0; i < count; ) {
                    int replicate = (int) ((wave + i) / length);
                    int index = (int) ((wave + i) % length);
                    int run = Math.min(count - i, length - index);
                    System.arraycopy(points[replicate].points(from + index, run), 0, at, i, run);
                    i += run;
                }
                Draw[] draws = new Draw[count];
                IntStream.range(0, count).parallel().forEach(i -> draws[i] = trial.at(at[i]));
                if (hits.length == 0) {
                    begin(draws);
                }
                for (int i = 0; i < count; i++) {
                    add((int) ((wave + i) / length), draws[i]);
                }
                progress.at(before + wave + count, (long) most * points.length);
            }
        }

        private void begin(Draw[] first) {
            hits = new long[points.length][first[0].events().length];
            for (int k = 0; k < first[0].values().length; k++) {
                double[] values = new double[first.length];
                for (int i = 0; i < first.length; i++) {
                    values[i] = first[i].values()[k];
                }
                tallies.add(new Tally(points.length, values));
            }
        }

        private void add(int replicate, Draw draw) {
            for (int k = 0; k < draw.values().length; k++) {
                tallies.get(k).add(replicate, draw.values()[k]);
            }
            for (int e = 0; e < draw.events().length; e++) {
                hits[replicate][e] += draw.events()[e] ? 1 : 0;
            }
        }

        Sample sample(int size) {
            List<Interval> events = new ArrayList<>();
            for (int e = 0; e < hits[0].length; e++) {
                long[] one = new long[hits.length];
                for (int r = 0; r < hits.length; r++) {
                    one[r] = hits[r][e];
                }
                events.add(Interval.probability(one, size));
            }
            return new Sample(
                    points.length, size, tallies.stream().map(Tally::output).toList(), events);
        }
    }
}
