package flowshy.stream.surroundings;

import flowshy.math.Caveat;
import flowshy.stream.wall.FluctuatingLayer;
import flowshy.stream.wall.TurbulentWall;
import java.util.List;
import org.hipparchus.complex.Complex;

/** The wall layer that a stream lies over, laminar, turbulent or in between. */
interface Layer {
    /** Mean speed at the edge of the layer or in the middle of the duct [m/s]. */
    double streamSpeed();

    /** Mean speed at a height [m/s]. */
    double speedAt(double height);

    /** Share of time that it is turbulent. */
    double intermittency();

    /** The turbulent wall, where some of it is turbulent. */
    TurbulentWall wall();

    /** Fluctuation in the laminar layer over that of the stream. */
    Complex laminarShare(FluctuatingLayer component, double height, double omega);

    /** What the layer itself must say. */
    List<Caveat> caveats(double hairLength);
}
