package flowshy.stream.surroundings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Caveat;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.record.Declaration;
import flowshy.stream.record.MeasuredSpectrum;
import flowshy.stream.record.RecordFile;
import flowshy.stream.sound.SoundWave;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** Measured files as sources. */
class MeasuredTest {
    private static final OptionalDouble NONE = OptionalDouble.empty();

    private static MeasuredSpectrum read(String text, String quantity, String unit, double rate) {
        boolean record = quantity.equals("time record");
        Declaration declaration = Declaration.of(
                record ? List.of("u") : List.of("f", "S"),
                quantity,
                unit,
                0,
                record ? OptionalDouble.of(rate) : NONE,
                NONE);
        return RecordFile.read("logged.txt", text, declaration);
    }

    private static MeasuredSpectrum noise(double mean) {
        Random random = new Random(42L);
        StringBuilder text = new StringBuilder();
        for (int n = 0; n < 20000; n++) {
            text.append(mean + 0.1 * random.nextGaussian()).append('\n');
        }
        return read(text.toString(), "time record", "m/s", 2000.0);
    }

    /** White noise of 0.1 m/s rms: gathered into bands it keeps its mean square, and there are few of them. */
    @Test
    void recordWithAMeanIsAStream() {
        MeasuredSpectrum record = noise(0.8);
        double mean = Measured.meanSpeed(record).orElseThrow();
        assertThat(mean).isCloseTo(0.8, within(0.005));
        Source stream = Measured.stream(
                "logged",
                SourceKind.RECORD,
                0.0,
                mean,
                record,
                Stated.assumed("fetch", 0.02, "common practice, no source"),
                StreamTest.AIR);
        assertThat(stream.driven()).isFalse();
        assertThat(stream.kind()).isEqualTo(SourceKind.RECORD);
        assertThat(stream.meanSpeedAt(1.0)).isCloseTo(mean, within(1e-9));
        assertThat(stream.breaks().size()).isBetween(50, 200);
        double sum = 0.0;
        List<Double> edges = stream.breaks();
        for (int i = 1; i < edges.size(); i++) {
            sum += stream.density(0.5 * (edges.get(i - 1) + edges.get(i))) * (edges.get(i) - edges.get(i - 1));
        }
        assertThat(sum).isCloseTo(record.meanSquare(), Percentage.withPercentage(1e-6));
        assertThat(sum).isCloseTo(0.01, Percentage.withPercentage(3.0));
        assertThat(stream.acrossDensity(100.0)).isEqualTo(stream.density(100.0));
        assertThat(stream.varied("fetch", 2.0).meanSpeedAt(4e-4)).isLessThan(stream.meanSpeedAt(4e-4));
        assertThat(stream.caveats(6e-4))
                .extracting(Caveat::text)
                .anySatisfy(t -> assertThat(t).contains("The density is Welch's"))
                .anySatisfy(t -> assertThat(t).contains("Measured from"))
                .noneSatisfy(t -> assertThat(t).contains("across the stream was not measured"));
        Source slanted = Measured.stream(
                "logged", SourceKind.RECORD, 1.0, mean, record, Stated.given("fetch", 0.02), StreamTest.AIR);
        assertThat(slanted.caveats(6e-4))
                .extracting(Caveat::text)
                .anySatisfy(t -> assertThat(t).contains("across the stream was not measured"));
    }

    @Test
    void recordWithoutAMeanIsAnOscillation() {
        MeasuredSpectrum record = noise(0.001);
        assertThat(Measured.meanSpeed(record)).isEmpty();
        Source oscillation = Measured.oscillation("logged", SourceKind.RECORD, 0.0, record, StreamTest.AIR);
        assertThat(oscillation.driven()).isTrue();
        assertThat(oscillation.meanSpeed()).isZero();
        assertThat(oscillation.density(300.0)).isCloseTo(1e-5, Percentage.withPercentage(40.0)); // 2σ²/f_s
        assertThat(oscillation.acrossDensity(300.0)).isZero();
    }

    @Test
    void linesStayLines() {
        Source pump = Measured.oscillation(
                "pump", SourceKind.SPECTRUM, 0.0, read("50 2\n150 1\n", "rms lines", "mm/s", 0.0), StreamTest.AIR);
        assertThat(pump.lines()).hasSize(2);
        assertThat(pump.lines().get(0).deviation()).isCloseTo(2e-3, within(1e-15));
        assertThat(pump.density(50.0)).isZero();
        assertThat(pump.breaks()).isEmpty();
        assertThat(pump.support().contains(50.0) && pump.support().contains(150.0))
                .isTrue();
        assertThat(pump.caveats(1e-3))
                .extracting(Caveat::text)
                .anySatisfy(t -> assertThat(t).contains("one sinusoid"));
    }

    /** 94 dB in one third-octave of a microphone: 2.42365 mm/s in it. */
    @Test
    void soundPressureBecomesVelocity() {
        SoundWave wave = SoundWave.plane(1.20458, 343.34);
        Source microphone = Measured.sound(
                "microphone",
                SourceKind.SPECTRUM,
                0.0,
                read("125 94\n160 0\n", "band levels", "dB re 20 uPa", 0.0),
                wave,
                StreamTest.AIR);
        double low = microphone.breaks().get(0);
        double high = microphone.breaks().get(1);
        assertThat(Math.sqrt(microphone.density(125.0) * 125.0 * Math.log(high / low)))
                .isCloseTo(2.42365e-3, Percentage.withPercentage(0.01));
        assertThat(microphone.driven()).isTrue();
    }

    /** A finely divided spectrum keeps a narrow peak's mean square when it is gathered. */
    @Test
    void fineSpectrumIsGathered() {
        StringBuilder text = new StringBuilder();
        for (int i = 1; i <= 5000; i++) {
            text.append(i).append(' ').append(i == 2345 ? 1.0 : 1e-6).append('\n');
        }
        MeasuredSpectrum fine = read(text.toString(), "density", "(m/s)2/Hz", 0.0);
        Source source = Measured.oscillation("fine", SourceKind.SPECTRUM, 0.0, fine, StreamTest.AIR);
        assertThat(source.breaks().size()).isLessThan(300);
        double sum = 0.0;
        List<Double> edges = source.breaks();
        for (int i = 1; i < edges.size(); i++) {
            sum += source.density(0.5 * (edges.get(i - 1) + edges.get(i))) * (edges.get(i) - edges.get(i - 1));
        }
        assertThat(sum).isCloseTo(fine.meanSquare(), Percentage.withPercentage(1e-6));
    }

    @Test
    void refusesOtherSignals() {
        MeasuredSpectrum motion = read("20 1\n200 1\n", "density", "g2/Hz", 0.0);
        MeasuredSpectrum lines = read("50 2\n", "rms lines", "mm/s", 0.0);
        Stated fetch = Stated.given("fetch", 0.02);
        SoundWave wave = SoundWave.plane(1.2, 343.0);
        assertThatThrownBy(() -> Measured.oscillation("m", SourceKind.SPECTRUM, 0.0, motion, StreamTest.AIR))
                .hasMessageContaining("no velocity");
        assertThatThrownBy(() -> Measured.sound("m", SourceKind.SPECTRUM, 0.0, motion, wave, StreamTest.AIR))
                .hasMessageContaining("sound pressure");
        assertThatThrownBy(() -> Measured.stream("m", SourceKind.SPECTRUM, 0.0, 1.0, lines, fetch, StreamTest.AIR))
                .hasMessageContaining("density of velocity");
    }
}
