package flowshy.hair;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club.End;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Mass and moments against the solids of any handbook of mechanics; parallel axes are shifted by hand. */
class MomentsValidationTest {
    private static final double LENGTH = 7.3e-4;
    private static final double RADIUS = 4.1e-5;
    private static final double AREA = FastMath.PI * RADIUS * RADIUS;

    /** Cylinder about its base: volume πr²L, centroid L/2, second moment V (L²/3 + r²/4). */
    @Test
    void cylinder() {
        Moments moments = Moments.of(new Cylinder(LENGTH, RADIUS), 0.0);
        double volume = AREA * LENGTH;
        close(moments.volume(), volume);
        close(moments.first(), volume * LENGTH / 2.0);
        close(moments.second(), volume * (LENGTH * LENGTH / 3.0 + RADIUS * RADIUS / 4.0));
    }

    /** Cone about its base: volume a third, centroid L/4, second moment πr²L (L²/30 + r²/20). */
    @Test
    void cone() {
        Moments moments = Moments.of(new Taper(LENGTH, RADIUS, 0.0), 0.0);
        double volume = AREA * LENGTH / 3.0;
        close(moments.volume(), volume);
        close(moments.first(), volume * LENGTH / 4.0);
        close(moments.second(), AREA * LENGTH * (LENGTH * LENGTH / 30.0 + RADIUS * RADIUS / 20.0));
    }

    /** Frustum: V = πL/3 (R² + Rr + r²), centroid L (R² + 2Rr + 3r²)/(4 (R² + Rr + r²)); it may also widen upwards. */
    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 2.2e-5, 6.4e-5})
    void frustum(double tip) {
        Moments moments = Moments.of(new Taper(LENGTH, RADIUS, tip), 0.0);
        double squares = RADIUS * RADIUS + RADIUS * tip + tip * tip;
        double volume = FastMath.PI * LENGTH / 3.0 * squares;
        close(moments.volume(), volume);
        double centroid = LENGTH * (RADIUS * RADIUS + 2.0 * RADIUS * tip + 3.0 * tip * tip) / (4.0 * squares);
        close(moments.first(), volume * centroid);
    }

    /**
     * Paraboloid r = r₀ √(1 − z/L), about its base: volume a half, centroid L/3, second moment πr₀²L (L²/12 + r₀²/12). Measured
     * at heights that are even in the radius, it is a chain of frustums whose error falls with the square of the step.
     */
    @Test
    void paraboloidFromMeasuredPoints() {
        Moments coarse = Moments.of(paraboloid(150), 0.0);
        Moments fine = Moments.of(paraboloid(300), 0.0);
        double volume = AREA * LENGTH / 2.0;
        double first = volume * LENGTH / 3.0;
        double second = AREA * LENGTH * (LENGTH * LENGTH + RADIUS * RADIUS) / 12.0;
        assertThat(fine.volume() / volume).isCloseTo(1.0, within(1e-4));
        extrapolated(coarse.volume(), fine.volume(), volume);
        extrapolated(coarse.first(), fine.first(), first);
        extrapolated(coarse.second(), fine.second(), second);
    }

    /** Cylinder with half a sphere on top: V = 2πR³/3, centroid 3R/8 over its flat face, second moment 2VR²/5 about that face. */
    @ParameterizedTest
    @ValueSource(doubles = {0.0, 1.7e-5, 9e-4})
    void clubOfOneDiameterWithARoundEnd(double pivotDepth) {
        double below = LENGTH - RADIUS;
        Club club = new Club(LENGTH, RADIUS, 0.4 * LENGTH, 0.1 * LENGTH, RADIUS, End.ROUND);
        Moments moments = Moments.of(club, pivotDepth);
        double stalk = AREA * below;
        double cap = 2.0 / 3.0 * FastMath.PI * RADIUS * RADIUS * RADIUS;
        double stalkArm = 0.5 * below + pivotDepth;
        double capArm = below + 3.0 / 8.0 * RADIUS + pivotDepth;
        double capOwn = cap * RADIUS * RADIUS * (2.0 / 5.0 - 9.0 / 64.0);
        close(moments.volume(), stalk + cap);
        close(moments.first(), stalk * stalkArm + cap * capArm);
        close(
                moments.second(),
                stalk * (below * below / 12.0 + RADIUS * RADIUS / 4.0 + stalkArm * stalkArm)
                        + capOwn
                        + cap * capArm * capArm);
    }

    /** Two cylinders, one on the other. */
    @Test
    void clubWithAStepAndAFlatEnd() {
        double thin = 1.3e-5;
        double joint = 4.4e-4;
        double pivotDepth = 6e-6;
        Moments moments = Moments.of(new Club(LENGTH, thin, joint, 0.0, RADIUS, End.FLAT), pivotDepth);
        double stalk = FastMath.PI * thin * thin * joint;
        double head = AREA * (LENGTH - joint);
        double stalkArm = 0.5 * joint + pivotDepth;
        double headArm = 0.5 * (LENGTH + joint) + pivotDepth;
        close(moments.volume(), stalk + head);
        close(moments.first(), stalk * stalkArm + head * headArm);
        close(
                moments.second(),
                stalk * (joint * joint / 12.0 + thin * thin / 4.0 + stalkArm * stalkArm)
                        + head
                                * ((LENGTH - joint) * (LENGTH - joint) / 12.0
                                        + RADIUS * RADIUS / 4.0
                                        + headArm * headArm));
    }

    /** Shoulder r = m − c cos πt with a hair's breadth of stalk and head: ∫ a² t^n dt and ∫ a⁴ dt by parts, by hand. */
    @Test
    void cosineShoulder() {
        double thin = 1.5e-5;
        double rest = 1e-12 * LENGTH;
        double span = LENGTH - 2.0 * rest;
        Moments moments = Moments.of(new Club(LENGTH, thin, rest, span, RADIUS, End.FLAT), 0.0);
        double m = 0.5 * (thin + RADIUS);
        double c = 0.5 * (RADIUS - thin);
        double pi2 = FastMath.PI * FastMath.PI;
        double zeroth = m * m + c * c / 2.0;
        double first = m * m / 2.0 + c * c / 4.0 + 4.0 * m * c / pi2;
        double second = m * m / 3.0 + 4.0 * m * c / pi2 + c * c * (1.0 / 6.0 + 1.0 / (4.0 * pi2));
        double fourth = m * m * m * m + 3.0 * m * m * c * c + 3.0 / 8.0 * c * c * c * c;
        assertThat(moments.volume() / (FastMath.PI * LENGTH * zeroth)).isCloseTo(1.0, within(1e-11));
        assertThat(moments.first() / (FastMath.PI * LENGTH * LENGTH * first)).isCloseTo(1.0, within(1e-11));
        double expected = FastMath.PI * (LENGTH * LENGTH * LENGTH * second + LENGTH * fourth / 4.0);
        assertThat(moments.second() / expected).isCloseTo(1.0, within(1e-11));
    }

    /** Mass and moment of inertia carry the density; a deeper pivot follows the parallel-axis theorem. */
    @Test
    void hairOfADensity() {
        double density = 1180.0;
        double depth = 2.5e-5;
        Hair hair = new Hair(new Cylinder(LENGTH, RADIUS), density, OptionalDouble.empty());
        double mass = density * AREA * LENGTH;
        close(hair.mass(), mass);
        double own = mass * (LENGTH * LENGTH / 12.0 + RADIUS * RADIUS / 4.0);
        double arm = 0.5 * LENGTH + depth;
        close(hair.inertia(depth), own + mass * arm * arm);
    }

    private static MeasuredProfile paraboloid(int pieces) {
        List<Double> heights = new ArrayList<>();
        List<Double> radii = new ArrayList<>();
        for (int i = pieces; i >= 0; i--) {
            double share = (double) i / pieces;
            heights.add(i == 0 ? LENGTH : LENGTH * (1.0 - share * share));
            radii.add(RADIUS * share);
        }
        return new MeasuredProfile(heights, radii);
    }

    private static void extrapolated(double coarse, double fine, double exact) {
        assertThat((4.0 * fine - coarse) / 3.0 / exact).isCloseTo(1.0, within(2e-8));
    }

    private static void close(double value, double exact) {
        assertThat(value / exact).isCloseTo(1.0, within(2e-14));
    }
}
