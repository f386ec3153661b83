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
        /** measured by whoever made the table */
        MEASURED("measured"),
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

    /**
     * The same with a further, independent error.
     *
     * @param error relative standard uncertainty [-]
     * @return root of the sum of squares; unchanged if no uncertainty is stated
     */
    PropertySource widened(double error) {
        return uncertainty.isEmpty()
                ? this
                : new PropertySource(
                        property, source, reading, OptionalDouble.of(Math.hypot(uncertainty.getAsDouble(), error)));
    }

    /** The same, as a property of one part of a mixture. */
    PropertySource of(String part) {
        return new PropertySource(property + " of " + part, source, reading, uncertainty);
    }
}
