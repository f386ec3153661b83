package flowshy.verdict;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.medium.PropertySource.Reading;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.stream.cover.Covers;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** Each caveat is there where its assumption weakens, with its figures, and away where it does not. */
class AssumptionsTest {
    private static final Band BAND = new Band(20.0, 2000.0);

    private static List<Caveat> of(Device device) {
        return Assumptions.of(device, BAND, DeviceFacts.of(device, BAND));
    }

    private static List<Caveat> with(Device device, String words) {
        List<Caveat> all = of(device);
        assertThat(all)
                .allSatisfy(caveat -> assertThat(caveat.text())
                        .endsWith(".")
                        .doesNotContain("NaN")
                        .doesNotContain("%%"));
        return all.stream().filter(caveat -> caveat.text().contains(words)).toList();
    }

    private static void one(Device device, String words, Subject about, Weight weight) {
        List<Caveat> found = with(device, words);
        assertThat(found).as(words).hasSize(1);
        assertThat(found.get(0).about()).isEqualTo(about);
        assertThat(found.get(0).weight()).isEqualTo(weight);
    }

    /** δ = √(2ν/ω) = 491 µm at 20 Hz and 49.1 µm at 2 kHz in air of ν = 1.5167e-5 m²/s; L = 760 µm, L/d = 9.05. */
    @Test
    void stripTheoryWithItsFigures() {
        Device open = Devices.bare(Devices.ROD, 1190.0, Devices.AIR);
        one(open, "Strip theory", Subject.REJECTION, Weight.WEAK);
        assertThat(with(open, "Strip theory").get(0).text())
                .contains("from 0.065 to 0.65")
                .contains("over diameter is 9.05");
        one(open, "flat and wide", Subject.FLOW, Weight.NOTE);
        assertThat(with(open, "flat and wide").get(0).text())
                .contains("(0.760 mm)")
                .contains("0.491 mm");
        assertThat(with(Devices.sealed(Devices.ROD, 1190.0, Devices.AIR), "Strip theory"))
                .isEmpty();
        assertThat(with(Devices.sealed(Devices.ROD, 1190.0, Devices.AIR), "flat and wide"))
                .isEmpty();
    }

    /** 0.3 · 2π f · max(a, δ): 0.0185 m/s at 20 Hz, 0.185 m/s at 2 kHz. */
    @Test
    void smallExcursionsWithTheirSpeeds() {
        Device open = Devices.bare(Devices.ROD, 1190.0, Devices.AIR);
        one(open, "Small excursions", Subject.FLOW, Weight.NOTE);
        assertThat(with(open, "Small excursions").get(0).text())
                .contains("0.019 m/s at 20")
                .contains("0.19 m/s at 2000");
        assertThat(with(Devices.sealed(Devices.ROD, 1190.0, Devices.AIR), "Small excursions"))
                .isEmpty();
    }

    @Test
    void aPropertyFromMemory() {
        Device recalled = Devices.bare(Devices.ROD, 1190.0, Devices.known("oil", 950.0, Reading.MEMORY, 0.01));
        one(recalled, "recalled from memory", Subject.MEDIUM, Weight.WEAK);
        Device seen = Devices.bare(Devices.ROD, 1190.0, Devices.known("oil", 950.0, Reading.SEEN, 0.01));
        assertThat(with(seen, "recalled from memory")).isEmpty();
    }

    @Test
    void hairAndFillOfNearlyOneDensity() {
        one(Devices.sealed(Devices.ROD, 1040.0, Devices.WATER), "nearly of one density", Subject.MOTION, Weight.WEAK);
        assertThat(with(Devices.sealed(Devices.ROD, 1040.0, Devices.WATER), "nearly of one density")
                        .get(0)
                        .text())
                .contains("torque 4.0 % is left");
        assertThat(with(Devices.sealed(Devices.ROD, 1060.0, Devices.WATER), "nearly of one density"))
                .isEmpty();
        assertThat(with(Devices.bare(Devices.ROD, 1040.0, Devices.WATER), "nearly of one density"))
                .isEmpty();
    }

    @Test
    void aSealedCoverSaysWhatItAssumes() {
        one(Devices.sealed(Devices.ROD, 1190.0, Devices.AIR), "Sealed cover", Subject.RESONANCE, Weight.WEAK);
        assertThat(with(Devices.bare(Devices.ROD, 1190.0, Devices.AIR), "Sealed cover"))
                .isEmpty();
    }

    @Test
    void slipThatHasEndedTouchesTheRejectionOnlyWhereFlowEnters() {
        one(
                Devices.bare(Devices.ROD, 1190.0, Devices.gas(6e-6)),
                "the slip law ends",
                Subject.REJECTION,
                Weight.OUT_OF_RANGE);
        one(
                Devices.sealed(Devices.ROD, 1190.0, Devices.gas(6e-6)),
                "the slip law ends",
                Subject.RESONANCE,
                Weight.OUT_OF_RANGE);
        one(
                Devices.bare(Devices.ROD, 1190.0, Devices.gas(2e-6)),
                "slip of first order",
                Subject.REJECTION,
                Weight.NOTE);
        assertThat(with(Devices.bare(Devices.ROD, 1190.0, Devices.gas(6.5e-8)), "slip"))
                .isEmpty();
    }

    /** What a map asks of every place says the same as all that stands beside a whole answer. */
    @Test
    void theEndOfTheRejectionIsThatOfItsCaveats() {
        int ended = 0;
        for (double path : new double[] {6.5e-8, 1e-6, 3e-6, 4.1e-6, 4.3e-6, 6e-6}) {
            for (Profile profile : List.of(
                    Devices.ROD,
                    new Taper(7.6e-4, 4.2e-5, 0.0),
                    new Taper(7.6e-4, 4.2e-5, 2e-5),
                    new Club(7.6e-4, 2e-5, 4e-4, 1e-4, 6e-5, Club.End.ROUND))) {
                for (Device device : List.of(
                        Devices.bare(profile, 1190.0, Devices.gas(path)),
                        Devices.sealed(profile, 1190.0, Devices.gas(path)))) {
                    boolean expected = Assumptions.ended(of(device), Subject.REJECTION);
                    assertThat(Assumptions.rejectionEnds(device, BAND))
                            .as("%s, mean free path %s", device, path)
                            .isEqualTo(expected);
                    ended += expected ? 1 : 0;
                }
            }
        }
        assertThat(ended).isBetween(8, 30);
    }

    /** The tip of a pointed hair is always too thin for the law; by how much that counts is told. */
    @Test
    void aPointedTipIsWeighedByWhatItCarries() {
        Device slender = Devices.bare(new Taper(7.2e-4, 4.4e-5, 0.0), 1190.0, Devices.gas(6.5e-8));
        one(slender, "thinner than 1.30 um", Subject.REJECTION, Weight.NOTE);
        Device needle = Devices.bare(new Taper(7.2e-4, 4e-6, 0.0), 1190.0, Devices.gas(6.5e-8));
        one(needle, "thinner than 1.30 um", Subject.REJECTION, Weight.OUT_OF_RANGE);
    }

    @Test
    void aHairThatFallsOver() {
        Device falling = Devices.held(
                Devices.suspension(1e-12, Attitude.UPRIGHT), OptionalDouble.empty(), Devices.AIR, Covers.OPEN);
        one(falling, "falls over", Subject.RESONANCE, Weight.OUT_OF_RANGE);
        assertThat(with(Devices.held(Devices.HELD, OptionalDouble.empty(), Devices.AIR, Covers.OPEN), "falls over"))
                .isEmpty();
    }

    /** (ρ_h − ρ) g A L²/2 / S = 1188.8 · 9.80665 · 5.5418e-9 · 2.888e-7 / 4e-9 = 4.665 mrad. */
    @Test
    void aHorizontalHairTilts() {
        Device level = Devices.held(
                Devices.suspension(4e-9, Attitude.HORIZONTAL), OptionalDouble.empty(), Devices.AIR, Covers.OPEN);
        one(level, "tilts the hair", Subject.MOTION, Weight.NOTE);
        assertThat(with(level, "tilts the hair").get(0).text()).contains("4.665 mrad");
    }

    @Test
    void bendingOfSoftAndStiffHairs() {
        Device unknown = Devices.held(Devices.HELD, OptionalDouble.empty(), Devices.AIR, Covers.OPEN);
        one(unknown, "counts as rigid", Subject.HAIR, Weight.NOTE);
        Device stiff = Devices.held(Devices.HELD, OptionalDouble.of(3e9), Devices.AIR, Covers.OPEN);
        assertThat(with(stiff, "bend")).isEmpty();
        assertThat(with(stiff, "soft")).isEmpty();
        Device soft = Devices.held(Devices.HELD, OptionalDouble.of(3e5), Devices.AIR, Covers.OPEN);
        one(soft, "The hair bends", Subject.MOTION, Weight.WEAK);
        one(soft, "The hair is soft", Subject.MOTION, Weight.WEAK);
        // no suspension: nothing to compare with
        assertThat(with(Devices.bare(new Cylinder(7e-4, 3e-5), 1190.0, Devices.AIR), "rigid"))
                .isEmpty();
    }

    @Test
    void nothingOutsideTouchesAHairInAClosedCavity() {
        Caveat outside = new Caveat(Subject.MEDIUM, Weight.WEAK, "Of the outside air.");
        flowshy.medium.Medium air = new flowshy.medium.Medium(
                "air",
                flowshy.medium.Phase.GAS,
                293.15,
                101325.0,
                1.2,
                1.82e-5,
                OptionalDouble.empty(),
                OptionalDouble.of(6.5e-8),
                List.of(),
                List.of(outside));
        Hair hair = new Hair(Devices.ROD, 1190.0, OptionalDouble.empty());
        Optional<Suspension> none = Optional.empty();
        assertThat(of(new Device(hair, none, air, Covers.OPEN, air))).contains(outside);
        assertThat(of(new Device(hair, none, air, Covers.SEALED, Devices.WATER)))
                .doesNotContain(outside);
    }
}
