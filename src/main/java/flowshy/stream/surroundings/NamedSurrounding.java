package flowshy.stream.surroundings;

import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import java.util.List;
import java.util.Optional;

/**
 * Starting values under a name of our own.
 *
 * @param name e.g. {@code ventilated room}
 * @param kind of source
 * @param about what it is, a few words
 * @param numbers assumed values with their sources, SI, levels in dB; keys as in a study
 */
public record NamedSurrounding(String name, SourceKind kind, String about, List<StartingValue> numbers) {
    /**
     * One number with its unit.
     *
     * @param stated key, value and source
     * @param unit SI unit, {@code 1} for shares, {@code dB} for levels
     */
    public record StartingValue(Stated stated, String unit) {}

    /** Copies the list. */
    public NamedSurrounding {
        numbers = List.copyOf(numbers);
    }

    /**
     * One of the numbers.
     *
     * @param key as in a study
     * @return the number, empty if this entry has none of that key
     */
    public Optional<Stated> number(String key) {
        return numbers.stream()
                .map(StartingValue::stated)
                .filter(stated -> stated.key().equals(key))
                .findFirst();
    }
}
