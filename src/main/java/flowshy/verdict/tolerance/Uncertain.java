package flowshy.verdict.tolerance;

import java.util.List;

/**
 * One independent uncertain input. Numbers that go together, such as the diameters of one wafer, are moved by one input.
 *
 * @param name path of a key, name of a group, or what else it is
 * @param shape how it is spread
 * @param size as a study writes it, e.g. {@code 3 %}
 * @param source where the size comes from: the study, or a published source
 * @param targets what it moves
 */
public record Uncertain(String name, Shape shape, String size, String source, List<Target> targets) {
    /** Copies the list. */
    public Uncertain {
        targets = List.copyOf(targets);
    }
}
