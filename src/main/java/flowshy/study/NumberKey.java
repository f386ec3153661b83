package flowshy.study;

import flowshy.study.keys.Measure;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import flowshy.study.units.WrittenUnit;

/**
 * A number of a study that can be varied.
 *
 * @param path of its key, e.g. {@code hair.diameter}
 * @param measure what it measures and its bounds
 * @param base its value in the study, SI
 * @param least smallest admissible value, SI
 * @param most largest admissible value, SI
 * @param orZero whether zero is admissible beside
 * @param unit in which the study states it, be it as a default
 */
public record NumberKey(
        String path, Measure measure, double base, double least, double most, boolean orZero, WrittenUnit unit) {
    static NumberKey of(String path, Measure measure, double base, WrittenUnit unit) {
        return new NumberKey(
                path,
                measure,
                base,
                Quantity.read(measure.least(), measure.dimension()).value(),
                Quantity.read(measure.most(), measure.dimension()).value(),
                measure.zero(),
                unit);
    }

    /**
     * What it measures.
     *
     * @return its dimension
     */
    public Dimension dimension() {
        return measure.dimension();
    }

    /**
     * Whether a value is admissible.
     *
     * @param value in SI
     * @return false also for what is no number
     */
    public boolean admits(double value) {
        return (value >= least && value <= most) || (orZero && value == 0.0);
    }

    /**
     * The value of a text.
     *
     * @param text number and unit
     * @return in SI, admissible
     * @throws QuantityException if it is no such number
     */
    public double value(String text) {
        return measure.read(text).value();
    }

    /**
     * A value as a study would write it.
     *
     * @param value in SI
     * @return number and unit, six significant digits
     */
    public String written(double value) {
        return unit.written(value);
    }
}
