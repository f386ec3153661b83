package flowshy.stream.cover;

import flowshy.medium.Medium;
import flowshy.stream.HeightShare;
import flowshy.stream.Source;
import flowshy.stream.WallShare;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * One source of flow as it arrives at the hair under a cover. Time factor e^{+iωt}.
 *
 * <p>Driven flow (tones, sound): φ and the cover's own profile. A stream: bare as the source has it; under a roof the through-flow law
 * with its gain and a parabola, or where that is not developed the source's own layer on both walls; a lid with holes through passes what
 * drives against their steady resistance, one with holes on one side breathes with the stream's pressure fluctuation ρUu; a measured cover
 * attenuates the stream as it does the flow at the lowest frequency it was measured at; a sealed one lets nothing in.
 *
 * @param source outside
 * @param cover over the hair
 * @param medium under the cover
 */
public record Exposure(Source source, Cover cover, Medium medium) {
    /** Loss of the dynamic pressure in one row of holes, entry and exit together (textbook, from memory). */
    private static final double HOLE_LOSS = 1.5;

    /**
     * Mean speed at a height over the wall.
     *
     * @param height z [m]
     * @return [m/s], along the source's direction
     */
    public double meanSpeedAt(double height) {
        double outside = source.meanSpeed();
        if (outside == 0.0 || cover.closed()) {
            return 0.0;
        }
        if (cover instanceof RoofedCover roof) {
            RoofThroughFlow flow = roof.throughFlow(medium);
            return flow.speed(outside) * channelShape(roof, height);
        }
        if (cover instanceof VentedCover vented) {
            return vented.through() ? throughSpeed(vented, outside) : 0.0;
        }
        if (cover instanceof MeasuredCover measured) {
            return source.meanSpeedAt(height) * measured.slowest();
        }
        return source.meanSpeedAt(height);
    }

    /**
     * The part of the force that a driving pressure gradient adds, over that of the free stream outside.
     *
     * @param omega angular frequency [rad/s]
     * @return φ for driven flow, zero for a stream [-]
     */
    public Complex gradient(double omega) {
        return source.driven() ? cover.factor(omega, medium) : Complex.ZERO;
    }

    /**
     * Fluctuation along the source's direction, over that of the free stream outside.
     *
     * @param omega angular frequency [rad/s]
     * @return s(z) at this frequency
     */
    public HeightShare along(double omega) {
        return source.driven() ? driven(omega) : carried(source.share(omega), omega);
    }

    /**
     * Fluctuation across the source's direction, over that of the free stream outside.
     *
     * @param omega angular frequency [rad/s]
     * @return s(z) at this frequency
     */
    public HeightShare across(double omega) {
        return source.driven() ? driven(omega) : carried(source.acrossShare(omega), omega);
    }

    private HeightShare driven(double omega) {
        Complex factor = cover.factor(omega, medium);
        WallShare profile = cover.profile(medium);
        return height -> profile.share(height, omega).multiply(factor);
    }

    private HeightShare carried(HeightShare bare, double omega) {
        if (cover.closed()) {
            return height -> Complex.ZERO;
        }
        if (cover instanceof RoofedCover roof) {
            RoofThroughFlow flow = roof.throughFlow(medium);
            double gain = flow.gain(source.meanSpeed());
            boolean developed = flow.developed(source.meanSpeed());
            return height -> developed
                    ? new Complex(gain * flow.parabola(height))
                    : bare.at(FastMath.min(height, roof.gap() - height)).multiply(gain);
        }
        if (cover instanceof VentedCover vented) {
            return vented(vented, omega);
        }
        if (cover instanceof MeasuredCover measured) {
            Complex factor = measured.factor(omega, medium);
            return height -> bare.at(height).multiply(factor);
        }
        return bare;
    }

    private HeightShare vented(VentedCover vented, double omega) {
        WallShare profile = vented.profile(medium);
        double outside = source.meanSpeed();
        Complex gain = vented.through()
                ? new Complex((throughSpeed(vented, 1.001 * outside) - throughSpeed(vented, 0.999 * outside))
                        / (0.002 * outside))
                : vented.breathing(omega, medium).multiply(medium.density() * outside);
        return height -> profile.share(height, omega).multiply(gain);
    }

    private double channelShape(RoofedCover roof, double height) {
        RoofThroughFlow flow = roof.throughFlow(medium);
        return flow.developed(source.meanSpeed())
                ? flow.parabola(height)
                : source.meanSpeedAt(FastMath.min(height, roof.gap() - height)) / source.meanSpeed();
    }

    /**
     * Steady flow through holes on both sides: ½ρU² = 2 R Q + 2 · ½ρ K (Q/(nA))², the stagnation pressure spent on both rows. Own
     * estimate.
     */
    private double throughSpeed(VentedCover vented, double outside) {
        HoleImpedance hole = vented.hole(medium);
        double area = vented.holes() * hole.area();
        double linear = 2.0 * hole.steady() / vented.holes();
        double square = medium.density() * HOLE_LOSS / (area * area);
        double pressure = 0.5 * medium.density() * outside * outside;
        // square Q² + linear Q − pressure = 0, in the form that keeps its digits where friction dominates
        double flow = 2.0 * pressure / (linear + FastMath.sqrt(linear * linear + 4.0 * square * pressure));
        return FastMath.min(outside, flow / vented.cavitySection());
    }
}
