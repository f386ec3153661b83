package flowshy.verdict.lid;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.math.LogTable;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.response.Suspension;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.MeasuredCover;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.stream.cover.VentedCover;
import flowshy.stream.surroundings.Tone;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.error.Motion;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

/** Which cover is chosen, what is said of each, and what would do if none does; each figure found again by another way. */
class LidQuestionTest {
    private static final Medium AIR = medium("air of the test", Phase.GAS, 1.2, 1.82e-5, OptionalDouble.of(343.0));
    private static final Band BAND = new Band(25.0, 900.0);
    private static final double REFERENCE = 150.0;
    private static final Cylinder ROD = new Cylinder(7.3e-4, 4.1e-5);

    private static final Cover ROOF = new RoofedCover(9e-4, 4e-3);
    private static final Cover VENTED = new VentedCover(3, 1.5e-4, 3e-4, true, 6e-9, 3e-6);

    private static Medium medium(
            String name, Phase phase, double density, double viscosity, OptionalDouble soundSpeed) {
        return new Medium(
                name,
                phase,
                293.15,
                101325.0,
                density,
                viscosity,
                soundSpeed,
                OptionalDouble.empty(),
                List.of(),
                List.of());
    }

    private static Device device(double diameters, double densities) {
        Hair hair = new Hair(ROD.thickened(diameters), densities * 1190.0, OptionalDouble.empty());
        Suspension held = new Suspension(4e-9, 4e-13, 0.0, 0.0, Attitude.UPRIGHT, OptionalDouble.empty());
        return new Device(hair, Optional.of(held), AIR, Covers.OPEN, AIR);
    }

    private static List<Candidate> in(Medium around, Cover... covers) {
        return List.of(covers).stream()
                .map(cover -> new Candidate(cover, around))
                .toList();
    }

    private static Acceptance asked(double rejection) {
        return new Acceptance(OptionalDouble.of(rejection), OptionalDouble.empty());
    }

    private static LidAnswer answer(double rejection, List<Candidate> candidates) {
        return new LidQuestion(device(1.0, 1.0), BAND, asked(rejection), REFERENCE, candidates).answer();
    }

    /** Least rejection on a plain grid of frequencies; no curve is built, no turning point looked for. */
    private static double least(Device device, double from, double to) {
        Response response = new Response(device);
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i <= 300; i++) {
            least = FastMath.min(least, response.rejection(from * FastMath.pow(to / from, i / 300.0)));
        }
        return least;
    }

    private static double least(Candidate candidate) {
        return candidate.cover().closed()
                ? Double.POSITIVE_INFINITY
                : least(candidate.over(device(1.0, 1.0)), BAND.from(), BAND.to());
    }

    @Test
    void theFirstInOrderThatMeetsEveryLimitIsChosen() {
        List<Candidate> candidates = new ArrayList<>(in(AIR, Covers.OPEN, ROOF, VENTED, Covers.SEALED));
        int notTheFirst = 0;
        for (int turn = 0; turn < candidates.size(); turn++) {
            Collections.rotate(candidates, 1);
            for (double margin : new double[] {10.0, 20.0, 24.0, 28.0, 40.0, 70.0}) {
                Candidate expected = candidates.stream()
                        .filter(candidate -> least(candidate) >= margin)
                        .findFirst()
                        .orElseThrow();
                LidAnswer answer = answer(margin, candidates);
                assertThat(answer.chosen().orElseThrow().candidate()).isEqualTo(expected);
                assertThat(answer.verdict().decision()).isEqualTo(Decision.MEETS);
                assertThat(answer.verdict().sentence())
                        .contains(
                                expected.cover().equals(Covers.OPEN)
                                        ? "No lid is needed"
                                        : expected.cover().words());
                assertThat(answer.remedies()).isEmpty();
                assertThat(answer.covers()).extracting(CoverRow::candidate).containsExactlyElementsOf(candidates);
                notTheFirst += expected.equals(candidates.get(0)) ? 0 : 1;
            }
        }
        assertThat(notTheFirst).isGreaterThan(3);
    }

    @Test
    void ifNoneDoesTheNearestIsNamedWithWhatItMisses() {
        List<Candidate> candidates = in(AIR, Covers.OPEN, ROOF);
        LidAnswer answer = answer(45.0, candidates);
        assertThat(answer.verdict().decision()).isEqualTo(Decision.FAILS);
        assertThat(answer.chosen()).isEmpty();
        Candidate nearest = least(candidates.get(0)) > least(candidates.get(1)) ? candidates.get(0) : candidates.get(1);
        double misses =
                number("rejection misses by ([\\d.]+) dB", answer.verdict().sentence());
        assertThat(answer.verdict().sentence())
                .contains("The nearest is " + nearest.cover().words() + ":");
        assertThat(misses).isCloseTo(45.0 - least(nearest), within(0.06));
        for (CoverRow row : answer.covers()) {
            assertThat(row.misses()).hasSize(1);
            assertThat(number("by ([\\d.]+) dB", row.misses().get(0)))
                    .isCloseTo(45.0 - least(row.candidate()), within(0.06));
        }
    }

    /** The factor printed does; a hundredth less does not; both found by bisection over a plain grid of frequencies. */
    @Test
    void remediesAreComputed() {
        double margin = 27.0;
        LidAnswer answer = answer(margin, in(AIR, Covers.OPEN));
        assertThat(answer.remedies()).hasSize(3);
        double thicker =
                number("all diameters times ([\\d.]+) \\(", answer.remedies().get(0));
        double denser =
                number("a hair ([\\d.]+) times as dense", answer.remedies().get(1));
        double thickerRoot = bisected(by -> device(by, 1.0), margin);
        double denserRoot = bisected(by -> device(1.0, by), margin);
        assertThat(thickerRoot).isBetween(1.05, 7.0);
        assertThat(denserRoot).isBetween(1.05, 7.0);
        assertThat(thicker).isBetween(thickerRoot - 1e-6, thickerRoot + 0.01);
        assertThat(denser).isBetween(denserRoot - 1e-6, denserRoot + 0.01);
        assertThat(number("largest ([\\d.]+) um", answer.remedies().get(0))).isCloseTo(thicker * 82.0, within(0.06));
        assertThat(number("\\(([\\d.]+) kg/m3\\)", answer.remedies().get(1))).isCloseTo(denser * 1190.0, within(0.6));
        double from = number("from ([\\d.]+) Hz", answer.remedies().get(2));
        double to = number("to ([\\d.]+) Hz", answer.remedies().get(2));
        assertThat(to).isEqualTo(BAND.to());
        assertThat(least(device(1.0, 1.0), from, to)).isGreaterThanOrEqualTo(margin);
        assertThat(least(device(1.0, 1.0), 0.999 * from, to)).isLessThan(margin);
    }

    private static double bisected(DoubleFunction<Device> changed, double margin) {
        double low = 1.0;
        double high = 8.0;
        while (high - low > 1e-7) {
            double middle = 0.5 * (low + high);
            if (least(changed.apply(middle), BAND.from(), BAND.to()) >= margin) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    private static double number(String pattern, String text) {
        Matcher matcher = Pattern.compile(pattern).matcher(text);
        assertThat(matcher.find()).as(text).isTrue();
        return Double.parseDouble(matcher.group(1));
    }

    @Test
    void whereNothingWithinReachDoesThatIsSaid() {
        assertThat(answer(150.0, in(AIR, Covers.OPEN)).remedies())
                .containsExactly(
                        "no thicker hair of this shape and length keeps every limit",
                        "no hair up to 9520 kg/m3 keeps every limit",
                        "no part of the band keeps the margin");
    }

    /** The hair of a cavity 1.3 times as wide has no room to grow eightfold. */
    @Test
    void aHairIsNotThickenedIntoTheWallOfItsCavity() {
        double section = FastMath.PI * FastMath.pow(1.3 * ROD.radius(), 2);
        Cover narrow = new VentedCover(9, 2e-4, 1e-4, true, 2e-12, section);
        LidAnswer answer = answer(150.0, in(AIR, narrow));
        assertThat(answer.verdict().decision()).isEqualTo(Decision.FAILS);
        assertThat(answer.remedies().get(0)).startsWith("no thicker hair");
    }

    @Test
    void aSealedHairAsDenseAsItsFillIsToldToDiffer() {
        Medium same = medium("brine of the test", Phase.LIQUID, 1190.0, 2e-3, OptionalDouble.empty());
        LidAnswer answer = answer(20.0, in(same, Covers.SEALED));
        assertThat(answer.verdict().decision()).isEqualTo(Decision.FAILS);
        assertThat(answer.remedies())
                .containsExactly(
                        "a hair of another density than its fill: one of 2380 kg/m3 keeps half of its inertial torque");
    }

    @Test
    void withoutALimitCoversAreComparedAndNoneIsChosen() {
        LidQuestion question = new LidQuestion(device(1.0, 1.0), BAND, Acceptance.NONE, REFERENCE, List.of());
        LidAnswer answer = question.answer();
        assertThat(answer.verdict().decision()).isEqualTo(Decision.NOT_ASKED);
        assertThat(answer.chosen()).isEmpty();
        assertThat(answer.remedies()).isEmpty();
        assertThat(answer.covers()).hasSize(4);
        assertThat(answer.required()).hasSize(16); // 25 Hz (25.12) to 900 Hz (794.3)
    }

    /** Lengths of the usual covers, by hand for a hair of 0.73 mm. */
    @Test
    void usualCoversFollowTheHairsLength() {
        List<Candidate> usual = new LidQuestion(device(1.0, 1.0), BAND, asked(20.0), REFERENCE, List.of()).candidates();
        assertThat(usual)
                .extracting(candidate -> candidate.cover().kind())
                .containsExactly("open", "roofed", "vented", "sealed");
        RoofedCover roof = (RoofedCover) usual.get(1).cover();
        assertThat(roof.gap()).isCloseTo(1.095e-3, within(1e-12));
        assertThat(roof.length()).isCloseTo(4.38e-3, within(1e-12));
        VentedCover vented = (VentedCover) usual.get(2).cover();
        assertThat(vented.cavityVolume()).isCloseTo(2.92e-3 * 2.92e-3 * 1.46e-3, within(1e-15));
        assertThat(vented.cavitySection()).isCloseTo(2.92e-3 * 1.46e-3, within(1e-12));
        Cavity cavity = ((SealedCover) usual.get(3).cover()).cavity().orElseThrow();
        assertThat(cavity.diameter()).isCloseTo(2.92e-3, within(1e-12));
        assertThat(cavity.height()).isCloseTo(1.46e-3, within(1e-12));
        // a vented cover breathes by the sound speed of what is in it
        Device mute = new Device(
                device(1.0, 1.0).hair(),
                Optional.empty(),
                Medium.of("plain", 1.2, 1.8e-5),
                Covers.OPEN,
                Medium.of("plain", 1.2, 1.8e-5));
        assertThat(LidQuestion.usual(mute))
                .extracting(candidate -> candidate.cover().kind())
                .containsExactly("open", "roofed", "sealed");
        assertThat(new LidQuestion(device(1.0, 1.0), BAND, asked(20.0), REFERENCE, in(AIR, ROOF)).candidates())
                .hasSize(1);
    }

    /** Each warning at the cover that earns it, once, and at no other. */
    @Test
    void everyWarningStandsOnceWhereItBelongs() {
        Medium near = medium("brine of the test", Phase.LIQUID, 1130.0, 2e-3, OptionalDouble.empty());
        Cover resonant = new VentedCover(1, 1e-4, 2e-3, false, 9e-6, 3e-4);
        double resonance = ((VentedCover) resonant).resonance(AIR).orElseThrow();
        assertThat(resonance).isBetween(BAND.from(), BAND.to());
        List<Candidate> candidates = new ArrayList<>(in(AIR, Covers.OPEN, new RoofedCover(7.5e-4, 4e-3), resonant));
        candidates.add(new Candidate(new SealedCover(Optional.of(new Cavity(3e-3, 3e-3))), near));
        candidates.add(new Candidate(Covers.SEALED, AIR));
        List<CoverRow> rows = answer(20.0, candidates).covers();
        assertOnce(rows, "nearly as dense as the hair: 5.0 % of its inertial torque is left", 3);
        assertOnce(rows, "over the tip is less than the Stokes layer", 1);
        assertOnce(rows, "the vents resonate within the band", 2);
        assertOnce(rows, "a liquid fill", 3);
        assertOnce(rows, "sound transmitted through the lid", 3, 4);
        assertThat(rows.get(0).warnings()).isEmpty();
        assertOnce(rows, "calibrations with and without this cover differ by", differing(rows));
        assertThat(differing(rows)).contains(3).doesNotContain(0);
    }

    private static int[] differing(List<CoverRow> rows) {
        Device bare = device(1.0, 1.0);
        double open = new Response(bare).at(REFERENCE).motion().orElseThrow().norm();
        List<Integer> found = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            Device covered = rows.get(i).candidate().over(bare);
            double under =
                    new Response(covered).at(REFERENCE).motion().orElseThrow().norm();
            assertThat(rows.get(i).change().change()).isCloseTo(under / open, within(1e-12));
            if (FastMath.abs(under / open - 1.0) > 0.01) {
                found.add(i);
            }
        }
        return found.stream().mapToInt(Integer::intValue).toArray();
    }

    private static void assertOnce(List<CoverRow> rows, String words, int... where) {
        for (int i = 0; i < rows.size(); i++) {
            int row = i;
            long expected = Arrays.stream(where).filter(w -> w == row).count();
            assertThat(rows.get(i).warnings().stream()
                            .filter(warning -> warning.contains(words))
                            .count())
                    .as("%s at %s", words, rows.get(i).candidate().cover().words())
                    .isEqualTo(expected);
        }
    }

    /** A tone so weak that everything is linear: the attenuation that brings its error to the limit, put back, does. */
    @Test
    void attenuationForTheErrorLimitPutBackBringsTheErrorToIt() {
        Tone tone = new Tone("pump", 0.0, 180.0, 1e-6, AIR);
        Acceptance limit = new Acceptance(OptionalDouble.empty(), OptionalDouble.of(2e-6));
        BandsQuestion base = new BandsQuestion(device(1.0, 1.0), BAND, limit, Motion.NONE, List.of(tone));
        LidAnswer answer = new LidQuestion(base, REFERENCE, in(AIR, Covers.OPEN, Covers.SEALED)).answer();
        double attenuation = answer.requiredError().orElseThrow();
        assertThat(attenuation).isGreaterThan(3.0);
        assertThat(answer.chosen().orElseThrow().candidate().cover()).isEqualTo(Covers.SEALED);
        LogTable level = new LogTable(List.of(1.0, 1e4), List.of(attenuation, attenuation));
        Cover measured = new MeasuredCover("put back", level, Optional.empty());
        double error = new LidQuestion(base, REFERENCE, in(AIR, measured))
                .answer()
                .covers()
                .get(0)
                .answer()
                .error()
                .orElseThrow()
                .rms();
        // the sensitivity to motion changes a little under the cover as well
        assertThat(error / 2e-6).isCloseTo(1.0, within(0.05));
    }
}
