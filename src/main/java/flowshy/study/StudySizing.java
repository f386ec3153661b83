package flowshy.study;

import flowshy.hair.LengthModel;
import flowshy.math.Caveat;
import flowshy.math.Figures;
import flowshy.response.Device;
import flowshy.response.Hold;
import flowshy.study.NumberKeys.KeyRange;
import flowshy.study.text.Position;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.study.units.WrittenUnit;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.Limit;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import flowshy.verdict.size.Agreement;
import flowshy.verdict.size.Rounding;
import flowshy.verdict.size.SizeQuestion;
import flowshy.verdict.size.Sized;
import flowshy.verdict.size.Sizer;
import flowshy.verdict.size.SizingProblem;
import flowshy.verdict.size.Trial;
import flowshy.verdict.size.Variable;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.DoubleConsumer;
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
 * @param search how the length of the hair is seen by the search; over many shapes the estimate stands for a solution that is taken by default
 * @param agreement the optimum, or what comes nearest, by the study's own model, and how the search came to agree with it
 * @param values the numbers rounded to few digits, to the side that keeps the limits
 * @param trial the figures of the rounded numbers, as {@code bands} finds them
 * @param estimate the same figures by the model of the search
 * @param base the figures of the study as it stands
 * @param answer what {@code bands} says of the device with the rounded numbers; empty where there is none
 * @param undecided limits that the search keeps and {@code bands} does not call met at the rounded numbers
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
        LengthModel search,
        Agreement agreement,
        List<Double> values,
        Trial trial,
        Trial estimate,
        Trial base,
        Optional<BandsAnswer> answer,
        List<Limit> undecided,
        List<Caveat> caveats) {
    /** More numbers than this are no longer searched with any certainty. */
    private static final int MOST = 6;

    /** Range taken where none is stated: so many times less and more than the study's number. */
    private static final double WIDE = 5.0;

    /** And so many kelvin, or decibels, where that has no sense. */
    private static final double STEP = 20.0;

    /** Copies the lists. */
    public StudySizing {
        numbers = List.copyOf(numbers);
        units = List.copyOf(units);
        taken = List.copyOf(taken);
        limits = List.copyOf(limits);
        leftOut = List.copyOf(leftOut);
        values = List.copyOf(values);
        undecided = List.copyOf(undecided);
        caveats = List.copyOf(caveats);
    }

    /**
     * Sizes a study.
     *
     * @param reader of the study
     * @param words what is asked
     * @param progress told now and then, by any thread, what share is done
     * @return the answer
     * @throws StudyException with every problem of the study, or the first of the words
     */
    public static StudySizing of(StudyReader reader, SizeWords words, DoubleConsumer progress) {
        Study study = reader.study();
        Figure figure = StudyMap.figure("--to", words.figure());
        NumberKeys keys = reader.numbers();
        List<NumberKey> numbers = numbers(keys, words);
        Map<String, KeyRange> stated = stated(keys, words, numbers);
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
        if (study.envelope().isPresent()) {
            leftOut.add("envelope: the limits are kept at the study's own state; bands judges the worst one");
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
        List<List<Double>> known = inside ? List.of(own) : List.of();
        Sizer sizer = new Sizer(words.seed(), progress);
        boolean estimated = varied.model() != study.device().hair().lengthModel();
        SizeQuestion solved = estimated ? question.in(asStudied(study, question.space())) : question;
        Agreement agreement =
                estimated ? sizer.solve(problem, solved::trial, known) : Agreement.of(sizer.solve(problem, known));
        List<Double> values = Rounding.of(agreement);
        Optional<BandsAnswer> answer = agreement.sized().trial().there()
                ? Optional.of(asStudied(study, varied)
                        .at(values.stream().mapToDouble(value -> value).toArray())
                        .answer())
                : Optional.empty();
        return new StudySizing(
                study,
                words,
                figure,
                numbers,
                numbers.stream().map(keys::unit).toList(),
                numbers.stream()
                        .map(number -> !stated.containsKey(number.path()))
                        .toList(),
                limits,
                leftOut,
                varied.hold(),
                varied.model(),
                agreement,
                values,
                solved.trial(values),
                question.trial(values),
                question.trial(study.question()),
                answer,
                agreement.sized().fits() ? answer.map(StudySizing::undecided).orElseThrow() : List.of(),
                answer.map(found -> caveats(study, found)).orElse(List.of()));
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

    /** The devices of a space with the study's own model of their length. */
    private static DesignSpace asStudied(Study study, DesignSpace space) {
        return new Seen(space, study.device().hair().lengthModel());
    }

    /** The devices of a space, their length seen otherwise. */
    private record Seen(DesignSpace space, LengthModel model) implements DesignSpace {
        @Override
        public List<String> keys() {
            return space.keys();
        }

        @Override
        public BandsQuestion at(double... values) {
            BandsQuestion question = space.at(values);
            Device device = question.device();
            return question.about(device.with(device.hair().seenAs(model)));
        }

        @Override
        public DesignSpace still() {
            return new Seen(space.still(), model);
        }
    }

    private static List<Limit> undecided(BandsAnswer answer) {
        return answer.verdict().limits().stream()
                .filter(limit -> limit.decision() == Decision.UNDECIDED || limit.decision() == Decision.FAILS)
                .toList();
    }

    /** What weakens or ends at the sized device and did not at the base, and all that has ended. */
    private static List<Caveat> caveats(Study study, BandsAnswer sized) {
        List<String> before = new ArrayList<>();
        study.question().answer().caveats().forEach(caveat -> before.add(caveat.text()));
        LinkedHashSet<Caveat> caveats = new LinkedHashSet<>();
        for (Caveat caveat : sized.caveats()) {
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
     * The optimum, or what comes nearest.
     *
     * @return by the study's own model
     */
    public Sized sized() {
        return agreement.sized();
    }

    /**
     * Whether every limit is kept.
     *
     * @return true if {@code bands} says so too
     */
    public boolean keeps() {
        return sized().fits() && undecided.isEmpty();
    }

    /**
     * Whether the search went by another model than the answer.
     *
     * @return true if an estimate was corrected
     */
    public boolean estimated() {
        return search != study.device().hair().lengthModel();
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
