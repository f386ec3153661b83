package flowshy.cli;

import java.util.Arrays;
import java.util.List;
import picocli.CommandLine.ITypeConverter;

/** A list of frequencies as one word: {@code "80 Hz, 320 Hz"}. */
record Frequencies(List<Double> values) {
    /** Reads the list. */
    static final class Converter implements ITypeConverter<Frequencies> {
        private final QuantityConverters.Frequency one = new QuantityConverters.Frequency();

        @Override
        public Frequencies convert(String text) {
            return new Frequencies(
                    Arrays.stream(text.split(",")).map(one::convert).toList());
        }
    }
}
