package flowshy.study.text;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearestTest {
    private static final List<String> KNOWN = List.of("diameter", "length", "density", "shape", "um", "m");

    @ParameterizedTest
    @CsvSource({
        "diametre, diameter",
        "Diameter, diameter",
        "diamteer, diameter",
        "lenght, length",
        "densty, density",
        "shap, shape",
        "Um, um",
        "M, m"
    })
    void findsTheWordMeant(String typed, String meant) {
        assertThat(Nearest.among(typed, KNOWN)).contains(meant);
    }

    @ParameterizedTest
    @CsvSource({"radius", "x", "mass", "temperature", "''"})
    void offersNothingWhenNothingIsNear(String typed) {
        assertThat(Nearest.among(typed, KNOWN)).isEmpty();
        assertThat(Nearest.among("d".repeat(100_000), KNOWN)).isEmpty();
    }

    @Test
    void printableTextHasNoControlsAndIsShort() {
        assertThat(Printable.of("a\u001B[31m\u202Eb\r\n\uD800")).isEqualTo("a\uFFFD[31m\uFFFDb\uFFFD\uFFFD\uFFFD");
        assertThat(Printable.of("µ😀é")).isEqualTo("µ😀é");
        assertThat(Printable.of("x".repeat(500))).hasSize(81).endsWith("…");
    }
}
