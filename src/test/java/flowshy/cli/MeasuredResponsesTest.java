package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Measured responses beside the model, as {@code bands} prints them. */
class MeasuredResponsesTest {
    private static final String STUDY = "examples/measured-pickup/study.yaml";

    @Test
    void textTellsDeviationAndWhereTheyDiffer() {
        Run run = Run.of("bands", STUDY);
        assertThat(run.code()).isZero();
        assertThat(run.out())
                .contains("Measured beside the model")
                .contains("one common factor taken out, nothing else")
                .contains("Measurement and model differ by more than their")
                .contains("shaker over flow tube");
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    @Test
    void jsonAndCsvHoldEveryPoint() {
        Map<String, Object> answer =
                Json.object(Json.parse(Run.of("bands", STUDY, "--json").out()));
        List<Map<String, Object>> measured = Json.objects(answer.get("measured"));
        assertThat(measured)
                .extracting(one -> one.get("name"))
                .containsExactly("shaker", "flow tube", "shaker over flow tube");
        assertThat(measured).extracting(one -> one.get("agreement")).containsOnly("differ");
        List<Map<String, Object>> points = Json.objects(measured.get(0).get("points"));
        assertThat(points).hasSize(31);
        Map<String, Object> point = points.get(4);
        double off = 20.0 * Math.log10((double) point.get("measured") / (double) point.get("predicted"));
        assertThat((double) point.get("deviation_db")).isCloseTo(off, within(1e-9));
        assertThat((double) point.get("uncertainty_db")).isCloseTo(0.2 / Math.log(10.0), within(1e-9));
        assertThat(Json.objects(measured.get(2).get("points")).get(0))
                .containsEntry("measured_phase_deg", null)
                .containsEntry("measured_phase_deg_reason", "no phase was measured");
        List<String> csv = Run.of("bands", STUDY, "--csv").out().lines().toList();
        assertThat(csv)
                .contains(
                        "measurement,of,amplitude_unit,frequency_hz,measured,predicted,deviation_db,uncertainty_db,model_uncertainty_db,"
                                + "measured_phase_deg,predicted_phase_deg,deviation_deg,uncertainty_deg,model_uncertainty_deg");
        assertThat(csv.stream().filter(line -> line.startsWith("shaker,motion,V/(m/s2),")))
                .hasSize(31);
        assertThat(csv.stream().filter(line -> line.startsWith("flow tube,flow,V/(m/s),")))
                .hasSize(28);
    }

    @Test
    void aGainInTheStudyIsTakenAsGiven() {
        Run run = Run.of("bands", STUDY, "--set", "measurements.shaker.gain=2.6 V/rad");
        assertThat(run.out()).contains("2.600 V/rad, as given");
        Run wrong = Run.of("bands", STUDY, "--set", "measurements.shaker.gain=2.6 V/m");
        assertThat(wrong.code()).isEqualTo(2);
        assertThat(wrong.err()).contains("measurements.shaker.gain: 2.6 V/m").contains("V/rad");
    }
}
