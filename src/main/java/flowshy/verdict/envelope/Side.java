package flowshy.verdict.envelope;

import java.util.List;

/**
 * One number that the envelope moves.
 *
 * @param key path of the number
 * @param values SI, at least one
 * @param words the same as a study writes them, same order
 * @param range whether only the first and the last are corners: the rest lies inside
 */
public record Side(String key, List<Double> values, List<String> words, boolean range) {
    /** @throws IllegalArgumentException if there are no values, or not a word for each */
    public Side {
        values = List.copyOf(values);
        words = List.copyOf(words);
        if (values.isEmpty() || values.size() != words.size()) {
            throw new IllegalArgumentException(key + ": " + values.size() + " values, " + words.size() + " words");
        }
    }

    boolean corner(int index) {
        return !range || index == 0 || index == values.size() - 1;
    }
}
