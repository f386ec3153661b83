package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.units.QuantityException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * One certain word, or a number of one of some dimensions.
 *
 * @param word the word
 * @param numbers what the number may be; the first that fits is taken
 */
public record WordOr(String word, List<Measure> numbers) implements Value {
    /** Copies the list. */
    public WordOr {
        numbers = List.copyOf(numbers);
    }

    @Override
    public String kind() {
        return word + ", or " + numbers.stream().map(Measure::kind).collect(Collectors.joining("; or "));
    }

    @Override
    public Map<String, Object> schema() {
        List<Object> ways = new ArrayList<>();
        ways.add(Map.of("const", word));
        numbers.forEach(number -> ways.add(number.schema()));
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("anyOf", ways);
        return schema;
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (node instanceof Node.Scalar scalar && scalar.text().strip().equals(word)) {
            reading.field(path, scalar, Optional.empty());
        } else if (node instanceof Node.Scalar scalar && !scalar.text().isBlank()) {
            numbers.stream()
                    .filter(number -> fits(number, scalar))
                    .findFirst()
                    .orElse(numbers.get(0))
                    .read(reading, node, path);
        } else {
            reading.unfit(node, path, "the word " + word + " or a number is wanted here");
        }
    }

    private static boolean fits(Measure number, Node.Scalar scalar) {
        try {
            number.parse(scalar.text());
            return true;
        } catch (QuantityException e) {
            return false;
        }
    }
}
