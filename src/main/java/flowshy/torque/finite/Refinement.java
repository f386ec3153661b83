package flowshy.torque.finite;

import org.hipparchus.util.FastMath;

/**
 * How finely a surface is cut into rings.
 *
 * @param longest longest ring over the length of the outline
 * @param widest largest ring where the outline leans or turns, over its largest radius
 * @param edge ring at an edge, over the radius there
 * @param foot ring at the wall, over the radius there
 * @param growth growth of the ring's length per length along the outline
 */
record Refinement(double longest, double widest, double edge, double foot, double growth) {
    static final Refinement ROUGH = new Refinement(1.0 / 6.0, 0.5, 0.15, 0.2, 1.2);

    static final Refinement COARSE = new Refinement(1.0 / 8.0, 0.35, 0.08, 0.12, 0.9);

    static final Refinement FINE = new Refinement(1.0 / 13.0, 0.2, 0.03, 0.05, 0.55);

    /** δ²/a² = 2/β below which rings on a slope shrink with the layer: their steps of density there cost as ln(ring/δ). */
    private static final double THIN_LAYER = 0.0625;

    double widest(double beta) {
        double square = 2.0 / beta;
        return square < THIN_LAYER ? widest * FastMath.pow(square / THIN_LAYER, 0.25) : widest;
    }
}
