package flowshy.verdict.design;

import flowshy.verdict.BandsQuestion;
import java.util.List;

/**
 * A device as a function of a few numbers of its study. What was measured of the suspension is solved once, on the base study.
 * Implementations may be asked by several threads at once and give each point the same answer in any order.
 */
public interface DesignSpace {
    /**
     * Paths of the numbers that vary.
     *
     * @return e.g. {@code hair.diameter}, in the order of the values
     */
    List<String> keys();

    /**
     * The question of a study with these numbers.
     *
     * @param values one a key, in SI
     * @return about its device, with its limits, motion and surroundings
     * @throws NoDesignException if the values make no device
     * @throws IllegalArgumentException if there are more or fewer values than keys
     */
    BandsQuestion at(double... values);

    /**
     * The same devices without what flows around them: quicker, for figures that do not ask for it.
     *
     * @return a space whose questions have no sources
     */
    DesignSpace still();
}
