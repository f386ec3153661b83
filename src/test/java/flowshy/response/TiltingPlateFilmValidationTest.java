package flowshy.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.math.Caveat;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TiltingPlateFilmValidationTest {
    private static final Medium UNIT = Medium.of("unit", 1.0, 1.0);

    private static Medium gas(double meanFreePath) {
        return new Medium(
                "test gas",
                Phase.GAS,
                293.15,
                101325.0,
                /* density= */ 1.2,
                /* viscosity= */ 1.8e-5,
                OptionalDouble.empty(),
                OptionalDouble.of(meanFreePath),
                List.of(),
                List.of());
    }

    /** c h³/(μ l⁶) of the series summed term by term before this code, agreed there with finite differences to 6 digits. */
    @ParameterizedTest
    @CsvSource({"0.25, 7.842579e-4", "0.5, 3.657345e-3", "1, 1.1602288e-2", "2, 2.8250715e-2", "5, 7.8250681e-2"})
    void agreesWithTheSeriesSummedApart(double width, double expected) {
        assertThat(new TiltingPlateFilm(1.0, width, 1.0).damping(UNIT) / expected)
                .isCloseTo(1.0, within(1e-7));
    }

    /** A second method: ∇²p = 12x by finite differences on two grids, extrapolated. */
    @ParameterizedTest
    @ValueSource(doubles = {0.4, 1.0, 1.7})
    void agreesWithFiniteDifferences(double width) {
        double coarse = finiteDifferences(width, 20);
        double fine = finiteDifferences(width, 40);
        double extrapolated = fine + (fine - coarse) / 3.0;
        assertThat(new TiltingPlateFilm(1.0, width, 1.0).damping(UNIT) / extrapolated)
                .isCloseTo(1.0, within(2e-4));
    }

    /** A long plate is a plane film, 1/60 of μ l⁵ w/h³; a short one, μ l³ w³/(12 h³). Both integrated by hand. */
    @Test
    void tendsToPlaneFilmsBothWays() {
        assertThat(new TiltingPlateFilm(1.0, 1e6, 1.0).damping(UNIT) / 1e6).isCloseTo(1.0 / 60.0, within(1e-8));
        assertThat(new TiltingPlateFilm(1.0, 1e-3, 1.0).damping(UNIT) / 1e-9).isCloseTo(1.0 / 12.0, within(3e-4));
    }

    /** 100 µm × 100 µm, 1 µm over the base, air of 18.2 µPa s: 2.112e-13 N m s/rad. */
    @Test
    void givesTheExampleOfASquarePlate() {
        Medium air = Medium.of("air", 1.2, 18.2e-6);
        assertThat(new TiltingPlateFilm(100e-6, 100e-6, 1e-6).damping(air)).isCloseTo(2.112e-13, within(5e-17));
    }

    /** For small Kn the fit stands near the slip of first order, 1/(1 + 6 Kn), which it meets within its own 5 %. */
    @ParameterizedTest
    @ValueSource(doubles = {0.0, 0.01, 0.03, 0.1})
    void startsLikeSlipOfFirstOrder(double knudsen) {
        TiltingPlateFilm film = new TiltingPlateFilm(100e-6, 100e-6, 1e-6);
        double share = film.effectiveViscosity(gas(knudsen * 1e-6)) / 1.8e-5;
        assertThat(share * (1.0 + 6.0 * knudsen)).isCloseTo(1.0, within(0.05));
    }

    /** Veijola's factor evaluated apart: Kn = 0.0653, 1 and 10. */
    @ParameterizedTest
    @CsvSource({"0.0653, 0.71031676", "1, 0.094002632", "10, 0.0071433124"})
    void isVeijolasFactor(double knudsen, double share) {
        TiltingPlateFilm film = new TiltingPlateFilm(100e-6, 80e-6, 1e-6);
        Medium rarefied = gas(knudsen * 1e-6);
        assertThat(film.effectiveViscosity(rarefied) / 1.8e-5).isCloseTo(share, within(1e-7 * share));
        double continuum = film.damping(Medium.of("plain", 1.2, 1.8e-5));
        assertThat(film.damping(rarefied) / continuum).isCloseTo(share, within(1e-7 * share));
    }

    @Test
    void saysWhereItWeakens() {
        TiltingPlateFilm film = new TiltingPlateFilm(100e-6, 100e-6, 1e-6);
        assertThat(film.squeezeNumber(Medium.of("plain", 1.2, 1.8e-5), 1e4)).isCloseTo(0.05329386, within(1e-8));
        assertThat(film.caveats(gas(1e-9), 1e3)).isEmpty();
        assertThat(film.caveats(gas(1e-9), 5e5)).singleElement().satisfies(caveat -> {
            assertThat(caveat.weight()).isEqualTo(Caveat.Weight.WEAK);
            assertThat(caveat.text()).contains("squeeze number");
        });
        assertThat(film.caveats(gas(1e-9), 5e6)).extracting(Caveat::weight).containsExactly(Caveat.Weight.OUT_OF_RANGE);
        TiltingPlateFilm thick = new TiltingPlateFilm(100e-6, 50e-6, 20e-6);
        assertThat(thick.caveats(Medium.of("plain", 1.2, 1.8e-5), 1e6))
                .extracting(Caveat::text)
                .hasSize(2)
                .anySatisfy(text -> assertThat(text).contains("0.40 of the plate's side"))
                .anySatisfy(text -> assertThat(text).contains("inertia"));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.0, -1.0, Double.NaN, Double.POSITIVE_INFINITY})
    void refusesWhatIsNotPositive(double bad) {
        assertThatThrownBy(() -> new TiltingPlateFilm(bad, 1.0, 1.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new TiltingPlateFilm(1.0, bad, 1.0)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new TiltingPlateFilm(1.0, 1.0, bad)).isInstanceOf(IllegalArgumentException.class);
    }

    /** −∫ p x dA of ∇²p = 12 x on a plate of length 1 (x from −1/2) by over-relaxation. */
    private static double finiteDifferences(double width, int cells) {
        double dx = 1.0 / cells;
        double dy = width / cells;
        double wx = 1.0 / (dx * dx);
        double wy = 1.0 / (dy * dy);
        double[][] p = new double[cells + 1][cells + 1];
        double relax = 2.0 / (1.0 + FastMath.sin(FastMath.PI / cells));
        for (int sweep = 0; sweep < 12 * cells; sweep++) {
            for (int i = 1; i < cells; i++) {
                for (int j = 1; j < cells; j++) {
                    double balance =
                            wx * (p[i - 1][j] + p[i + 1][j]) + wy * (p[i][j - 1] + p[i][j + 1]) - 12.0 * (i * dx - 0.5);
                    p[i][j] += relax * (0.5 * balance / (wx + wy) - p[i][j]);
                }
            }
        }
        double torque = 0.0;
        for (int i = 1; i < cells; i++) {
            for (int j = 1; j < cells; j++) {
                torque -= p[i][j] * (i * dx - 0.5) * dx * dy;
            }
        }
        return torque;
    }
}
