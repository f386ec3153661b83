package flowshy.verdict.tolerance;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import flowshy.medium.PropertySource;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.stream.cover.Covers;
import flowshy.torque.Torques;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.tolerance.ToleranceAnswer.FanPoint;
import flowshy.verdict.tolerance.ToleranceAnswer.Spread;
import flowshy.verdict.tolerance.Tolerances.StatedFlow;
import flowshy.verdict.tolerance.sampling.Progress;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.junit.jupiter.api.Test;

/** Whole runs against what one uncertain input alone must give, worked out from the torques themselves or by hand. */
class ToleranceQuestionValidationTest {
    private static final double LENGTH = 7.3e-4;
    private static final double RADIUS = 4.4e-5;
    private static final double DENSITY = 1240.0;
    private static final Band BAND = new Band(40.0, 600.0);

    private static final Medium AIR = new Medium(
            "air",
            Phase.GAS,
            293.15,
            101325.0,
            1.2,
            1.82e-5,
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            List.of(source("density", 0.01), source("viscosity", 0.02)),
            List.of());

    private static PropertySource source(String property, double uncertainty) {
        return new PropertySource(property, "a test", PropertySource.Reading.GIVEN, OptionalDouble.of(uncertainty));
    }

    private static BandsQuestion question(double radius, double density, Acceptance acceptance) {
        Hair hair = new Hair(new Cylinder(LENGTH, radius), density, OptionalDouble.empty());
        return new BandsQuestion(new Device(hair, Optional.empty(), AIR, Covers.OPEN, AIR), BAND, acceptance);
    }

    /** Radius and density of the hair vary. */
    private record Space(Acceptance acceptance) implements DesignSpace {
        @Override
        public List<String> keys() {
            return List.of("radius", "density");
        }

        @Override
        public BandsQuestion at(double... values) {
            if (values[0] > 1.3 * RADIUS) {
                throw new NoDesignException("too thick");
            }
            return question(values[0], values[1], acceptance);
        }

        @Override
        public DesignSpace still() {
            return this;
        }
    }

    private static Tolerances tolerances(
            Acceptance acceptance, List<Uncertain> stated, boolean properties, Optional<StatedFlow> flow) {
        return new Tolerances(
                question(RADIUS, DENSITY, acceptance),
                new Space(acceptance),
                List.of(RADIUS, DENSITY),
                stated,
                properties,
                false,
                flow,
                OptionalDouble.empty());
    }

    private static Uncertain of(String name, Shape shape, int index, double size) {
        return new Uncertain(name, shape, "", "", List.of(new Target.OfNumber(index, size, true)));
    }

    private static ToleranceAnswer run(Tolerances tolerances) {
        return new ToleranceQuestion(tolerances, List.of(Figure.MASS))
                .answer(new Effort(16_384, Precision.ANY, 3), Progress.NONE);
    }

    private static double rejection(double radius, double density, double frequency) {
        return new Response(question(radius, density, Acceptance.NONE).device()).rejection(frequency);
    }

    private static double percentile(FanPoint point, double p) {
        return point.percentiles().get(ToleranceAnswer.PERCENTILES.indexOf(p)).estimate();
    }

    /** One evenly spread diameter: the rejection rises with it, so its 97.5 % percentile is the rejection at 0.95 of the half width. */
    @Test
    void oneDiameterEvenlySpread() {
        ToleranceAnswer answer = run(tolerances(
                new Acceptance(OptionalDouble.empty(), OptionalDouble.empty()),
                List.of(of("diameter", Shape.UNIFORM, 0, 0.06)),
                false,
                Optional.empty()));
        assertThat(answer.fan()).hasSize(ToleranceQuestion.FREQUENCIES);
        for (int i : new int[] {0, 77, 199}) {
            FanPoint point = answer.fan().get(i);
            assertThat(point.nominal()).isCloseTo(rejection(RADIUS, DENSITY, point.frequency()), within(1e-12));
            assertThat(percentile(point, 97.5))
                    .isCloseTo(rejection(RADIUS * (1.0 + 0.06 * 0.95), DENSITY, point.frequency()), within(0.003));
            assertThat(percentile(point, 2.5))
                    .isCloseTo(rejection(RADIUS * (1.0 - 0.06 * 0.95), DENSITY, point.frequency()), within(0.003));
        }
        Spread least = answer.figures().get(0);
        assertThat(least.nominal()).isCloseTo(rejection(RADIUS, DENSITY, BAND.from()), within(1e-12));
        assertThat(least.effects()).singleElement().satisfies(one -> {
            assertThat(one.effect().first().estimate()).isCloseTo(1.0, within(0.01));
            assertThat(one.effect().total().estimate()).isCloseTo(1.0, within(0.01));
        });
        // mass goes with the square: mean 1 + w²/3 of the nominal one
        Spread mass = answer.figures().get(1);
        assertThat(mass.mean().estimate() / mass.nominal()).isCloseTo(1.0 + 0.06 * 0.06 / 3.0, within(1e-6));
    }

    /** One normal density of the hair, and the limit where two thirds of a deviation above the nominal value put it: Φ(2/3) = 0.747507. */
    @Test
    void chanceOfALimitByOneNormalInput() {
        double limit = rejection(RADIUS, DENSITY * (1.0 - 0.03 * 2.0 / 3.0), BAND.from());
        ToleranceAnswer answer = run(tolerances(
                new Acceptance(OptionalDouble.of(limit), OptionalDouble.empty()),
                List.of(of("density", Shape.NORMAL, 1, 0.03)),
                false,
                Optional.empty()));
        assertThat(answer.limits()).singleElement().satisfies(chance -> {
            assertThat(chance.asked()).isTrue();
            assertThat(chance.met().estimate()).isCloseTo(0.747507, within(1e-3));
            assertThat(chance.met().low()).isLessThan(0.7476).isGreaterThan(0.745);
        });
        assertThat(answer.yield().orElseThrow().estimate())
                .isEqualTo(answer.limits().get(0).met().estimate());
        assertThat(answer.decision()).isEqualTo(Decision.MEETS);
    }

    /** T_motion = T_carried − e^{zu} T_flow at the percentile's z = ±1.959964, by the torques of the nominal device. */
    @Test
    void dragLawAlone() {
        double size = 0.05;
        ToleranceAnswer answer = run(
                tolerances(Acceptance.NONE, List.of(), false, Optional.of(new StatedFlow(Shape.NORMAL, size, "5 %"))));
        Response response =
                new Response(question(RADIUS, DENSITY, Acceptance.NONE).device());
        FanPoint point = answer.fan().get(60);
        Torques torques = response.torques(point.frequency());
        for (double[] at : new double[][] {{2.5, 1.959964}, {97.5, -1.959964}}) {
            Complex flow = torques.flow().multiply(Math.exp(at[1] * size));
            double expected =
                    20.0 * Math.log10(flow.negate().add(torques.carried()).norm() / flow.norm());
            assertThat(percentile(point, at[0])).isCloseTo(expected, within(0.01));
        }
        assertThat(answer.inputs()).extracting(Uncertain::name).containsExactly("drag law");
    }

    /** Viscosity and density of the medium: the spread is the root of the sum of squares of what each moves by one deviation. */
    @Test
    void propertiesOfTheMedium() {
        ToleranceAnswer answer = run(tolerances(Acceptance.NONE, List.of(), true, Optional.empty()));
        double[] moved = new double[2];
        for (int i = 0; i < 2; i++) {
            double up = least(i == 0 ? 1.01 : 1.0, i == 1 ? 1.02 : 1.0);
            double down = least(i == 0 ? 0.99 : 1.0, i == 1 ? 0.98 : 1.0);
            moved[i] = 0.5 * (up - down);
        }
        assertThat(answer.inputs()).hasSize(2);
        assertThat(answer.figures().get(0).deviation().estimate())
                .isCloseTo(Math.hypot(moved[0], moved[1]), within(1e-3 * Math.hypot(moved[0], moved[1])));
        assertThat(answer.figures().get(0).effects().get(0).input()).isEqualTo("viscosity of air");
        assertThat(answer.left()).containsExactly("The drag law counts as certain: drag-law is off.");
    }

    private static double least(double density, double viscosity) {
        Medium medium = Medium.of("air", 1.2 * density, 1.82e-5 * viscosity);
        Hair hair = new Hair(new Cylinder(LENGTH, RADIUS), DENSITY, OptionalDouble.empty());
        return new Response(new Device(hair, Optional.empty(), medium, Covers.OPEN, medium)).rejection(BAND.from());
    }

    /** Φ(3) of the devices can be made; the rest fails, and is told. */
    @Test
    void devicesThatCannotBeMadeFail() {
        ToleranceAnswer answer = run(tolerances(
                new Acceptance(OptionalDouble.of(1.0), OptionalDouble.empty()),
                List.of(of("diameter", Shape.NORMAL, 0, 0.1)),
                false,
                Optional.empty()));
        assertThat(answer.refused().count()).isBetween(20L, 24L);
        assertThat(answer.refused().example()).isEqualTo("too thick");
        assertThat(answer.yield().orElseThrow().estimate()).isCloseTo(0.99865, within(2e-4));
        assertThat(answer.figures().get(0).counted())
                .isEqualTo(answer.devices() - answer.refused().count());
    }

    /** The study's own diameter twice: one input that both share, one alone. Variances add up, and so the indices. */
    @Test
    void groupsShareOneInput() {
        Uncertain shared = new Uncertain(
                "wafer",
                Shape.NORMAL,
                "",
                "",
                List.of(new Target.OfNumber(0, 0.01, true), new Target.OfNumber(1, 0.01, true)));
        ToleranceAnswer answer = run(tolerances(
                Acceptance.NONE, List.of(shared, of("density", Shape.NORMAL, 1, 0.02)), false, Optional.empty()));
        double both = 0.5
                * (rejection(1.01 * RADIUS, 1.01 * DENSITY, BAND.from())
                        - rejection(0.99 * RADIUS, 0.99 * DENSITY, BAND.from()));
        double alone =
                0.5 * (rejection(RADIUS, 1.02 * DENSITY, BAND.from()) - rejection(RADIUS, 0.98 * DENSITY, BAND.from()));
        Spread least = answer.figures().get(0);
        double variance = both * both + alone * alone;
        assertThat(least.deviation().estimate()).isCloseTo(Math.sqrt(variance), within(2e-3 * Math.sqrt(variance)));
        assertThat(least.effects().get(0).input()).isEqualTo("wafer");
        assertThat(least.effects().get(0).effect().first().estimate()).isCloseTo(both * both / variance, within(0.01));
    }

    @Test
    void endsWhenItIsPreciseEnough() {
        Tolerances tolerances =
                tolerances(Acceptance.NONE, List.of(of("diameter", Shape.NORMAL, 0, 0.02)), false, Optional.empty());
        ToleranceAnswer answer = new ToleranceQuestion(tolerances, List.of())
                .answer(
                        new Effort(1 << 17, new Precision(OptionalDouble.of(0.02), OptionalDouble.of(0.05)), 3),
                        Progress.NONE);
        assertThat(answer.devices()).isBetween(4096, 1 << 16);
        answer.fan()
                .forEach(point -> point.percentiles()
                        .forEach(percentile -> assertThat(percentile.half()).isLessThanOrEqualTo(0.02)));
    }
}
