package flowshy.torque;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.math.LogTable;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import flowshy.stream.StokesLayer;
import flowshy.stream.WallShare;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.MeasuredCover;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.stream.cover.VentedCover;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

/** Torques under every cover: the three integrals apart, the limits between covers, and what a cavity does to the hair's own turning. */
class CoverTorquesTest {
    private static final double DEPTH = 4e-6;

    private static final List<Profile> PROFILES = List.of(
            new Cylinder(8e-4, 4e-5),
            new Taper(7.2e-4, 4.4e-5, 2.2e-5),
            new Club(6.6e-4, 1.4e-5, 3.7e-4, 1e-4, 5.2e-5, End.FLAT));

    private static final List<Medium> MEDIA =
            List.of(known("air", 1.2, 1.82e-5, 343.0), known("water", 998.2, 1.0016e-3, 1482.0));

    private static Medium known(String name, double density, double viscosity, double soundSpeed) {
        return new Medium(
                name,
                Phase.UNSTATED,
                293.15,
                101325.0,
                density,
                viscosity,
                OptionalDouble.of(soundSpeed),
                OptionalDouble.empty(),
                List.of(),
                List.of());
    }

    private static List<Cover> covers() {
        LogTable level = new LogTable(List.of(1.0, 100.0, 2e4), List.of(0.0, 12.0, -3.0));
        LogTable phase = new LogTable(List.of(1.0, 2e4), List.of(-20.0, 150.0));
        return List.of(
                Covers.OPEN,
                Covers.SEALED,
                new SealedCover(Optional.of(new Cavity(4e-4, 1e-3))),
                new RoofedCover(9e-4, 5e-3),
                new RoofedCover(3e-2, 5e-2),
                new VentedCover(6, 2e-4, 1e-4, false, 4e-9, 2e-6),
                new VentedCover(6, 2e-4, 1e-4, true, 4e-9, 2e-6),
                new MeasuredCover("a.csv", level, Optional.empty()),
                new MeasuredCover("b.csv", level, Optional.of(phase)));
    }

    /** ∫ πa² g(z) ℓ dz by Simpson's rule on 4000 intervals, graded to the wall where the layer is; not the strips' own points. */
    private static Complex integral(Profile profile, WallShare flow, Medium medium, double omega, boolean past) {
        Complex sum = Complex.ZERO;
        List<Double> breaks = profile.breaks();
        for (int part = 1; part < breaks.size(); part++) {
            double from = breaks.get(part - 1);
            double span = breaks.get(part) - from;
            int intervals = 4000;
            for (int i = 0; i <= intervals; i++) {
                double t = (double) i / intervals;
                double z = from + span * t * t;
                // a hair's breadth inside the piece, so that a step counts to its own side
                double radius = profile.radius(i == 0 ? from + 1e-12 * span : FastMath.min(z, profile.length()));
                Complex value = past
                        ? new OscillatingCylinder(radius, medium)
                                .hydrodynamicFunction(omega)
                                .multiply(flow.share(z, omega))
                        : Complex.ONE;
                double weight = i == 0 || i == intervals ? 1.0 : i % 2 == 1 ? 4.0 : 2.0;
                double moment = FastMath.PI * radius * radius * (z + DEPTH) * 2.0 * span * t;
                sum = sum.add(value.multiply(weight * moment / (3.0 * intervals)));
            }
        }
        return sum;
    }

    /** T_motion = T_carried − T_flow for every linear cover; each of the three is also made by another rule, from its own integrand. */
    @Test
    void motionIsCarriedLessFlowUnderEveryCover() {
        double omega = 2.0 * FastMath.PI * 130.0;
        int checked = 0;
        for (Profile profile : PROFILES) {
            Hair hair = Hairs.of(profile, 1190.0);
            for (Medium medium : MEDIA) {
                double rho = medium.density();
                Complex first = integral(profile, (height, w) -> Complex.ONE, medium, omega, false);
                for (Cover cover : covers()) {
                    Torques torques = TorqueModel.of(hair, medium, DEPTH, cover).at(omega);
                    Complex factor = cover.factor(omega, medium);
                    Complex past = integral(profile, cover.profile(medium), medium, omega, true);
                    Complex flow = first.add(past).multiply(rho).multiply(factor);
                    // the hair's own mass, less the share of the fluid that comes along, less what the rest of it drags
                    Complex motion = first.multiply(-1190.0)
                            .add(first.multiply(rho).multiply(Complex.ONE.subtract(factor)))
                            .subtract(past.multiply(rho).multiply(factor));
                    String where = profile.shape() + ", " + medium.name() + ", " + cover.words();
                    double scale = FastMath.max(flow.norm(), first.norm() * 1190.0);
                    assertThat(torques.flow(factor).subtract(flow).norm() / scale)
                            .as(where)
                            .isLessThan(1e-8);
                    assertThat(torques.motion(factor).subtract(motion).norm() / scale)
                            .as(where)
                            .isLessThan(1e-8);
                    Complex identity = torques.flow(factor).negate().add(torques.carried());
                    assertThat(torques.motion(factor).subtract(identity).norm() / scale)
                            .as(where)
                            .isLessThan(1e-14);
                    checked++;
                }
            }
        }
        assertThat(checked).isEqualTo(54);
    }

    @Test
    void aMeasuredCoverOfNoAttenuationIsTheOpenDeviceExactly() {
        LogTable none = new LogTable(List.of(1.0, 1e4), List.of(0.0, 0.0));
        Cover measured = new MeasuredCover("none.csv", none, Optional.empty());
        for (Profile profile : PROFILES) {
            for (Medium medium : MEDIA) {
                for (double frequency : new double[] {1.0, 77.0, 1e4}) {
                    double omega = 2.0 * FastMath.PI * frequency;
                    Hair hair = Hairs.of(profile, 1190.0);
                    Torques open = TorqueModel.of(hair, medium, DEPTH).at(omega);
                    Torques covered =
                            TorqueModel.of(hair, medium, DEPTH, measured).at(omega);
                    Complex factor = measured.factor(omega, medium);
                    assertThat(covered).isEqualTo(open);
                    assertThat(covered.motion(factor)).isEqualTo(open.open());
                    assertThat(covered.flow(factor)).isEqualTo(open.flow());
                }
            }
        }
    }

    /**
     * Smaller holes, less flow; none left is the sealed cavity. Holes so wide that the cavity follows the pressure as a whole are left out:
     * there the nearing resonance of narrower ones gives a little more flow (5e-5 here).
     */
    @Test
    void sealedIsTheLimitOfVentedWithShrinkingHoles() {
        double omega = 2.0 * FastMath.PI * 40.0;
        double section = 2e-6;
        Cover sealed = new SealedCover(
                Optional.of(new Cavity(2.0 * FastMath.sqrt(section / FastMath.PI), /* height= */ 2e-3)));
        for (Medium medium : MEDIA) {
            Hair hair = Hairs.of(PROFILES.get(0), 1190.0);
            Torques closed = TorqueModel.of(hair, medium, DEPTH, sealed).at(omega);
            for (boolean through : new boolean[] {true, false}) {
                double before = Double.POSITIVE_INFINITY;
                Torques torques = closed;
                Complex factor = Complex.ONE;
                for (double diameter = through ? 4e-4 : 2e-5; diameter > 1e-9; diameter *= 0.5) {
                    Cover vented = new VentedCover(5, diameter, 1e-4, through, 4e-9, section);
                    torques = TorqueModel.of(hair, medium, DEPTH, vented).at(omega);
                    factor = vented.factor(omega, medium);
                    double flow = torques.flow(factor).norm();
                    assertThat(flow).as("holes of %g m", diameter).isLessThan(before);
                    before = flow;
                }
                assertThat(torques.motion(factor).subtract(closed.carried()).norm() / FastMath.abs(closed.carried()))
                        .isLessThan(1e-9);
                assertThat(torques.fluidInertia()).isEqualTo(closed.fluidInertia());
            }
        }
    }

    /**
     * The wall's effect on a hair that turns on the axis falls with (b/a)², so a hundred times wider is ten thousand times less. A narrow
     * cavity damps more and carries more along; between the two the added mass may dip below that of open fluid, as the wall stops the
     * layer that would have come along.
     */
    @Test
    void aWideCavityGivesTheOpenDampingANarrowOneMore() {
        double omega = 2.0 * FastMath.PI * 300.0;
        for (Medium medium : MEDIA) {
            double reach = 4e-5 + new StokesLayer(medium.kinematicViscosity()).thickness(omega);
            for (Profile profile : PROFILES) {
                Hair hair = Hairs.of(profile, 1190.0);
                Complex open = TorqueModel.of(hair, medium, DEPTH).at(omega).fluidInertia();
                double wide = distance(hair, medium, omega, 1e3 * reach, open);
                double wider = distance(hair, medium, omega, 1e5 * reach, open);
                assertThat(wide).isBetween(1e-9, 1e-5);
                assertThat(wide / wider).isBetween(9e3, 1.1e4);
                double damping = -open.getImaginary();
                for (double radius : new double[] {4.0 * reach, 2.0 * reach, 1.1e-4, 6e-5}) {
                    Complex inside = inside(hair, medium, omega, radius);
                    assertThat(-inside.getImaginary()).as("b = %g m", radius).isGreaterThan(damping);
                    damping = -inside.getImaginary();
                }
                assertThat(damping / -open.getImaginary()).isGreaterThan(2.0);
            }
            Hair hair = Hairs.of(PROFILES.get(0), 1190.0);
            Complex open = TorqueModel.of(hair, medium, DEPTH).at(omega).fluidInertia();
            // a gap of share e of the radius, squeezed to and fro: the parabola's kinetic energy, 6/5 of the mean's,
            // gives Re Γ = 1.2/e
            double displaced = medium.density() * FastMath.PI * 4e-5 * 4e-5;
            double turning = displaced * (FastMath.pow(8e-4 + DEPTH, 3) - FastMath.pow(DEPTH, 3)) / 3.0;
            Complex narrow = inside(hair, medium, omega, 1.01 * 4e-5);
            assertThat(narrow.getReal() / (120.0 * turning)).isCloseTo(1.0, within(0.02));
            assertThat(narrow.getReal()).isGreaterThan(2.0 * open.getReal());
        }
    }

    private static double distance(Hair hair, Medium medium, double omega, double radius, Complex open) {
        return inside(hair, medium, omega, radius).subtract(open).norm() / open.norm();
    }

    private static Complex inside(Hair hair, Medium medium, double omega, double radius) {
        Cover sealed = new SealedCover(Optional.of(new Cavity(2.0 * radius, 2e-3)));
        return TorqueModel.of(hair, medium, DEPTH, sealed).at(omega).fluidInertia();
    }
}
