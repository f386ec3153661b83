package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.hipparchus.complex.Complex;
import org.hipparchus.random.RandomGenerator;
import org.hipparchus.random.Well19937c;
import org.junit.jupiter.api.Test;

class SymmetricFactorsTest {
    private static final int SIZE = 30;

    /** A random symmetric matrix with a dominant real part; the product with the solution gives the right side back. */
    @Test
    void solves() {
        RandomGenerator random = new Well19937c(7);
        double[][] re = new double[SIZE][SIZE];
        double[][] im = new double[SIZE][SIZE];
        for (int i = 0; i < SIZE; i++) {
            for (int j = 0; j <= i; j++) {
                re[i][j] = random.nextGaussian() + (i == j ? 2.0 * SIZE : 0.0);
                im[i][j] = random.nextGaussian() * (i == j ? SIZE : 1.0);
                re[j][i] = re[i][j];
                im[j][i] = im[i][j];
            }
        }
        Complex[] right = new Complex[SIZE];
        for (int i = 0; i < SIZE; i++) {
            right[i] = new Complex(random.nextGaussian(), random.nextGaussian());
        }
        double[][] lowerRe = Arrays.stream(re).map(double[]::clone).toArray(double[][]::new);
        double[][] lowerIm = Arrays.stream(im).map(double[]::clone).toArray(double[][]::new);
        Complex[] x = new SymmetricFactors(lowerRe, lowerIm).solve(right);
        for (int i = 0; i < SIZE; i++) {
            Complex sum = Complex.ZERO;
            for (int j = 0; j < SIZE; j++) {
                sum = sum.add(x[j].multiply(new Complex(re[i][j], im[i][j])));
            }
            assertThat(sum.subtract(right[i]).norm()).isCloseTo(0.0, within(1e-12));
        }
    }
}
