package flowshy.study.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Collects problems while a study is read, so that all of them are told at once. */
public final class Problems {
    /** More than this nobody mends in one go; a hostile file must not fill the screen. */
    private static final int MOST = 100;

    private final List<Problem> found = new ArrayList<>();
    private int untold;

    /**
     * Notes a problem; beyond the hundredth only their number is kept.
     *
     * @param problem the problem
     */
    public void add(Problem problem) {
        if (found.size() < MOST) {
            found.add(problem);
        } else {
            untold++;
        }
    }

    /**
     * Notes a problem without a near word.
     *
     * @param position where it stands
     * @param path the key's path, may be empty
     * @param was what was found
     * @param accepted what would be right
     */
    public void add(Position position, String path, String was, String accepted) {
        add(Problem.of(position, path, was, accepted));
    }

    /**
     * The problem that was found first.
     *
     * @return empty if there is none
     */
    public Optional<Problem> first() {
        return found.stream().findFirst();
    }

    /**
     * Those noted, the first hundred.
     *
     * @return in the order noted
     */
    public List<Problem> all() {
        return List.copyOf(found);
    }

    /**
     * How many were noted.
     *
     * @return the count, those beyond the hundredth included
     */
    public int count() {
        return found.size() + untold;
    }

    /**
     * Whether a key, or anything below it, has a problem already: what follows from it need not be told again.
     *
     * @param path the key's path
     * @return true if so
     */
    public boolean touches(String path) {
        if (untold > 0) { // past the hundredth problem, who knows
            return true;
        }
        for (Problem problem : found) { // a mistyped key stands for the one it was meant to be
            if (within(problem.path(), path)
                    || problem.nearest().filter(near -> within(near, path)).isPresent()) {
                return true;
            }
        }
        return false;
    }

    private static boolean within(String inner, String path) {
        return inner.equals(path) || inner.startsWith(path + ".");
    }

    /**
     * Ends the reading if anything was found.
     *
     * @throws StudyException with every problem
     */
    public void throwIfAny() {
        if (!found.isEmpty()) {
            throw new StudyException(found, untold);
        }
    }
}
