package flowshy.verdict.curve;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Levers;
import flowshy.verdict.ReadingBand;
import java.nio.file.Path;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Fine curves against the answers they belong to, and the parts of the torque against their sum and against the explanation of edges. */
class DeviceCurveTest {
    private static Study study(String example, String... settings) {
        return StudyReader.read(Path.of("examples/" + example + "/study.yaml"), List.of(settings));
    }

    @ParameterizedTest
    @ValueSource(strings = {"workbench-air", "weather-mast", "helium-can", "water-tank"})
    void runsOverTheWholeBandAndThroughEveryEdge(String example) {
        BandsAnswer answer = study(example).question().answer();
        List<Double> frequencies = DeviceCurve.of(answer).points().stream()
                .map(point -> point.response().frequency())
                .toList();
        assertThat(frequencies).hasSizeGreaterThan(60).isSorted().doesNotHaveDuplicates();
        assertThat(frequencies.get(0)).isEqualTo(answer.band().from());
        assertThat(frequencies.get(frequencies.size() - 1))
                .isEqualTo(answer.band().to());
        assertThat(frequencies)
                .containsAll(
                        answer.bands().stream().skip(1).map(ReadingBand::from).toList());
    }

    @Test
    void aSharpResonanceIsSeenAtItsPeak() {
        BandsAnswer answer = study("workbench-air", "suspension.quality.value=150", "band.to=5 kHz")
                .question()
                .answer();
        double resonance = answer.facts().medium().orElseThrow().resonance();
        double peak = new Response(answer.device())
                .at(resonance)
                .motion()
                .orElseThrow()
                .norm();
        double drawn = DeviceCurve.of(answer).points().stream()
                .map(CurvePoint::response)
                .mapToDouble(point -> point.motion().orElseThrow().norm())
                .max()
                .orElseThrow();
        assertThat(drawn).isGreaterThanOrEqualTo(peak * (1.0 - 1e-9)).isLessThan(1.01 * peak);
    }

    /** gradient + added mass − i·damping is the flow's torque; its signs: added mass helps, damping lags the velocity. */
    @ParameterizedTest
    @ValueSource(strings = {"workbench-air", "water-tank", "wrong-fill"})
    void partsMakeTheFlowsTorque(String example) {
        BandsAnswer answer =
                study(example, "cover=open", "candidates=[open]").question().answer();
        Response response = new Response(answer.device());
        for (double frequency :
                new double[] {answer.band().from(), answer.band().to()}) {
            TorqueParts parts = TorqueParts.at(response, frequency);
            ResponsePoint point = response.at(frequency);
            double sum = new Complex(parts.gradient() + parts.addedMass(), parts.damping()).norm();
            assertThat(sum).isPositive().isCloseTo(point.flowTorque().norm(), within(1e-12 * sum));
            assertThat(parts.flow()).isCloseTo(sum, within(1e-12 * sum));
            assertThat(parts.motion()).isEqualTo(point.motionTorque().norm());
        }
    }

    @Test
    void partsAreThoseThatEdgesAreExplainedBy() {
        BandsAnswer answer = study("weather-mast").question().answer();
        List<Levers> levers = Levers.of(answer);
        assertThat(levers).isNotEmpty();
        for (Levers edge : levers) {
            TorqueParts parts = TorqueParts.at(new Response(answer.device()), edge.frequency());
            assertThat(parts.inertial()).isCloseTo(edge.inertial(), within(1e-12 * edge.inertial()));
            assertThat(parts.gradient()).isCloseTo(edge.gradient(), within(1e-12 * edge.gradient()));
            assertThat(parts.addedMass()).isCloseTo(edge.addedMass(), within(1e-12 * edge.addedMass()));
            assertThat(parts.damping()).isCloseTo(edge.drag(), within(1e-12 * edge.drag()));
        }
    }

    @Test
    void aSealedCoverLeavesOnlyInertia() {
        BandsAnswer answer = study("helium-can").question().answer();
        for (CurvePoint point : DeviceCurve.of(answer).points()) {
            TorqueParts parts = point.parts();
            assertThat(List.of(parts.gradient(), parts.addedMass(), parts.damping(), parts.flow()))
                    .containsOnly(0.0);
            assertThat(parts.motion()).isPositive().isCloseTo(parts.inertial(), within(1e-12 * parts.inertial()));
        }
    }

    /** δ = √(2ν/ω); ν of this air, 15.479 mm²/s, as the command prints it. */
    @Test
    void layersFollowTheRootOfFrequency() {
        BandsAnswer answer = study("workbench-air", "band.from=1 Hz", "band.to=16 Hz")
                .question()
                .answer();
        List<Layers.Layer> all = Layers.of(answer.device(), answer.band()).all();
        assertThat(all).hasSize(3);
        assertThat(all.get(1).frequency()).isCloseTo(4.0, within(1e-12));
        double first = all.get(0).thickness();
        assertThat(first).isCloseTo(Math.sqrt(2.0 * 1.5479e-5 / (2.0 * Math.PI)), within(1e-4 * first));
        assertThat(all.get(1).thickness()).isCloseTo(first / 2.0, within(1e-12 * first));
        assertThat(all.get(2).thickness()).isCloseTo(first / 4.0, within(1e-12 * first));
    }
}
