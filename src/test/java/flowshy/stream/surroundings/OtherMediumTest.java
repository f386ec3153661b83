package flowshy.stream.surroundings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import flowshy.math.Density;
import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.MediumQuery;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.UnfitMediumException;
import flowshy.stream.record.MeasuredSpectrum;
import flowshy.stream.record.Signal;
import flowshy.stream.sound.SoundLevel;
import flowshy.stream.sound.SoundWave;
import flowshy.stream.wall.DuctFlow;
import flowshy.stream.wall.DuctSection;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.junit.jupiter.api.Test;

/** A source taken over into another medium is the one that would have been made there. */
class OtherMediumTest {
    private static final Medium AIR = Media.at(MediumQuery.of("dry air", 293.15, 101325.0));
    private static final Medium HELIUM = Media.at(MediumQuery.of("helium", 293.15, 101325.0));
    private static final Medium MERCURY = Media.at(MediumQuery.of("mercury", 293.15, 101325.0));
    private static final Medium MUTE = Medium.of("plain", 1.2, 1.8e-5);

    private static SoundWave wave(Medium medium) {
        return new SoundWave(medium.density(), medium.soundSpeed().orElseThrow(), 0.4);
    }

    private static Source stream(Medium medium) {
        return new Stream(
                "draught",
                0.3,
                1.7,
                Stated.given("turbulence", 0.12),
                Stated.assumed("length-scale", 0.03, "test"),
                Stated.given("fetch", 0.2),
                medium);
    }

    private static Source duct(Medium medium) {
        DuctFlow flow = new DuctFlow(new DuctSection.Round(0.05), 2.4, medium.kinematicViscosity());
        return Duct.of("duct", 0.3, flow, Optional.empty(), Optional.of(Stated.given("length-scale", 0.004)));
    }

    private static Source sound(Medium medium) {
        return new Sound("hall", 0.3, Sound.over(SoundLevel.IN_GAS, 90.0, 100.0, 900.0), wave(medium), medium);
    }

    private static Source measured(Medium medium) {
        MeasuredSpectrum spectrum = new MeasuredSpectrum(
                Signal.PRESSURE,
                Optional.empty(),
                List.of(new flowshy.stream.Line(150.0, 0.7)),
                0.0,
                Optional.empty(),
                List.of());
        return Measured.sound("logged", SourceKind.SPECTRUM, 0.3, spectrum, wave(medium), medium);
    }

    private static Source logged(Medium medium) {
        Density density = Sound.over(SoundLevel.IN_GAS, 70.0, 5.0, 500.0);
        MeasuredSpectrum spectrum = new MeasuredSpectrum(
                Signal.VELOCITY, Optional.of(density), List.of(), 0.0, Optional.empty(), List.of());
        return Measured.stream(
                "anemometer", SourceKind.SPECTRUM, 0.3, 1.1, spectrum, Stated.given("fetch", 0.1), medium);
    }

    private static void assertTakenOver(Function<Medium, Source> made) {
        Source taken = made.apply(AIR).in(HELIUM);
        Source there = made.apply(HELIUM);
        assertThat(taken.name()).isEqualTo(there.name());
        assertThat(taken.kind()).isEqualTo(there.kind());
        assertThat(taken.direction()).isEqualTo(there.direction());
        assertThat(taken.lines()).isEqualTo(there.lines());
        assertThat(taken.assumed()).isEqualTo(there.assumed());
        assertThat(taken.support()).isEqualTo(there.support());
        for (double height : new double[] {1e-5, 4e-4, 2e-3}) {
            assertThat(taken.meanSpeedAt(height)).isEqualTo(there.meanSpeedAt(height));
            assertThat(taken.share(900.0).at(height))
                    .isEqualTo(there.share(900.0).at(height));
            assertThat(taken.share(900.0).at(height))
                    .isNotEqualTo(made.apply(AIR).share(900.0).at(height));
        }
        assertThat(taken.density(120.0)).isEqualTo(there.density(120.0));
        assertThat(taken.acrossDensity(120.0)).isEqualTo(there.acrossDensity(120.0));
    }

    @Test
    void isTheOneThatWouldHaveBeenMadeThere() {
        assertTakenOver(OtherMediumTest::stream);
        assertTakenOver(OtherMediumTest::duct);
        assertTakenOver(OtherMediumTest::sound);
        assertTakenOver(OtherMediumTest::measured);
        assertTakenOver(OtherMediumTest::logged);
        assertTakenOver(medium -> new Tone("hum", 0.3, 150.0, 0.02, medium));
    }

    /** Re = 8000 in air and 960 in helium: what was assumed of the turbulent duct is not carried into the laminar one. */
    @Test
    void whatWasAssumedIsAssumedAnew() {
        assertThat(duct(AIR).assumed()).extracting(Stated::key).containsExactly("turbulence");
        assertThat(duct(AIR).density(20.0)).isPositive();
        assertThat(duct(AIR).in(HELIUM).assumed()).isEmpty();
        assertThat(duct(AIR).in(HELIUM).density(20.0)).isZero();
    }

    @Test
    void whatNoLawCoversIsRefused() {
        assertThatThrownBy(() -> sound(AIR).in(MUTE))
                .isInstanceOf(UnfitMediumException.class)
                .hasMessage("hall: the sound speed of plain is not known");
        assertThatThrownBy(() -> measured(AIR).in(MUTE)).isInstanceOf(UnfitMediumException.class);
        Source fast = new Stream(
                "gale",
                0.0,
                60.0,
                Stated.given("turbulence", 0.1),
                Stated.given("length-scale", 1.0),
                Stated.given("fetch", 5.0),
                AIR);
        assertThatThrownBy(() -> fast.in(MERCURY))
                .isInstanceOf(UnfitMediumException.class)
                .hasMessageContaining("gale: a Reynolds number of");
        Source main = Duct.of(
                "main",
                0.0,
                new DuctFlow(new DuctSection.Round(3.0), 50.0, AIR.kinematicViscosity()),
                Optional.empty(),
                Optional.empty());
        assertThatThrownBy(() -> main.in(MERCURY))
                .isInstanceOf(UnfitMediumException.class)
                .hasMessageContaining("main: a Reynolds number of");
    }
}
