package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.ReferenceTable;
import java.util.List;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Bodies whose forces are known in closed form or in print; radius, viscosity and velocity 1. */
class KnownBodiesValidationTest {
    private static final double FAR = 1e4;

    /**
     * Sphere that slides to and fro far from the wall: F = −6π (1 + s + s²/9), s = k (Stokes 1851, exact). Rounded surfaces want
     * short rings where the layer is thin; there the phase is what is left.
     */
    @ParameterizedTest
    @CsvSource({"10, 0.1", "1, 0.1", "0.4, 0.1", "0.2, 0.15", "0.1, 0.3", "0.05, 0.5"})
    void oscillatingSphere(double delta, double degrees) {
        double beta = 2.0 / (delta * delta);
        Complex s = Bodies.wave(beta);
        Complex exact = s.multiply(s).divide(9.0).add(s).add(1.0).multiply(-6.0 * FastMath.PI);
        Complex force = Bodies.slidingForce(Bodies.layer(Bodies.sphere(FAR), beta));
        assertThat(Bodies.amplitudeError(force, exact)).isCloseTo(0.0, within(1e-3));
        assertThat(Bodies.phaseError(force, exact)).isCloseTo(0.0, within(degrees));
    }

    /** Sphere that turns to and fro: T = −(8π/3) (3 + 3s + s²)/(1 + s) (Stokes 1851; Landau and Lifshitz, from memory). */
    @ParameterizedTest
    @CsvSource({"10", "1", "0.4", "0.2"})
    void turningSphere(double delta) {
        double beta = 2.0 / (delta * delta);
        Complex s = Bodies.wave(beta);
        Complex exact =
                s.multiply(s).add(s.multiply(3.0)).add(3.0).divide(s.add(1.0)).multiply(-8.0 * FastMath.PI / 3.0);
        Complex torque = Bodies.turningTorque(Bodies.layer(Bodies.sphere(FAR), beta), FAR);
        assertThat(Bodies.amplitudeError(torque, exact)).isCloseTo(0.0, within(2e-3));
        assertThat(Bodies.phaseError(torque, exact)).isCloseTo(0.0, within(0.1));
    }

    /**
     * Slow sphere along the wall, force over 6π: Goldman, Cox and Brenner 1967, Chem. Eng. Sci. 22:637, table (exact bipolar
     * solution, four decimals; from memory). Below a gap of a tenth of a radius the rings are too long for the film.
     */
    @ParameterizedTest
    @CsvSource({"10.0677, 1.0587", "3.7622, 1.1738", "2.3524, 1.3079", "1.5431, 1.5675"})
    void slowSphereAlongTheWall(double height, double printed) {
        Complex force = Bodies.slidingForce(Bodies.layer(Bodies.sphere(height), 0.0));
        assertThat(force.getReal() / (-6.0 * FastMath.PI)).isCloseTo(printed, within(1e-3 * printed));
    }

    /** Faxén's series, seen: 1/(1 − 9/16 x + x³/8 − 45/256 x⁴ − x⁵/16), x = a/h; its next term is below 1e-4 at h = 4. */
    @Test
    void slowSphereFurtherOff() {
        double x = 0.25;
        double series = 1.0
                / (1.0 - 9.0 / 16.0 * x + x * x * x / 8.0 - 45.0 / 256.0 * x * x * x * x - x * x * x * x * x / 16.0);
        Complex force = Bodies.slidingForce(Bodies.layer(Bodies.sphere(4.0), 0.0));
        assertThat(force.getReal() / (-6.0 * FastMath.PI)).isCloseTo(series, within(1e-3));
    }

    /** Fixed sphere touching the wall in a shear: F = 1.7009 · 6π, torque about the centre 0.9440 · 4π (O'Neill 1968, from memory). */
    @Test
    void sphereTouchingTheWallInShear() {
        RingLayer layer = Bodies.layer(Bodies.sphere(1.0), 0.0);
        Complex[] density = layer.inStream(Complex::new);
        double force = RingLayer.dot(layer.motion(1.0, 0.0, 0.0), density).getReal();
        double torque = RingLayer.dot(layer.motion(-1.0, 1.0, 1.0), density).getReal();
        assertThat(force / (6.0 * FastMath.PI)).isCloseTo(1.7009, within(2e-3));
        assertThat(torque / (4.0 * FastMath.PI)).isCloseTo(0.9440, within(1e-3));
    }

    /** Half a sphere on the wall in a shear: F = 4.30 π, torque about the foot 2.44 π (Price 1985, QJMAM 38; from memory). */
    @Test
    void bumpOnTheWallInShear() {
        RingLayer layer = Bodies.layer(Bodies.bump(), 0.0);
        Complex[] density = layer.inStream(Complex::new);
        assertThat(RingLayer.dot(layer.motion(1.0, 0.0, 0.0), density).getReal() / FastMath.PI)
                .isCloseTo(4.30, within(0.006));
        assertThat(RingLayer.dot(layer.motion(0.0, 1.0, 1.0), density).getReal() / FastMath.PI)
                .isCloseTo(2.44, within(0.006));
    }

    /** Slow spheroid across its axis, force over 6πμb: exact (Oberbeck 1876), as evaluated in the project's check values. */
    @ParameterizedTest
    @CsvSource({"2, 1.3789", "4.99, 2.3679", "9.97, 3.8033"})
    void slowSpheroid(double semiAxis, double exact) {
        Complex force = Bodies.slidingForce(Bodies.layer(Bodies.spheroid(semiAxis, FAR), 0.0));
        assertThat(force.getReal() / (-6.0 * FastMath.PI)).isCloseTo(exact, within(5e-4 * exact));
    }

    /** Blunt cylinders, free and standing on the wall, by collocation in real space; the script is beside the table. */
    @Test
    void slowBluntCylinders() {
        List<Map<String, String>> rows = ReferenceTable.of(KnownBodiesValidationTest.class, "blunt-bodies.csv")
                .rows();
        assertThat(rows).hasSize(6);
        for (Map<String, String> row : rows) {
            double length = 2.0 * ReferenceTable.number(row, "slenderness");
            double force = ReferenceTable.number(row, "force");
            if ("rod".equals(row.get("body"))) {
                Complex found = Bodies.slidingForce(Bodies.layer(Bodies.rod(length, FAR), 0.0));
                assertThat(found.getReal() / -length).isCloseTo(force, within(1e-3 * force));
            } else {
                RingLayer layer = Bodies.layer(Bodies.post(length), 0.0);
                Complex[] density = layer.inStream(Complex::new);
                double torque = ReferenceTable.number(row, "torque");
                assertThat(RingLayer.dot(layer.motion(1.0, 0.0, 0.0), density).getReal())
                        .isCloseTo(force, within(2e-3 * force));
                assertThat(RingLayer.dot(layer.motion(0.0, 1.0, 1.0), density).getReal())
                        .isCloseTo(torque, within(2e-3 * torque));
            }
        }
    }

    /**
     * Slow blunt rod against the printed fits of Tirado and García de la Torre 1979 and 1980 (partly from memory), which come from
     * beads and lie 1.7 % to 2.5 % below the collocation above; and its torque end over end.
     */
    @ParameterizedTest
    @CsvSource({"10, 0.03, 0.015", "20, 0.02, 0.005"})
    void slowRodAgainstBeadModels(double p, double forceTolerance, double torqueTolerance) {
        double length = 2.0 * p;
        RingLayer layer = Bodies.layer(Bodies.rod(length, FAR - p), 0.0);
        double force = 4.0 * FastMath.PI / (FastMath.log(p) + 0.839 + 0.185 / p + 0.233 / (p * p));
        double torque = FastMath.PI / (3.0 * (FastMath.log(p) - 0.662 + 0.917 / p - 0.050 / (p * p)));
        assertThat(Bodies.slidingForce(layer).getReal() / -length).isCloseTo(force, within(forceTolerance * force));
        assertThat(Bodies.turningTorque(layer, FAR).getReal() / -(length * length * length))
                .isCloseTo(torque, within(torqueTolerance * torque));
    }

    /**
     * Slender-body theory for a slow blunt rod, F = 4πμLU/(ln 2p + ln 2 − ½) (Cox 1970, Batchelor 1970, from memory), left with terms
     * of the order 1/ln³ p; and the end over end torque π μL³ω/(3 (ln 2p + ln 2 − 11/6)) (Batchelor 1970, from memory).
     */
    @ParameterizedTest
    @CsvSource({"50, 0.03", "100, 0.02", "200, 0.015"})
    void slowRodTendsToSlenderBodies(double p, double tolerance) {
        double length = 2.0 * p;
        RingLayer layer = Bodies.layer(Bodies.rod(length, FAR - p), 0.0);
        double logarithm = FastMath.log(2.0 * p) + FastMath.log(2.0);
        double force = 4.0 * FastMath.PI / (logarithm - 0.5);
        double torque = FastMath.PI / (3.0 * (logarithm - 11.0 / 6.0));
        assertThat(Bodies.slidingForce(layer).getReal() / -length).isCloseTo(force, within(tolerance * force));
        assertThat(Bodies.turningTorque(layer, FAR).getReal() / -(length * length * length))
                .isCloseTo(torque, within(2.0 * tolerance * torque));
    }
}
