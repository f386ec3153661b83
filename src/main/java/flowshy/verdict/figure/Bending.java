package flowshy.verdict.figure;

import flowshy.response.Suspension;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.verdict.DeviceFacts;
import java.util.OptionalDouble;

/** Quantities of the hair as a solid: how stiff it is, and how much room it has. */
final class Bending {
    private static final String NO_MODULUS = "hair.youngs-modulus is not stated";
    private static final String NO_SUSPENSION = "no suspension is stated";
    private static final String NO_HEIGHT = "no height is known of what stands over the hair";

    private Bending() {}

    static Found frequency(Evaluated device) {
        return device.bending().isPresent() ? Found.of(device.bending().getAsDouble()) : Found.notStated(NO_MODULUS);
    }

    static Found ratio(Evaluated device) {
        if (device.bending().isEmpty()) {
            return Found.notStated(NO_MODULUS);
        }
        return device.resonance().isPresent()
                ? Found.of(device.bending().getAsDouble() / device.resonance().getAsDouble())
                : Swinging.still(device);
    }

    static Found stiffness(Evaluated device) {
        OptionalDouble stiffness = DeviceFacts.bendingStiffness(device.device());
        return stiffness.isPresent() ? Found.of(stiffness.getAsDouble()) : Found.notStated(NO_MODULUS);
    }

    static Found stiffnessRatio(Evaluated device) {
        OptionalDouble stiffness = DeviceFacts.bendingStiffness(device.device());
        if (stiffness.isEmpty()) {
            return Found.notStated(NO_MODULUS);
        }
        return device.device()
                .suspension()
                .map(Suspension::stiffness)
                .map(held -> Found.of(stiffness.getAsDouble() / held))
                .orElseGet(() -> Found.notStated(NO_SUSPENSION));
    }

    static Found clearance(Evaluated device) {
        double length = device.device().hair().profile().length();
        Cover cover = device.device().cover();
        if (cover instanceof RoofedCover roof) {
            return Found.of(roof.gap() - length);
        }
        if (cover instanceof SealedCover sealed && sealed.cavity().isPresent()) {
            return Found.of(sealed.cavity().get().height() - length);
        }
        return Found.notStated(NO_HEIGHT);
    }
}
