package flowshy.torque.finite;

import flowshy.hair.Profile;
import flowshy.math.Range;
import flowshy.medium.Medium;
import flowshy.stream.StokesLayer;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.complex.Complex;

/**
 * A hair of finite length on a plane no-slip wall in a medium: tip, wall and the flow along the hair, which strip theory
 * neglects.
 *
 * <p>Solves iωρu = −∇p + μ∇²u, ∇·u = 0 outside the hair, u = 0 on the wall, by a single layer of ring forces on side and tip
 * over the half-space kernels of {@link Couplings}, in Galerkin's form; own formulation after the boundary-integral method
 * (Pozrikidis, Boundary Integral and Singularity Methods, 1992; from memory). Linear: small excursions, Re ≪ 1 for the
 * steady case. No slip at the surface. Held to a finite-element solution within 0.1 % at length over diameter 7.5 and 10, and
 * by refinement, reciprocity and closed solutions from 1 to 50 and for δ from 0.05 radii to 20 lengths.
 *
 * <p>Rocking is a rigid turn about the pivot. The foot turns with it, and with the foot the wall inside the foot's radius; over
 * the foot gap beside it the wall's motion falls evenly to nothing. Without a gap the torque would grow as the logarithm of one
 * over the gap: 4π²/(π²−4) μa³ for each factor e, 0.03 % at length over diameter 10, 6 % at 1.
 */
public final class FiniteHair {
    /** Foot gap over the radius at the wall where none is stated: an own choice, no source. */
    public static final double DEFAULT_GAP_SHARE = 0.1;

    /** Layer thickness over the largest radius for which the rings are short enough; a thinner layer is refused. */
    public static final Range LAYER_SHARE = new Range("δ/a", 0.05, Double.MAX_VALUE);

    private final Profile profile;
    private final Medium medium;
    private final double pivotDepth;
    private final double footGap;
    private final double scale;
    private final Meridian meridian;
    /** Layer without inertia, made when first asked for: it serves every slow stream. */
    private RingLayer slow;

    /**
     * A hair with the default foot gap.
     *
     * @param profile its shape
     * @param medium what it stands in
     * @param pivotDepth h, depth of the pivot below the wall, zero or more [m]
     * @throws IllegalArgumentException if the depth is negative or not finite
     */
    public FiniteHair(Profile profile, Medium medium, double pivotDepth) {
        this(profile, medium, pivotDepth, defaultGap(profile));
    }

    /**
     * The gap at the foot of a hair that states none.
     *
     * @param profile its shape
     * @return gap [m]
     */
    public static double defaultGap(Profile profile) {
        return DEFAULT_GAP_SHARE * profile.radius(0.0);
    }

    /**
     * A hair with a stated foot gap.
     *
     * @param profile its shape
     * @param medium what it stands in
     * @param pivotDepth h, depth of the pivot below the wall, zero or more [m]
     * @param footGap width over which the wall's motion falls to nothing beside the foot, positive [m]
     * @throws IllegalArgumentException if the depth is negative, the gap not positive, or either not finite
     */
    public FiniteHair(Profile profile, Medium medium, double pivotDepth, double footGap) {
        if (!(pivotDepth >= 0.0) || Double.isInfinite(pivotDepth)) {
            throw new IllegalArgumentException("pivot depth must be zero or more and finite, was " + pivotDepth + " m");
        }
        if (!(footGap > 0.0) || Double.isInfinite(footGap)) {
            throw new IllegalArgumentException("foot gap must be positive and finite, was " + footGap + " m");
        }
        this.profile = profile;
        this.medium = medium;
        this.pivotDepth = pivotDepth;
        this.footGap = footGap;
        this.scale = profile.largestRadius();
        this.meridian = Meridian.of(profile, scale);
    }

    /**
     * The gap in use.
     *
     * @return foot gap [m]
     */
    public double footGap() {
        return footGap;
    }

    /**
     * Highest frequency that the solver takes, where δ falls to the least share of the largest radius.
     *
     * @return angular frequency [rad/s]
     */
    public double highestFrequency() {
        double delta = LAYER_SHARE.low() * scale;
        return 2.0 * medium.kinematicViscosity() / (delta * delta) * (1.0 - 1e-12);
    }

    /**
     * Forces of the medium at one frequency, from the two finer meshes.
     *
     * @param omega angular frequency, positive [rad/s]
     * @return torques, forces, their errors and the distribution along the hair
     * @throws IllegalArgumentException if ω is not positive and finite, or δ is below the range {@link #LAYER_SHARE}
     */
    public FiniteTorques at(double omega) {
        return at(omega, Accuracy.FINE);
    }

    /**
     * Forces of the medium at one frequency.
     *
     * @param omega angular frequency, positive [rad/s]
     * @param accuracy how fine the two meshes are
     * @return torques, forces, their errors and the distribution along the hair
     * @throws IllegalArgumentException if ω is not positive and finite, or δ is below the range {@link #LAYER_SHARE}
     */
    public FiniteTorques at(double omega, Accuracy accuracy) {
        if (!(omega > 0.0) || Double.isInfinite(omega)) {
            throw new IllegalArgumentException("angular frequency must be positive and finite, was " + omega);
        }
        double share = medium.stokesLayer(omega) / scale;
        if (!LAYER_SHARE.contains(share)) {
            throw new IllegalArgumentException(
                    "the medium's layer is " + share + " of the largest radius; the solver holds for " + LAYER_SHARE);
        }
        double beta = omega * scale * scale / medium.kinematicViscosity();
        Answer rough = new Answer(mesh(accuracy.first(), 1.0, beta), omega);
        double gapShare = accuracy == Accuracy.FINE ? 0.5 : 1.0;
        Answer answer = new Answer(mesh(accuracy.second(), gapShare, beta), omega);
        StripForces strips = new StripForces(medium, pivotDepth, omega);
        Complex[] strip = strips.torques(profile);
        FluidLoad stream = load(answer, answer.stream, rough, rough.stream, velocity());
        FluidLoad rocking = load(answer, answer.rocking, rough, rough.rocking, velocity() * scale);
        return new FiniteTorques(
                omega,
                stream,
                rocking,
                stream.torque().divide(strip[0]),
                rocking.torque().divide(strip[1]),
                slices(answer, strips));
    }

    /**
     * Torque of a slow steady stream along the wall: a lower bound for the torque at any Reynolds number.
     *
     * @param velocity undisturbed velocity at height z [m], as share of the free stream [-]
     * @return torque about the pivot per unit velocity of the free stream [N·m per m/s], axial traction included
     */
    public double creepingTorque(DoubleUnaryOperator velocity) {
        RingLayer layer = creeping();
        Complex[] density = layer.inStream(z -> new Complex(velocity.applyAsDouble(z * scale)));
        return RingLayer.dot(layer.motion(pivotDepth / scale, 1.0, 1.0), density)
                        .getReal()
                * velocity()
                * scale;
    }

    private synchronized RingLayer creeping() {
        if (slow == null) {
            slow = new RingLayer(mesh(Refinement.FINE, 1.0, 0.0), FootSlot.NONE, 0.0);
        }
        return slow;
    }

    private List<Ring> mesh(Refinement refinement, double gapShare, double beta) {
        return RingMesh.of(meridian, refinement, gapShare * footGap / scale, beta);
    }

    /** Force of unit density and velocity: μ times the scale [N·s/m]. */
    private double velocity() {
        return medium.viscosity() * scale;
    }

    private FluidLoad load(Answer answer, Complex[] density, Answer rough, Complex[] roughDensity, double unit) {
        Complex torque = answer.torque(density);
        Complex force = answer.force(density);
        return new FluidLoad(
                torque.multiply(unit * scale),
                answer.lateral(density).multiply(unit * scale),
                force.multiply(unit),
                rough.torque(roughDensity).subtract(torque).norm() / torque.norm(),
                rough.force(roughDensity).subtract(force).norm() / force.norm());
    }

    private List<ForceSlice> slices(Answer answer, StripForces strips) {
        List<ForceSlice> slices = new ArrayList<>();
        List<Ring> rings = answer.layer.rings();
        for (int i = 0; i < rings.size(); i++) {
            Ring ring = rings.get(i);
            Complex stripStream = Complex.ZERO;
            Complex stripRocking = Complex.ZERO;
            for (RingPiece piece : ring.pieces()) {
                double radius = piece.radius() * scale;
                double length = piece.thickness() * scale;
                Complex gamma = strips.gamma(radius);
                Complex stream = PieceMean.of(piece, z -> strips.stream(radius, gamma, z * scale));
                Complex rocking = strips.rocking(radius, gamma, piece.middle() * scale);
                stripStream = stripStream.add(stream.multiply(length));
                stripRocking = stripRocking.add(rocking.multiply(length));
            }
            slices.add(new ForceSlice(
                    ring.bottom() * scale,
                    ring.top() * scale,
                    answer.stream[3 * i].multiply(ring.area() * velocity()),
                    answer.rocking[3 * i].multiply(ring.area() * velocity() * scale),
                    stripStream,
                    stripRocking));
        }
        return slices;
    }

    /** Densities of both problems on one mesh. */
    private final class Answer {
        private final RingLayer layer;
        private final Complex[] stream;
        private final Complex[] rocking;

        Answer(List<Ring> rings, double omega) {
            FootSlot slot = new FootSlot(profile.radius(0.0) / scale, footGap / scale);
            layer = new RingLayer(rings, slot, omega * scale * scale / medium.kinematicViscosity());
            double delta = medium.stokesLayer(omega) / scale;
            stream = layer.inStream(z -> StokesLayer.share(z / delta));
            rocking = layer.moving(pivotDepth / scale, 1.0, 1.0);
        }

        Complex torque(Complex[] density) {
            return RingLayer.dot(layer.motion(pivotDepth / scale, 1.0, 1.0), density);
        }

        Complex lateral(Complex[] density) {
            return RingLayer.dot(layer.motion(pivotDepth / scale, 1.0, 0.0), density);
        }

        Complex force(Complex[] density) {
            return RingLayer.dot(layer.motion(1.0, 0.0, 0.0), density);
        }
    }
}
