package flowshy.verdict;

import flowshy.hair.Hair;
import flowshy.hair.Moments;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.stream.cover.Covers;
import flowshy.torque.Torques;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.TreeSet;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Why the rejection at a frequency is what it is: the parts of the torques, and what would move it.
 *
 * @param frequency [Hz]
 * @param rejection there [dB]
 * @param inertial torque of the hair's own inertia, less that of the fluid carried along [N·m per m/s²]
 * @param gradient torque of the pressure gradient that drives the flow, ρ P[1] [N·m per m/s²]
 * @param addedMass torque of the flow past the hair in phase with its acceleration, ρ Re P[Γs] [N·m per m/s²]
 * @param drag torque of the flow past the hair in phase with its velocity, ρ |Im P[Γs]| [N·m per m/s²]
 * @param levers what a change of ten per cent does
 */
public record Levers(
        double frequency,
        double rejection,
        double inertial,
        double gradient,
        double addedMass,
        double drag,
        List<Lever> levers) {
    /** The change tried: large enough to be built, small enough to read as a slope. */
    private static final double CHANGE = 1.1;

    /** An edge is looked for within this factor of frequency. */
    private static final double REACH = 8.0;

    /**
     * One thing that can be changed.
     *
     * @param what in words, e.g. {@code all diameters +10 %}
     * @param gain change of the rejection at the frequency [dB]
     * @param edge where the rejection then has its old value [Hz], absent if nowhere within a factor of eight
     */
    public record Lever(String what, double gain, OptionalDouble edge) {}

    /** Copies the list. */
    public Levers {
        levers = List.copyOf(levers);
    }

    /**
     * Explains an answer: every edge between bands, and where a limit on the rejection fails.
     *
     * @param answer of a device
     * @return in the order of frequency; empty under a sealed cover, where no flow turns the hair
     */
    public static List<Levers> of(BandsAnswer answer) {
        if (!answer.device().cover().equals(Covers.OPEN)) {
            return List.of();
        }
        TreeSet<Double> frequencies = new TreeSet<>();
        answer.bands().stream().skip(1).forEach(band -> frequencies.add(band.from()));
        answer.verdict().limits().stream()
                .filter(limit -> limit.decision() == Decision.FAILS)
                .flatMapToDouble(limit -> limit.at().stream())
                .forEach(frequencies::add);
        return frequencies.stream()
                .map(frequency -> at(answer.device(), frequency))
                .toList();
    }

    /**
     * Takes the rejection at a frequency apart.
     *
     * @param device with an open cover
     * @param frequency [Hz]
     * @return parts and levers
     */
    public static Levers at(Device device, double frequency) {
        Response response = new Response(device);
        Torques torques = response.torques(frequency);
        double gradient = device.around().density()
                * Moments.of(device.hair().profile(), device.pivotDepth()).first();
        Complex past = torques.flow().subtract(gradient);
        double rejection = response.rejection(frequency);
        List<Lever> levers = new ArrayList<>();
        // differences of shapes: each solved whole would take longer than all the rest, and the estimate's error is in
        // both
        Hair hair = device.hair().seenAs(device.hair().lengthModel().overShapes());
        double base = new Response(device.with(hair)).rejection(frequency);
        boolean room = hair.profile().room() >= CHANGE;
        levers.add(lever(
                room ? "all diameters +10 %" : "all diameters -10 %",
                device.with(hair.reshaped(hair.profile().thickened(room ? CHANGE : 2.0 - CHANGE))),
                frequency,
                base));
        levers.add(lever(
                "all lengths +10 %", device.with(hair.reshaped(hair.profile().lengthened(CHANGE))), frequency, base));
        levers.add(lever("hair density +10 %", device.with(hair.ofDensity(CHANGE * hair.density())), frequency, base));
        return new Levers(
                frequency,
                rejection,
                FastMath.abs(torques.carried()),
                gradient,
                past.getReal(),
                FastMath.abs(past.getImaginary()),
                levers);
    }

    /**
     * The part of the flow torque that dominates, in words.
     *
     * @return viscous drag, added mass or the pressure gradient
     */
    public String dominant() {
        if (drag >= addedMass && drag >= gradient) {
            return "viscous drag";
        }
        return addedMass >= gradient ? "added mass" : "the pressure gradient";
    }

    private static Lever lever(String what, Device changed, double frequency, double level) {
        Response response = new Response(changed);
        DoubleUnaryOperator more = x -> response.rejection(FastMath.exp(x)) - level;
        double low = FastMath.log(frequency / REACH);
        double high = FastMath.log(frequency * REACH);
        OptionalDouble edge = OptionalDouble.empty();
        if (more.applyAsDouble(low) * more.applyAsDouble(high) < 0.0) {
            double root = new BracketingNthOrderBrentSolver(1e-9, 5).solve(100, more::applyAsDouble, low, high);
            edge = OptionalDouble.of(FastMath.exp(root));
        }
        return new Lever(what, response.rejection(frequency) - level, edge);
    }
}
