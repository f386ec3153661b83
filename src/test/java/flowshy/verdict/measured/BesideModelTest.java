package flowshy.verdict.measured;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import flowshy.medium.PropertySource;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.stream.cover.Covers;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.random.RandomGenerator;
import org.hipparchus.random.Well19937a;
import org.junit.jupiter.api.Test;

/** Measured responses beside a known device. */
class BesideModelTest {
    private static final Medium AIR = Medium.of("air", 1.19, 1.82e-5);
    private static final Device DEVICE = device(AIR);

    private static Device device(Medium medium) {
        Hair hair = new Hair(new Cylinder(7e-4, 4.5e-5), 1200.0, OptionalDouble.empty());
        Suspension held = new Suspension(3e-9, 2e-13, 0.0, 0.0, Attitude.UPRIGHT, OptionalDouble.empty());
        return new Device(hair, Optional.of(held), medium, Covers.OPEN, medium);
    }

    private static Complex model(Measurand of, boolean speed, double frequency) {
        return new Prediction(DEVICE).at(of, speed, frequency).orElseThrow();
    }

    private static MeasuredResponse run(
            String name, Measurand of, Reading reading, OptionalDouble gain, double factor, double noise, long seed) {
        RandomGenerator random = new Well19937a(seed);
        List<MeasuredPoint> points = new ArrayList<>();
        for (int i = 0; i < 40; i++) {
            double frequency = 20.0 * Math.pow(40.0, i / 39.0);
            Complex value = model(of, reading.perSpeed(), frequency)
                    .multiply(factor)
                    .multiply(new Complex(1.0 + noise * random.nextGaussian(), noise * random.nextGaussian()));
            points.add(new MeasuredPoint(
                    frequency,
                    value.norm(),
                    of == Measurand.REJECTION ? OptionalDouble.empty() : OptionalDouble.of(value.getArgument()),
                    noise > 0.0 ? OptionalDouble.of(noise) : OptionalDouble.empty(),
                    noise > 0.0 ? OptionalDouble.of(noise) : OptionalDouble.empty()));
        }
        return new MeasuredResponse(name, of, reading, gain, points);
    }

    /** Flow per speed is flow per acceleration times iω; rejection the ratio of the two responses. */
    @Test
    void predictsWhatAnInstrumentReads() {
        double omega = 2.0 * Math.PI * 80.0;
        Complex perSpeed = model(Measurand.FLOW, true, 80.0);
        Complex expected = model(Measurand.FLOW, false, 80.0).multiply(new Complex(0.0, omega));
        assertThat(perSpeed.subtract(expected).norm()).isLessThan(1e-12 * expected.norm());
        assertThat(model(Measurand.REJECTION, false, 80.0).getReal())
                .isCloseTo(
                        model(Measurand.MOTION, false, 80.0).norm()
                                / model(Measurand.FLOW, false, 80.0).norm(),
                        within(1e-9));
    }

    @Test
    void oneFactorIsTakenOutOfAllThatShareTheReadout() {
        Reading volts = new Reading(true, false);
        List<Compared> all = BesideModel.of(
                DEVICE,
                List.of(
                        run("m", Measurand.MOTION, volts, OptionalDouble.empty(), -4.0, 0.0, 1),
                        run("f", Measurand.FLOW, new Reading(true, true), OptionalDouble.empty(), -4.0, 0.0, 2),
                        run("given", Measurand.MOTION, volts, OptionalDouble.of(2.0), 2.0, 0.0, 3)));
        assertThat(all).hasSize(4);
        assertThat(all).allSatisfy(one -> {
            assertThat(one.points()).isNotEmpty();
            assertThat(one.rms()).isLessThan(1e-6);
            assertThat(one.agreement().outcome()).isEqualTo(Agreement.Outcome.UNKNOWN);
        });
        assertThat(all.subList(0, 3))
                .allSatisfy(one -> assertThat(one.rmsPhase().getAsDouble()).isLessThan(1e-9));
        assertThat(all.get(0).gain()).isCloseTo(-4.0, within(1e-9)); // also finds that the sense is turned round
        assertThat(all.get(0).freed()).isTrue();
        assertThat(all.get(2).gain()).isEqualTo(2.0);
        assertThat(all.get(3).measured().name()).isEqualTo("m over f");
        assertThat(all.get(3).measured().of()).isEqualTo(Measurand.REJECTION);
    }

    @Test
    void aWrongGainIsTold() {
        Compared off = BesideModel.of(
                        DEVICE,
                        List.of(run(
                                "m",
                                Measurand.MOTION,
                                new Reading(false, false),
                                OptionalDouble.of(1.0),
                                1.1,
                                0.01,
                                4)))
                .get(0);
        assertThat(off.agreement().outcome()).isEqualTo(Agreement.Outcome.DIFFER);
        assertThat(off.agreement().where()).hasSize(1);
        assertThat(off.bands())
                .hasSizeGreaterThan(14)
                .allSatisfy(band -> assertThat(band.level()).isCloseTo(20.0 * Math.log10(1.1), within(0.3)));
    }

    /** A true model is called wrong in one case of twenty: 400 seeded repeats, binomial 95 % bounds about 5 %. */
    @Test
    void aTrueModelIsSeldomCalledWrong() {
        int wrong = 0;
        for (int seed = 0; seed < 400; seed++) {
            MeasuredResponse run = run(
                    "m", Measurand.MOTION, new Reading(false, false), OptionalDouble.of(1.0), 1.0, 0.02, 100 + seed);
            if (BesideModel.of(DEVICE, List.of(run)).get(0).agreement().outcome() == Agreement.Outcome.DIFFER) {
                wrong++;
            }
        }
        assertThat(wrong).isBetween(11, 30);
    }

    /** A viscosity known to 5 % explains what 5 % more of it does. */
    @Test
    void theMediumsOwnUncertaintyCounts() {
        PropertySource known = new PropertySource(
                "viscosity", "invented for this test", PropertySource.Reading.SEEN, OptionalDouble.of(0.05));
        Medium stated = new Medium(
                "air",
                Phase.UNSTATED,
                293.15,
                101325.0,
                1.19,
                1.82e-5,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                List.of(known),
                List.of());
        MeasuredResponse ratio = run("r", Measurand.REJECTION, Reading.RATIO, OptionalDouble.empty(), 1.0, 0.001, 5);
        Deviation point =
                BesideModel.of(device(stated), List.of(ratio)).get(0).points().get(3);
        double more = new Prediction(device(Medium.of("air", 1.19, 1.05 * 1.82e-5)))
                .at(Measurand.REJECTION, false, point.frequency())
                .orElseThrow()
                .getReal();
        double here = model(Measurand.REJECTION, false, point.frequency()).getReal();
        assertThat(point.modelUncertainty()).isCloseTo(Math.abs(20.0 * Math.log10(more / here)), within(1e-9));
        assertThat(point.modelUncertainty()).isGreaterThan(0.1);
    }
}
