package flowshy.report.chart.paper;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Numbers and texts as a chart shows them. */
class TickTextTest {
    @ParameterizedTest
    @CsvSource({
        "0, 3, 0",
        "1e-5, 2, 10⁻⁵",
        "1000.0, 4, 1000",
        "12345, 3, 12\u2009300",
        "100000, 2, 100\u2009000",
        "1e6, 3, 10⁶",
        "-0.5, 3, −0.5",
        "-3.24e-9, 2, −3.2·10⁻⁹",
        "0.0012, 4, 0.0012",
        "9.999, 2, 10",
        "20.0, 4, 20"
    })
    void numbersArePlainWhereThatIsShort(double value, int digits, String text) {
        assertThat(TickText.of(value, digits)).isEqualTo(text);
    }

    @Test
    void frequenciesAboveTenThousandAreInKilohertz() {
        assertThat(TickText.hertz(67.4321, 4)).isEqualTo("67.43 Hz");
        assertThat(TickText.hertz(9999.0, 4)).isEqualTo("9999 Hz");
        assertThat(TickText.hertz(12500.0, 4)).isEqualTo("12.5 kHz");
    }

    @Test
    void nothingThatXmlRefusesIsLeft() {
        assertThat(PlainText.of("a\u0000b\nc\td\uFFFE\uD800e\u202Ef\uD83D\uDE80 "))
                .isEqualTo("ab c d\uFFFD\uFFFDef\uD83D\uDE80");
    }

    @Test
    void longTextsAreCutBetweenCharacters() {
        String rockets = "\uD83D\uDE80".repeat(50);
        String cut = Pen.fitting(Typeface.TEXT, rockets, 100.0);
        assertThat(cut).endsWith("…").hasSizeLessThan(100);
        assertThat(cut.codePoints().filter(point -> point >= 0xD800 && point <= 0xDFFF))
                .isEmpty();
        assertThat(Pen.width(Typeface.TEXT, cut)).isLessThanOrEqualTo(100.0);
    }
}
