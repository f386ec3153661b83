package flowshy.verdict.measured;

import flowshy.response.Device;
import flowshy.response.Oscillator;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** What the model says that a measurement should have given. Time factor e^{+iωt}. */
public final class Prediction {
    private final Response response;

    /**
     * Predictions of a device.
     *
     * @param device hair, suspension, medium, cover
     */
    public Prediction(Device device) {
        this.response = new Response(device);
    }

    /**
     * Whether there is a suspension that holds the hair, or none is asked for.
     *
     * @return false if the hair falls over
     */
    public boolean holds() {
        return response.oscillator().map(Oscillator::stands).orElse(true);
    }

    /**
     * The angle, or the ratio of a rejection.
     *
     * @param of what was measured
     * @param perSpeed per speed [m/s] of base or fluid, not per acceleration [m/s²]
     * @param frequency [Hz]
     * @return [rad per m/s² or per m/s], or a real ratio; empty where there is none: no suspension that holds the hair, no flow under the
     *     cover
     */
    public Optional<Complex> at(Measurand of, boolean perSpeed, double frequency) {
        ResponsePoint point = response.at(frequency);
        Optional<Complex> angle = switch (of) {
            case MOTION -> point.motion();
            case FLOW -> point.flow();
            case REJECTION ->
                Optional.of(new Complex(
                        point.motionTorque().norm() / point.flowTorque().norm()));
        };
        Complex speed = perSpeed ? new Complex(0.0, 2.0 * FastMath.PI * frequency) : Complex.ONE;
        return angle.map(speed::multiply).filter(value -> value.norm() > 0.0 && Double.isFinite(value.norm()));
    }
}
