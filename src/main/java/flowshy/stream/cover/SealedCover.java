package flowshy.stream.cover;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import flowshy.stream.WallShare;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;

/**
 * A full, closed, rigid cavity: the fluid is carried along with the base, no flow enters.
 *
 * @param cavity its size, empty if not stated: then its walls count as far away
 */
public record SealedCover(Optional<Cavity> cavity) implements Cover {
    @Override
    public String kind() {
        return "sealed";
    }

    @Override
    public String words() {
        return cavity.map(size ->
                        say("sealed, diameter %.4g mm, height %.4g mm", 1e3 * size.diameter(), 1e3 * size.height()))
                .orElse("sealed");
    }

    @Override
    public Complex factor(double omega, Medium around) {
        return Complex.ZERO;
    }

    @Override
    public WallShare profile(Medium around) {
        return new StokesLayer(around.kinematicViscosity());
    }

    @Override
    public boolean closed() {
        return true;
    }

    @Override
    public OptionalDouble cavityRadius() {
        return cavity.isPresent() ? OptionalDouble.of(0.5 * cavity.get().diameter()) : OptionalDouble.empty();
    }

    @Override
    public List<Caveat> assumptions(Medium around) {
        String walls = cavity.isPresent()
                ? "the fluid that the hair's own turning moves is confined by its wall"
                : "its walls count as far from the hair, so damping and added mass of the hair's own turning are those of open"
                        + " fluid";
        return List.of(new Caveat(
                Caveat.Subject.RESONANCE,
                cavity.isPresent() ? Caveat.Weight.NOTE : Caveat.Weight.WEAK,
                "Sealed cover: the cavity is full, closed and rigid; " + walls
                        + ". Sound transmitted through the lid is not modelled."));
    }
}
