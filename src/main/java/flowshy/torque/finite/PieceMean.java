package flowshy.torque.finite;

import flowshy.math.GaussLegendre;
import java.util.function.DoubleFunction;
import org.hipparchus.complex.Complex;

/** Mean of a function of the height over a piece. */
final class PieceMean {
    private static final GaussLegendre RULE = GaussLegendre.of(12);

    private PieceMean() {}

    static Complex of(RingPiece piece, DoubleFunction<Complex> function) {
        if (!piece.upright()) {
            return function.apply(piece.middle());
        }
        Complex sum = Complex.ZERO;
        for (int n = 0; n < RULE.size(); n++) {
            double z = piece.from().height() + 0.5 * piece.thickness() * (1.0 + RULE.point(n));
            sum = sum.add(function.apply(z).multiply(0.5 * RULE.weight(n)));
        }
        return sum;
    }
}
