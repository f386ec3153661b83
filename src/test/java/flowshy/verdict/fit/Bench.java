package flowshy.verdict.fit;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.stream.cover.Covers;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredPoint;
import flowshy.verdict.measured.MeasuredResponse;
import flowshy.verdict.measured.Prediction;
import flowshy.verdict.measured.Reading;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.random.RandomGenerator;
import org.hipparchus.random.Well19937a;

/** A device that is known, and what a bench would read of it, with normal noise of a known size. */
final class Bench {
    static final Band BAND = new Band(20.0, 1000.0);
    static final double STIFFNESS = 3.1e-9;
    static final double DAMPING = 2.4e-13;
    static final double GAIN = 3.3;
    static final double DENSITY = 1250.0;
    private static final Medium AIR = Medium.of("air", 1.19, 1.82e-5);

    static final Freed FREE_STIFFNESS =
            new Freed("suspension.stiffness", Freed.Kind.STIFFNESS, "N.m/rad", 2.6e-9, 1e-20, 1e6);
    static final Freed FREE_DAMPING = new Freed("suspension.damping", Freed.Kind.DAMPING, "N.m.s/rad", 5e-13, 0.0, 1e6);
    static final Freed FREE_DENSITY = new Freed("hair.density", Freed.Kind.STUDY, "kg/m3", 1180.0, 1.0, 3e4);

    private Bench() {}

    static Device device(double stiffness, double damping, double density) {
        Hair hair = new Hair(new Cylinder(7e-4, 4.5e-5), density, OptionalDouble.empty());
        Suspension held = new Suspension(stiffness, damping, 0.0, 0.0, Attitude.UPRIGHT, OptionalDouble.empty());
        return new Device(hair, Optional.of(held), AIR, Covers.OPEN, AIR);
    }

    /** The device as a study would have it: off in stiffness and damping. */
    static Device stated() {
        return device(FREE_STIFFNESS.start(), FREE_DAMPING.start(), DENSITY);
    }

    /** A space of the hair's density, as a study makes one. */
    static DesignSpace density() {
        return new DesignSpace() {
            @Override
            public List<String> keys() {
                return List.of("hair.density");
            }

            @Override
            public BandsQuestion at(double... values) {
                return new BandsQuestion(
                        device(FREE_STIFFNESS.start(), FREE_DAMPING.start(), values[0]),
                        BAND,
                        new Acceptance(OptionalDouble.empty(), OptionalDouble.empty()));
            }

            @Override
            public DesignSpace still() {
                return this;
            }
        };
    }

    /** A run over 25 frequencies; noise alike in both parts of the phasor, stated or not. */
    static MeasuredResponse run(String name, Measurand of, boolean volts, double noise, boolean stated, long seed) {
        RandomGenerator random = new Well19937a(seed);
        Prediction truth = new Prediction(device(STIFFNESS, DAMPING, DENSITY));
        List<MeasuredPoint> points = new ArrayList<>();
        for (int i = 0; i < 25; i++) {
            double frequency = 25.0 * Math.pow(32.0, i / 24.0);
            Complex value = truth.at(of, of == Measurand.FLOW, frequency)
                    .orElseThrow()
                    .multiply(volts ? GAIN : 1.0)
                    .multiply(new Complex(noise * random.nextGaussian(), noise * random.nextGaussian()).exp());
            boolean ratio = of == Measurand.REJECTION;
            points.add(new MeasuredPoint(
                    frequency,
                    value.norm(),
                    ratio ? OptionalDouble.empty() : OptionalDouble.of(value.getArgument()),
                    stated ? OptionalDouble.of(noise) : OptionalDouble.empty(),
                    stated ? OptionalDouble.of(noise) : OptionalDouble.empty()));
        }
        Reading reading = of == Measurand.REJECTION ? Reading.RATIO : new Reading(volts, of == Measurand.FLOW);
        return new MeasuredResponse(
                name,
                of,
                reading,
                volts || of == Measurand.REJECTION ? OptionalDouble.empty() : OptionalDouble.of(1.0),
                points);
    }
}
