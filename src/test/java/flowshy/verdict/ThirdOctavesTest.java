package flowshy.verdict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ThirdOctavesTest {
    /** Exact mid-band frequencies as printed, IEC 61260-1 base ten (values seen in two public pages); half the last digit. */
    @ParameterizedTest
    @CsvSource({
        "31.623, 0.0005",
        "63.096, 0.0005",
        "125.89, 0.005",
        "630.96, 0.005",
        "794.33, 0.005",
        "1258.9, 0.05",
        "1584.9, 0.05"
    })
    void hasThePrintedFrequencies(double printed, double half) {
        List<Double> all = ThirdOctaves.in(new Band(20.0, 20000.0));
        assertThat(all.stream().filter(f -> FastMath.abs(f - printed) <= half).toList())
                .hasSize(1);
    }

    @Test
    void includesTheEndsInSpiteOfRounding() {
        List<Double> decade = ThirdOctaves.in(new Band(10.0, 100.0));
        assertThat(decade).hasSize(11).isSorted();
        assertThat(decade.get(0)).isCloseTo(10.0, within(1e-12));
        assertThat(decade.get(10)).isCloseTo(100.0, within(1e-12));
        assertThat(ThirdOctaves.in(new Band(10.001, 99.9))).hasSize(9);
        assertThat(ThirdOctaves.in(new Band(1.0, 10000.0))).hasSize(41);
    }

    @Test
    void givesTheEndsOfABandThatHoldsNone() {
        assertThat(ThirdOctaves.in(new Band(101.0, 110.0))).containsExactly(101.0, 110.0);
    }

    @Test
    void bandsAreSpacedEvenlyInRatioAndMustRunUpwards() {
        assertThat(new Band(10.0, 1000.0).even(3)).hasSize(3);
        assertThat(new Band(10.0, 1000.0).even(3).get(1)).isCloseTo(100.0, within(1e-12));
        assertThat(new Band(10.0, 1000.0).even(2)).containsExactly(10.0, 1000.0);
        for (double[] ends : new double[][] {{0.0, 1.0}, {-1.0, 1.0}, {2.0, 2.0}, {3.0, 2.0}, {Double.NaN, 1.0}}) {
            assertThatThrownBy(() -> new Band(ends[0], ends[1])).isInstanceOf(IllegalArgumentException.class);
        }
        assertThatThrownBy(() -> new Band(1.0, Double.POSITIVE_INFINITY)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Band(1.0, Double.NaN)).isInstanceOf(IllegalArgumentException.class);
    }
}
