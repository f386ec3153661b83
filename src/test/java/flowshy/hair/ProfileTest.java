package flowshy.hair;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club.End;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class ProfileTest {
    private static final Club CLUB = new Club(9e-4, 2e-5, 4e-4, 1e-4, 6e-5, End.ROUND);

    static Stream<Profile> every() {
        return Stream.of(
                new Cylinder(7e-4, 4e-5),
                new Taper(7e-4, 4e-5, 0.0),
                new Taper(7e-4, 1e-5, 5e-5),
                CLUB,
                new Club(9e-4, 2e-5, 4e-4, 0.0, 6e-5, End.FLAT),
                new MeasuredProfile(List.of(0.0, 2e-4, 5e-4, 8e-4), List.of(5e-5, 2e-5, 3e-5, 0.0)));
    }

    @Test
    void namesTheShapeAsAStudyDoes() {
        assertThat(every().map(Profile::shape))
                .containsExactly("cylinder", "taper", "taper", "club", "club", "profile");
    }

    /** The quadrature relies on it: first break 0, last the length, rising, and the radius has no jump between. */
    @ParameterizedTest
    @MethodSource("every")
    void breaksRunFromWallToTipAndTheRadiusIsSmoothBetween(Profile profile) {
        List<Double> breaks = profile.breaks();
        assertThat(breaks).isSorted().doesNotHaveDuplicates().hasSizeGreaterThan(1);
        assertThat(breaks.get(0)).isZero();
        assertThat(breaks.get(breaks.size() - 1)).isEqualTo(profile.length());
        for (int i = 1; i < breaks.size(); i++) {
            double from = breaks.get(i - 1);
            double step = (breaks.get(i) - from) / 1000.0;
            for (int k = 2; k < 999; k++) {
                double before = profile.radius(from + (k - 1) * step);
                double here = profile.radius(from + k * step);
                double after = profile.radius(from + (k + 1) * step);
                assertThat(here).isBetween(0.0, profile.largestRadius() * (1.0 + 1e-12));
                // a kink or a jump would show in the second difference as a step of the slope times 1
                assertThat(after - 2.0 * here + before).isCloseTo(0.0, within(0.02 * profile.largestRadius()));
            }
        }
    }

    /** A rounding error there would be a flat of its square root, and rings shrink without end towards its edge. */
    @Test
    void aRoundEndIsClosedExactly() {
        for (int i = 0; i < 200; i++) {
            double head = 6e-5 + 5e-8 * i;
            assertThat(new Club(9e-4, 2e-5, 4e-4, 1e-4, head, End.ROUND).radius(9e-4))
                    .as("%s", head)
                    .isZero();
        }
    }

    @ParameterizedTest
    @MethodSource("every")
    void volumeGrowsWithTheSquareOfTheDiameters(Profile profile) {
        double volume = Moments.of(profile, 0.0).volume();
        double thicker = Moments.of(profile.thickened(1.2), 0.0).volume();
        // a round end grows with the head: its share is counted by hand, 2R³π/3 against R²π of straight head
        double expected = 1.44 * volume;
        if (profile instanceof Club club && club.end() == End.ROUND) {
            expected -= Math.PI * Math.pow(1.2 * club.headRadius(), 2) * 0.2 * club.headRadius() / 3.0;
        }
        assertThat(thicker / expected).isCloseTo(1.0, within(1e-12));
        assertThat(profile.thickened(1.2).length()).isEqualTo(profile.length());
        assertThat(profile.thickened(1.2).largestRadius())
                .isCloseTo(1.2 * profile.largestRadius(), within(1e-15 * profile.largestRadius()));
    }

    @ParameterizedTest
    @MethodSource("every")
    void volumeGrowsWithTheLength(Profile profile) {
        double volume = Moments.of(profile, 0.0).volume();
        double longer = Moments.of(profile.lengthened(1.5), 0.0).volume();
        double expected = 1.5 * volume;
        if (profile instanceof Club club && club.end() == End.ROUND) {
            // of the end only the lost third of a cylinder R³π stays as it is
            expected += 0.5 * Math.PI * Math.pow(club.headRadius(), 3) / 3.0;
        }
        assertThat(longer / expected).isCloseTo(1.0, within(1e-12));
        assertThat(profile.lengthened(1.5).length())
                .isCloseTo(1.5 * profile.length(), within(1e-15 * profile.length()));
        assertThat(profile.lengthened(1.5).largestRadius()).isEqualTo(profile.largestRadius());
    }

    @ParameterizedTest
    @CsvSource({"0, 2e-5", "4e-4, 2e-5", "4.5e-4, 4e-5", "5e-4, 6e-5", "8.3e-4, 6e-5", "8.76e-4, 4.8e-5", "9e-4, 0"})
    void clubFollowsItsParts(double z, double radius) {
        // 0.036 mm into the end of 0.06 mm: 3-4-5 triangle
        assertThat(CLUB.radius(z)).isCloseTo(radius, within(1e-18));
    }

    @Test
    void clubHasItsBreaksWhereItsPartsMeet() {
        assertThat(CLUB.breaks()).hasSize(5);
        assertThat(CLUB.breaks().get(1)).isEqualTo(4e-4);
        assertThat(CLUB.breaks().get(2)).isCloseTo(5e-4, within(1e-18));
        assertThat(CLUB.breaks().get(3)).isCloseTo(8.4e-4, within(1e-18));
        assertThat(new Club(9e-4, 2e-5, 4e-4, 0.0, 6e-5, End.FLAT).breaks()).containsExactly(0.0, 4e-4, 9e-4);
        // shoulder and round end fill the rest: no sliver of head, in spite of rounding
        assertThat(new Club(9e-4, 2e-5, 7e-4, 1.4e-4, 6e-5, End.ROUND).breaks()).hasSize(4);
        assertThat(Club.headStraight(9e-4, 4e-4, 1e-4, 6e-5, End.ROUND)).isCloseTo(3.4e-4, within(1e-18));
    }

    @Test
    void measuredProfileRunsStraightBetweenItsPoints() {
        MeasuredProfile profile = new MeasuredProfile(List.of(0.0, 2e-4, 5e-4), List.of(5e-5, 2e-5, 3.5e-5));
        assertThat(profile.radius(0.0)).isEqualTo(5e-5);
        assertThat(profile.radius(1e-4)).isCloseTo(3.5e-5, within(1e-19));
        assertThat(profile.radius(3e-4)).isCloseTo(2.5e-5, within(1e-19));
        assertThat(profile.radius(5e-4)).isCloseTo(3.5e-5, within(1e-19));
        assertThat(profile.breaks()).containsExactly(0.0, 2e-4, 5e-4);
    }

    @Test
    void leavesAPointOutOfTheSmallestRadius() {
        assertThat(new Taper(7e-4, 4e-5, 0.0).smallestRadius()).isEqualTo(4e-5);
        assertThat(new Taper(7e-4, 4e-5, 1e-5).smallestRadius()).isEqualTo(1e-5);
        assertThat(new Taper(7e-4, 1e-5, 4e-5).largestRadius()).isEqualTo(4e-5);
        assertThat(CLUB.smallestRadius()).isEqualTo(2e-5);
        MeasuredProfile pointed = new MeasuredProfile(List.of(0.0, 2e-4, 8e-4), List.of(5e-5, 2e-5, 0.0));
        assertThat(pointed.smallestRadius()).isEqualTo(2e-5);
        assertThat(pointed.largestRadius()).isEqualTo(5e-5);
        assertThat(new Cylinder(7e-4, 4e-5).smallestRadius()).isEqualTo(4e-5);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -1e-5, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesDimensionsThatAreNone(double bad) {
        assertThatThrownBy(() -> new Cylinder(bad, 1e-5)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Cylinder(1e-3, bad)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Taper(1e-3, bad, 1e-5)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Club(1e-3, bad, 4e-4, 1e-4, 5e-5, End.FLAT))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Club(1e-3, 2e-5, bad, 1e-4, 5e-5, End.FLAT))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Hair(CLUB, bad, OptionalDouble.empty()))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Hair(CLUB, 1200.0, OptionalDouble.of(bad)))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void refusesBodiesThatCannotBe() {
        assertThatThrownBy(() -> new Cylinder(1e-4, 6e-5)).hasMessageContaining("as long as wide");
        assertThatThrownBy(() -> new Taper(1e-4, 1e-5, 6e-5)).hasMessageContaining("as long as wide");
        assertThatThrownBy(() -> new Taper(1e-3, 1e-5, -1e-6)).hasMessageContaining("tip radius");
        assertThatThrownBy(() -> new Club(1e-3, 6e-5, 4e-4, 1e-4, 5e-5, End.FLAT))
                .hasMessageContaining("stalk");
        assertThatThrownBy(() -> new Club(1e-3, 2e-5, 9e-4, 0.6e-4, 5e-5, End.ROUND))
                .hasMessageContaining("longer");
        assertThat(new Club(1e-3, 2e-5, 9e-4, 0.6e-4, 5e-5, End.FLAT).length()).isEqualTo(1e-3);
        assertThatThrownBy(() -> new MeasuredProfile(List.of(0.0), List.of(1e-5)))
                .hasMessageContaining("two heights");
        assertThatThrownBy(() -> new MeasuredProfile(List.of(0.0, 1e-3), List.of(1e-5)))
                .hasMessageContaining("a radius for each");
        assertThatThrownBy(() -> new MeasuredProfile(List.of(1e-6, 1e-3), List.of(1e-5, 1e-5)))
                .hasMessageContaining("begins at height 0");
        assertThatThrownBy(() -> new MeasuredProfile(List.of(0.0, 1e-3, 1e-3), List.of(1e-5, 1e-5, 1e-5)))
                .hasMessageContaining("does not rise");
        assertThatThrownBy(() -> new MeasuredProfile(List.of(0.0, 5e-4, 1e-3), List.of(1e-5, 0.0, 1e-5)))
                .hasMessageContaining("radius 2");
        assertThatThrownBy(() -> new MeasuredProfile(List.of(0.0, 5e-4, 1e-3), List.of(1e-5, Double.NaN, 1e-5)))
                .hasMessageContaining("radius 2");
        assertThatThrownBy(() -> new MeasuredProfile(List.of(0.0, 1e-4), List.of(6e-5, 1e-5)))
                .hasMessageContaining("as long as wide");
    }

    static List<Profile> shapesWithRoom() {
        return List.of(
                new Cylinder(7e-4, 4e-5),
                new Taper(7e-4, 1e-5, 4e-5),
                CLUB,
                new Club(9e-4, 2e-5, 7.6e-4, 0.6e-4, 6e-5, End.ROUND),
                new Club(9e-4, 2e-5, 7.6e-4, 0.6e-4, 6e-5, End.FLAT),
                new MeasuredProfile(List.of(0.0, 2e-4, 8e-4), List.of(5e-5, 2e-5, 0.0)));
    }

    @ParameterizedTest
    @MethodSource("shapesWithRoom")
    void saysHowMuchThickerItCanBe(Profile profile) {
        double most = profile.room();
        assertThat(most).isGreaterThan(1.0);
        assertThat(profile.thickened(most * (1.0 - 1e-9)).largestRadius())
                .isCloseTo(most * profile.largestRadius(), within(1e-12));
        assertThatThrownBy(() -> profile.thickened(most * (1.0 + 1e-6))).isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void keepsMaterialInAnotherShape() {
        Hair hair = new Hair(CLUB, 1180.0, OptionalDouble.of(2e9));
        Hair other = hair.reshaped(new Cylinder(7e-4, 4e-5));
        assertThat(other.density()).isEqualTo(1180.0);
        assertThat(other.youngsModulus()).hasValue(2e9);
        assertThat(other.profile().shape()).isEqualTo("cylinder");
    }
}
