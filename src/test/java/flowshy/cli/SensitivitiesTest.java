package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What to tighten first, as a user meets it, where the whole hair is solved: it is what {@code bands} does when a number is set otherwise. */
class SensitivitiesTest {
    private static final String TRAY = "examples/fan-tray/study.yaml";
    private static final String MAST = "examples/weather-mast/study.yaml";

    /** Across the meshes, whose jumps are a few thousandths of the largest slope at this step. */
    private static final double STEP = 0.05;

    private static final Map<String, Map<String, Object>> ANSWERS = new HashMap<>();

    private static Map<String, Object> answer(String study) {
        return ANSWERS.computeIfAbsent(
                study,
                file -> Json.object(Json.parse(Run.of("bands", file, "--json").out())));
    }

    private static double rejection(String study, double frequency, String setting) {
        List<String> lines = Run.of("bands", study, "--csv", "--frequencies", frequency + " Hz", "--set", setting)
                .out()
                .lines()
                .toList();
        int column = List.of(lines.get(0).split(",", -1)).indexOf("rejection_db");
        return Double.parseDouble(lines.get(1).split(",", -1)[column]);
    }

    /**
     * Each slope against runs of the study with that number a twentieth up and down, within one per cent of the largest slope, which the
     * estimate in closed form would miss: it is up to 4.8 % of the largest off in these two studies.
     */
    @ParameterizedTest
    @CsvSource({
        TRAY + ", hair.diameter, 130, um",
        TRAY + ", hair.length, 420, um",
        TRAY + ", hair.density, 7.9, g/cm3",
        MAST + ", hair.length, 900, um",
        MAST + ", hair.head-diameter, 150, um",
        MAST + ", hair.stalk-length, 420, um",
        MAST + ", hair.stalk-diameter, 60, um",
        MAST + ", medium.pressure, 101.325, kPa"
    })
    void whatToTightenFirstIsWhatHappens(String study, String key, double value, String unit) {
        List<Map<String, Object>> all = Json.objects(answer(study).get("sensitivities"));
        double largest = change(Json.objects(all.get(0).get("slopes")).get(0));
        Map<String, Object> number = all.stream()
                .filter(one -> one.get("number").equals(key))
                .findFirst()
                .orElseThrow();
        List<Map<String, Object>> slopes = Json.objects(number.get("slopes"));
        assertThat(slopes).hasSize(2);
        for (Map<String, Object> slope : slopes) {
            double frequency = (double) slope.get("frequency_hz");
            double up = rejection(study, frequency, key + "=" + value * Math.exp(STEP) + " " + unit);
            double down = rejection(study, frequency, key + "=" + value * Math.exp(-STEP) + " " + unit);
            assertThat(change(slope))
                    .as("at %s Hz", frequency)
                    .isCloseTo((up - down) * Math.log(1.01) / (2.0 * STEP), within(0.01 * Math.abs(largest)));
        }
    }

    private static double change(Map<String, Object> slope) {
        return (double) slope.get("rejection_db_per_percent");
    }

    @Test
    void sayByWhichModelTheyWereMadeAndWhere() {
        assertThat(answer(TRAY).get("sensitivities_finite_length")).isEqualTo("auto");
        Run run = Run.of("bands", TRAY, "--why");
        assertThat(run.out().replaceAll("\\s+", " "))
                .contains(
                        "the whole hair solved, to one per cent (finite-length: auto)",
                        "least rejection of the band",
                        "What to tighten first");
        assertThat(Run.of("bands", TRAY, "--why", "--set", "finite-length=off").out())
                .contains("Differences by strip theory (finite-length: off)");
        List<String> where = new ArrayList<>();
        Json.objects(Json.objects(answer(TRAY).get("sensitivities")).get(0).get("slopes"))
                .forEach(slope -> where.add(slope.get("where").toString()));
        assertThat(where).hasSize(2).anyMatch(words -> words.startsWith("least rejection of the band"));
    }
}
