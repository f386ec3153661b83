package flowshy.verdict.fill;

import flowshy.medium.Medium;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.OpenCover;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Decision;
import flowshy.verdict.Verdict;
import flowshy.verdict.envelope.EnvelopeAnswer;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A device in one fill under one cover.
 *
 * @param fill name of the fill
 * @param cover open: the device stands bare in the fluid; sealed: the fluid is carried along
 * @param medium the fluid at the state, empty if it is refused there
 * @param rejection least rejection over the band [dB]; +∞ where no flow enters, NaN where nothing is read
 * @param at where it is least [Hz]; NaN where it belongs to no frequency
 * @param resonance [Hz], absent without a suspension that holds the hair
 * @param quality Q [-], likewise
 * @param sensitivity θ/A at the reference frequency over that of the study's device there [-]; of the torques without a suspension
 * @param thermalNoise at the reference frequency [m/s²/√Hz], absent without a suspension
 * @param excluded what speaks against the fluid, with an envelope in any state; empty if nothing does
 * @param fromMemory whether density or viscosity is recalled from memory
 * @param judged how the device in it comes out, empty if it is refused
 */
public record FillRow(
        String fill,
        Cover cover,
        Optional<Medium> medium,
        double rejection,
        double at,
        OptionalDouble resonance,
        OptionalDouble quality,
        double sensitivity,
        OptionalDouble thermalNoise,
        List<String> excluded,
        boolean fromMemory,
        Optional<Judged> judged) {
    /** Copies the list. */
    public FillRow {
        excluded = List.copyOf(excluded);
    }

    /**
     * How a device comes out.
     *
     * @param own answer at the study's own state
     * @param envelope over the states that it must bear, empty if none are stated
     * @param verdict limit by limit, with an envelope each at its worst
     * @param misses limits that are not met or undecided, each in words; empty if every limit is met
     */
    public record Judged(BandsAnswer own, Optional<EnvelopeAnswer> envelope, Verdict verdict, List<String> misses) {
        /** Copies the list. */
        public Judged {
            misses = List.copyOf(misses);
        }
    }

    /**
     * Fluid and cover in words.
     *
     * @return e.g. {@code helium, bare}
     */
    public String words() {
        return fill + ", " + (cover instanceof OpenCover ? "bare" : cover.words());
    }

    /**
     * Limits that are not met or undecided.
     *
     * @return each in words, empty if every limit is met and also if the fluid is refused
     */
    public List<String> misses() {
        return judged.map(Judged::misses).orElse(List.of());
    }

    /**
     * Least rejection of all states, the study's own among them.
     *
     * @return figure and state, absent without an envelope and where no flow enters
     */
    public Optional<AtState> lowest() {
        return judged.flatMap(found -> found.envelope().flatMap(states -> states.lowest(found.own())));
    }

    /**
     * Largest error by flow of all states, the study's own among them.
     *
     * @return figure and state, absent without an envelope or surroundings
     */
    public Optional<AtState> largestError() {
        return judged.flatMap(found -> found.envelope().flatMap(states -> states.error(found.own())));
    }

    /**
     * Whether nothing speaks against the fluid and every limit that can be judged is met.
     *
     * @return false also if it is refused
     */
    public boolean fit() {
        return excluded.isEmpty() && judged.isPresent() && misses().isEmpty();
    }

    /**
     * How it comes out.
     *
     * @return decision of the limits; fails where they are met but something else speaks against the fluid, and if it is refused
     */
    public Decision decision() {
        Decision limits = judged.map(found -> found.verdict().decision()).orElse(Decision.FAILS);
        return limits == Decision.MEETS && !excluded.isEmpty() ? Decision.FAILS : limits;
    }
}
