package flowshy.report.chart.device;

import flowshy.report.chart.Overlay;
import flowshy.verdict.measured.Compared;
import flowshy.verdict.measured.Deviation;
import flowshy.verdict.measured.Measurand;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.hipparchus.util.FastMath;

/**
 * Measured responses as points over the model's curves: behind the readout's gain, per acceleration, with twice their standard uncertainty on
 * either side where one is stated.
 */
public final class MeasuredOverlays {
    private static final double COVERAGE = 2.0;

    private MeasuredOverlays() {}

    /**
     * Points of every response, sizes and phases.
     *
     * @param responses beside the model
     * @return in the same order, the phase of a response behind its size
     */
    public static List<Overlay> of(List<Compared> responses) {
        List<Overlay> overlays = new ArrayList<>();
        for (Compared response : responses) {
            Measurand of = response.measured().of();
            Overlay.Of size = switch (of) {
                case MOTION -> Overlay.Of.MOTION;
                case FLOW -> Overlay.Of.FLOW;
                case REJECTION -> Overlay.Of.REJECTION;
            };
            overlays.add(overlay(response, size, point -> size(response, point)));
            if (response.points().stream().anyMatch(point -> point.phase().isPresent())) {
                overlays.add(overlay(
                        response,
                        of == Measurand.MOTION ? Overlay.Of.MOTION_PHASE : Overlay.Of.FLOW_PHASE,
                        point -> phase(response, point)));
            }
        }
        return overlays;
    }

    private static Overlay overlay(Compared response, Overlay.Of of, Function<Deviation, Overlay.Point> point) {
        return new Overlay(
                response.measured().name(),
                of,
                response.points().stream().map(point).toList());
    }

    private static Overlay.Point size(Compared response, Deviation point) {
        double reach = COVERAGE * point.uncertainty().orElse(0.0);
        if (response.measured().of() == Measurand.REJECTION) {
            double level = 20.0 * FastMath.log10(point.measured());
            return new Overlay.Point(point.frequency(), level, level - reach, level + reach);
        }
        double speed = response.measured().reading().perSpeed() ? 2.0 * FastMath.PI * point.frequency() : 1.0;
        double angle = point.measured() / FastMath.abs(response.gain()) / speed;
        double factor = FastMath.pow(10.0, reach / 20.0);
        return new Overlay.Point(point.frequency(), angle, angle / factor, angle * factor);
    }

    /** The phase of the angle per acceleration, within half a turn of zero. */
    private static Overlay.Point phase(Compared response, Deviation point) {
        OptionalDouble measured = point.phase().isPresent() ? point.measuredPhase() : OptionalDouble.empty();
        double turned = response.gain() < 0.0 ? 180.0 : 0.0;
        double quarter = response.measured().reading().perSpeed() ? 90.0 : 0.0;
        double phase = FastMath.toDegrees(measured.orElse(Double.NaN)) - turned - quarter;
        double within = phase - 360.0 * FastMath.rint(phase / 360.0);
        double reach = COVERAGE * FastMath.toDegrees(point.phaseUncertainty().orElse(0.0));
        return new Overlay.Point(point.frequency(), within, within - reach, within + reach);
    }
}
