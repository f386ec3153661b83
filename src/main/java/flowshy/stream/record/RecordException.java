package flowshy.stream.record;

import java.util.List;
import java.util.stream.Collectors;

/** A measured file cannot be used. The user can mend it. */
public final class RecordException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<RecordProblem> problems;

    /**
     * Every fault found.
     *
     * @param problems one or more, in the order of the file
     */
    public RecordException(List<RecordProblem> problems) {
        super(problems.stream().map(RecordProblem::toString).collect(Collectors.joining("\n")));
        this.problems = List.copyOf(problems);
    }

    /**
     * The faults.
     *
     * @return one or more, in the order of the file
     */
    public List<RecordProblem> problems() {
        return problems;
    }
}
