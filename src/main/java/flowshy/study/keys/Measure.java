package flowshy.study.keys;

import flowshy.study.text.Node;
import flowshy.study.text.Problem;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * A number with a unit.
 *
 * @param dimension what it measures
 * @param amplitude whether rms or peak may follow
 * @param zero whether zero is admissible beside the range
 * @param least smallest admissible value, as a study would write it
 * @param most largest admissible value, as a study would write it
 */
public record Measure(Dimension dimension, boolean amplitude, boolean zero, String least, String most)
        implements Value {
    static Measure of(Dimension dimension, String least, String most) {
        return new Measure(dimension, false, false, least, most);
    }

    static Measure amplitude(Dimension dimension, String least, String most) {
        return new Measure(dimension, true, false, least, most);
    }

    /** The same, zero admitted beside the range. */
    Measure orZero() {
        return new Measure(dimension, amplitude, true, least, most);
    }

    @Override
    public String kind() {
        return dimension.words() + ", " + range() + (amplitude ? ", rms or peak" : "");
    }

    private String range() {
        return (zero ? "zero or " : "") + least + " to " + most;
    }

    @Override
    public Map<String, Object> schema() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("$ref", "#/$defs/" + Schema.name(dimension));
        return schema;
    }

    @Override
    public void read(Reading reading, Node node, String path) {
        if (node instanceof Node.Scalar scalar && !scalar.text().isBlank()) {
            try {
                keep(reading, scalar, path, parse(scalar.text()));
            } catch (QuantityException e) {
                reading.problem(new Problem(scalar.position(), path, e.found(), e.accepted(), e.nearest()));
            }
        } else {
            reading.unfit(node, path, dimension.phrase() + " is wanted here, " + range());
        }
    }

    /**
     * The number of a text, checked like the text of a file.
     *
     * @param text number and unit
     * @return within the bounds
     * @throws QuantityException if it is no such number
     */
    public Quantity read(String text) {
        Quantity quantity = parse(text);
        if (!admits(quantity.value())) {
            throw new QuantityException(quantity.written(), wanted(), Optional.empty());
        }
        return quantity;
    }

    /**
     * Whether a number lies within the bounds.
     *
     * @param value in SI
     * @return false also for what is no number
     */
    public boolean admits(double value) {
        return (value >= parse(least).value() && value <= parse(most).value()) || (zero && value == 0.0);
    }

    private String wanted() {
        return dimension.phrase() + (zero ? ", " : " of ") + range() + " is wanted here";
    }

    private void keep(Reading reading, Node.Scalar scalar, String path, Quantity quantity) {
        if (admits(quantity.value())) {
            reading.field(path, scalar, Optional.of(quantity));
        } else {
            reading.problem(scalar.position(), path, quantity.written(), wanted());
        }
    }

    /** The number in a text; the range is not judged. */
    Quantity parse(String text) {
        return amplitude ? Quantity.readAmplitude(text, dimension) : Quantity.read(text, dimension);
    }
}
