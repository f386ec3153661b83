package flowshy.verdict.fit;

/**
 * What a fit leaves of one measured number.
 *
 * @param name of the measurement
 * @param frequency [Hz]
 * @param part level, phase, swing frequency or decay
 * @param share measured less fitted in standard deviations [-]
 * @param weight with which it counted, 1 in full [-]
 */
public record Residual(String name, double frequency, Part part, double share, double weight) {
    /** Which part of a measurement. */
    public enum Part {
        /** size of a response */
        LEVEL("level"),
        /** phase of a response */
        PHASE("phase"),
        /** frequency of a free swing */
        SWING("swing frequency"),
        /** decay time of a free swing */
        DECAY("decay time");

        private final String word;

        Part(String word) {
            this.word = word;
        }

        /**
         * In words.
         *
         * @return one or two
         */
        public String word() {
            return word;
        }
    }
}
