package flowshy.torque.finite;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** Cuts an outline into rings: short at edges, where the force density grows without bound, and at the wall; long elsewhere. */
final class RingMesh {
    /** Half width of the window for bends, over the largest radius. */
    private static final double WINDOW = 0.2;

    private final Refinement refinement;
    private final double total;
    private final double largest;
    private final double cutoff;
    private final double widest;
    private final List<Ring> rings = new ArrayList<>();

    private RingMesh(Meridian meridian, Refinement refinement, double beta) {
        this.refinement = refinement;
        this.cutoff = RingTail.layerCutoff(beta);
        this.total = meridian.parts().stream().mapToDouble(RingMesh::length).sum();
        this.largest = meridian.parts().stream()
                .flatMap(List::stream)
                .mapToDouble(MeridianPoint::radius)
                .max()
                .orElseThrow();
        this.widest = refinement.widest(beta * largest * largest);
    }

    /**
     * Rings from the foot to the tip.
     *
     * @param meridian the outline
     * @param refinement how fine
     * @param footRing ring at the wall no longer than this, beside what the refinement asks
     * @param beta ω/ν in units of the outline; thin layers ask for smoother slopes
     */
    static List<Ring> of(Meridian meridian, Refinement refinement, double footRing, double beta) {
        RingMesh mesh = new RingMesh(meridian, refinement, beta);
        for (int p = 0; p < meridian.parts().size(); p++) {
            List<MeridianPoint> part = meridian.parts().get(p);
            boolean wall = p == 0 && part.get(0).height() == 0.0;
            double first = part.get(0).radius() * (wall ? refinement.foot() : refinement.edge());
            mesh.cut(part, wall ? FastMath.min(first, footRing) : first);
        }
        return mesh.rings;
    }

    private void cut(List<MeridianPoint> points, double atStart) {
        int last = points.size() - 1;
        double[] along = new double[last + 1];
        double[] size = new double[last + 1];
        double[] direction = new double[last + 1];
        for (int i = 1; i <= last; i++) {
            RingPiece chord = RingPiece.between(points.get(i - 1), points.get(i));
            along[i] = along[i - 1] + chord.length();
            direction[i] = FastMath.atan2(chord.width(), chord.thickness());
            double lean = FastMath.abs(chord.width()) / chord.length();
            double leaning = lean > 0.0 ? widest * chord.radius() / lean : Double.POSITIVE_INFINITY;
            size[i] = FastMath.min(refinement.longest() * total, FastMath.max(widest * largest, leaning));
        }
        size[0] = size[1];
        direction[0] = direction[1];
        bend(along, direction, size);
        limit(size, 0, points.get(0).radius() > 0.0 ? atStart : size[0]);
        limit(
                size,
                last,
                points.get(last).radius() > 0.0
                        ? refinement.edge() * points.get(last).radius()
                        : size[last]);
        grow(along, size);
        share(points, along, size);
    }

    /** No ring turns by more than the share of a radian; the turn is taken over a window, so that a kink counts as a bend. */
    private void bend(double[] along, double[] direction, double[] size) {
        double window = WINDOW * largest;
        int low = 0;
        int high = 0;
        for (int i = 0; i < along.length; i++) {
            while (along[i] - along[low] > window) {
                low++;
            }
            while (high < along.length - 1 && along[high] - along[i] < window) {
                high++;
            }
            double turn = FastMath.abs(direction[high] - direction[low]);
            double span = FastMath.max(along[high] - along[low], window);
            size[i] = FastMath.min(size[i], widest * span / FastMath.max(turn, 1e-12));
        }
    }

    private static void limit(double[] size, int at, double most) {
        size[at] = FastMath.min(size[at], most);
    }

    private void grow(double[] along, double[] size) {
        for (int i = 1; i < size.length; i++) {
            size[i] = FastMath.min(size[i], size[i - 1] + refinement.growth() * (along[i] - along[i - 1]));
        }
        for (int i = size.length - 2; i >= 0; i--) {
            size[i] = FastMath.min(size[i], size[i + 1] + refinement.growth() * (along[i + 1] - along[i]));
        }
    }

    /** Equal shares of ∫ ds/size. */
    private void share(List<MeridianPoint> points, double[] along, double[] size) {
        double[] count = new double[along.length];
        for (int i = 1; i < along.length; i++) {
            count[i] = count[i - 1] + (along[i] - along[i - 1]) * 2.0 / (size[i] + size[i - 1]);
        }
        int last = along.length - 1;
        int number = (int) FastMath.max(1.0, FastMath.ceil(count[last] - 0.2));
        double from = 0.0;
        for (int n = 1; n <= number; n++) {
            double to = n == number ? along[last] : at(count, along, count[last] * n / number);
            MeridianPoint low = point(points, along, from);
            MeridianPoint high = point(points, along, to);
            int pieces = Ring.piecesFor(low, high, cutoff);
            List<MeridianPoint> ends = new ArrayList<>();
            for (int k = 0; k <= pieces; k++) {
                ends.add(k == pieces ? high : point(points, along, from + (to - from) * k / pieces));
            }
            rings.add(Ring.through(ends));
            from = to;
        }
    }

    private static MeridianPoint point(List<MeridianPoint> points, double[] along, double s) {
        int high = upper(along, s);
        double share = (s - along[high - 1]) / (along[high] - along[high - 1]);
        MeridianPoint a = points.get(high - 1);
        MeridianPoint b = points.get(high);
        if (share >= 1.0) {
            return b;
        }
        return new MeridianPoint(
                a.radius() + share * (b.radius() - a.radius()), a.height() + share * (b.height() - a.height()));
    }

    private static double at(double[] x, double[] y, double value) {
        int high = upper(x, value);
        return y[high - 1] + (y[high] - y[high - 1]) * (value - x[high - 1]) / (x[high] - x[high - 1]);
    }

    /** First index above 0 whose entry is not below the value. */
    private static int upper(double[] rising, double value) {
        int low = 0;
        int high = rising.length - 1;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (rising[middle] < value) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }

    private static double length(List<MeridianPoint> points) {
        double sum = 0.0;
        for (int i = 1; i < points.size(); i++) {
            sum += RingPiece.between(points.get(i - 1), points.get(i)).length();
        }
        return sum;
    }
}
