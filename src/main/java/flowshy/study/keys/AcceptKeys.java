package flowshy.study.keys;

import flowshy.study.units.Dimension;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.FigureUnit;
import flowshy.verdict.figure.Sense;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;

/** Keys of the limits: rejection and error, then every other named quantity that a device can be held to. */
public final class AcceptKeys {
    /** Those that rejection and error already limit. */
    private static final Set<Figure> TOLD = Set.of(Figure.REJECTION, Figure.LEAST_REJECTION, Figure.ERROR);

    private AcceptKeys() {}

    static Group group() {
        List<Key> keys = new ArrayList<>();
        keys.add(Key.of(
                "rejection",
                Measure.of(Dimension.LEVEL, "0 dB", "300 dB"),
                Presence.taken("20 dB", "ten to one, common practice; splits the bands, is no limit"),
                "least rejection over the band"));
        keys.add(Key.optional(
                "error", Measure.amplitude(Dimension.ACCELERATION, "1e-12 m/s2", "1e9 m/s2"), "largest error by flow"));
        figures().forEach(figure -> keys.add(Key.optional(figure.word(), limit(figure), meaning(figure))));
        return Group.of("accept", keys);
    }

    /**
     * The quantities that a limit may name beside rejection and error.
     *
     * @return in the order of their table
     */
    public static List<Figure> figures() {
        List<Figure> figures = new ArrayList<>(List.of(Figure.values()));
        figures.removeAll(TOLD);
        return figures;
    }

    private static String meaning(Figure figure) {
        String sense = figure.sense() == Sense.NONE ? "" : figure.sense().words() + ": ";
        return sense + figure.words();
    }

    /** A plain number where the quantity has a good way; else a number for each way. */
    private static Value limit(Figure figure) {
        Measure number = measure(figure.unit());
        return figure.sense() == Sense.NONE
                ? Group.of(
                        figure.word(),
                        List.of(
                                Key.optional(Sense.AT_LEAST.word(), number, "least value"),
                                Key.optional(Sense.AT_MOST.word(), number, "largest value")))
                : number;
    }

    /** Wide ranges: they only catch a slip of the unit. */
    private static Measure measure(FigureUnit unit) {
        return switch (unit) {
            case MASS -> Measure.of(Dimension.MASS, "1e-24 kg", "1 kg");
            case VOLUME -> Measure.of(Dimension.VOLUME, "1e-24 m3", "1 m3");
            case LENGTH -> Measure.of(Dimension.LENGTH, "1 nm", "1 m");
            case INERTIA -> Measure.of(Dimension.INERTIA, "1e-36 kg.m2", "1 kg.m2");
            case TORQUE_PER_ACCELERATION ->
                Measure.of(Dimension.TORQUE_PER_ACCELERATION, "1e-30 N.m/(m/s2)", "1 N.m/(m/s2)");
            case STIFFNESS -> Measure.of(Dimension.STIFFNESS, "1e-20 N.m/rad", "1e6 N.m/rad");
            case FREQUENCY -> Measure.of(Dimension.FREQUENCY, "1 mHz", "1 GHz");
            case LEVEL -> Measure.of(Dimension.LEVEL, "-300 dB", "300 dB");
            case ANGLE_PER_ACCELERATION ->
                Measure.of(Dimension.ANGLE_PER_ACCELERATION, "1e-18 rad/(m/s2)", "1e6 rad/(m/s2)");
            case ANGLE_PER_SPEED -> Measure.of(Dimension.ANGLE_PER_SPEED, "1e-18 rad/(m/s)", "1e6 rad/(m/s)");
            case ACCELERATION_NOISE -> Measure.of(Dimension.ACCELERATION_NOISE, "1e-18 m/s2/rtHz", "1e6 m/s2/rtHz");
            case ACCELERATION -> Measure.amplitude(Dimension.ACCELERATION, "1e-12 m/s2", "1e9 m/s2");
            case ACCELERATION_PER_SPEED ->
                Measure.of(Dimension.ACCELERATION_PER_SPEED, "1e-12 m/s2/(m/s)", "1e12 m/s2/(m/s)");
            case SPEED -> Measure.amplitude(Dimension.SPEED, "1e-12 m/s", "1e6 m/s");
            case ANGLE -> Measure.of(Dimension.ANGLE, "1e-12 rad", "1 rad");
            case NUMBER -> Measure.of(Dimension.NUMBER, "1e-9", "1e9");
        };
    }
}
