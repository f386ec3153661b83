package flowshy.verdict.lid;

import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Verdict;
import flowshy.verdict.envelope.EnvelopeAnswer;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The lid decision.
 *
 * @param bare the device without a cover, at the study's own state
 * @param required attenuation a cover must give, by frequency
 * @param requiredError attenuation that brings the bare error down to its limit at the study's own state [dB], absent without surroundings
 *     and limit
 * @param worst what the states that the device must bear ask beyond that, empty if none are stated
 * @param reference frequency at which sensitivities are compared [Hz]
 * @param covers the candidates, in order of preference
 * @param chosen the first candidate that meets every limit
 * @param remedies what would make the nearest candidate do, if none does
 * @param verdict the decision
 */
public record LidAnswer(
        BandsAnswer bare,
        List<RequiredAttenuation> required,
        OptionalDouble requiredError,
        Optional<OverStates> worst,
        double reference,
        List<CoverRow> covers,
        Optional<CoverRow> chosen,
        List<String> remedies,
        Verdict verdict) {
    /** Copies the lists. */
    public LidAnswer {
        required = List.copyOf(required);
        covers = List.copyOf(covers);
        remedies = List.copyOf(remedies);
    }

    /**
     * What a cover must do over an envelope.
     *
     * @param bare the device without a cover in every state
     * @param required attenuation that the worst state asks, by frequency as at the study's own state, which counts too
     * @param error attenuation that the error limit asks in its worst state [dB], absent likewise
     */
    public record OverStates(EnvelopeAnswer bare, List<AtState> required, Optional<AtState> error) {
        /** Copies the list. */
        public OverStates {
            required = List.copyOf(required);
        }
    }
}
