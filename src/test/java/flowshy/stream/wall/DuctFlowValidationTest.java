package flowshy.stream.wall;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Against textbook values of developed duct flow (Shah and London 1978, White; from memory) and measured orders. */
class DuctFlowValidationTest {
    private static final double AIR = 1.51e-5;

    /** Greatest over mean velocity: pipe 2, square 2.0962, rectangle 2 : 1 1.9918, wide slot 1.5. */
    @Test
    void laminarMiddleOverMean() {
        assertThat(new DuctSection.Round(0.3).laminarShare(0.15)).isCloseTo(2.0, within(1e-15));
        assertThat(new DuctSection.Rectangular(0.2, 0.2).laminarShare(0.1)).isCloseTo(2.0962, within(1e-4));
        assertThat(new DuctSection.Rectangular(0.4, 0.2).laminarShare(0.1)).isCloseTo(1.9918, within(2e-4));
        assertThat(new DuctSection.Rectangular(0.2, 0.4).laminarShare(0.2)).isCloseTo(1.9918, within(2e-4));
        assertThat(new DuctSection.Rectangular(100.0, 0.2).laminarShare(0.1)).isCloseTo(1.5, within(2e-3));
    }

    /** The mean over a rectangle of the velocity is one: integrated here over slices from the finite-difference solution of ∇²u = −1. */
    @Test
    void laminarProfileOfARectangleFromDifferences() {
        int n = 40;
        double[][] u = new double[n + 1][n + 1];
        for (int sweep = 0; sweep < 6000; sweep++) {
            for (int i = 1; i < n; i++) {
                for (int j = 1; j < n; j++) {
                    // width twice the height: 1/(2h)² across, 1/h² upwards
                    double around = 0.25 * (u[i - 1][j] + u[i + 1][j]) + u[i][j - 1] + u[i][j + 1];
                    u[i][j] = (around + 1.0 / (n * n)) / 2.5;
                }
            }
        }
        double mean = 0.0;
        for (double[] row : u) {
            for (double value : row) {
                mean += value / (n * n);
            }
        }
        DuctSection section = new DuctSection.Rectangular(2.0, 1.0);
        for (int j = 2; j < n; j += 3) {
            assertThat(section.laminarShare((double) j / n))
                    .isCloseTo(u[n / 2][j] / mean, Percentage.withPercentage(0.3));
        }
    }

    @Test
    void hydraulicDiameters() {
        assertThat(new DuctSection.Rectangular(0.2, 0.12).hydraulicDiameter()).isCloseTo(0.15, within(1e-15));
        assertThat(new DuctSection.Rectangular(0.2, 0.12).area()).isCloseTo(0.024, within(1e-15));
        assertThat(new DuctSection.Round(0.1).area()).isCloseTo(7.85398e-3, within(1e-8));
        assertThat(new DuctSection.Round(0.1).hydraulicDiameter()).isEqualTo(0.1);
    }

    /** Wall shear of laminar pipe flow: 8 μU/D, so the profile begins with 8Uz/D; of the wide slot 6. */
    @Test
    void laminarProfileBeginsWithTheWallShear() {
        DuctFlow slow = new DuctFlow(new DuctSection.Round(0.02), 0.5, AIR);
        assertThat(slow.reynolds()).isCloseTo(662.25, within(0.01));
        assertThat(slow.intermittency()).isZero();
        assertThat(slow.speedAt(1e-6)).isCloseTo(8.0 * 0.5 * 1e-6 / 0.02, Percentage.withPercentage(0.01));
        assertThat(slow.coreSpeed()).isCloseTo(1.0, within(1e-12));
    }

    /** 5 m/s in a 0.2 m pipe: f = 0.0196 at Re 6.6e4, u_τ = 0.248 m/s; the axis 1.14 times the mean, where pipes show 1.2 (from memory). */
    @Test
    void turbulentDuct() {
        DuctFlow duct = new DuctFlow(new DuctSection.Round(0.2), 5.0, AIR);
        assertThat(duct.intermittency()).isEqualTo(1.0);
        assertThat(duct.wall().frictionVelocity())
                .isCloseTo(5.0 * Math.sqrt(PipeFriction.PRANDTL.factor(duct.reynolds()) / 8.0), within(1e-12));
        assertThat(duct.wall().frictionVelocity()).isBetween(0.245, 0.25);
        assertThat(duct.coreSpeed() / 5.0).isBetween(1.13, 1.25);
        assertThat(duct.speedAt(0.19)).isCloseTo(duct.speedAt(0.01), within(1e-9));
        assertThat(duct.speedAt(0.0)).isZero();
    }

    /** Spalding's profile carries the mean speed that the friction law was given, less 4.5 % (no wake, low buffer). */
    @Test
    void turbulentProfileCarriesTheFlow() {
        DuctFlow duct = new DuctFlow(new DuctSection.Round(0.2), 5.0, AIR);
        double flow = 0.0;
        int n = 20000;
        for (int i = 0; i < n; i++) {
            double z = 0.1 * (i + 0.5) / n;
            flow += duct.speedAt(z) * 2.0 * Math.PI * (0.1 - z) * 0.1 / n;
        }
        assertThat(flow / duct.section().area()).isCloseTo(5.0 * 0.955, Percentage.withPercentage(1.0));
    }

    @Test
    void noStepThroughTransition() {
        for (double edge : new double[] {2300.0, 4000.0}) {
            double speed = edge * AIR / 0.2;
            DuctSection pipe = new DuctSection.Round(0.2);
            double below = new DuctFlow(pipe, speed * (1.0 - 1e-7), AIR).speedAt(1e-3);
            double above = new DuctFlow(pipe, speed * (1.0 + 1e-7), AIR).speedAt(1e-3);
            assertThat(above).isCloseTo(below, Percentage.withPercentage(1e-3));
        }
        double middle = 3150.0 * AIR / 0.2;
        assertThat(new DuctFlow(new DuctSection.Round(0.2), middle, AIR).intermittency())
                .isCloseTo(0.5, within(1e-9));
    }

    @Test
    void refusesWhatIsNoDuct() {
        assertThatThrownBy(() -> new DuctSection.Rectangular(0.2, -0.1)).hasMessageContaining("height");
        assertThatThrownBy(() -> new DuctFlow(new DuctSection.Round(0.2), 0.0, AIR))
                .hasMessageContaining("mean speed");
    }
}
