package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.MeasuredCover;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.stream.cover.VentedCover;
import flowshy.study.text.StudyException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Covers as a study states them, and what is told where one cannot be. */
class CoverReadingTest {
    private static final String HAIR = "hair: {length: 700 um, diameter: 80 um, density: 1.2 g/cm3}\n";
    private static final String BAND = "band: {from: 20 Hz, to: 500 Hz}\n";
    private static final String LEVELS = "frequency [Hz],attenuation [dB]\n10,0\n100,20\n1000,40\n";

    @TempDir
    private Path folder;

    private Study read(String more, String table) {
        try {
            Files.writeString(folder.resolve("a.csv"), table);
            return StudyReader.read(Files.writeString(folder.resolve("s.yaml"), HAIR + BAND + more), List.of());
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private List<String> problems(String more, String table) {
        try {
            read(more, table);
            return List.of();
        } catch (StudyException e) {
            String here = folder + folder.getFileSystem().getSeparator();
            return e.problems().stream()
                    .map(problem -> problem.text().replace(here, ""))
                    .toList();
        }
    }

    private Cover cover(String text) {
        return read("medium: air\ncover: " + text + "\n", LEVELS).device().cover();
    }

    @Test
    void everyKindIsBuiltFromItsKeys() {
        assertThat(cover("open")).isEqualTo(Covers.OPEN);
        assertThat(cover("{kind: open}")).isEqualTo(Covers.OPEN);
        assertThat(cover("sealed")).isEqualTo(Covers.SEALED);
        assertThat(cover("{kind: sealed, diameter: 3 mm, height: 1.5 mm}"))
                .isEqualTo(new SealedCover(Optional.of(new Cavity(3e-3, 1.5e-3))));
        assertThat(cover("{kind: roofed, gap: 1.2 mm, length: 5 mm}")).isEqualTo(new RoofedCover(1.2e-3, 5e-3));
        String vented = "{kind: vented, holes: 6, hole-diameter: 90 um, hole-depth: 0.2 mm, cavity-volume: 8 mm3,"
                + " cavity-section: 5 mm2";
        assertThat(cover(vented + "}")).isEqualTo(new VentedCover(6, 9e-5, 2e-4, false, 8e-9, 5e-6));
        assertThat(cover(vented + ", sides: through}")).isEqualTo(new VentedCover(6, 9e-5, 2e-4, true, 8e-9, 5e-6));
        assertThat(read("medium: air\n", LEVELS).device().cover()).isEqualTo(Covers.OPEN);
    }

    @Test
    void aMeasuredCoverComesWithOrWithoutItsPhase() {
        MeasuredCover plain = (MeasuredCover) cover("{kind: measured, file: a.csv}");
        assertThat(plain.attenuation().at(100.0)).isEqualTo(20.0);
        assertThat(plain.phase()).isEmpty();
        Study turned = read(
                "medium: air\ncover: {kind: measured, file: a.csv}\n",
                "frequency [kHz];phase [deg];attenuation [dB]\n0.01;0;0\n0.1;90;6\n1;180;12\n");
        Complex factor = turned.device()
                .cover()
                .factor(2.0 * FastMath.PI * 100.0, turned.device().around());
        assertThat(factor.getReal()).isCloseTo(0.0, within(1e-15));
        assertThat(factor.getImaginary()).isCloseTo(FastMath.pow(10.0, -0.3), within(1e-14));
        assertThat(turned.origin().filesRead()).extracting(Study.FileRead::file).containsExactly("a.csv");
    }

    @Test
    void aFillIsHeldAtItsOwnStateAndOnlySealedCoversHaveOne() {
        Study study = read("""
                medium: {name: air, temperature: 60 degC}
                cover: {kind: sealed, fill: {name: helium, temperature: 20 degC, pressure: 1 bar}}
                """, LEVELS);
        // a sealed gas keeps its density and takes the temperature of use: p V = n R T
        assertThat(study.device().around().temperature()).isCloseTo(333.15, within(1e-9));
        assertThat(study.device().around().density()).isCloseTo(0.1642, within(3e-4));
        assertThat(study.device().outside().name()).contains("air");
        Study same = read("medium: air\ncover: sealed\n", LEVELS);
        assertThat(same.device().around()).isEqualTo(same.device().outside());
        assertThat(problems(
                        "medium: air\ncover: {kind: roofed, gap: 1 mm, length: 5 mm, fill: {name: helium}}\n", LEVELS))
                .singleElement()
                .asString()
                .startsWith("s.yaml:4:48: cover.fill: belongs to kind: sealed, not to roofed");
    }

    @Test
    void candidatesKeepTheirOrder() {
        Study study = read(
                "medium: air\ncandidates: [sealed, {kind: roofed, gap: 1 mm, length: 5 mm}, open, {kind: measured, file: a.csv}]\n",
                LEVELS);
        assertThat(study.candidates())
                .extracting(candidate -> candidate.cover().kind())
                .containsExactly("sealed", "roofed", "open", "measured");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "cover: {kind: roofed, gap: 700 um, length: 5 mm} | s.yaml:4:28: cover.gap: a roof 700 um above the wall touches the hair; a gap above the hair's length",
                "cover: {kind: sealed, diameter: 3 mm, height: 0.5 mm} | s.yaml:4:47: cover.height: a cavity 0.5 mm high touches the hair; a height above the hair's length",
                "cover: {kind: sealed, diameter: 80.5 um, height: 1 mm} | s.yaml:4:15: cover.kind: a cavity hardly wider than the hair; a cavity radius of 1.01 of the hair's or more, where the law of the confined cylinder holds",
                "cover: {kind: sealed, diameter: 3 mm} | s.yaml:4:8: cover.height: missing; diameter goes with it",
                "cover: {kind: vented, holes: 2.5, hole-diameter: 90 um, hole-depth: 0.2 mm, cavity-volume: 8 mm3, cavity-section: 5 mm2} | s.yaml:4:30: cover.holes: a share of a hole; a whole number of holes",
                "cover: {kind: vented, holes: 2, hole-diameter: 90 um, hole-depth: 0.2 mm, cavity-volume: 8 mm3, cavity-section: 5000 um2} | s.yaml:4:15: cover.kind: a cavity hardly wider than the hair; a cavity radius of 1.01 of the hair's or more, where the law of the confined cylinder holds",
                "cover: {kind: measured, file: none.csv} | s.yaml:4:31: cover.file: none.csv: no such file beside the study; name a text file",
                "cover: {kind: lid} | s.yaml:4:15: cover.kind: unknown word lid; one of open, roofed, vented, sealed, measured is wanted here",
                "'candidates: [open, {kind: roofed, gap: 0.7 mm, length: 5 mm}]' | s.yaml:4:40: candidates[1].gap: a roof 0.7 mm above the wall touches the hair; a gap above the hair's length",
            })
    void whatCannotStandOverTheHairIsRefusedAtItsKey(String cover, String problem) {
        assertThat(problems("medium: air\n" + cover + "\n", LEVELS)).containsExactly(problem);
    }

    @Test
    void aVentedCoverNeedsASoundSpeed() {
        String vented = "{kind: vented, holes: 2, hole-diameter: 90 um, hole-depth: 0.2 mm, cavity-volume: 8 mm3,"
                + " cavity-section: 5 mm2}";
        assertThat(problems("medium: {density: 1.2 kg/m3, viscosity: 18 uPa.s}\ncover: " + vented + "\n", LEVELS))
                .containsExactly(
                        "s.yaml:4:15: cover.kind: the sound speed of medium of the study is not known; a vented cover breathes by the"
                                + " compliance of its cavity: state medium.sound-speed");
        assertThat(read(
                                "medium: {density: 1.2 kg/m3, viscosity: 18 uPa.s, sound-speed: 340 m/s}\ncover: "
                                        + vented + "\n",
                                LEVELS)
                        .device()
                        .cover()
                        .kind())
                .isEqualTo("vented");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'frequency [Hz],attenuation [dB]\n10,0\n100,20\n90,30\n1000,40' | a.csv:4:1: cover.file: 90.00 Hz does not rise; rows by rising frequency, above zero",
                "'frequency [Hz],attenuation [dB]\n0,0\n1000,40' | a.csv:2:1: cover.file: 0 Hz does not rise; rows by rising frequency, above zero",
                "'frequency [Hz],attenuation [dB]\n10,0\n1000,-61' | a.csv:3:6: cover.file: -61.00 dB; -60.0 dB to 300 dB",
                "'frequency [Hz],attenuation [dB]\n10,5' | a.csv:2:1: cover.file: one row only; two frequencies or more",
                "'frequency [Hz],attenuation [dB]\n30,0\n1000,40' | s.yaml:4:31: cover.file: a.csv covers 30.00 Hz to 1000 Hz; the whole band of use inside it: nothing is extrapolated",
                "'frequency [Hz],attenuation [dB]\n10,0\n499,40' | s.yaml:4:31: cover.file: a.csv covers 10.00 Hz to 499.0 Hz; the whole band of use inside it: nothing is extrapolated",
                "'frequency [Hz],attenuation [mm]\n10,0\n1000,40' | a.csv:1:16: 1 mm is a length; a level is wanted here, with its unit: dB",
                "'f [Hz],attenuation [dB]\n10,0\n1000,40' | a.csv:1:1: no column frequency; the header names its columns with units, e.g. frequency [Hz]",
                "'frequency [Hz],attenuation [dB],phase\n10,0,3\n1000,40,3' | a.csv:1:33: 1 has no unit; an angle is wanted here, with its unit: deg, rad, mrad, urad; did you mean 1 deg?",
                "'frequency [Hz],attenuation [dB]\n10,x\n1000,40' | a.csv:2:4: x dB is not a number; a level is wanted here, with its unit: dB",
                "'' | a.csv: no rows; a header with units, then numbers",
            })
    void faultsOfAnAttenuationAreToldAtTheirPlace(String table, String problem) {
        assertThat(problems("medium: air\ncover: {kind: measured, file: a.csv}\n", table))
                .last()
                .isEqualTo(problem);
    }

    @Test
    void theCalibrationMustLieInsideTheMeasurementToo() {
        assertThat(problems(
                        "medium: air\ncandidates: [{kind: measured, file: a.csv}]\ncalibration: {frequency: 5 Hz}\n",
                        LEVELS))
                .containsExactly(
                        "s.yaml:4:37: candidates[0].file: a.csv covers 10.00 Hz to 1000 Hz; calibration.frequency inside it: nothing is"
                                + " extrapolated");
    }
}
