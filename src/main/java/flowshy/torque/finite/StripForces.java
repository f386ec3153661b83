package flowshy.torque.finite;

import flowshy.cylinder.HydrodynamicFunction;
import flowshy.hair.Profile;
import flowshy.hair.Strip;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** Strip theory without slip at one frequency, for comparison: each slice as part of an endless cylinder. */
final class StripForces {
    /** Splits in units of δ; above the last the flow is the free stream. */
    private static final double[] LAYER_SPLITS = {1.0, 3.0, 8.0, 20.0, 40.0};

    private static final int POINTS = 12;

    private final double omega;
    private final double wave;
    private final double density;
    private final double delta;
    private final double pivotDepth;

    StripForces(Medium medium, double pivotDepth, double omega) {
        this.omega = omega;
        this.wave = FastMath.sqrt(omega / medium.kinematicViscosity());
        this.density = medium.density();
        this.delta = medium.stokesLayer(omega);
        this.pivotDepth = pivotDepth;
    }

    Complex gamma(double radius) {
        return HydrodynamicFunction.of(radius * wave);
    }

    /** iωρπa² (1 + Γ s) [N·s/m²]. */
    Complex stream(double radius, Complex gamma, double height) {
        return mass(radius, gamma.multiply(StokesLayer.share(height / delta)).add(1.0));
    }

    /** −iωρπa² Γ (z + h) [N·s]. */
    Complex rocking(double radius, Complex gamma, double height) {
        return mass(radius, gamma.multiply(-(height + pivotDepth)));
    }

    /** Torques about the pivot: of the stream [N·m per m/s], of rocking [N·m per rad/s]. */
    Complex[] torques(Profile profile) {
        Complex stream = Complex.ZERO;
        Complex rocking = Complex.ZERO;
        double radius = Double.NaN;
        Complex gamma = Complex.ZERO;
        for (Strip strip : Strip.along(profile, segments(profile, delta), POINTS)) {
            if (strip.radius() != radius) { // a straight part needs its law once
                radius = strip.radius();
                gamma = gamma(radius);
            }
            double arm = (strip.height() + pivotDepth) * strip.weight();
            stream = stream.add(stream(radius, gamma, strip.height()).multiply(arm));
            rocking = rocking.add(rocking(radius, gamma, strip.height()).multiply(arm));
        }
        return new Complex[] {stream, rocking};
    }

    private Complex mass(double radius, Complex factor) {
        double rate = omega * density * FastMath.PI * radius * radius;
        return new Complex(-factor.getImaginary() * rate, factor.getReal() * rate);
    }

    /** Breaks of the profile, and near the wall multiples of the layer. */
    static List<Double> segments(Profile profile, double delta) {
        List<Double> merged = new ArrayList<>();
        int next = 0;
        for (double z : profile.breaks()) {
            while (next < LAYER_SPLITS.length && LAYER_SPLITS[next] * delta < z) {
                merged.add(LAYER_SPLITS[next] * delta);
                next++;
            }
            if (merged.isEmpty() || z > merged.get(merged.size() - 1)) {
                merged.add(z);
            }
        }
        return merged;
    }
}
