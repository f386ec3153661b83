package flowshy.torque.strips;

import flowshy.hair.Profile;
import flowshy.hair.Strip;
import flowshy.stream.WallShare;
import flowshy.stream.cover.ChannelLayer;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.hipparchus.util.FastMath;

/**
 * Gauss–Legendre strips along a hair: between the profile's own breaks once for all, and anew where the Stokes layer is thin
 * against a piece. As many points as keep each torque converged to 1e-8; a test doubles them.
 */
public final class StripMesh {
    /** Splits in units of δ; above the last the flow is the free stream to 4e-11. */
    private static final double[] LAYER_SPLITS = {1.0, 3.0, 8.0, 24.0};

    /** A sliver beside a break of the profile adds points and no accuracy [δ]. */
    private static final double SLIVER = 0.05;

    private final Profile profile;
    private final List<Piece> pieces;
    private final List<Strip> all;

    /**
     * Piece between two breaks.
     *
     * @param from lower end [m]
     * @param to upper end [m]
     * @param points as many as the change of radius needs
     * @param cutPoints as many as each part needs where the layer cuts the piece
     * @param reach longest piece that these points resolve the layer on [δ]
     * @param strips the points
     */
    private record Piece(double from, double to, int points, int cutPoints, double reach, List<Strip> strips) {}

    /**
     * Mesh of a profile.
     *
     * @param profile the shape
     * @param refinement factor on the number of points, 1 in use
     */
    public StripMesh(Profile profile, int refinement) {
        this.profile = profile;
        this.pieces = new ArrayList<>();
        this.all = new ArrayList<>();
        List<Double> breaks = profile.breaks();
        for (int i = 1; i < breaks.size(); i++) {
            Piece piece = piece(breaks.get(i - 1), breaks.get(i), refinement);
            pieces.add(piece);
            all.addAll(piece.strips());
        }
    }

    /**
     * Strips that resolve the profile alone.
     *
     * @return from wall to tip
     */
    public List<Strip> strips() {
        return all;
    }

    /**
     * Strips that resolve profile and layer.
     *
     * @param delta Stokes layer [m]
     * @param share the flow over the wall; under a roof there is a second layer
     * @return from wall to tip
     */
    public List<Strip> strips(double delta, WallShare share) {
        double thickness = LAYER_SPLITS[LAYER_SPLITS.length - 1] * delta;
        double roof = share instanceof ChannelLayer channel ? channel.gap() : Double.POSITIVE_INFINITY;
        List<Strip> strips = new ArrayList<>(2 * all.size());
        for (Piece piece : pieces) {
            if (piece.to() - piece.from() <= piece.reach() * delta
                    || (piece.from() >= thickness && piece.to() <= roof - thickness)) {
                strips.addAll(piece.strips());
            } else {
                strips.addAll(Strip.along(profile, cuts(piece, delta, roof), piece.cutPoints()));
            }
        }
        return strips;
    }

    private static List<Double> cuts(Piece piece, double delta, double roof) {
        TreeSet<Double> wanted = new TreeSet<>();
        for (double split : LAYER_SPLITS) {
            wanted.add(split * delta);
            wanted.add(roof - split * delta);
        }
        List<Double> cuts = new ArrayList<>(List.of(piece.from()));
        double below = piece.from();
        for (double z : wanted) {
            if (z - below > SLIVER * delta && piece.to() - z > SLIVER * delta) {
                cuts.add(z);
                below = z;
            }
        }
        cuts.add(piece.to());
        return cuts;
    }

    /**
     * Γa² is analytic in a but for the logarithm at 0, so the ratio of the radii at the ends settles how many points a piece
     * needs; how long it may be against the layer follows from the error term of the rule on e^{-kz} (both own, tested).
     */
    private Piece piece(double from, double to, int refinement) {
        double span = to - from;
        double foot = profile.radius(from + 1e-9 * span);
        double middle = profile.radius(from + 0.5 * span);
        double top = profile.radius(to);
        double least = FastMath.min(foot, top);
        double ratio = FastMath.max(foot, top) / least;
        int points;
        double reach;
        if (ratio < 1.15 && FastMath.abs(middle - least) <= 0.15 * least) {
            points = 5;
            reach = 1.0;
        } else if (ratio < 1.5) {
            points = 8;
            reach = 3.0;
        } else if (ratio < 4.0) {
            points = 14;
            reach = 8.0;
        } else {
            points = 24;
            reach = 8.0;
        }
        int count = refinement * points;
        return new Piece(
                from,
                to,
                count,
                FastMath.max(count, refinement * 14),
                reach,
                Strip.along(profile, List.of(from, to), count));
    }
}
