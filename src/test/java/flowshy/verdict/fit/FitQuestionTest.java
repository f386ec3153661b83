package flowshy.verdict.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.response.FreeSwing;
import flowshy.response.Oscillator;
import flowshy.verdict.measured.Agreement;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredPoint;
import flowshy.verdict.measured.MeasuredResponse;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What a fit finds of a device that is known, and what it refuses to find. */
class FitQuestionTest {
    private static final List<Freed> BOTH = List.of(Bench.FREE_STIFFNESS, Bench.FREE_DAMPING);

    private static FitAnswer fit(List<Freed> free, List<MeasuredResponse> runs, Robustness robustness) {
        return new FitQuestion(Bench.density(), Bench.stated(), Bench.BAND, free, runs, List.of(), robustness).answer();
    }

    private static List<MeasuredResponse> both(double noise, boolean stated, long seed) {
        return List.of(
                Bench.run("shaker", Measurand.MOTION, true, noise, stated, seed),
                Bench.run("tube", Measurand.FLOW, true, noise, stated, seed + 1));
    }

    /** Without noise the truth comes back to many digits, from a start 16 % off in stiffness and a factor two in damping. */
    @ParameterizedTest
    @EnumSource
    void noiselessDataGiveTheTruth(Robustness robustness) {
        FitAnswer answer = fit(BOTH, both(1e-9, true, 1), robustness);
        assertThat(answer.estimates()).hasSize(3);
        assertThat(answer.estimates().get(0).value() / Bench.STIFFNESS).isCloseTo(1.0, within(1e-8));
        assertThat(answer.estimates().get(1).value() / Bench.DAMPING).isCloseTo(1.0, within(1e-7));
        assertThat(answer.estimates().get(2).value() / Bench.GAIN).isCloseTo(1.0, within(1e-8));
        assertThat(answer.device().suspension().orElseThrow().stiffness())
                .isEqualTo(answer.estimates().get(0).value());
        assertThat(answer.outliers()).isEmpty();
        assertThat(answer.after())
                .hasSize(3)
                .allSatisfy(one -> assertThat(one.agreement().outcome()).isEqualTo(Agreement.Outcome.AGREE));
        assertThat(answer.before().get(0).agreement().outcome()).isEqualTo(Agreement.Outcome.DIFFER);
    }

    /** Angles have no free gain, so that inertia shows: the density of the hair comes out too. */
    @Test
    void findsTheDensityOfTheHair() {
        List<MeasuredResponse> angles = List.of(
                Bench.run("shaker", Measurand.MOTION, false, 0.005, true, 7),
                Bench.run("tube", Measurand.FLOW, false, 0.005, true, 8));
        FitAnswer answer =
                fit(List.of(Bench.FREE_STIFFNESS, Bench.FREE_DAMPING, Bench.FREE_DENSITY), angles, Robustness.HUBER);
        assertThat(answer.estimates()).extracting(e -> e.freed().key()).endsWith("hair.density");
        Estimate density = answer.estimates().get(2);
        assertThat(Math.abs(density.value() - Bench.DENSITY)).isLessThan(3.0 * density.uncertainty());
        assertThat(density.uncertainty()).isBetween(0.1, 30.0);
        assertThat(answer.device().hair().density()).isEqualTo(density.value());
        assertThat(answer.derived())
                .extracting(Derived::key)
                .contains("vacuum_resonance_hz", "vacuum_quality", "resonance_hz", "quality");
    }

    /** A rejection alone tells the density: the suspension cancels, and freeing it is refused by name. */
    @Test
    void aRejectionTellsTheDensityAndNothingOfTheSuspension() {
        List<MeasuredResponse> ratio = List.of(Bench.run("ratio", Measurand.REJECTION, false, 0.01, true, 9));
        FitAnswer answer = fit(List.of(Bench.FREE_DENSITY), ratio, Robustness.NONE);
        Estimate density = answer.estimates().get(0);
        assertThat(Math.abs(density.value() - Bench.DENSITY)).isLessThan(3.0 * density.uncertainty());
        assertThatThrownBy(() -> fit(List.of(Bench.FREE_STIFFNESS), ratio, Robustness.NONE))
                .isInstanceOf(FitException.class)
                .hasMessage("nothing that was measured depends on suspension.stiffness; do not free it");
    }

    /** With the gain free, stiffness, damping and density scale together: the response stays the same, and the fit says so. */
    @Test
    void whatCannotBeToldApartIsRefused() {
        List<MeasuredResponse> motion = List.of(Bench.run("shaker", Measurand.MOTION, true, 0.01, true, 11));
        List<MeasuredResponse> turned = List.of(new MeasuredResponse(
                "low",
                Measurand.MOTION,
                motion.get(0).reading(),
                OptionalDouble.empty(),
                motion.get(0).points().subList(0, 2)));
        assertThatThrownBy(() -> fit(
                        List.of(Bench.FREE_STIFFNESS, Bench.FREE_DAMPING, Bench.FREE_DENSITY), turned, Robustness.NONE))
                .isInstanceOf(FitException.class)
                .hasMessageContaining("4 measured numbers cannot settle 4 free ones");
        Freed twice = new Freed("stiffness again", Freed.Kind.VOLTS, "V/rad", 1.0, 0.0, 1e9);
        assertThatThrownBy(() -> fit(List.of(Bench.FREE_STIFFNESS, twice), motion, Robustness.NONE))
                .isInstanceOf(FitException.class)
                .hasMessageContaining("nothing that was measured depends on");
    }

    /** One reading that went wrong by a third pulls plain least squares, hardly Huber's, not at all Tukey's estimator. */
    @Test
    void outliersAreToldAndHardlyPull() {
        List<MeasuredResponse> runs = new ArrayList<>(both(0.01, true, 21));
        List<MeasuredPoint> points = new ArrayList<>(runs.get(0).points());
        MeasuredPoint good = points.get(20);
        points.set(
                20,
                new MeasuredPoint(
                        good.frequency(),
                        1.35 * good.amplitude(),
                        good.phase(),
                        good.uncertainty(),
                        good.phaseUncertainty()));
        runs.set(
                0,
                new MeasuredResponse(
                        "shaker", Measurand.MOTION, runs.get(0).reading(), OptionalDouble.empty(), points));
        double clean = fit(BOTH, both(0.01, true, 21), Robustness.NONE)
                .estimates()
                .get(0)
                .value();
        double plain = fit(BOTH, runs, Robustness.NONE).estimates().get(0).value();
        FitAnswer huber = fit(BOTH, runs, Robustness.HUBER);
        FitAnswer tukey = fit(BOTH, runs, Robustness.TUKEY);
        double pull = Math.abs(plain - clean);
        assertThat(Math.abs(huber.estimates().get(0).value() - clean)).isLessThan(0.5 * pull);
        assertThat(Math.abs(tukey.estimates().get(0).value() - clean)).isLessThan(0.25 * pull);
        assertThat(huber.outliers()).singleElement().satisfies(outlier -> {
            assertThat(outlier.name()).isEqualTo("shaker");
            assertThat(outlier.frequency()).isEqualTo(good.frequency());
            assertThat(outlier.part()).isEqualTo(Residual.Part.LEVEL);
            assertThat(outlier.share()).isGreaterThan(20.0);
            assertThat(outlier.weight()).isLessThan(0.1);
        });
        assertThat(huber.chance().getAsDouble()).isLessThan(1e-6);
        assertThat(huber.core().chance().getAsDouble()).isGreaterThan(0.01);
        assertThat(huber.enlarged()).isCloseTo(1.0, within(1e-12)); // one outlier does not make the rest less certain
    }

    /** Uncertainties stated a third of the scatter enlarge the intervals, and a sentence says so. */
    @Test
    void understatedUncertaintiesAreEnlarged() {
        List<MeasuredResponse> runs = new ArrayList<>();
        for (MeasuredResponse run : both(0.03, true, 31)) {
            runs.add(new MeasuredResponse(
                    run.name(),
                    run.of(),
                    run.reading(),
                    run.gain(),
                    run.points().stream()
                            .map(p -> new MeasuredPoint(
                                    p.frequency(),
                                    p.amplitude(),
                                    p.phase(),
                                    OptionalDouble.of(0.01),
                                    OptionalDouble.of(0.01)))
                            .toList()));
        }
        for (Robustness robustness : Robustness.values()) {
            FitAnswer answer = fit(BOTH, runs, robustness);
            assertThat(answer.enlarged()).as("%s", robustness).isBetween(2.4, 3.6);
            assertThat(answer.warnings())
                    .anySatisfy(warning -> assertThat(warning).contains("Birge 1932"));
        }
    }

    @Test
    void scatterStandsInForUncertaintiesThatAreNotStated() {
        FitAnswer answer = fit(BOTH, both(0.02, false, 41), Robustness.NONE);
        assertThat(answer.chiSquare()).isEmpty();
        assertThat(answer.scatters())
                .hasSize(2)
                .allSatisfy(s -> assertThat(s.share()).isBetween(0.014, 0.026));
    }

    /** A recorded swing gives stiffness and damping alone; its uncertainties go through to theirs. */
    @Test
    void aSwingGivesStiffnessAndDamping() {
        Complex root = new Oscillator(
                        Bench.stated().hair(),
                        Bench.device(Bench.STIFFNESS, Bench.DAMPING, Bench.DENSITY)
                                .suspension()
                                .orElseThrow(),
                        Optional.of(Bench.stated().around()))
                .decay()
                .root()
                .orElseThrow();
        double frequency = root.getImaginary() / (2.0 * Math.PI);
        double decay = -1.0 / root.getReal();
        List<MeasuredSwing> swings = List.of(
                new MeasuredSwing("a", new FreeSwing(frequency, decay, 1e-3 * frequency, 1e-2 * decay, 0.01)),
                new MeasuredSwing("b", new FreeSwing(frequency, decay, 1e-3 * frequency, 1e-2 * decay, 0.01)));
        FitAnswer answer = new FitQuestion(
                        Bench.density(), Bench.stated(), Bench.BAND, BOTH, List.of(), swings, Robustness.NONE)
                .answer();
        assertThat(answer.estimates().get(0).value() / Bench.STIFFNESS).isCloseTo(1.0, within(1e-9));
        assertThat(answer.estimates().get(1).value() / Bench.DAMPING).isCloseTo(1.0, within(1e-8));
        // stiffness goes with the square of the frequency; two records halve the variance
        assertThat(answer.estimates().get(0).uncertainty() / Bench.STIFFNESS)
                .isCloseTo(2.0 * 1e-3 / Math.sqrt(2.0), within(2e-4));
        assertThat(answer.warnings())
                .anySatisfy(warning -> assertThat(warning).contains("degrees of freedom are left"));
    }

    /** Data of a device without structural damping: the estimate stays at zero and says that it stands there. */
    @Test
    void aBoundIsTold() {
        Freed floor = new Freed("suspension.damping", Freed.Kind.DAMPING, "N.m.s/rad", 5e-13, 4e-13, 1e6);
        FitAnswer answer = fit(List.of(Bench.FREE_STIFFNESS, floor), both(0.01, true, 51), Robustness.NONE);
        Estimate damping = answer.estimates().get(1);
        assertThat(damping.value()).isCloseTo(4e-13, within(1e-19));
        assertThat(damping.bound()).isTrue();
        assertThat(answer.warnings())
                .anySatisfy(warning -> assertThat(warning)
                        .startsWith("suspension.damping stands at its bound of 4.000e-13 N.m.s/rad"));
    }
}
