package flowshy.verdict.error;

import flowshy.math.Caveat;
import flowshy.math.Range;
import flowshy.medium.Medium;
import flowshy.stream.HeightShare;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import java.util.List;
import org.hipparchus.complex.Complex;

/**
 * A source whose flow is the same at every height, flat in frequency: the error budget of such a flow can be worked by hand.
 *
 * @param name any
 * @param direction φ [rad]
 * @param meanSpeed U [m/s]
 * @param density S along and across [(m/s)²/Hz]
 * @param lines sinusoids
 * @param driven whether a gradient drives it
 */
record PlainSource(String name, double direction, double meanSpeed, double density, List<Line> lines, boolean driven)
        implements Source {
    static PlainSource tone(double frequency, double speed, double direction) {
        return new PlainSource("tone", direction, 0.0, 0.0, List.of(new Line(frequency, speed)), true);
    }

    static PlainSource stream(double speed, double density, double direction) {
        return new PlainSource("stream", direction, speed, density, List.of(), false);
    }

    @Override
    public SourceKind kind() {
        return driven ? SourceKind.TONE : SourceKind.STREAM;
    }

    @Override
    public Source in(Medium other) {
        return this;
    }

    @Override
    public double meanSpeedAt(double height) {
        return meanSpeed;
    }

    @Override
    public double density(double frequency) {
        return density;
    }

    @Override
    public double acrossDensity(double frequency) {
        return driven ? 0.0 : density;
    }

    @Override
    public HeightShare share(double omega) {
        return height -> Complex.ONE;
    }

    @Override
    public HeightShare acrossShare(double omega) {
        return share(omega);
    }

    @Override
    public Range support() {
        return new Range("frequency [Hz]", 1.0, 1000.0);
    }

    @Override
    public List<Double> breaks() {
        return List.of();
    }

    @Override
    public List<Stated> assumed() {
        return List.of();
    }

    @Override
    public Source varied(String key, double factor) {
        throw new IllegalArgumentException("nothing is assumed here");
    }

    @Override
    public List<Caveat> caveats(double hairLength) {
        return List.of();
    }
}
