package flowshy.torque.finite;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Part of the surface with one force density a direction: e_x evenly, (cos 2φ, sin 2φ), and e_z in cos φ.
 *
 * @param pieces from the lower end to the upper
 */
record Ring(List<RingPiece> pieces) {
    /** Cut-off times length. */
    private static final double CUTOFF = 10.0;

    /** Largest step of the stairs over their radius: a ring near a point is no cylinder. */
    private static final double STEP = 0.15;

    /** Largest cut-off times step of the stairs that stand for a slope. */
    private static final double STAIR = 0.6;

    Ring {
        pieces = List.copyOf(pieces);
    }

    /** Number of pieces for a ring between two points of a curve, for waves up to its own cut-off and up to the given one. */
    static int piecesFor(MeridianPoint from, MeridianPoint to, double cutoff) {
        RingPiece chord = RingPiece.between(from, to);
        double minor = FastMath.min(FastMath.abs(chord.width()), chord.thickness());
        double highest = FastMath.max(CUTOFF / chord.length(), cutoff);
        double steps = FastMath.max(highest * minor / STAIR, minor / (STEP * chord.radius()));
        return (int) FastMath.max(1.0, FastMath.ceil(steps));
    }

    static Ring through(List<MeridianPoint> points) {
        List<RingPiece> pieces = new ArrayList<>();
        for (int i = 1; i < points.size(); i++) {
            pieces.add(RingPiece.between(points.get(i - 1), points.get(i)));
        }
        return new Ring(pieces);
    }

    double length() {
        return pieces.stream().mapToDouble(RingPiece::length).sum();
    }

    double area() {
        return pieces.stream().mapToDouble(RingPiece::area).sum();
    }

    double bottom() {
        return pieces.get(0).from().height();
    }

    double top() {
        return highest().from().height() + highest().thickness();
    }

    RingPiece lowest() {
        return pieces.get(0);
    }

    RingPiece highest() {
        return pieces.get(pieces.size() - 1);
    }

    double outerRadius() {
        return pieces.stream().mapToDouble(RingPiece::outer).max().orElseThrow();
    }

    double meanRadius() {
        return pieces.stream().mapToDouble(RingPiece::radius).average().orElseThrow();
    }

    /** Wavenumber above which only the ring's force on itself is left, and that in closed form, as far as its length asks. */
    double cutoff() {
        return CUTOFF / length();
    }
}
