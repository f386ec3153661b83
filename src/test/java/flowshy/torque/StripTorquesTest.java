package flowshy.torque;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

class StripTorquesTest {
    /** Open, sealed, and a cover that lets a third in, 35° behind. */
    private static final List<Complex> FACTORS = List.of(Complex.ONE, Complex.ZERO, new Complex(0.27, -0.19));

    /** 1e-2 Hz to 1e5 Hz, three a decade. */
    private static final int FREQUENCIES = 22;

    private static double omega(int index) {
        return 2.0 * FastMath.PI * FastMath.pow(10.0, -2.0 + index / 3.0);
    }

    /** Doubling the points moves no part of any torque by 1e-8; what is seen is 1e-10. */
    @Test
    void isConverged() {
        int compared = 0;
        for (Map.Entry<String, Profile> profile : Hairs.profiles().entrySet()) {
            for (Medium medium : Hairs.media()) {
                Hair hair = Hairs.of(profile.getValue(), 1200.0);
                TorqueModel usual = new StripTorques(hair, medium, 3e-6);
                TorqueModel fine = new StripTorques(hair, medium, 3e-6, Covers.OPEN, 2);
                for (int i = 0; i < FREQUENCIES; i++) {
                    Torques one = usual.at(omega(i));
                    Torques two = fine.at(omega(i));
                    String where = profile.getKey() + " in " + medium.name() + " at " + omega(i) + " rad/s";
                    same(one.flow(), two.flow(), where);
                    same(one.open(), two.open(), where);
                    same(one.fluidInertia(), two.fluidInertia(), where);
                    assertThat(one.carried() / two.carried()).as(where).isCloseTo(1.0, within(1e-8));
                    compared++;
                }
                Complex s = new Complex(-400.0, 900.0);
                same(usual.fluidInertia(s), fine.fluidInertia(s), profile.getKey());
            }
        }
        assertThat(compared).isEqualTo(13 * 4 * FREQUENCIES);
    }

    /** The same under roofs, low and high: there a second layer hangs over the tip. */
    @Test
    void isConvergedUnderARoof() {
        int compared = 0;
        for (Map.Entry<String, Profile> profile : Hairs.profiles().entrySet()) {
            for (Medium medium : Hairs.media()) {
                for (double gap : new double[] {1.02, 1.4, 6.0}) {
                    Cover roof = new RoofedCover(gap * profile.getValue().length(), 5e-3);
                    Hair hair = Hairs.of(profile.getValue(), 1200.0);
                    TorqueModel usual = TorqueModel.of(hair, medium, 3e-6, roof);
                    TorqueModel fine = new StripTorques(hair, medium, 3e-6, roof, 2);
                    for (int i = 0; i < FREQUENCIES; i += 2) {
                        Torques one = usual.at(omega(i));
                        Torques two = fine.at(omega(i));
                        String where = profile.getKey() + " in " + medium.name() + " at " + omega(i) + " rad/s, " + gap;
                        same(one.flow(), two.flow(), where);
                        same(one.open(), two.open(), where);
                        compared++;
                    }
                }
            }
        }
        assertThat(compared).isEqualTo(13 * 4 * 3 * FREQUENCIES / 2);
    }

    private static void same(Complex one, Complex two, String where) {
        assertThat(one.getReal() / two.getReal()).as(where).isCloseTo(1.0, within(1e-8));
        assertThat(one.getImaginary() / two.getImaginary()).as(where).isCloseTo(1.0, within(1e-8));
    }

    /** The closed forms of the cylinder and the strips know nothing of each other; both sides of their own change of method. */
    @Test
    void agreesWithTheClosedFormsOfTheCylinder() {
        int compared = 0;
        for (Medium medium : Hairs.media()) {
            for (double depth : new double[] {0.0, 2.4e-5, 9e-4}) {
                Hair hair = Hairs.of(new Cylinder(8.3e-4, 3.7e-5), 1190.0);
                TorqueModel closed = TorqueModel.of(hair, medium, depth);
                assertThat(closed).isInstanceOf(CylinderTorques.class);
                TorqueModel strips = new StripTorques(hair, medium, depth, Covers.OPEN, 4);
                for (int i = 0; i < FREQUENCIES; i++) {
                    Torques one = closed.at(omega(i));
                    Torques two = strips.at(omega(i));
                    near(one.flow(), two.flow());
                    near(one.open(), two.open());
                    near(one.fluidInertia(), two.fluidInertia());
                    assertThat(one.carried() / two.carried()).isCloseTo(1.0, within(1e-12));
                    compared++;
                }
                Complex s = new Complex(-400.0, 900.0);
                near(closed.fluidInertia(s), strips.fluidInertia(s));
            }
        }
        assertThat(compared).isEqualTo(4 * 3 * FREQUENCIES);
    }

    private static void near(Complex one, Complex two) {
        assertThat(one.subtract(two).norm() / two.norm()).isCloseTo(0.0, within(1e-12));
    }

    /** T_motion(cover) = T_carried − T_flow(cover), each integral evaluated apart: every profile, medium and cover. */
    @Test
    void motionIsWhatIsCarriedLessTheFlow() {
        int compared = 0;
        for (Profile profile : Hairs.profiles().values()) {
            for (Medium medium : Hairs.media()) {
                for (double density : new double[] {400.0, 998.2, 2330.0}) {
                    TorqueModel model = TorqueModel.of(Hairs.of(profile, density), medium, 0.0);
                    for (int i = 0; i < FREQUENCIES; i += 3) {
                        Torques torques = model.at(omega(i));
                        for (Complex factor : FACTORS) {
                            Complex rest = torques.motion(factor)
                                    .add(torques.flow(factor))
                                    .subtract(torques.carried());
                            double size = torques.open().norm() + torques.flow().norm();
                            assertThat(rest.norm() / size).isCloseTo(0.0, within(1e-13));
                            compared++;
                        }
                    }
                }
            }
        }
        assertThat(compared).isEqualTo(13 * 4 * 3 * 8 * 3);
    }

    /** The same with the profile under each cover, its factor, and its own medium's law. */
    @Test
    void motionIsWhatIsCarriedLessTheFlowUnderEveryCover() {
        List<Cover> covers = List.of(
                Covers.OPEN,
                Covers.SEALED,
                new SealedCover(Optional.of(new Cavity(4e-3, 2e-3))),
                new RoofedCover(1.3e-3, 5e-3));
        int compared = 0;
        for (Profile profile : Hairs.profiles().values()) {
            for (Medium medium : Hairs.media()) {
                for (Cover cover : covers) {
                    TorqueModel model = TorqueModel.of(Hairs.of(profile, 1200.0), medium, 0.0, cover);
                    for (int i = 0; i < FREQUENCIES; i += 5) {
                        Torques torques = model.at(omega(i));
                        Complex factor = cover.factor(omega(i), medium);
                        Complex rest =
                                torques.motion(factor).add(torques.flow(factor)).subtract(torques.carried());
                        double size = torques.open().norm() + torques.flow().norm();
                        assertThat(rest.norm() / size)
                                .as("%s, %s", cover.words(), profile)
                                .isCloseTo(0.0, within(1e-13));
                        compared++;
                    }
                }
            }
        }
        assertThat(compared).isEqualTo(13 * 4 * 4 * 5);
    }

    @Test
    void aSealedCoverLetsNoFlowInAndCarriesTheFluid() {
        Torques torques = TorqueModel.of(
                        Hairs.of(new Cylinder(8e-4, 4e-5), 1180.0),
                        Hairs.media().get(0),
                        0.0)
                .at(500.0);
        assertThat(torques.flow(Complex.ZERO).norm()).isZero();
        assertThat(torques.motion(Complex.ZERO)).isEqualTo(new Complex(torques.carried()));
        assertThat(torques.flow(Complex.ONE)).isEqualTo(torques.flow());
        assertThat(torques.motion(Complex.ONE)).isEqualTo(torques.open());
    }

    /** A hair as dense as its fluid, carried along, feels nothing; the base moves one way, the hair stays behind the other. */
    @Test
    void carriedTorqueFollowsTheDifferenceOfDensities() {
        for (Profile profile : List.copyOf(Hairs.profiles().values())) {
            Medium water = Hairs.media().get(2);
            assertThat(TorqueModel.of(Hairs.of(profile, water.density()), water, 0.0)
                            .at(300.0)
                            .carried())
                    .isZero();
            assertThat(TorqueModel.of(Hairs.of(profile, 1200.0), water, 0.0)
                            .at(300.0)
                            .carried())
                    .isNegative();
            assertThat(TorqueModel.of(Hairs.of(profile, 400.0), water, 0.0)
                            .at(300.0)
                            .carried())
                    .isPositive();
        }
    }

    /** The medium takes power out of a turning hair, adds inertia to it, and drives it with the flow, at every frequency. */
    @Test
    void signsAreThoseOfAPassiveMedium() {
        int compared = 0;
        for (Profile profile : Hairs.profiles().values()) {
            for (Medium medium : Hairs.media()) {
                TorqueModel model = TorqueModel.of(Hairs.of(profile, 1200.0), medium, 0.0);
                for (int i = 0; i < FREQUENCIES; i++) {
                    Torques torques = model.at(omega(i));
                    assertThat(torques.fluidInertia().getReal()).isPositive().isFinite();
                    assertThat(torques.fluidInertia().getImaginary())
                            .isNegative()
                            .isFinite();
                    assertThat(torques.flow().getReal()).isPositive().isFinite();
                    // drag leads: per acceleration it lags by up to 90°
                    assertThat(torques.flow().getImaginary()).isNegative().isFinite();
                    compared++;
                }
            }
        }
        assertThat(compared).isEqualTo(13 * 4 * FREQUENCIES);
    }
}
