package flowshy.stream.cover;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.medium.Medium;
import flowshy.stream.WallShare;
import java.util.List;
import org.hipparchus.complex.Complex;

/**
 * Open-sided roof over the hair.
 *
 * @param gap H between wall and roof [m]
 * @param length ℓ of the roof along the flow [m]
 */
public record RoofedCover(double gap, double length) implements Cover {
    /** @throws IllegalArgumentException if a dimension is not positive and finite */
    public RoofedCover {
        if (!(gap > 0.0 && length > 0.0) || Double.isInfinite(gap) || Double.isInfinite(length)) {
            throw new IllegalArgumentException(
                    "gap " + gap + " m and length " + length + " m of a roof must be positive");
        }
    }

    @Override
    public String kind() {
        return "roofed";
    }

    @Override
    public String words() {
        return say("roofed, gap %.4g mm, length %.4g mm", 1e3 * gap, 1e3 * length);
    }

    @Override
    public Complex factor(double omega, Medium around) {
        return Complex.ONE;
    }

    @Override
    public WallShare profile(Medium around) {
        return new ChannelLayer(gap, around.kinematicViscosity());
    }

    /**
     * What a stream drives through the gap.
     *
     * @param around the medium
     * @return the through-flow law
     */
    public RoofThroughFlow throughFlow(Medium around) {
        return new RoofThroughFlow(gap, length, around.kinematicViscosity());
    }

    @Override
    public List<Caveat> assumptions(Medium around) {
        return List.of(new Caveat(
                Caveat.Subject.COVER,
                Caveat.Weight.WEAK,
                "Roof: a plane channel, open at its sides and long against its gap; the pressure gradient outside acts inside"
                        + " unchanged; the through-flow of a stream is an own estimate without entry losses."));
    }
}
