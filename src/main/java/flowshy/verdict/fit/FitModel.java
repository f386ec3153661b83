package flowshy.verdict.fit;

import flowshy.response.Device;
import flowshy.response.Oscillator;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.response.Suspension;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredPoint;
import flowshy.verdict.measured.MeasuredResponse;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.MathUtils;

/**
 * Measured less predicted, by free numbers. The torques are worked out anew only where a number of the study changes; stiffness and damping
 * enter the denominator as they stand.
 */
final class FitModel {
    /** What a number that makes no device leaves; the search turns back from it. */
    static final double NO_DEVICE = 1e6;

    /** Torques of this many designs are kept: one search asks for each a few times. */
    private static final int KEPT = 64;

    private final DesignSpace space;
    private final Device base;
    private final List<Freed> free;
    private final List<MeasuredResponse> responses;
    private final List<MeasuredSwing> swings;
    private final Map<List<Double>, Design> known = new LinkedHashMap<>();
    private final int count;
    private boolean voltsTurned;
    private boolean anglesTurned;

    FitModel(
            DesignSpace space,
            Device base,
            List<Freed> free,
            List<MeasuredResponse> responses,
            List<MeasuredSwing> swings) {
        this.space = space;
        this.base = base;
        this.free = List.copyOf(free);
        this.responses = List.copyOf(responses);
        this.swings = List.copyOf(swings);
        this.count = numbers().size();
    }

    /** Says that the readouts turn the sense round; found once, before the search. */
    void turned(boolean volts, boolean angles) {
        voltsTurned = volts;
        anglesTurned = angles;
    }

    /** Torques over each response's frequencies, and the denominators with the base's suspension. */
    private record Design(Device device, List<List<ResponsePoint>> points) {}

    /** Residuals in the order of {@link #numbers}: of levels in natural logarithms, of phases in radians. */
    double[] residuals(double[] values) {
        double[] rest = new double[count];
        Optional<Design> design = design(values);
        if (design.isEmpty()) {
            Arrays.fill(rest, NO_DEVICE);
            return rest;
        }
        Device device = design.get().device();
        Optional<Suspension> held = device.suspension().map(stood -> suspension(stood, values));
        int next = 0;
        for (int r = 0; r < responses.size(); r++) {
            MeasuredResponse response = responses.get(r);
            for (int i = 0; i < response.points().size(); i++) {
                MeasuredPoint point = response.points().get(i);
                Optional<Complex> model =
                        predicted(response, design.get().points().get(r).get(i), device.suspension(), held, values);
                rest[next++] = model.map(m -> FastMath.log(point.amplitude() / m.norm()))
                        .orElse(NO_DEVICE);
                if (point.phase().isPresent()) {
                    rest[next++] = model.map(
                                    m -> MathUtils.normalizeAngle(point.phase().getAsDouble() - m.getArgument(), 0.0))
                            .orElse(NO_DEVICE);
                }
            }
        }
        for (MeasuredSwing swing : swings) {
            Optional<Complex> root = held.flatMap(h -> root(device, h));
            rest[next++] = root.map(s -> FastMath.log(swing.swing().frequency() * 2.0 * FastMath.PI / s.getImaginary()))
                    .orElse(NO_DEVICE);
            rest[next++] = root.map(s -> FastMath.log(-swing.swing().decayTime() * s.getReal()))
                    .orElse(NO_DEVICE);
        }
        return rest;
    }

    /** One a residual: where it comes from and its standard deviation, 1 where none is stated. */
    List<Datum> numbers() {
        List<Datum> numbers = new ArrayList<>();
        for (int r = 0; r < responses.size(); r++) {
            MeasuredResponse response = responses.get(r);
            boolean certain = response.certain();
            for (MeasuredPoint point : response.points()) {
                numbers.add(new Datum(
                        r,
                        response.name(),
                        point.frequency(),
                        Residual.Part.LEVEL,
                        certain ? point.uncertainty().orElseThrow() : 1.0,
                        certain));
                if (point.phase().isPresent()) {
                    numbers.add(new Datum(
                            r,
                            response.name(),
                            point.frequency(),
                            Residual.Part.PHASE,
                            certain ? point.phaseUncertainty().orElseThrow() : 1.0,
                            certain));
                }
            }
        }
        for (int s = 0; s < swings.size(); s++) {
            MeasuredSwing swing = swings.get(s);
            double frequency = swing.swing().frequency();
            numbers.add(new Datum(
                    responses.size() + s,
                    swing.name(),
                    frequency,
                    Residual.Part.SWING,
                    swing.swing().frequencyUncertainty() / frequency,
                    true));
            numbers.add(new Datum(
                    responses.size() + s,
                    swing.name(),
                    frequency,
                    Residual.Part.DECAY,
                    swing.swing().decayUncertainty() / swing.swing().decayTime(),
                    true));
        }
        return numbers;
    }

    /** Where a residual comes from. */
    record Datum(int source, String name, double frequency, Residual.Part part, double deviation, boolean stated) {}

    /** The device with these numbers; empty where they make none. */
    Optional<Device> device(double[] values) {
        return design(values).map(design -> {
            Device made = design.device();
            return made.suspension().isEmpty()
                    ? made
                    : new Device(
                            made.hair(),
                            made.suspension().map(stood -> suspension(stood, values)),
                            made.outside(),
                            made.cover(),
                            made.around());
        });
    }

    /** The gain behind which a response was read. */
    double gain(MeasuredResponse response, double[] values) {
        if (response.of() == Measurand.REJECTION) {
            return 1.0;
        }
        if (response.gain().isPresent()) {
            return response.gain().getAsDouble();
        }
        boolean volts = response.reading().volts();
        double size =
                value(volts ? Freed.Kind.VOLTS : Freed.Kind.ANGLES, values).orElse(1.0);
        return (volts ? voltsTurned : anglesTurned) ? -size : size;
    }

    private Optional<Complex> predicted(
            MeasuredResponse response,
            ResponsePoint point,
            Optional<Suspension> stood,
            Optional<Suspension> held,
            double[] values) {
        if (response.of() == Measurand.REJECTION) {
            double ratio = point.motionTorque().norm() / point.flowTorque().norm();
            return Optional.of(new Complex(ratio)).filter(r -> Double.isFinite(ratio) && ratio > 0.0);
        }
        boolean motion = response.of() == Measurand.MOTION;
        Complex torque = motion ? point.motionTorque() : point.flowTorque();
        Optional<Complex> angle = motion ? point.motion() : point.flow();
        if (angle.isEmpty() || !(angle.get().norm() > 0.0)) {
            return Optional.empty();
        }
        double omega = 2.0 * FastMath.PI * point.frequency();
        Complex denominator = torque.divide(angle.get())
                .add(new Complex(
                        held.orElseThrow().stiffness() - stood.orElseThrow().stiffness(),
                        omega
                                * (held.orElseThrow().damping()
                                        - stood.orElseThrow().damping())));
        Complex turned = torque.divide(denominator).multiply(gain(response, values));
        return Optional.of(response.reading().perSpeed() ? turned.multiply(new Complex(0.0, omega)) : turned);
    }

    private static Optional<Complex> root(Device device, Suspension held) {
        Oscillator swing = new Oscillator(device.hair(), held, Optional.of(device.around()), device.cover());
        return swing.stands() ? swing.decay().root() : Optional.empty();
    }

    private Suspension suspension(Suspension stood, double[] values) {
        return new Suspension(
                value(Freed.Kind.STIFFNESS, values).orElse(stood.stiffness()),
                value(Freed.Kind.DAMPING, values).orElse(stood.damping()),
                stood.plateInertia(),
                stood.pivotDepth(),
                stood.attitude(),
                stood.readoutNoise(),
                stood.film());
    }

    private Optional<Double> value(Freed.Kind kind, double[] values) {
        for (int i = 0; i < free.size(); i++) {
            if (free.get(i).kind() == kind) {
                return Optional.of(values[i]);
            }
        }
        return Optional.empty();
    }

    private Optional<Design> design(double[] values) {
        List<Double> numbers = new ArrayList<>();
        for (int i = 0; i < free.size(); i++) {
            if (values[i] > free.get(i).most()) {
                return Optional.empty();
            }
            if (free.get(i).kind() == Freed.Kind.STUDY) {
                numbers.add(values[i]);
            }
        }
        Design kept = known.get(numbers);
        if (kept != null) {
            return Optional.of(kept);
        }
        Device device = base;
        if (!numbers.isEmpty()) {
            try {
                device = space.at(numbers.stream()
                                .mapToDouble(Double::doubleValue)
                                .toArray())
                        .device();
            } catch (NoDesignException e) {
                return Optional.empty();
            }
        }
        Response response = new Response(device);
        List<List<ResponsePoint>> points = responses.stream()
                .map(measured -> measured.points().stream()
                        .map(point -> response.at(point.frequency()))
                        .toList())
                .toList();
        if (known.size() >= KEPT) {
            known.clear();
        }
        Design made = new Design(device, points);
        known.put(numbers, made);
        return Optional.of(made);
    }
}
