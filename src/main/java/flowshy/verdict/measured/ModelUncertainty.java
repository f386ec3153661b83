package flowshy.verdict.measured;

import flowshy.medium.Medium;
import flowshy.response.Device;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;

/**
 * Standard uncertainty of a prediction by what is known of the medium: its density and its viscosity, each as its table states it, moved
 * one after the other (JCGM 100:2008, 5.1.4 note 2). The force law's own error is not in it: where the law weakens, a caveat says so.
 */
final class ModelUncertainty {
    private final Prediction base;
    private final List<Prediction> moved = new ArrayList<>();

    ModelUncertainty(Device device, Prediction base) {
        this.base = base;
        double density = device.around().uncertainty("density").orElse(0.0);
        double viscosity = device.around().uncertainty("viscosity").orElse(0.0);
        if (density > 0.0) {
            moved.add(new Prediction(in(device, 1.0 + density, 1.0)));
        }
        if (viscosity > 0.0) {
            moved.add(new Prediction(in(device, 1.0, 1.0 + viscosity)));
        }
    }

    /**
     * How far a prediction may be off.
     *
     * @param level standard uncertainty of the natural logarithm of the size [-]
     * @param phase standard uncertainty of the phase [rad]
     */
    record Spread(double level, double phase) {}

    /** Of a prediction that is there. */
    Spread at(Measurand of, boolean perSpeed, double frequency) {
        Optional<Complex> here = base.at(of, perSpeed, frequency);
        double level = 0.0;
        double phase = 0.0;
        for (Prediction other : moved) {
            Optional<Complex> there = other.at(of, perSpeed, frequency);
            if (here.isPresent() && there.isPresent()) {
                Complex change = there.get().divide(here.get());
                level = FastMath.hypot(level, FastMath.log(change.norm()));
                phase = FastMath.hypot(phase, change.getArgument());
            }
        }
        return new Spread(level, phase);
    }

    private static Device in(Device device, double density, double viscosity) {
        Medium around = device.around().scaled(density, viscosity);
        Medium outside = device.outside().equals(device.around()) ? around : device.outside();
        return new Device(device.hair(), device.suspension(), outside, device.cover(), around);
    }
}
