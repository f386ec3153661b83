package flowshy.verdict.curve;

import flowshy.response.Device;
import flowshy.stream.StokesLayer;
import flowshy.verdict.Band;
import java.util.List;
import org.hipparchus.util.FastMath;

/**
 * Thickness of the viscous layer about a hair and over its wall, at three frequencies.
 *
 * @param all at the lower end of the band, in its middle on a logarithmic scale, at its upper end
 */
public record Layers(List<Layer> all) {
    /**
     * One layer.
     *
     * @param frequency [Hz]
     * @param thickness δ = √(2ν/ω) [m]
     */
    public record Layer(double frequency, double thickness) {}

    /** Copies the list. */
    public Layers {
        all = List.copyOf(all);
    }

    /**
     * The layers of a device.
     *
     * @param device gives the medium around the hair
     * @param band its ends and middle
     * @return thickest first
     */
    public static Layers of(Device device, Band band) {
        StokesLayer law = new StokesLayer(device.around().kinematicViscosity());
        return new Layers(List.of(band.from(), FastMath.sqrt(band.from() * band.to()), band.to()).stream()
                .map(frequency -> new Layer(frequency, law.thickness(2.0 * FastMath.PI * frequency)))
                .toList());
    }
}
