package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.MeasuredProfile;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

class RingMeshTest {
    /** Area and volume in closed form; pieces are frusta, so round parts come out a little small. */
    @Test
    void coversTheSurface() {
        hold(new Cylinder(20.0, 1.0), FastMath.PI * (40.0 + 1.0), FastMath.PI * 20.0, 1e-9);
        double slant = FastMath.hypot(20.0, 0.75);
        hold(
                new Taper(20.0, 1.0, 0.25),
                FastMath.PI * (1.25 * slant + 0.0625),
                FastMath.PI * 20.0 * 1.3125 / 3.0,
                1e-3);
        hold(new Taper(20.0, 1.0, 0.0), FastMath.PI * FastMath.hypot(20.0, 1.0), FastMath.PI * 20.0 / 3.0, 2e-3);
        Profile step = new Club(10.0, 0.5, 4.0, 0.0, 1.0, Club.End.FLAT);
        hold(step, FastMath.PI * (4.0 + 0.75 + 12.0 + 1.0), FastMath.PI * (1.0 + 6.0), 1e-9);
        Profile round = new Club(10.0, 1.0, 4.0, 1.0, 1.0, Club.End.ROUND);
        hold(round, FastMath.PI * (18.0 + 2.0), FastMath.PI * (9.0 + 2.0 / 3.0), 2e-3);
    }

    private static void hold(Profile profile, double area, double volume, double tolerance) {
        for (double beta : new double[] {0.0, 1.0, 800.0}) {
            List<Ring> rings = mesh(profile, Refinement.FINE, beta);
            assertThat(rings.stream().mapToDouble(Ring::area).sum()).isCloseTo(area, within(tolerance * area));
            assertThat(rings.stream()
                            .flatMap(ring -> ring.pieces().stream())
                            .mapToDouble(RingPiece::volume)
                            .sum())
                    .isCloseTo(volume, within(tolerance * volume));
            for (int i = 1; i < rings.size(); i++) {
                assertThat(rings.get(i).bottom()).isCloseTo(rings.get(i - 1).top(), within(1e-12));
            }
        }
    }

    /** Few rings for the slender cylinder of the design, short ones at the rim and at the foot. */
    @Test
    void crowdsAtEdgesAndStaysSmall() {
        List<Ring> rings = mesh(new Cylinder(20.0, 1.0), Refinement.FINE, 0.1);
        assertThat(rings.size()).isBetween(25, 40);
        assertThat(rings.get(0).length()).isBetween(0.02, 0.08);
        double shortest = rings.stream().mapToDouble(Ring::length).min().orElseThrow();
        assertThat(shortest).isBetween(0.015, 0.05);
        assertThat(rings.stream().mapToDouble(Ring::length).max().orElseThrow()).isLessThan(21.0 / 13.0 * 1.01);
    }

    /** Kinks of a measured outline are bends, not edges: they must not each draw a crowd of rings. */
    @Test
    void measuredOutlineStaysSmall() {
        List<Double> heights = new ArrayList<>();
        List<Double> radii = new ArrayList<>();
        for (int i = 0; i <= 60; i++) {
            heights.add(20.0 * i / 60);
            radii.add(1.0 - 0.01 * i + (i % 2 == 0 ? 0.005 : -0.005));
        }
        int rings =
                mesh(new MeasuredProfile(heights, radii), Refinement.FINE, 0.1).size();
        assertThat(rings).isBetween(20, 120);
    }

    /** Thin layers ask for shorter rings on round parts, and for finer stairs. */
    @Test
    void roundPartsFollowTheLayer() {
        Meridian sphere = Bodies.sphere(10.0);
        List<Ring> thick = RingMesh.of(sphere, Refinement.FINE, 1.0, 1.0);
        List<Ring> thin = RingMesh.of(sphere, Refinement.FINE, 1.0, 800.0);
        assertThat(thin.size()).isGreaterThan(thick.size() * 3 / 2);
        assertThat(pieces(thin)).isGreaterThan(3 * pieces(thick) / 2);
    }

    private static int pieces(List<Ring> rings) {
        return rings.stream().mapToInt(ring -> ring.pieces().size()).sum();
    }

    private static List<Ring> mesh(Profile profile, Refinement refinement, double beta) {
        return RingMesh.of(Meridian.of(profile, 1.0), refinement, Double.POSITIVE_INFINITY, beta);
    }
}
