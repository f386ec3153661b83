package flowshy.verdict.error;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.SteadyDrag;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.math.LogTable;
import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.MediumQuery;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.response.Suspension;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.MeasuredCover;
import flowshy.verdict.Band;
import flowshy.verdict.Reads;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** The error budget against figures worked from the laws it is made of, and against its limits and symmetries. */
class SurroundingsQuestionTest {
    private static final Band BAND = new Band(20.0, 500.0);
    private static final double LENGTH = 6e-4;
    private static final double RADIUS = 4e-5;
    private static final Medium AIR = Media.at(MediumQuery.of("dry air", 293.15, 101325.0));

    private static Device device(Cover cover) {
        return new Device(
                new Hair(new Cylinder(LENGTH, RADIUS), 1200.0, OptionalDouble.empty()),
                Optional.of(new Suspension(4e-9, 2e-13, 0.0, 0.0, Attitude.UPRIGHT, OptionalDouble.empty())),
                AIR,
                cover,
                AIR);
    }

    private static ErrorBudget budget(Cover cover, Motion motion, Source... sources) {
        return new SurroundingsQuestion(device(cover), BAND, 20.0, motion, List.of(sources)).answer();
    }

    /** A faint tone meets the linear law: its error is ω u |T_flow|/|T_motion|, the column that the response table prints. */
    @Test
    void aFaintToneReadsAsTheResponseSays() {
        for (double frequency : new double[] {25.0, 80.0, 400.0}) {
            ErrorBudget budget = budget(Covers.OPEN, Motion.NONE, PlainSource.tone(frequency, 1e-6, 0.0));
            double expected =
                    1e-6 * new Response(device(Covers.OPEN)).at(frequency).equivalent();
            assertThat(budget.rms()).isCloseTo(expected, within(2e-6 * expected));
            assertThat(budget.offset()).isZero();
        }
    }

    /** The law is linear below an excursion of 0.3: twice the tone, twice the error; far above it more than twice. */
    @Test
    void aLoudToneLeavesTheLinearLaw() {
        double faint = budget(Covers.OPEN, Motion.NONE, PlainSource.tone(30.0, 1e-5, 0.0))
                .rms();
        double twice = budget(Covers.OPEN, Motion.NONE, PlainSource.tone(30.0, 2e-5, 0.0))
                .rms();
        double loud = budget(Covers.OPEN, Motion.NONE, PlainSource.tone(30.0, 1.0, 0.0))
                .rms();
        assertThat(twice / faint).isCloseTo(2.0, within(1e-12));
        assertThat(loud / faint).isGreaterThan(1.5e5);
    }

    @Test
    void tonesCountByTheCosineOfTheirDirection() {
        double along = budget(Covers.OPEN, Motion.NONE, PlainSource.tone(80.0, 1e-4, 0.0))
                .rms();
        double slanted = budget(Covers.OPEN, Motion.NONE, PlainSource.tone(80.0, 1e-4, Math.PI / 3))
                .rms();
        double across = budget(Covers.OPEN, Motion.NONE, PlainSource.tone(80.0, 1e-4, Math.PI / 2))
                .rms();
        assertThat(slanted / along).isCloseTo(0.5, within(1e-12));
        assertThat(across).isZero();
    }

    /** Uniform steady stream: torque f(U) L²/2, over the inertial torque (ρ_h − ρ) πa² L²/2. Worked from the drag law alone. */
    @Test
    void aSteadyStreamTiltsByItsDrag() {
        double speed = 0.4;
        double drag = new SteadyDrag(RADIUS, AIR).force(speed);
        double expected = drag / ((1200.0 - AIR.density()) * Math.PI * RADIUS * RADIUS);
        ErrorBudget along = budget(Covers.OPEN, Motion.NONE, PlainSource.stream(speed, 1e-20, 0.0));
        ErrorBudget against = budget(Covers.OPEN, Motion.NONE, PlainSource.stream(speed, 1e-20, Math.PI));
        ErrorBudget across = budget(Covers.OPEN, Motion.NONE, PlainSource.stream(speed, 1e-20, Math.PI / 2));
        assertThat(along.offset()).isCloseTo(expected, within(1e-6 * expected));
        assertThat(against.offset()).isCloseTo(-expected, within(1e-6 * expected));
        assertThat(across.offset()).isZero();
        assertThat(along.sources().get(0).offset()).isCloseTo(along.offset(), within(1e-15));
    }

    /** f → 0 in a stream: the fluctuation meets the slope of the drag along, f/U across; the ratio of both by hand. */
    @Test
    void aSlowFluctuationMeetsTheSlopeOfTheDrag() {
        double speed = 3.0;
        SteadyDrag drag = new SteadyDrag(RADIUS, AIR);
        double along = slow(0.0, speed);
        double across = slow(Math.PI / 2, speed);
        assertThat(across / along).isCloseTo(drag.resistance(speed) / drag.slope(speed), within(0.02));
        double torque = drag.slope(speed) * 0.5 * LENGTH * LENGTH;
        double motion = new Response(device(Covers.OPEN))
                .at(Math.sqrt(3.0))
                .motionTorque()
                .norm();
        double expected = torque / motion * Math.sqrt(1e-12 * 2.0);
        assertThat(along).isCloseTo(expected, within(0.03 * expected));
    }

    private static double slow(double direction, double speed) {
        return new SurroundingsQuestion(
                        device(Covers.SEALED).bare(),
                        new Band(1.0, 3.0),
                        20.0,
                        Motion.NONE,
                        List.of(PlainSource.stream(speed, 1e-12, direction)))
                .answer()
                .rms();
    }

    /** Two equal uncorrelated sources, both present in both questions through the operating point of the louder stream. */
    @Test
    void equalSourcesAddByTheSquareAtOneOperatingPoint() {
        Source carrier = PlainSource.stream(2.0, 1e-30, 0.0);
        double one = budget(Covers.OPEN, Motion.NONE, carrier, PlainSource.stream(0.0, 1e-12, 0.0))
                .rms();
        double two = budget(
                        Covers.OPEN,
                        Motion.NONE,
                        carrier,
                        PlainSource.stream(0.0, 1e-12, 0.0),
                        PlainSource.stream(0.0, 1e-12, 0.0))
                .rms();
        assertThat(two / one).isCloseTo(Math.sqrt(2.0), within(1e-6));
    }

    @Test
    void aMeasuredCoverOfNoAttenuationIsNone() {
        LogTable none = new LogTable(List.of(1.0, 1000.0), List.of(0.0, 0.0));
        Source[] sources = {PlainSource.tone(80.0, 1e-3, 0.2), PlainSource.stream(0.3, 1e-7, 0.5)};
        ErrorBudget open = budget(Covers.OPEN, Motion.NONE, sources[1]);
        ErrorBudget covered = budget(new MeasuredCover("none.csv", none, Optional.empty()), Motion.NONE, sources[1]);
        assertThat(covered.rms()).isEqualTo(open.rms());
        assertThat(covered.offset()).isEqualTo(open.offset());
    }

    @Test
    void nothingEntersASealedCover() {
        ErrorBudget sealed = budget(
                Covers.SEALED,
                new Motion(OptionalDouble.of(0.1), OptionalDouble.of(6.0), Optional.empty()),
                PlainSource.stream(1.0, 1e-4, 0.0),
                PlainSource.tone(80.0, 0.01, 0.0));
        assertThat(sealed.rms()).isZero();
        assertThat(sealed.offset()).isZero();
        assertThat(sealed.bands())
                .singleElement()
                .satisfies(band -> assertThat(band.reads()).isEqualTo(Reads.MOTION));
        assertThat(sealed.smallestReadable()).isEqualTo(sealed.noise().orElseThrow());
    }

    /** Common practice, no source: 0.1 to 6 m/s² is 35.6 dB; the smallest reading stands where signal equals error and noise. */
    @Test
    void dynamicRangeIsTwentyTimesTheLogarithm() {
        Motion motion = new Motion(OptionalDouble.empty(), OptionalDouble.of(6.0), Optional.empty());
        double equivalent = new Response(device(Covers.OPEN)).at(80.0).equivalent();
        ErrorBudget budget = budget(Covers.OPEN, motion, PlainSource.tone(80.0, 0.1 / equivalent, 0.0));
        double readable = Math.hypot(budget.rms(), budget.noise().orElseThrow());
        assertThat(budget.smallestReadable()).isCloseTo(readable, within(1e-15));
        assertThat(budget.dynamicRange().orElseThrow()).isCloseTo(20.0 * Math.log10(6.0 / readable), within(1e-12));
        assertThat(20.0 * Math.log10(6.0 / 0.1)).isCloseTo(35.6, within(0.05));
    }

    /** On a path of speed that crosses all regimes the error has no jump. */
    @Test
    void theErrorHasNoJumpWhereTheRegimeChanges() {
        double before = Double.NaN;
        double slopeBefore = Double.NaN;
        int steps = 0;
        for (double lg = -4.0; lg <= 0.7; lg += 0.01) {
            double speed = Math.pow(10.0, lg);
            double error = budget(Covers.OPEN, Motion.NONE, PlainSource.tone(40.0, speed, 0.0))
                    .rms();
            double slope = Math.log10(error / before) / 0.01;
            if (Double.isFinite(slopeBefore)) {
                assertThat(Math.abs(slope - slopeBefore)).isLessThan(0.08);
                steps++;
            }
            slopeBefore = slope;
            before = error;
        }
        assertThat(steps).isGreaterThan(400);
    }

    @Test
    void sharesAddUpAndLinesAreCountedOnce() {
        Source two = new PlainSource("pair", 0.0, 0.0, 0.0, List.of(new Line(50.0, 1e-5), new Line(500.0, 1e-5)), true);
        ErrorBudget both = budget(Covers.OPEN, Motion.NONE, two, PlainSource.tone(80.0, 1e-5, 0.0));
        assertThat(both.sources().stream().mapToDouble(SourceError::share).sum())
                .isCloseTo(1.0, within(1e-12));
        Response response = new Response(device(Covers.OPEN));
        double expected = 1e-5
                * Math.hypot(response.at(50.0).equivalent(), response.at(500.0).equivalent());
        assertThat(both.sources().get(0).rms()).isCloseTo(expected, within(1e-5 * expected));
    }
}
