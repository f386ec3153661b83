package flowshy.response;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.torque.TorqueModel;
import flowshy.torque.Torques;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * What a device answers to motion of its base and to flow outside, at any frequency. Time factor e^{+iωt}, peak values.
 *
 * <p>θ/A = T / (S + S_g + iωR − ω²(J + J_plate + J_fluid)); without a suspension only the torques are known, and their ratio.
 */
public final class Response {
    /** Boltzmann constant [J/K], exact in the SI of 2019. */
    public static final double BOLTZMANN = 1.380649e-23;

    private final Device device;
    private final TorqueModel model;
    /** Made when first asked for, null until then: a map of the rejection never asks. */
    private volatile Oscillator oscillator;

    /**
     * The response of a device.
     *
     * @param device hair, suspension, medium and cover
     */
    public Response(Device device) {
        this(device, TorqueModel.of(device.hair(), device.around(), device.pivotDepth(), device.cover()));
    }

    private Response(Device device, TorqueModel model) {
        this.device = device;
        this.model = model;
    }

    /**
     * The same for a few frequencies alone: a hair that is solved whole is solved at each of them and no others.
     *
     * @return less work for one of many devices
     */
    public Response alone() {
        return new Response(device, model.alone());
    }

    /**
     * Says over which frequencies the response will be asked for.
     *
     * @param lowest [Hz]
     * @param highest above the lowest [Hz]
     */
    public void expect(double lowest, double highest) {
        model.expect(2.0 * FastMath.PI * lowest, 2.0 * FastMath.PI * highest);
    }

    /**
     * The device.
     *
     * @return as given
     */
    public Device device() {
        return device;
    }

    /**
     * The device as an oscillator in its medium.
     *
     * @return empty without a suspension
     */
    public Optional<Oscillator> oscillator() {
        if (oscillator == null && device.suspension().isPresent()) {
            oscillator = new Oscillator(
                    device.hair(), device.suspension().get(), Optional.of(device.around()), device.cover());
        }
        return Optional.ofNullable(oscillator);
    }

    /**
     * Torques at a frequency.
     *
     * @param frequency [Hz]
     * @return torques per unit acceleration
     */
    public Torques torques(double frequency) {
        return model.at(2.0 * FastMath.PI * frequency);
    }

    /**
     * Rejection: motion response over flow response at equal acceleration. The suspension cancels.
     *
     * @param frequency [Hz]
     * @return 20 lg |T_motion/T_flow| [dB]; +∞ where no flow reaches the hair
     */
    public double rejection(double frequency) {
        return rejection(torques(frequency));
    }

    private double rejection(Torques torques) {
        Complex factor = device.cover().factor(torques.omega(), device.around());
        return 20.0
                * FastMath.log10(
                        torques.motion(factor).norm() / torques.flow(factor).norm());
    }

    /**
     * What tip and wall do to the rejection.
     *
     * @param frequency [Hz]
     * @return rejection less that of strip theory [dB]; absent under strip theory, or where no flow reaches the hair
     */
    public OptionalDouble finiteLength(double frequency) {
        return finiteLength(torques(frequency));
    }

    private OptionalDouble finiteLength(Torques torques) {
        Optional<Complex> factor = model.streamFactor(torques.omega());
        if (factor.isEmpty()) {
            return OptionalDouble.empty();
        }
        Torques strips = new Torques(
                torques.omega(),
                torques.flow().divide(factor.get()),
                torques.open().subtract(torques.carried()).divide(factor.get()).add(torques.carried()),
                torques.carried(),
                torques.fluidInertia());
        double change = rejection(torques) - rejection(strips);
        return Double.isFinite(change) ? OptionalDouble.of(change) : OptionalDouble.empty();
    }

    /**
     * Everything at one frequency.
     *
     * @param frequency [Hz]
     * @return the point
     */
    public ResponsePoint at(double frequency) {
        double omega = 2.0 * FastMath.PI * frequency;
        Torques torques = model.at(omega);
        Complex factor = device.cover().factor(omega, device.around());
        Complex motionTorque = torques.motion(factor);
        Complex flowTorque = torques.flow(factor);
        Optional<Complex> denominator =
                oscillator().filter(Oscillator::stands).map(swing -> swing.denominator(omega, torques.fluidInertia()));
        OptionalDouble thermal = thermalNoise(omega, torques, motionTorque);
        OptionalDouble readout = denominator.isPresent()
                        && device.suspension().orElseThrow().readoutNoise().isPresent()
                ? OptionalDouble.of(
                        device.suspension().orElseThrow().readoutNoise().getAsDouble()
                                * denominator.get().norm()
                                / motionTorque.norm())
                : OptionalDouble.empty();
        return new ResponsePoint(
                frequency,
                motionTorque,
                flowTorque,
                denominator.map(motionTorque::divide),
                denominator.map(flowTorque::divide),
                new OscillatingCylinder(device.hair().profile().largestRadius(), device.around()).womersley(omega),
                finiteLength(torques),
                thermal,
                readout);
    }

    private OptionalDouble thermalNoise(double omega, Torques torques, Complex motionTorque) {
        Optional<Oscillator> swing = oscillator();
        if (swing.isEmpty()) {
            return OptionalDouble.empty();
        }
        double damping = swing.get().totalDamping(omega, torques.fluidInertia());
        double torque = FastMath.sqrt(4.0 * BOLTZMANN * device.around().temperature() * damping);
        return OptionalDouble.of(torque / motionTorque.norm());
    }
}
