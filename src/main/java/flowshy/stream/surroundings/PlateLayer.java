package flowshy.stream.surroundings;

import static flowshy.math.Figures.say;

import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.stream.wall.BlasiusLayer;
import flowshy.stream.wall.FluctuatingLayer;
import flowshy.stream.wall.PlateFlow;
import flowshy.stream.wall.Transition;
import flowshy.stream.wall.TurbulentWall;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.complex.Complex;

/** Layer over the surface between its leading edge and the hair. */
record PlateLayer(PlateFlow flow) implements Layer {
    @Override
    public double streamSpeed() {
        return flow.laminar().speed();
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

    @Override
    public Complex laminarShare(FluctuatingLayer component, double height, double omega) {
        BlasiusLayer laminar = flow.laminar();
        return component.share(laminar.eta(height), omega * laminar.fetch() / laminar.speed());
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        List<Caveat> caveats = new ArrayList<>();
        double reynolds = flow.laminar().reynolds();
        double gamma = intermittency();
        String state = gamma == 0.0
                ? "laminar"
                : gamma < 0.99 ? say("turbulent %.2g %% of the time", 100.0 * gamma) : "turbulent";
        caveats.add(new Caveat(
                Subject.ERROR,
                Weight.NOTE,
                say(
                        "The layer over the wall is %s (Re_x = %.3g) and %.3g mm thick, the hair %.3g mm long.",
                        state, reynolds, 1e3 * flow.thickness(), 1e3 * hairLength)));
        if (reynolds < BlasiusLayer.REYNOLDS.low()) {
            caveats.add(new Caveat(
                    Subject.ERROR,
                    Weight.WEAK,
                    say(
                            "Re_x = %.3g is below %.3g: the leading edge is still felt and the layer is an estimate.",
                            reynolds, BlasiusLayer.REYNOLDS.low())));
        }
        double turbulence = flow.transition().turbulence();
        if (reynolds > 0.5 * flow.transition().reynolds() && !Transition.TURBULENCE.contains(turbulence)) {
            caveats.add(new Caveat(
                    Subject.ERROR,
                    Weight.WEAK,
                    say(
                            "Transition is near and the turbulence of %.3g %% outside the data of its law (%.2g %% to %.2g %%).",
                            100.0 * turbulence,
                            100.0 * Transition.TURBULENCE.low(),
                            100.0 * Transition.TURBULENCE.high())));
        }
        return caveats;
    }
}
