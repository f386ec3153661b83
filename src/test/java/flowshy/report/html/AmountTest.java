package flowshy.report.html;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.report.html.Amount.Scale;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AmountTest {
    @ParameterizedTest
    @CsvSource({
        "0.00054, m, 4, 540.0 µm",
        "0.0012, m, 2, 1.2 mm",
        "9.99996e-4, m, 4, 1.000 mm",
        "5.564e-09, kg, 4, 5.564 µg",
        "5.507e-16, kg.m2, 4, 5.507×10⁻¹⁶ kg·m²",
        "-1.48e-11, N.m/rad, 3, −14.8 pN·m/rad",
        "3e-18, N.m.s/rad, 2, 3.0×10⁻¹⁸ N·m·s/rad",
        "1.7364e-4, rad per m/s2, 4, 173.6 µrad per m/s²",
        "101325, Pa, 6, 101.325 kPa",
        "1.8246e-05, Pa.s, 5, 18.246 µPa·s",
        "500, Hz, 4, 500.0 Hz",
        "10000, Hz, 3, 10.0 kHz",
        "1.1788, kg/m3, 6, 1.17880 kg/m³",
        "26.2197, dB, 4, 26.22 dB",
        "0, m/s2, 4, 0 m/s²",
        "45, deg, 2, 45°",
        "1.2345e-5, '', 3, 1.23×10⁻⁵",
        "1000, '', 4, 1000",
        "123456789, '', 3, 1.23×10⁸"
    })
    void setsNumbersAsPrintDoes(double value, String unit, int digits, String text) {
        assertThat(new Amount(value, unit, digits).text().replace('\u00A0', ' '))
                .isEqualTo(text);
    }

    @Test
    void saysWhereThereIsNoNumber() {
        assertThat(new Amount(Double.POSITIVE_INFINITY, "kg", 4).text()).isEqualTo("infinite\u00A0kg");
        assertThat(new Amount(Double.NaN, "m", 4).text()).isEqualTo("undefined\u00A0m");
        assertThat(new Amount(Double.NaN, "m", 4).machine()).isEqualTo("undefined");
    }

    @Test
    void keepsTwelveDigitsForPrograms() {
        assertThat(new Amount(1.0 / 3.0, "m", 3).machine()).isEqualTo("0.333333333333");
    }

    @Test
    void scalesAColumnByItsMiddle() {
        Scale scale = Scale.of("rad/(m/s2)", List.of(1.7e-4, 2.0e-4, 3e-9));
        assertThat(scale.prefix()).isEqualTo("µ");
        assertThat(Scale.of("rad/(m/s²)", List.of(1.7e-4))).isEqualTo(scale);
        assertThat(scale.text(1.7364e-4, 4)).isEqualTo("173.6");
        assertThat(scale.text(3e-9, 2)).isEqualTo("0.0030");
    }

    @Test
    void leavesAColumnAloneThatHasNoPrefix() {
        assertThat(Scale.of("dB", List.of(1e-6))).isEqualTo(Scale.NONE);
        assertThat(Scale.of("Hz", List.of(1e4))).isEqualTo(Scale.NONE);
        assertThat(Scale.of("m", List.of(0.0))).isEqualTo(Scale.NONE);
        assertThat(Scale.of("m", List.of())).isEqualTo(Scale.NONE);
    }
}
