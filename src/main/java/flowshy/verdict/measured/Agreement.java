package flowshy.verdict.measured;

import java.util.List;

/**
 * Whether a measurement and the model agree within their uncertainties.
 *
 * @param outcome in a word
 * @param sentence the same for people, ending in a full stop
 * @param where intervals in which they differ, rising
 */
public record Agreement(Outcome outcome, String sentence, List<Interval> where) {
    /** Copies the list. */
    public Agreement {
        where = List.copyOf(where);
    }

    /** In a word. */
    public enum Outcome {
        /** nowhere apart by more than the uncertainties explain */
        AGREE("agree"),
        /** somewhere apart by more */
        DIFFER("differ"),
        /** no uncertainty is known, or nothing is predicted */
        UNKNOWN("not-known");

        private final String word;

        Outcome(String word) {
            this.word = word;
        }

        /**
         * For programs.
         *
         * @return one word
         */
        public String word() {
            return word;
        }
    }

    /**
     * A range of frequency.
     *
     * @param from [Hz]
     * @param to [Hz]
     */
    public record Interval(double from, double to) {}
}
