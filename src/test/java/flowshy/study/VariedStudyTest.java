package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.response.Device;
import flowshy.response.Hold;
import flowshy.response.Oscillator;
import flowshy.response.Response;
import flowshy.response.Suspension;
import flowshy.study.text.StudyException;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.NoDesignException;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Studies with numbers that vary, against the same study read anew with these numbers. */
class VariedStudyTest {
    private static final String STUDY = """
            hair: {shape: club, length: 830 um, stalk-diameter: 44 um, stalk-length: 390 um, shoulder-length: 70 um,
                   head-diameter: 118 um, end: round, density: 1.24 g/cm3, youngs-modulus: 3.1 GPa}
            suspension: {stiffness: 6.1 nN.m/rad, damping: {value: 4e-13 N.m.s/rad, in: vacuum}, pivot-depth: 4 um, plate-inertia: 2e-17 kg.m2}
            medium: {name: air, temperature: 24 degC, pressure: 97 kPa, humidity: 35 %}
            band: {from: 18 Hz, to: 900 Hz}
            accept: {rejection: 12 dB, error: 0.4 m/s2}
            finite-length: off
            surroundings:
              window: {kind: stream, mean-speed: 0.2 m/s}
              blades: {kind: tone, frequency: 140 Hz, speed: 0.9 mm/s}
            """;

    @TempDir
    private Path folder;

    private StudyReader reader(String text, String... settings) {
        try {
            Path file = Files.writeString(folder.resolve("s.yaml"), text, StandardCharsets.UTF_8);
            return StudyReader.open(file, List.of(settings));
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private static VariedStudy varied(StudyReader reader, String... paths) {
        NumberKeys numbers = reader.numbers();
        return VariedStudy.of(
                reader,
                List.of(paths).stream().map(path -> numbers.key("--vary", path)).toList());
    }

    /** With a stated stiffness and a damping of vacuum nothing is solved, so the study read anew is the same device. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "hair.head-diameter | 131 um",
                "hair.length | 0.91 mm",
                "hair.density | 1.9 g/cm3",
                "hair.youngs-modulus | 2.2 GPa",
                "medium.temperature | 61 degC",
                "medium.pressure | 0.4 bar",
                "medium.humidity | 80 %",
                "suspension.stiffness | 9 nN.m/rad",
                "suspension.damping.value | 1e-12 N.m.s/rad",
                "suspension.damping | 1e-12 N.m.s/rad",
                "suspension.plate-inertia | 0 kg.m2",
                "suspension.pivot-depth | 11 um",
                "band.to | 650 Hz",
                "accept.rejection | 31 dB",
                "accept.error | 3 m/s2",
                "surroundings.window.mean-speed | 0.31 m/s",
                "surroundings.blades.frequency | 155 Hz",
            })
    void isTheStudyReadAnewWithThatNumber(String path, String value) {
        VariedStudy space = varied(reader(STUDY), path);
        double number = space.numbers().get(0).value(value);
        BandsAnswer varied = space.at(number).answer();
        BandsAnswer anew = reader(STUDY, path + "=" + value).study().question().answer();
        assertThat(varied.device()).isEqualTo(anew.device());
        assertThat(varied.points()).hasSizeGreaterThan(10).isEqualTo(anew.points());
        assertThat(varied.error().orElseThrow().rms())
                .isEqualTo(anew.error().orElseThrow().rms());
        assertThat(varied.verdict()).isEqualTo(anew.verdict());
        BandsAnswer base = reader(STUDY).study().question().answer();
        assertThat(varied).as("the number counts").isNotEqualTo(base);
    }

    @Test
    void atTheBasesNumbersIsTheBase() {
        StudyReader reader = reader(STUDY);
        List<NumberKey> numbers = reader.numbers().all();
        assertThat(numbers).hasSizeGreaterThan(18);
        VariedStudy space = VariedStudy.of(reader, numbers);
        double[] values = numbers.stream().mapToDouble(NumberKey::base).toArray();
        BandsQuestion question = space.at(values);
        assertThat(question.device()).isEqualTo(space.base().device());
        assertThat(question.answer().verdict())
                .isEqualTo(space.base().question().answer().verdict());
        assertThat(space.still().at(values).sources()).isEmpty();
    }

    /** Stiffness and structural damping are properties of the springs: measured once, they carry the other hair. */
    @Test
    void whatWasMeasuredIsHeld() {
        String measured = STUDY.replace(
                "stiffness: 6.1 nN.m/rad, damping: {value: 4e-13 N.m.s/rad, in: vacuum}",
                "resonance: {frequency: 510 Hz, in: {name: air, temperature: 24 degC, pressure: 97 kPa, humidity: 35 %}}, quality: {value: 4.4, in: air}");
        StudyReader reader = reader(measured);
        VariedStudy space = varied(reader, "hair.head-diameter", "medium.temperature");
        Suspension base = space.base().device().suspension().orElseThrow();
        assertThat(space.at(140e-6, 330.0).device().suspension()).contains(base);
        StudyReader anew = reader(measured, "hair.head-diameter=140 um");
        assertThat(anew.study().device().suspension().orElseThrow().stiffness())
                .as("measured on another hair the same resonance means other springs")
                .isGreaterThan(1.05 * base.stiffness());
    }

    /** The definition of the resonance itself: there the response turns through 90°. */
    @Test
    void onRequestTheResonanceIsHeld() {
        String measured = STUDY.replace(
                "stiffness: 6.1 nN.m/rad, damping: {value: 4e-13 N.m.s/rad, in: vacuum}",
                "resonance: {frequency: 510 Hz, in: {name: air, temperature: 24 degC, pressure: 97 kPa, humidity: 35 %}}, quality: {value: 4.4, in: air}");
        StudyReader reader = reader(measured + "hold: resonance\n");
        VariedStudy space = varied(reader, "hair.head-diameter");
        assertThat(space.hold()).isEqualTo(Hold.RESONANCE);
        Suspension base = space.base().device().suspension().orElseThrow();
        Device thick = space.at(150e-6).device();
        Suspension held = thick.suspension().orElseThrow();
        assertThat(held.damping()).isEqualTo(base.damping());
        assertThat(held.stiffness()).isGreaterThan(1.05 * base.stiffness());
        Oscillator swing = new Oscillator(thick.hair(), held, Optional.of(thick.outside()));
        assertThat(swing.resonance() / (2.0 * Math.PI)).isCloseTo(510.0, within(510e-9));
        double still = space.at(space.numbers().get(0).base())
                .device()
                .suspension()
                .orElseThrow()
                .stiffness();
        assertThat(still).isCloseTo(base.stiffness(), within(1e-9 * base.stiffness()));
    }

    @Test
    void valuesThatMakeNoDeviceSayWhy() {
        VariedStudy space = varied(reader(STUDY), "hair.head-diameter", "hair.stalk-length");
        assertThatThrownBy(() -> space.at(30e-6, 390e-6))
                .isInstanceOf(NoDesignException.class)
                .hasMessageContaining("hair.head-diameter: a head of 30 um on a stalk of 44 um");
        assertThatThrownBy(() -> space.at(118e-6, 760e-6))
                .isInstanceOf(NoDesignException.class)
                .hasMessageContaining("longer than the hair's 830 um");
        assertThatThrownBy(() -> space.at(-1e-6, 390e-6))
                .isInstanceOf(NoDesignException.class)
                .hasMessageContaining("lies outside");
        assertThatThrownBy(() -> space.at(Double.NaN, 390e-6)).isInstanceOf(NoDesignException.class);
        assertThatThrownBy(() -> space.at(118e-6)).isInstanceOf(IllegalArgumentException.class);
        VariedStudy hot = varied(reader(STUDY), "medium.temperature");
        assertThatThrownBy(() -> hot.at(2900.0))
                .isInstanceOf(NoDesignException.class)
                .hasMessageContaining("medium.temperature");
    }

    @Test
    void severalThreadsGetTheSameAnswers() {
        VariedStudy space = varied(reader(STUDY), "hair.length", "medium.temperature");
        List<Double> alone = new ArrayList<>();
        for (int i = 0; i < 400; i++) {
            alone.add(rejection(space, i));
        }
        List<Double> together = IntStream.range(0, 400)
                .parallel()
                .mapToObj(i -> rejection(space, i))
                .toList();
        assertThat(together).isEqualTo(alone).doesNotContain(Double.NaN);
    }

    private static double rejection(VariedStudy space, int i) {
        return new Response(space.still().at(700e-6 + 1e-6 * i, 280.0 + 0.1 * i).device()).rejection(80.0);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "hair.diameterr=1 um..2 um | --across hair.diameterr: unknown key; a number of this study is wanted:",
                "hair.shape=1..2 | --across hair.shape: not a number;",
                "suspension.readout-noise=1 nrad/rtHz..2 nrad/rtHz | --across suspension.readout-noise: the study does not state it;",
                "hair.length=2 mm..1 mm | --across hair.length: a range from 2 mm to 1 mm is upside down;",
                "hair.length=2 mm..2 mm | a range from 2 mm to 2 mm is empty;",
                "hair.length=2 s..3 s | --across hair.length: 2 s is a time",
                "hair.length=40..120 um | --across hair.length: 40 has no unit;",
                "hair.length=1 mm..2 km | --across hair.length: 2 km",
                "hair.length=1 mm | --across: hair.length=1 mm is no KEY=A..B; for example hair.diameter=40 um..120 um",
                "hair.length | --across: hair.length is no KEY=A..B",
                "=1 mm..2 mm | --across: =1 mm..2 mm is no KEY=A..B",
            })
    void rangesAreChecked(String text, String problem) {
        NumberKeys numbers = reader(STUDY).numbers();
        assertThatThrownBy(() -> numbers.range("--across", text))
                .isInstanceOf(StudyException.class)
                .hasMessageContaining(problem);
    }

    @Test
    void aRangeIsReadInSi() {
        NumberKeys.KeyRange range =
                reader(STUDY).numbers().range("--down", "suspension.damping = 1e-13 N.m.s/rad..2e-12 N.m.s/rad");
        assertThat(range.key().path()).isEqualTo("suspension.damping.value");
        assertThat(range.key().base()).isEqualTo(4e-13);
        assertThat(range.from()).isEqualTo(1e-13);
        assertThat(range.to()).isEqualTo(2e-12);
    }
}
