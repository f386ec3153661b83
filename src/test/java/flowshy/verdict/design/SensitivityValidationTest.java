package flowshy.verdict.design;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.stream.cover.Covers;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.Sensitivities.Place;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.stream.Collectors;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Slopes of a cylinder's rejection as exponents of its diameter, length and density, against closed forms in the limits of its torques
 * (own derivation, beside each). One per cent of a number to the power n is 20 n lg 1.01 dB.
 */
class SensitivityValidationTest {
    private static final double EULER = 0.5772156649015329;
    private static final double PER_CENT = 20.0 * Math.log10(1.01);

    /** ν = 1 m²/s and ω = 1 rad/s: lengths are in units of √(ν/ω). */
    private static final double FREQUENCY = 1.0 / (2.0 * Math.PI);

    private static final Place HERE = new Place(FREQUENCY, "here");

    /** A fluid so thin that the hair's own inertia alone counts in motion. */
    private static final Medium THIN = Medium.of("thin", 1e-9, 1e-9);

    private static final Medium AIR = Medium.of("air", 1.2, 1.2);

    /** Of strips, whatever its size. */
    private static final Device HAIR = response(2.5, 0.4, 1100.0, AIR).device();

    private static Response response(double length, double radius, double density, Medium medium) {
        Hair hair = new Hair(new Cylinder(length, radius), density, OptionalDouble.empty());
        return new Response(new Device(hair, Optional.empty(), medium, Covers.OPEN, medium));
    }

    private static BandsQuestion question(double length, double radius, double density, Medium medium) {
        return new BandsQuestion(
                response(length, radius, density, medium).device(), new Band(0.01, 10.0), Acceptance.NONE);
    }

    private static Sensitivity.Slope slope(double value, DoubleFunction<BandsQuestion> law) {
        List<Sensitivity> found = new SensitivityQuestion(
                        HAIR, List.of(new Knob("x", value, false, law)), List.of(HERE))
                .answer()
                .numbers();
        assertThat(found).hasSize(1);
        return found.get(0).slopes().get(0);
    }

    private static double exponent(double value, DoubleFunction<BandsQuestion> law) {
        return slope(value, law).change() / PER_CENT;
    }

    /** q = −ln(λ/2) − γ, λ = a e^{iπ/4}: the logarithm of a thin hair's drag. */
    private static Complex logarithm(double radius) {
        return new Complex(Math.log(0.5 * radius) + EULER, 0.25 * Math.PI).negate();
    }

    /** Motion is the hair's inertia: the first power of its density. */
    @Test
    void densityCountsOnceWhereTheFluidWeighsNothing() {
        assertThat(exponent(1e6, rho -> question(3.0, 0.2, rho, THIN))).isCloseTo(1.0, within(1e-7));
    }

    /**
     * a ≪ δ ≪ L: flow is the logarithmic drag over the whole length, |T_flow| ∝ L²/|q|; motion ∝ a² L². The rejection goes as a²|q|: exponent
     * of the diameter 2 − Re 1/q, of the length nothing but some δ/L by the layer at the foot.
     */
    @Test
    void aThinHairInAThinLayerGoesAsItsSectionTimesTheLogarithm() {
        double radius = 1e-6;
        double length = 1e5;
        assertThat(exponent(radius, a -> question(length, a, 1e15, THIN)))
                .isCloseTo(2.0 - logarithm(radius).reciprocal().getReal(), within(1e-6));
        List<Sensitivity> lengths = new SensitivityQuestion(
                        HAIR,
                        List.of(new Knob("x", length, false, l -> question(l, radius, 1e15, THIN))),
                        List.of(HERE))
                .answer()
                .numbers();
        assertThat(lengths.stream().mapToDouble(Sensitivity::size).sum() / PER_CENT)
                .isLessThan(5e-5);
    }

    /**
     * a ≪ L ≪ δ: the shear s = kz is weak along the whole hair, |T_flow| ∝ L³/|q|; motion ∝ a² L². The rejection goes as a²|q|/L; the next term
     * of the layer, kz/2, leaves some L/δ in the exponent of the length.
     */
    @Test
    void aHairDeepInTheLayerLosesWithItsLength() {
        double radius = 1e-7;
        double length = 1e-4;
        assertThat(exponent(length, l -> question(l, radius, 1e25, THIN))).isCloseTo(-1.0, within(1e-4));
        assertThat(exponent(radius, a -> question(length, a, 1e25, THIN)))
                .isCloseTo(2.0 - logarithm(radius).reciprocal().getReal(), within(1e-6));
    }

    /**
     * δ ≪ a: flow is pressure gradient and added mass, thinned by Stokes' next term Γ − 1 = 4/λ: |2 + 4/λ| = 2 (1 + √2/Wo). The rejection goes as
     * a to the √2/Wo, to first order, where the layer at the foot counts for nothing.
     */
    @Test
    void aThickHairGainsOnlyByItsBoundaryLayer() {
        double radius = 300.0;
        assertThat(exponent(radius, a -> question(1e9, a, 1e6, THIN)))
                .isCloseTo(Math.sqrt(2.0) / radius, within(3.0 / (radius * radius)));
    }

    /** Where nothing is a limit: against a finer five-point difference, within the error that is told. */
    @Test
    void theErrorToldBoundsTheError() {
        Sensitivity.Slope told = slope(0.4, a -> question(2.5, a, 1100.0, AIR));
        double h = 2e-3;
        double[] weights = {1.0, -8.0, 8.0, -1.0};
        double[] steps = {-2.0, -1.0, 1.0, 2.0};
        double sum = 0.0;
        for (int i = 0; i < 4; i++) {
            sum += weights[i]
                    * response(2.5, 0.4 * Math.exp(steps[i] * h), 1100.0, AIR).rejection(FREQUENCY);
        }
        double fine = Math.log(1.01) * sum / (12.0 * h);
        assertThat(told.error()).isBetween(1e-10, 1e-4);
        assertThat(Math.abs(told.change() - fine)).isLessThan(told.error());
        assertThat(told.change()).isCloseTo(fine, within(1e-7));
    }

    @Test
    void theStrongestComesFirstAndWhatDoesNothingIsLeftOut() {
        List<Sensitivity> found = new SensitivityQuestion(
                        HAIR,
                        List.of(
                                new Knob("nothing", 5.0, false, x -> question(2.5, 0.4, 1100.0, AIR)),
                                new Knob("length", 2.5, false, l -> question(l, 0.4, 1100.0, AIR)),
                                new Knob("no device", 2.5, false, l -> {
                                    throw new NoDesignException("none");
                                }),
                                new Knob("diameter", 0.4, false, a -> question(2.5, a, 1100.0, AIR))),
                        List.of(HERE, new Place(3.0 * FREQUENCY, "above")))
                .answer()
                .numbers();
        assertThat(found).extracting(Sensitivity::name).containsExactly("diameter", "length");
        assertThat(found.get(0).slopes()).hasSize(2);
    }

    /** Per kelvin: the slope in the logarithm over the temperature. */
    @Test
    void temperaturesArePerKelvin() {
        DoubleFunction<BandsQuestion> law = t -> question(2.5, 0.4, t, AIR);
        List<Sensitivity> found = new SensitivityQuestion(HAIR, List.of(new Knob("t", 300.0, true, law)), List.of(HERE))
                .answer()
                .numbers();
        assertThat(found.get(0).slopes().get(0).change())
                .isCloseTo(slope(300.0, law).change() / Math.log(1.01) / 300.0, within(1e-12));
    }

    private static Device seen(Profile profile, Medium medium, LengthModel model) {
        Hair hair = new Hair(profile, 1100.0, OptionalDouble.empty(), model);
        return new Device(hair, Optional.empty(), medium, Covers.OPEN, medium);
    }

    private static BandsQuestion question(Device device) {
        return new BandsQuestion(device, new Band(0.01, 10.0), Acceptance.NONE);
    }

    static List<Arguments> bodies() {
        List<Arguments> all = new ArrayList<>();
        for (LengthModel model : LengthModel.values()) {
            all.add(Arguments.of(new Cylinder(2.5, 0.4), model));
            all.add(Arguments.of(new Club(2.5, 0.2, 1.4, 0.3, 0.4, Club.End.FLAT), model));
        }
        return all;
    }

    /**
     * By dimensions alone: lengths over √(ν/ω) and one density over the other are all that the rejection can know. So the slopes by all
     * lengths and twice that by the viscosity make nothing, and neither do those by both densities and the viscosity. Where the whole hair is
     * solved the former come across meshes and the latter along one grid of frequencies: one per cent of the largest.
     */
    @ParameterizedTest
    @MethodSource("bodies")
    void slopesOfWhatBelongsTogetherMakeNothing(Profile profile, LengthModel model) {
        Device here = seen(profile, AIR, model);
        List<Sensitivity> found = new SensitivityQuestion(
                        here,
                        List.of(
                                new Knob(
                                        "all",
                                        1.0,
                                        false,
                                        x -> question(seen(profile.thickened(x).lengthened(x), AIR, model))),
                                new Knob("thick", 1.0, false, x -> question(seen(profile.thickened(x), AIR, model))),
                                new Knob("long", 1.0, false, x -> question(seen(profile.lengthened(x), AIR, model))),
                                new Knob(
                                        "viscosity",
                                        1.0,
                                        false,
                                        x -> question(seen(profile, Medium.of("air", 1.2, 1.2 * x), model))),
                                new Knob(
                                        "density",
                                        1.0,
                                        false,
                                        x -> question(seen(profile, Medium.of("air", 1.2 * x, 1.2), model))),
                                new Knob(
                                        "hair",
                                        1.0,
                                        false,
                                        x -> question(here.with(here.hair().ofDensity(1100.0 * x))))),
                        List.of(HERE))
                .answer()
                .numbers();
        assertThat(found).hasSize(6);
        Map<String, Double> slopes = found.stream()
                .collect(Collectors.toMap(
                        Sensitivity::name, one -> one.slopes().get(0).change()));
        boolean meshes = model == LengthModel.AUTO || model == LengthModel.FINITE;
        double within = (meshes ? 0.01 : 1e-5) * slopes.get("thick");
        assertThat(within).isPositive();
        assertThat(slopes.get("thick") + slopes.get("long")).isCloseTo(slopes.get("all"), within(within));
        assertThat(slopes.get("all")).isCloseTo(-2.0 * slopes.get("viscosity"), within(within));
        assertThat(slopes.get("hair"))
                .isCloseTo(-slopes.get("density") - slopes.get("viscosity"), within(1e-4 * slopes.get("thick")));
    }

    /** A number that leaves no room for the wide step is differenced across a narrow one. */
    @Test
    void aTightNumberIsDifferencedNarrowly() {
        Profile profile = new Cylinder(2.5, 0.4);
        DoubleFunction<BandsQuestion> law = x -> question(seen(profile.thickened(x), AIR, LengthModel.AUTO));
        Device here = seen(profile, AIR, LengthModel.AUTO);
        List<Sensitivity> found = new SensitivityQuestion(
                        here,
                        List.of(new Knob("free", 1.0, false, law), new Knob("tight", 1.0, false, x -> {
                            if (Math.abs(x - 1.0) > 0.05) {
                                throw new NoDesignException("no room");
                            }
                            return law.apply(x);
                        })),
                        List.of(HERE))
                .answer()
                .numbers();
        assertThat(found).extracting(Sensitivity::name).containsExactlyInAnyOrder("free", "tight");
        assertThat(found.get(0).size())
                .isCloseTo(found.get(1).size(), within(0.01 * found.get(1).size()));
        assertThat(found.get(0).size()).isNotEqualTo(found.get(1).size());
    }
}
