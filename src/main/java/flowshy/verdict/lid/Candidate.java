package flowshy.verdict.lid;

import flowshy.medium.Medium;
import flowshy.response.Device;
import flowshy.stream.cover.Cover;

/**
 * A cover that may be chosen.
 *
 * @param cover the cover
 * @param around what touches the hair under it
 */
public record Candidate(Cover cover, Medium around) {
    /**
     * A device under this cover; stiffness and structural damping are held.
     *
     * @param device of the study
     * @return the same hair under this cover
     */
    public Device over(Device device) {
        return new Device(device.hair(), device.suspension(), device.outside(), cover, around);
    }
}
