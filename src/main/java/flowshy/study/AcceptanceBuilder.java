package flowshy.study;

import flowshy.study.keys.AcceptKeys;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import flowshy.verdict.Acceptance;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Sense;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** From the keys of the limits to what the device is held to. */
final class AcceptanceBuilder {
    private static final String GROUP = "accept.";

    private final Form form;
    private final Problems problems;

    AcceptanceBuilder(Form form, Problems problems) {
        this.form = form;
        this.problems = problems;
    }

    Acceptance build() {
        List<FigureLimit> others = new ArrayList<>();
        for (Figure figure : AcceptKeys.figures()) {
            String path = GROUP + figure.word();
            if (!form.has(path) || problems.touches(path)) {
                continue;
            }
            if (figure.sense() == Sense.NONE) {
                others.addAll(both(figure, path));
            } else {
                others.add(new FigureLimit(figure, figure.sense(), form.si(path)));
            }
        }
        return new Acceptance(
                form.given("accept.rejection") ? form.siIfAny("accept.rejection") : OptionalDouble.empty(),
                form.siIfAny("accept.error"),
                others);
    }

    private List<FigureLimit> both(Figure figure, String path) {
        List<FigureLimit> limits = new ArrayList<>();
        for (Sense sense : List.of(Sense.AT_LEAST, Sense.AT_MOST)) {
            OptionalDouble value = form.siIfAny(path + "." + sense.word());
            value.ifPresent(limit -> limits.add(new FigureLimit(figure, sense, limit)));
        }
        if (limits.isEmpty()) {
            problems.add(form.position(path), path, "no limit is stated", "at-least, at-most or both");
        }
        if (limits.size() == 2 && limits.get(0).value() > limits.get(1).value()) {
            String most = path + "." + Sense.AT_MOST.word();
            String least = path + "." + Sense.AT_LEAST.word();
            problems.add(
                    form.position(most),
                    most,
                    form.word(most).orElseThrow() + " is below the at-least of "
                            + form.word(least).orElseThrow(),
                    "at-least lies below at-most");
        }
        return limits;
    }
}
