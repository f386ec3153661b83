package flowshy.hair;

import java.util.List;

/** Radius of a hair along its axis: a body of revolution r = a(z), 0 ≤ z ≤ L, standing on the wall z = 0. */
public sealed interface Profile permits Cylinder, Taper, Club, MeasuredProfile {
    /**
     * Name of the shape as a study writes it.
     *
     * @return cylinder, taper, club or profile
     */
    String shape();

    /**
     * Total length L.
     *
     * @return L [m]
     */
    double length();

    /**
     * Radius at a height above the wall.
     *
     * @param z height, 0 ≤ z ≤ L [m]
     * @return a(z) [m], zero at most at the tip
     */
    double radius(double z);

    /**
     * Heights between which the radius is smooth, rising, first 0 and last L.
     *
     * @return heights [m]
     */
    List<Double> breaks();

    /**
     * The same shape with every diameter multiplied.
     *
     * @param factor positive factor [-]
     * @return the thicker or thinner hair; the length stays
     */
    Profile thickened(double factor);

    /**
     * How much thicker the hair may become.
     *
     * @return largest factor that {@link #thickened} takes [-]; then the hair is as wide as long, or its round end takes the whole
     *     head
     */
    default double room() {
        return length() / (2.0 * largestRadius());
    }

    /**
     * The same shape with every length along the axis multiplied.
     *
     * @param factor positive factor [-]
     * @return the longer or shorter hair; the diameters stay, except that a round end keeps its own radius
     */
    Profile lengthened(double factor);

    /**
     * Largest radius of the hair.
     *
     * @return [m]
     */
    double largestRadius();

    /**
     * Smallest radius of the hair, that of a pointed or rounded end left out.
     *
     * @return [m]
     */
    double smallestRadius();
}
