package flowshy.verdict.measured;

import flowshy.response.Device;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.hipparchus.util.MathUtils;

/**
 * Lays measured responses beside the model of a device. Nothing is fitted; where the gain of a readout is not known, one factor common to
 * all responses of that kind is taken out, the weighted mean of measured over predicted, and the sense in which the readout counts.
 */
public final class BesideModel {
    private static final double DECIBEL = 20.0 / FastMath.log(10.0);

    private final Prediction prediction;
    private final ModelUncertainty uncertainty;
    private final List<MeasuredResponse> responses;

    private BesideModel(Device device, List<MeasuredResponse> responses) {
        this.prediction = new Prediction(device);
        this.uncertainty = new ModelUncertainty(device, prediction);
        this.responses = responses;
    }

    /**
     * Lays responses beside the model.
     *
     * @param device the device that was measured
     * @param responses what was measured on it
     * @return one a response, same order; then the rejection that a motion and a flow give together, if both were measured
     */
    public static List<Compared> of(Device device, List<MeasuredResponse> responses) {
        List<MeasuredResponse> all = new ArrayList<>(responses);
        MeasuredRejection.from(responses).ifPresent(all::add);
        BesideModel beside = new BesideModel(device, all);
        return all.stream().map(beside::compared).toList();
    }

    private Compared compared(MeasuredResponse response) {
        boolean ratio = response.of() == Measurand.REJECTION;
        boolean freed = !ratio && response.gain().isEmpty();
        double gain = ratio
                ? 1.0
                : response.gain().orElseGet(() -> common(response.reading().volts()));
        List<Deviation> points = new ArrayList<>();
        for (MeasuredPoint point : response.points()) {
            predicted(response, point).ifPresent(value -> points.add(deviation(response, point, value.multiply(gain))));
        }
        return Compared.of(response, gain, freed, points);
    }

    private Optional<Complex> predicted(MeasuredResponse response, MeasuredPoint point) {
        return prediction.at(response.of(), response.reading().perSpeed(), point.frequency());
    }

    /** The factor common to all responses whose gain is not known, angles and voltages apart. */
    private double common(boolean volts) {
        List<MeasuredResponse> free = responses.stream()
                .filter(r -> r.of() != Measurand.REJECTION
                        && r.gain().isEmpty()
                        && r.reading().volts() == volts)
                .toList();
        boolean certain = free.stream().allMatch(MeasuredResponse::certain);
        double weights = 0.0;
        double logs = 0.0;
        double sense = 0.0;
        for (MeasuredResponse response : free) {
            for (MeasuredPoint point : response.points()) {
                Optional<Complex> model = predicted(response, point);
                if (model.isPresent()) {
                    double spread = certain ? point.uncertainty().getAsDouble() : 1.0;
                    double weight = 1.0 / (spread * spread);
                    weights += weight;
                    logs += weight
                            * FastMath.log(point.amplitude() / model.get().norm());
                    sense += point.phase().isPresent()
                            ? weight
                                    * FastMath.cos(point.phase().getAsDouble()
                                            - model.get().getArgument())
                            : 0.0;
                }
            }
        }
        return weights > 0.0 ? FastMath.copySign(FastMath.exp(logs / weights), sense < 0.0 ? -1.0 : 1.0) : 1.0;
    }

    private Deviation deviation(MeasuredResponse response, MeasuredPoint point, Complex model) {
        ModelUncertainty.Spread spread =
                uncertainty.at(response.of(), response.reading().perSpeed(), point.frequency());
        OptionalDouble phase = point.phase().isPresent()
                ? OptionalDouble.of(MathUtils.normalizeAngle(point.phase().getAsDouble() - model.getArgument(), 0.0))
                : OptionalDouble.empty();
        return new Deviation(
                point.frequency(),
                point.amplitude(),
                model.norm(),
                point.phase(),
                response.of() == Measurand.REJECTION ? OptionalDouble.empty() : OptionalDouble.of(model.getArgument()),
                DECIBEL * FastMath.log(point.amplitude() / model.norm()),
                phase,
                point.uncertainty().isPresent()
                        ? OptionalDouble.of(DECIBEL * point.uncertainty().getAsDouble())
                        : OptionalDouble.empty(),
                phase.isPresent() ? point.phaseUncertainty() : OptionalDouble.empty(),
                DECIBEL * spread.level(),
                spread.phase());
    }
}
