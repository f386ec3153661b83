package flowshy.torque;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.medium.Medium;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** How torques and moments grow with the dimensions of a hair. All of it: common practice, no source. */
class ScalingTest {
    private static final Medium AIR = Medium.of("air", 1.2, 1.82e-5);

    /** Local exponent in a factor of 1.01. */
    private static double exponent(double before, double after) {
        return FastMath.log(after / before) / FastMath.log(1.01);
    }

    /** Inertial torque ∝ d² L²: common practice, no source. */
    @Test
    void inertialTorqueGrowsWithTheSquaresOfDiameterAndLength() {
        for (Profile profile : List.of(new Cylinder(8e-4, 3e-5), new Taper(8e-4, 4e-5, 1e-5))) {
            double usual = carried(profile);
            assertThat(exponent(usual, carried(profile.thickened(1.01)))).isCloseTo(2.0, within(1e-9));
            assertThat(exponent(usual, carried(profile.lengthened(1.01)))).isCloseTo(2.0, within(1e-9));
        }
    }

    private static double carried(Profile profile) {
        return -TorqueModel.of(Hairs.of(profile, 1200.0), AIR, 0.0).at(300.0).carried();
    }

    /** Moment of inertia of a slender hair ∝ d² L³: common practice, no source; the section's own term is (d/L)² 3/16 of it. */
    @Test
    void momentOfInertiaOfASlenderHairGrowsWithTheCubeOfItsLength() {
        Profile slender = new Cylinder(2e-3, 2e-5);
        double usual = Hairs.of(slender, 1200.0).inertia(0.0);
        Hair thicker = Hairs.of(slender.thickened(1.01), 1200.0);
        Hair longer = Hairs.of(slender.lengthened(1.01), 1200.0);
        assertThat(exponent(usual, thicker.inertia(0.0))).isCloseTo(2.0, within(2e-4));
        assertThat(exponent(usual, longer.inertia(0.0))).isCloseTo(3.0, within(2e-4));
    }

    /** Flow torque in a uniform stream ∝ L² (common practice, no source): the layer is thin against the hair. */
    @Test
    void flowTorqueGrowsWithTheSquareOfTheLength() {
        double omega = 2.0 * FastMath.PI * 1e6;
        double usual = flow(new Cylinder(2e-3, 2e-5), omega);
        assertThat(flow(new Cylinder(4e-3, 2e-5), omega) / usual).isCloseTo(4.0, within(1e-4));
    }

    private static double flow(Profile profile, double omega) {
        return TorqueModel.of(Hairs.of(profile, 1200.0), AIR, 0.0)
                .at(omega)
                .flow()
                .norm();
    }

    /** Thin hairs: about the cube root of the diameter (common practice, no source), between 0.24 and 0.44 in two digits. */
    @ParameterizedTest
    @ValueSource(doubles = {0.02, 0.04, 0.07, 0.1, 0.15})
    void flowTorqueOfThinHairsGrowsWithAboutTheCubeRootOfTheDiameter(double womersley) {
        assertThat(diameterExponent(womersley)).isBetween(0.235, 0.445);
    }

    /** Beyond, the exponent rises to 2, that of the displaced fluid. */
    @Test
    void theExponentRisesWithTheWomersleyNumber() {
        double before = diameterExponent(0.02);
        int compared = 0;
        for (double wo = 0.03; wo < 300.0; wo *= 1.5) {
            double here = diameterExponent(wo);
            assertThat(here).as("Wo = %s", wo).isGreaterThan(before);
            before = here;
            compared++;
        }
        assertThat(compared).isGreaterThan(20);
        assertThat(before).isBetween(1.9, 2.0);
    }

    /** d ln |f| / d ln a in a uniform stream, at constant frequency and medium. */
    private static double diameterExponent(double womersley) {
        double omega = 500.0;
        double radius = womersley * FastMath.sqrt(AIR.kinematicViscosity() / omega);
        double thin = new OscillatingCylinder(radius / FastMath.sqrt(1.01), AIR)
                .streamForcePerVelocity(omega, Complex.ONE)
                .norm();
        double thick = new OscillatingCylinder(radius * FastMath.sqrt(1.01), AIR)
                .streamForcePerVelocity(omega, Complex.ONE)
                .norm();
        return exponent(thin, thick);
    }
}
