package flowshy.study;

import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.math.Caveat;
import flowshy.math.Figures;
import flowshy.response.Hold;
import flowshy.study.NumberKeys.KeyRange;
import flowshy.study.text.Position;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.study.units.WrittenUnit;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.error.StreamTooFastException;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import flowshy.verdict.size.Constraint;
import flowshy.verdict.size.SizeQuestion;
import flowshy.verdict.size.Sized;
import flowshy.verdict.size.Sizer;
import flowshy.verdict.size.SizingProblem;
import flowshy.verdict.size.Trial;
import flowshy.verdict.size.Variable;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.hipparchus.util.FastMath;

/**
 * A study's device sized: some of its numbers chosen so that a figure is least or largest and every limit of the study is kept.
 *
 * @param study the base
 * @param words what was asked
 * @param figure what is made least or largest
 * @param numbers the numbers chosen
 * @param units in which the study, or the range, states each number
 * @param taken whether each range was taken, not stated
 * @param limits what must be kept
 * @param leftOut limits that the study states and nothing can be said about, with the reason
 * @param hold what of the suspension stays
 * @param model how the length of the hair is seen in the search; over many shapes the estimate stands for a solution that is taken by default
 * @param solved the figures of the rounded numbers with the study's own model, as {@code bands} finds them
 * @param sized the optimum, or what comes nearest
 * @param values the numbers rounded to few digits, to the side that keeps the limits
 * @param trial the figures of the rounded numbers
 * @param base the figures of the study as it stands
 * @param caveats what must stand beside the sized device's numbers
 */
public record StudySizing(
        Study study,
        SizeWords words,
        Figure figure,
        List<NumberKey> numbers,
        List<WrittenUnit> units,
        List<Boolean> taken,
        List<FigureLimit> limits,
        List<String> leftOut,
        Hold hold,
        LengthModel model,
        Trial solved,
        Sized sized,
        List<Double> values,
        Trial trial,
        Trial base,
        List<Caveat> caveats) {
    /** More numbers than this are no longer searched with any certainty. */
    private static final int MOST = 6;

    /** Range taken where none is stated: so many times less and more than the study's number. */
    private static final double WIDE = 5.0;

    /** And so many kelvin, or decibels, where that has no sense. */
    private static final double STEP = 20.0;

    private static final int FEWEST_DIGITS = 6;

    /** Copies the lists. */
    public StudySizing {
        numbers = List.copyOf(numbers);
        units = List.copyOf(units);
        taken = List.copyOf(taken);
        limits = List.copyOf(limits);
        leftOut = List.copyOf(leftOut);
        values = List.copyOf(values);
        caveats = List.copyOf(caveats);
    }

    /**
     * Sizes a study.
     *
     * @param reader of the study
     * @param words what is asked
     * @return the answer
     * @throws StudyException with every problem of the study, or the first of the words
     */
    public static StudySizing of(StudyReader reader, SizeWords words) {
        Study study = reader.study();
        Figure figure = StudyMap.figure("--to", words.figure());
        NumberKeys known = reader.numbers();
        List<NumberKey> numbers = numbers(known, words);
        Map<String, KeyRange> stated = stated(known, words, numbers);
        List<Variable> variables = new ArrayList<>();
        for (NumberKey number : numbers) {
            variables.add(variable(number, Optional.ofNullable(stated.get(number.path()))));
        }
        VariedStudy varied = VariedStudy.of(reader, numbers);
        Evaluated now = words.at().isPresent()
                ? new Evaluated(study.question(), words.at().getAsDouble())
                : new Evaluated(study.question());
        Found objective = figure.of(now);
        if (objective.state() == Found.State.NOT_STATED) {
            throw fault("--to " + figure.word(), objective.reason(), "state it in the study, or choose another figure");
        }
        List<FigureLimit> limits = new ArrayList<>();
        List<String> leftOut = new ArrayList<>();
        for (FigureLimit limit : SizeQuestion.limits(study.question())) {
            Found found = limit.figure().of(now);
            if (found.state() == Found.State.NOT_STATED) {
                leftOut.add(limit.figure().word() + ": " + found.reason());
            } else {
                limits.add(limit);
            }
        }
        boolean surrounded =
                StudyMap.surrounded(figure) || limits.stream().anyMatch(limit -> StudyMap.surrounded(limit.figure()));
        SizeQuestion question =
                new SizeQuestion(surrounded ? varied : varied.still(), figure, words.maximize(), limits, words.at());
        SizingProblem problem = question.problem(variables);
        List<Double> own = numbers.stream().map(NumberKey::base).toList();
        boolean inside = true;
        for (int i = 0; i < own.size(); i++) {
            inside &= own.get(i) >= variables.get(i).from()
                    && own.get(i) <= variables.get(i).to();
        }
        Sized sized = new Sizer(words.seed()).solve(problem, inside ? List.of(own) : List.of());
        List<Double> values = rounded(question, problem, sized);
        return new StudySizing(
                study,
                words,
                figure,
                numbers,
                numbers.stream().map(known::unit).toList(),
                numbers.stream()
                        .map(number -> !stated.containsKey(number.path()))
                        .toList(),
                limits,
                leftOut,
                varied.hold(),
                varied.model(),
                solved(study, varied, question, values),
                sized,
                values,
                question.trial(values),
                question.trial(own),
                sized.trial().there() ? caveats(study, varied, values) : List.of());
    }

    private static List<NumberKey> numbers(NumberKeys known, SizeWords words) {
        List<NumberKey> numbers = new ArrayList<>();
        for (String path : words.vary()) {
            NumberKey number = known.key("--vary", path.strip());
            if (numbers.stream().anyMatch(other -> other.path().equals(number.path()))) {
                throw fault("--vary " + number.path(), "named twice", "each number once");
            }
            numbers.add(number);
        }
        if (numbers.size() > MOST) {
            throw fault("--vary", numbers.size() + " numbers", "at most " + MOST + " can be searched together");
        }
        return numbers;
    }

    private static Map<String, KeyRange> stated(NumberKeys known, SizeWords words, List<NumberKey> numbers) {
        Map<String, KeyRange> stated = new TreeMap<>();
        for (String text : words.within()) {
            KeyRange range = known.range("--within", text);
            String path = range.key().path();
            if (numbers.stream().noneMatch(number -> number.path().equals(path))) {
                throw fault("--within " + path, "not among the numbers of --vary", "name it there, or leave it out");
            }
            if (stated.put(path, range) != null) {
                throw fault("--within " + path, "stated twice", "one range a number");
            }
        }
        return stated;
    }

    private static Variable variable(NumberKey number, Optional<KeyRange> stated) {
        double from = stated.map(KeyRange::from).orElseGet(() -> FastMath.max(number.least(), taken(number, false)));
        double to = stated.map(KeyRange::to).orElseGet(() -> FastMath.min(number.most(), taken(number, true)));
        if (!(from < to)) {
            throw fault(
                    "--vary " + number.path(),
                    "no range can be taken about " + number.written(number.base()),
                    "state one: --within '" + number.path() + "=A..B'");
        }
        return new Variable(number.path(), from, to, from > 0.0 && to > 2.0 * from);
    }

    /** An end of the range that is taken about a number: a factor, a step, or all that is admissible. */
    private static double taken(NumberKey number, boolean upper) {
        return switch (number.dimension()) {
            case TEMPERATURE, LEVEL -> number.base() + (upper ? STEP : -STEP);
            case SHARE, ANGLE -> upper ? number.most() : number.least();
            default -> number.base() > 0.0 ? number.base() * (upper ? WIDE : 1.0 / WIDE) : number.base();
        };
    }

    /** Fewest digits with which the limits are still kept; the digits found if none do. */
    private static List<Double> rounded(SizeQuestion question, SizingProblem problem, Sized sized) {
        if (!sized.trial().there()) {
            return sized.values();
        }
        for (int digits = FEWEST_DIGITS; digits <= Figures.FULL; digits++) {
            List<Double> best = List.of();
            double bestCost = Double.POSITIVE_INFINITY;
            for (int choice = 0; choice < 1 << sized.values().size(); choice++) {
                List<Double> tried = new ArrayList<>();
                for (int i = 0; i < sized.values().size(); i++) {
                    Variable range = problem.variables().get(i);
                    RoundingMode mode = !sized.fits()
                            ? RoundingMode.HALF_EVEN
                            : (choice >> i & 1) == 0 ? RoundingMode.FLOOR : RoundingMode.CEILING;
                    double value = new BigDecimal(sized.values().get(i))
                            .round(new MathContext(digits, mode))
                            .doubleValue();
                    tried.add(FastMath.min(FastMath.max(value, range.from()), range.to()));
                }
                Trial trial = question.trial(tried);
                double cost = trial.objective() * (problem.maximize() ? -1.0 : 1.0);
                if (trial.there() && (!sized.fits() || keeps(problem, trial)) && cost < bestCost) {
                    best = tried;
                    bestCost = cost;
                }
            }
            if (!best.isEmpty()) {
                return best;
            }
        }
        return sized.values();
    }

    private static boolean keeps(SizingProblem problem, Trial trial) {
        for (int c = 0; c < problem.constraints().size(); c++) {
            Constraint constraint = problem.constraints().get(c);
            if (!(constraint.shortfall(trial.found().get(c)) <= 0.0)) {
                return false;
            }
        }
        return true;
    }

    private static Trial solved(Study study, VariedStudy varied, SizeQuestion question, List<Double> values) {
        if (varied.model() == study.device().hair().lengthModel()) {
            return question.trial(values);
        }
        try {
            return question.trial(asStudied(study, varied, values));
        } catch (NoDesignException | StreamTooFastException e) {
            return Trial.none(e.getMessage());
        }
    }

    /** The sized device with the study's own model of its length. */
    private static BandsQuestion asStudied(Study study, VariedStudy varied, List<Double> values) {
        BandsQuestion sized =
                varied.at(values.stream().mapToDouble(value -> value).toArray());
        Hair hair = sized.device().hair();
        return sized.about(sized.device().with(hair.seenAs(study.device().hair().lengthModel())));
    }

    /** What weakens or ends at the sized device and did not at the base, and all that has ended. */
    private static List<Caveat> caveats(Study study, VariedStudy varied, List<Double> values) {
        BandsQuestion sized = asStudied(study, varied, values);
        List<String> before = new ArrayList<>();
        study.question().answer().caveats().forEach(caveat -> before.add(caveat.text()));
        LinkedHashSet<Caveat> caveats = new LinkedHashSet<>();
        for (Caveat caveat : sized.answer().caveats()) {
            boolean ended = caveat.weight() == Caveat.Weight.OUT_OF_RANGE;
            if (ended || (caveat.weight() == Caveat.Weight.WEAK && !before.contains(caveat.text()))) {
                caveats.add(caveat);
            }
        }
        return List.copyOf(caveats);
    }

    private static StudyException fault(String option, String found, String accepted) {
        return new StudyException(Problem.of(Position.label(option), "", found, accepted));
    }

    /**
     * A number in the unit of the study, to be typed again.
     *
     * @param index which of the numbers
     * @return number and unit, in few digits
     */
    public String written(int index) {
        WrittenUnit unit = units.get(index);
        return (Figures.full(unit.show(values.get(index))) + " " + unit.symbol()).strip();
    }
}
