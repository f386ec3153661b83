package flowshy.medium;

import java.util.OptionalDouble;

/**
 * Where one property of a medium comes from.
 *
 * @param property density, viscosity, sound speed …
 * @param source author, year, equation or table
 * @param reading how surely the value is known
 * @param uncertainty relative standard uncertainty [-], absent if none is stated
 */
public record PropertySource(String property, String source, Reading reading, OptionalDouble uncertainty) {
    /** How a value came to us. */
    public enum Reading {
        /** read in the published source */
        SEEN("seen"),
        /** quoted by another public source */
        SECOND_HAND("second hand"),
        /** recalled, not seen */
        MEMORY("from memory"),
        /** computed or derived by us from published equations */
        OWN("own evaluation"),
        /** stated by the user */
        GIVEN("given in the study");

        private final String words;

        Reading(String words) {
            this.words = words;
        }

        /**
         * The words a report prints.
         *
         * @return a few plain words
         */
        public String words() {
            return words;
        }
    }
}
