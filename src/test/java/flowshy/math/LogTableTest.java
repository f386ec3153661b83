package flowshy.math;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class LogTableTest {
    private static final LogTable TABLE = new LogTable(List.of(10.0, 40.0, 90.0), List.of(2.0, 8.0, -1.0));

    @Test
    void holdsItsPointsAndRunsStraightOverTheLogarithm() {
        assertThat(TABLE.at(10.0)).isEqualTo(2.0);
        assertThat(TABLE.at(40.0)).isEqualTo(8.0);
        assertThat(TABLE.at(90.0)).isEqualTo(-1.0);
        // geometric means of the neighbours lie half way
        assertThat(TABLE.at(20.0)).isCloseTo(5.0, within(1e-14));
        assertThat(TABLE.at(60.0)).isCloseTo(3.5, within(1e-14));
        // one octave of two: 10 Hz · 4^(1/4)
        assertThat(TABLE.at(10.0 * Math.sqrt(2.0))).isCloseTo(3.5, within(1e-14));
    }

    @Test
    void coversItsRangeAndRoundingBesideItOnly() {
        assertThat(TABLE.covers(10.0 * (1.0 - 1e-10))).isTrue();
        assertThat(TABLE.at(90.0 * (1.0 + 1e-10))).isEqualTo(-1.0);
        for (double outside : new double[] {9.99, 90.01, 0.0, -10.0, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThat(TABLE.covers(outside)).isFalse();
            assertThatThrownBy(() -> TABLE.at(outside))
                    .isInstanceOf(IllegalArgumentException.class)
                    .hasMessageContaining("outside");
        }
        assertThat(TABLE.range().low()).isEqualTo(10.0);
        assertThat(TABLE.range().high()).isEqualTo(90.0);
    }

    @Test
    void refusesWhatIsNoTable() {
        assertThatThrownBy(() -> new LogTable(List.of(10.0), List.of(1.0))).hasMessageContaining("two frequencies");
        assertThatThrownBy(() -> new LogTable(List.of(10.0, 20.0), List.of(1.0)))
                .hasMessageContaining("a value for each");
        assertThatThrownBy(() -> new LogTable(List.of(0.0, 20.0), List.of(1.0, 1.0)))
                .hasMessageContaining("row 1");
        assertThatThrownBy(() -> new LogTable(List.of(20.0, 20.0), List.of(1.0, 1.0)))
                .hasMessageContaining("row 2");
        assertThatThrownBy(() -> new LogTable(List.of(20.0, Double.NaN), List.of(1.0, 1.0)))
                .hasMessageContaining("row 2");
        assertThatThrownBy(() -> new LogTable(List.of(10.0, 20.0), List.of(1.0, Double.NaN)))
                .hasMessageContaining("row 2");
    }
}
