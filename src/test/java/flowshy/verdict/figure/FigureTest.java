package flowshy.verdict.figure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.response.Suspension;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.DeviceFacts;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.Limit;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Each named quantity against a formula by hand, or the number that an answer to the main question gives. */
class FigureTest {
    private static final double LENGTH = 7.3e-4;
    private static final double RADIUS = 4.4e-5;
    private static final double DENSITY = 1260.0;
    private static final double DEPTH = 6e-6;
    private static final double MODULUS = 3.1e9;
    private static final double AREA = Math.PI * RADIUS * RADIUS;
    private static final Medium AIR = Medium.of("air", 1.19, 1.83e-5);
    private static final Band BAND = new Band(12.0, 900.0);
    private static final double AT = 70.0;
    private static final Suspension HELD =
            new Suspension(3e-9, 5e-13, 4e-18, DEPTH, Attitude.UPRIGHT, OptionalDouble.of(2e-9));

    private static Device device(Optional<Suspension> held, OptionalDouble modulus, Cover cover, Medium around) {
        return new Device(new Hair(new Cylinder(LENGTH, RADIUS), DENSITY, modulus), held, AIR, cover, around);
    }

    private static final Device DEVICE = device(Optional.of(HELD), OptionalDouble.of(MODULUS), Covers.OPEN, AIR);
    private static final Device PLAIN = device(Optional.empty(), OptionalDouble.empty(), Covers.OPEN, AIR);

    private static Found of(Figure figure, Device device) {
        return figure.of(new Evaluated(new BandsQuestion(device, BAND, Acceptance.NONE), AT));
    }

    private static double value(Figure figure) {
        Found found = of(figure, DEVICE);
        assertThat(found.state()).isEqualTo(Found.State.NUMBER);
        return found.value();
    }

    /** Handbook solids: a cylinder about an axis below its end. */
    @Test
    void theHairAsASolid() {
        double top = LENGTH + DEPTH;
        double second = AREA * (top * top * top - DEPTH * DEPTH * DEPTH) / 3.0 + AREA * RADIUS * RADIUS / 4.0 * LENGTH;
        assertThat(value(Figure.VOLUME)).isCloseTo(AREA * LENGTH, relative(AREA * LENGTH));
        assertThat(value(Figure.MASS)).isCloseTo(DENSITY * AREA * LENGTH, relative(DENSITY * AREA * LENGTH));
        assertThat(value(Figure.INERTIA)).isCloseTo(DENSITY * second, relative(DENSITY * second));
        double first = DENSITY * AREA * LENGTH * (0.5 * LENGTH + DEPTH);
        assertThat(value(Figure.INERTIAL_TORQUE)).isCloseTo(first, relative(first));
        assertThat(value(Figure.FOOTPRINT)).isEqualTo(2.0 * RADIUS);
        assertThat(value(Figure.LENGTH)).isEqualTo(LENGTH);
        assertThat(value(Figure.SLENDERNESS)).isEqualTo(LENGTH / (2.0 * RADIUS));
    }

    private static org.assertj.core.data.Offset<Double> relative(double value) {
        return within(1e-12 * Math.abs(value));
    }

    /** Euler and Bernoulli: β₁ = 1.87510407 (handbook), in a fluid without weight; EI/(0.9 L) by the definition of EI/L. */
    @Test
    void theHairAsABeam() {
        Medium thin = Medium.of("thin", 1e-9, 1e-12);
        double stiff = MODULUS * Math.PI * Math.pow(RADIUS, 4) / 4.0;
        double beta = 1.8751040687;
        double frequency = beta * beta / (2.0 * Math.PI * LENGTH * LENGTH) * Math.sqrt(stiff / (DENSITY * AREA));
        Device device = device(Optional.of(HELD), OptionalDouble.of(MODULUS), Covers.OPEN, thin);
        double found = of(Figure.BENDING_FREQUENCY, device).value();
        assertThat(found).isCloseTo(frequency, within(1e-6 * frequency));
        assertThat(value(Figure.BENDING_STIFFNESS)).isCloseTo(stiff / (0.9 * LENGTH), relative(stiff / (0.9 * LENGTH)));
        assertThat(value(Figure.BENDING_STIFFNESS_RATIO))
                .isCloseTo(stiff / (0.9 * LENGTH) / 3e-9, relative(stiff / (0.9 * LENGTH) / 3e-9));
        assertThat(of(Figure.BENDING_RATIO, device).value())
                .isEqualTo(found / of(Figure.RESONANCE, device).value());
    }

    /** Every number that an answer gives as well, to its last bit. */
    @Test
    void theNumbersAreThoseOfTheAnswer() {
        BandsAnswer answer = new BandsQuestion(DEVICE, BAND, Acceptance.NONE).answer(List.of(AT));
        DeviceFacts facts = answer.facts();
        ResponsePoint point = answer.points().get(0);
        assertThat(value(Figure.MASS)).isEqualTo(facts.mass());
        assertThat(value(Figure.INERTIA)).isEqualTo(facts.inertia());
        assertThat(value(Figure.INERTIAL_TORQUE)).isEqualTo(facts.inertialTorque());
        assertThat(value(Figure.RESONANCE))
                .isEqualTo(facts.medium().orElseThrow().resonance());
        assertThat(value(Figure.QUALITY))
                .isEqualTo(facts.medium().orElseThrow().decay().quality());
        assertThat(value(Figure.BENDING_FREQUENCY))
                .isEqualTo(facts.bendingFrequency().orElseThrow());
        assertThat(value(Figure.BENDING_STIFFNESS))
                .isEqualTo(facts.bendingStiffness().orElseThrow());
        assertThat(value(Figure.REJECTION)).isEqualTo(point.rejection());
        assertThat(value(Figure.SENSITIVITY))
                .isEqualTo(point.motion().orElseThrow().norm());
        assertThat(value(Figure.EQUIVALENT)).isEqualTo(point.equivalent());
        assertThat(value(Figure.LEAST_REJECTION))
                .isEqualTo(answer.least().orElseThrow().rejection());
        assertThat(of(Figure.LEAST_REJECTION, DEVICE).at())
                .hasValue(answer.least().orElseThrow().frequency());
        assertThat(value(Figure.REJECTION_FROM)).isEqualTo(answer.bands().get(0).rejectionFrom());
        ReadingBand last = answer.bands().get(answer.bands().size() - 1);
        assertThat(value(Figure.REJECTION_TO)).isEqualTo(last.rejectionTo());
        List<ReadingBand> motion = answer.bands().stream()
                .filter(band -> band.reads() == Reads.MOTION)
                .toList();
        assertThat(motion).hasSize(1);
        assertThat(answer.bands()).hasSize(2); // mixed below, so that widths are not those of the whole band
        double from = motion.get(0).from();
        assertThat(value(Figure.MOTION_WIDTH)).isEqualTo(900.0 - from);
        assertThat(value(Figure.MOTION_OCTAVES)).isCloseTo(Math.log(900.0 / from) / Math.log(2.0), within(1e-12));
        assertThat(value(Figure.MOTION_FROM)).isEqualTo(from);
        assertThat(value(Figure.MOTION_TO)).isEqualTo(900.0);
    }

    /** A speed of unit amplitude is an acceleration ω; noise adds up in squares; the equivalent is ω over the ratio of responses. */
    @Test
    void speedsAndNoiseByHand() {
        ResponsePoint point = new Response(DEVICE).at(AT);
        double omega = 2.0 * Math.PI * AT;
        double flow = omega * point.flow().orElseThrow().norm();
        assertThat(value(Figure.FLOW_SENSITIVITY)).isCloseTo(flow, relative(flow));
        double ratio = Math.pow(10.0, value(Figure.REJECTION) / 20.0);
        assertThat(value(Figure.EQUIVALENT)).isCloseTo(omega / ratio, within(1e-11 * omega / ratio));
        double thermal = point.thermalNoise().orElseThrow();
        double readout = 2e-9 / value(Figure.SENSITIVITY);
        double both = Math.sqrt(thermal * thermal + readout * readout);
        assertThat(readout).isGreaterThan(0.05 * thermal);
        assertThat(value(Figure.NOISE)).isCloseTo(both, within(1e-12 * both));
    }

    /** Noise over a band is the root of the area under its square: here by trapezoids over a finer, even grid. */
    @Test
    void noiseOverTheBandByHand() {
        Response response = new Response(DEVICE);
        double sum = 0.0;
        double worst = 0.0;
        int steps = 20_000;
        double width = Math.log(900.0 / 12.0) / steps;
        for (int i = 0; i <= steps; i++) {
            double frequency = 12.0 * Math.exp(i * width);
            ResponsePoint point = response.at(frequency);
            double square = Math.pow(point.thermalNoise().orElseThrow(), 2)
                    + Math.pow(point.readoutNoise().orElseThrow(), 2);
            worst = Math.max(worst, Math.sqrt(square));
            sum += (i == 0 || i == steps ? 0.5 : 1.0) * square * frequency * width;
        }
        assertThat(value(Figure.NOISE_RMS)).isCloseTo(Math.sqrt(sum), within(3e-4 * Math.sqrt(sum)));
        assertThat(value(Figure.WORST_NOISE)).isCloseTo(worst, within(1e-4 * worst));
    }

    /** (ρ_h − ρ) g P[1] over S for a level hair; none for the others. */
    @Test
    void tiltByGravityByHand() {
        Suspension level = new Suspension(3e-9, 5e-13, 4e-18, DEPTH, Attitude.HORIZONTAL, OptionalDouble.empty());
        double moment = (DENSITY - 1.19) * 9.80665 * AREA * LENGTH * (0.5 * LENGTH + DEPTH);
        Device device = device(Optional.of(level), OptionalDouble.empty(), Covers.OPEN, AIR);
        assertThat(of(Figure.GRAVITY_TILT, device).value()).isCloseTo(moment / 3e-9, relative(moment / 3e-9));
        assertThat(of(Figure.STATIC_TILT, device).value()).isCloseTo(moment / 3e-9, relative(moment / 3e-9));
        assertThat(value(Figure.GRAVITY_TILT)).isZero();
    }

    @Test
    void roomOverTheTip() {
        Device roofed = device(Optional.empty(), OptionalDouble.empty(), new RoofedCover(1.2e-3, 5e-3), AIR);
        assertThat(of(Figure.TIP_CLEARANCE, roofed).value()).isEqualTo(1.2e-3 - LENGTH);
        Cover can = new SealedCover(Optional.of(new Cavity(3e-3, 1.5e-3)));
        Device sealed = device(Optional.empty(), OptionalDouble.empty(), can, AIR);
        assertThat(of(Figure.TIP_CLEARANCE, sealed).value()).isEqualTo(1.5e-3 - LENGTH);
        assertThat(of(Figure.TIP_CLEARANCE, DEVICE).state()).isEqualTo(Found.State.NOT_STATED);
    }

    @Test
    void theLargestSpeedKeepsTheErrorLimit() {
        Acceptance asked = new Acceptance(OptionalDouble.empty(), OptionalDouble.of(0.3));
        Found speed = Figure.LARGEST_SPEED.of(new Evaluated(new BandsQuestion(DEVICE, BAND, asked), AT));
        assertThat(speed.value() * value(Figure.EQUIVALENT)).isCloseTo(0.3, within(1e-14));
        assertThat(of(Figure.LARGEST_SPEED, DEVICE).reason()).isEqualTo("no error limit is stated");
    }

    @Test
    void whatIsMissingSaysWhy() {
        for (Figure figure :
                List.of(Figure.RESONANCE, Figure.QUALITY, Figure.SENSITIVITY, Figure.NOISE, Figure.NOISE_RMS)) {
            assertThat(of(figure, PLAIN).state()).isEqualTo(Found.State.NOT_STATED);
            assertThat(of(figure, PLAIN).reason()).isEqualTo("no suspension is stated");
            assertThat(of(figure, PLAIN).number()).isEmpty();
        }
        assertThat(of(Figure.BENDING_FREQUENCY, PLAIN).reason()).isEqualTo("hair.youngs-modulus is not stated");
        assertThat(of(Figure.ERROR, DEVICE).reason()).isEqualTo("no surroundings are given");
        Suspension weak = new Suspension(1e-14, 5e-13, 4e-18, DEPTH, Attitude.UPRIGHT, OptionalDouble.empty());
        Device falls = device(Optional.of(weak), OptionalDouble.empty(), Covers.OPEN, AIR);
        assertThat(of(Figure.RESONANCE, falls).state()).isEqualTo(Found.State.HAS_NONE);
        Device sealed = device(Optional.of(HELD), OptionalDouble.empty(), Covers.SEALED, AIR);
        assertThat(of(Figure.LEAST_REJECTION, sealed).state()).isEqualTo(Found.State.UNBOUNDED);
        assertThat(of(Figure.REJECTION, sealed).value()).isInfinite();
        assertThat(of(Figure.MOTION_WIDTH, sealed).value()).isEqualTo(888.0);
        Device floating =
                device(Optional.of(HELD), OptionalDouble.empty(), Covers.SEALED, Medium.of("match", DENSITY, 1e-3));
        assertThat(of(Figure.LEAST_REJECTION, floating).state()).isEqualTo(Found.State.HAS_NONE);
        assertThat(of(Figure.MOTION_WIDTH, floating).state()).isEqualTo(Found.State.HAS_NONE);
    }

    @ParameterizedTest
    @EnumSource(Figure.class)
    void everyQuantityIsFoundByItsName(Figure figure) {
        assertThat(Figure.named(figure.word())).contains(figure);
        assertThat(figure.word()).matches("[a-z]+(-[a-z]+)*");
        assertThat(figure.column())
                .matches("[a-z0-9]+(_[a-z0-9]+)*")
                .startsWith(figure.word().replace('-', '_'));
        assertThat(of(figure, DEVICE)).isNotNull();
        assertThat(of(figure, DEVICE).number().isPresent())
                .isEqualTo(of(figure, DEVICE).reason().isEmpty());
    }

    @Test
    void namesAndColumnsAreUnlikeEachOther() {
        assertThat(new HashSet<>(Figure.names())).hasSize(Figure.values().length);
        assertThat(Arrays.stream(Figure.values()).map(Figure::column)).doesNotHaveDuplicates();
        assertThat(Figure.named("weight")).isEmpty();
    }

    private static Limit limit(Device device, FigureLimit asked) {
        Acceptance acceptance = new Acceptance(OptionalDouble.empty(), OptionalDouble.empty(), List.of(asked));
        return new BandsQuestion(device, BAND, acceptance)
                .answer()
                .verdict()
                .limits()
                .get(0);
    }

    @Test
    void limitsAreJudgedInTheirSense() {
        double mass = value(Figure.MASS);
        FigureLimit light = new FigureLimit(Figure.MASS, Sense.AT_MOST, 1.001 * mass);
        assertThat(limit(DEVICE, light).decision()).isEqualTo(Decision.MEETS);
        assertThat(limit(DEVICE, light).found()).hasValue(mass);
        FigureLimit lighter = new FigureLimit(Figure.MASS, Sense.AT_MOST, 0.999 * mass);
        assertThat(limit(DEVICE, lighter).decision()).isEqualTo(Decision.FAILS);
        double resonance = value(Figure.RESONANCE);
        FigureLimit low = new FigureLimit(Figure.RESONANCE, Sense.AT_LEAST, 0.999 * resonance);
        assertThat(limit(DEVICE, low).decision()).isEqualTo(Decision.MEETS);
        FigureLimit high = new FigureLimit(Figure.RESONANCE, Sense.AT_MOST, 0.999 * resonance);
        assertThat(limit(DEVICE, high).decision()).isEqualTo(Decision.FAILS);
        assertThat(limit(PLAIN, low).decision()).isEqualTo(Decision.NOT_ASKED);
        assertThat(limit(PLAIN, low).reason()).isEqualTo("no suspension is stated");
        Device sealed = device(Optional.of(HELD), OptionalDouble.empty(), Covers.SEALED, AIR);
        FigureLimit edge = new FigureLimit(Figure.REJECTION_FROM, Sense.AT_LEAST, 60.0);
        assertThat(limit(sealed, edge).decision()).isEqualTo(Decision.MEETS);
        assertThat(limit(sealed, edge).found()).isEmpty();
    }
}
