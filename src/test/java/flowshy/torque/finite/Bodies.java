package flowshy.torque.finite;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/** Outlines in units of their radius, and what the solver says of them. */
final class Bodies {
    private static final int SAMPLES = 800;

    private Bodies() {}

    /** Spheroid, semi-axis along z, 1 across, centre at the height. */
    static Meridian spheroid(double semiAxis, double centre) {
        List<MeridianPoint> points = new ArrayList<>();
        for (int n = 0; n <= SAMPLES; n++) {
            double angle = FastMath.PI * n / SAMPLES;
            double radius = n == 0 || n == SAMPLES ? 0.0 : FastMath.sin(angle);
            points.add(new MeridianPoint(radius, centre - semiAxis * FastMath.cos(angle)));
        }
        return new Meridian(List.of(points));
    }

    static Meridian sphere(double centre) {
        return spheroid(1.0, centre);
    }

    /** Half a sphere on the wall. */
    static Meridian bump() {
        List<MeridianPoint> points = new ArrayList<>();
        for (int n = 0; n <= SAMPLES; n++) {
            double angle = 0.5 * FastMath.PI * n / SAMPLES;
            points.add(new MeridianPoint(n == SAMPLES ? 0.0 : FastMath.cos(angle), FastMath.sin(angle)));
        }
        return new Meridian(List.of(points));
    }

    /** Blunt rod clear of the wall, its lower end at the height. */
    static Meridian rod(double length, double bottom) {
        MeridianPoint low = new MeridianPoint(1.0, bottom);
        MeridianPoint high = new MeridianPoint(1.0, bottom + length);
        return new Meridian(List.of(
                Meridian.straight(new MeridianPoint(0.0, bottom), low),
                Meridian.straight(low, high),
                Meridian.straight(high, new MeridianPoint(0.0, bottom + length))));
    }

    /** Blunt post on the wall. */
    static Meridian post(double length) {
        MeridianPoint edge = new MeridianPoint(1.0, length);
        return new Meridian(List.of(
                Meridian.straight(new MeridianPoint(1.0, 0.0), edge),
                Meridian.straight(edge, new MeridianPoint(0.0, length))));
    }

    static Refinement finer(Refinement refinement, double factor) {
        return new Refinement(
                refinement.longest() / factor,
                refinement.widest() / factor,
                refinement.edge() / (factor * factor),
                refinement.foot() / factor,
                refinement.growth() / factor);
    }

    static RingLayer layer(Meridian meridian, double beta) {
        return layer(meridian, Refinement.FINE, FootSlot.NONE, beta);
    }

    static RingLayer layer(Meridian meridian, Refinement refinement, FootSlot slot, double beta) {
        double footRing = slot.radius() > 0.0 ? 0.5 * slot.gap() : Double.POSITIVE_INFINITY;
        return new RingLayer(RingMesh.of(meridian, refinement, footRing, beta), slot, beta);
    }

    /** iω/ν = k². */
    static Complex wave(double beta) {
        return new Complex(0.0, beta).sqrt();
    }

    /** Force along x on a body that slides along x with unit velocity. */
    static Complex slidingForce(RingLayer layer) {
        return RingLayer.dot(layer.motion(1.0, 0.0, 0.0), layer.moving(1.0, 0.0, 0.0));
    }

    /** Torque about an axis at a height on a body that turns about it with unit angular velocity. */
    static Complex turningTorque(RingLayer layer, double height) {
        return RingLayer.dot(layer.motion(-height, 1.0, 1.0), layer.moving(-height, 1.0, 1.0));
    }

    /** Amplitude and phase against a reference. */
    static double amplitudeError(Complex found, Complex reference) {
        return found.norm() / reference.norm() - 1.0;
    }

    static double phaseError(Complex found, Complex reference) {
        return FastMath.toDegrees(found.divide(reference).getArgument());
    }
}
