package flowshy.study;

import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.math.Figures;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
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
        return (Figures.of(value / unit(), 5) + " " + unitName()).strip();
    }

    @Override
    public String change(double value) {
        return words() + " from " + written(start()) + " to " + written(value);
    }

    /** The likeliest unit of its dimension, as a study would write it. */
    private String unitName() {
        boolean plain = number.dimension().siUnit().equals("1") || number.dimension() == Dimension.TEMPERATURE;
        return plain
                ? number.dimension().siUnit().replace("1", "")
                : number.dimension().units().get(0);
    }

    private double unit() {
        boolean plain = number.dimension().siUnit().equals("1") || number.dimension() == Dimension.TEMPERATURE;
        return plain
                ? 1.0
                : Quantity.read("1 " + unitName(), number.dimension()).value();
    }

    @Override
    public BandsQuestion at(double value) {
        BandsQuestion question = space.at(value);
        Hair hair = question.device().hair();
        LengthModel model =
                space.base().device().hair().lengthModel(); // as every other device of the comparison is seen
        return hair.lengthModel() == model
                ? question
                : question.about(question.device().with(hair.seenAs(model)));
    }
}
