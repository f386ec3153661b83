package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.stream.wall.DuctFlow;
import flowshy.stream.wall.FluctuatingLayer;
import flowshy.stream.wall.TurbulentWall;
import java.util.List;
import org.hipparchus.complex.Complex;

/** Developed flow of a duct over the wall with the hair. */
record DuctLayer(DuctFlow flow) implements Layer {
    @Override
    public double streamSpeed() {
        return flow.coreSpeed();
    }

    @Override
    public double speedAt(double height) {
        return flow.speedAt(height);
    }

    @Override
    public double intermittency() {
        return flow.intermittency();
    }

    @Override
    public TurbulentWall wall() {
        return flow.wall();
    }

    /** What is carried through a laminar duct is taken to be sheared down to the wall as the mean flow is, an estimate. */
    @Override
    public Complex laminarShare(FluctuatingLayer component, double height, double omega) {
        double middle = flow.section().laminarShare(0.5 * flow.section().depth());
        return new Complex(flow.section().laminarShare(height) / middle);
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        double gamma = intermittency();
        String state =
                gamma == 0.0 ? "laminar" : gamma < 1.0 ? "neither laminar nor turbulent all the time" : "turbulent";
        return List.of(new Caveat(
                Subject.ERROR,
                gamma > 0.0 && gamma < 1.0 ? Weight.WEAK : Weight.NOTE,
                say(
                        "The flow in the duct is %s (Re = %.3g), taken as developed; the hair of %.3g mm reaches %.2g %% of its depth.",
                        state,
                        flow.reynolds(),
                        1e3 * hairLength,
                        100.0 * hairLength / flow.section().depth())));
    }
}
