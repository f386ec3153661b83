package flowshy.math;

import java.util.Objects;

/**
 * One sentence that must stand next to a number.
 *
 * @param about the quantity the sentence touches
 * @param weight how far the number can still be trusted
 * @param text the sentence, with figures and units, ending in a full stop
 */
public record Caveat(Subject about, Weight weight, String text) {
    /** The equality of a record, written out: the generated one takes 40 ms to be linked, and every answer sorts out its caveats. */
    @Override
    public boolean equals(Object other) {
        return other instanceof Caveat same && about == same.about && weight == same.weight && text.equals(same.text);
    }

    @Override
    public int hashCode() {
        return Objects.hash(about, weight, text);
    }

    /** The quantity that a caveat touches; reports print the caveat beside it. */
    public enum Subject {
        /** properties of the medium */
        MEDIUM,
        /** mass, moments and shape of the hair */
        HAIR,
        /** stiffness, damping and what was solved from measurements */
        SUSPENSION,
        /** motion response over flow response, and so the bands */
        REJECTION,
        /** response to motion of the base */
        MOTION,
        /** response to flow */
        FLOW,
        /** resonance and quality factor */
        RESONANCE,
        /** thermal and readout noise */
        NOISE,
        /** equivalent acceleration of a flow */
        ERROR,
        /** what the cover does */
        COVER
    }

    /** How far the number can still be trusted. */
    public enum Weight {
        /** to be known, changes nothing */
        NOTE("note"),
        /** an assumption weakens; the number stands with the stated loss */
        WEAK("weak"),
        /** the model has ended; a decision that rests on the number is undecided */
        OUT_OF_RANGE("out of range");

        private final String words;

        Weight(String words) {
            this.words = words;
        }

        /**
         * The words printed before the sentence.
         *
         * @return a word or three
         */
        public String words() {
            return words;
        }
    }
}
