package flowshy.study;

import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.MediumQuery;
import flowshy.medium.SealedFill;
import flowshy.response.Device;
import flowshy.stream.cover.Cover;
import flowshy.verdict.lid.Candidate;
import java.util.Optional;

/**
 * Where a device stands: under its own cover in its own medium, under another of the study's covers, or in a fluid that takes the medium's
 * place.
 *
 * @param cover stands over the hair
 * @param path of the cover in the study; empty for a cover that the study does not state, which holds what is outside
 * @param around what touches the hair at the study's own state, empty where it is what is outside
 * @param fluid in place of the study's medium, at the study's own state
 */
record DevicePlace(Cover cover, String path, Optional<Medium> around, Optional<MediumQuery> fluid) {
    static DevicePlace own(Device device) {
        return new DevicePlace(device.cover(), "cover", Optional.of(device.around()), Optional.empty());
    }

    static DevicePlace under(Study base, Candidate candidate) {
        int stated = base.candidates().indexOf(candidate);
        if (stated >= 0) {
            return new DevicePlace(
                    candidate.cover(), "candidates[" + stated + "]", Optional.of(candidate.around()), Optional.empty());
        }
        Device device = base.device();
        boolean own = candidate.equals(new Candidate(device.cover(), device.around()));
        return own ? own(device) : new DevicePlace(candidate.cover(), "", Optional.empty(), Optional.empty());
    }

    static DevicePlace filled(MediumQuery fluid, Cover cover) {
        return new DevicePlace(cover, "", Optional.empty(), Optional.of(fluid));
    }

    /** The fluid at a state: as it was closed in under a closed cover, else as the state has it. */
    Medium fluidAt(double temperature, double pressure) {
        MediumQuery own = fluid.orElseThrow();
        return cover.closed() ? new SealedFill(own).at(temperature) : Media.at(own.at(temperature, pressure));
    }
}
