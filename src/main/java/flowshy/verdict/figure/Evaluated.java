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
import java.util.function.Supplier;
import org.hipparchus.util.FastMath;

/**
 * A device as named quantities see it: every part is worked out when it is first asked for, and then kept, so that one quantity at one
 * point costs only what it needs. For one thread.
 */
public final class Evaluated {
    private final BandsQuestion question;
    private final double frequency;
    private final Supplier<Response> response;
    private final Supplier<ResponsePoint> point;
    private final Supplier<Moments> moments;
    private final Supplier<OptionalDouble> resonance;
    private final Supplier<Optional<Decay>> decay;
    private final Supplier<BandReading> reading;
    private final Supplier<List<ReadingBand>> bands;
    private final Supplier<Optional<ErrorBudget>> error;
    private final Supplier<OptionalDouble> bending;

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
        this.response = new Once<>(() -> new Response(device()));
        this.point = new Once<>(() -> response().at(frequency));
        this.moments = new Once<>(() -> Moments.of(device().hair().profile(), device().pivotDepth()));
        this.resonance = new Once<>(() -> oscillator()
                .map(swing -> OptionalDouble.of(swing.resonance() / (2.0 * FastMath.PI)))
                .orElseGet(OptionalDouble::empty));
        this.decay = new Once<>(() -> oscillator().map(Oscillator::decay));
        this.reading = new Once<>(() -> question.reading(response()));
        this.bands = new Once<>(() -> reading().bands());
        this.error = new Once<>(question::error);
        this.bending = new Once<>(() -> DeviceFacts.bendingFrequency(device()));
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
        this.question = question;
        this.frequency = frequency;
        Evaluated fresh = new Evaluated(question);
        this.response = () -> response;
        this.point = new Once<>(() -> response.at(frequency));
        this.moments = fresh.moments;
        this.resonance = fresh.resonance;
        this.decay = fresh.decay;
        this.reading = () -> reading;
        this.bands = new Once<>(reading::bands);
        this.error = () -> error;
        this.bending = fresh.bending;
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
        return response.get();
    }

    ResponsePoint point() {
        return point.get();
    }

    Moments moments() {
        return moments.get();
    }

    /** Absent where no suspension is stated that holds the hair. */
    OptionalDouble resonance() {
        return resonance.get();
    }

    /** Likewise. */
    Optional<Decay> decay() {
        return decay.get();
    }

    Optional<Oscillator> oscillator() {
        return response().oscillator().filter(Oscillator::stands);
    }

    BandReading reading() {
        return reading.get();
    }

    List<ReadingBand> bands() {
        return bands.get();
    }

    /**
     * What the surroundings do.
     *
     * @return their error over the band, empty where none are given
     */
    public Optional<ErrorBudget> error() {
        return error.get();
    }

    /** Absent without a modulus. */
    OptionalDouble bending() {
        return bending.get();
    }

    /** A value worked out at the first call. */
    private static final class Once<T> implements Supplier<T> {
        private final Supplier<T> work;
        private T value;

        Once(Supplier<T> work) {
            this.work = work;
        }

        @Override
        public T get() {
            if (value == null) { // not worked out yet
                value = work.get();
            }
            return value;
        }
    }
}
