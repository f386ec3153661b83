package flowshy.stream.cover;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.medium.Medium;
import flowshy.medium.Phase;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;

/** Both limits of a tube by hand, continuity where the expansion takes over, and the handbook's resonator. */
class HoleImpedanceValidationTest {
    private static final Medium AIR = new Medium(
            "air",
            Phase.GAS,
            293.15,
            101325.0,
            1.20458,
            18.206e-6,
            OptionalDouble.of(343.34),
            OptionalDouble.empty(),
            List.of(),
            List.of());

    /** ω → 0: Poiseuille's 8μt/(πr⁴), and 4/3 of the plug's inertia (kinetic energy of a parabola, by hand). */
    @Test
    void tendsToPoiseuilleFlow() {
        HoleImpedance hole = new HoleImpedance(0.1e-3, 0.4e-3, AIR);
        double omega = 0.5;
        Complex tube = hole.tube(omega);
        double resistance = 8.0 * 18.206e-6 * 0.4e-3 / (Math.PI * 1e-16);
        double inertia = 4.0 / 3.0 * omega * 1.20458 * 0.4e-3 / hole.area();
        assertThat(tube.getReal()).isCloseTo(resistance, within(1e-9 * resistance));
        assertThat(tube.getImaginary()).isCloseTo(inertia, within(1e-6 * inertia));
        assertThat(hole.steady()).isCloseTo(resistance + 3.0 * 18.206e-6 / 1e-12, within(1e-9 * resistance));
    }

    /** ω → ∞: plug flow with a Stokes layer, Z → iωρt/(πr²) (1 + (1−i)δ/r), second order left out. */
    @Test
    void tendsToPlugFlow() {
        HoleImpedance hole = new HoleImpedance(1e-3, 2e-3, AIR);
        double omega = 2e6;
        double layer = AIR.stokesLayer(omega) / 1e-3;
        double inertia = omega * 1.20458 * 2e-3 / hole.area();
        Complex tube = hole.tube(omega);
        assertThat(tube.getImaginary()).isCloseTo(inertia * (1.0 + layer), within(2.0 * layer * layer * inertia));
        assertThat(tube.getReal()).isCloseTo(inertia * layer, within(3.0 * layer * layer * inertia));
    }

    @Test
    void joinsItsExpansionWithoutAStep() {
        HoleImpedance hole = new HoleImpedance(0.1e-3, 0.4e-3, AIR);
        // |λ|/√2 = 0.02 at ω = 2 · 0.02² ν/r²
        double omega = 2.0 * 4e-4 * AIR.kinematicViscosity() / 1e-8;
        Complex below = hole.tube(omega * (1.0 - 1e-9));
        Complex above = hole.tube(omega * (1.0 + 1e-9));
        assertThat(above.subtract(below).norm() / below.norm()).isLessThan(1e-8);
    }

    /** One hole and a volume: f = c/(2π) √(A/(V t')), t' = t + 16r/(3π) (handbook; worked by hand: 1126.3 Hz). */
    @Test
    void resonatesAsTheHandbookSays() {
        VentedCover cover = new VentedCover(1, 1e-3, 1e-3, false, 1e-6, 1e-4);
        double effective = 1e-3 + 16.0 * 0.5e-3 / (3.0 * Math.PI);
        double expected = 343.34 / (2.0 * Math.PI) * Math.sqrt(Math.PI * 0.25e-6 / (effective * 1e-6));
        assertThat(expected).isCloseTo(1126.3, within(0.05));
        assertThat(cover.resonance(AIR).orElseThrow()).isCloseTo(expected, within(1e-9 * expected));
        double peak = 0.0;
        double at = 0.0;
        for (double f = 700.0; f < 1700.0; f += 1.0) {
            double size = cover.factor(2.0 * Math.PI * f, AIR).norm();
            if (size > peak) {
                peak = size;
                at = f;
            }
        }
        assertThat(at).isCloseTo(expected, within(0.05 * expected)); // viscous mass in the hole lowers it a little
    }

    /** The smaller the holes, the less gets in, down to the sealed cavity; from where friction in them outweighs the cavity's spring. */
    @Test
    void closesAsTheHolesShrink() {
        for (boolean through : new boolean[] {false, true}) {
            double before = Double.POSITIVE_INFINITY;
            for (double diameter = 60e-6; diameter > 0.5e-6; diameter *= 0.5) {
                VentedCover cover = new VentedCover(4, diameter, 0.3e-3, through, 30e-9, 9e-6);
                double size = cover.factor(2.0 * Math.PI * 40.0, AIR).norm();
                assertThat(size).isLessThan(before);
                before = size;
            }
            assertThat(before).isLessThan(1e-9);
        }
    }

    /**
     * More holes let more in: through a cavity always, breathing while friction rules. With wide holes a breathing cavity is ruled by
     * its own spring, |φ| ∝ 1/(1 − (f/f₀)²), and more holes raise f₀: they then let a trace less in, which is right and stays.
     */
    @Test
    void moreHolesNeverAttenuateMoreWhileFrictionRules() {
        for (boolean through : new boolean[] {false, true}) {
            double before = 0.0;
            for (int holes = 1; holes <= 64; holes *= 2) {
                VentedCover cover = new VentedCover(holes, 20e-6, 0.3e-3, through, 30e-9, 9e-6);
                double size = cover.factor(2.0 * Math.PI * 60.0, AIR).norm();
                assertThat(size).isGreaterThan(before);
                before = size;
            }
        }
        double few = new VentedCover(2, 0.3e-3, 0.3e-3, false, 30e-9, 9e-6)
                .factor(377.0, AIR)
                .norm();
        double many = new VentedCover(8, 0.3e-3, 0.3e-3, false, 30e-9, 9e-6)
                .factor(377.0, AIR)
                .norm();
        assertThat(many / few).isBetween(0.99, 1.0);
    }

    /** A cavity without walls across the stream, wide holes: what is outside is inside. */
    @Test
    void wideThroughHolesLetTheStreamIn() {
        VentedCover cover = new VentedCover(100000, 1e-3, 1e-6, true, 0.1, 0.1);
        assertThat(cover.factor(2.0 * Math.PI * 1000.0, AIR).norm()).isCloseTo(1.0, within(0.1));
    }
}
