package flowshy.stream.surroundings;

import flowshy.math.Range;
import flowshy.medium.Medium;
import flowshy.stream.Line;
import flowshy.stream.Source;
import flowshy.stream.SourceKind;
import java.util.List;

/** An oscillation of one frequency along the wall: a pump, a fan's blade passing, a loudspeaker. */
public final class Tone extends DrivenFlow {
    private final Line line;

    /**
     * A tone in a medium.
     *
     * @param name the user's name for it
     * @param direction φ [rad]
     * @param frequency [Hz]
     * @param deviation rms velocity of the free stream [m/s]
     * @param medium what oscillates
     * @throws IllegalArgumentException if frequency or velocity is not positive and finite
     */
    public Tone(String name, double direction, double frequency, double deviation, Medium medium) {
        super(name, direction, medium);
        this.line = new Line(frequency, deviation);
    }

    @Override
    public SourceKind kind() {
        return SourceKind.TONE;
    }

    @Override
    public double density(double frequency) {
        return 0.0;
    }

    @Override
    public List<Line> lines() {
        return List.of(line);
    }

    @Override
    public Range support() {
        return new Range("frequency [Hz]", 0.5 * line.frequency(), 2.0 * line.frequency());
    }

    @Override
    public List<Double> breaks() {
        return List.of();
    }

    @Override
    public Source in(Medium other) {
        return new Tone(name(), direction(), line.frequency(), line.deviation(), other);
    }

    @Override
    double deviation() {
        return line.deviation();
    }
}
