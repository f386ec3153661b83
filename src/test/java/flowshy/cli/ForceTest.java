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

/** The force along a hair through the command line: text, JSON, CSV and chart hold the same distribution. */
class ForceTest {
    private static final String AIR =
            Path.of("examples", "workbench-air", "study.yaml").toString();

    @TempDir
    private Path folder;

    private Map<String, Object> force(String study, String frequency) {
        Run run = Run.of("bands", study, "--json", "--force-at", frequency);
        return Json.objects(Json.object(Json.parse(run.out())).get("force")).get(0);
    }

    /** 800 × 80 um in air at 80 Hz, finite elements: |∫ z f dz| 4.3977e-11 N·m per m/s, |∫ f dz| 9.5321e-8 N per m/s. */
    @Test
    void holdsTheFiniteElementSolution() throws IOException {
        Path study = folder.resolve("s.yaml");
        Files.writeString(study, """
                hair: {length: 800 um, diameter: 80 um, density: 1.2 g/cm3}
                medium: {density: 1.204 kg/m3, viscosity: 18.25 uPa.s}
                """);
        Map<String, Object> force = force(study.toString(), "80 Hz");
        assertThat((double) force.get("frequency_hz")).isEqualTo(80.0);
        assertThat((double) force.get("stream_torque_n_m_per_m_s")).isCloseTo(4.3977e-11, within(0.004 * 4.3977e-11));
        assertThat((double) force.get("stream_factor")).isCloseTo(1.06, within(0.01));
        assertThat((double) force.get("stream_factor_phase_deg")).isCloseTo(-4.0, within(0.6));
        assertThat((double) force.get("solution_error")).isBetween(1e-6, 2e-3);
        double re = 0.0;
        double im = 0.0;
        List<Map<String, Object>> slices = Json.objects(force.get("slices"));
        assertThat(slices).hasSizeGreaterThan(20);
        for (Map<String, Object> slice : slices) {
            double size = (double) slice.get("stream_force_n_per_m_s");
            double phase = Math.toRadians((double) slice.get("stream_force_phase_deg"));
            re += size * Math.cos(phase);
            im += size * Math.sin(phase);
        }
        assertThat(Math.hypot(re, im)).isCloseTo(9.5321e-8, within(0.001 * 9.5321e-8));
    }

    @Test
    void saysWhatStripTheoryMisses() {
        Run run = Run.of("bands", AIR, "--force-at", "80 Hz, 320 Hz");
        assertThat(run.code()).isZero();
        assertThat(run.out())
                .contains("Force along the hair at 80.000 Hz")
                .contains("Force along the hair at 320.00 Hz")
                .containsPattern(
                        "strip theory has 12\\.3 % less torque than the whole\\s+hair and leads it by 8\\.4 deg");
        assertThat(run.out().lines())
                .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
    }

    @Test
    void goesIntoTableAndChart() throws IOException {
        Path csv = folder.resolve("force.csv");
        Path charts = folder.resolve("charts");
        Run run = Run.of("bands", AIR, "--force-at", "80 Hz", "--csv", csv.toString(), "--chart", charts.toString());
        assertThat(run.code()).isZero();
        List<String> lines = Files.readAllLines(csv);
        assertThat(lines).anyMatch(line -> line.startsWith("frequency_hz,from_m,to_m,stream_force_n_per_m_s,"));
        List<String> table = Files.readAllLines(charts.resolve("force-along-hair-80-hz.csv"));
        assertThat(table.get(0)).contains("height_um").contains("strip_stream_n_per_m_per_m_s");
        assertThat(table).hasSizeGreaterThan(30);
        assertThat(charts.resolve("force-along-hair-80-hz.svg")).content().contains("Force along the hair at 80 Hz");
        assertThat(charts.resolve("force-along-hair-80-hz.png")).isNotEmptyFile();
    }

    /** In water the layer at 1 MHz is thinner than the solver takes. */
    @Test
    void saysWhereItIsNotSolved() throws IOException {
        Path study = folder.resolve("s.yaml");
        Files.writeString(study, """
                hair: {length: 800 um, diameter: 80 um, density: 1.2 g/cm3}
                medium: water
                """);
        Run run = Run.of("bands", study.toString(), "--force-at", "1 MHz");
        assertThat(run.err()).isEmpty();
        assertThat(run.out()).contains("Not solved: above").containsPattern("thinner than 0\\.05 of\\s+the\\s+largest");
        Map<String, Object> force = force(study.toString(), "1 MHz");
        assertThat(force.get("stream_factor")).isNull();
        assertThat(force).containsKey("stream_factor_reason");
        assertThat(Json.objects(force.get("slices"))).isEmpty();
    }
}
