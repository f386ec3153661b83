package flowshy.study.keys;

import flowshy.study.text.Nearest;
import flowshy.study.text.Node;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * One word out of a few.
 *
 * @param choices the words
 */
public record Words(List<Choice> choices) implements Value {
    /**
     * A word.
     *
     * @param word as written
     * @param instead empty for a word that is read; else what works instead in this version
     */
    public record Choice(String word, Optional<String> instead) {}

    /** Copies the choices. */
    public Words {
        choices = List.copyOf(choices);
    }

    static Words of(String... words) {
        return new Words(List.of(words).stream()
                .map(w -> new Choice(w, Optional.empty()))
                .toList());
    }

    /** The same with words that are known but not built yet. */
    Words later(String instead, String... words) {
        List<Choice> more = new ArrayList<>(choices);
        for (String word : words) {
            more.add(new Choice(word, Optional.of(instead)));
        }
        return new Words(more);
    }

    List<String> built() {
        return choices.stream()
                .filter(c -> c.instead().isEmpty())
                .map(Choice::word)
                .toList();
    }

    @Override
    public String kind() {
        return built().stream().collect(Collectors.joining(" | "));
    }

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("enum", built());
        return schema;
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        String wanted = "one of " + String.join(", ", built()) + " is wanted here";
        if (!(node instanceof Node.Scalar scalar) || scalar.text().isBlank()) {
            reading.unfit(node, path, wanted);
            return;
        }
        String word = scalar.text().strip();
        Optional<Choice> choice =
                choices.stream().filter(c -> c.word().equals(word)).findFirst();
        if (choice.isEmpty()) {
            reading.problem(new Problem(
                    scalar.position(),
                    path,
                    "unknown word " + Printable.of(word),
                    wanted,
                    Nearest.among(word, built())));
        } else if (choice.get().instead().isPresent()) {
            String instead = choice.get().instead().get();
            reading.problem(scalar.position(), path, word + " is known, but not built yet in this version", instead);
        } else {
            reading.field(path, scalar, Optional.empty());
        }
    }
}
