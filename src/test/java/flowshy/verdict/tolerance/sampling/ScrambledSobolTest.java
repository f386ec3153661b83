package flowshy.verdict.tolerance.sampling;

import static org.assertj.core.api.Assertions.assertThat;

import org.hipparchus.random.SobolSequenceGenerator;
import org.junit.jupiter.api.Test;

class ScrambledSobolTest {
    private static final int DIMENSION = 7;

    private static double[][] points(long seed, int replicate, int from, int count) {
        return new ScrambledSobol(new SobolSequenceGenerator(DIMENSION), DIMENSION, seed, replicate)
                .points(from, count);
    }

    /** The mark of a digital net: of 2^m points each of 2^m equal slices of every coordinate holds one. */
    @Test
    void everySliceHoldsOnePoint() {
        int count = 1024;
        double[][] points = points(3, 5, 0, count);
        for (int d = 0; d < DIMENSION; d++) {
            int[] held = new int[count];
            for (double[] point : points) {
                assertThat(point[d]).isGreaterThan(0.0).isLessThan(1.0);
                held[(int) (point[d] * count)]++;
            }
            assertThat(held).containsOnly(1);
        }
    }

    /** The same for the squares of the first two coordinates, which form a (0, 2)-sequence: all shapes of area 1/1024. */
    @Test
    void everyRectangleOfTheFirstTwoCoordinatesHoldsOnePoint() {
        int digits = 10;
        double[][] points = points(8, 1, 0, 1 << digits);
        for (int across = 0; across <= digits; across++) {
            int[] held = new int[1 << digits];
            for (double[] point : points) {
                int column = (int) (point[0] * (1 << across));
                int row = (int) (point[1] * (1 << (digits - across)));
                held[column * (1 << (digits - across)) + row]++;
            }
            assertThat(held).containsOnly(1);
        }
    }

    @Test
    void aRunContinuesWhereAnotherEnded() {
        double[][] whole = points(1, 2, 0, 96);
        double[][] rest = points(1, 2, 40, 56);
        for (int i = 0; i < rest.length; i++) {
            assertThat(rest[i]).containsExactly(whole[40 + i]);
        }
    }

    @Test
    void seedsAndReplicatesDiffer() {
        assertThat(points(1, 0, 0, 1)[0]).isEqualTo(points(1, 0, 0, 1)[0]);
        assertThat(points(1, 0, 0, 1)[0]).isNotEqualTo(points(1, 1, 0, 1)[0]);
        assertThat(points(1, 0, 0, 1)[0]).isNotEqualTo(points(2, 0, 0, 1)[0]);
        assertThat(points(1, 0, 0, 1)[0]).isNotEqualTo(points(1L << 40 | 1, 0, 0, 1)[0]);
    }
}
