package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.medium.Medium;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import flowshy.stream.UnfitMediumException;
import flowshy.stream.turbulence.DuctTurbulence;
import flowshy.stream.turbulence.TurbulenceSpectrum;
import flowshy.stream.wall.DuctFlow;
import flowshy.stream.wall.PipeFriction;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * Developed flow in a duct with the hair on its wall. Turbulence and length scale come from size and Reynolds number where they are
 * not stated, the intensity times the square root of the share of time that the flow is turbulent; a laminar duct carries none
 * unless it is stated.
 */
public final class Duct extends CarriedFlow {
    private static final String TURBULENCE = "turbulence";
    private static final String LENGTH_SCALE = "length-scale";

    private final String name;
    private final double direction;
    private final DuctFlow flow;

    private Duct(String name, double direction, DuctFlow flow, List<Stated> numbers) {
        super(name, direction, new DuctLayer(flow), carried(flow, numbers), numbers);
        this.name = name;
        this.direction = direction;
        this.flow = flow;
    }

    /**
     * A duct in a medium.
     *
     * @param name the user's name for it
     * @param direction φ [rad]
     * @param flow section, mean speed, viscosity
     * @param turbulence rms of the component along over the mean speed [-]; empty for the default
     * @param lengthScale longitudinal integral scale [m]; empty for the default
     * @return the source
     */
    public static Duct of(
            String name, double direction, DuctFlow flow, Optional<Stated> turbulence, Optional<Stated> lengthScale) {
        DuctTurbulence usual =
                new DuctTurbulence(flow.reynolds(), flow.section().hydraulicDiameter());
        List<Stated> numbers = new ArrayList<>();
        boolean carries = turbulence.isPresent() || flow.intermittency() > 0.0;
        if (carries) {
            numbers.add(turbulence.orElseGet(() -> Stated.assumed(
                    TURBULENCE,
                    usual.intensity() * FastMath.sqrt(flow.intermittency()), // none where the duct turns laminar
                    "0.16 Re^(-1/8) of a developed duct, common practice of flow simulation, no single source")));
            numbers.add(lengthScale.orElseGet(() -> Stated.assumed(
                    LENGTH_SCALE,
                    usual.lengthScale(),
                    "0.165 hydraulic diameters, from the mixing length of 0.07 of common practice, own conversion")));
        }
        return new Duct(name, direction, flow, numbers);
    }

    private static Optional<Turbulence> carried(DuctFlow flow, List<Stated> numbers) {
        if (numbers.isEmpty()) {
            return Optional.empty();
        }
        double deviation = numbers.get(0).value() * flow.meanSpeed();
        TurbulenceSpectrum spectrum =
                new TurbulenceSpectrum(deviation, numbers.get(1).value(), flow.coreSpeed(), flow.kinematicViscosity());
        return Optional.of(new ModelTurbulence(spectrum, flow.coreSpeed()));
    }

    @Override
    public SourceKind kind() {
        return SourceKind.DUCT;
    }

    @Override
    public Source in(Medium other) {
        DuctFlow there = new DuctFlow(flow.section(), flow.meanSpeed(), other.kinematicViscosity());
        if (!(there.reynolds() < PipeFriction.PRANDTL.range().high())) {
            throw new UnfitMediumException(say(
                    "%s: a Reynolds number of %.3g in the duct, where the law of its friction ends",
                    name, there.reynolds()));
        }
        return of(name, direction, there, given(TURBULENCE), given(LENGTH_SCALE));
    }

    private Optional<Stated> given(String key) {
        return numbers().stream()
                .filter(number -> number.key().equals(key) && !number.assumed())
                .findFirst();
    }

    @Override
    CarriedFlow with(List<Stated> changed) {
        return new Duct(name, direction, flow, changed);
    }
}
