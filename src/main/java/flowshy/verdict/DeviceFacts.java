package flowshy.verdict;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Cantilever;
import flowshy.hair.Hair;
import flowshy.hair.Moments;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.response.Decay;
import flowshy.response.Device;
import flowshy.response.Oscillator;
import flowshy.response.Suspension;
import flowshy.stream.StokesLayer;
import flowshy.stream.cover.Cover;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/**
 * Figures of a device that belong to no single frequency.
 *
 * @param mass of the hair [kg]
 * @param inertia of the hair about the pivot [kg·m²]
 * @param inertialTorque ρ_h P[1], torque per acceleration of the hair alone [N·m per m/s²]
 * @param slenderness length over largest diameter [-]
 * @param womersley least and largest a√(ω/ν) over radii and band [-]
 * @param layer Stokes layer at the upper and lower end of the band [m]
 * @param knudsen mean free path over the thinnest radius [-], zero where no mean free path is known
 * @param vacuum resonance and decay in vacuum, empty without a suspension that holds the hair
 * @param medium the same in the medium around the hair
 * @param gravityStiffness S_g [N·m/rad], zero without a suspension
 * @param staticTilt under gravity [rad], zero unless horizontal
 * @param bendingFrequency first bending frequency in the medium [Hz], absent without a modulus
 * @param bendingStiffness EI/L in the sense of {@link Cantilever#stiffness} [N·m/rad], absent without a modulus
 */
public record DeviceFacts(
        double mass,
        double inertia,
        double inertialTorque,
        double slenderness,
        Span womersley,
        Span layer,
        double knudsen,
        Optional<Swing> vacuum,
        Optional<Swing> medium,
        double gravityStiffness,
        double staticTilt,
        OptionalDouble bendingFrequency,
        OptionalDouble bendingStiffness) {
    /**
     * Least and largest value of a quantity.
     *
     * @param least in the quantity's unit
     * @param largest in the quantity's unit
     */
    public record Span(double least, double largest) {}

    /**
     * Resonance and decay.
     *
     * @param resonance frequency at which the response turns through 90° [Hz]
     * @param decay quality factor
     */
    public record Swing(double resonance, Decay decay) {}

    /**
     * Figures of a device.
     *
     * @param device the device
     * @param band over which Womersley number and layer are stated
     * @return the figures
     */
    public static DeviceFacts of(Device device, Band band) {
        Hair hair = device.hair();
        Profile profile = hair.profile();
        Medium around = device.around();
        Moments moments = Moments.of(profile, device.pivotDepth());
        double low = 2.0 * FastMath.PI * band.from();
        double high = 2.0 * FastMath.PI * band.to();
        OscillatingCylinder thin = new OscillatingCylinder(profile.smallestRadius(), around);
        OscillatingCylinder thick = new OscillatingCylinder(profile.largestRadius(), around);
        StokesLayer layer = new StokesLayer(around.kinematicViscosity());
        Optional<Oscillator> there =
                device.suspension().map(held -> new Oscillator(hair, held, Optional.of(around), device.cover()));
        return new DeviceFacts(
                hair.density() * moments.volume(),
                hair.density() * moments.second(),
                hair.density() * moments.first(),
                profile.length() / (2.0 * profile.largestRadius()),
                new Span(thin.womersley(low), thick.womersley(high)),
                new Span(layer.thickness(high), layer.thickness(low)),
                thin.knudsen(),
                device.suspension().flatMap(held -> swing(hair, held, Optional.empty(), device.cover())),
                device.suspension().flatMap(held -> swing(hair, held, Optional.of(around), device.cover())),
                there.map(Oscillator::gravityStiffness).orElse(0.0),
                there.map(Oscillator::staticTilt).orElse(0.0),
                bendingFrequency(device),
                bendingStiffness(device));
    }

    /**
     * First bending frequency of a device's hair.
     *
     * @param device the device
     * @return in the medium around the hair [Hz], absent without a modulus
     */
    public static OptionalDouble bendingFrequency(Device device) {
        Hair hair = device.hair();
        return hair.youngsModulus().isPresent()
                ? OptionalDouble.of(bending(hair, hair.youngsModulus().getAsDouble(), device.around()))
                : OptionalDouble.empty();
    }

    /**
     * Bending stiffness of a device's hair.
     *
     * @param device the device
     * @return EI/L in the sense of {@link Cantilever#stiffness} [N·m/rad], absent without a modulus
     */
    public static OptionalDouble bendingStiffness(Device device) {
        Hair hair = device.hair();
        return hair.youngsModulus().isPresent()
                ? OptionalDouble.of(Cantilever.stiffness(
                        hair.profile(), hair.youngsModulus().getAsDouble()))
                : OptionalDouble.empty();
    }

    private static Optional<Swing> swing(Hair hair, Suspension held, Optional<Medium> in, Cover cover) {
        Oscillator oscillator = new Oscillator(hair, held, in, cover);
        return oscillator.stands()
                ? Optional.of(new Swing(oscillator.resonance() / (2.0 * FastMath.PI), oscillator.decay()))
                : Optional.empty();
    }

    private static double bending(Hair hair, double modulus, Medium around) {
        return new Cantilever(hair.profile(), modulus)
                .firstFrequency(
                        (a, omega) -> FastMath.PI * a * a * (hair.density() + carried(a, around, omega)),
                        a -> FastMath.PI * a * a * hair.density());
    }

    /** Density that the fluid adds to a slice, ρ Re Γ [kg/m³]. */
    private static double carried(double radius, Medium around, double omega) {
        return around.density()
                * new OscillatingCylinder(radius, around)
                        .hydrodynamicFunction(omega)
                        .getReal();
    }
}
