package flowshy.verdict.force;

import flowshy.medium.Medium;
import flowshy.response.Device;
import flowshy.torque.finite.FiniteHair;
import flowshy.torque.finite.FiniteTorques;
import flowshy.torque.finite.ForceSlice;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Force of the medium along a hair on a bare wall at one frequency: the whole hair's solution beside strip theory, and what strip
 * theory misses of the torques.
 *
 * @param frequency [Hz]
 * @param length of the hair [m]
 * @param found the solution on the finer meshes, empty where the layer is too thin for it
 * @param highest highest frequency that is solved [Hz]
 */
public record ForceAlong(double frequency, double length, Optional<FiniteTorques> found, double highest) {
    /** Parts that a printed table shows. */
    private static final int PARTS = 10;

    /**
     * Force along one part of the hair.
     *
     * @param from lower end [m]
     * @param to upper end, equal to the lower for the flat faces together [m]
     * @param stream force of a stream of unit velocity on the part [N per m/s]
     * @param stripStream the same by strip theory
     * @param rocking force on the hair turning at unit angular velocity [N per rad/s]
     * @param stripRocking the same by strip theory
     */
    public record Part(
            double from, double to, Complex stream, Complex stripStream, Complex rocking, Complex stripRocking) {}

    /**
     * Solves a device's hair in the medium around it, as if it stood bare.
     *
     * @param device hair and medium; the cover is left out
     * @param frequency positive [Hz]
     * @return the distribution
     */
    public static ForceAlong of(Device device, double frequency) {
        Medium medium = device.around();
        FiniteHair hair = new FiniteHair(
                device.hair().profile(),
                medium,
                device.pivotDepth(),
                device.hair()
                        .footGap()
                        .orElse(FiniteHair.defaultGap(device.hair().profile())));
        double omega = 2.0 * FastMath.PI * frequency;
        return new ForceAlong(
                frequency,
                device.hair().profile().length(),
                omega <= hair.highestFrequency() ? Optional.of(hair.at(omega)) : Optional.empty(),
                hair.highestFrequency() / (2.0 * FastMath.PI));
    }

    /**
     * Error of strip theory in the torque of a stream.
     *
     * @return strip theory over the whole hair's torque, less one; complex, its size is the relative error [-]
     * @throws java.util.NoSuchElementException if nothing was solved
     */
    public Complex streamError() {
        return found.orElseThrow().streamFactor().reciprocal().subtract(1.0);
    }

    /**
     * Error of strip theory in the torque on the turning hair.
     *
     * @return as {@link #streamError}
     * @throws java.util.NoSuchElementException if nothing was solved
     */
    public Complex rockingError() {
        return found.orElseThrow().rockingFactor().reciprocal().subtract(1.0);
    }

    /**
     * The slices of the solution.
     *
     * @return from the wall to the tip, flat faces among them; empty if nothing was solved
     */
    public List<ForceSlice> slices() {
        return found.map(FiniteTorques::slices).orElse(List.of());
    }

    /**
     * Force on ten equal parts of the side, then on the flat faces together if there are any.
     *
     * @return from the wall to the tip; empty if nothing was solved
     */
    public List<Part> parts() {
        List<Part> parts = new ArrayList<>();
        if (found.isEmpty()) {
            return parts;
        }
        for (int n = 0; n < PARTS; n++) {
            parts.add(part(length * n / PARTS, length * (n + 1) / PARTS));
        }
        Part faces = new Part(length, length, Complex.ZERO, Complex.ZERO, Complex.ZERO, Complex.ZERO);
        for (ForceSlice slice : slices()) {
            faces = slice.length() > 0.0 ? faces : plus(faces, slice, 1.0);
        }
        if (!faces.stream().isZero()) {
            parts.add(faces);
        }
        return parts;
    }

    private Part part(double from, double to) {
        Part part = new Part(from, to, Complex.ZERO, Complex.ZERO, Complex.ZERO, Complex.ZERO);
        for (ForceSlice slice : slices()) {
            double shared = FastMath.min(to, slice.top()) - FastMath.max(from, slice.bottom());
            if (shared > 0.0 && slice.length() > 0.0) {
                part = plus(part, slice, shared / slice.length());
            }
        }
        return part;
    }

    private static Part plus(Part part, ForceSlice slice, double share) {
        return new Part(
                part.from(),
                part.to(),
                part.stream().add(slice.stream().multiply(share)),
                part.stripStream().add(slice.stripStream().multiply(share)),
                part.rocking().add(slice.rocking().multiply(share)),
                part.stripRocking().add(slice.stripRocking().multiply(share)));
    }
}
