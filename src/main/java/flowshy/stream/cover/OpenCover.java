package flowshy.stream.cover;

import flowshy.math.Caveat;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import flowshy.stream.WallShare;
import java.util.List;
import org.hipparchus.complex.Complex;

/** No cover: outside flow reaches the hair over a flat, wide wall. */
public record OpenCover() implements Cover {
    @Override
    public String kind() {
        return "open";
    }

    @Override
    public String words() {
        return "open";
    }

    @Override
    public Complex factor(double omega, Medium around) {
        return Complex.ONE;
    }

    @Override
    public WallShare profile(Medium around) {
        return new StokesLayer(around.kinematicViscosity());
    }

    @Override
    public List<Caveat> assumptions(Medium around) {
        return List.of();
    }
}
