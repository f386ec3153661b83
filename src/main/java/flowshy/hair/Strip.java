package flowshy.hair;

import flowshy.math.GaussLegendre;
import java.util.ArrayList;
import java.util.List;

/**
 * One quadrature point along a hair.
 *
 * @param height z [m]
 * @param radius a(z) [m]
 * @param weight share of the length that the point stands for [m]
 */
public record Strip(double height, double radius, double weight) {
    /** Below this share of its middle, the radius at an end of a segment makes the force law steep there. */
    private static final double NARROW = 0.2;

    /**
     * Gauss–Legendre strips on each segment.
     *
     * <p>Towards a pointed or round tip, or a narrow foot, the force law falls like 1/ln a; there the points crowd with the
     * fourth power of the distance, which restores fast convergence.
     *
     * @param profile the shape
     * @param breaks rising heights, first 0 and last the length [m]; the profile's own or finer
     * @param points quadrature points a segment
     * @return strips from wall to tip
     */
    public static List<Strip> along(Profile profile, List<Double> breaks, int points) {
        GaussLegendre rule = GaussLegendre.of(points);
        List<Strip> strips = new ArrayList<>(points * (breaks.size() - 1));
        for (int i = 1; i < breaks.size(); i++) {
            double from = breaks.get(i - 1);
            double span = breaks.get(i) - from;
            double narrow = NARROW * profile.radius(from + 0.5 * span);
            boolean atTop = profile.radius(from + span) < narrow;
            // just above the foot: at a step the foot itself still belongs to the part below
            boolean atFoot = !atTop && profile.radius(from + 1e-6 * span) < narrow;
            for (int n = 0; n < points; n++) {
                double share = 0.5 * (1.0 + rule.point(n));
                double weight = 0.5 * span * rule.weight(n);
                if (atTop || atFoot) {
                    double away = atTop ? 1.0 - share : share;
                    weight *= 4.0 * away * away * away;
                    share = away * away * away * away;
                    share = atTop ? 1.0 - share : share;
                }
                double height = from + span * share;
                double radius = profile.radius(height);
                if (radius
                        > 0.0) { // rounding may put the last of very many points on the very tip, which carries nothing
                    strips.add(new Strip(height, radius, weight));
                }
            }
        }
        return strips;
    }
}
