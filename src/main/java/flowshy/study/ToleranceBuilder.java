package flowshy.study;

import flowshy.study.keys.Form;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.tolerance.Shape;
import flowshy.verdict.tolerance.Target;
import flowshy.verdict.tolerance.Tolerances;
import flowshy.verdict.tolerance.Tolerances.StatedFlow;
import flowshy.verdict.tolerance.Uncertain;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;

/** From the spreads a study states to uncertain inputs. */
final class ToleranceBuilder {
    private static final String GROUP = "tolerances";
    /** All diameters of the hair, whatever its shape. */
    private static final String DIAMETERS = "hair.diameters";

    private static final String DRAG_LAW = "drag-law";
    private static final String PROPERTIES = "medium-properties";
    private static final String YIELD = "yield";
    /** Keys of what is asked, not of what there is. */
    private static final List<String> ASKED = List.of("band.", "accept.", "calibration.", "motion.");

    private static final List<String> ON_OFF = List.of("on", "off");

    /** What has no natural zero, or whose unit is a per cent already. */
    private static final Set<Dimension> ABSOLUTE = EnumSet.of(Dimension.TEMPERATURE, Dimension.LEVEL, Dimension.SHARE);

    private final Form form;
    private final Problems problems;
    private final NumberKeys numbers;
    private final Map<String, NumberKey> moved = new LinkedHashMap<>();
    private final List<Uncertain> inputs = new ArrayList<>();

    ToleranceBuilder(Form form, Problems problems) {
        this.form = form;
        this.problems = problems;
        this.numbers = new NumberKeys(form);
    }

    /** The space is made of the numbers that turn out to vary. */
    Tolerances build(BandsQuestion base, Function<List<NumberKey>, DesignSpace> space) {
        boolean properties = true;
        boolean flow = true;
        Optional<StatedFlow> stated = Optional.empty();
        OptionalDouble yield = OptionalDouble.empty();
        for (String name : names()) {
            String path = GROUP + "." + name;
            switch (name) {
                case PROPERTIES -> properties = on(path);
                case YIELD -> yield = share(path);
                case DRAG_LAW -> {
                    if (form.has(path + ".sd") || form.has(path + ".within")) {
                        stated = size(path, Optional.empty())
                                .map(size -> new StatedFlow(size.shape(), size.value(), size.written()));
                    } else {
                        flow = on(path);
                    }
                }
                default -> input(name, path);
            }
        }
        List<NumberKey> keys = List.copyOf(moved.values());
        return new Tolerances(
                base,
                space.apply(keys),
                keys.stream().map(NumberKey::base).toList(),
                inputs,
                properties,
                flow,
                stated,
                yield);
    }

    private List<String> names() {
        List<String> all = form.entries(GROUP);
        return all.stream()
                .filter(name ->
                        !name.endsWith(".keys") || !all.contains(name.substring(0, name.length() - ".keys".length())))
                .toList();
    }

    private boolean on(String path) {
        String word = form.word(path).orElse("a group of keys");
        if (!ON_OFF.contains(word)) {
            problems.add(
                    form.position(path),
                    path,
                    Printable.of(word),
                    "on or off" + (path.endsWith(DRAG_LAW) ? ", or {sd: 3 %}" : ""));
        }
        return !word.equals("off");
    }

    private OptionalDouble share(String path) {
        try {
            double value =
                    Quantity.read(form.word(path).orElse(""), Dimension.SHARE).value();
            if (value > 0.0 && value < 1.0) {
                return OptionalDouble.of(value);
            }
            problems.add(form.position(path), path, form.word(path).orElse(""), "a share between 0 % and 100 %");
        } catch (QuantityException e) {
            problems.add(new Problem(form.position(path), path, e.found(), e.accepted(), e.nearest()));
        }
        return OptionalDouble.empty();
    }

    private void input(String name, String path) {
        List<String> keys = keys(name, path);
        List<NumberKey> found = new ArrayList<>();
        for (String key : keys) {
            number(key, path).ifPresent(found::add);
        }
        if (found.size() < keys.size() || problems.touches(path)) {
            return;
        }
        Optional<Size> size =
                size(path, found.stream().map(NumberKey::dimension).findFirst());
        if (size.isEmpty()) {
            return;
        }
        List<Target> targets = new ArrayList<>();
        for (NumberKey key : found) {
            if (size.get().dimension().filter(d -> d != step(key.dimension())).isPresent()) {
                problems.add(
                        form.position(path),
                        path,
                        size.get().written() + " for " + key.path() + ", "
                                + key.dimension().phrase(),
                        "numbers of one kind, or a spread in per cent");
                return;
            }
            moved.putIfAbsent(key.path(), key);
            int index = List.copyOf(moved.keySet()).indexOf(key.path());
            targets.add(new Target.OfNumber(
                    index, size.get().value(), size.get().dimension().isEmpty()));
        }
        inputs.add(new Uncertain(name, size.get().shape(), size.get().written(), "the study", targets));
    }

    /** The numbers that one input moves. */
    private List<String> keys(String name, String path) {
        if (form.has(path + ".keys")) {
            List<String> keys = new ArrayList<>();
            for (int i = 0; form.has(path + ".keys[" + i + "]"); i++) {
                String key = form.word(path + ".keys[" + i + "]").orElseThrow();
                keys.addAll(key.equals(DIAMETERS) ? diameters() : List.of(key));
            }
            return keys;
        }
        return name.equals(DIAMETERS) ? diameters() : List.of(name);
    }

    private List<String> diameters() {
        return numbers.all().stream()
                .map(NumberKey::path)
                .filter(path -> path.startsWith("hair.") && path.endsWith("diameter"))
                .toList();
    }

    private Optional<NumberKey> number(String key, String path) {
        if (ASKED.stream().anyMatch(key::startsWith)) {
            problems.add(
                    form.position(path),
                    path,
                    Printable.of(key),
                    "what is asked of a device has no spread; name a number of it");
            return Optional.empty();
        }
        try {
            return Optional.of(numbers.key("", key));
        } catch (StudyException e) {
            Position at = form.position(path);
            e.problems()
                    .forEach(p -> problems.add(new Problem(
                            at, path, Printable.of(key) + ": " + p.found(), accepted(p, key, path), p.nearest())));
            return Optional.empty();
        }
    }

    /** A name that is no path may be meant as a name of one's own. */
    private String accepted(Problem problem, String key, String path) {
        return form.has(path + ".keys") || key.contains(".")
                ? problem.accepted()
                : "a name of your own needs keys: [...] beside it; " + problem.accepted();
    }

    /**
     * How wide.
     *
     * @param shape how it is spread
     * @param value a share, or in SI
     * @param dimension empty for a share of the nominal value
     * @param written as the study writes it
     */
    private record Size(Shape shape, double value, Optional<Dimension> dimension, String written) {}

    private Optional<Size> size(String path, Optional<Dimension> of) {
        boolean sd = form.has(path + ".sd");
        if (sd == form.has(path + ".within")) {
            problems.add(
                    form.position(path),
                    path,
                    sd ? "sd beside within" : "neither sd nor within",
                    "one of them: sd, a standard deviation, or within, evenly spread that far to both sides");
            return Optional.empty();
        }
        Shape shape = sd ? Shape.NORMAL : Shape.UNIFORM;
        String at = path + "." + shape.word();
        String text = form.word(at).orElseThrow();
        try {
            boolean relative = of.isEmpty() || (text.strip().endsWith("%") && !ABSOLUTE.contains(of.get()));
            Quantity read = Quantity.read(text, relative ? Dimension.SHARE : step(of.get()));
            boolean fits = read.value() > 0.0 && (!relative || read.value() <= 1.0);
            if (!fits) {
                problems.add(
                        form.position(at), at, text, relative ? "more than 0 %, 100 % at most" : "a spread above zero");
                return Optional.empty();
            }
            Optional<Dimension> dimension = relative ? Optional.empty() : of.map(ToleranceBuilder::step);
            String written =
                    of.equals(Optional.of(Dimension.SHARE)) ? read.written() + " of the whole" : read.written();
            return Optional.of(new Size(shape, read.value(), dimension, written));
        } catch (QuantityException e) {
            boolean percent = of.isPresent() && !ABSOLUTE.contains(of.get());
            problems.add(new Problem(
                    form.position(at),
                    at,
                    e.found(),
                    (percent ? "a spread in % of the nominal value, or " : "") + e.accepted(),
                    e.nearest()));
            return Optional.empty();
        }
    }

    /** A spread of temperature is a step, not a point of the scale. */
    private static Dimension step(Dimension of) {
        return of == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_STEP : of;
    }
}
