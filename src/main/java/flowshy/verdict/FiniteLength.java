package flowshy.verdict;

import static flowshy.math.Figures.say;

import flowshy.hair.LengthModel;
import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.response.Device;
import flowshy.response.Response;
import flowshy.stream.cover.Covers;
import flowshy.torque.finite.FiniteFactors;
import flowshy.torque.finite.FiniteHair;
import flowshy.torque.finite.LengthFactors;
import flowshy.torque.finite.RepairedStrips;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.util.FastMath;

/** What must be said of a correction for finite length: its size over the band, its error, where it ends. */
final class FiniteLength {
    /** Error of the factors above which they are a weak point: a twentieth of a decibel is 0.6 %. */
    private static final double SMALL = 0.02;

    private FiniteLength() {}

    static List<Caveat> of(Device device, Band band, LengthFactors factors) {
        FiniteFactors low = factors.at(2.0 * FastMath.PI * band.from());
        FiniteFactors high = factors.at(2.0 * FastMath.PI * band.to());
        double error = FastMath.max(low.streamError(), high.streamError());
        List<Caveat> caveats = new ArrayList<>();
        caveats.add(new Caveat(
                Subject.REJECTION,
                error < SMALL ? Weight.NOTE : Weight.WEAK,
                size(device, band, low, high) + " " + error(device, error)));
        double held = factors.heldAbove() / (2.0 * FastMath.PI);
        if (held < band.to()) {
            caveats.add(new Caveat(
                    Subject.REJECTION,
                    Weight.WEAK,
                    say(
                            "Above %.4g Hz the Stokes layer is thinner than %.2g of the largest radius, the least that is solved: there"
                                    + " the correction stays as it is at %.4g Hz.",
                            held, FiniteHair.LAYER_SHARE.low(), held)));
        }
        if (!device.cover().equals(Covers.OPEN)) {
            caveats.add(new Caveat(
                    Subject.REJECTION,
                    Weight.NOTE,
                    "The correction for finite length is that of a bare wall; the cover shapes the flow, its own walls do not enter the"
                            + " correction."));
        }
        return caveats;
    }

    /** In a cavity the turning hair's medium is confined, which is solved strip by strip. */
    static List<Caveat> inCavity(Device device) {
        return device.hair().lengthModel() == LengthModel.STRIPS
                ? List.of()
                : List.of(new Caveat(
                        Subject.RESONANCE,
                        Weight.NOTE,
                        "In the cavity the fluid that the hair's own turning moves is confined by the wall; there the hair counts strip by"
                                + " strip, tip and foot are not solved."));
    }

    private static String size(Device device, Band band, FiniteFactors low, FiniteFactors high) {
        Response response = new Response(device);
        return say(
                "Finite length (%s): with its tip on its wall the hair takes %.4g times the flow torque of strip theory at %.4g Hz and"
                        + " %.4g times at %.4g Hz (turned by %.2g and %.2g deg), which moves the rejection by %.3g and %.3g dB.",
                device.hair().lengthModel().word(),
                low.stream().norm(),
                band.from(),
                high.stream().norm(),
                band.to(),
                FastMath.toDegrees(low.stream().getArgument()),
                FastMath.toDegrees(high.stream().getArgument()),
                response.finiteLength(band.from()).orElse(0.0),
                response.finiteLength(band.to()).orElse(0.0));
    }

    private static String error(Device device, double error) {
        if (Double.isInfinite(error)) {
            return say(
                    "The error of this estimate is not known here: it was checked for length over diameter from %.3g to %.3g and layer over"
                            + " length from %.2g to %.2g.",
                    RepairedStrips.SLENDERNESS.low(),
                    RepairedStrips.SLENDERNESS.high(),
                    RepairedStrips.LAYER_SHARE.low(),
                    RepairedStrips.LAYER_SHARE.high());
        }
        return device.hair().lengthModel() == LengthModel.ESTIMATE
                ? say("An estimate, within %.2g %% of the whole hair's solution.", 100.0 * error)
                : say("The solution's own error is %.2g %%.", 100.0 * error);
    }
}
