package flowshy.cylinder;

import flowshy.math.Positive;
import flowshy.math.Range;
import flowshy.medium.Medium;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Regular vortices behind a long circular cylinder across a steady stream: when they start, and their frequency.
 *
 * <p>St = f d/u = A + B/√Re, range by range: Fey, König &amp; Eckelmann 1998, Phys. Fluids 10:1547 (from memory). Between Re = 180
 * and 360, where the wake turns three-dimensional and the frequency jumps by a few per cent, a straight line in 1/√Re (own).
 * Parallel shedding; oblique vortices, as behind a cylinder with a free end, run slower by the cosine of their angle, 3 % in
 * Williamson 1989. Re on the diameter.
 *
 * @param radius a [m]
 * @param medium the medium of the stream
 */
public record Shedding(double radius, Medium medium) {
    /** Where vortices are shed and the law holds; Williamson 1996 (seen) puts the onset at 49, Fey et al. at 47. */
    public static final Range REYNOLDS = new Range("Re", 47.0, 2e5);

    private record Piece(double to, double level, double slope) {}

    // the second line joins the values of its neighbours at 180 and 360
    private static final List<Piece> PIECES = List.of(
            new Piece(180.0, 0.2684, -1.0356),
            new Piece(360.0, 0.229752, -0.517086),
            new Piece(1300.0, 0.2257, -0.4402),
            new Piece(5000.0, 0.2040, 0.3364),
            new Piece(REYNOLDS.high(), 0.1776, 2.2023));

    /** @throws IllegalArgumentException if the radius is not positive and finite */
    public Shedding {
        Positive.check("radius [m]", radius);
    }

    /**
     * Strouhal number f d/u of parallel shedding.
     *
     * @param reynolds Re in {@link #REYNOLDS}
     * @return St [-]
     * @throws IllegalArgumentException if Re lies outside the range
     */
    public static double strouhal(double reynolds) {
        if (!REYNOLDS.contains(reynolds)) {
            throw new IllegalArgumentException("shedding is stated for " + REYNOLDS + ", was " + reynolds);
        }
        Piece piece = PIECES.stream()
                .filter(candidate -> reynolds <= candidate.to)
                .findFirst()
                .orElseThrow();
        return piece.level + piece.slope / FastMath.sqrt(reynolds);
    }

    /**
     * Whether a steady stream sheds regular vortices from the cylinder.
     *
     * @param u speed of the stream [m/s], of either sign
     * @return true where Re lies in {@link #REYNOLDS}
     */
    public boolean sheds(double u) {
        return REYNOLDS.contains(reynolds(u));
    }

    /**
     * Frequency of the vortices, that of the force across the stream.
     *
     * @param u speed of the stream [m/s], of either sign
     * @return f [Hz]
     * @throws IllegalArgumentException if no vortices are shed at this speed
     */
    public double frequency(double u) {
        return strouhal(reynolds(u)) * FastMath.abs(u) / (2.0 * radius);
    }

    private double reynolds(double u) {
        return FastMath.abs(u) * 2.0 * radius / medium.kinematicViscosity();
    }
}
