package flowshy.report.html;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Contrast ratios after WCAG 2.1, success criterion 1.4.3: 4.5 : 1 for text (seen), 3 : 1 for lines that carry meaning (1.4.11). */
class PaletteTest {
    private static final double TEXT = 4.5;
    private static final double SIGN = 3.0;

    private static Map<String, String> colours(boolean dark) throws IOException {
        try (InputStream file = Page.class.getResourceAsStream("palette.css")) {
            String[] halves = new String(file.readAllBytes(), StandardCharsets.UTF_8).split("@media", -1);
            assertThat(halves).hasSize(2);
            Map<String, String> colours = new HashMap<>();
            Matcher colour = Pattern.compile("--([a-z-]+): (#[0-9a-f]{6});").matcher(halves[dark ? 1 : 0]);
            while (colour.find()) {
                colours.put(colour.group(1), colour.group(2));
            }
            assertThat(colours).hasSize(14);
            return colours;
        }
    }

    /** Relative luminance: L = 0.2126 R + 0.7152 G + 0.0722 B with the linear values of sRGB. */
    private static double luminance(String colour) {
        double[] weights = {0.2126, 0.7152, 0.0722};
        double sum = 0.0;
        for (int i = 0; i < 3; i++) {
            double share = Integer.parseInt(colour.substring(1 + 2 * i, 3 + 2 * i), 16) / 255.0;
            sum += weights[i] * (share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4));
        }
        return sum;
    }

    private static double contrast(String one, String other) {
        double light = Math.max(luminance(one), luminance(other));
        double dark = Math.min(luminance(one), luminance(other));
        return (light + 0.05) / (dark + 0.05);
    }

    @Test
    void measuresContrastAsTheGuidelineDoes() {
        assertThat(contrast("#000000", "#ffffff")).isEqualTo(21.0);
        // the guideline's own border case for text on white, seen: #767676 has 4.54 : 1
        assertThat(contrast("#767676", "#ffffff")).isBetween(4.535, 4.545);
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void everyTextCanBeReadOnItsGround(boolean dark) throws IOException {
        Map<String, String> colours = colours(dark);
        for (String ink : List.of("ink", "soft", "link")) {
            for (String ground : List.of("paper", "panel")) {
                assertThat(contrast(colours.get(ink), colours.get(ground)))
                        .as("%s on %s", ink, ground)
                        .isGreaterThanOrEqualTo(TEXT);
            }
        }
        for (String decision : List.of("meets", "fails", "undecided", "not-asked")) {
            assertThat(contrast(colours.get(decision), colours.get(decision + "-ground")))
                    .as(decision)
                    .isGreaterThanOrEqualTo(TEXT);
            assertThat(contrast(colours.get(decision), colours.get("paper")))
                    .as("border of " + decision)
                    .isGreaterThanOrEqualTo(SIGN);
        }
        assertThat(contrast(colours.get("ink"), colours.get("fails-ground")))
                .as("caveat out of range")
                .isGreaterThanOrEqualTo(TEXT);
    }

    @Test
    void coloursDifferInTheDark() throws IOException {
        assertThat(luminance(colours(true).get("paper"))).isLessThan(0.05);
        assertThat(luminance(colours(false).get("paper"))).isGreaterThan(0.9);
    }
}
