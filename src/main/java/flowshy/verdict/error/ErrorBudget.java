package flowshy.verdict.error;

import flowshy.math.Caveat;
import flowshy.verdict.ReadingBand;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The error that the surroundings cause, over the band of use.
 *
 * @param sources source by source, in the order of the study
 * @param rms of all sources together, uncorrelated [m/s² rms]
 * @param offset of the mean streams as equivalent acceleration [m/s²], with sign
 * @param offsetOfFullScale its share of full scale [-], absent without one
 * @param staticTilt of the mean streams [rad], absent without a suspension
 * @param noise thermal and readout noise over the band [m/s² rms], absent without a suspension
 * @param smallestReadable where signal equals noise and flow error together (common practice) [m/s² rms]
 * @param dynamicRange 20 lg of full scale over the smallest readable [dB], absent without a full scale
 * @param deflection offset and three standard deviations of error, noise and motion over full scale [-], absent without one
 * @param points density by frequency, even on a logarithmic scale over the band
 * @param thirdOctaves signal against error in each third-octave, empty without a motion
 * @param bands what is read on the spectra, empty without a motion
 * @param caveats what must stand beside the figures
 */
public record ErrorBudget(
        List<SourceError> sources,
        double rms,
        double offset,
        OptionalDouble offsetOfFullScale,
        OptionalDouble staticTilt,
        OptionalDouble noise,
        double smallestReadable,
        OptionalDouble dynamicRange,
        OptionalDouble deflection,
        List<DensityPoint> points,
        List<ThirdOctaveLevel> thirdOctaves,
        List<ReadingBand> bands,
        List<Caveat> caveats) {
    /**
     * Densities at one frequency.
     *
     * @param frequency [Hz]
     * @param sources equivalent acceleration density of each source, same order [(m/s²)²/Hz]
     * @param noise thermal and readout noise [(m/s²)²/Hz], zero without a suspension
     * @param runningRms all sources together from the lower end of the band up to here, lines included [m/s² rms]
     * @param runningNoise noise likewise [m/s² rms]
     */
    public record DensityPoint(
            double frequency, List<Double> sources, double noise, double runningRms, double runningNoise) {
        /** Copies the list. */
        public DensityPoint {
            sources = List.copyOf(sources);
        }
    }

    /**
     * One third-octave.
     *
     * @param middle exact mid-band frequency [Hz]
     * @param signal motion in it [m/s² rms]
     * @param error flow error in it [m/s² rms]
     * @param ratio 20 lg of signal over error [dB]; infinite where no flow acts
     */
    public record ThirdOctaveLevel(double middle, double signal, double error, double ratio) {}

    /** Copies the lists. */
    public ErrorBudget {
        sources = List.copyOf(sources);
        points = List.copyOf(points);
        thirdOctaves = List.copyOf(thirdOctaves);
        bands = List.copyOf(bands);
        caveats = List.copyOf(caveats);
    }

    /**
     * Whether a model has ended that the error rests on.
     *
     * @return true if a caveat says so
     */
    public boolean ended() {
        return caveats.stream().anyMatch(caveat -> caveat.weight() == Caveat.Weight.OUT_OF_RANGE);
    }
}
