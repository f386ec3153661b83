package flowshy.stream.surroundings;

import flowshy.math.Caveat;
import flowshy.math.Range;
import java.util.List;
import java.util.Optional;

/** Fluctuation of the free stream that a mean flow carries past. */
interface Turbulence {
    /** Density along [(m/s)²/Hz]. */
    double along(double frequency);

    /** Density across [(m/s)²/Hz]. */
    double across(double frequency);

    /** Rms along [m/s]. */
    double deviation();

    /** Frequencies that hold it. */
    Range support();

    /** Steps of the density, rising. */
    List<Double> breaks();

    /** Where viscosity has taken half, if a model knows. */
    Optional<Double> cutOff();

    /** What it must say beside a hair of some length. */
    List<Caveat> caveats(double hairLength);
}
