package flowshy.verdict;

import flowshy.verdict.figure.Sense;
import java.util.OptionalDouble;

/**
 * One limit of a study and what was found.
 *
 * @param name key under {@code accept}, e.g. {@code rejection}
 * @param unit unit of both numbers, e.g. {@code dB}
 * @param sense whether it is a least or a largest value
 * @param required what was asked
 * @param found what was found; absent where infinite or undefined
 * @param at frequency at which it was found [Hz], absent where it belongs to none
 * @param decision how it comes out
 * @param reason why a number is absent, or a remark; empty if there is none
 */
public record Limit(
        String name,
        String unit,
        Sense sense,
        double required,
        OptionalDouble found,
        OptionalDouble at,
        Decision decision,
        String reason) {}
