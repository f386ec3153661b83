package flowshy.stream.surroundings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Caveat;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.turbulence.DuctTurbulence;
import flowshy.stream.wall.DuctFlow;
import flowshy.stream.wall.DuctSection;
import java.util.Optional;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** A duct with and without stated turbulence. */
class DuctTest {
    private static final double AIR = 1.51e-5;

    private static Duct duct(double speed, Optional<Stated> turbulence) {
        DuctSection section = new DuctSection.Rectangular(0.3, 0.2);
        return Duct.of("supply", 0.0, new DuctFlow(section, speed, AIR), turbulence, Optional.empty());
    }

    /** 5 m/s: Re = 7.9e4, 0.16 Re^(−1/8) of the mean speed, 0.165 hydraulic diameters of 0.24 m. */
    @Test
    void turbulenceFromSizeAndReynoldsNumber() {
        Duct duct = duct(5.0, Optional.empty());
        double reynolds = 5.0 * 0.24 / AIR;
        assertThat(duct.kind()).isEqualTo(SourceKind.DUCT);
        assertThat(duct.deviation())
                .isCloseTo(5.0 * 0.16 * Math.pow(reynolds, -0.125), Percentage.withPercentage(1e-9));
        assertThat(duct.assumed()).extracting(Stated::key).containsExactly("turbulence", "length-scale");
        assertThat(duct.assumed().get(1).value())
                .isCloseTo(new DuctTurbulence(reynolds, 0.24).lengthScale(), within(1e-12));
        assertThat(duct.assumed())
                .allSatisfy(number -> assertThat(number.source()).contains("common practice"));
        assertThat(duct.meanSpeed()).isBetween(5.0, 6.3);
        assertThat(duct.meanSpeedAt(6e-4)).isBetween(1.8, 2.2);
        assertThat(duct.density(10.0)).isGreaterThan(0.0);
        assertThat(((Duct) duct.varied("turbulence", 2.0)).deviation())
                .isCloseTo(2.0 * duct.deviation(), Percentage.withPercentage(1e-9));
    }

    @Test
    void statedTurbulenceIsKept() {
        Duct duct = duct(5.0, Optional.of(Stated.given("turbulence", 0.12)));
        assertThat(duct.deviation()).isCloseTo(0.6, within(1e-12));
        assertThat(duct.assumed()).extracting(Stated::key).containsExactly("length-scale");
    }

    @Test
    void laminarDuctCarriesNothingByItself() {
        Duct slow = duct(0.1, Optional.empty());
        assertThat(slow.deviation()).isZero();
        assertThat(slow.density(1.0)).isZero();
        assertThat(slow.acrossDensity(1.0)).isZero();
        assertThat(slow.assumed()).isEmpty();
        assertThat(slow.cutOff()).isEmpty();
        assertThat(slow.caveats(6e-4))
                .extracting(Caveat::text)
                .anySatisfy(text -> assertThat(text).contains("No fluctuation is stated"));
        Source stated = duct(0.1, Optional.of(Stated.given("turbulence", 0.05)));
        assertThat(stated.density(0.1)).isGreaterThan(0.0);
        assertThat(stated.share(1.0).at(0.1).getReal()).isCloseTo(1.0, within(1e-12));
        assertThat(stated.share(1.0).at(0.0).getReal()).isZero();
    }

    /** Through Re = 2300 the turbulence begins from nothing. */
    @Test
    void turbulenceBeginsFromNothing() {
        double speed = 2300.0 * AIR / 0.24;
        assertThat(duct(speed * 0.999, Optional.empty()).deviation()).isZero();
        assertThat(duct(speed * (1.0 + 1e-6), Optional.empty()).deviation()).isLessThan(1e-6 * speed);
        assertThat(duct(speed * 1.2, Optional.empty()).caveats(6e-4))
                .extracting(Caveat::text)
                .anySatisfy(text -> assertThat(text).contains("neither laminar nor turbulent all the time"));
    }
}
