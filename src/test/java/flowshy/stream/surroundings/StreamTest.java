package flowshy.stream.surroundings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Caveat;
import flowshy.medium.Medium;
import flowshy.stream.HeightShare;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.turbulence.TurbulenceSpectrum;
import flowshy.stream.wall.BlasiusLayer;
import flowshy.stream.wall.FluctuatingLayer;
import flowshy.stream.wall.PlateFlow;
import flowshy.stream.wall.Transition;
import org.assertj.core.data.Percentage;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;

/** How a stream is put together from its laws, each of which has its own validation; and the rule of the local rms. */
class StreamTest {
    static final Medium AIR = Medium.of("air", 1.2, 1.812e-5); // ν = 1.51e-5

    static Stream stream(double speed, double turbulence, double lengthScale, double fetch) {
        return new Stream(
                "draught",
                0.0,
                speed,
                Stated.given("turbulence", turbulence),
                Stated.assumed("length-scale", lengthScale, "common practice, no source"),
                Stated.assumed("fetch", fetch, "common practice, no source"),
                AIR);
    }

    @Test
    void laminarDraughtIsBlasiusWithItsOwnFluctuation() {
        Stream draught = stream(0.3, 0.35, 0.06, 0.008);
        double omega = 2.0 * Math.PI * 7.0;
        BlasiusLayer layer = new BlasiusLayer(0.3, 0.008, 1.51e-5);
        assertThat(draught.kind()).isEqualTo(SourceKind.STREAM);
        assertThat(draught.driven()).isFalse();
        assertThat(draught.meanSpeed()).isEqualTo(0.3);
        assertThat(draught.meanSpeedAt(5e-4)).isCloseTo(layer.speedAt(5e-4), within(1e-12));
        Complex along = draught.share(omega).at(5e-4);
        assertThat(along.subtract(FluctuatingLayer.ALONG.share(layer.eta(5e-4), omega * 0.008 / 0.3))
                        .norm())
                .isLessThan(1e-12);
        Complex across = draught.acrossShare(omega).at(5e-4);
        assertThat(across.subtract(FluctuatingLayer.ACROSS.share(layer.eta(5e-4), omega * 0.008 / 0.3))
                        .norm())
                .isLessThan(1e-12);
        TurbulenceSpectrum spectrum = new TurbulenceSpectrum(0.105, 0.06, 0.3, 1.51e-5);
        assertThat(draught.density(7.0)).isCloseTo(spectrum.along(7.0), Percentage.withPercentage(1e-9));
        assertThat(draught.acrossDensity(7.0)).isCloseTo(spectrum.across(7.0), Percentage.withPercentage(1e-9));
        assertThat(draught.cutOff()).contains(spectrum.cutOff());
        assertThat(draught.lines()).isEmpty();
        assertThat(draught.breaks()).isEmpty();
    }

    /** The support leaves a thousandth of the variance outside at most. */
    @Test
    void supportHoldsTheVariance() {
        for (Stream each : new Stream[] {stream(0.3, 0.35, 0.06, 0.008), stream(10.0, 0.05, 0.1, 0.5)}) {
            assertThat(variance(each, height -> Complex.ONE, 0.0))
                    .isCloseTo(each.deviation() * each.deviation(), Percentage.withPercentage(0.1));
        }
    }

    /** 10 m/s after two metres: the rms at a height is the larger of σ U(z)/U and u_τ min(0.4 z⁺, 2.7), integrated over frequency. */
    @Test
    void localRmsInATurbulentLayerFollowsTheRule() {
        for (double turbulence : new double[] {0.02, 0.05, 0.3}) {
            Stream wind = stream(10.0, turbulence, 0.1, 2.0);
            PlateFlow flow = PlateFlow.of(10.0, 2.0, turbulence, 1.51e-5);
            assertThat(flow.intermittency()).isCloseTo(1.0, within(1e-6));
            for (double z : new double[] {5e-5, 2e-4, 6e-4, 2e-3}) {
                double carried = 10.0 * turbulence * flow.wall().speedAt(z) / 10.0;
                double made = flow.wall().fluctuationAt(z);
                double rms = Math.sqrt(variance(wind, null, z));
                assertThat(rms)
                        .as("turbulence %s, z %s", turbulence, z)
                        .isCloseTo(Math.max(carried, made), Percentage.withPercentage(0.2));
            }
        }
    }

    /** A wind of twenty metres' scale ends at 1.7 kHz; the wall's own turbulence goes on to 1.8 u_τ²/ν. */
    @Test
    void supportReachesToTheWallsOwnTurbulence() {
        Stream wind = stream(10.0, 0.02, 20.0, 2.0);
        double friction = PlateFlow.of(10.0, 2.0, 0.02, 1.51e-5).wall().frictionVelocity();
        assertThat(wind.support().high())
                .isCloseTo(1.8 * friction * friction / 1.51e-5, Percentage.withPercentage(0.01));
    }

    private static double variance(Source source, HeightShare uniform, double height) {
        double low = Math.log(source.support().low());
        double high = Math.log(source.support().high());
        int n = 4000;
        double sum = 0.0;
        for (int i = 0; i < n; i++) {
            double f = Math.exp(low + (i + 0.5) * (high - low) / n);
            HeightShare share = uniform == null ? source.share(2.0 * Math.PI * f) : uniform;
            double size = share.at(height).norm();
            sum += size * size * source.density(f) * f * (high - low) / n;
        }
        return sum;
    }

    /** On a path of rising fetch: no step where transition begins, and the end of it reached. */
    @Test
    void noStepThroughTransition() {
        double start = new Transition(0.03).reynolds() * 1.51e-5 / 10.0;
        double omega = 2.0 * Math.PI * 80.0;
        Complex before =
                stream(10.0, 0.03, 0.1, start * (1.0 - 1e-9)).share(omega).at(4e-4);
        Complex behind =
                stream(10.0, 0.03, 0.1, start * (1.0 + 1e-9)).share(omega).at(4e-4);
        assertThat(behind.subtract(before).norm() / before.norm()).isLessThan(1e-7);
        Complex between = stream(10.0, 0.03, 0.1, 1.5 * start).share(omega).at(4e-4);
        assertThat(between.norm()).isGreaterThan(before.norm());
    }

    /** Half the turbulence: a quarter of the density at equal shape; the wrong key is refused. */
    @Test
    void assumedNumbersCanBeVaried() {
        Stream draught = stream(0.3, 0.35, 0.06, 0.008);
        assertThat(draught.assumed()).extracting(Stated::key).containsExactly("length-scale", "fetch");
        Source longer = draught.varied("length-scale", 2.0);
        assertThat(longer.density(3.0))
                .isCloseTo(stream(0.3, 0.35, 0.12, 0.008).density(3.0), Percentage.withPercentage(1e-9));
        assertThat(longer.assumed().get(0).value()).isCloseTo(0.12, within(1e-15));
        Source shorter = draught.varied("fetch", 0.5);
        assertThat(shorter.meanSpeedAt(5e-4))
                .isCloseTo(new BlasiusLayer(0.3, 0.004, 1.51e-5).speedAt(5e-4), within(1e-12));
        assertThatThrownBy(() -> draught.varied("turbulence", 2.0))
                .hasMessageContaining("turbulence is no assumed number");
    }

    @Test
    void saysWhatItRestsOn() {
        assertThat(stream(0.3, 0.35, 0.002, 0.008).caveats(6.4e-4))
                .extracting(Caveat::text)
                .anySatisfy(text -> assertThat(text)
                        .contains("laminar")
                        .contains("3.12 mm thick")
                        .contains("0.640 mm long"))
                .anySatisfy(text -> assertThat(text).contains("Re_x = 159 is below 500"))
                .anySatisfy(text -> assertThat(text).contains("turbulence of 35.0 %"))
                .anySatisfy(text -> assertThat(text).contains("length scale of 2.00 mm"))
                .anySatisfy(text -> assertThat(text).contains("Reynolds number of 13.9"));
        assertThat(stream(10.0, 0.05, 0.1, 0.5).caveats(6.4e-4))
                .extracting(Caveat::text)
                .anySatisfy(text ->
                        assertThat(text).contains("turbulent (Re_x = 331000)").contains("14.6 mm thick"))
                .anySatisfy(text -> assertThat(text).contains("estimate"))
                .noneSatisfy(text -> assertThat(text).contains("length scale"));
        assertThat(stream(4.0, 0.2, 0.1, 0.2).caveats(6.4e-4))
                .extracting(Caveat::text)
                .anySatisfy(text -> assertThat(text).contains("outside the data of its law"));
    }

    @Test
    void refusesWhatIsNoStream() {
        assertThatThrownBy(() -> stream(0.0, 0.3, 0.1, 0.02)).hasMessageContaining("mean speed");
        assertThatThrownBy(() -> Stated.given("turbulence", 0.0)).hasMessageContaining("turbulence");
        assertThatThrownBy(() -> Stated.assumed("fetch", 1.0, " ")).hasMessageContaining("no source");
    }
}
