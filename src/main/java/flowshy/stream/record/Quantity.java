package flowshy.stream.record;

import java.util.Arrays;
import java.util.Optional;
import java.util.stream.Collectors;

/** In what form a file holds a signal. */
public enum Quantity {
    /** one-sided density, square of the signal per Hz */
    DENSITY("density", "(%s)2/Hz"),
    /** square root of the one-sided density */
    AMPLITUDE_DENSITY("amplitude density", "%s/rtHz"),
    /** rms or level in third-octave or octave bands, by their mid-band frequency */
    BAND_LEVELS("band levels", "%s"),
    /** rms of one sinusoid a row */
    RMS_LINES("rms lines", "%s"),
    /** the signal itself at equal steps of time */
    TIME_RECORD("time record", "%s");

    private final String word;
    private final String form;

    Quantity(String word, String form) {
        this.word = word;
        this.form = form;
    }

    /**
     * The words a study uses.
     *
     * @return e.g. {@code amplitude density}
     */
    public String word() {
        return word;
    }

    /**
     * The quantity of a word.
     *
     * @param word as a study writes it
     * @return the quantity, empty if there is none of this name
     */
    public static Optional<Quantity> of(String word) {
        return Arrays.stream(values()).filter(q -> q.word.equals(word)).findFirst();
    }

    /** All words, for a message. */
    static String words() {
        return Arrays.stream(values()).map(Quantity::word).collect(Collectors.joining(", "));
    }

    /** How the unit of the signal is written in the unit of this quantity. */
    String unit(String signalUnit) {
        return String.format(java.util.Locale.ROOT, form, signalUnit);
    }

    /** Whether the rows run over frequency. */
    boolean overFrequency() {
        return this != TIME_RECORD;
    }
}
