package flowshy.hair;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

class StripTest {
    private static final double LENGTH = 7e-4;

    @Test
    void weightsAddUpToTheLengthAndHeightsRise() {
        Taper pointed = new Taper(LENGTH, 4e-5, 0.0);
        List<Strip> strips = Strip.along(pointed, List.of(0.0, 2e-4, LENGTH), 20);
        assertThat(strips).hasSize(40);
        assertThat(strips.stream().mapToDouble(Strip::weight).sum()).isCloseTo(LENGTH, within(1e-15 * LENGTH));
        assertThat(strips.stream().map(Strip::height).toList()).isSorted();
        for (Strip strip : strips) {
            assertThat(strip.radius()).isPositive().isEqualTo(pointed.radius(strip.height()));
        }
    }

    /** ∫ dx/√x from a point at either end: the crowded points see it as a polynomial, evenly spread ones are off by 3 %. */
    @Test
    void crowdsPointsTowardsAPointAtEitherEnd() {
        Taper top = new Taper(LENGTH, 4e-5, 0.0);
        MeasuredProfile foot = new MeasuredProfile(List.of(0.0, LENGTH), List.of(1e-12, 4e-5));
        for (Profile profile : List.of(top, foot)) {
            double sum = 0.0;
            for (Strip strip : Strip.along(profile, profile.breaks(), 20)) {
                sum += strip.weight() / FastMath.sqrt(strip.radius());
            }
            assertThat(sum / (2.0 * LENGTH / FastMath.sqrt(4e-5)))
                    .as(profile.shape())
                    .isCloseTo(1.0, within(2e-4));
        }
    }
}
