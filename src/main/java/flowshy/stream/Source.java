package flowshy.stream;

import flowshy.math.Caveat;
import flowshy.math.Range;
import flowshy.medium.Medium;
import java.util.List;

/**
 * One named cause of flow at the hair: a steady part, a random part and lines, each as the free stream would have it and as it arrives at
 * a height over the wall.
 *
 * <p>Time factor e^{+iωt}; densities are one-sided; along is the direction of the source, across is at right angles to it and parallel to
 * the wall. The random part at a height is {@code share(ω).at(z)} times that of the free stream and taken as one wave over the whole
 * hair, so that a torque's density is |∫ … share dz|² · density. Sources are uncorrelated with each other.
 */
public interface Source {
    /**
     * The name the user gave.
     *
     * @return e.g. {@code draught}
     */
    String name();

    /**
     * What kind of source it is.
     *
     * @return its kind
     */
    SourceKind kind();

    /**
     * Angle between the source's direction and the sensitive axis.
     *
     * @return φ [rad]
     */
    double direction();

    /**
     * Mean speed of the free stream.
     *
     * @return U [m/s], zero for what only oscillates
     */
    double meanSpeed();

    /**
     * Mean speed over the wall.
     *
     * @param height z [m], zero or more
     * @return [m/s]
     */
    double meanSpeedAt(double height);

    /**
     * Density of the free stream's fluctuation along the source's direction.
     *
     * @param frequency f &gt; 0 [Hz]
     * @return S_u [(m/s)²/Hz], zero where the source has none
     */
    double density(double frequency);

    /**
     * Density of the free stream's fluctuation across the source's direction.
     *
     * @param frequency f &gt; 0 [Hz]
     * @return S_v [(m/s)²/Hz], zero for what has one direction only
     */
    double acrossDensity(double frequency);

    /**
     * Fluctuation along, over that of the free stream, on an open wall.
     *
     * @param omega angular frequency [rad/s]
     * @return s(z) at this frequency
     */
    HeightShare share(double omega);

    /**
     * Fluctuation across, over that of the free stream, on an open wall.
     *
     * @param omega angular frequency [rad/s]
     * @return s(z) at this frequency; what has one direction only returns the same as along
     */
    HeightShare acrossShare(double omega);

    /**
     * Whether a pressure gradient drives the fluctuation, so that the force has the term of the free stream besides Γ times the local
     * velocity. Where it does, a cover's own profile takes the place of {@link #share}.
     *
     * @return true for tones and sound, false for what a stream carries along
     */
    boolean driven();

    /**
     * The sinusoids in it.
     *
     * @return rising in frequency; empty for a stream
     */
    List<Line> lines();

    /**
     * Frequencies that hold the random part, but for a thousandth of its variance.
     *
     * @return range [Hz]; for a source of lines only, from half the lowest to twice the highest
     */
    Range support();

    /**
     * Frequencies inside the support where the density steps or has a corner that an integral should split at.
     *
     * @return rising [Hz], may be empty
     */
    List<Double> breaks();

    /**
     * Numbers that were taken for want of better.
     *
     * @return may be empty
     */
    List<Stated> assumed();

    /**
     * The same source with one assumed number multiplied.
     *
     * @param key key of one of {@link #assumed()}
     * @param factor positive
     * @return a new source
     * @throws IllegalArgumentException if no assumed number has this key
     */
    Source varied(String key, double factor);

    /**
     * The same source where another medium takes the place of its own: speeds as they are, of sound the pressure; what was computed for
     * want of a statement is computed anew.
     *
     * @param other what flows or carries the sound
     * @return a new source
     * @throws UnfitMediumException if no law covers it there
     */
    Source in(Medium other);

    /**
     * What must stand beside figures of this source.
     *
     * @param hairLength L, for the thickness of the layer against it [m]
     * @return may be empty
     */
    List<Caveat> caveats(double hairLength);
}
