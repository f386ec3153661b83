package flowshy.study;

import flowshy.response.Suspension;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.verdict.fit.Freed;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The numbers that a fit may change: the stiffness and the damping that the study's suspension is held at, however it states them, and any
 * number that the study holds.
 *
 * @param space the device as a function of those that are numbers of the study
 * @param free all of them, in the order named
 */
public record FreeKeys(VariedStudy space, List<Freed> free) {
    /** The key of the suspension's stiffness as held. */
    public static final String STIFFNESS = "suspension.stiffness";

    /** The key of its structural damping as held. */
    public static final String DAMPING = "suspension.damping";

    private static final String GAIN = "gain";
    private static final String OPTION = "--free";

    /** Stiffness and damping beyond these are told as such. */
    private static final double LEAST_STIFFNESS = 1e-20;

    private static final double MOST = 1e6;

    /** Copies the list. */
    public FreeKeys {
        free = List.copyOf(free);
    }

    /**
     * Numbers by their keys.
     *
     * @param reader of the study
     * @param words keys; {@code gain} is passed over, it is free wherever it is not known
     * @return the free numbers
     * @throws StudyException with every problem of the study and of the keys
     */
    public static FreeKeys of(StudyReader reader, List<String> words) {
        Optional<Suspension> held = reader.study().device().suspension();
        NumberKeys known = reader.numbers();
        Problems problems = new Problems();
        List<NumberKey> numbers = new ArrayList<>();
        List<Freed> free = new ArrayList<>();
        List<String> seen = new ArrayList<>();
        for (String word : words) {
            String key = word.strip();
            if (seen.contains(key)) {
                refuse(problems, key, "named twice", "each key once");
                continue;
            }
            seen.add(key);
            if (key.equals(STIFFNESS) || key.equals(DAMPING)) {
                if (held.isEmpty()) {
                    refuse(problems, key, "the study states no suspension", "state one to start from");
                } else {
                    free.add(suspension(key, held.get()));
                }
            } else if (!key.equals(GAIN)) {
                try {
                    NumberKey number = known.key(OPTION, key);
                    numbers.add(number);
                    free.add(new Freed(
                            number.path(),
                            Freed.Kind.STUDY,
                            number.dimension().siUnit(),
                            number.base(),
                            number.orZero() ? 0.0 : number.least(),
                            number.most()));
                } catch (StudyException e) {
                    e.problems().forEach(problems::add);
                }
            }
        }
        problems.throwIfAny();
        return new FreeKeys(VariedStudy.of(reader, numbers), free);
    }

    private static Freed suspension(String key, Suspension held) {
        return key.equals(STIFFNESS)
                ? new Freed(key, Freed.Kind.STIFFNESS, "N.m/rad", held.stiffness(), LEAST_STIFFNESS, MOST)
                : new Freed(key, Freed.Kind.DAMPING, "N.m.s/rad", held.damping(), 0.0, MOST);
    }

    private static void refuse(Problems problems, String key, String found, String accepted) {
        problems.add(Problem.of(Position.label(OPTION + " " + Printable.of(key)), "", found, accepted));
    }
}
