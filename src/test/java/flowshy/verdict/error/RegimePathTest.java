package flowshy.verdict.error;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.study.Study;
import flowshy.study.StudyReader;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Where a hair lives and what flows over it, against definitions and against the budget they are drawn beside. */
class RegimePathTest {
    private static Study study(String example) {
        return StudyReader.read(Path.of("examples/" + example + "/study.yaml"), List.of());
    }

    /** Without a mean stream the excursion over diameter is KC = 2π (û/ω)/d = û/(f d). */
    @Test
    void givenSpeedsAreSeenByTheirKeuleganCarpenterNumber() {
        Study study = study("workbench-air");
        List<RegimePath> paths = RegimePath.of(study.device(), study.band(), List.of());
        assertThat(paths).hasSize(3);
        double diameter = 2.0 * study.device().hair().profile().largestRadius();
        for (RegimePath path : paths) {
            assertThat(path.points()).hasSizeGreaterThan(20);
            for (RegimePath.Point point : path.points()) {
                double expected = path.speed() / (point.frequency() * diameter);
                assertThat(point.excursion()).isCloseTo(expected, within(1e-12 * expected));
                assertThat(point.regime().keuleganCarpenter()).isCloseTo(expected, within(1e-12 * expected));
            }
        }
    }

    /** With a stream the faster of mean and fluctuation counts, and grows from the wall to the tip. */
    @Test
    void surroundingsAreFollowedAtThreeHeights() {
        Study study = study("weather-mast");
        List<RegimePath> paths = RegimePath.of(study.device(), study.band(), study.surroundings());
        assertThat(paths).hasSize(3);
        for (int i = 1; i < paths.size(); i++) {
            assertThat(paths.get(i).speed()).isGreaterThan(paths.get(i - 1).speed());
        }
        RegimePath tip = paths.get(2);
        RegimePath.Point first = tip.points().get(0);
        double expected = tip.speed() / (first.frequency() * 2.0 * tip.radius());
        assertThat(first.excursion()).isCloseTo(expected, within(1e-12 * expected));
    }

    @Test
    void theRmsAddsUpToTheBudget() {
        for (String example : List.of("weather-mast", "fan-tray", "machine-hall", "air-duct")) {
            ErrorBudget budget = study(example).question().answer().error().orElseThrow();
            List<ErrorBudget.DensityPoint> points = budget.points();
            assertThat(points).hasSizeGreaterThan(20);
            ErrorBudget.DensityPoint last = points.get(points.size() - 1);
            assertThat(last.runningRms()).isCloseTo(budget.rms(), within(1e-9 * budget.rms()));
            double noise = budget.noise().orElseThrow();
            assertThat(last.runningNoise()).isCloseTo(noise, within(1e-9 * noise));
            double before = 0.0;
            for (ErrorBudget.DensityPoint point : points) {
                assertThat(point.runningRms()).isGreaterThanOrEqualTo(before);
                before = point.runningRms();
            }
        }
    }

    @Test
    void theFluidRestsAtTheWallAndEndsAtARoof() {
        Study study = study("fan-tray");
        FlowOverHair bare = FlowOverHair.of(study.device(), study.surroundings());
        assertThat(bare.levels().get(0).mean()).isZero();
        assertThat(bare.levels().get(0).deviation()).isZero();
        FlowOverHair.Level top = bare.levels().get(bare.levels().size() - 1);
        assertThat(top.height())
                .isCloseTo(1.25 * study.device().hair().profile().length(), within(1e-12));
        assertThat(top.mean()).isEqualTo(top.means().get(0)).isPositive();
        Study roofed = StudyReader.read(
                Path.of("examples/fan-tray/study.yaml"), List.of("cover={kind: roofed, gap: 0.47 mm, length: 6 mm}"));
        FlowOverHair under = FlowOverHair.of(roofed.device(), roofed.surroundings());
        FlowOverHair.Level roof = under.levels().get(under.levels().size() - 1);
        assertThat(roof.height()).isCloseTo(0.47e-3, within(1e-12));
        assertThat(roof.mean()).isCloseTo(0.0, within(1e-9));
    }
}
