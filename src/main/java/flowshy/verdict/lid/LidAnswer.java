package flowshy.verdict.lid;

import flowshy.verdict.BandsAnswer;
import flowshy.verdict.Verdict;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The lid decision.
 *
 * @param bare the device without a cover
 * @param required attenuation a cover must give, by frequency
 * @param requiredError attenuation that brings the bare error down to its limit [dB], absent without surroundings and limit
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
}
