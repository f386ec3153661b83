package flowshy.verdict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Cylinder;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.medium.Medium;
import flowshy.medium.PropertySource.Reading;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class BandsQuestionTest {
    private static final Band WIDE = new Band(1.0, 1e5);

    private static Acceptance margin(double decibels) {
        return new Acceptance(OptionalDouble.of(decibels), OptionalDouble.empty());
    }

    private static BandsAnswer ask(Device device, double decibels) {
        return new BandsQuestion(device, WIDE, margin(decibels)).answer();
    }

    /** The bands cover the whole band without gaps; each edge lies on the margin, and each middle beyond it as told. */
    @Test
    void bandsCoverTheBandAndMeetOnTheMargin() {
        List<Profile> profiles =
                List.of(Devices.ROD, new Taper(7.2e-4, 4.4e-5, 0.0), new Club(9e-4, 2e-5, 4e-4, 1e-4, 6e-5, End.ROUND));
        int edges = 0;
        for (Profile profile : profiles) {
            for (Medium medium : List.of(Devices.AIR, Devices.WATER)) {
                for (double density : new double[] {100.0, 1190.0, 8000.0}) {
                    for (double margin : new double[] {0.5, 3.0, 20.0, 40.0}) {
                        Device device = Devices.bare(profile, density, medium);
                        List<ReadingBand> bands = ask(device, margin).bands();
                        Response response = new Response(device);
                        assertThat(bands.get(0).from()).isEqualTo(1.0);
                        assertThat(bands.get(bands.size() - 1).to()).isEqualTo(1e5);
                        for (int i = 0; i < bands.size(); i++) {
                            ReadingBand band = bands.get(i);
                            assertThat(band.rejectionFrom()).isEqualTo(response.rejection(band.from()));
                            assertThat(band.rejectionTo()).isEqualTo(response.rejection(band.to()));
                            double middle = response.rejection(FastMath.sqrt(band.from() * band.to()));
                            Reads reads =
                                    middle >= margin ? Reads.MOTION : middle <= -margin ? Reads.FLOW : Reads.MIXED;
                            assertThat(band.reads()).isEqualTo(reads);
                            if (i > 0) {
                                assertThat(band.from())
                                        .isEqualTo(bands.get(i - 1).to());
                                assertThat(band.reads())
                                        .isNotEqualTo(bands.get(i - 1).reads());
                                assertThat(FastMath.abs(band.rejectionFrom())).isCloseTo(margin, within(1e-6));
                                edges++;
                            }
                        }
                    }
                }
            }
        }
        assertThat(edges).isGreaterThan(20);
    }

    /** Heavy hair in a gas: motion above one edge, mixed below. A light one in water reads flow at high frequencies. */
    @Test
    void readsMotionMixedAndFlowWhereOneExpectsThem() {
        List<ReadingBand> gas =
                ask(Devices.bare(Devices.ROD, 1190.0, Devices.AIR), 30.0).bands();
        assertThat(gas.stream().map(ReadingBand::reads)).containsExactly(Reads.MIXED, Reads.MOTION);
        List<ReadingBand> water =
                ask(Devices.bare(Devices.ROD, 100.0, Devices.WATER), 3.0).bands();
        assertThat(water.stream().map(ReadingBand::reads)).containsExactly(Reads.MIXED, Reads.FLOW);
    }

    /** Just short of the margin is mixed, on either side of zero. */
    @Test
    void staysMixedJustShortOfTheMargin() {
        for (double density : new double[] {100.0, 8000.0}) {
            Device device = Devices.bare(Devices.ROD, density, Devices.WATER);
            Band band = new Band(9000.0, 9100.0);
            Response response = new Response(device);
            double most =
                    FastMath.max(FastMath.abs(response.rejection(9000.0)), FastMath.abs(response.rejection(9100.0)));
            List<ReadingBand> mixed = new BandsQuestion(device, band, margin(1.01 * most))
                    .answer()
                    .bands();
            assertThat(mixed.stream().map(ReadingBand::reads)).containsExactly(Reads.MIXED);
            List<ReadingBand> beyond =
                    new BandsQuestion(device, band, margin(0.9 * most)).answer().bands();
            assertThat(beyond.stream().map(ReadingBand::reads))
                    .containsExactly(density > 1000.0 ? Reads.MOTION : Reads.FLOW);
        }
    }

    /** Γ → 1 and s → 1: 20 lg((ρ_h + ρ)/(2ρ)) at high frequencies, own limit of the torques. */
    @ParameterizedTest
    @CsvSource({"100, water", "1190, water", "8000, water", "1190, air", "19300, air"})
    void tendsToTheRatioOfDensities(double density, String name) {
        Medium medium = name.equals("air") ? Devices.AIR : Devices.WATER;
        double limit = 20.0 * FastMath.log10((density + medium.density()) / (2.0 * medium.density()));
        double found = new Response(Devices.bare(Devices.ROD, density, medium)).rejection(1e10);
        assertThat(found).isCloseTo(limit, within(0.02));
    }

    /** Thick layer: the drag hides everything, both readings are the same fluid's, 0 dB. */
    @Test
    void tendsToNothingBetweenThemAtLowFrequencies() {
        assertThat(new Response(Devices.bare(Devices.ROD, 1190.0, Devices.WATER)).rejection(1e-4))
                .isCloseTo(0.0, within(0.01));
    }

    @Test
    void extremesAreThoseOfTheBand() {
        Device device = Devices.bare(Devices.ROD, 1190.0, Devices.AIR);
        BandsAnswer answer = ask(device, 20.0);
        Response response = new Response(device);
        assertThat(answer.least().orElseThrow().rejection()).isEqualTo(response.rejection(1.0));
        assertThat(answer.largest().orElseThrow().rejection()).isEqualTo(response.rejection(1e5));
        assertThat(answer.least().orElseThrow().frequency()).isEqualTo(1.0);
        assertThat(answer.device()).isEqualTo(device);
        assertThat(answer.band()).isEqualTo(WIDE);
    }

    @Test
    void readsMotionEverywhereUnderASealedCover() {
        BandsAnswer answer = ask(Devices.sealed(Devices.ROD, 1190.0, Devices.WATER), 20.0);
        assertThat(answer.bands())
                .containsExactly(
                        new ReadingBand(1.0, 1e5, Reads.MOTION, Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY));
        assertThat(answer.least()).isEmpty();
        assertThat(answer.largest()).isEmpty();
        assertThat(answer.verdict().decision()).isEqualTo(Decision.MEETS);
        assertThat(answer.verdict().limits()).hasSize(1);
        assertThat(answer.verdict().limits().get(0).found()).isEmpty();
        assertThat(answer.verdict().limits().get(0).reason()).contains("no flow reaches the hair");
        assertThat(answer.verdict().sentence()).contains("the rejection has no bound");
    }

    /** Sealed and as dense as its fill, within what the fill's density is known to: it reads neither. */
    @ParameterizedTest
    @ValueSource(doubles = {1000.0, 1000.9, 999.1})
    void readsNothingWhereHairAndFillAreOfOneDensity(double density) {
        Medium fill = Devices.known("brine", 1000.0, Reading.SEEN, 1e-3);
        BandsAnswer answer = ask(Devices.sealed(Devices.ROD, density, fill), 20.0);
        assertThat(answer.bands()).hasSize(1);
        assertThat(answer.bands().get(0).reads()).isEqualTo(Reads.NOTHING);
        assertThat(answer.bands().get(0).rejectionFrom()).isNaN();
        assertThat(answer.verdict().decision()).isEqualTo(Decision.FAILS);
        assertThat(answer.verdict().sentence()).startsWith("The device reads nothing");
    }

    @Test
    void readsMotionWhereTheDensitiesDifferByMoreThanIsKnown() {
        Medium fill = Devices.known("brine", 1000.0, Reading.SEEN, 1e-3);
        assertThat(ask(Devices.sealed(Devices.ROD, 1001.1, fill), 20.0)
                        .bands()
                        .get(0)
                        .reads())
                .isEqualTo(Reads.MOTION);
        // and open, the flow past it is still felt
        assertThat(ask(Devices.bare(Devices.ROD, 1000.0, fill), 20.0)
                        .bands()
                        .get(0)
                        .reads())
                .isEqualTo(Reads.MIXED);
        // a medium of two plain numbers counts as exact
        assertThat(ask(Devices.sealed(Devices.ROD, 998.2, Devices.WATER), 20.0)
                        .bands()
                        .get(0)
                        .reads())
                .isEqualTo(Reads.NOTHING);
        assertThat(ask(Devices.sealed(Devices.ROD, 998.21, Devices.WATER), 20.0)
                        .bands()
                        .get(0)
                        .reads())
                .isEqualTo(Reads.MOTION);
    }

    /** Kn above 0.1: the slip law has ended, the bare device is undecided; the sealed one needs no law to shut out the flow. */
    @Test
    void isUndecidedWhereTheSlipLawHasEnded() {
        Medium thin = Devices.gas(0.11 * 4.2e-5);
        BandsAnswer bare = ask(Devices.bare(Devices.ROD, 1190.0, thin), 20.0);
        assertThat(bare.bands()).hasSize(1);
        assertThat(bare.bands().get(0).reads()).isEqualTo(Reads.UNDECIDED);
        assertThat(bare.bands().get(0).rejectionFrom()).isFinite();
        assertThat(bare.least()).isPresent();
        assertThat(bare.verdict().decision()).isEqualTo(Decision.UNDECIDED);
        assertThat(bare.verdict().limits().get(0).reason()).contains("a model has ended");
        BandsAnswer sealed = ask(Devices.sealed(Devices.ROD, 1190.0, thin), 20.0);
        assertThat(sealed.bands().get(0).reads()).isEqualTo(Reads.MOTION);
        assertThat(sealed.verdict().decision()).isEqualTo(Decision.MEETS);
        assertThat(ask(Devices.bare(Devices.ROD, 1190.0, Devices.gas(0.09 * 4.2e-5)), 20.0)
                        .bands()
                        .get(0)
                        .reads())
                .isNotEqualTo(Reads.UNDECIDED);
    }

    /** A tip that is too thin for the law decides nothing while it carries little, whether it ends in a point or not. */
    @ParameterizedTest
    @ValueSource(doubles = {0.0, 2e-7, 6e-7, 3e-6})
    void aThinTipAloneLeavesNothingUndecided(double tip) {
        Medium air = Devices.gas(6.5e-8);
        Device device = Devices.bare(new Taper(7.2e-4, 4.4e-5, tip), 1190.0, air);
        assertThat(ask(device, 20.0).bands().get(0).reads()).isNotEqualTo(Reads.UNDECIDED);
        Device needle = Devices.bare(new Taper(7.2e-4, 1e-6, tip), 1190.0, air);
        assertThat(ask(needle, 20.0).bands().get(0).reads() == Reads.UNDECIDED).isEqualTo(tip < 1e-6);
    }

    @Test
    void evaluatesThePointsAskedForInTheirOrder() {
        Device device = Devices.bare(new Cylinder(7e-4, 3e-5), 1190.0, Devices.AIR);
        BandsQuestion question = new BandsQuestion(device, new Band(20.0, 200.0), Acceptance.NONE);
        BandsAnswer chosen = question.answer(List.of(320.0, 80.0));
        assertThat(chosen.points().stream().map(ResponsePoint::frequency)).containsExactly(320.0, 80.0);
        assertThat(question.answer().points()).hasSize(10);
        assertThat(question.answer().verdict().decision()).isEqualTo(Decision.NOT_ASKED);
    }
}
