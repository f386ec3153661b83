package flowshy.study;

import static flowshy.math.Figures.say;

import flowshy.study.keys.Form;
import flowshy.study.text.Position;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.units.QuantityException;
import flowshy.verdict.envelope.Envelope;
import flowshy.verdict.envelope.Side;
import flowshy.verdict.envelope.StatesOfUse;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;

/** From lists and ranges of numbers to the states a device must bear. */
final class EnvelopeBuilder {
    private static final String GROUP = "envelope";
    private static final String TO = "..";
    private static final double ICE_POINT = 273.15;

    /** Values of a range, ends included, while there are few states. */
    private static final int FINE = 9;

    /** States at most. */
    private static final int MOST = 2000;

    /** With surroundings each state takes up to half a second. */
    private static final int MOST_SURROUNDED = 100;

    private final Form form;
    private final Problems problems;
    private final NumberKeys numbers;

    EnvelopeBuilder(Form form, Problems problems) {
        this.form = form;
        this.problems = problems;
        this.numbers = new NumberKeys(form);
    }

    /** A number with the values written; of a range its two ends. */
    private record Written(NumberKey key, List<Double> values, List<String> words, boolean range) {}

    Optional<Envelope> build(boolean surrounded, Function<List<NumberKey>, StatesOfUse> space) {
        List<Written> all = new ArrayList<>();
        for (String name : form.entries(GROUP)) {
            side(name, GROUP + "." + name).ifPresent(all::add);
        }
        if (problems.count() > 0) {
            return Optional.empty();
        }
        int most = surrounded ? MOST_SURROUNDED : MOST;
        int fine = FINE;
        while (fine > 2 && states(all, fine) > most) {
            fine--;
        }
        if (states(all, fine) > most) {
            problems.add(
                    form.position(GROUP),
                    GROUP,
                    say("%s states", Double.valueOf(states(all, fine)).longValue()),
                    "at most " + most + (surrounded ? " with surroundings" : "") + " are judged; name fewer values");
            return Optional.empty();
        }
        int values = fine;
        List<Side> sides = all.stream().map(one -> filled(one, values)).toList();
        return Optional.of(
                new Envelope(space.apply(all.stream().map(Written::key).toList()), sides));
    }

    private static double states(List<Written> all, int fine) {
        double states = 1.0;
        for (Written one : all) {
            states *= one.range() ? fine : one.values().size();
        }
        return states;
    }

    private Optional<Written> side(String name, String path) {
        NumberKey key;
        try {
            key = numbers.key("", name);
        } catch (StudyException e) {
            e.problems()
                    .forEach(p ->
                            problems.add(new Problem(form.position(path), path, p.found(), p.accepted(), p.nearest())));
            return Optional.empty();
        }
        Optional<String> text = form.word(path);
        List<String> words = new ArrayList<>();
        if (text.isPresent()) {
            int to = text.get().indexOf(TO);
            words.add((to < 0 ? text.get() : text.get().substring(0, to)).strip());
            if (to >= 0) {
                words.add(text.get().substring(to + TO.length()).strip());
            }
        }
        for (int i = 0; form.has(path + "[" + i + "]"); i++) {
            words.add(form.word(path + "[" + i + "]").orElseThrow().strip());
        }
        boolean range = text.isPresent() && words.size() == 2;
        List<Double> values = new ArrayList<>();
        for (int i = 0; i < words.size(); i++) {
            String at = form.has(path + "[" + i + "]") ? path + "[" + i + "]" : path;
            value(key, words.get(i), form.position(at), path).ifPresent(values::add);
        }
        if (values.size() < words.size()) {
            return Optional.empty();
        }
        if (range && !(values.get(0) < values.get(1))) {
            problems.add(
                    form.position(path),
                    path,
                    "a range from " + words.get(0) + " to " + words.get(1) + " is upside down",
                    "the lower end stands first, the upper end above it");
            return Optional.empty();
        }
        return Optional.of(new Written(key, values, words, range));
    }

    private OptionalDouble value(NumberKey key, String text, Position at, String path) {
        try {
            return OptionalDouble.of(key.value(text));
        } catch (QuantityException e) {
            problems.add(new Problem(at, path, e.found(), e.accepted(), e.nearest()));
            return OptionalDouble.empty();
        }
    }

    private static Side filled(Written one, int fine) {
        if (!one.range()) {
            return new Side(one.key().path(), one.values(), one.words(), false);
        }
        List<Double> values = new ArrayList<>();
        List<String> words = new ArrayList<>();
        double from = one.values().get(0);
        double to = one.values().get(1);
        for (int i = 0; i < fine; i++) {
            boolean end = i == 0 || i == fine - 1;
            double value = i == 0 ? from : i == fine - 1 ? to : from + (to - from) * i / (fine - 1);
            values.add(value);
            words.add(end ? one.words().get(i == 0 ? 0 : 1) : written(one.key(), value));
        }
        return new Side(one.key().path(), values, words, true);
    }

    private static String written(NumberKey key, double value) {
        return switch (key.dimension()) {
            case TEMPERATURE -> say("%.4g degC", value - ICE_POINT);
            case SHARE -> say("%.4g %%", 100.0 * value);
            default -> key.written(value);
        };
    }
}
