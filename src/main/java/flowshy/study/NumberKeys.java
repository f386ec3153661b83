package flowshy.study;

import flowshy.study.keys.Form;
import flowshy.study.keys.KeyRow;
import flowshy.study.keys.Keys;
import flowshy.study.keys.Measure;
import flowshy.study.text.Nearest;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.study.units.QuantityException;
import flowshy.study.units.WrittenUnit;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The numbers of one study that can be varied, found by the path of their key. */
public final class NumberKeys {
    /** What stands between the ends of a range. */
    private static final String TO = "..";

    private final Form form;

    NumberKeys(Form form) {
        this.form = form;
    }

    /**
     * A range of one number, ends included.
     *
     * @param key the number
     * @param from one end, SI
     * @param to the other, above it, SI
     */
    public record KeyRange(NumberKey key, double from, double to) {}

    /**
     * Every number the study holds.
     *
     * @return in the order of the key table
     */
    public List<NumberKey> all() {
        return form.fields().stream()
                .filter(field -> field.quantity().isPresent())
                .flatMap(field -> Keys.measure(field.path()).stream())
                .map(found -> number(found.getKey(), found.getValue()))
                .toList();
    }

    /**
     * A number by its path.
     *
     * @param option what to print as the place of a fault, e.g. {@code --across}
     * @param path of a key; a group that stands for one of its keys may be named instead of that key
     * @return the number
     * @throws StudyException if there is no such number in the study
     */
    public NumberKey key(String option, String path) {
        Position at = Position.label((option + " " + Printable.of(path)).strip());
        Optional<Map.Entry<String, Measure>> found = Keys.measure(path);
        if (found.isPresent() && form.siIfAny(found.get().getKey()).isPresent()) {
            String whole = found.get().getKey();
            return number(whole, found.get().getValue());
        }
        if (found.isPresent()) {
            throw new StudyException(Problem.of(
                    at, path, "the study does not state it", "state a value in the study, or with --set, to vary it"));
        }
        boolean known = Keys.row(path).isPresent() || form.has(path);
        List<String> paths = all().stream().map(NumberKey::path).toList();
        throw new StudyException(new Problem(
                at,
                path,
                known ? "not a number" : "unknown key",
                "a number of this study is wanted: " + String.join(", ", paths),
                known
                        ? Optional.empty()
                        : Nearest.among(path, paths)
                                .or(() -> Nearest.among(
                                        path,
                                        Keys.rows().stream().map(KeyRow::path).toList()))));
    }

    private NumberKey number(String path, Measure measure) {
        WrittenUnit unit = WrittenUnit.of(form.word(path).orElseThrow(), measure.dimension());
        return NumberKey.of(path, measure, form.si(path), unit);
    }

    /**
     * A range written as {@code hair.diameter=40 um..120 um}.
     *
     * @param option what to print as the place of a fault
     * @param text key path, equals sign, lower end, two points, upper end
     * @return the range
     * @throws StudyException if the key, an end or their order is wrong
     */
    public KeyRange range(String option, String text) {
        int equals = text.indexOf('=');
        String path = equals < 0 ? text.strip() : text.substring(0, equals).strip();
        int between = text.indexOf(TO, equals + 1);
        if (equals < 0 || path.isEmpty() || between < 0) {
            throw new StudyException(Problem.of(
                    Position.label(option),
                    "",
                    Printable.of(text.strip()) + " is no KEY=A..B",
                    "for example hair.diameter=40 um..120 um"));
        }
        NumberKey key = key(option, path);
        String low = text.substring(equals + 1, between).strip();
        String high = text.substring(between + TO.length()).strip();
        double from = end(option, key, low);
        double to = end(option, key, high);
        if (!(from < to)) {
            throw new StudyException(Problem.of(
                    Position.label(option + " " + path),
                    path,
                    order(low, high, from, to),
                    "the lower end stands first, the upper end above it"));
        }
        return new KeyRange(key, from, to);
    }

    /**
     * The unit in which the study states a number.
     *
     * @param key one of its numbers
     * @return as written, or as its default is written
     */
    public WrittenUnit unit(NumberKey key) {
        return key.unit();
    }

    /** What is wrong with two ends, as they were written. */
    static String order(String low, String high, double from, double to) {
        return "a range from " + Printable.of(low) + " to " + Printable.of(high)
                + (from == to ? " is empty" : " is upside down");
    }

    private static double end(String option, NumberKey key, String text) {
        try {
            return key.value(text.strip());
        } catch (QuantityException e) {
            throw new StudyException(new Problem(
                    Position.label(option + " " + key.path()), key.path(), e.found(), e.accepted(), e.nearest()));
        }
    }
}
