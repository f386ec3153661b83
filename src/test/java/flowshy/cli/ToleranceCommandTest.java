package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ToleranceCommandTest {
    private static final String DEVICE = """
            hair: {length: 0.82 mm, diameter: 90 um, density: 1.18 g/cm3}
            suspension: {resonance: {frequency: 310 Hz, in: vacuum}, quality: {value: 4, in: vacuum}}
            medium: {name: helium, temperature: 26 degC}
            band: {from: 40 Hz, to: 700 Hz}
            accept: {rejection: 26 dB, resonance: {at-least: 290 Hz, at-most: 330 Hz}}
            finite-length: off
            """;

    @TempDir
    private static Path folder;

    private static String study(String tolerances) throws IOException {
        Path file = Files.createTempFile(folder, "study", ".yaml");
        return Files.writeString(file, DEVICE + tolerances).toString();
    }

    private static final String SPREAD = """
            tolerances:
              wafer: {sd: 2 %, keys: [hair.diameters]}
              hair.length: {within: 8 um}
              medium.temperature: {sd: 4 K}
            """;

    /** A busy machine may take so long that a run tells how far it is. */
    private static String withoutProgress(Run run) {
        return run.err().replaceAll("(?m)^[0-9.]+ % done.*\\R", "");
    }

    private static Map<?, ?> json(String study, String... more) {
        String[] words = new String[more.length + 5];
        words[0] = "tolerance";
        words[1] = study;
        words[2] = "--json";
        words[3] = "--samples";
        words[4] = "512";
        System.arraycopy(more, 0, words, 5, more.length);
        Run run = Run.of(words);
        assertThat(withoutProgress(run)).isEmpty();
        return (Map<?, ?>) Json.parse(run.out());
    }

    @Test
    void tellsChancesSpreadAndWhatMattersMost() throws IOException {
        String study = study(SPREAD);
        Run run = Run.of("tolerance", study, "--samples", "512", "--of", "quality,mass");
        assertThat(withoutProgress(run)).isEmpty();
        assertThat(run.out().replaceAll("\\s+", " "))
                .contains("Chance of each limit")
                .contains("wafer sd 2 % (the study)")
                .contains("hair.length within 8 um (the study)")
                .contains("medium.temperature sd 4 K (the study)")
                .contains("viscosity of helium")
                .contains("drag law")
                .contains("Quality factor in the medium")
                .contains("Mass of the hair")
                .contains("strip theory (finite-length: off)")
                .contains("scrambled Sobol sequence, seed 1");
        run.out()
                .lines()
                .skip(1)
                .forEach(line -> assertThat(line.length()).as(line).isLessThanOrEqualTo(80));
    }

    /** Limits on both sides of the resonance are two chances; the fan, the figures and their indices stand in the JSON with intervals. */
    @Test
    void writesEverythingAsJsonAndTheFanAsCsv() throws IOException {
        String study = study(SPREAD);
        Map<?, ?> answer = json(study);
        assertThat(Json.numbers(answer, study)).isGreaterThan(3000);
        assertThat((List<?>) answer.get("limits")).hasSize(3);
        assertThat((List<?>) answer.get("fan")).hasSize(200);
        Map<?, ?> least = (Map<?, ?>) ((List<?>) answer.get("figures")).get(0);
        assertThat(least.get("figure")).isEqualTo("least-rejection");
        assertThat((List<?>) least.get("effects")).hasSize(6);
        double first = ((Number) ((Map<?, ?>) ((List<?>) answer.get("fan")).get(0)).get("p50_db")).doubleValue();
        assertThat(first).isCloseTo(((Number) least.get("p50_db")).doubleValue(), within(0.01));
        Run csv = Run.of("tolerance", study, "--samples", "512", "--csv");
        List<String> lines = csv.out().lines().toList();
        assertThat(lines).hasSize(201);
        assertThat(lines.get(0)).startsWith("frequency_hz,nominal_db,p2_5_db,p2_5_low_db,p2_5_high_db,p16_db");
    }

    /** The nominal numbers are those of the command bands. */
    @Test
    void nominalIsWhatBandsSays() throws IOException {
        String study = study(SPREAD);
        Map<?, ?> least = (Map<?, ?>) ((List<?>) json(study).get("figures")).get(0);
        Map<?, ?> bands =
                (Map<?, ?>) Json.parse(Run.of("bands", study, "--json").out());
        Map<?, ?> limit = (Map<?, ?>) ((List<?>) ((Map<?, ?>) bands.get("verdict")).get("limits")).get(0);
        assertThat(((Number) least.get("nominal_db")).doubleValue())
                .isCloseTo(((Number) limit.get("found")).doubleValue(), within(1e-6));
    }

    @Test
    void seedDecidesThreadsDoNot() throws IOException {
        String study = study(SPREAD);
        assertThat(json(study, "--threads", "1")).isEqualTo(json(study, "--threads", "3"));
        assertThat(json(study, "--seed", "2").get("fan"))
                .isNotEqualTo(json(study).get("fan"));
    }

    /** Without a word about tolerances the model and the medium are uncertain all the same; both can be turned off. */
    @Test
    void modelAndMediumCountByDefault() throws IOException {
        assertThat((List<?>) json(study("")).get("inputs")).hasSize(3);
        Map<?, ?> off = json(study("tolerances: {drag-law: off, medium-properties: off}\n"));
        assertThat((List<?>) off.get("inputs")).isEmpty();
        assertThat((List<?>) off.get("certain")).hasSize(3);
        Map<?, ?> stated =
                (Map<?, ?>) ((List<?>) json(study("tolerances: {drag-law: {within: 7 %}, medium-properties: off}\n"))
                                .get("inputs"))
                        .get(0);
        assertThat(stated.get("size")).isEqualTo("7 %");
        assertThat(stated.get("source")).isEqualTo("the study");
    }

    @Test
    void aRequiredYieldDecides() throws IOException {
        String met = study(SPREAD + "  drag-law: off\n  yield: 1 %\n");
        assertThat(Run.of("tolerance", met, "--samples", "512").code()).isZero();
        Run missed = Run.of("tolerance", met, "--samples", "512", "--set", "tolerances.yield=99.9 %");
        assertThat(missed.code()).isEqualTo(3);
        assertThat(missed.out()).contains("Decision: fails").contains("Required are 99.90 %: not met.");
    }

    /** A setting replaces the spread of the file, and adds others. */
    @Test
    void settingsAreLaidOver() throws IOException {
        Run run = Run.of(
                "tolerance",
                study(SPREAD),
                "--samples",
                "512",
                "--set",
                "tolerances.hair.length={sd: 1 %}",
                "--set",
                "tolerances.hair.density.within=3 %");
        assertThat(withoutProgress(run)).isEmpty();
        assertThat(run.out())
                .contains("hair.length             sd 1 % (the study)")
                .contains("hair.density            within 3 % (the study)")
                .doesNotContain("within 8 um");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "hair.length: 3 % | 3 %; say which it is: {sd: 3 %}, a standard deviation, or {within: 3 %}, evenly spread",
                "hair.length: {sd: 3 %, within: 3 um} | sd beside within; one of them",
                "hair.length: {} | neither sd nor within; one of them",
                "hair.length: {sd: 3} | 3 has no unit; a spread in % of the nominal value, or a length is wanted here",
                "hair.length: {sd: 3 kg} | 3 kg is a mass; a spread in % of the nominal value, or a length is wanted here",
                "hair.length: {sd: 0 %} | 0 %; more than 0 %, 100 % at most",
                "hair.length: {sd: 130 %} | 130 %; more than 0 %, 100 % at most",
                "hair.length: {sigma: 3 %} | tolerances.hair.length.sigma: unknown key; known here: sd, within, keys",
                "hair.lenght: {sd: 3 %} | hair.lenght: unknown key; a number of this study is wanted: hair.length",
                "drag-law: perhaps | perhaps; on or off, or {sd: 3 %}",
                "wafer: 3 % | a name of your own needs keys: [...] beside it",
                "wafer: {sd: 3 %} | a name of your own needs keys: [...] beside it",
                "wafer: {sd: 3 um, keys: [hair.length, hair.density]} | 3 um for hair.density, a density; numbers of one kind",
                "band.from: {sd: 3 %} | what is asked of a device has no spread",
                "hair.shape: {sd: 3 %} | hair.shape: not a number",
                "medium.temperature: {sd: 3 %} | a step of temperature is wanted here",
                "medium.humidity: {sd: 3 %} | the study does not state it",
                "yield: 120 % | 120 %; a share between 0 % and 100 %",
                "drag-law: {sd: 3 um} | 3 um is a length; a share is wanted here",
            })
    void saysWhatIsWrong(String entry, String told) throws IOException {
        Run run = Run.of("tolerance", study("tolerances: {" + entry + "}\n"));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).contains(told).contains(".yaml:7:");
        assertThat(run.err().lines()).hasSize(2);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--samples 12 | --samples takes a whole number from 256 to 100000000",
                "--precision 3 | 3 has no unit",
                "--precision 0%  | more than zero is wanted",
                "--of weight | 'weight' is no quantity; known are mass",
                "--threads 0 | --threads takes a whole number from 1",
            })
    void optionsAreChecked(String words, String told) throws IOException {
        String[] two = words.split(" ", -1);
        Run run = Run.of("tolerance", study(SPREAD), two[0], two[1]);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains(told);
    }

    /** A sealed hair: no rejection to spread, but its resonance. */
    /** All diameters of a club are moved as one. */
    @Test
    void diametersOfAClubGoTogether() throws IOException {
        String club = Files.writeString(Files.createTempFile(folder, "club", ".yaml"), """
                        hair: {shape: club, length: 0.82 mm, stalk-diameter: 60 um, stalk-length: 420 um, head-diameter: 120 um, density: 1.18 g/cm3}
                        medium: argon
                        band: {from: 40 Hz, to: 700 Hz}
                        finite-length: off
                        tolerances: {hair.diameters: {sd: 2 %}, medium-properties: off, drag-law: off}
                        """)
                .toString();
        Map<?, ?> least = (Map<?, ?>) ((List<?>) json(club).get("figures")).get(0);
        double wide = least(club, "61.2 um", "122.4 um");
        double thin = least(club, "58.8 um", "117.6 um");
        assertThat(((Number) least.get("standard_deviation_db")).doubleValue())
                .isCloseTo(0.5 * (wide - thin), within(0.003));
    }

    private static double least(String study, String stalk, String head) {
        Run run = Run.of(
                "bands",
                study,
                "--json",
                "--set",
                "hair.stalk-diameter=" + stalk,
                "--set",
                "hair.head-diameter=" + head);
        Map<?, ?> bands = (Map<?, ?>) ((List<?>) ((Map<?, ?>) Json.parse(run.out())).get("points")).get(0);
        return ((Number) bands.get("rejection_db")).doubleValue();
    }

    @Test
    void aSealedDeviceHasNoFan() throws IOException {
        Run run = Run.of("tolerance", study(SPREAD + "cover: sealed\n"), "--samples", "512");
        assertThat(withoutProgress(run)).isEmpty();
        assertThat(run.out())
                .contains("Without a bound in every device.")
                .contains("No flow enters: the rejection has no bound.")
                .doesNotContain("Rejection by frequency");
    }

    /** With surroundings the error limit has its chance too, of fewer devices. */
    @Test
    void surroundingsAreJudgedOnFewerDevices() throws IOException {
        String study = study(SPREAD + "surroundings: {hum: {kind: tone, frequency: 100 Hz, speed: 1 mm/s rms}}\n");
        Map<?, ?> answer = json(study, "--set", "accept.error=0.02 m/s2");
        Map<?, ?> error = (Map<?, ?>) ((List<?>) answer.get("limits")).get(3);
        assertThat(error.get("limit")).isEqualTo("error");
        assertThat(((Number) error.get("devices")).intValue()).isEqualTo(256);
        Map<?, ?> figures = (Map<?, ?>) ((List<?>) answer.get("figures")).get(2);
        assertThat(figures.get("figure")).isEqualTo("error");
        assertThat(((Number) figures.get("p50_m_s2")).doubleValue())
                .isCloseTo(((Number) figures.get("nominal_m_s2")).doubleValue(), within(5e-4));
    }

    /** The report of a study with tolerances and an envelope has a section for each, and the chart in its place. */
    @Test
    void theReportTellsBoth() throws IOException {
        Path page = folder.resolve("page.html");
        Run run = Run.of("report", "examples/potting-oil/study.yaml", "--out", page.toString());
        assertThat(run.code()).isEqualTo(3);
        String text = Files.readString(page);
        assertThat(text)
                .contains("id=\"envelope\"")
                .contains("id=\"tolerance\"")
                .contains("Spread of the rejection over all devices")
                .contains("cut and plate");
        assertThat(text.indexOf("Spread of the rejection over all devices"))
                .isGreaterThan(text.indexOf("id=\"tolerance\""));
        String section = text.substring(text.indexOf("id=\"tolerance\""));
        assertThat(section.substring(0, section.indexOf("</section>")))
                .contains("id=\"chart-variance-least-rejection\"", "id=\"chart-rejection-spread\"");
    }
}
