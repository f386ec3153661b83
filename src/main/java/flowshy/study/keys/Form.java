package flowshy.study.keys;

import flowshy.study.text.Position;
import flowshy.study.units.Quantity;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** The checked values of a study by path, each on its own: nothing here knows what they mean together. */
public final class Form {
    private final Map<String, Field> fields;
    private final Map<String, Position> places;
    private final List<Taken> taken;
    /** Paths of the numbers laid over the fields; a handful, sought one by one. */
    private final List<String> changed;

    private final double[] values;

    /**
     * A default that was used, or something left out.
     *
     * @param path of the key
     * @param value what was taken, as a study would write it
     * @param why where it comes from, or what is left out
     */
    public record Taken(String path, String value, String why) {}

    Form(Map<String, Field> fields, Map<String, Position> places, List<Taken> taken) {
        this.fields = Collections.unmodifiableMap(new LinkedHashMap<>(fields));
        this.places = Collections.unmodifiableMap(new LinkedHashMap<>(places));
        this.taken = List.copyOf(taken);
        this.changed = List.of();
        this.values = new double[0];
    }

    private Form(Form base, List<String> changed, double... values) {
        this.fields = base.fields;
        this.places = base.places;
        this.taken = base.taken;
        this.changed = changed;
        this.values = values;
    }

    /**
     * Every value, defaults included.
     *
     * @return in the order of the key table
     */
    public List<Field> fields() {
        return changed.isEmpty()
                ? List.copyOf(fields.values())
                : fields.keySet().stream().map(this::at).toList();
    }

    /**
     * Every default that was used.
     *
     * @return in the order of the key table
     */
    public List<Taken> taken() {
        return changed.isEmpty()
                ? taken
                : taken.stream().filter(t -> !changed.contains(t.path())).toList();
    }

    /**
     * Whether a key, or a group, is there, be it by default.
     *
     * @param path of the key
     * @return true if so
     */
    public boolean has(String path) {
        return fields.containsKey(path) || places.containsKey(path);
    }

    /**
     * Whether a value was written.
     *
     * @param path of the key
     * @return false for a default and for nothing at all
     */
    public boolean given(String path) {
        return changed.contains(path)
                || (fields.containsKey(path) && fields.get(path).given());
    }

    /**
     * The number behind a key.
     *
     * @param path of the key
     * @return in SI
     * @throws IllegalStateException if there is none: ask {@link #has} before
     */
    public double si(String path) {
        OptionalDouble number = siIfAny(path);
        if (number.isEmpty()) {
            throw new IllegalStateException("no number at " + path);
        }
        return number.getAsDouble();
    }

    /**
     * The number behind a key.
     *
     * @param path of the key
     * @return in SI, empty if the key is not there
     */
    public OptionalDouble siIfAny(String path) {
        int over = changed.indexOf(path);
        if (over >= 0) {
            return OptionalDouble.of(values[over]);
        }
        Field field = fields.get(path);
        return field == null || field.quantity().isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(field.quantity().get().value());
    }

    /**
     * The word or text behind a key.
     *
     * @param path of the key
     * @return as written, empty if the key is not there
     */
    public Optional<String> word(String path) {
        return field(path).map(Field::written);
    }

    /**
     * The value behind a key.
     *
     * @param path of the key
     * @return the field, empty if the key is not there
     */
    public Optional<Field> field(String path) {
        return fields.containsKey(path) ? Optional.of(at(path)) : Optional.empty();
    }

    private Field at(String path) {
        Field field = fields.get(path);
        int over = changed.indexOf(path);
        if (over < 0) {
            return field;
        }
        Quantity quantity = field.quantity().orElseThrow().at(values[over]);
        return new Field(path, quantity.written(), Optional.of(quantity), field.position(), true);
    }

    /**
     * The names of the groups right below a path.
     *
     * @param path of names that the user gave
     * @return in the order of the text, empty if the path is not there
     */
    public List<String> names(String path) {
        String above = path + ".";
        return places.keySet().stream()
                .filter(place -> place.startsWith(above) && place.indexOf('.', above.length()) < 0)
                .map(place -> place.substring(above.length()))
                .toList();
    }

    /**
     * What stands below a path, whatever points are in its names.
     *
     * @param path of something about other numbers, e.g. {@code tolerances}
     * @return the paths below it that have a place, without it, in the order of the text
     */
    public List<String> entries(String path) {
        String above = path + ".";
        return places.keySet().stream()
                .filter(place -> place.startsWith(above))
                .map(place -> place.substring(above.length()))
                .toList();
    }

    /**
     * Where a default comes from.
     *
     * @param path of the key
     * @return its reason, empty for what is written or not there
     */
    public Optional<String> why(String path) {
        return taken().stream()
                .filter(t -> t.path().equals(path))
                .map(Taken::why)
                .findFirst();
    }

    /**
     * Where a key's value or group stands; where it does not, its nearest group above.
     *
     * @param path of the key
     * @return the place
     * @throws IllegalStateException if the form is empty
     */
    public Position position(String path) {
        if (fields.containsKey(path)) {
            return fields.get(path).position();
        }
        if (places.containsKey(path)) {
            return places.get(path);
        }
        if (path.isEmpty()) {
            throw new IllegalStateException("a form without a place");
        }
        return position(path.substring(0, Math.max(0, path.lastIndexOf('.'))));
    }

    /**
     * The same with one number replaced, unchecked: for sweeps inside a range that was checked before.
     *
     * @param path of a number that is there
     * @param value in SI
     * @return another form
     * @throws IllegalStateException if there is no number at that path
     */
    public Form with(String path, double value) {
        return with(List.of(path), value);
    }

    /**
     * The same with some numbers replaced, unchecked likewise.
     *
     * @param paths of numbers that are there
     * @param values in SI, same order
     * @return another form
     * @throws IllegalStateException if there is no number at one of these paths
     */
    public Form with(List<String> paths, double... values) {
        for (String path : paths) {
            Field old = fields.get(path);
            if (old == null || old.quantity().isEmpty()) {
                throw new IllegalStateException("no number at " + path);
            }
        }
        if (changed.isEmpty()) {
            return new Form(this, List.copyOf(paths), values.clone());
        }
        Map<String, Double> over = new LinkedHashMap<>();
        for (int i = 0; i < changed.size(); i++) {
            over.put(changed.get(i), this.values[i]);
        }
        for (int i = 0; i < paths.size(); i++) {
            over.put(paths.get(i), values[i]);
        }
        return new Form(
                this,
                List.copyOf(over.keySet()),
                over.values().stream().mapToDouble(value -> value).toArray());
    }
}
