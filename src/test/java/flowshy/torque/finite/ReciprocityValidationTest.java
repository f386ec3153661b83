package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Laws of the exact problem that tie its solutions together; posts in units of their radius. */
class ReciprocityValidationTest {
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(64);

    /**
     * Lorentz: the torque of the stream follows from the traction of a sheared hair (v_x = z), with the stress of both motions
     * inside taken off: T = −∫ u∞ · t dS + ∫ z (iβ u∞) + u∞′ dV. The first integral knows the stream only through its velocity at
     * the surface, the solver's torque only through the stream's own density.
     */
    @ParameterizedTest
    @CsvSource({
        "1, 0.06", "1, 0.3", "1, 1", "1, 4", "2, 0.08", "2, 0.4", "2, 2", "2, 8", "5, 0.2", "5, 1", "5, 5", "5, 20",
        "10, 0.4", "10, 2", "10, 10", "10, 40", "20, 0.8", "20, 4", "20, 20", "50, 2", "50, 10", "50, 50", "50, 200"
    })
    void streamAndShearedHair(double slenderness, double delta) {
        double length = 2.0 * slenderness;
        double beta = 2.0 / (delta * delta);
        Complex k = Bodies.wave(beta);
        RingLayer layer = Bodies.layer(Bodies.post(length), beta);
        Complex direct = RingLayer.dot(layer.motion(0.0, 1.0, 0.0), layer.inStream(z -> share(k, z)));
        Complex[] sheared = layer.moving(0.0, 1.0, 0.0);
        Complex power = Complex.ZERO;
        for (int i = 0; i < layer.rings().size(); i++) {
            for (RingPiece piece : layer.rings().get(i).pieces()) {
                Complex mean = PieceMean.of(piece, z -> share(k, z));
                power = power.add(sheared[3 * i].multiply(mean).multiply(piece.area()));
            }
        }
        // on the flat tip the sheared motion inside has the traction e_x
        Complex inside = share(k, length).multiply(-FastMath.PI);
        for (int n = 0; n < RULE.getNumberOfPoints(); n++) {
            double z = 0.5 * length * (1.0 + RULE.getPoint(n));
            Complex share = share(k, z);
            Complex slope = k.multiply(share.negate().add(1.0));
            Complex volume = share.multiply(new Complex(0.0, beta * z)).add(slope);
            inside = inside.add(volume.multiply(FastMath.PI * 0.5 * length * RULE.getWeight(n)));
        }
        Complex reciprocal = inside.subtract(power);
        assertThat(reciprocal.subtract(direct).norm() / direct.norm()).isCloseTo(0.0, within(1e-3));
    }

    /**
     * Superposition: hair and wall shaken along x in medium at rest far away is the stream seen from the wall, less the moment of
     * the pressure that carries the stream, on the wetted surface: T = −T_stream + iβ (∫ πa² z dz − πa⁴/4), the last because the
     * foot is dry. The left side is solved apart: wall's layer e^{−kz}, rigid hair.
     */
    @ParameterizedTest
    @CsvSource({"1, 0.1", "1, 2", "3, 0.3", "10, 1", "10, 10", "30, 3"})
    void shakenWall(double slenderness, double delta) {
        double length = 2.0 * slenderness;
        double beta = 2.0 / (delta * delta);
        Complex k = Bodies.wave(beta);
        RingLayer layer = Bodies.layer(Bodies.post(length), beta);
        double[] moment = layer.motion(0.0, 1.0, 1.0);
        Complex still = RingLayer.dot(moment, layer.inStream(z -> share(k, z)));
        Complex hair = RingLayer.dot(moment, layer.moving(1.0, 0.0, 0.0));
        Complex wall =
                RingLayer.dot(moment, layer.inStream(z -> share(k, z).negate().add(1.0)));
        Complex expected = new Complex(0.0, beta * FastMath.PI * (0.5 * length * length - 0.25)).subtract(still);
        assertThat(hair.add(wall).subtract(expected).norm() / expected.norm()).isCloseTo(0.0, within(1e-3));
    }

    private static Complex share(Complex k, double z) {
        return k.multiply(-z).exp().negate().add(1.0);
    }
}
