package flowshy.torque.finite;

import org.hipparchus.complex.Complex;

/**
 * Factors L D Lᵀ of a complex symmetric matrix, without exchange of rows.
 *
 * <p>The layer's matrix gives out no power, so the part of it that dissipates is positive definite and no pivot can be small
 * against what it came from (Higham, Accuracy and Stability of Numerical Algorithms, on A = B + iC; from memory).
 */
final class SymmetricFactors {
    private final int size;
    private final double[][] re;
    private final double[][] im;

    /** Takes the lower triangles over. */
    SymmetricFactors(double[][] re, double[][] im) {
        this.size = re.length;
        this.re = re;
        this.im = im;
        double[] pivotRe = new double[size];
        double[] pivotIm = new double[size];
        for (int i = 0; i < size; i++) {
            // row i: first L D, then L by dividing through the pivots
            for (int j = 0; j < i; j++) {
                double sumRe = re[i][j];
                double sumIm = im[i][j];
                for (int m = 0; m < j; m++) {
                    sumRe -= re[i][m] * re[j][m] - im[i][m] * im[j][m];
                    sumIm -= re[i][m] * im[j][m] + im[i][m] * re[j][m];
                }
                re[i][j] = sumRe;
                im[i][j] = sumIm;
            }
            double diagonalRe = re[i][i];
            double diagonalIm = im[i][i];
            for (int j = 0; j < i; j++) {
                double norm = pivotRe[j] * pivotRe[j] + pivotIm[j] * pivotIm[j];
                double lRe = (re[i][j] * pivotRe[j] + im[i][j] * pivotIm[j]) / norm;
                double lIm = (im[i][j] * pivotRe[j] - re[i][j] * pivotIm[j]) / norm;
                diagonalRe -= lRe * re[i][j] - lIm * im[i][j];
                diagonalIm -= lRe * im[i][j] + lIm * re[i][j];
                re[i][j] = lRe;
                im[i][j] = lIm;
            }
            pivotRe[i] = diagonalRe;
            pivotIm[i] = diagonalIm;
            re[i][i] = diagonalRe;
            im[i][i] = diagonalIm;
        }
    }

    Complex[] solve(Complex[] right) {
        Complex[] x = right.clone();
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < i; j++) {
                x[i] = x[i].subtract(x[j].multiply(new Complex(re[i][j], im[i][j])));
            }
        }
        for (int i = 0; i < size; i++) {
            x[i] = x[i].divide(new Complex(re[i][i], im[i][i]));
        }
        for (int i = size - 1; i >= 0; i--) {
            for (int j = i + 1; j < size; j++) {
                x[i] = x[i].subtract(x[j].multiply(new Complex(re[j][i], im[j][i])));
            }
        }
        return x;
    }
}
