package flowshy.study;

import flowshy.hair.LengthModel;
import flowshy.response.Hold;
import flowshy.study.text.Nearest;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.verdict.FigureLimit;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Sense;
import flowshy.verdict.map.Axis;
import flowshy.verdict.map.Grid;
import flowshy.verdict.map.GridRun;
import flowshy.verdict.map.MapQuestion;
import flowshy.verdict.map.Spot;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/**
 * A figure of a study's device over two numbers.
 *
 * @param study the base
 * @param across side that runs across
 * @param down side that runs down
 * @param figure what is mapped
 * @param frequency at which the figure is asked for [Hz]; absent where it belongs to no single frequency, or where a side is the frequency
 * @param hold what of the suspension stays
 * @param grid figure by place
 * @param own the figure of the study as it stands, at its own two numbers; empty where these lie outside the map
 */
public record StudyMap(
        Study study,
        Side across,
        Side down,
        Figure figure,
        OptionalDouble frequency,
        Hold hold,
        Grid grid,
        Optional<Spot> own) {
    /** Figures that belong to a frequency. */
    private static final Set<Figure> AT_FREQUENCY = EnumSet.of(
            Figure.REJECTION,
            Figure.SENSITIVITY,
            Figure.FLOW_SENSITIVITY,
            Figure.NOISE,
            Figure.EQUIVALENT,
            Figure.LARGEST_SPEED);

    /** Figures that the surroundings have a part in. */
    private static final Set<Figure> SURROUNDED = EnumSet.of(
            Figure.ERROR,
            Figure.OFFSET,
            Figure.SMALLEST_READABLE,
            Figure.DYNAMIC_RANGE,
            Figure.NOISE_RMS,
            Figure.STATIC_TILT,
            Figure.STREAM_TILT);

    /**
     * Fills a map.
     *
     * @param reader of the study
     * @param words what is asked
     * @param run on how many threads
     * @return the map
     * @throws StudyException with every problem of the study, or the first of the words
     */
    public static StudyMap of(StudyReader reader, MapWords words, GridRun run) {
        Study study = reader.study();
        NumberKeys numbers = reader.numbers();
        Side across = Side.read("--across", words.across(), numbers, study.reference());
        Side down = Side.read("--down", words.down(), numbers, study.reference());
        if (across.key().path().equals(down.key().path())) {
            throw fault(
                    "--down " + down.key().path(), "the same number as --across", "two different numbers span a map");
        }
        boolean frequencySide = across.frequency() || down.frequency();
        Figure figure = figure(words, frequencySide);
        if (words.at().isPresent() && frequencySide) {
            throw fault("--at", "a side of the map is the frequency", "leave out one of them");
        }
        boolean needed = AT_FREQUENCY.contains(figure);
        if (!needed && (words.at().isPresent() || frequencySide)) {
            List<String> fitting = AT_FREQUENCY.stream().map(Figure::word).toList();
            throw fault(
                    words.at().isPresent() ? "--at" : "--of " + figure.word(),
                    figure.word() + " belongs to no single frequency",
                    "leave the frequency out, or map one of " + String.join(", ", fitting));
        }
        OptionalDouble frequency = !needed || frequencySide
                ? OptionalDouble.empty()
                : OptionalDouble.of(words.at().orElse(study.reference()));
        List<NumberKey> keys = new ArrayList<>();
        for (Side side : List.of(across, down)) {
            if (!side.frequency()) {
                keys.add(side.key());
            }
        }
        VariedStudy varied = VariedStudy.of(reader, keys);
        DesignSpace space = surrounded(figure) ? varied : varied.still();
        MapQuestion question = new MapQuestion(space, figure, frequency);
        Grid grid = question.answer(axis(across, words, 0), axis(down, words, 1), run);
        return new StudyMap(study, across, down, figure, frequency, varied.hold(), grid, own(question, across, down));
    }

    /**
     * The model of finite length that the places of the map were worked out by.
     *
     * @return the study's, or the estimate where the shape varies
     */
    public LengthModel lengthModel() {
        return VariedStudy.over(
                study.device().hair().lengthModel(),
                List.of(across.key().path(), down.key().path()));
    }

    private static Figure figure(MapWords words, boolean frequencySide) {
        if (words.figure().isEmpty()) {
            return frequencySide || words.at().isPresent() ? Figure.REJECTION : Figure.LEAST_REJECTION;
        }
        return figure("--of", words.figure().get());
    }

    /** The figure of a name, or what names there are. */
    static Figure figure(String option, String name) {
        return Figure.named(name)
                .orElseThrow(() -> new StudyException(new Problem(
                        Position.label(option),
                        "",
                        Printable.of(name) + " is no figure",
                        "one of " + String.join(", ", Figure.names()),
                        Nearest.among(name, Figure.names()))));
    }

    /** Whether the surroundings have a part in a figure. */
    static boolean surrounded(Figure figure) {
        return SURROUNDED.contains(figure);
    }

    private static Axis axis(Side side, MapWords words, int index) {
        boolean log = words.log().get(index);
        if (log && !(side.from() > 0.0)) {
            throw fault(
                    "--log",
                    side.key().path() + " begins at " + side.key().written(side.from()),
                    "a logarithmic side begins above zero");
        }
        return new Axis(side.key().path(), side.from(), side.to(), words.steps().get(index), log);
    }

    private static Optional<Spot> own(MapQuestion question, Side across, Side down) {
        if (!inside(across) || !inside(down)) {
            return Optional.empty();
        }
        OptionalDouble hertz = question.frequency();
        List<Double> values = new ArrayList<>();
        for (Side side : List.of(across, down)) {
            if (side.frequency()) {
                hertz = OptionalDouble.of(side.key().base());
            } else {
                values.add(side.key().base());
            }
        }
        return Optional.of(
                question.at(hertz, values.stream().mapToDouble(value -> value).toArray()));
    }

    private static boolean inside(Side side) {
        return side.key().base() >= side.from() && side.key().base() <= side.to();
    }

    private static StudyException fault(String option, String found, String accepted) {
        return new StudyException(Problem.of(Position.label(option), "", found, accepted));
    }

    /**
     * The values of the figure that decide: for a rejection the margin either way and zero, and the limits that the study states.
     *
     * @return rising in the order of the study
     */
    public List<Double> decisive() {
        List<Double> decisive = new ArrayList<>();
        if (rejection()) {
            double margin = study.acceptance().margin();
            decisive.addAll(List.of(-margin, 0.0, margin));
        }
        if (figure == Figure.ERROR) {
            study.acceptance().error().ifPresent(decisive::add);
        }
        for (FigureLimit limit : study.acceptance().others()) {
            if (limit.figure() == figure) {
                decisive.add(limit.value());
            }
        }
        return decisive.stream().distinct().sorted().toList();
    }

    /**
     * Whether a value that decides is a largest one.
     *
     * @param level one of {@link #decisive}
     * @return true where every limit of the study at that value is one; false for a least one, and for a rejection
     */
    public boolean atMost(double level) {
        List<FigureLimit> there = study.acceptance().others().stream()
                .filter(limit -> limit.figure() == figure && limit.value() == level)
                .toList();
        return there.isEmpty()
                ? figure == Figure.ERROR
                : there.stream().allMatch(limit -> limit.sense() == Sense.AT_MOST);
    }

    /**
     * Whether the figure is a rejection, whose sign says what is read.
     *
     * @return true for each of its forms
     */
    public boolean rejection() {
        return Set.of(Figure.REJECTION, Figure.LEAST_REJECTION, Figure.REJECTION_FROM, Figure.REJECTION_TO)
                .contains(figure);
    }
}
