package flowshy.verdict.figure;

import java.util.OptionalDouble;

/**
 * A named quantity of a device, or why it has none.
 *
 * @param value in SI; infinite where there is no bound, not a number where there is no value
 * @param at frequency at which it was found [Hz], absent where it belongs to none
 * @param state what became of it
 * @param reason why there is no finite value; empty where there is one
 */
public record Found(double value, OptionalDouble at, State state, String reason) {
    /** What became of a quantity. */
    public enum State {
        /** a finite number */
        NUMBER,
        /** no bound: the value is infinite */
        UNBOUNDED,
        /** what it needs is not stated in the study */
        NOT_STATED,
        /** the device has none: it falls over, or reads nothing */
        HAS_NONE,
        /** its model has ended */
        ENDED
    }

    /**
     * A finite number that belongs to no frequency.
     *
     * @param value in SI
     * @return the quantity
     */
    static Found of(double value) {
        return new Found(value, OptionalDouble.empty(), State.NUMBER, "");
    }

    /**
     * A finite number found at a frequency.
     *
     * @param value in SI
     * @param frequency [Hz]
     * @return the quantity
     */
    static Found at(double value, double frequency) {
        return new Found(value, OptionalDouble.of(frequency), State.NUMBER, "");
    }

    /**
     * A quantity without a bound.
     *
     * @param reason why
     * @return the quantity, +∞
     */
    static Found unbounded(String reason) {
        return new Found(Double.POSITIVE_INFINITY, OptionalDouble.empty(), State.UNBOUNDED, reason);
    }

    /**
     * A quantity that needs what the study does not state.
     *
     * @param reason what is missing
     * @return no value
     */
    static Found notStated(String reason) {
        return new Found(Double.NaN, OptionalDouble.empty(), State.NOT_STATED, reason);
    }

    /**
     * A quantity that this device does not have.
     *
     * @param reason why
     * @return no value
     */
    static Found hasNone(String reason) {
        return new Found(Double.NaN, OptionalDouble.empty(), State.HAS_NONE, reason);
    }

    /**
     * A quantity whose model has ended.
     *
     * @param reason which
     * @return no value
     */
    static Found ended(String reason) {
        return new Found(Double.NaN, OptionalDouble.empty(), State.ENDED, reason);
    }

    /**
     * The value where it is a number.
     *
     * @return in SI, absent where it is infinite or undefined; the reason then says why
     */
    public OptionalDouble number() {
        return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
    }
}
