package flowshy.math;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Against the exact mid-band frequencies of IEC 61260-1 as printed on two public pages. */
class ThirdOctaveValidationTest {
    @Test
    void middlesAreThePrintedOnes() {
        double[][] printed = {
            {-15, 31.623, 31.5},
            {-12, 63.096, 63},
            {-9, 125.89, 125},
            {-2, 630.96, 630},
            {-1, 794.33, 800},
            {1, 1258.9, 1250},
            {2, 1584.9, 1600}
        };
        for (double[] row : printed) {
            ThirdOctave band = new ThirdOctave((int) row[0]);
            assertThat(band.middle()).isCloseTo(row[1], Percentage.withPercentage(0.004));
            assertThat(band.nominal()).isCloseTo(row[2], Percentage.withPercentage(1e-12));
            assertThat(ThirdOctave.holding(row[2])).isEqualTo(band);
        }
    }

    /** Edges a factor 10^(±1/20) = 1.1220185 from the middle; neighbours share an edge exactly. */
    @Test
    void edges() {
        for (int i = -40; i < 40; i++) {
            ThirdOctave band = new ThirdOctave(i);
            assertThat(band.high() / band.middle()).isCloseTo(1.1220185, within(0.5e-7));
            assertThat(band.middle() / band.low()).isCloseTo(1.1220185, within(0.5e-7));
            assertThat(new ThirdOctave(i + 1).low()).isEqualTo(band.high());
            assertThat(ThirdOctave.holding(band.low())).isEqualTo(band);
            assertThat(ThirdOctave.holding(Math.nextDown(band.low()))).isEqualTo(new ThirdOctave(i - 1));
        }
    }

    @Test
    void namesBelowOneHertz() {
        assertThat(new ThirdOctave(-30).nominal()).isEqualTo(1.0);
        assertThat(new ThirdOctave(-31).nominal()).isCloseTo(0.8, within(1e-15));
        assertThat(new ThirdOctave(-40).nominal()).isCloseTo(0.1, within(1e-15));
        assertThat(new ThirdOctave(10).nominal()).isEqualTo(10000.0);
        assertThat(new ThirdOctave(-9)).hasToString("third-octave at 125.000 Hz");
    }

    @Test
    void coversAnInterval() {
        List<ThirdOctave> bands = ThirdOctave.covering(20.0, 100.0);
        assertThat(bands).hasSize(8); // 20, 25, 31.5, 40, 50, 63, 80, 100
        assertThat(bands.get(0).nominal()).isEqualTo(20.0);
        assertThat(bands.get(7).nominal()).isEqualTo(100.0);
        assertThatThrownBy(() -> ThirdOctave.covering(100.0, 20.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> ThirdOctave.holding(0.0)).isInstanceOf(IllegalArgumentException.class);
    }
}
