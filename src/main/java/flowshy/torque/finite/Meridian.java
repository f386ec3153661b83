package flowshy.torque.finite;

import flowshy.hair.Profile;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Outline of a body of revolution from its lowest point to its highest, as fine polylines; the height never falls.
 *
 * @param parts smooth parts, the end of each the beginning of the next; between them the surface has an edge
 */
record Meridian(List<List<MeridianPoint>> parts) {
    /** A turn of the outline above this is an edge, one below it is smoothed over by the rings [rad]. */
    private static final double EDGE = 0.3;

    private static final int SAMPLES = 600;

    private static final int FEWEST_SAMPLES = 40;

    Meridian {
        parts = parts.stream().map(List::copyOf).toList();
    }

    /**
     * Outline of a hair, open at the wall.
     *
     * @param profile its shape
     * @param scale length that becomes 1 [m]
     */
    static Meridian of(Profile profile, double scale) {
        List<List<MeridianPoint>> parts = new ArrayList<>();
        List<Double> breaks = profile.breaks();
        int samples = FastMath.max(FEWEST_SAMPLES, SAMPLES / (breaks.size() - 1));
        for (int i = 1; i < breaks.size(); i++) {
            List<MeridianPoint> part = stretch(profile, breaks.get(i - 1), breaks.get(i), samples, scale);
            if (parts.isEmpty()) {
                parts.add(part);
                continue;
            }
            List<MeridianPoint> before = parts.get(parts.size() - 1);
            MeridianPoint end = before.get(before.size() - 1);
            MeridianPoint start = part.get(0);
            if (FastMath.abs(start.radius() - end.radius()) > 1e-9) { // a step
                parts.add(straight(end, start));
                parts.add(part);
            } else if (FastMath.abs(direction(part, 1) - direction(before, before.size() - 1)) > EDGE) {
                parts.add(part);
            } else {
                before.addAll(part.subList(1, part.size()));
            }
        }
        List<MeridianPoint> last = parts.get(parts.size() - 1);
        MeridianPoint tip = last.get(last.size() - 1);
        if (tip.radius() > 0.0) {
            parts.add(straight(tip, new MeridianPoint(0.0, tip.height())));
        }
        return new Meridian(parts);
    }

    /** Straight line, points crowding at both ends. */
    static List<MeridianPoint> straight(MeridianPoint from, MeridianPoint to) {
        List<MeridianPoint> points = new ArrayList<>();
        for (int n = 0; n <= SAMPLES / 4; n++) {
            double share = crowded(n, SAMPLES / 4);
            points.add(new MeridianPoint(
                    from.radius() + share * (to.radius() - from.radius()),
                    from.height() + share * (to.height() - from.height())));
        }
        return points;
    }

    private static List<MeridianPoint> stretch(Profile profile, double from, double to, int samples, double scale) {
        List<MeridianPoint> points = new ArrayList<>();
        // the radius may step at a break; a profile gives the lower side of the step there
        points.add(new MeridianPoint(profile.radius(FastMath.nextUp(from)) / scale, from / scale));
        for (int n = 1; n < samples; n++) {
            double z = from + crowded(n, samples) * (to - from);
            points.add(new MeridianPoint(profile.radius(z) / scale, z / scale));
        }
        points.add(new MeridianPoint(profile.radius(to) / scale, to / scale));
        return points;
    }

    private static double crowded(int n, int of) {
        double sine = FastMath.sin(0.5 * FastMath.PI * n / of);
        return sine * sine;
    }

    /** Angle of the outline against the axis, between a point and the one before. */
    private static double direction(List<MeridianPoint> points, int at) {
        RingPiece chord = RingPiece.between(points.get(at - 1), points.get(at));
        return FastMath.atan2(chord.width(), chord.thickness());
    }
}
