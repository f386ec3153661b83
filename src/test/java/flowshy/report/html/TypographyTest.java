package flowshy.report.html;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TypographyTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "stiffness 9.0171e-09 N.m/rad, gravity adds -1.48e-11 N.m/rad|stiffness 9.0171×10⁻⁹ N·m/rad, gravity adds"
                        + " −1.48×10⁻¹¹ N·m/rad",
                "50.0 um over the tip is less than 362 um at 40.00 Hz|50.0 µm over the tip is less than 362 µm at 40.00 Hz",
                "15 degC to 27 degC|15 °C to 27 °C",
                "turned by 0.5 and 12 deg|turned by 0.5 and 12°",
                "2220 kg/m3, 3 m2/s, 4 mm3, 1e+07 Pa.s|2220 kg/m³, 3 m²/s, 4 mm³, 1×10⁷ Pa·s",
                "6.50e-05 m/s2/rtHz|6.50×10⁻⁵ m/s²/√Hz",
                "0.0202 m/s2 rms|0.0202 m/s² rms",
                "hair.youngs-modulus is not stated|hair.youngs-modulus is not stated",
                "IEC 61260-1, ratio 10 : 1|IEC 61260-1, ratio 10 : 1"
            })
    void setsOurSentences(String ascii, String set) {
        assertThat(Typography.set(ascii).replace('\u00A0', ' ')).isEqualTo(set);
    }

    @Test
    void keepsANumberAndItsUnitOnOneLine() {
        assertThat(Typography.set("about 5 um or 3 dB, 20 % of 4 m/s2"))
                .isEqualTo("about 5\u00A0µm or 3\u00A0dB, 20\u00A0% of 4\u00A0m/s²");
    }

    @Test
    void leavesTheUsersWordsAsTheyAre() {
        Html html = new Html();
        new Typography(List.of("fan 5 um <1e-05>", "מאוורר")).sentence(html, "fan 5 um <1e-05>: 2 um, מאוורר: 3 um");
        assertThat(html)
                .hasToString(
                        "<bdi dir=\"auto\">fan 5 um &lt;1e-05&gt;</bdi>: 2\u00A0µm, <bdi dir=\"auto\">מאוורר</bdi>: 3\u00A0µm");
    }

    @Test
    void doesNotFindAUsersWordInsideAnother() {
        Html html = new Html();
        new Typography(List.of("a", "air")).sentence(html, "fair air: a");
        assertThat(html).hasToString("fair <bdi dir=\"auto\">air</bdi>: <bdi dir=\"auto\">a</bdi>");
    }
}
