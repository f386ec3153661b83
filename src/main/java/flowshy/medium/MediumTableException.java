package flowshy.medium;

import java.util.List;
import java.util.stream.Collectors;

/** A property table cannot be read; carries every fault of the file. */
public final class MediumTableException extends MediumException {
    private static final long serialVersionUID = 1L;

    private final transient List<TableProblem> problems;

    /**
     * States the faults.
     *
     * @param problems at least one, in the order of the file
     */
    public MediumTableException(List<TableProblem> problems) {
        super(
                MediumParameter.NAME,
                problems.stream().map(TableProblem::toString).collect(Collectors.joining(System.lineSeparator())));
        this.problems = List.copyOf(problems);
    }

    /**
     * The faults, one by one.
     *
     * @return in the order of the file
     */
    public List<TableProblem> problems() {
        return problems;
    }
}
