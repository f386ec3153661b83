package flowshy.stream.cover;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import flowshy.stream.WallShare;
import java.util.List;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * A lid with holes over a cavity, lumped: hole impedance, compliance of the cavity, inertia of the fluid across it. An estimate.
 *
 * <p>Holes on one side: sound pressure p = ρcU makes the cavity breathe, Q = p/(Z/n + 1/(iωC)), C = V/(ρc²); all of it passes the
 * hair. Holes on both sides (n on each): the gradient iωρU over the cavity's length V/A drives Q through both, against 2 Z/n and the
 * inertia iωρ(V/A)/A. The flow at the hair is Q/A. Own lumped model from textbook elements.
 *
 * @param holes number of holes on one side
 * @param holeDiameter [m]
 * @param holeDepth thickness of the lid [m]
 * @param through true if as many holes stand on the opposite side
 * @param cavityVolume V [m³]
 * @param cavitySection A across the flow at the hair [m²]
 */
public record VentedCover(
        int holes, double holeDiameter, double holeDepth, boolean through, double cavityVolume, double cavitySection)
        implements Cover {
    /** @throws IllegalArgumentException if a number is not positive */
    public VentedCover {
        if (holes < 1 || !(holeDiameter > 0.0 && holeDepth > 0.0 && cavityVolume > 0.0 && cavitySection > 0.0)) {
            throw new IllegalArgumentException("holes, their size and the cavity of a vented cover must be positive");
        }
    }

    @Override
    public String kind() {
        return "vented";
    }

    @Override
    public String words() {
        return say(
                "vented, %s of %.4g mm by %.4g mm %s, cavity %.4g mm3",
                holes == 1 ? "1 hole" : holes + " holes",
                1e3 * holeDiameter,
                1e3 * holeDepth,
                through ? "on both sides" : "on one side",
                1e9 * cavityVolume);
    }

    /**
     * Impedance of the holes of one side together.
     *
     * @param omega angular frequency [rad/s]
     * @param around the medium
     * @return Z/n [Pa·s/m³]
     */
    public Complex impedance(double omega, Medium around) {
        return hole(around).at(omega).divide(holes);
    }

    /**
     * One of the holes.
     *
     * @param around the medium
     * @return its impedance law
     */
    public HoleImpedance hole(Medium around) {
        return new HoleImpedance(0.5 * holeDiameter, holeDepth, around);
    }

    /**
     * Resonance of the holes' mass on the spring of the cavity.
     *
     * @param around the medium, its sound speed known
     * @return c/(2π) √(n πr²/((t + 16r/(3π)) V)) [Hz] (Helmholtz, handbook); absent without a sound speed
     */
    public OptionalDouble resonance(Medium around) {
        if (around.soundSpeed().isEmpty()) {
            return OptionalDouble.empty();
        }
        HoleImpedance hole = hole(around);
        int all = through ? 2 * holes : holes;
        double spring = all * hole.area() / ((holeDepth + 2.0 * hole.endLength()) * cavityVolume);
        return OptionalDouble.of(around.soundSpeed().getAsDouble() * FastMath.sqrt(spring) / (2.0 * FastMath.PI));
    }

    @Override
    public Complex factor(double omega, Medium around) {
        if (through) {
            Complex gradient = new Complex(0.0, omega * around.density() * length());
            Complex against = impedance(omega, around).multiply(2.0).add(gradient.divide(cavitySection));
            return gradient.divide(against).divide(cavitySection);
        }
        return breathing(omega, around).multiply(around.density() * soundSpeed(around));
    }

    /**
     * Flow at the hair by a pressure outside the holes of one side.
     *
     * @param omega angular frequency [rad/s]
     * @param around the medium
     * @return velocity over pressure [m/s per Pa]
     */
    public Complex breathing(double omega, Medium around) {
        double compliance = cavityVolume / (around.density() * soundSpeed(around) * soundSpeed(around));
        Complex spring = new Complex(0.0, -1.0 / (omega * compliance));
        return impedance(omega, around).add(spring).reciprocal().divide(cavitySection);
    }

    /**
     * Length of the cavity along the flow.
     *
     * @return V/A [m]
     */
    public double length() {
        return cavityVolume / cavitySection;
    }

    @Override
    public WallShare profile(Medium around) {
        return new StokesLayer(around.kinematicViscosity());
    }

    @Override
    public OptionalDouble cavityRadius() {
        return OptionalDouble.of(FastMath.sqrt(cavitySection / FastMath.PI));
    }

    @Override
    public List<Caveat> assumptions(Medium around) {
        String resonance = resonance(around).isPresent()
                ? say(" Resonance of the vents at %.4g Hz.", resonance(around).getAsDouble())
                : "";
        return List.of(new Caveat(
                Caveat.Subject.COVER,
                Caveat.Weight.WEAK,
                "Vented cover: a lumped estimate (holes as viscous tubes with end corrections, adiabatic cavity, all flow past the"
                        + " hair); holes do not interact, sound comes as a plane wave." + resonance));
    }

    /** Without a sound speed a study cannot ask for a vented cover; its reader refuses it. */
    private static double soundSpeed(Medium around) {
        return around.soundSpeed()
                .orElseThrow(() -> new IllegalStateException("the sound speed of " + around.name() + " is not known"));
    }
}
