package flowshy.verdict.compare;

import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.NoDesignException;

/** A device as a function of one number, by which it is made equal to another. */
public interface Scaling {
    /**
     * What is changed.
     *
     * @return in words, or the path of a key
     */
    String words();

    /**
     * The number as it stands.
     *
     * @return in SI, or a factor
     */
    double start();

    /**
     * Smallest number to be tried.
     *
     * @return in SI, or a factor
     */
    double least();

    /**
     * Largest number to be tried.
     *
     * @return in SI, or a factor
     */
    double most();

    /**
     * A number for people.
     *
     * @param value in SI, or a factor
     * @return with its unit
     */
    String written(double value);

    /**
     * What was done, for people.
     *
     * @param value the number it was changed to, in SI, or a factor
     * @return words with both numbers
     */
    String change(double value);

    /**
     * The device with that number.
     *
     * @param value in SI, or a factor
     * @return the question about it
     * @throws NoDesignException if it makes no device
     */
    BandsQuestion at(double value);
}
