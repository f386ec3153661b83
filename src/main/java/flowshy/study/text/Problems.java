package flowshy.study.text;

import java.util.ArrayList;
import java.util.List;

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
        return found.stream().anyMatch(p -> p.path().equals(path) || p.path().startsWith(path + "."));
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
