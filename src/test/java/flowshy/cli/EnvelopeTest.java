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

class EnvelopeTest {
    private static final String DEVICE = """
            hair: {length: 700 um, diameter: 140 um, density: 7.9 g/cm3}
            medium: {name: silicone oil, grade: 10 cSt, temperature: 25 degC}
            band: {from: 200 Hz, to: 2 kHz}
            accept: {rejection: 4 dB}
            finite-length: off
            """;

    @TempDir
    private static Path folder;

    private static String study(String envelope) throws IOException {
        return Files.writeString(Files.createTempFile(folder, "study", ".yaml"), DEVICE + envelope)
                .toString();
    }

    private static Map<?, ?> json(String study, String... more) {
        String[] words = new String[more.length + 3];
        words[0] = "bands";
        words[1] = study;
        words[2] = "--json";
        System.arraycopy(more, 0, words, 3, more.length);
        Run run = Run.of(words);
        assertThat(run.err()).isEmpty();
        Map<?, ?> answer = (Map<?, ?>) Json.parse(run.out());
        assertThat(Json.numbers(answer, study)).isPositive();
        return answer;
    }

    private static Map<?, ?> limit(Map<?, ?> answer) {
        return (Map<?, ?>) ((List<?>) ((Map<?, ?>) answer.get("verdict")).get("limits")).get(0);
    }

    private static double found(Map<?, ?> answer) {
        return ((Number) limit(answer).get("found")).doubleValue();
    }

    /** The same oil at each state by a study of its own. */
    @Test
    void theWorstStateIsTheOneThatAStudyOfItsOwnFinds() throws IOException {
        String study = study("envelope: {medium.temperature: [-10 degC, 25 degC, 70 degC]}\n");
        Map<?, ?> answer = json(study);
        double cold = found(json(study(""), "--set", "medium.temperature=-10 degC"));
        double warm = found(json(study(""), "--set", "medium.temperature=70 degC"));
        assertThat(cold).isLessThan(warm - 1.0);
        assertThat(found(answer)).isCloseTo(cold, within(1e-9));
        assertThat(limit(answer).get("reason")).isEqualTo("at medium.temperature -10 degC");
        Map<?, ?> envelope = (Map<?, ?>) answer.get("envelope");
        assertThat(((Number) envelope.get("largest_least_rejection_db")).doubleValue())
                .isCloseTo(warm, within(1e-9));
        assertThat(((Number) envelope.get("states")).intValue()).isEqualTo(3);
        Run run = Run.of("bands", study);
        assertThat(run.code()).isEqualTo(3);
        assertThat(run.out()).contains("Decision: fails").contains("Envelope: fails");
        assertThat(Run.of("bands", study(""), "--set", "accept.rejection=3 dB").code())
                .isZero();
    }

    @Test
    void aStateThatCannotBeWorkedOutLeavesItUndecided() throws IOException {
        String study = Files.writeString(
                        Files.createTempFile(folder, "ice", ".yaml"),
                        DEVICE.replace("{name: silicone oil, grade: 10 cSt, temperature: 25 degC}", "water")
                                        .replace("4 dB", "1 dB")
                                + "envelope: {medium.temperature: [20 degC, 300 degC]}\n")
                .toString();
        Run run = Run.of("bands", study);
        assertThat(run.code()).isEqualTo(3);
        assertThat(run.out())
                .contains("Decision: undecided")
                .contains("[cannot be worked out] medium.temperature 300 degC:");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "medium.temperature: [20] | 20 has no unit; a temperature is wanted here",
                "medium.temperature: 60 degC..20 degC | a range from 60 degC to 20 degC is upside down",
                "medium.temprature: [20 degC] | unknown key; a number of this study is wanted",
                "medium.name: [water] | not a number",
                "medium.temperature: {from: 3 degC} | a list of values is wanted here, or a range",
                "medium.temperature: 3 kg..4 kg | 3 kg is a mass; a temperature is wanted here",
                "surroundings.fan.mean-speed: [1 m/s] | the study does not state it",
            })
    void saysWhatIsWrong(String entry, String told) throws IOException {
        Run run = Run.of("bands", study("envelope: {" + entry + "}\n"));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains(told).contains(".yaml:6:");
    }

    @Test
    void tooManyStatesAreRefused() throws IOException {
        StringBuilder values = new StringBuilder("20 degC");
        for (int i = 1; i < 50; i++) {
            values.append(", ").append(20 + i).append(" degC");
        }
        Run run = Run.of(
                "bands",
                study("envelope: {medium.temperature: [" + values + "], hair.length: ["
                        + values.toString().replace("degC", "um") + "]}\n"));
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("2500 states; at most 2000 are judged");
    }
}
