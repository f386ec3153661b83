package flowshy.study.text;

import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;

/** A study cannot be used as it is written; holds every problem at once, file by file in the order of the text. */
public final class StudyException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<Problem> problems;

    /**
     * Some problems.
     *
     * @param problems at least one
     * @param untold how many more there were
     */
    StudyException(List<Problem> problems, int untold) {
        this(sorted(problems), more(untold));
    }

    private StudyException(List<Problem> sorted, String more) {
        super(sorted.stream().map(Problem::text).collect(Collectors.joining("\n")) + more);
        this.problems = sorted;
    }

    /**
     * One problem.
     *
     * @param problem the problem
     */
    public StudyException(Problem problem) {
        this(List.of(problem), 0);
    }

    /**
     * The problems, file by file in the order of the text.
     *
     * @return at least one, at most a hundred
     */
    public List<Problem> problems() {
        return problems;
    }

    private static List<Problem> sorted(List<Problem> problems) {
        List<String> origins =
                problems.stream().map(p -> p.position().origin()).distinct().toList();
        return problems.stream()
                .sorted(Comparator.comparingInt(
                                (Problem p) -> origins.indexOf(p.position().origin()))
                        .thenComparing(Problem::position))
                .toList();
    }

    private static String more(int untold) {
        return untold == 0 ? "" : "\nand " + untold + " more";
    }
}
