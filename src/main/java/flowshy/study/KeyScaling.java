package flowshy.study;

import flowshy.math.Figures;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.compare.Scaling;

/**
 * One number of a study changed; the rest stays.
 *
 * @param space the study as a function of the number
 * @param number the number
 */
record KeyScaling(VariedStudy space, NumberKey number) implements Scaling {
    @Override
    public String words() {
        return number.path();
    }

    @Override
    public double start() {
        return number.base();
    }

    @Override
    public double least() {
        return number.least();
    }

    @Override
    public double most() {
        return number.most();
    }

    @Override
    public String written(double value) {
        return (Figures.of(value, 5) + " " + number.dimension().siUnit()).strip();
    }

    @Override
    public BandsQuestion at(double value) {
        return space.at(value);
    }
}
