package flowshy.verdict.figure;

import flowshy.hair.Moments;
import flowshy.response.Decay;
import flowshy.response.Device;
import flowshy.response.Oscillator;
import flowshy.response.Response;
import flowshy.response.ResponsePoint;
import flowshy.verdict.BandReading;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.DeviceFacts;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.error.ErrorBudget;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/**
 * A device as named quantities see it: every part is worked out when it is first asked for, and then kept, so that one quantity at one
 * point costs only what it needs. For one thread.
 */
public final class Evaluated {
    private final BandsQuestion question;
    private final double frequency;
    // parts: null until asked for
    private Response response;
    private ResponsePoint point;
    private Moments moments;
    private OptionalDouble resonance;
    private Optional<Decay> decay;
    private BandReading reading;
    private List<ReadingBand> bands;
    private Optional<ErrorBudget> error;
    private OptionalDouble bending;

    /**
     * A device at the frequency of comparison of its question.
     *
     * @param question device, band, limits, surroundings
     */
    public Evaluated(BandsQuestion question) {
        this(question, question.reference());
    }

    /**
     * A device at a frequency.
     *
     * @param question device, band, limits, surroundings
     * @param frequency at which what depends on it is evaluated [Hz], also outside the band
     */
    public Evaluated(BandsQuestion question, double frequency) {
        this.question = question;
        this.frequency = frequency;
    }

    /**
     * A device of which the costly parts are known already.
     *
     * @param question device, band, limits, surroundings
     * @param response of the device
     * @param reading what it reads over its band
     * @param error what the surroundings do
     */
    public Evaluated(BandsQuestion question, Response response, BandReading reading, Optional<ErrorBudget> error) {
        this(question, question.reference(), response, reading, error);
    }

    /**
     * The same at another frequency.
     *
     * @param question device, band, limits, surroundings
     * @param frequency at which what depends on it is evaluated [Hz], also outside the band
     * @param response of the device
     * @param reading what it reads over its band
     * @param error what the surroundings do
     */
    public Evaluated(
            BandsQuestion question,
            double frequency,
            Response response,
            BandReading reading,
            Optional<ErrorBudget> error) {
        this(question, frequency);
        this.response = response;
        this.reading = reading;
        this.error = error;
    }

    /**
     * What was asked.
     *
     * @return device, band, limits, surroundings
     */
    public BandsQuestion question() {
        return question;
    }

    /**
     * The device.
     *
     * @return as in the question
     */
    public Device device() {
        return question.device();
    }

    /**
     * Frequency at which what depends on it is evaluated.
     *
     * @return [Hz]
     */
    public double frequency() {
        return frequency;
    }

    Response response() {
        if (response == null) {
            response = new Response(device());
        }
        return response;
    }

    ResponsePoint point() {
        if (point == null) {
            point = response().at(frequency);
        }
        return point;
    }

    Moments moments() {
        if (moments == null) {
            moments = Moments.of(device().hair().profile(), device().pivotDepth());
        }
        return moments;
    }

    /** Absent where no suspension is stated that holds the hair. */
    OptionalDouble resonance() {
        if (resonance == null) {
            resonance = oscillator()
                    .map(swing -> OptionalDouble.of(swing.resonance() / (2.0 * FastMath.PI)))
                    .orElseGet(OptionalDouble::empty);
        }
        return resonance;
    }

    /** Likewise. */
    Optional<Decay> decay() {
        if (decay == null) {
            decay = oscillator().map(Oscillator::decay);
        }
        return decay;
    }

    Optional<Oscillator> oscillator() {
        return response().oscillator().filter(Oscillator::stands);
    }

    BandReading reading() {
        if (reading == null) {
            reading = question.reading(response());
        }
        return reading;
    }

    List<ReadingBand> bands() {
        if (bands == null) {
            bands = reading().bands();
        }
        return bands;
    }

    /**
     * What the surroundings do; what their assumed numbers decide may be left out.
     *
     * @return their error over the band, empty where none are given
     */
    public Optional<ErrorBudget> error() {
        if (error == null) {
            error = question.errorAsTaken();
        }
        return error;
    }

    /** Absent without a modulus. */
    OptionalDouble bending() {
        if (bending == null) {
            bending = DeviceFacts.bendingFrequency(device());
        }
        return bending;
    }
}
