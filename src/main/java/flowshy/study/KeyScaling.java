package flowshy.study;

import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.math.Figures;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.compare.Scaling;

/**
 * One number of a study changed; the rest stays.
 *
 * @param space the study as a function of the number
 * @param number the number
 * @param states that the device must bear
 */
record KeyScaling(VariedStudy space, NumberKey number, ScaledStates states) implements Scaling {
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
        return (Figures.of(number.unit().show(value), 5) + " " + number.unit().symbol()).strip();
    }

    @Override
    public String change(double value) {
        return words() + " from " + written(start()) + " to " + written(value);
    }

    @Override
    public BandsQuestion at(double value) {
        BandsQuestion question = space.at(value);
        Hair hair = question.device().hair();
        LengthModel model =
                space.base().device().hair().lengthModel(); // as every other device of the comparison is seen
        return states.bear(
                hair.lengthModel() == model
                        ? question
                        : question.about(question.device().with(hair.seenAs(model))),
                states.form().with(number.path(), value));
    }
}
