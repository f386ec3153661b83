package flowshy.response;

import flowshy.cylinder.ConfinedCylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/**
 * A hair where it stands.
 *
 * @param hair the hair
 * @param suspension what it turns on, empty if not stated: then torques are known, movements are not
 * @param outside the medium in which the device is used
 * @param cover what stands between
 * @param around the medium that touches the hair: the outside medium, or the fill of a sealed cover
 */
public record Device(Hair hair, Optional<Suspension> suspension, Medium outside, Cover cover, Medium around) {
    /**
     * Depth of the pivot axis.
     *
     * @return h [m], zero without a suspension
     */
    public double pivotDepth() {
        return suspension.map(Suspension::pivotDepth).orElse(0.0);
    }

    /**
     * The same device without its cover, standing in the outside medium.
     *
     * @return the bare device
     */
    public Device bare() {
        return new Device(hair, suspension, outside, Covers.OPEN, outside);
    }

    /**
     * Largest factor by which all diameters can grow in this place: the hair stays a hair, and inside its cavity.
     *
     * @return factor [-], one or more
     */
    public double room() {
        double cavity = cover.cavityRadius().orElse(Double.POSITIVE_INFINITY);
        double inside = cavity / (ConfinedCylinder.NARROWEST * hair.profile().largestRadius());
        return FastMath.min(hair.profile().room(), inside);
    }

    /**
     * The same device with another hair; stiffness and structural damping are held.
     *
     * @param other the hair
     * @return the device
     */
    public Device with(Hair other) {
        return new Device(other, suspension, outside, cover, around);
    }
}
