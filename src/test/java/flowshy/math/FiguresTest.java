package flowshy.math;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FiguresTest {
    @ParameterizedTest
    @CsvSource({
        "20, 4, 20.00",
        "20000, 3, 20000",
        "0.0123456, 3, 0.0123",
        "0.00099994, 4, 9.999e-04",
        "0.00099999, 4, 0.001000",
        "999999.6, 6, 1.00000e+06",
        "1234567, 3, 1.23e+06",
        "-0.5, 2, -0.50",
        "1.5e-12, 1, 2e-12",
        "9.9996, 4, 10.00",
        "1e100, 2, 1.0e+100",
        "0, 5, 0"
    })
    void keepsTheDigitsPromised(double value, int digits, String text) {
        assertThat(Figures.of(value, digits)).isEqualTo(text);
    }

    /** 2e23 is printed differently by JDK 17 and 25 through Double.toString; here it is not. */
    @ParameterizedTest
    @CsvSource({"2e23, 2e+23", "0.1, 0.1", "1e-5, 1e-05", "123456.789, 123456.789", "1e9, 1e+09", "-3, -3", "0, 0"})
    void writesNumbersForPrograms(double value, String text) {
        assertThat(Figures.full(value)).isEqualTo(text);
    }

    @Test
    void readsBackToTwelveDigits() {
        double value = Math.PI * 1e-9;
        assertThat(Math.abs(Double.parseDouble(Figures.full(value)) / value - 1.0))
                .isLessThan(1e-12);
    }

    @Test
    void knowsNoLocale() {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.GERMANY);
            assertThat(Figures.of(1234.5, 5)).isEqualTo("1234.5");
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void putsFiguresIntoSentences() {
        assertThat(Figures.say("%s: %.3g dB at %.4g Hz, %.2g %%", "least", 12.3456, 10000.0, 5.0))
                .isEqualTo("least: 12.3 dB at 10000 Hz, 5.0 %");
        assertThatIllegalArgumentException().isThrownBy(() -> Figures.say("%s"));
        assertThatIllegalArgumentException().isThrownBy(() -> Figures.say("none", 1.0));
    }
}
