package flowshy.stream.record;

import flowshy.math.Density;
import flowshy.stream.Line;
import java.util.List;
import java.util.Optional;

/**
 * What a measured file says of a signal.
 *
 * @param signal what was measured; densities, lines and mean are in its SI unit
 * @param density one-sided density of the random part; empty for a file of lines
 * @param lines sinusoids; empty for a file of densities
 * @param mean mean value of a record in time, zero for the other forms
 * @param averaging how a record became a density; empty for the other forms
 * @param notes what was left out or taken for granted, a sentence each
 */
public record MeasuredSpectrum(
        Signal signal,
        Optional<Density> density,
        List<Line> lines,
        double mean,
        Optional<Averaging> averaging,
        List<String> notes) {
    /** Copies the lists. */
    public MeasuredSpectrum {
        lines = List.copyOf(lines);
        notes = List.copyOf(notes);
    }

    /**
     * Mean square of all, without the mean value.
     *
     * @return square of the signal's SI unit
     */
    public double meanSquare() {
        double sum = density.map(Density::meanSquare).orElse(0.0);
        for (Line line : lines) {
            sum += line.deviation() * line.deviation();
        }
        return sum;
    }
}
