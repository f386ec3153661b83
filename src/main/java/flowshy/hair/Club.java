package flowshy.hair;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Thin stalk, a shoulder that widens as half a cosine, a head of one diameter, and a flat or half-spherical end.
 *
 * @param length total length L [m]
 * @param stalkRadius radius of the stalk [m]
 * @param stalkLength height at which the shoulder begins [m]
 * @param shoulderLength height over which the radius grows, zero for a step [m]
 * @param headRadius radius of the head, at least that of the stalk [m]
 * @param end flat, or round with the head's radius
 */
public record Club(
        double length, double stalkRadius, double stalkLength, double shoulderLength, double headRadius, End end)
        implements Profile {
    /** How the head ends. */
    public enum End {
        /** cut straight across */
        FLAT,
        /** half a sphere of the head's radius */
        ROUND
    }

    /** @throws IllegalArgumentException if a dimension is out of its range or the parts are longer than the hair */
    public Club {
        Dimensions.positive("length", length);
        Dimensions.positive("stalk radius", stalkRadius);
        Dimensions.positive("stalk length", stalkLength);
        Dimensions.notNegative("shoulder length", shoulderLength);
        Dimensions.positive("head radius", headRadius);
        Dimensions.slender(length, headRadius);
        if (!(headRadius >= stalkRadius)) {
            throw new IllegalArgumentException("head radius " + headRadius + " m is below the stalk's " + stalkRadius);
        }
        if (!(headStraight(length, stalkLength, shoulderLength, headRadius, end) >= -1e-12 * length)) {
            throw new IllegalArgumentException("stalk, shoulder and end are together longer than " + length + " m");
        }
    }

    @Override
    public String shape() {
        return "club";
    }

    @Override
    public double radius(double z) {
        if (z <= stalkLength) {
            return stalkRadius;
        }
        if (z < stalkLength + shoulderLength) {
            double turn = FastMath.PI * (z - stalkLength) / shoulderLength;
            return stalkRadius + 0.5 * (headRadius - stalkRadius) * (1.0 - FastMath.cos(turn));
        }
        double intoEnd = end == End.ROUND ? z - (length - headRadius) : 0.0;
        if (intoEnd <= 0.0) {
            return headRadius;
        }
        if (z >= length) {
            return 0.0; // a rounding error of the difference would be a flat of its root, 1e-8 of the radius wide
        }
        // (R - x)(R + x) keeps its digits near the tip, R² - x² does not
        return FastMath.sqrt(FastMath.max(0.0, (headRadius - intoEnd) * (headRadius + intoEnd)));
    }

    @Override
    public List<Double> breaks() {
        List<Double> heights = new ArrayList<>(List.of(0.0, stalkLength));
        addAbove(heights, stalkLength + shoulderLength);
        if (end == End.ROUND) {
            addAbove(heights, length - headRadius);
        }
        addAbove(heights, length);
        return List.copyOf(heights);
    }

    @Override
    public Profile thickened(double factor) {
        return new Club(length, stalkRadius * factor, stalkLength, shoulderLength, headRadius * factor, end);
    }

    @Override
    public double room() {
        double forHead = length - stalkLength - shoulderLength;
        double byWidth = length / (2.0 * headRadius);
        return end == End.ROUND ? FastMath.min(byWidth, forHead / headRadius) : byWidth;
    }

    @Override
    public Profile lengthened(double factor) {
        return new Club(length * factor, stalkRadius, stalkLength * factor, shoulderLength * factor, headRadius, end);
    }

    @Override
    public double largestRadius() {
        return headRadius;
    }

    @Override
    public double smallestRadius() {
        return stalkRadius;
    }

    /**
     * Length of the head's straight part, negative if the parts do not fit.
     *
     * @param length total length [m]
     * @param stalkLength [m]
     * @param shoulderLength [m]
     * @param headRadius [m]
     * @param end flat or round
     * @return what is left between shoulder and end [m]
     */
    public static double headStraight(
            double length, double stalkLength, double shoulderLength, double headRadius, End end) {
        return length - stalkLength - shoulderLength - (end == End.ROUND ? headRadius : 0.0);
    }

    private void addAbove(List<Double> heights, double z) {
        if (z > heights.get(heights.size() - 1) * (1.0 + 1e-12)) {
            heights.add(z);
        }
    }
}
